//! The resources; each file holds its request, its answer, its description and its handlers.

pub mod film;
pub mod fluids;
pub mod geometries;
pub mod methods;
pub mod operation;
pub mod pages;
