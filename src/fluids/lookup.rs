//! What a fluid answers for a temperature and conditions.

use super::collection::Fluids;
use super::conditions::{Composition, Conditions};
use super::density_maximum::{self, DensityMaximum};
use super::fluid::{Fluid, Limits};
use super::grid::Position;
use super::humid_air;
use super::state::{Phase, State, StateError};
use super::vapour;

impl Fluid {
    /// The properties at a temperature and conditions.
    ///
    /// Humid air keeps its humidity ratio below its dew point, as a layer of air next to a cold
    /// surface does; [`Self::is_past_saturation`] tells.
    ///
    /// # Units
    /// K
    ///
    /// # Errors
    /// Outside the table, the pressure rule or the compositions, below a mixture's freezing
    /// point, or on the wrong side of a pure fluid's saturation.
    pub fn state(&self, temperature: f64, conditions: &Conditions) -> Result<State, StateError> {
        let &Conditions {
            pressure,
            composition,
        } = conditions;
        if !(temperature.is_finite() && pressure.is_finite() && composition.is_finite()) {
            return Err(StateError::NotFinite);
        }
        if composition != 0.0 || matches!(self.composition, Composition::MassFraction { .. }) {
            self.check_composition(temperature, composition)?;
        }
        let Some(position) = self.grid.locate(temperature) else {
            return Err(self.outside(temperature, pressure));
        };
        let saturation = self.saturation_at(position);
        let (minimum, maximum) = self.pressures(saturation);
        if !(minimum..=maximum).contains(&pressure) {
            return Err(self
                .wrong_phase(pressure, saturation)
                .unwrap_or(StateError::PressureOutside { minimum, maximum }));
        }
        let state = self.table.state(position, temperature, conditions);
        if self.is_humid(conditions) {
            Ok(humid_air::state(state, temperature, conditions))
        } else {
            Ok(state)
        }
    }

    /// Freezing and flash point; no freezing point for a composition that the fluid does not
    /// have.
    pub fn limits_at(&self, conditions: &Conditions) -> Limits {
        Limits {
            freezing: self.freezing_at(conditions.composition),
            flash_point: self.description.flash_point,
        }
    }

    /// The pressure at which the pure fluid is saturated; none where the table does not hold it.
    ///
    /// # Units
    /// K → Pa
    pub fn saturation_pressure(&self, temperature: f64) -> Option<f64> {
        self.saturation_at(self.grid.locate(temperature)?)
    }

    /// The temperature at which the fluid is saturated, of humid air the dew point; none where
    /// it is not known.
    ///
    /// # Units
    /// K
    pub fn saturation_temperature(&self, conditions: &Conditions) -> Option<f64> {
        if self.is_humid(conditions) {
            return Fluids::dew_point(conditions.composition, conditions.pressure);
        }
        self.saturation.as_ref()?.temperature(conditions.pressure)
    }

    /// The temperature of the greatest density, where the expansion turns round; none where the
    /// table does not hold one.
    ///
    /// # Units
    /// K
    pub fn density_maximum(&self, conditions: &Conditions) -> Option<f64> {
        match self.density_maximum {
            DensityMaximum::None => None,
            DensityMaximum::At(temperature) => Some(temperature),
            DensityMaximum::ByComposition => {
                let lowest = self.mixture_freezing(conditions.composition).unwrap_or(0.0);
                density_maximum::search(&self.grid, &self.table, conditions, lowest)
            }
        }
    }

    /// Whether the fluid has changed phase at a temperature and conditions, as far as the table
    /// tells: a liquid above its boiling point, a vapour below its condensation point, humid air
    /// below its dew point.
    ///
    /// # Units
    /// K
    pub fn is_past_saturation(&self, temperature: f64, conditions: &Conditions) -> bool {
        if self.is_humid(conditions) {
            let vapour = humid_air::vapour_pressure(conditions.composition, conditions.pressure);
            return vapour::saturation_pressure(temperature)
                .is_some_and(|saturation| saturation < vapour);
        }
        if self.saturation.is_none() {
            return false;
        }
        let pressure = conditions.pressure;
        let (minimum, maximum) = self.temperatures();
        match (self.phase(), self.saturation_pressure(temperature)) {
            (Phase::Liquid, Some(saturation)) => saturation > pressure,
            (Phase::Liquid, None) => temperature > maximum,
            (Phase::Gas, Some(saturation)) => saturation < pressure,
            (Phase::Gas, None) => temperature < minimum,
        }
    }

