//! The program: arguments, logging, and a hand over to the library.

use std::process::ExitCode;

use clap::Parser;
use plumeline::{cli, config::Config, log};

fn main() -> ExitCode {
    let config = Config::parse();
    let log = log::start();
    let outcome = cli::run(config);
    drop(log);
    match outcome {
        Ok(()) => ExitCode::SUCCESS,
        Err(reason) => {
            eprintln!("plumeline: {reason}");
            ExitCode::FAILURE
        }
    }
}
