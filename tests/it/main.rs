//! The library and the routes, checked from outside.

mod agreement;
mod bodies;
mod continuity;
mod layering;
mod openapi;
mod properties;
mod published;
mod routes;
mod support;
