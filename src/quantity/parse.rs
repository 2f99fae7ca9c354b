//! A text to a value in SI.

use super::error::{QuantityError, excerpt};
use super::kind::Kind;
use super::number;
use super::units::Unit;

/// What a text said.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Reading {
    /// The value in SI (degrees for angles).
    pub value: f64,
    /// The unit it was written in, or taken to be.
    pub unit: Unit,
    /// Whether it carried no unit of its own.
    pub bare: bool,
}

/// Reads a quantity such as `0.2`, `"8 in"`, `"1 1/2 in"` or `"85 °C"`.
///
/// # Units
/// A bare number is in `default`, a unit of `kind`; the value is in SI, angles in degrees.
///
/// # Errors
/// Every [`QuantityError`]; the text is never read as something it only resembles.
pub fn parse(text: &str, kind: Kind, default: Unit) -> Result<Reading, QuantityError> {
    let (number, rest) = number::read(text, kind)?;
    let symbol = rest.trim();
    let bare = symbol.is_empty();
    let unit = if bare {
        default
    } else {
        Unit::find(kind, symbol)?
    };
    let value = unit.to_si(number);
    if value.is_finite() {
        Ok(Reading { value, unit, bare })
    } else {
        Err(QuantityError::NotFinite {
            given: excerpt(text.trim()),
        })
    }
}
