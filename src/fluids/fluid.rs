//! A fluid: its table, its pressure rule, its limits and where they come from.

use super::fault::TableFault;
use super::grid::{Grid, Position};
use super::pressure::PressureRule;
use super::read;
use super::saturation::Saturation;
use super::state::{Phase, State, StateError};
use super::table::Table;

/// Temperatures at which a fluid changes or becomes dangerous, where they are known.
///
/// # Units
/// K
#[derive(Clone, Copy, PartialEq, Debug, Default)]
pub struct Limits {
    /// Freezing point.
    pub freezing: Option<f64>,
    /// Flash point.
    pub flash_point: Option<f64>,
}

/// The largest deviation of each property that a table's header states, as a fraction.
#[derive(Clone, Copy, PartialEq, Debug)]
pub struct StatedError {
    /// Of density.
    pub density: f64,
    /// Of specific heat.
    pub specific_heat: f64,
    /// Of viscosity.
    pub viscosity: f64,
    /// Of conductivity.
    pub conductivity: f64,
    /// Of expansion, where it is not small; see [`Fluid::expansion_error_floor`].
    pub expansion: f64,
}

/// What a fluid is and where its table comes from.
pub(super) struct Description {
    pub(super) id: String,
    pub(super) name: String,
    pub(super) phase: Phase,
    pub(super) source: String,
    pub(super) notes: Vec<String>,
    pub(super) limits: Limits,
    pub(super) interpolation_error: Option<StatedError>,
    pub(super) pressure_error: Option<StatedError>,
    pub(super) expansion_error_floor: Option<f64>,
}

/// A fluid as a table by temperature.
pub struct Fluid {
    pub(super) description: Description,
    pub(super) pressure_rule: PressureRule,
    pub(super) grid: Grid,
    pub(super) table: Table,
    pub(super) saturation: Option<Saturation>,
    pub(super) density_maximum: Option<f64>,
}

impl Fluid {
    /// The fluid that the text of a table describes, in the form of the built-in ones.
    ///
    /// # Errors
    /// All faults of the header and of the cells; where there are none, all faults of how the
    /// rows are arranged and of how they fit the header.
    pub fn read(text: &str) -> Result<Self, Vec<TableFault>> {
        read::fluid(text)
    }

    /// The word that requests use.
    pub fn id(&self) -> &str {
        &self.description.id
    }

    /// The fluid in plain words.
    pub fn name(&self) -> &str {
        &self.description.name
    }

    /// Gas or liquid.
    pub fn phase(&self) -> Phase {
        self.description.phase
    }

    /// Where the properties come from.
    pub fn source(&self) -> &str {
        &self.description.source
    }

    /// Remarks on the table, each a sentence or two.
    pub fn notes(&self) -> &[String] {
        &self.description.notes
    }

    /// Freezing and flash point.
    pub fn limits(&self) -> Limits {
        self.description.limits
    }

    /// The table's lowest and highest temperature.
    ///
    /// # Units
    /// K
    pub fn temperatures(&self) -> (f64, f64) {
        (self.grid.minimum(), self.grid.maximum())
    }

    /// The number of temperatures in the table.
    pub fn nodes(&self) -> usize {
        self.grid.nodes().len()
    }

    /// How the table serves pressures, and which.
    pub fn pressure_rule(&self) -> &PressureRule {
        &self.pressure_rule
    }

    /// Deviation between rows from the table's source, where stated.
    pub fn interpolation_error(&self) -> Option<StatedError> {
        self.description.interpolation_error
    }

    /// Deviation of the pressure rule over its whole range, where stated.
    pub fn pressure_error(&self) -> Option<StatedError> {
        self.description.pressure_error
    }

    /// Deviation of a small expansion between rows, where a fraction of it would mean nothing.
    ///
    /// # Units
    /// 1/K
    pub fn expansion_error_floor(&self) -> Option<f64> {
        self.description.expansion_error_floor
    }

    /// Whether a temperature lies within one row of either end of the table, or beyond it.
    ///
    /// # Units
    /// K
    pub fn near_edge(&self, temperature: f64) -> bool {
        self.grid.near_edge(temperature)
    }

    /// The pressure at which the fluid is saturated; none where the table does not hold it.
    ///
    /// # Units
    /// K → Pa
    pub fn saturation_pressure(&self, temperature: f64) -> Option<f64> {
        self.saturation_at(self.grid.locate(temperature)?)
    }

    /// The temperature at which the fluid is saturated; none where the table does not hold it.
    ///
    /// # Units
    /// Pa → K
    pub fn saturation_temperature(&self, pressure: f64) -> Option<f64> {
        self.saturation.as_ref()?.temperature(pressure)
    }

    /// The temperature of the greatest density, where the expansion turns round; none where the
    /// table does not hold one.
    ///
    /// # Units
    /// K
    pub fn density_maximum(&self) -> Option<f64> {
        self.density_maximum
    }

    /// Whether the fluid has changed phase at a temperature and pressure, as far as the table
    /// tells: a liquid above its boiling point, a vapour below its condensation point.
    ///
    /// # Units
    /// K, Pa
    pub fn is_past_saturation(&self, temperature: f64, pressure: f64) -> bool {
        if self.saturation.is_none() {
            return false;
        }
        let (minimum, maximum) = self.temperatures();
        match (self.phase(), self.saturation_pressure(temperature)) {
            (Phase::Liquid, Some(saturation)) => saturation > pressure,
            (Phase::Liquid, None) => temperature > maximum,
            (Phase::Gas, Some(saturation)) => saturation < pressure,
            (Phase::Gas, None) => temperature < minimum,
        }
    }

    /// The lowest and highest temperature at which the fluid has a state at a pressure.
    ///
    /// # Units
    /// Pa → K
    pub fn temperatures_at(&self, pressure: f64) -> (f64, f64) {
        let (minimum, maximum) = self.temperatures();
        match (self.phase(), self.saturation_temperature(pressure)) {
            (Phase::Gas, Some(saturation)) => (minimum.max(saturation), maximum),
            (Phase::Liquid, Some(saturation)) => (minimum, maximum.min(saturation)),
            (_, None) => (minimum, maximum),
        }
    }

    /// The properties at a temperature and an absolute pressure.
    ///
    /// # Units
    /// K, Pa
    ///
    /// # Errors
    /// Outside the table, outside the pressure rule, or on the wrong side of saturation.
    pub fn state(&self, temperature: f64, pressure: f64) -> Result<State, StateError> {
        if !(temperature.is_finite() && pressure.is_finite()) {
            return Err(StateError::NotFinite);
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
        Ok(self.table.state(position, temperature, pressure))
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
        let saturation = self.saturation_temperature(pressure)?;
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
