//! `/v1/geometries`: the bodies and the fields that each asks for.

use axum::extract::State;
use axum::http::HeaderMap;
use axum::response::Response;
use serde::Serialize;
use utoipa::ToSchema;
use utoipa::openapi::{ObjectBuilder, Type};

use crate::fluids::Fluids;
use crate::geometry::{Field, FieldValue, Geometry, GeometryEntry};
use crate::http::extract::AcceptsJson;
use crate::http::openapi::example_request;
use crate::http::problem::Problem;
use crate::http::reply::{json, tagged};
use crate::http::service::Service;
use crate::methods::MethodId;

/// All bodies.
#[derive(Serialize, ToSchema)]
pub struct Geometries<'a> {
    /// Every one of them, in a fixed order.
    geometries: Vec<GeometryView<'a>>,
}

/// One body.
#[derive(Serialize, ToSchema)]
pub struct GeometryView<'a> {
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
    sizes: Vec<SizeView<'a>>,
    /// Fields beside its size that must be given.
    required: Vec<FieldView<'a>>,
    /// Fields of which exactly one must be given; empty where there is no such choice.
    one_of: Vec<FieldView<'a>>,
    /// Fields that may be given.
    optional: Vec<FieldView<'a>>,
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
pub struct SizeView<'a> {
    /// All of these.
    required: Vec<FieldView<'a>>,
    /// At most one of these.
    optional: Vec<FieldView<'a>>,
}

/// One field of a case.
#[derive(Serialize, ToSchema)]
pub struct FieldView<'a> {
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
    choices: Vec<&'a str>,
}

impl<'a> FieldView<'a> {
    fn new(field: Field, geometry: Geometry, fluids: &'a Fluids) -> Self {
        let entry = field.entry();
        let (kind, limits) = match entry.value {
            FieldValue::Quantity(kind, limits) => (Some(kind), Some(limits)),
            _ => (None, None),
        };
        let choices = match entry.value {
            FieldValue::Choice(words) => words.to_vec(),
            FieldValue::Fluid => fluids.iter().map(|(_, fluid)| fluid.id()).collect(),
            FieldValue::Method => methods_of(geometry).collect(),
            FieldValue::Quantity(..) | FieldValue::Label => Vec::new(),
        };
        FieldView {
            name: entry.name,
            text: entry.text,
            kind: kind.map(|kind| kind.name()),
            unit: kind.map(|kind| kind.si_unit().symbol()),
            minimum: limits.map(|limits| limits.minimum),
            maximum: limits.map(|limits| limits.maximum),
            choices,
        }
    }
}

/// `auto` and the methods of a body.
fn methods_of(geometry: Geometry) -> impl Iterator<Item = &'static str> {
    let methods = MethodId::ALL
        .iter()
        .filter(move |id| id.method().geometry == geometry);
    std::iter::once("auto").chain(methods.map(|id| id.as_str()))
}

impl<'a> GeometryView<'a> {
    fn new(geometry: Geometry, entry: &'static GeometryEntry, fluids: &'a Fluids) -> Self {
        let list = |fields: &[Field]| {
            let view = |&field: &Field| FieldView::new(field, geometry, fluids);
            fields.iter().map(view).collect::<Vec<_>>()
        };
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
                    required: list(form.required),
                    optional: list(form.optional),
                })
                .collect(),
            required: list(fields.required),
            one_of: list(fields.one_of),
            optional: list(&fields.optional.concat()),
            example: example_request(geometry),
        }
    }
}

/// All bodies and the fields that each asks for.
#[utoipa::path(
    get, path = "/v1/geometries", operation_id = "list_geometries", tag = "catalogue",
    responses((status = 200, description = "all bodies", body = Geometries))
)]
pub async fn list_geometries(
    State(service): State<Service>,
    _accepts: AcceptsJson,
    headers: HeaderMap,
) -> Result<Response, Problem> {
    let geometries = Geometry::all()
        .map(|(geometry, entry)| GeometryView::new(geometry, entry, service.fluids))
        .collect();
    Ok(tagged(json(&Geometries { geometries })?, &headers))
}
