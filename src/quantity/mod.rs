//! Quantities and units: text such as `"8 in"` to a value in SI and back.
//!
//! The only module that holds a conversion factor. Every factor stands once, beside its
//! word, in `words`; compound units follow from their words, so that `Btu/(h ft2 degF)`
//! needs no number of its own.
//!
//! - [`Kind`]: what a number measures
//! - [`Unit`]: one of the units a kind is read and written in
//! - [`parse`]: a text to a [`Reading`] in SI
//! - [`UnitChoice`]: the units that a request chose for its bare numbers
//! - [`number_text`]: a number as people read it
//! - [`nominal_diameter`], [`looks_nominal`]: nominal pipe sizes
//! - [`nearest`]: the known name that a misspelt one resembles

mod defaults;
mod error;
mod expression;
mod kind;
mod nearest;
mod nominal;
mod number;
mod parse;
mod scale;
#[cfg(test)]
mod tests;
mod text;
mod units;
mod words;

pub use defaults::{ChoiceFault, UnitChoice};
pub use error::QuantityError;
pub use kind::Kind;
pub use nearest::nearest;
pub use nominal::{looks_nominal, nominal_diameter};
pub use parse::{Reading, parse};
pub use text::number_text;
pub use units::Unit;
