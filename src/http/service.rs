//! What all handlers share: the fluids and the limits. Nothing in it changes.

use std::time::Duration;

use crate::fluids::Fluids;
use crate::methods::registry_digest;

/// What a request may take.
#[derive(Clone, Copy, Debug)]
pub struct RequestLimits {
    /// Bytes of a body.
    pub body_bytes: usize,
    /// Time for a body to arrive.
    pub body_time: Duration,
}

impl Default for RequestLimits {
    fn default() -> Self {
        RequestLimits {
            body_bytes: 1 << 20,
            body_time: Duration::from_secs(30),
        }
    }
}

/// The state behind the routes.
#[derive(Clone, Copy)]
pub struct Service {
    /// The fluids that requests can name.
    pub fluids: &'static Fluids,
    /// What a request may take.
    pub limits: RequestLimits,
}

impl Service {
    /// These fluids, with these limits. The registry's digest evaluates every method once, so that the first request finds their tables made.
    pub fn new(fluids: &'static Fluids, limits: RequestLimits) -> Self {
        registry_digest();
        Service { fluids, limits }
    }
}
