//! What the program does when it is started.

use std::io::{self, Write};

use tokio::net::TcpListener;
use tokio::signal::unix::{SignalKind, signal};

use crate::config::{Command, Config, ServeConfig};
use crate::fluids::Fluids;
use crate::geometry::Geometry;
use crate::http;

/// Runs a command to its end.
///
/// # Errors
/// What kept it from running, in words.
pub fn run(config: Config) -> Result<(), String> {
    match config.command {
        None => serve(&config.serve),
        Some(Command::Serve(serving)) => serve(&serving),
        Some(Command::Openapi) => {
            print(http::document()).map_err(|error| format!("cannot write: {error}"))
        }
    }
}

fn serve(config: &ServeConfig) -> Result<(), String> {
    let fluids = read_fluids(config)?;
    let runtime = tokio::runtime::Builder::new_multi_thread()
        .enable_all()
        .build()
        .map_err(|error| format!("cannot start: {error}"))?;
    runtime.block_on(async {
        let listener = TcpListener::bind(&config.listen)
            .await
            .map_err(|error| format!("cannot listen on {}: {error}", config.listen))?;
        let address = listener
            .local_addr()
            .map_err(|error| format!("cannot tell the address listened on: {error}"))?;
        let end = end_signal().map_err(|error| format!("cannot wait for signals: {error}"))?;
        let limits = http::RequestLimits {
            body_bytes: config.body_bytes,
            body_time: config.body_timeout,
        };
        let service = http::Service::new(fluids, limits);
        let router = http::router(service);
        let example = http::example_request(Geometry::HorizontalCylinder);
        print(&format!(
            "listening on http://{address}\ncurl -s http://{address}/v1/film -H 'content-type: application/json' -d '{example}'\n"
        ))
        .map_err(|error| format!("cannot write: {error}"))?;
        let limits = http::ConnectionLimits {
            header_time: config.header_timeout,
            drain_time: config.drain_timeout,
        };
        http::serve(listener, router, limits, end)
            .await
            .map_err(|error| format!("cannot go on serving: {error}"))
    })
}

/// The built-in fluids and those of the operator's folder, for as long as the program runs.
fn read_fluids(config: &ServeConfig) -> Result<&'static Fluids, String> {
    let Some(folder) = &config.fluids else {
        return Ok(Fluids::built_in());
    };
    match Fluids::with_folder(folder) {
        Ok(fluids) => Ok(Box::leak(Box::new(fluids))),
        Err(faults) => {
            let told: Vec<_> = faults.iter().map(|fault| format!("\n  {fault}")).collect();
            Err(format!(
                "the fluids in {} are not in order:{}",
                folder.display(),
                told.concat()
            ))
        }
    }
}

/// Resolves at SIGTERM or Ctrl-C.
fn end_signal() -> io::Result<impl Future<Output = ()>> {
    let mut terminate = signal(SignalKind::terminate())?;
    let mut interrupt = signal(SignalKind::interrupt())?;
    Ok(async move {
        tokio::select! {
            _ = terminate.recv() => {}
            _ = interrupt.recv() => {}
        }
    })
}

fn print(text: &str) -> io::Result<()> {
    let mut out = io::stdout().lock();
    out.write_all(text.as_bytes())?;
    out.flush()
}
