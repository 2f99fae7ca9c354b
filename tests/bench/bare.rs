//! A bare axum handler to measure the service against: parses the same request as JSON and writes an answer of as many bytes as JSON; no layer, no computation.
//!
//! `bare --listen HOST:PORT --answer FILE` prints `listening on http://HOST:PORT` when it is ready. The file holds the answer, which is read once and written for every request.

use std::path::PathBuf;
use std::sync::Arc;

use axum::response::IntoResponse;
use axum::routing::post;
use axum::{Json, Router};
use clap::Parser;
use serde::Deserialize;
use serde_json::Value;

#[derive(Parser)]
struct Arguments {
    #[arg(long, default_value = "127.0.0.1:0")]
    listen: String,
    #[arg(long)]
    answer: PathBuf,
}

/// The fields of the request that the comparison sends.
#[derive(Deserialize)]
#[allow(dead_code, reason = "parsed, as the service does, and left at that")]
struct Case {
    geometry: String,
    diameter: String,
    length: String,
    surface_temperature: String,
    ambient_temperature: String,
    emissivity: f64,
}

#[tokio::main]
async fn main() -> std::io::Result<()> {
    let arguments = Arguments::parse();
    let answer: Value = serde_json::from_slice(&std::fs::read(&arguments.answer)?)?;
    let answer = Arc::new(answer);
    let handler = move |Json(_case): Json<Case>| {
        let answer = Arc::clone(&answer);
        async move { Json(answer.as_ref()).into_response() }
    };
    let listener = tokio::net::TcpListener::bind(&arguments.listen).await?;
    println!("listening on http://{}", listener.local_addr()?);
    axum::serve(listener, Router::new().route("/v1/film", post(handler))).await
}
