//! The OpenAPI document, built with the routes that it describes.

use std::sync::LazyLock;

use serde_json::{Map, Value, json};
use utoipa::OpenApi;
use utoipa::openapi::RefOr;
use utoipa::openapi::example::ExampleBuilder;
use utoipa_axum::router::OpenApiRouter;
use utoipa_axum::routes;

use crate::geometry::Geometry;

use super::routes::{film, fluids, geometries, methods, operation, pages};
use super::service::Service;

#[derive(OpenApi)]
#[openapi(
    info(
        title = "plumeline",
        description = "Free-convection heat loss of plant surfaces by published methods, with radiation beside it. Figures are estimates for still surroundings; local codes and licensed practice govern. Quantities are bare numbers in SI or texts with a unit.",
    ),
    tags(
        (name = "film", description = "one surface, one answer"),
        (name = "catalogue", description = "bodies, methods and fluids, from the registry that computes"),
        (name = "operation", description = "for those who run the service"),
    )
)]
struct Base;

/// The routes with their descriptions.
pub fn routes() -> OpenApiRouter<Service> {
    OpenApiRouter::with_openapi(Base::openapi())
        .routes(routes!(film::create_film, film::read_film))
        .routes(routes!(geometries::list_geometries))
        .routes(routes!(methods::list_methods))
        .routes(routes!(fluids::list_fluids))
        .routes(routes!(fluids::read_fluid_state))
        .routes(routes!(operation::read_version))
        .routes(routes!(operation::read_liveness))
        .routes(routes!(operation::read_readiness))
        .route("/openapi.json", axum::routing::get(pages::read_openapi))
        .route("/docs", axum::routing::get(pages::read_docs))
        .route("/favicon.ico", axum::routing::get(pages::read_icon))
        .route("/", axum::routing::get(pages::read_front))
}

/// The document as it is served: indented JSON, the same for the same build.
pub fn document() -> &'static str {
    static DOCUMENT: LazyLock<String> = LazyLock::new(|| {
        let mut document = routes().into_openapi();
        add_examples(&mut document);
        document.to_pretty_json().unwrap_or_default() + "\n"
    });
    &DOCUMENT
}

/// The example request of a body.
pub fn example_request(geometry: Geometry) -> Value {
    let entry = geometry.entry();
    let mut request = Map::new();
    request.insert("geometry".to_owned(), json!(geometry.as_str()));
    for (field, value) in entry.example {
        // Examples in the list are JSON, which a test proves.
        let value = serde_json::from_str(value).unwrap_or_default();
        request.insert(field.name().to_owned(), value);
    }
    Value::Object(request)
}

/// One named example a body.
fn add_examples(document: &mut utoipa::openapi::OpenApi) {
    let post = document
        .paths
        .paths
        .get_mut("/v1/film")
        .and_then(|item| item.post.as_mut());
    let Some(RefOr::T(body)) = post.and_then(|post| post.request_body.as_mut()) else {
        return;
    };
    let Some(RefOr::T(content)) = body.content.get_mut("application/json") else {
        return;
    };
    for (geometry, entry) in Geometry::all() {
        let example = ExampleBuilder::new()
            .summary(entry.example_title)
            .value(Some(example_request(geometry)))
            .build();
        content
            .examples
            .insert(geometry.as_str().to_owned(), RefOr::T(example));
    }
}
