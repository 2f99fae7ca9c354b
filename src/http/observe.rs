//! One structured log line a request, under an id that the caller sees too.

use std::sync::LazyLock;
use std::sync::atomic::{AtomicU64, Ordering};
use std::time::{Instant, SystemTime, UNIX_EPOCH};

use axum::extract::Request;
use axum::http::{HeaderName, HeaderValue};
use axum::middleware::Next;
use axum::response::Response;

static REQUEST_ID: HeaderName = HeaderName::from_static("x-request-id");

/// Names the request, runs it and logs what became of it.
pub async fn observe(request: Request, next: Next) -> Response {
    let start = Instant::now();
    let given = request
        .headers()
        .get(&REQUEST_ID)
        .filter(|id| is_short_word(id));
    let id = given.cloned().unwrap_or_else(new_id);
    let method = request.method().clone();
    let path = request.uri().path().to_owned();
    let mut response = next.run(request).await;
    tracing::info!(
        request_id = id.to_str().unwrap_or_default(),
        method = method.as_str(),
        path,
        status = response.status().as_u16(),
        microseconds = start.elapsed().as_micros() as u64,
        "request"
    );
    response.headers_mut().insert(REQUEST_ID.clone(), id);
    response
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
