//! Serving: deadlines for headers, and an end that lets running requests finish.

use std::io;
use std::time::Duration;

use hyper::server::conn::http1;
use hyper_util::rt::{TokioIo, TokioTimer};
use hyper_util::server::graceful::GracefulShutdown;
use hyper_util::service::TowerToHyperService;
use tokio::net::TcpListener;

use super::observe::Observed;

/// How long connections may take.
#[derive(Clone, Copy, Debug)]
pub struct ConnectionLimits {
    /// For the headers of a request to arrive.
    pub header_time: Duration,
    /// For running requests to finish after the end was asked for.
    pub drain_time: Duration,
}

/// Serves until `end`, then stops listening and lets running requests finish.
///
/// # Errors
/// Listening failed for good.
pub async fn serve(
    listener: TcpListener,
    routes: Observed,
    limits: ConnectionLimits,
    end: impl Future<Output = ()>,
) -> io::Result<()> {
    let mut http = http1::Builder::new();
    http.timer(TokioTimer::new())
        .header_read_timeout(limits.header_time);
    let running = GracefulShutdown::new();
    let mut end = std::pin::pin!(end);
    loop {
        let stream = tokio::select! {
            accepted = listener.accept() => match accepted {
                Ok((stream, _)) => stream,
                Err(error) if is_passing(&error) => {
                    tracing::warn!(%error, "a connection could not be accepted");
                    tokio::time::sleep(Duration::from_millis(50)).await;
                    continue;
                }
                Err(error) => return Err(error),
            },
            () = &mut end => break,
        };
        // Without it small answers wait; where it fails they only wait longer.
        let _ = stream.set_nodelay(true);
        let service = TowerToHyperService::new(routes.clone());
        let connection = http.serve_connection(TokioIo::new(stream), service);
        let connection = running.watch(connection);
        tokio::spawn(async move {
            if let Err(error) = connection.await {
                tracing::debug!(%error, "a connection ended early");
            }
        });
    }
    drop(listener);
    tracing::info!("draining");
    if tokio::time::timeout(limits.drain_time, running.shutdown())
        .await
        .is_err()
    {
        tracing::warn!(
            seconds = limits.drain_time.as_secs_f64(),
            "requests were cut off at the end of the drain time"
        );
    }
    Ok(())
}

/// Whether accepting may succeed again: the connection was at fault, or files are short for now.
fn is_passing(error: &io::Error) -> bool {
    const TOO_MANY_FILES: [i32; 2] = [23, 24];
    matches!(
        error.kind(),
        io::ErrorKind::ConnectionAborted
            | io::ErrorKind::ConnectionReset
            | io::ErrorKind::Interrupted
    ) || error
        .raw_os_error()
        .is_some_and(|code| TOO_MANY_FILES.contains(&code))
}
