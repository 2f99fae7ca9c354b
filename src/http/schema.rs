//! OpenAPI schemas written from the lists that compute: fields, columns, kinds, notes and ids.

use std::borrow::Cow;

use serde_json::{Value, json};
use utoipa::openapi::path::{Parameter, ParameterBuilder, ParameterIn};
use utoipa::openapi::schema::{
    AdditionalProperties, AnyOfBuilder, ArrayBuilder, Object, ObjectBuilder, Schema, SchemaType,
    Type,
};
use utoipa::openapi::{Ref, RefOr, Required};
use utoipa::{PartialSchema, ToSchema};

use crate::case::{CODES, Column, ColumnType, NoteCode, PROPERTIES, Severity};
use crate::fluids::Fluids;
use crate::geometry::{Field, FieldValue};
use crate::http::extract::COLUMNS;
use crate::methods::{MethodId, RangeStatus};
use crate::quantity::Kind;

/// A list of schemas with their names, as utoipa collects them.
type Schemas = Vec<(String, RefOr<Schema>)>;

/// Text that begins like a number; what follows is the unit.
const QUANTITY_PATTERN: &str = r"^\s*[+\-−]?\s*[0-9.][\s\S]*$";

fn types(types: &[Type]) -> SchemaType {
    SchemaType::Array(types.to_vec())
}

fn reference(name: &str) -> RefOr<Schema> {
    RefOr::Ref(Ref::from_schema_name(name))
}

/// The name of a kind's schema: `heat_flow` is `HeatFlow`.
fn kind_schema_name(kind: Kind) -> String {
    kind.name()
        .split('_')
        .map(|word| word[..1].to_uppercase() + &word[1..])
        .collect()
}

/// A quantity as requests carry it.
fn quantity(kind: Kind) -> Schema {
    let units: Vec<_> = kind.units().map(|unit| unit.symbol()).collect();
    let bare = kind.si_unit().symbol();
    let description = format!(
        "{}: a number in {bare} (or in the request's own unit), or text with a unit: {}. Null is not given.",
        kind.name().replace('_', " "),
        units.join(", ")
    );
    let last = units.last().copied().unwrap_or(bare);
    Schema::Object(
        ObjectBuilder::new()
            .schema_type(types(&[Type::Number, Type::String, Type::Null]))
            .description(Some(description))
            .pattern(Some(QUANTITY_PATTERN))
            .examples([json!(1.5), json!(format!("1.5 {last}"))])
            .build(),
    )
}

/// A closed set of words; with `null` where a request may leave it out.
fn closed(words: &[&str], nullable: bool) -> ObjectBuilder {
    let mut values: Vec<Value> = words.iter().map(|word| json!(word)).collect();
    let mut kinds = vec![Type::String];
    if nullable {
        values.push(Value::Null);
        kinds.push(Type::Null);
    }
    ObjectBuilder::new()
        .schema_type(types(&kinds))
        .enum_values(Some(values))
}

/// A set of words that may grow.
fn open<'a>(words: impl Iterator<Item = &'a str>, nullable: bool) -> AnyOfBuilder {
    let known: Vec<&str> = words.collect();
    let free = if nullable {
        types(&[Type::String, Type::Null])
    } else {
        types(&[Type::String])
    };
    AnyOfBuilder::new()
        .item(closed(&known, false).build())
        .item(ObjectBuilder::new().schema_type(free).build())
}

fn fluid_ids() -> impl Iterator<Item = &'static str> {
    Fluids::built_in().iter().map(|(_, fluid)| fluid.id())
}

fn method_ids() -> impl Iterator<Item = &'static str> {
    MethodId::TEXTS.iter().copied()
}

fn example(text: &str) -> Value {
    // Examples in the lists are JSON, which a test proves.
    serde_json::from_str(text).unwrap_or_default()
}

/// The schema of one field of a case.
pub fn field_schema(field: Field) -> RefOr<Schema> {
    let entry = field.entry();
    let shown = example(entry.example);
    match entry.value {
        FieldValue::Quantity(kind, limits) => {
            let unit = kind.si_unit().symbol();
            let description = format!(
                "{}; {} {} to {} {unit}",
                entry.text,
                if limits.above_minimum {
                    "above"
                } else {
                    "from"
                },
                limits.minimum,
                limits.maximum
            );
            AnyOfBuilder::new()
                .item(reference(&kind_schema_name(kind)))
                .description(Some(description))
                .examples([shown])
                .into()
        }
        FieldValue::Choice(words) => closed(words, field != Field::Geometry)
            .description(Some(entry.text))
            .examples([shown])
            .into(),
        FieldValue::Fluid => described(open(fluid_ids(), true), entry.text, shown),
        FieldValue::Method => {
            described(open(method_ids().chain(["auto"]), true), entry.text, shown)
        }
        FieldValue::Label => ObjectBuilder::new()
            .schema_type(types(&[Type::String, Type::Null]))
            .description(Some(entry.text))
            .examples([shown])
            .into(),
    }
}

