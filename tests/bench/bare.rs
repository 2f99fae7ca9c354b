//! A bare handler to measure the service against: parses the same request, answers as many bytes, adds no layer.
//!
//! `bare --listen HOST:PORT --bytes N` prints `listening on http://HOST:PORT` when it is ready.

use axum::Router;
use axum::http::header;
use axum::response::IntoResponse;
use axum::routing::post;
use clap::Parser;
use serde::Deserialize;

#[derive(Parser)]
struct Arguments {
    #[arg(long, default_value = "127.0.0.1:0")]
    listen: String,
    #[arg(long, default_value_t = 3000)]
    bytes: usize,
}

/// The fields of the request that the comparison sends.
#[derive(Deserialize)]
struct Case {
    geometry: String,
    diameter: String,
    surface_temperature: String,
    ambient_temperature: String,
    emissivity: f64,
}

#[tokio::main]
async fn main() -> std::io::Result<()> {
    let arguments = Arguments::parse();
    let bytes = arguments.bytes;
    let answer = move |axum::Json(case): axum::Json<Case>| async move {
        let texts = [
            case.geometry,
            case.diameter,
            case.surface_temperature,
            case.ambient_temperature,
        ];
        let read =
            texts.iter().map(String::len).sum::<usize>() + usize::from(case.emissivity > 0.0);
        let text = "0".repeat(bytes.max(read));
        ([(header::CONTENT_TYPE, "application/json")], text).into_response()
    };
    let listener = tokio::net::TcpListener::bind(&arguments.listen).await?;
    println!("listening on http://{}", listener.local_addr()?);
    let router = Router::new().route("/v1/film", post(answer));
    axum::serve(listener, router).await
}
