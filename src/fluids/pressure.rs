//! How a table by temperature answers for other pressures.

use std::fmt;

/// How a fluid's table serves pressures, and which.
///
/// # Units
/// Pa
#[derive(Clone, Copy, PartialEq, Debug)]
pub enum PressureRule {
    /// Tabulated at several pressures; between them every property is a Lagrange polynomial in
    /// pressure, as a virial series is.
    Layers {
        /// The first layer's pressure.
        minimum: f64,
        /// The last layer's pressure.
        maximum: f64,
    },
    /// Tabulated at one pressure; density in proportion to pressure, the rest unchanged.
    IdealGas {
        /// The table's pressure.
        reference: f64,
        /// The lowest pressure served.
        minimum: f64,
        /// The highest pressure served.
        maximum: f64,
    },
    /// Tabulated at one pressure and taken as it stands at others.
    Incompressible {
        /// The table's pressure.
        reference: f64,
        /// The lowest pressure served.
        minimum: f64,
        /// The highest pressure served.
        maximum: f64,
    },
    /// A liquid tabulated along the larger of a reference pressure and its saturation pressure;
    /// taken as incompressible from saturation up to `headroom` above the tabulated pressure.
    AlongSaturation {
        /// The pressure of the table where the liquid does not boil at it.
        reference: f64,
        /// How far above the tabulated pressure the table serves.
        headroom: f64,
    },
}

impl PressureRule {
    /// The word for the rule in a table's header.
    pub fn name(&self) -> &'static str {
        match self {
            Self::Layers { .. } => "layers",
            Self::IdealGas { .. } => "ideal-gas",
            Self::Incompressible { .. } => "incompressible",
            Self::AlongSaturation { .. } => "along-saturation",
        }
    }

    /// The pressure of a table that holds one; of layers the first.
    pub(super) fn reference(&self) -> f64 {
        match *self {
            Self::Layers { minimum, .. } => minimum,
            Self::IdealGas { reference, .. }
            | Self::Incompressible { reference, .. }
            | Self::AlongSaturation { reference, .. } => reference,
        }
    }

    /// The lowest and highest pressure served at a temperature with this saturation pressure.
    pub(super) fn bounds(&self, saturation: Option<f64>) -> (f64, f64) {
        match *self {
            Self::Layers { minimum, maximum }
            | Self::IdealGas {
                minimum, maximum, ..
            }
            | Self::Incompressible {
                minimum, maximum, ..
            } => (minimum, maximum),
            Self::AlongSaturation {
                reference,
                headroom,
            } => {
                let lowest = saturation.unwrap_or(reference);
                (lowest, lowest.max(reference) + headroom)
            }
        }
    }
}

impl fmt::Display for PressureRule {
    fn fmt(&self, out: &mut fmt::Formatter<'_>) -> fmt::Result {
        match *self {
            Self::Layers { minimum, maximum } => {
                write!(out, "tabulated from {minimum} Pa to {maximum} Pa")
            }
            Self::IdealGas {
                reference,
                minimum,
                maximum,
            } => write!(
                out,
                "tabulated at {reference} Pa; density in proportion to pressure from {minimum} Pa to {maximum} Pa"
            ),
            Self::Incompressible {
                reference,
                minimum,
                maximum,
            } => write!(
                out,
                "tabulated at {reference} Pa and taken as incompressible from {minimum} Pa to {maximum} Pa"
            ),
            Self::AlongSaturation {
                reference,
                headroom,
            } => write!(
                out,
                "tabulated at the larger of {reference} Pa and saturation; taken as incompressible from saturation to {headroom} Pa above"
            ),
        }
    }
}