fn described(schema: AnyOfBuilder, text: &str, example: Value) -> RefOr<Schema> {
    schema.description(Some(text)).examples([example]).into()
}

/// A choice of units for bare numbers or for an answer.
pub fn unit_choice(text: &str, example: Value) -> RefOr<Schema> {
    ObjectBuilder::new()
        .schema_type(types(&[Type::Object, Type::Null]))
        .description(Some(text))
        .additional_properties(Some(AdditionalProperties::RefOr(RefOr::T(Schema::Object(
            Object::with_type(Type::String),
        )))))
        .examples([example])
        .into()
}

/// A case as `POST /v1/film` takes it.
pub struct FilmRequest;

impl PartialSchema for FilmRequest {
    fn schema() -> RefOr<Schema> {
        let mut object = ObjectBuilder::new().description(Some(
            "One surface in one fluid. Which dimensions a body takes is in /v1/geometries; give surface_temperature, heat_flux or heat_flow.",
        ));
        for &field in Field::ALL {
            let schema = match field {
                Field::Fluid => fluid_or_table(),
                field => field_schema(field),
            };
            object = object.property(field.name(), schema);
        }
        object
            .property(
                "units",
                unit_choice(
                    "units of bare numbers, by kind or field",
                    json!({"temperature": "degC", "length": "mm"}),
                ),
            )
            .property(
                "answer_units",
                unit_choice(
                    "units of the answer, by kind or figure",
                    json!({"temperature": "degC", "heat_flow": "kW"}),
                ),
            )
            .required(Field::Geometry.name())
            .required(Field::AmbientTemperature.name())
            .additional_properties(Some(AdditionalProperties::FreeForm(false)))
            .into()
    }
}

impl ToSchema for FilmRequest {
    fn name() -> Cow<'static, str> {
        "FilmRequest".into()
    }

    fn schemas(schemas: &mut Schemas) {
        schemas.push(("FluidTable".to_owned(), fluid_table()));
        let columns = COLUMNS.iter().map(|&(_, kind)| kind);
        for kind in Field::ALL
            .iter()
            .filter_map(|field| field.kind())
            .chain(columns)
        {
            let name = kind_schema_name(kind);
            if !schemas.iter().any(|(known, _)| *known == name) {
                schemas.push((name, quantity(kind).into()));
            }
        }
    }
}

/// A fluid's id, or a table of the caller's own.
fn fluid_or_table() -> RefOr<Schema> {
    let entry = Field::Fluid.entry();
    let text = format!("{}, or a table of the caller's own", entry.text);
    let either = open(fluid_ids(), true).item(reference("FluidTable"));
    described(either, &text, example(entry.example))
}

fn fluid_table() -> RefOr<Schema> {
    let mut object = ObjectBuilder::new()
        .description(Some(
            "A caller's own fluid by temperature, one value a row, at least three rows. Either viscosity or kinematic_viscosity; without an expansion it comes from a smooth fit of the densities.",
        ))
        .additional_properties(Some(AdditionalProperties::FreeForm(false)));
    for (name, kind) in COLUMNS {
        let text = format!("{} of every row", name.replace('_', " "));
        let column = ArrayBuilder::new()
            .items(reference(&kind_schema_name(kind)))
            .schema_type(types(&[Type::Array, Type::Null]))
            .description(Some(text))
            .examples([json!([1.0, 2.0, 3.0])]);
        object = object.property(name, column);
    }
    let nullable_text = |text: &str, shown: &str| {
        ObjectBuilder::new()
            .schema_type(types(&[Type::String, Type::Null]))
            .description(Some(text))
            .examples([json!(shown)])
    };
    object
        .property(
            "source",
            nullable_text("where the figures come from", "data sheet of the supplier"),
        )
        .property(
            "phase",
            closed(&["liquid", "gas"], true)
                .description(Some("liquid when not given"))
                .examples([json!("liquid")]),
        )
        .property(
            "flash_point",
            AnyOfBuilder::new()
                .item(reference(&kind_schema_name(Kind::Temperature)))
                .description(Some("flash point, where there is one"))
                .examples([json!("210 degC")]),
        )
        .required("temperature")
        .required("density")
        .required("specific_heat")
        .required("conductivity")
        .into()
}

