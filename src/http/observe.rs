//! One structured log line a request, under an id that the caller sees too; a panic is told as a problem.

use std::convert::Infallible;
use std::panic::AssertUnwindSafe;
use std::pin::Pin;
use std::sync::LazyLock;
use std::sync::atomic::{AtomicU64, Ordering};
use std::task::{Context, Poll};
use std::time::{Instant, SystemTime, UNIX_EPOCH};

use axum::Router;
use axum::body::HttpBody;
use axum::http::{HeaderName, HeaderValue, Request};
use axum::response::{IntoResponse, Response};
use bytes::Bytes;
use futures_util::FutureExt;
use tower::Service;

use crate::log::{self, RequestLine};

use super::problem::{Problem, ProblemKind};

static REQUEST_ID: HeaderName = HeaderName::from_static("x-request-id");

/// The routes with what every request gets: it stands around all of them, since a layer in each route costs several times as much.
#[derive(Clone)]
pub struct Observed {
    routes: Router,
}

impl Observed {
    /// Observes these routes.
    pub(super) fn new(routes: Router) -> Self {
        Observed { routes }
    }
}

impl<B> Service<Request<B>> for Observed
where
    B: HttpBody<Data = Bytes> + Send + 'static,
    B::Error: Into<axum::BoxError>,
{
    type Response = Response;
    type Error = Infallible;
    type Future = Pin<Box<dyn Future<Output = Result<Response, Infallible>> + Send>>;

    fn poll_ready(&mut self, _: &mut Context<'_>) -> Poll<Result<(), Infallible>> {
        Poll::Ready(Ok(()))
    }

    fn call(&mut self, request: Request<B>) -> Self::Future {
        let start = Instant::now();
        let given = request
            .headers()
            .get(&REQUEST_ID)
            .filter(|id| is_short_word(id));
        let id = given.cloned().unwrap_or_else(new_id);
        let method = request.method().clone();
        let uri = request.uri().clone();
        let answer = AssertUnwindSafe(self.routes.call(request)).catch_unwind();
        Box::pin(async move {
            // The cause of a panic goes to standard error by the panic hook, not to the caller.
            let mut response = match answer.await {
                Ok(Ok(response)) => response,
                Ok(Err(never)) => match never {},
                Err(_) => Problem::new(ProblemKind::Internal, "the service failed on this request")
                    .into_response(),
            };
            log::request(&RequestLine {
                id: id.to_str().unwrap_or_default(),
                method: method.as_str(),
                path: uri.path(),
                status: response.status().as_u16(),
                time: start.elapsed(),
            });
            response.headers_mut().insert(REQUEST_ID.clone(), id);
            Ok(response)
        })
    }
}

fn is_short_word(id: &HeaderValue) -> bool {
    let allowed = |byte: &u8| byte.is_ascii_alphanumeric() || b"-_.:".contains(byte);
    (1..=64).contains(&id.len()) && id.as_bytes().iter().all(allowed)
}

/// An id that no other request of this process has, and most likely none of another.
fn new_id() -> HeaderValue {
    static NEXT: AtomicU64 = AtomicU64::new(0);
    static PROCESS: LazyLock<u64> = LazyLock::new(|| {
        let now = SystemTime::now()
            .duration_since(UNIX_EPOCH)
            .unwrap_or_default();
        now.as_nanos() as u64 ^ u64::from(std::process::id()).rotate_left(32)
    });
    let number = NEXT.fetch_add(1, Ordering::Relaxed);
    HeaderValue::from_str(&format!("{:016x}-{number:x}", *PROCESS))
        .unwrap_or(HeaderValue::from_static("unnamed"))
}
