//! What the registry knows of one published method.

use crate::geometry::{Geometry, choice};

use super::groups::Groups;
use super::range::{Range, RangeStatus, Verdict};

choice! {
    /// How a surface is heated or cooled.
    Heating {
        /// One temperature over the whole surface.
        Isothermal = "isothermal",
        /// One heat flux over the whole surface.
        UniformFlux = "uniform-flux",
        /// The method serves both, with the mean or mid-height temperature difference for a flux.
        Either = "either",
    }
}

choice! {
    /// Which way the layer next to a plate or between two pulls.
    Side {
        /// The method does not depend on it.
        Any = "any",
        /// The layer leaves the surface: warm facing up, or cold facing down; a gap heated from below.
        Unstable = "unstable",
        /// The layer clings to the surface: warm facing down, or cold facing up; a gap heated from above.
        Stable = "stable",
    }
}

/// Where a formula was published.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub struct Source {
    /// Authors.
    pub authors: &'static str,
    /// Year of publication.
    pub year: u16,
    /// Journal and volume, or book.
    pub work: &'static str,
    /// Pages, chapter or equation.
    pub locator: &'static str,
}

/// The temperatures at which a method wants the fluid's properties.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum ReferenceTemperature {
    /// The mean of surface and ambient.
    Film,
    /// Ambient plus a share of the temperature difference.
    Weighted {
        /// Share for all properties but the expansion.
        properties: f64,
        /// Share for the expansion.
        expansion: f64,
    },
}

impl ReferenceTemperature {
    /// Temperatures for the properties and for the expansion, K.
    pub fn temperatures(self, surface: f64, ambient: f64) -> (f64, f64) {
        match self {
            ReferenceTemperature::Film => {
                let film = 0.5 * (surface + ambient);
                (film, film)
            }
            ReferenceTemperature::Weighted {
                properties,
                expansion,
            } => {
                let at = |share: f64| ambient + share * (surface - ambient);
                (at(properties), at(expansion))
            }
        }
    }

    /// The rule in words.
    pub fn text(self) -> String {
        match self {
            ReferenceTemperature::Film => "film: mean of surface and ambient".to_owned(),
            ReferenceTemperature::Weighted {
                properties,
                expansion,
            } => format!(
                "properties at ambient + {properties} x difference, expansion at ambient + {expansion} x difference"
            ),
        }
    }
}

/// The spread of measurements about a method.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum Scatter {
    /// As its source states it, a fraction.
    Stated(f64),
    /// The source states none: 15 % while laminar, 25 % beyond (common practice).
    CommonPractice,
}

impl Scatter {
    /// The fraction, by whether the flow is laminar.
    pub fn fraction(self, laminar: bool) -> f64 {
        match self {
            Scatter::Stated(fraction) => fraction,
            Scatter::CommonPractice if laminar => 0.15,
            Scatter::CommonPractice => 0.25,
        }
    }
}

/// A worked figure that the method must reproduce.
#[derive(Clone, Copy, Debug)]
pub struct Example {
    /// What the formula is entered with.
    pub groups: Groups,
    /// The Nusselt number it gives.
    pub nusselt: f64,
    /// How many of its figures are significant.
    pub figures: u8,
    /// Where the figure comes from.
    pub from: &'static str,
}

/// Where a worked figure comes from when no publication prints one.
pub const COMPUTED: &str = "tests/reference/formulas.py, the formula typed a second time";

/// A published method.
#[derive(Clone, Copy, Debug)]
pub struct Method {
    /// The body it is for.
    pub geometry: Geometry,
    /// The heating it is for.
    pub heating: Heating,
    /// The side of a plate it is for.
    pub side: Side,
    /// Whether it takes part in the automatic choice.
    pub automatic: bool,
    /// The formula as text.
    pub formula: &'static str,
    /// Where it was published.
    pub source: Source,
    /// Where it holds.
    pub ranges: &'static [Range],
    /// Where properties are taken.
    pub reference: ReferenceTemperature,
    /// The spread of data about it.
    pub scatter: Scatter,
    /// Readings of the source that are open, and how far it is from others; empty when there is nothing to say.
    pub remark: &'static str,
    /// A worked figure.
    pub example: Example,
    /// Rayleigh numbers at which the formula changes from one band to the next.
    pub edges: &'static [fn(&Groups) -> f64],
    /// Nusselt number on the characteristic length.
    pub nusselt: fn(&Groups) -> f64,
}

impl Method {
    /// Where a case lies to the method's ranges.
    pub fn verdict(&self, groups: &Groups) -> Verdict {
        Verdict::of(self.ranges, groups)
    }

    /// Whether the formula changes from one band to the next between two Rayleigh numbers.
    pub fn changes_between(&self, groups: &Groups, next: &Groups) -> bool {
        self.edges
            .iter()
            .map(|edge| edge(groups))
            .any(|edge| groups.rayleigh <= edge && edge < next.rayleigh)
    }

    /// Whether the method is for this heating and side.
    pub fn serves(&self, heating: Heating, side: Side) -> bool {
        (self.heating == Heating::Either || self.heating == heating)
            && (self.side == Side::Any || self.side == side)
    }

    /// Whether a case is inside all ranges.
    pub fn holds(&self, groups: &Groups) -> bool {
        self.verdict(groups).status == RangeStatus::Within
    }
}
