//! The properties of a fluid at one temperature and pressure.

use std::fmt;

/// Whether a table holds a gas or a liquid.
#[derive(Clone, Copy, PartialEq, Eq, Debug, Default)]
pub enum Phase {
    /// Density falls with temperature about as 1/T and grows with pressure.
    Gas,
    /// Density hardly changes with pressure.
    #[default]
    Liquid,
}

impl Phase {
    /// `gas` or `liquid`.
    pub fn name(self) -> &'static str {
        match self {
            Self::Gas => "gas",
            Self::Liquid => "liquid",
        }
    }
}

/// Properties of a fluid at one temperature and pressure.
///
/// # Units
/// SI, as named beside each.
#[derive(Clone, Copy, PartialEq, Debug)]
pub struct State {
    /// kg/m³
    pub density: f64,
    /// At constant pressure, J/(kg K).
    pub specific_heat: f64,
    /// Dynamic, Pa s.
    pub viscosity: f64,
    /// W/(m K)
    pub conductivity: f64,
    /// Isobaric, of volume, 1/K; negative for water below its density maximum.
    pub expansion: f64,
}

impl State {
    /// ν = μ/ρ.
    ///
    /// # Units
    /// m²/s
    pub fn kinematic_viscosity(&self) -> f64 {
        self.viscosity / self.density
    }

    /// Thermal diffusivity α = k/(ρ c_p).
    ///
    /// # Units
    /// m²/s
    pub fn diffusivity(&self) -> f64 {
        self.conductivity / (self.density * self.specific_heat)
    }

    /// Pr = μ c_p/k.
    pub fn prandtl(&self) -> f64 {
        self.viscosity * self.specific_heat / self.conductivity
    }
}

/// Why a fluid has no state at a temperature and conditions.
///
/// # Units
/// Temperatures in K, pressures in Pa.
#[derive(Clone, Copy, PartialEq, Debug)]
pub enum StateError {
    /// Colder than the table.
    BelowTable {
        /// The table's lowest temperature.
        minimum: f64,
    },
    /// Hotter than the table.
    AboveTable {
        /// The table's highest temperature.
        maximum: f64,
    },
    /// Outside the pressures that the fluid's pressure rule serves at this temperature.
    PressureOutside {
        /// The lowest pressure served.
        minimum: f64,
        /// The highest pressure served.
        maximum: f64,
    },
    /// A liquid hotter than saturation at this pressure.
    Boils {
        /// The saturation temperature.
        saturation: f64,
    },
    /// A vapour colder than saturation at this pressure.
    Condenses {
        /// The saturation temperature.
        saturation: f64,
    },
    /// A mixture colder than its freezing point at this composition.
    Freezes {
        /// The freezing point.
        freezing: f64,
    },
    /// A composition that the fluid does not have; see [`super::Composition`].
    CompositionOutside {
        /// The least composition.
        minimum: f64,
        /// The largest composition.
        maximum: f64,
    },
    /// The temperature, the pressure or the composition is not a finite number.
    NotFinite,
}

impl fmt::Display for StateError {
    fn fmt(&self, out: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self {
            Self::BelowTable { minimum } => write!(
                out,
                "the temperature is below the fluid's table, which begins at {minimum} K"
            ),
            Self::AboveTable { maximum } => write!(
                out,
                "the temperature is above the fluid's table, which ends at {maximum} K"
            ),
            Self::PressureOutside { minimum, maximum } => write!(
                out,
                "the pressure is outside the fluid's range at this temperature, {minimum:.0} to {maximum:.0} Pa"
            ),
            Self::Boils { saturation } => write!(
                out,
                "the liquid boils: at this pressure it is saturated at {saturation:.2} K"
            ),
            Self::Condenses { saturation } => write!(
                out,
                "the vapour condenses: at this pressure it is saturated at {saturation:.2} K"
            ),
            Self::Freezes { freezing } => write!(
                out,
                "the mixture begins to freeze: at this concentration its freezing point is {freezing:.2} K"
            ),
            Self::CompositionOutside { minimum, maximum } if minimum == maximum => {
                write!(out, "the fluid has no concentration or humidity to choose")
            }
            Self::CompositionOutside { minimum, maximum } => write!(
                out,
                "the concentration or humidity ratio is outside the fluid's range, {minimum} to {maximum}"
            ),
            Self::NotFinite => write!(
                out,
                "the temperature, the pressure or the composition is not a finite number"
            ),
        }
    }
}

impl std::error::Error for StateError {}

#[cfg(test)]
mod tests {
    use super::{State, StateError};

    /// Air at 300 K and 101325 Pa, properties and groups as CoolProp 8.0.0 gives them.
    #[test]
    fn groups_follow_from_properties() {
        let air = State {
            density: 1.1769956,
            specific_heat: 1006.3739,
            viscosity: 1.8537341e-5,
            conductivity: 0.026384466,
            expansion: 0.0033422206,
        };
        for (found, expected) in [
            (air.kinematic_viscosity(), 1.5749711e-5),
            (air.diffusivity(), 2.2274815e-5),
            (air.prandtl(), 0.70706362),
        ] {
            assert!(
                (found / expected - 1.0).abs() < 1e-7,
                "{found} for {expected}"
            );
        }
    }

    #[test]
    fn errors_say_what_would_do() {
        let error = StateError::Boils {
            saturation: 373.124_296,
        };
        assert_eq!(
            error.to_string(),
            "the liquid boils: at this pressure it is saturated at 373.12 K"
        );
        let error = StateError::BelowTable { minimum: 273.15 };
        assert!(error.to_string().ends_with("begins at 273.15 K"));
    }
}
