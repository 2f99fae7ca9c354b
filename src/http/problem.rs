//! Problem details (RFC 9457): the one form in which the service refuses, and the only place that knows status codes.

use axum::http::{HeaderValue, StatusCode, header};
use axum::response::{IntoResponse, Response};
use serde::Serialize;
use utoipa::ToSchema;

use crate::case::Fault;

macro_rules! kinds {
    ($($(#[$doc:meta])* $kind:ident = $id:literal, $status:ident, $title:literal;)+) => {
        /// What kind of refusal it is.
        #[derive(Clone, Copy, Debug, PartialEq, Eq)]
        pub enum ProblemKind { $($(#[$doc])* $kind,)+ }

        impl ProblemKind {
            /// Every kind.
            pub const ALL: &'static [ProblemKind] = &[$(ProblemKind::$kind,)+];

            /// The word that ends the problem's type.
            pub fn as_str(self) -> &'static str {
                match self { $(ProblemKind::$kind => $id,)+ }
            }

            /// The HTTP status.
            pub fn status(self) -> StatusCode {
                match self { $(ProblemKind::$kind => StatusCode::$status,)+ }
            }

            /// The kind in a few words.
            pub fn title(self) -> &'static str {
                match self { $(ProblemKind::$kind => $title,)+ }
            }
        }
    };
}

kinds! {
    /// The bytes do not parse in their media type.
    Malformed = "malformed", BAD_REQUEST, "The body cannot be parsed";
    /// There is no such resource.
    NotFound = "not-found", NOT_FOUND, "There is no such resource";
    /// The resource does not know the method.
    MethodNotAllowed = "method-not-allowed", METHOD_NOT_ALLOWED, "The resource does not take this method";
    /// No form that the caller accepts exists.
    NotAcceptable = "not-acceptable", NOT_ACCEPTABLE, "No accepted form exists";
    /// The request did not arrive in time.
    Timeout = "timeout", REQUEST_TIMEOUT, "The request did not arrive in time";
    /// The body is too large.
    TooLarge = "too-large", PAYLOAD_TOO_LARGE, "The body is too large";
    /// The body is in no form that the service reads.
    UnsupportedMediaType = "unsupported-media-type", UNSUPPORTED_MEDIA_TYPE, "The body's form is not read here";
    /// The request was read, and has faults.
    Invalid = "invalid", UNPROCESSABLE_ENTITY, "The request has faults";
    /// The service failed.
    Internal = "internal", INTERNAL_SERVER_ERROR, "The service failed";
}

/// A refusal.
#[derive(Clone, Debug)]
pub struct Problem {
    kind: ProblemKind,
    detail: String,
    faults: Vec<Fault>,
}

/// A refusal as it is sent (RFC 9457).
#[derive(Serialize, ToSchema)]
#[schema(as = Problem)]
pub struct ProblemBody<'a> {
    /// Reference to what this kind of problem means.
    #[schema(example = "/docs#problem-invalid")]
    r#type: String,
    /// The kind in a few words.
    #[schema(example = "The request has faults")]
    title: &'a str,
    /// The HTTP status.
    #[schema(example = 422)]
    status: u16,
    /// What happened.
    #[schema(example = "1 fault")]
    detail: &'a str,
    /// All faults of the request.
    errors: Vec<FaultBody<'a>>,
}

/// One fault of a request.
#[derive(Serialize, ToSchema)]
#[schema(as = Fault)]
pub struct FaultBody<'a> {
    /// JSON pointer to the place, as a URI fragment; query parameters as if they were members.
    #[schema(example = "#/diameter")]
    pointer: &'a str,
    /// What is wrong, for programs; codes may be added.
    #[schema(schema_with = crate::http::schema::fault_code)]
    code: &'a str,
    /// What was given, what is wrong, what would do.
    #[schema(example = "diameter is not given; horizontal-cylinder takes diameter [length]")]
    detail: &'a str,
}

impl Problem {
    /// A refusal without a list of faults.
    pub fn new(kind: ProblemKind, detail: impl Into<String>) -> Self {
        Problem {
            kind,
            detail: detail.into(),
            faults: Vec::new(),
        }
    }

    /// The refusal of a request with faults.
    pub fn invalid(faults: Vec<Fault>) -> Self {
        let detail = match faults.len() {
            1 => "1 fault".to_owned(),
            count => format!("{count} faults"),
        };
        Problem {
            kind: ProblemKind::Invalid,
            detail,
            faults,
        }
    }

    /// The refusal as one short line for a calculation sheet's cell.
    pub fn cell_text(&self) -> String {
        let mut details = self.faults.iter().map(|fault| fault.detail.as_str());
        match (details.next(), self.faults.len()) {
            (Some(first), 1) => format!("error: {first}"),
            (Some(first), count) => format!("error: {first} (and {} more)", count - 1),
            (None, _) => format!("error: {}", self.detail),
        }
    }

    fn body(&self) -> ProblemBody<'_> {
        ProblemBody {
            r#type: format!("/docs#problem-{}", self.kind.as_str()),
            title: self.kind.title(),
            status: self.kind.status().as_u16(),
            detail: &self.detail,
            errors: self
                .faults
                .iter()
                .map(|fault| FaultBody {
                    pointer: &fault.pointer,
                    code: fault.code,
                    detail: &fault.detail,
                })
                .collect(),
        }
    }
}

impl IntoResponse for Problem {
    fn into_response(self) -> Response {
        // Strings and small numbers always serialize.
        let body = serde_json::to_vec(&self.body()).unwrap_or_default();
        let content_type = HeaderValue::from_static("application/problem+json");
        let mut response = (
            self.kind.status(),
            [(header::CONTENT_TYPE, content_type)],
            body,
        )
            .into_response();
        if matches!(self.kind, ProblemKind::TooLarge | ProblemKind::Timeout) {
            // The rest of the body stays unread, so the connection cannot carry another request.
            let close = HeaderValue::from_static("close");
            response.headers_mut().insert(header::CONNECTION, close);
        }
        response
    }
}
