//! Air with water vapour in it.
//!
//! The mixing rules take real dry air at the total pressure and vapour that departs from an
//! ideal gas as it does at its own partial pressure, saturation at most. Against CoolProp's
//! `HAPropsSI` at the same humidity ratio, 0 to 90 °C, 10 to 99 % relative humidity, 0.8 to
//! 1.2 bar: density within 0.06 %, specific heat 0.7 %, expansion 0.5 %, viscosity 2.4 % and
//! conductivity 4.0 %. For the last two that library takes the vapour saturated at the total
//! pressure, near 100 °C, whatever the air's temperature; with vapour of the air's temperature
//! the same rules agree within 0.001 %.

use std::fmt;
use std::ops::RangeInclusive;

use super::conditions::{Composition, Conditions};
use super::state::State;
use super::vapour;

/// Temperatures at which humid air is served, K: from where frost leaves hardly any vapour to
/// the end of the vapour's viscosity equation, 900 °C (IAPWS R12-08).
pub(super) const TEMPERATURES: RangeInclusive<f64> = 223.15..=1173.15;

/// Molar mass of dry air, kg/mol: Lemmon et al. 2000, J. Phys. Chem. Ref. Data 29, 331-385.
const AIR_MOLAR_MASS: f64 = 0.028_965_46;

/// kg of vapour per kg of dry air when there are as many moles of each.
const MASS_RATIO: f64 = vapour::MOLAR_MASS / AIR_MOLAR_MASS;

/// Why a relative humidity has no humidity ratio.
///
/// # Units
/// Temperatures in K, pressures in Pa.
#[derive(Clone, Copy, PartialEq, Debug)]
pub enum HumidityError {
    /// The relative humidity is not between 0 and 1.
    RelativeHumidityOutside,
    /// Outside the temperatures at which vapour is saturated and humid air is served.
    TemperatureOutside {
        /// The lowest temperature.
        minimum: f64,
        /// The highest temperature.
        maximum: f64,
    },
    /// The vapour leaves too little room for air at this pressure.
    TooMuchVapour {
        /// The pressure of the vapour.
        vapour_pressure: f64,
        /// The most vapour served at this pressure.
        maximum: f64,
    },
    /// One of the numbers is not finite, or the pressure is not positive.
    NotFinite,
}

impl fmt::Display for HumidityError {
    fn fmt(&self, out: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self {
            Self::RelativeHumidityOutside => {
                write!(out, "a relative humidity lies between 0 and 1")
            }
            Self::TemperatureOutside { minimum, maximum } => write!(
                out,
                "relative humidity is served from {minimum} K to {maximum} K"
            ),
            Self::TooMuchVapour {
                vapour_pressure,
                maximum,
            } => write!(
                out,
                "the vapour's pressure is {vapour_pressure:.0} Pa, and humid air is served up to {maximum:.0} Pa of vapour at this pressure"
            ),
            Self::NotFinite => write!(
                out,
                "the humidity, the temperature or the pressure is not a finite number, or the pressure is not positive"
            ),
        }
    }
}

impl std::error::Error for HumidityError {}

/// The humidity ratio of a relative humidity, see [`super::Fluids::humidity_ratio`].
pub(super) fn humidity_ratio(
    relative_humidity: f64,
    temperature: f64,
    pressure: f64,
) -> Result<f64, HumidityError> {
    let numbers = [relative_humidity, temperature, pressure];
    if !numbers.iter().all(|number| number.is_finite()) || pressure <= 0.0 {
        return Err(HumidityError::NotFinite);
    }
    if !(0.0..=1.0).contains(&relative_humidity) {
        return Err(HumidityError::RelativeHumidityOutside);
    }
    let (minimum, maximum) = (*TEMPERATURES.start(), *vapour::SATURATED.end());
    let saturation = vapour::saturation_pressure(temperature)
        .filter(|_| temperature >= minimum)
        .ok_or(HumidityError::TemperatureOutside { minimum, maximum })?;
    let vapour_pressure = relative_humidity * saturation;
    let maximum = mole_fraction(Composition::MOST_HUMID) * pressure;
    if vapour_pressure > maximum {
        return Err(HumidityError::TooMuchVapour {
            vapour_pressure,
            maximum,
        });
    }
    let ratio = MASS_RATIO * vapour_pressure / (pressure - vapour_pressure);
    Ok(ratio.min(Composition::MOST_HUMID))
}

/// The pressure of the vapour alone.
///
/// # Units
/// kg of vapour per kg of dry air, Pa → Pa
pub(super) fn vapour_pressure(humidity_ratio: f64, pressure: f64) -> f64 {
    mole_fraction(humidity_ratio) * pressure
}

fn mole_fraction(humidity_ratio: f64) -> f64 {
    humidity_ratio / (humidity_ratio + MASS_RATIO)
}

/// Humid air at a temperature, from dry air there.
///
/// Density and specific heat add up by mass, v = v_a + W v_v with v_v = R T/p + B p_v/p; the
/// expansion is that of the mixture, (∂v/∂T)/v at constant pressure and humidity ratio.
///
/// # Units
/// K
///
/// # Source
/// Viscosity: Wilke 1950, J. Chem. Phys. 18, 517-519. Conductivity: Wassiljewa 1904, with
/// Wilke's factors as proposed by Mason & Saxena 1958, Phys. Fluids 1, 361-369.
pub(super) fn state(dry: State, temperature: f64, conditions: &Conditions) -> State {
    let Conditions {
        pressure,
        composition: ratio,
    } = *conditions;
    let share = mole_fraction(ratio);
    let saturation = vapour::saturation_pressure(temperature).unwrap_or(f64::INFINITY);
    let vapour_pressure = (share * pressure).min(saturation);

    let virial = vapour::virial(temperature);
    let ideal = vapour::GAS_CONSTANT * temperature / pressure;
    let crowding = vapour_pressure / pressure;
    let volume = 1.0 / dry.density + ratio * (ideal + crowding * virial.value);
    let volume_slope =
        dry.expansion / dry.density + ratio * (ideal + crowding * virial.slope) / temperature;
    let vapour_heat =
        vapour::ideal_specific_heat(temperature) - virial.curvature * vapour_pressure / temperature;

    let vapour_viscosity = vapour::viscosity(temperature);
    let air_hindered = wilke(dry.viscosity / vapour_viscosity, 1.0 / MASS_RATIO);
    let vapour_hindered = wilke(vapour_viscosity / dry.viscosity, MASS_RATIO);
    let mix = |air: f64, vapour: f64| {
        let air_share = 1.0 - share;
        air_share * air / (air_share + share * air_hindered)
            + share * vapour / (share + air_share * vapour_hindered)
    };
    State {
        density: (1.0 + ratio) / volume,
        specific_heat: (dry.specific_heat + ratio * vapour_heat) / (1.0 + ratio),
        viscosity: mix(dry.viscosity, vapour_viscosity),
        conductivity: mix(dry.conductivity, vapour::conductivity(temperature)),
        expansion: volume_slope / volume,
    }
}

/// Wilke's factor of a gas beside another, by the ratios of their viscosities and molar masses.
fn wilke(viscosities: f64, masses: f64) -> f64 {
    let sum = 1.0 + viscosities.sqrt() * masses.powf(-0.25);
    sum * sum / (8.0 * (1.0 + masses)).sqrt()
}
