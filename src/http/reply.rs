//! Bodies of good answers.

use axum::http::{HeaderMap, HeaderValue, StatusCode, header};
use axum::response::{IntoResponse, Response};
use serde::Serialize;

use crate::digest::sha256;

use super::problem::{Problem, ProblemKind};

/// Room for a whole film answer, so that writing it does not move it.
const EXPECTED_BYTES: usize = 6 << 10;

/// The body of a good answer.
pub struct Body {
    content_type: &'static str,
    bytes: Vec<u8>,
}

/// An answer in JSON.
///
/// # Errors
/// The value cannot be written, which is the service's fault.
pub fn json(value: &impl Serialize) -> Result<Body, Problem> {
    let mut bytes = Vec::with_capacity(EXPECTED_BYTES);
    serde_json::to_writer(&mut bytes, value).map_err(internal)?;
    Ok(Body {
        content_type: "application/json",
        bytes,
    })
}

/// JSON that is written already.
pub fn json_text(text: &str) -> Body {
    Body {
        content_type: "application/json",
        bytes: text.as_bytes().to_vec(),
    }
}

/// An answer in plain text.
pub fn text(text: String) -> Body {
    Body {
        content_type: "text/plain; charset=utf-8",
        bytes: text.into_bytes(),
    }
}

/// A page.
pub fn html(page: String) -> Body {
    Body {
        content_type: "text/html; charset=utf-8",
        bytes: page.into_bytes(),
    }
}

/// The refusal after a fault of the service's own; the cause goes to the log alone.
pub fn internal(cause: impl std::fmt::Display) -> Problem {
    tracing::error!(%cause, "an answer could not be written");
    Problem::new(ProblemKind::Internal, "the answer could not be written")
}

impl IntoResponse for Body {
    fn into_response(self) -> Response {
        let content_type = HeaderValue::from_static(self.content_type);
        ([(header::CONTENT_TYPE, content_type)], self.bytes).into_response()
    }
}

/// An answer with its entity tag, or none of it when the caller holds it already.
pub fn tagged(body: Body, request: &HeaderMap) -> Response {
    let digest = sha256(&body.bytes);
    let tag = format!("\"{}\"", &digest["sha256:".len()..][..32]);
    let held = request.get_all(header::IF_NONE_MATCH).iter().any(|value| {
        let mut tags = value.to_str().unwrap_or_default().split(',').map(str::trim);
        tags.any(|held| held == "*" || held.trim_start_matches("W/") == tag)
    });
    let mut response = if held {
        StatusCode::NOT_MODIFIED.into_response()
    } else {
        body.into_response()
    };
    if let Ok(tag) = HeaderValue::from_str(&tag) {
        response.headers_mut().insert(header::ETAG, tag);
    }
    response
}
