//! The schema of a case as it is asked.

use std::borrow::Cow;

use serde_json::{Value, json};
use utoipa::openapi::path::{Parameter, ParameterBuilder, ParameterIn};
use utoipa::openapi::schema::{
    AdditionalProperties, AnyOfBuilder, ArrayBuilder, Object, ObjectBuilder, Schema, Type,
};
use utoipa::openapi::{RefOr, Required};
use utoipa::{PartialSchema, ToSchema};

use crate::fluids::Fluids;
use crate::geometry::{Field, FieldValue};
use crate::http::extract::COLUMNS;
use crate::quantity::Kind;

use super::parts::{
    Schemas, closed, described, example, kind_schema_name, method_ids, open, reference, types,
};

/// Text that begins like a number; what follows is the unit.
const QUANTITY_PATTERN: &str = r"^\s*[+\-−]?\s*[0-9.][\s\S]*$";

/// The same, or a nominal pipe size.
const LENGTH_PATTERN: &str = r"^\s*([dD][nN]|[nN][pP][sS])?\s*[+\-−]?\s*[0-9.][\s\S]*$";

/// A quantity as requests carry it.
fn quantity(kind: Kind) -> Schema {
    let units: Vec<_> = kind.units().map(|unit| unit.symbol()).collect();
    let bare = kind.si_unit().symbol();
    let description = format!(
        "{}: a number in {bare} (or in the request's own unit), or text with a unit: {}. Null is not given.",
        kind.name().replace('_', " "),
        units.join(", ")
    );
    let pattern = match kind {
        Kind::Length => LENGTH_PATTERN,
        _ => QUANTITY_PATTERN,
    };
    let last = units.last().copied().unwrap_or(bare);
    Schema::Object(
        ObjectBuilder::new()
            .schema_type(types(&[Type::Number, Type::String, Type::Null]))
            .description(Some(description))
            .pattern(Some(pattern))
            .examples([json!(1.5), json!(format!("1.5 {last}"))])
            .build(),
    )
}

fn fluid_ids() -> impl Iterator<Item = &'static str> {
    Fluids::built_in().iter().map(|(_, fluid)| fluid.id())
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

/// A choice of units for bare numbers or for an answer.
fn unit_choice(text: &str, example: Value) -> RefOr<Schema> {
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