fn figure(kind: Kind, nullable: bool, text: &str, shown: Value) -> RefOr<Schema> {
    let kinds = if nullable {
        types(&[Type::Number, Type::Null])
    } else {
        types(&[Type::Number])
    };
    let unit = match kind {
        Kind::Number => String::new(),
        kind => format!(", {} unless asked otherwise", kind.si_unit().symbol()),
    };
    ObjectBuilder::new()
        .schema_type(kinds)
        .description(Some(format!("{text}{unit}")))
        .examples([shown])
        .into()
}

/// An answer as `/v1/film` gives it.
pub struct FilmAnswer;

impl PartialSchema for FilmAnswer {
    fn schema() -> RefOr<Schema> {
        let mut object = ObjectBuilder::new()
            .description(Some("What was found for one case."))
            .property(
                "id",
                ObjectBuilder::new()
                    .schema_type(Type::String)
                    .description(Some("the caller's label, when one was given"))
                    .examples([json!("boiler-house-17")]),
            );
        for &column in Column::ALL {
            let entry = column.entry();
            let shown = example(entry.example);
            let schema = match entry.holds {
                ColumnType::Quantity(kind) => figure(kind, false, entry.text, shown),
                ColumnType::Optional(kind) => figure(kind, true, entry.text, shown),
                ColumnType::Choice(words) => closed(words, false)
                    .description(Some(entry.text))
                    .examples([shown])
                    .into(),
                ColumnType::Method => described(open(method_ids(), false), entry.text, shown),
                ColumnType::Notes => ArrayBuilder::new()
                    .items(reference("Note"))
                    .description(Some(entry.text))
                    .examples([shown])
                    .into(),
            };
            object = object.property(entry.name, schema).required(entry.name);
        }
        for (name, schema, text) in [
            (
                "properties",
                "Properties",
                "the fluid at the method's reference temperature",
            ),
            ("source", "Source", "where the method was published"),
            ("provenance", "Provenance", "what the answer rests on"),
        ] {
            let referenced = AnyOfBuilder::new()
                .item(reference(schema))
                .description(Some(text));
            object = object.property(name, referenced).required(name);
        }
        let alternatives = ArrayBuilder::new()
            .items(reference("Alternative"))
            .description(Some(
                "every other method of the body within or near its range",
            ));
        let basis = ArrayBuilder::new()
            .items(Object::with_type(Type::String))
            .description(Some("what the answer takes for granted"))
            .examples([json!(["Characteristic length: outside diameter."])]);
        let units = ObjectBuilder::new()
            .schema_type(Type::Object)
            .additional_properties(Some(AdditionalProperties::RefOr(RefOr::T(Schema::Object(
                Object::with_type(Type::String),
            )))))
            .description(Some("the unit of every figure that has one"))
            .examples([json!({"heat_transfer_coefficient": "W/(m2 K)"})]);
        object
            .property("alternatives", alternatives)
            .required("alternatives")
            .property("basis", basis)
            .required("basis")
            .property("units", units)
            .required("units")
            .additional_properties(Some(AdditionalProperties::FreeForm(false)))
            .into()
    }
}

impl ToSchema for FilmAnswer {
    fn name() -> Cow<'static, str> {
        "FilmAnswer".into()
    }

    fn schemas(schemas: &mut Schemas) {
        schemas.push(("Note".to_owned(), note()));
        schemas.push(("Alternative".to_owned(), alternative()));
        schemas.push(("Properties".to_owned(), Properties::schema()));
        schemas.push(("Source".to_owned(), source()));
        schemas.push(("Provenance".to_owned(), provenance()));
    }
}

fn word(text: &str, shown: &str) -> ObjectBuilder {
    ObjectBuilder::new()
        .schema_type(Type::String)
        .description(Some(text))
        .examples([json!(shown)])
}

/// An object whose members are all there.
fn object(text: &str, members: Vec<(&str, RefOr<Schema>)>) -> RefOr<Schema> {
    let all = ObjectBuilder::new().description(Some(text));
    members
        .into_iter()
        .fold(all, |object, (name, schema)| {
            object.property(name, schema).required(name)
        })
        .into()
}

