//! A fluid: its table, its pressure rule, its limits and where they come from.

use super::conditions::Composition;
use super::density_maximum::DensityMaximum;
use super::fault::TableFault;
use super::grid::Grid;
use super::pressure::PressureRule;
use super::read;
use super::saturation::Saturation;
use super::state::Phase;
use super::table::Table;

/// Temperatures at which a fluid changes or becomes dangerous, where they are known.
///
/// # Units
/// K
#[derive(Clone, Copy, PartialEq, Debug, Default)]
pub struct Limits {
    /// Freezing point; of a mixture where the first crystals form.
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
    /// None, one, or one per layer of mass fraction.
    pub(super) freezing: Vec<f64>,
    pub(super) flash_point: Option<f64>,
    pub(super) interpolation_error: Option<StatedError>,
    pub(super) pressure_error: Option<StatedError>,
    pub(super) expansion_error_floor: Option<f64>,
    pub(super) digest: String,
}

/// A fluid as a table by temperature.
pub struct Fluid {
    pub(super) description: Description,
    pub(super) composition: Composition,
    pub(super) pressure_rule: PressureRule,
    pub(super) grid: Grid,
    pub(super) table: Table,
    pub(super) saturation: Option<Saturation>,
    pub(super) density_maximum: DensityMaximum,
    pub(super) expansion_is_rough: bool,
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

    /// `sha256:` and the hexadecimal digest of everything the fluid was made of.
    pub fn digest(&self) -> &str {
        &self.description.digest
    }

    /// What the composition in [`super::Conditions`] means for this fluid.
    pub fn composition(&self) -> &Composition {
        &self.composition
    }

    /// The table's lowest and highest temperature, whatever the conditions.
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

    /// Whether the expansion comes from densities too rough for it; see [`super::OwnTable`].
    pub fn expansion_is_rough(&self) -> bool {
        self.expansion_is_rough
    }

    /// Whether a temperature lies within one row of either end of the table, or beyond it.
    ///
    /// # Units
    /// K
    pub fn near_edge(&self, temperature: f64) -> bool {
        self.grid.near_edge(temperature)
    }
}
