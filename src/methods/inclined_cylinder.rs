//! Cylinders between upright and lying, on their length.

use crate::geometry::Geometry::InclinedCylinder;

use super::entry::{
    COMPUTED, Example, Heating, Method, ReferenceTemperature, Scatter, Side, Source,
};
use super::groups::Groups;
use super::range::{Quantity, Range};
use super::sources::HANDBOOK;
use super::{horizontal_cylinder, vertical_cylinder};

pub static RAITHBY_HOLLANDS: Method = Method {
    geometry: InclinedCylinder,
    heating: Heating::Either,
    side: Side::Any,
    automatic: true,
    formula: "Nu = max{Nu_v(Ra cos t), Nu_h(Ra sin t (D/L)^3) L/D}: Nu_v the upright cylinder's automatic method on the length L, Nu_h the lying cylinder's on the diameter D, t the tilt from vertical",
    source: HANDBOOK,
    ranges: &[
        Range::between(Quantity::Rayleigh, 1e4, 1e13).answered_below(),
        Range::between(Quantity::Prandtl, 0.01, 100.0),
        Range::between(Quantity::Curvature, 0.0, 5.0).answered_above(),
        Range::between(Quantity::Tilt, 0.0, 90.0),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The larger heat flow of the lying cylinder with gravity across it and the upright one with gravity along it: the source's rule for inclined plates, carried over by analogy.",
    example: Example {
        groups: LEANING,
        nusselt: 180.505,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let upright = vertical_cylinder::upright(&g.at_rayleigh(g.rayleigh_along()));
        let across = g.rayleigh * g.tilt.to_radians().sin() / g.slenderness.powi(3);
        let lying = horizontal_cylinder::full_range(&g.at_rayleigh(across));
        upright.max(lying * g.slenderness)
    },
};

pub static AL_ARABI_KHAMIS: Method = Method {
    geometry: InclinedCylinder,
    heating: Heating::Either,
    side: Side::Any,
    automatic: false,
    formula: "Nu = [2.9 - 2.32 (sin t)^0.8] Gr_D^(-1/12) Ra^(1/4 + (1/12)(sin t)^1.2) to Ra 2.6e9 + 1.1e9 tan t, [0.47 + 0.11 (sin t)^0.8] Gr_D^(-1/12) Ra^(1/3) beyond",
    source: Source {
        authors: "Al-Arabi, M.; Khamis, M.",
        year: 1982,
        work: "Int. J. Heat Mass Transfer 25",
        locator: "3-15",
    },
    ranges: &[
        Range::between(Quantity::Rayleigh, 9.88e7, 2.95e10),
        Range::between(Quantity::DiameterGrashof, 1.08e4, 6.9e5),
        Range::between(Quantity::Prandtl, 0.6, 1.1),
        Range::between(Quantity::Tilt, 0.0, 90.0),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Air. 25 to 90 % above the other methods at the two ends of the tilt. The Rayleigh range is from memory. At 45 degrees the bands step by -9.4 %.",
    example: Example {
        groups: LEANING,
        nusselt: 270.063,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[transition],
    nusselt: |g| {
        let sine = g.tilt.to_radians().sin();
        // Gr_D^(-1/12) is this times Ra^(-1/12).
        let diameter = (g.prandtl * g.slenderness.powi(3)).powf(1.0 / 12.0);
        if g.rayleigh <= transition(g) {
            let exponent = (2.0 + sine.powf(1.2)) / 12.0;
            (2.9 - 2.32 * sine.powf(0.8)) * diameter * g.rayleigh.powf(exponent)
        } else {
            (0.47 + 0.11 * sine.powf(0.8)) * diameter * g.rayleigh.powf(0.25)
        }
    },
};

/// Rayleigh number at which Al-Arabi and Khamis' layer turns turbulent.
fn transition(g: &Groups) -> f64 {
    2.6e9 + 1.1e9 * g.tilt.to_radians().tan()
}

const LEANING: Groups = Groups::new(2e9, 0.7).with_slenderness(20.0).tilted(45.0);
