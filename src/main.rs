//! The program: arguments, logging, and a hand over to the library.

use std::process::ExitCode;

use clap::Parser;
use plumeline::{cli, config::Config};

fn main() -> ExitCode {
    let config = Config::parse();
    tracing_subscriber::fmt()
        .json()
        .flatten_event(true)
        .with_target(false)
        .with_writer(std::io::stderr)
        .init();
    match cli::run(config) {
        Ok(()) => ExitCode::SUCCESS,
        Err(reason) => {
            eprintln!("plumeline: {reason}");
            ExitCode::FAILURE
        }
    }
}