    /// The lowest and highest temperature at which the fluid has a state under conditions.
    ///
    /// # Units
    /// K
    pub fn temperatures_at(&self, conditions: &Conditions) -> (f64, f64) {
        let (minimum, maximum) = self.temperatures();
        if self.is_humid(conditions) {
            let (coldest, hottest) = humid_air::TEMPERATURES.into_inner();
            return (minimum.max(coldest), maximum.min(hottest));
        }
        if let Some(freezing) = self.mixture_freezing(conditions.composition) {
            return (minimum.max(freezing), maximum);
        }
        match (self.phase(), self.saturation_temperature(conditions)) {
            (Phase::Gas, Some(saturation)) => (minimum.max(saturation), maximum),
            (Phase::Liquid, Some(saturation)) => (minimum, maximum.min(saturation)),
            (_, None) => (minimum, maximum),
        }
    }

    fn is_humid(&self, conditions: &Conditions) -> bool {
        conditions.composition > 0.0 && matches!(self.composition, Composition::Humidity)
    }

    fn freezing_at(&self, composition: f64) -> Option<f64> {
        match self.composition {
            Composition::MassFraction { .. } => self.mixture_freezing(composition),
            _ => self.description.freezing.first().copied(),
        }
    }

    /// The freezing point of a mixture; none for other fluids and outside the mass fractions.
    fn mixture_freezing(&self, composition: f64) -> Option<f64> {
        let Composition::MassFraction {
            minimum, maximum, ..
        } = self.composition
        else {
            return None;
        };
        let known = (minimum..=maximum).contains(&composition);
        let curve = &self.description.freezing;
        (known && !curve.is_empty()).then(|| self.table.across(curve, composition))
    }

    /// What a composition asks beyond the table: that the fluid has it, and has it at this
    /// temperature. Kept out of [`Self::state`], as most fluids need none of it.
    #[cold]
    fn check_composition(&self, temperature: f64, composition: f64) -> Result<(), StateError> {
        let (minimum, maximum) = self.composition.bounds();
        if !(minimum..=maximum).contains(&composition) {
            return Err(StateError::CompositionOutside { minimum, maximum });
        }
        match self.composition {
            Composition::Pure => Ok(()),
            Composition::MassFraction { .. } => match self.mixture_freezing(composition) {
                Some(freezing) if temperature < freezing => Err(StateError::Freezes { freezing }),
                _ => Ok(()),
            },
            Composition::Humidity => {
                let (minimum, maximum) = humid_air::TEMPERATURES.into_inner();
                if composition > 0.0 && temperature < minimum {
                    Err(StateError::BelowTable { minimum })
                } else if composition > 0.0 && temperature > maximum {
                    Err(StateError::AboveTable { maximum })
                } else {
                    Ok(())
                }
            }
        }
    }

    fn saturation_at(&self, position: Position) -> Option<f64> {
        self.saturation.as_ref()?.pressure(position)
    }

    /// The pressures of the rule that lie on this phase's side of saturation.
    fn pressures(&self, saturation: Option<f64>) -> (f64, f64) {
        let (minimum, maximum) = self.pressure_rule.bounds(saturation);
        match (self.phase(), saturation) {
            (_, None) => (minimum, maximum),
            (Phase::Gas, Some(saturation)) => (minimum, maximum.min(saturation)),
            (Phase::Liquid, Some(saturation)) => (minimum.max(saturation), maximum),
        }
    }

    #[cold]
    fn wrong_phase(&self, pressure: f64, saturation: Option<f64>) -> Option<StateError> {
        let saturation = saturation?;
        let changed = match self.phase() {
            Phase::Gas => pressure > saturation,
            Phase::Liquid => pressure < saturation,
        };
        if changed {
            self.phase_change(pressure)
        } else {
            None
        }
    }

    fn phase_change(&self, pressure: f64) -> Option<StateError> {
        let saturation = self.saturation.as_ref()?.temperature(pressure)?;
        Some(match self.phase() {
            Phase::Gas => StateError::Condenses { saturation },
            Phase::Liquid => StateError::Boils { saturation },
        })
    }

    /// The error of a temperature outside the table: a change of phase on the way if there is
    /// one, else the end of the table.
    #[cold]
    fn outside(&self, temperature: f64, pressure: f64) -> StateError {
        let (minimum, maximum) = self.temperatures();
        let (end, towards_saturation) = if temperature < minimum {
            (StateError::BelowTable { minimum }, Phase::Gas)
        } else {
            (StateError::AboveTable { maximum }, Phase::Liquid)
        };
        if self.phase() == towards_saturation {
            self.phase_change(pressure).unwrap_or(end)
        } else {
            end
        }
    }
}
