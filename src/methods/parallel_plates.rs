//! Open channels between upright plates, on their spacing; the difference is wall minus inlet.

use crate::geometry::Geometry::ParallelPlates;

use super::entry::{
    COMPUTED, Example, Heating, Method, ReferenceTemperature, Scatter, Side, Source,
};
use super::groups::Groups;
use super::range::{Quantity, Range};

const BAR_COHEN_ROHSENOW: Source = Source {
    authors: "Bar-Cohen, A.; Rohsenow, W. M.",
    year: 1984,
    work: "J. Heat Transfer 106",
    locator: "116-123",
};

/// Wide channels are answered as the single walls that they tend to.
const RANGES: &[Range] = &[
    Range::between(Quantity::RayleighChannel, 0.0, 1e5).answered_above(),
    Range::at_least(Quantity::Prandtl, 0.6),
];

pub static ISOTHERMAL: Method = Method {
    geometry: ParallelPlates,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: true,
    formula: "Nu = (C1/E^2 + C2/E^(1/2))^(-1/2), E = Ra S/H; both walls heated 576, 2.87; one insulated 144, 2.87",
    source: BAR_COHEN_ROHSENOW,
    ranges: RANGES,
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "A parabolic solution of the channel differs by +10 to -13 %, as much as the condition at the inlet does. Wide channels tend to two single walls.",
    example: Example {
        groups: CHANNEL,
        nusselt: 1.7035,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let e = Quantity::RayleighChannel.of(g);
        let first = if g.heated_walls > 1.0 { 576.0 } else { 144.0 };
        (first / (e * e) + 2.87 / e.sqrt()).powf(-0.5)
    },
};

pub static ELENBAAS: Method = Method {
    geometry: ParallelPlates,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: false,
    formula: "Nu = (E/24) {1 - exp(-35/E)}^(3/4), E = Ra S/H; both walls heated",
    source: Source {
        authors: "Elenbaas, W.",
        year: 1942,
        work: "Physica 9",
        locator: "1-28",
    },
    ranges: &[
        Range::between(Quantity::RayleighChannel, 0.1, 1e5),
        Range::between(Quantity::HeatedWalls, 2.0, 2.0),
        Range::between(Quantity::Prandtl, 0.6, 1.1),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Air. The source takes properties at the wall; the mean is used here.",
    example: Example {
        groups: CHANNEL,
        nusselt: 1.66917,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let e = Quantity::RayleighChannel.of(g);
        e / 24.0 * (-(-35.0 / e).exp_m1()).powf(0.75)
    },
};

pub static UNIFORM_FLUX: Method = Method {
    geometry: ParallelPlates,
    heating: Heating::UniformFlux,
    side: Side::Any,
    automatic: true,
    formula: "Nu = (C1/E* + C2/E*^(2/5))^(-1/2), E* = Ra* S/H = E Nu, with the difference at the top edge; both walls heated 48, 2.51; one insulated 24, 2.51",
    source: BAR_COHEN_ROHSENOW,
    ranges: RANGES,
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Entered with the Rayleigh number of the top edge's difference, for which the printed form is solved.",
    example: Example {
        groups: CHANNEL,
        nusselt: 1.10749,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let first = if g.heated_walls > 1.0 { 48.0 } else { 24.0 };
        uniform_flux(Quantity::RayleighChannel.of(g), first)
    },
};

const CHANNEL: Groups = Groups {
    heated_walls: 2.0,
    ..Groups::new(2e3, 0.7).with_aspect(20.0)
};

/// Solves `C1 Nu/E + C2 Nu^1.6/E^0.4 = 1`, which is the printed form with `E* = E Nu`, by Newton's method from above: the left side is convex and rises.
fn uniform_flux(e: f64, first: f64) -> f64 {
    if e == 0.0 {
        return 0.0;
    }
    let (linear, power) = (first / e, 2.51 / e.powf(0.4));
    let mut nusselt = (1.0 / linear).min(power.powf(-0.625));
    for _ in 0..60 {
        let excess = linear * nusselt + power * nusselt.powf(1.6) - 1.0;
        let slope = linear + 1.6 * power * nusselt.powf(0.6);
        let next = nusselt - excess / slope;
        if next == nusselt {
            break;
        }
        nusselt = next;
    }
    nusselt
}
