//! Fluids as tables by temperature, and the state of a fluid at a temperature and pressure.
//!
//! A fluid is one table, or one per pressure layer, read from a CSV text with its source, its
//! pressure rule and its limits in the header. Between rows every property follows a
//! shape-preserving cubic; outside the table there is no answer.

mod built_in;
mod fault;
mod fluid;
mod grid;
mod header;
mod pchip;
mod pressure;
mod read;
mod rows;
mod saturation;
mod state;
mod table;

#[cfg(test)]
mod tests;

pub use built_in::{FluidId, Fluids};
pub use fault::TableFault;
pub use fluid::{Fluid, Limits, StatedError};
pub use pressure::PressureRule;
pub use state::{Phase, State, StateError};