fn note() -> RefOr<Schema> {
    let codes = open(NoteCode::TEXTS.iter().copied(), false);
    let field = ObjectBuilder::new()
        .schema_type(types(&[Type::String, Type::Null]))
        .description(Some("the field that the note is about"))
        .examples([json!("surface_temperature")]);
    object(
        "What to know about an answer.",
        vec![
            (
                "code",
                described(
                    codes,
                    "what the note says, for programs; codes may be added",
                    json!("burn-hazard"),
                ),
            ),
            (
                "severity",
                closed(Severity::TEXTS, false)
                    .description(Some("how much it matters"))
                    .examples([json!("warning")])
                    .into(),
            ),
            (
                "text",
                word(
                    "what the note says, for people",
                    "Surface at 160.0 degC: guard it.",
                )
                .into(),
            ),
            ("field", field.into()),
        ],
    )
}

fn alternative() -> RefOr<Schema> {
    let method = open(method_ids(), false);
    object(
        "Another method's result for the same surface.",
        vec![
            (
                "method",
                described(method, "the method", json!("horizontal-cylinder-morgan")),
            ),
            (
                "nusselt",
                figure(Kind::Number, false, "its Nusselt number", json!(20.9)),
            ),
            (
                "heat_transfer_coefficient",
                figure(Kind::Coefficient, false, "its coefficient", json!(7.31)),
            ),
            (
                "range_status",
                closed(RangeStatus::TEXTS, false)
                    .description(Some("how the case lies to its range"))
                    .examples([json!("within")])
                    .into(),
            ),
        ],
    )
}

/// A fluid's properties.
pub struct Properties;

impl PartialSchema for Properties {
    fn schema() -> RefOr<Schema> {
        let members = PROPERTIES.iter().map(|property| {
            let schema = figure(property.kind, false, property.text, json!(0.97));
            (property.name, schema)
        });
        object("A fluid's properties.", members.collect())
    }
}

impl ToSchema for Properties {
    fn name() -> Cow<'static, str> {
        "Properties".into()
    }
}

fn source() -> RefOr<Schema> {
    let year = ObjectBuilder::new()
        .schema_type(Type::Integer)
        .description(Some("year of publication"))
        .examples([json!(1975)]);
    object(
        "Where a method was published.",
        vec![
            (
                "authors",
                word("authors", "Churchill, S. W.; Chu, H. H. S.").into(),
            ),
            ("year", year.into()),
            (
                "work",
                word(
                    "journal and volume, or book",
                    "Int. J. Heat Mass Transfer 18",
                )
                .into(),
            ),
            (
                "locator",
                word("pages, chapter or equation", "1049-1053").into(),
            ),
            (
                "formula",
                word("the formula as text", "Nu = 0.53 Ra^(1/4)").into(),
            ),
        ],
    )
}

fn provenance() -> RefOr<Schema> {
    let digest = |text: &str| word(text, "sha256:0f3a...").into();
    object(
        "What an answer rests on; the same request and digests give the same bytes.",
        vec![
            (
                "service_version",
                word("version of the service", env!("CARGO_PKG_VERSION")).into(),
            ),
            ("tables_digest", digest("digest of the fluids' tables")),
            (
                "registry_digest",
                digest("digest of the registry of methods"),
            ),
            (
                "case_digest",
                digest("digest of the case in SI, however it was written"),
            ),
        ],
    )
}

/// The schema of a fault's code.
pub fn fault_code() -> RefOr<Schema> {
    open(CODES.iter().map(|(code, _)| *code), false)
        .description(Some("what is wrong, for programs; codes may be added"))
        .examples([json!("missing-field")])
        .into()
}

/// A parameter of a query.
pub fn parameter(
    name: &str,
    text: &str,
    required: bool,
    schema: impl Into<RefOr<Schema>>,
) -> Parameter {
    ParameterBuilder::new()
        .name(name)
        .parameter_in(ParameterIn::Query)
        .description(Some(text))
        .required(if required {
            Required::True
        } else {
            Required::False
        })
        .schema(Some(schema))
        .build()
}

/// A parameter of a query that holds a quantity.
pub fn quantity_parameter(name: &str, text: &str, required: bool, kind: Kind) -> Parameter {
    parameter(name, text, required, reference(&kind_schema_name(kind)))
}
