//! The schema of what is answered.

use std::borrow::Cow;

use serde_json::{Value, json};
use utoipa::openapi::RefOr;
use utoipa::openapi::schema::{
    AdditionalProperties, AnyOfBuilder, ArrayBuilder, Object, ObjectBuilder, Schema, Type,
};
use utoipa::{PartialSchema, ToSchema};

use crate::case::{CODES, Column, ColumnType, NoteCode, PROPERTIES, Severity};
use crate::methods::RangeStatus;
use crate::quantity::Kind;

use super::parts::{Schemas, closed, described, example, method_ids, open, reference, types};

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
