//! Vapour pressure by temperature, and back.

use super::grid::Position;
use super::pchip::{self, Cubic};

/// Halvings of an interval until its width is lost in rounding: 2⁻⁵² of it.
const HALVINGS: u32 = 52;

/// Saturation pressures at a table's leading rows.
///
/// Between rows T ln p is interpolated, which is nearly straight in T (ln p ≈ a − b/T).
pub(super) struct Saturation {
    temperatures: Vec<f64>,
    pressures: Vec<f64>,
    cubics: Vec<Cubic>,
}

impl Saturation {
    /// Through at least three rising, positive pressures at the first of these temperatures.
    pub(super) fn new(temperatures: &[f64], pressures: Vec<f64>) -> Self {
        let temperatures = temperatures[..pressures.len()].to_vec();
        let products: Vec<f64> = temperatures
            .iter()
            .zip(&pressures)
            .map(|(temperature, pressure)| temperature * pressure.ln())
            .collect();
        Self {
            cubics: pchip::cubics(&temperatures, &products),
            temperatures,
            pressures,
        }
    }

    /// The saturation pressure at a place on the table's grid; none beyond the last known row.
    pub(super) fn pressure(&self, position: Position) -> Option<f64> {
        let cubic = self.cubics.get(position.node)?;
        if position.node + 1 == self.cubics.len() && position.offset > 0.0 {
            return None;
        }
        let temperature = self.temperatures[position.node] + position.offset;
        Some((pchip::value(cubic, position.offset) / temperature).exp())
    }

    /// The saturation temperature at a pressure; none outside the known pressures.
    pub(super) fn temperature(&self, pressure: f64) -> Option<f64> {
        let above = self.pressures.partition_point(|&known| known <= pressure);
        let node = above.checked_sub(1)?;
        let start = self.temperatures[node];
        let Some(&end) = self.temperatures.get(above) else {
            return (self.pressures[node] == pressure).then_some(start);
        };
        let logarithm = pressure.ln();
        let (mut low, mut high) = (0.0, end - start);
        for _ in 0..HALVINGS {
            let middle = 0.5 * (low + high);
            if pchip::value(&self.cubics[node], middle) <= (start + middle) * logarithm {
                low = middle;
            } else {
                high = middle;
            }
        }
        Some(start + low)
    }
}

#[cfg(test)]
mod tests {
    use super::super::{Conditions, Fluid, Fluids, State, StateError};

    const ATMOSPHERE: f64 = 101_325.0;

    fn fluid(id: &str) -> &'static Fluid {
        let fluids = Fluids::built_in();
        fluids.get(fluids.find(id).expect("a built-in fluid"))
    }

    fn state(fluid: &Fluid, temperature: f64, pressure: f64) -> Result<State, StateError> {
        fluid.state(temperature, &Conditions::pure(pressure))
    }

    fn saturated(fluid: &Fluid, pressure: f64) -> Option<f64> {
        fluid.saturation_temperature(&Conditions::pure(pressure))
    }

    /// CoolProp 8.0.0, water: saturation at these pressures and temperatures.
    #[test]
    fn water_saturates() {
        let water = fluid("water");
        for (pressure, expected) in [
            (70e3, 363.0817336647414),
            (101_325.0, 373.12429584766636),
            (200e3, 393.3600913279622),
            (1e6, 453.0280078816743),
            (5e6, 537.090721954165),
        ] {
            let found = saturated(water, pressure).expect("in the table");
            assert!((found - expected).abs() < 1e-4, "{found} for {expected}");
            let back = water.saturation_pressure(found).expect("in the table");
            assert!((back / pressure - 1.0).abs() < 1e-12);
        }
        for (temperature, expected) in [(300.0, 3536.8067523441227), (550.0, 6117183.639591112)] {
            let found = water
                .saturation_pressure(temperature)
                .expect("in the table");
            assert!(
                (found / expected - 1.0).abs() < 1e-6,
                "{found} for {expected}"
            );
        }
        assert_eq!(saturated(water, 600.0), None);
        assert_eq!(saturated(water, 9e6), None);
        assert_eq!(water.saturation_pressure(600.0), None);
        assert_eq!(fluid("air").saturation_pressure(300.0), None);
    }

    #[test]
    fn water_boils() {
        let water = fluid("water");
        let saturated = |pressure| saturated(water, pressure).expect("in the table");
        let at_one_atmosphere = StateError::Boils {
            saturation: saturated(ATMOSPHERE),
        };
        assert!(state(water, 373.12, ATMOSPHERE).is_ok());
        assert_eq!(state(water, 373.13, ATMOSPHERE), Err(at_one_atmosphere));
        assert_eq!(state(water, 650.0, ATMOSPHERE), Err(at_one_atmosphere));
        assert!(state(water, 363.0, 70e3).is_ok());
        assert_eq!(
            state(water, 363.2, 70e3),
            Err(StateError::Boils {
                saturation: saturated(70e3)
            })
        );
        assert!(state(water, 300.0, 2.1e6).is_ok());
        assert!(matches!(
            state(water, 300.0, 2.2e6),
            Err(StateError::PressureOutside { .. })
        ));
        assert!(matches!(
            state(water, 300.0, 100.0),
            Err(StateError::PressureOutside { .. })
        ));
        assert_eq!(
            state(water, 600.0, 9e6),
            Err(StateError::AboveTable { maximum: 573.15 })
        );
    }

    #[test]
    fn steam_condenses() {
        let steam = fluid("steam");
        let saturated = |pressure| saturated(steam, pressure).expect("in the table");
        assert!(state(steam, 373.15, ATMOSPHERE).is_ok());
        assert_eq!(
            state(steam, 350.0, ATMOSPHERE),
            Err(StateError::Condenses {
                saturation: saturated(ATMOSPHERE)
            })
        );
        assert_eq!(
            state(steam, 393.0, 200e3),
            Err(StateError::Condenses {
                saturation: saturated(200e3)
            })
        );
        assert!(state(steam, 393.5, 200e3).is_ok());
        assert_eq!(
            state(steam, 360.0, 60e3),
            Err(StateError::BelowTable { minimum: 373.12 })
        );
    }
}
