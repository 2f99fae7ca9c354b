//! `/v1/geometries`: the bodies and the fields that each asks for.

use axum::http::HeaderMap;
use axum::response::Response;
use serde::Serialize;
use utoipa::ToSchema;
use utoipa::openapi::{ObjectBuilder, Type};

use crate::geometry::{Field, FieldValue, Geometry, GeometryEntry};
use crate::http::extract::AcceptsJson;
use crate::http::openapi::example_request;
use crate::http::problem::Problem;
use crate::http::reply::{json, tagged};

/// All bodies.
#[derive(Serialize, ToSchema)]
pub struct Geometries {
    /// Every one of them, in a fixed order.
    geometries: Vec<GeometryView>,
}

/// One body.
#[derive(Serialize, ToSchema)]
pub struct GeometryView {
    /// Its id in requests.
    #[schema(example = "horizontal-cylinder")]
    id: &'static str,
    /// Plain words.
    #[schema(example = "lying pipe, rod, cable or wire")]
    name: &'static str,
    /// The length in its Nusselt and Rayleigh numbers.
    #[schema(example = "outside diameter")]
    characteristic_length: &'static str,
    /// What figures per length are per; null where there are none.
    #[schema(example = "length")]
    per_length_of: Option<&'static str>,
    /// The ways to give its size: all required fields, and at most one of the optional ones.
    sizes: Vec<SizeView>,
    /// Fields beside its size that must be given.
    required: Vec<FieldView>,
    /// Fields of which exactly one must be given; empty where there is no such choice.
    one_of: Vec<FieldView>,
    /// Fields that may be given.
    optional: Vec<FieldView>,
    /// An example request.
    #[schema(schema_with = example_schema)]
    example: serde_json::Value,
}

fn example_schema() -> ObjectBuilder {
    ObjectBuilder::new()
        .schema_type(Type::Object)
        .description(Some("An example request."))
        .examples([example_request(Geometry::Sphere)])
}

/// One way to give a body's size.
#[derive(Serialize, ToSchema)]
pub struct SizeView {
    /// All of these.
    required: Vec<FieldView>,
    /// At most one of these.
    optional: Vec<FieldView>,
}

/// One field of a case.
#[derive(Serialize, ToSchema)]
pub struct FieldView {
    /// Its name in requests.
    #[schema(example = "diameter")]
    name: &'static str,
    /// Its meaning.
    #[schema(example = "outside diameter")]
    text: &'static str,
    /// The kind of quantity; null for a text.
    #[schema(example = "length")]
    kind: Option<&'static str>,
    /// The unit of bare numbers; null for a text.
    #[schema(example = "m")]
    unit: Option<&'static str>,
    /// Smallest value in that unit; null for a text.
    #[schema(example = 0.0)]
    minimum: Option<f64>,
    /// Largest value in that unit; null for a text.
    #[schema(example = 10000.0)]
    maximum: Option<f64>,
    /// The words it takes; empty for quantities and free texts.
    #[schema(example = json!([]))]
    choices: Vec<&'static str>,
}

impl FieldView {
    fn new(field: Field) -> Self {
        let entry = field.entry();
        let (kind, limits, choices): (_, _, &[&str]) = match entry.value {
            FieldValue::Quantity(kind, limits) => (Some(kind), Some(limits), &[]),
            FieldValue::Choice(words) => (None, None, words),
            FieldValue::Fluid | FieldValue::Method | FieldValue::Label => (None, None, &[]),
        };
        FieldView {
            name: entry.name,
            text: entry.text,
            kind: kind.map(|kind| kind.name()),
            unit: kind.map(|kind| kind.si_unit().symbol()),
            minimum: limits.map(|limits| limits.minimum),
            maximum: limits.map(|limits| limits.maximum),
            choices: choices.to_vec(),
        }
    }

    fn list<'a>(fields: impl IntoIterator<Item = &'a Field>) -> Vec<Self> {
        fields
            .into_iter()
            .map(|&field| FieldView::new(field))
            .collect()
    }
}

/// All bodies and the fields that each asks for.
#[utoipa::path(
    get, path = "/v1/geometries", operation_id = "list_geometries", tag = "catalogue",
    responses((status = 200, description = "all bodies", body = Geometries))
)]
pub async fn list_geometries(
    _accepts: AcceptsJson,
    headers: HeaderMap,
) -> Result<Response, Problem> {
    let view = |(geometry, entry): (Geometry, &'static GeometryEntry)| {
        let fields = entry.space.fields();
        GeometryView {
            id: geometry.as_str(),
            name: entry.name,
            characteristic_length: entry.characteristic_length,
            per_length_of: entry.per_length_of,
            sizes: entry
                .forms
                .iter()
                .map(|form| SizeView {
                    required: FieldView::list(form.required),
                    optional: FieldView::list(form.optional),
                })
                .collect(),
            required: FieldView::list(fields.required),
            one_of: FieldView::list(fields.one_of),
            optional: FieldView::list(fields.optional.into_iter().flatten()),
            example: example_request(geometry),
        }
    };
    let geometries = Geometry::all().map(view).collect();
    Ok(tagged(json(&Geometries { geometries })?, &headers))
}
