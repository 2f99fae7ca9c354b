//! The service over HTTP: the only module that knows it.

mod answer;
mod extract;
mod observe;
mod openapi;
mod page;
mod problem;
mod reply;
mod routes;
mod schema;
mod server;
mod service;

use axum::http::{Method, StatusCode};
use axum::response::{IntoResponse, Response};

use problem::{Problem, ProblemKind};

pub use observe::Observed;
pub use openapi::{document, example_request};
pub use server::{ConnectionLimits, serve};
pub use service::{RequestLimits, Service};

/// All routes, observed: ready to be served or called without a port.
pub fn router(service: Service) -> Observed {
    let (routes, _) = openapi::routes().split_for_parts();
    Observed::new(
        routes
            .fallback(not_found)
            .method_not_allowed_fallback(other_method)
            .with_state(service),
    )
}

async fn not_found(uri: axum::http::Uri) -> Problem {
    let path = crate::case::shown(uri.path());
    Problem::new(
        ProblemKind::NotFound,
        format!("there is nothing at {path}; the calls are listed in /docs"),
    )
}

/// OPTIONS is answered with the methods that the resource takes, all else refused; the router adds `Allow`.
async fn other_method(method: Method) -> Response {
    if method == Method::OPTIONS {
        return StatusCode::NO_CONTENT.into_response();
    }
    Problem::new(
        ProblemKind::MethodNotAllowed,
        format!("{method} is not taken here; the header Allow lists what is"),
    )
    .into_response()
}
