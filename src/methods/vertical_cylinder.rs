//! The side of upright cylinders, on their height.

use crate::geometry::Geometry::VerticalCylinder;

use super::entry::{
    COMPUTED, Example, Heating, Method, ReferenceTemperature, Scatter, Side, Source,
};
use super::groups::Groups;
use super::layers::{blend, vertical_laminar, vertical_turbulent};
use super::range::{Quantity, Range};
use super::sources::CHURCHILL_CHU_PLATE;
use super::vertical_plate;

pub static POPIEL: Method = Method {
    geometry: VerticalCylinder,
    heating: Heating::Either,
    side: Side::Any,
    automatic: true,
    formula: "Nu = [(K Nu_l)^6 + Nu_t^6]^(1/6): the upright plate's blend, its laminar part times K = 1 + B [32^(1/2) Gr^(-1/4) H/D]^C, B = 0.0571322 + 0.20305 Pr^(-0.43), C = 0.9165 - 0.0043 Pr^(1/2) + 0.01333 ln Pr + 0.0004809/Pr",
    source: Source {
        authors: "Popiel, C. O.; Wojtkowiak, J.; Bober, K.",
        year: 2007,
        work: "Experimental Thermal and Fluid Science 32",
        locator: "607-613",
    },
    ranges: &[
        Range::between(Quantity::Rayleigh, LOWEST_RAYLEIGH, 1e12).answered_below(),
        Range::between(Quantity::Prandtl, 0.01, 100.0),
        Range::between(Quantity::Curvature, 0.0, 5.0),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "K is a fit to Cebeci's 1974 boundary-layer solution, of which it lies within -2.8 to +1.3 % at Pr 0.7 to 6 and +0.5 to +2.6 % at Pr 100, to a bracket of 10; the plate's layers are those of Raithby and Hollands 1998. Below Ra 100 K is held, since the fit grows without bound as Ra tends to 0.",
    example: Example {
        groups: SLENDER,
        nusselt: 68.3009,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: upright,
};

pub static LEFEVRE_EDE: Method = Method {
    geometry: VerticalCylinder,
    heating: Heating::Either,
    side: Side::Any,
    automatic: false,
    formula: "Nu = (4/3) {7 Ra Pr/[5 (20 + 21 Pr)]}^(1/4) + 4 (272 + 315 Pr) H/[35 (64 + 63 Pr) D]",
    source: Source {
        authors: "LeFevre, E. J.; Ede, A. J.",
        year: 1956,
        work: "Proc. 9th Int. Congress of Applied Mechanics 4",
        locator: "175-183",
    },
    ranges: &[
        Range::between(Quantity::Rayleigh, 1e4, 1e9),
        Range::between(Quantity::Curvature, 0.0, 5.0),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Integral method for the laminar layer; +7 to -11 % of a boundary-layer computation. The ranges are those of the laminar layer and of that comparison.",
    example: Example {
        groups: SLENDER,
        nusselt: 65.0728,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let plate = 7.0 * g.rayleigh * g.prandtl / (5.0 * (20.0 + 21.0 * g.prandtl));
        let curvature =
            4.0 * (272.0 + 315.0 * g.prandtl) * g.slenderness / (35.0 * (64.0 + 63.0 * g.prandtl));
        4.0 / 3.0 * plate.powf(0.25) + curvature
    },
};

pub static CHURCHILL_CHU: Method = Method {
    geometry: VerticalCylinder,
    heating: Heating::Either,
    side: Side::Any,
    automatic: false,
    formula: "Nu = {0.825 + 0.387 Ra^(1/6) / [1 + (0.492/Pr)^(9/16)]^(8/27)}^2",
    source: CHURCHILL_CHU_PLATE,
    ranges: &[
        Range::between(Quantity::Rayleigh, 0.1, 1e12).answered_below(),
        Range::between(Quantity::Curvature, 0.0, 0.16),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The upright plate's form for thick cylinders, D/H of at least 35/Gr^(1/4) (common practice; a 5 % criterion for gases).",
    example: Example {
        groups: Groups::new(7.65e8, 0.7202).with_slenderness(2.0),
        nusselt: 113.3,
        figures: 4,
        from: "Cengel, Heat Transfer, example 9-2 (from memory; a plate)",
    },
    edges: &[],
    nusselt: |g| vertical_plate::full_range(g, 0.492),
};

const SLENDER: Groups = Groups::new(1e8, 0.7).with_slenderness(20.0);

/// The Rayleigh number below which the gain is held: the fit grows without bound as it tends to 0.
const LOWEST_RAYLEIGH: f64 = 1e2;

/// How much a laminar layer gains by bending around an upright cylinder.
///
/// # Source
/// Popiel, Wojtkowiak, Bober 2007.
pub fn curvature_factor(g: &Groups) -> f64 {
    let b = 0.0571322 + 0.20305 * g.prandtl.powf(-0.43);
    let c = 0.9165 - 0.0043 * g.prandtl.sqrt() + 0.01333 * g.prandtl.ln() + 0.0004809 / g.prandtl;
    let held = g.at_rayleigh(g.rayleigh.max(LOWEST_RAYLEIGH));
    1.0 + b * held.curvature().powf(c)
}

/// The upright plate's blend with the gain in its laminar part.
pub(super) fn upright(g: &Groups) -> f64 {
    blend(
        curvature_factor(g) * vertical_laminar(g.rayleigh, g.prandtl),
        vertical_turbulent(g.rayleigh, g.prandtl),
        6.0,
    )
}
