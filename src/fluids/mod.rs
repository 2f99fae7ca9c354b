//! Fluids as tables by temperature, and the state of a fluid at a temperature and conditions.
//!
//! A fluid is one table, or one per layer of pressure or mass fraction, read from a CSV text
//! with its source, its pressure rule and its limits in the header. Between rows every property
//! follows a shape-preserving cubic; outside the table there is no answer. Water vapour in air
//! is mixed by rule.

mod built_in;
mod collection;
mod conditions;
mod density_maximum;
mod fault;
mod fit;
mod fluid;
mod folder;
mod grid;
mod header;
mod humid_air;
mod lookup;
mod own;
mod own_check;
mod pchip;
mod pressure;
mod read;
mod rows;
mod saturation;
mod state;
mod table;
mod vapour;

#[cfg(test)]
mod tests;

pub use collection::{FluidId, Fluids};
pub use conditions::{Composition, Conditions};
pub use fault::{FolderFault, OwnFault, TableFault};
pub use fluid::{Fluid, Limits, StatedError};
pub use humid_air::HumidityError;
pub use own::OwnTable;
pub use pressure::PressureRule;
pub use state::{Phase, State, StateError};
