//! A JSON body: its media type, its size and the time it takes to arrive.

use axum::body::{Body, HttpBody};
use axum::extract::{FromRequest, Request};
use axum::http::{HeaderMap, header};
use bytes::Bytes;
use http_body_util::{BodyExt, LengthLimitError, Limited};
use tokio::time::timeout;

use crate::http::problem::{Problem, ProblemKind};
use crate::http::service::Service;

/// The bytes of a body that claims to be JSON.
pub struct JsonBody(pub Bytes);

impl FromRequest<Service> for JsonBody {
    type Rejection = Problem;

    async fn from_request(request: Request, service: &Service) -> Result<Self, Problem> {
        check_media_type(request.headers())?;
        let limit = service.limits.body_bytes;
        let body = request.into_body();
        // An announced length is refused before the body is sent.
        if body.size_hint().lower() > limit as u64 {
            return Err(too_large(limit));
        }
        let body = Limited::new(body, limit);
        match timeout(service.limits.body_time, collect(body)).await {
            Ok(Ok(bytes)) => Ok(JsonBody(bytes)),
            Ok(Err(error)) if error.is::<LengthLimitError>() => Err(too_large(limit)),
            Ok(Err(_)) => Err(Problem::new(
                ProblemKind::Malformed,
                "the body broke off before its end",
            )),
            Err(_) => Err(Problem::new(
                ProblemKind::Timeout,
                format!(
                    "the body did not arrive within {} s",
                    service.limits.body_time.as_secs_f64()
                ),
            )),
        }
    }
}

fn too_large(limit: usize) -> Problem {
    Problem::new(
        ProblemKind::TooLarge,
        format!("the body is larger than {limit} bytes; send less at a time"),
    )
}

async fn collect(body: Limited<Body>) -> Result<Bytes, Box<dyn std::error::Error + Send + Sync>> {
    Ok(body.collect().await?.to_bytes())
}

fn check_media_type(headers: &HeaderMap) -> Result<(), Problem> {
    let given = headers
        .get(header::CONTENT_TYPE)
        .map(|value| value.to_str().unwrap_or("unreadable"));
    let media = given
        .and_then(|given| given.split(';').next())
        .map(str::trim);
    match media {
        Some(media) if media.eq_ignore_ascii_case("application/json") => Ok(()),
        other => Err(Problem::new(
            ProblemKind::UnsupportedMediaType,
            match other {
                Some(media) => format!("the body is {media:?}; send application/json"),
                None => "the body has no content type; send application/json".to_owned(),
            },
        )),
    }
}
