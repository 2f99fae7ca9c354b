//! Whether the caller takes the form in which answers are sent.

use axum::extract::FromRequestParts;
use axum::http::header;
use axum::http::request::Parts;

use crate::http::problem::{Problem, ProblemKind};

/// Proof that the caller accepts JSON; a browser that asks for a page gets it too.
pub struct AcceptsJson;

const ACCEPTED: [&str; 6] = [
    "*/*",
    "application/*",
    "application/json",
    "application/problem+json",
    "text/*",
    "text/html",
];

impl<S: Sync> FromRequestParts<S> for AcceptsJson {
    type Rejection = Problem;

    async fn from_request_parts(parts: &mut Parts, _: &S) -> Result<Self, Problem> {
        let mut given = parts.headers.get_all(header::ACCEPT).iter().peekable();
        if given.peek().is_none() || given.any(|value| value.to_str().is_ok_and(takes_json)) {
            return Ok(AcceptsJson);
        }
        Err(Problem::new(
            ProblemKind::NotAcceptable,
            "the answer is application/json; accept that or */*",
        ))
    }
}

fn takes_json(accept: &str) -> bool {
    accept.trim().is_empty()
        || accept.split(',').any(|range| {
            let mut parts = range.split(';').map(str::trim);
            let media = parts.next().unwrap_or_default().to_ascii_lowercase();
            let refused = parts.any(|parameter| {
                parameter
                    .strip_prefix("q=")
                    .is_some_and(|weight| weight.parse::<f32>() == Ok(0.0))
            });
            !refused && ACCEPTED.contains(&media.as_str())
        })
}

#[cfg(test)]
mod tests {
    use super::takes_json;

    #[test]
    fn browsers_and_programs_are_served() {
        assert!(takes_json("text/html,application/xhtml+xml,*/*;q=0.8"));
        assert!(takes_json("application/json"));
        assert!(takes_json("text/csv, application/*;q=0.2"));
        assert!(!takes_json("image/png"));
        assert!(!takes_json("application/json;q=0, image/png"));
    }
}
