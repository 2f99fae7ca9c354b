//! What the state of a fluid depends on besides its temperature.

/// Pressure and composition of a fluid.
#[derive(Clone, Copy, PartialEq, Debug)]
pub struct Conditions {
    /// Absolute, Pa.
    pub pressure: f64,
    /// What the fluid's [`Composition`] asks for; 0 for a pure fluid and for dry air.
    pub composition: f64,
}

impl Conditions {
    /// A pure fluid, or dry air, at an absolute pressure.
    ///
    /// # Units
    /// Pa
    pub fn pure(pressure: f64) -> Self {
        Self {
            pressure,
            composition: 0.0,
        }
    }
}

/// What the composition of a fluid means.
#[derive(Clone, PartialEq, Debug)]
pub enum Composition {
    /// Always the same: 0.
    Pure,
    /// The mass fraction of one component of a mixture.
    MassFraction {
        /// The component.
        of: String,
        /// The least fraction in the table.
        minimum: f64,
        /// The largest fraction in the table.
        maximum: f64,
    },
    /// The humidity ratio of air: kg of water vapour per kg of dry air, from 0 to
    /// [`Composition::MOST_HUMID`].
    Humidity,
}

impl Composition {
    /// The largest humidity ratio served: air saturated near 90 °C at 0.8 bar, up to where the
    /// mixing rules were compared.
    pub const MOST_HUMID: f64 = 5.0;

    /// The least and the largest composition served.
    pub fn bounds(&self) -> (f64, f64) {
        match *self {
            Self::Pure => (0.0, 0.0),
            Self::MassFraction {
                minimum, maximum, ..
            } => (minimum, maximum),
            Self::Humidity => (0.0, Self::MOST_HUMID),
        }
    }
}
