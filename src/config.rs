//! Flags and environment, read once into one typed value.

use std::path::PathBuf;
use std::time::Duration;

use clap::{Parser, Subcommand};

/// Free-convection heat loss of plant surfaces, by published methods, over HTTP.
#[derive(Debug, Parser)]
#[command(
    version,
    after_help = "Example:\n  plumeline serve --listen 127.0.0.1:8347"
)]
pub struct Config {
    /// What to do; serve when nothing is said.
    #[command(subcommand)]
    pub command: Option<Command>,
    /// How to serve.
    #[command(flatten)]
    pub serve: ServeConfig,
}

/// What the program can do.
#[derive(Debug, Subcommand)]
pub enum Command {
    /// Serve over HTTP until SIGTERM or Ctrl-C.
    #[command(after_help = "Example:\n  plumeline serve --listen 0.0.0.0:8347")]
    Serve(ServeConfig),
    /// Print the OpenAPI document.
    #[command(after_help = "Example:\n  plumeline openapi > openapi.json")]
    Openapi,
}

/// How to serve.
#[derive(Clone, Debug, Parser)]
pub struct ServeConfig {
    /// Address and port to listen on; port 0 picks a free one.
    #[arg(
        long,
        value_name = "HOST:PORT",
        env = "PLUMELINE_LISTEN",
        default_value = "127.0.0.1:8347"
    )]
    pub listen: String,
    /// Folder with fluids of your own, CSV tables like the built-in ones.
    #[arg(long, value_name = "DIR", env = "PLUMELINE_FLUIDS")]
    pub fluids: Option<PathBuf>,
    /// Largest body that is read, in bytes.
    #[arg(long, value_name = "BYTES", env = "PLUMELINE_BODY_BYTES", default_value_t = 1 << 20)]
    pub body_bytes: usize,
    /// Time for a body to arrive, in seconds.
    #[arg(long, value_name = "SECONDS", env = "PLUMELINE_BODY_TIMEOUT", default_value = "30", value_parser = seconds)]
    pub body_timeout: Duration,
    /// Time for a request's headers to arrive, in seconds.
    #[arg(long, value_name = "SECONDS", env = "PLUMELINE_HEADER_TIMEOUT", default_value = "10", value_parser = seconds)]
    pub header_timeout: Duration,
    /// Time for running requests to finish after SIGTERM, in seconds.
    #[arg(long, value_name = "SECONDS", env = "PLUMELINE_DRAIN_TIMEOUT", default_value = "20", value_parser = seconds)]
    pub drain_timeout: Duration,
}

fn seconds(text: &str) -> Result<Duration, String> {
    let hint = "give seconds above 0 and up to 86400, for example 2.5";
    match text.parse::<f64>() {
        Ok(value) if value > 0.0 && value <= 86_400.0 => Ok(Duration::from_secs_f64(value)),
        _ => Err(hint.to_owned()),
    }
}
