//! Pages for people, and the document that describes the rest.

use axum::http::{HeaderMap, HeaderValue, header};
use axum::response::{IntoResponse, Response};

use crate::http::openapi::document;
use crate::http::page;
use crate::http::reply::{html, json_text, tagged};

/// The OpenAPI document.
pub async fn read_openapi(headers: HeaderMap) -> Response {
    tagged(json_text(document()), &headers)
}

/// The reference, written from the OpenAPI document.
pub async fn read_docs(headers: HeaderMap) -> Response {
    tagged(html(page::docs().to_owned()), &headers)
}

/// Links and one example.
pub async fn read_front(headers: HeaderMap) -> Response {
    tagged(html(page::front().to_owned()), &headers)
}

/// The icon.
pub async fn read_icon() -> Response {
    let content_type = HeaderValue::from_static("image/svg+xml");
    ([(header::CONTENT_TYPE, content_type)], page::ICON).into_response()
}
