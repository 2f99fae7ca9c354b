//! What operators ask: the version, and whether the service lives and is ready.

use axum::extract::State;
use axum::http::HeaderMap;
use axum::response::Response;
use serde::Serialize;
use utoipa::ToSchema;

use crate::http::extract::AcceptsJson;
use crate::http::problem::Problem;
use crate::http::reply::{json, tagged};
use crate::http::service::Service;
use crate::methods::registry_digest;

/// What the service is and what its figures rest on.
#[derive(Serialize, ToSchema)]
pub struct Version<'a> {
    /// Version of the service.
    #[schema(example = "0.1.0")]
    version: &'a str,
    /// Digest of the fluids' tables.
    #[schema(example = "sha256:0f3a...")]
    tables_digest: &'a str,
    /// Digest of the registry of methods.
    #[schema(example = "sha256:0f3a...")]
    registry_digest: &'a str,
}

/// Whether the service is well.
#[derive(Serialize, ToSchema)]
pub struct Health {
    /// `ok`.
    #[schema(example = "ok")]
    status: &'static str,
}

/// Version and digests.
#[utoipa::path(
    get, path = "/v1/version", operation_id = "read_version", tag = "operation",
    responses((status = 200, description = "version and digests", body = Version))
)]
pub async fn read_version(
    State(service): State<Service>,
    _accepts: AcceptsJson,
    headers: HeaderMap,
) -> Result<Response, Problem> {
    let version = Version {
        version: env!("CARGO_PKG_VERSION"),
        tables_digest: service.fluids.digest(),
        registry_digest: registry_digest(),
    };
    Ok(tagged(json(&version)?, &headers))
}

/// Whether the process answers.
#[utoipa::path(
    get, path = "/health/live", operation_id = "read_liveness", tag = "operation",
    responses((status = 200, description = "it does", body = Health))
)]
pub async fn read_liveness(_accepts: AcceptsJson, headers: HeaderMap) -> Result<Response, Problem> {
    Ok(tagged(json(&Health { status: "ok" })?, &headers))
}

/// Whether the service can compute.
#[utoipa::path(
    get, path = "/health/ready", operation_id = "read_readiness", tag = "operation",
    responses((status = 200, description = "the tables are loaded", body = Health))
)]
pub async fn read_readiness(
    State(service): State<Service>,
    _accepts: AcceptsJson,
    headers: HeaderMap,
) -> Result<Response, Problem> {
    let status = if service.fluids.iter().next().is_some() {
        "ok"
    } else {
        "no fluids"
    };
    Ok(tagged(json(&Health { status })?, &headers))
}
