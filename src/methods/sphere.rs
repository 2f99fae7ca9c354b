//! Spheres, on their diameter.

use crate::geometry::Geometry::Sphere;

use super::entry::{
    COMPUTED, Example, Heating, Method, ReferenceTemperature, Scatter, Side, Source,
};
use super::groups::Groups;
use super::layers::{blend, f9, turbulent_sphere_constant};
use super::range::{Quantity, Range};
use super::sources::HANDBOOK;

pub static CHURCHILL: Method = Method {
    geometry: Sphere,
    heating: Heating::Either,
    side: Side::Any,
    automatic: true,
    formula: "Nu = 2 + 0.589 Ra^(1/4) / [1 + (0.469/Pr)^(9/16)]^(4/9)",
    source: Source {
        authors: "Churchill, S. W.",
        year: 1983,
        work: "Heat Exchanger Design Handbook",
        locator: "sec. 2.5.7",
    },
    ranges: &[
        Range::between(Quantity::Rayleigh, 0.0, 1e11),
        Range::at_least(Quantity::Prandtl, 0.6),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The lower Prandtl end is for gases and above.",
    example: Example {
        groups: Groups::new(1e6, 0.7),
        nusselt: 16.3497,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: laminar,
};

pub static YUGE: Method = Method {
    geometry: Sphere,
    heating: Heating::Either,
    side: Side::Any,
    automatic: false,
    formula: "Nu = 2 + 0.43 Ra^(1/4)",
    source: Source {
        authors: "Yuge, T.",
        year: 1960,
        work: "J. Heat Transfer 82",
        locator: "214-220",
    },
    ranges: &[
        Range::between(Quantity::Rayleigh, 1.0, 1e5).answered_below(),
        Range::at_least(Quantity::Prandtl, 0.6),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "From measurements in air.",
    example: Example {
        groups: Groups::new(1e4, 0.7),
        nusselt: 6.3,
        figures: 3,
        from: "2 plus 0.43 times 10, by hand",
    },
    edges: &[],
    nusselt: |g| 2.0 + 0.43 * g.rayleigh.powf(0.25),
};

pub static RAITHBY_HOLLANDS: Method = Method {
    geometry: Sphere,
    heating: Heating::Either,
    side: Side::Any,
    automatic: true,
    formula: "Nu = (Nu_l^6 + Nu_t^6)^(1/6), Nu_l = 2 + 0.589 Ra^(1/4) / [1 + (0.469/Pr)^(9/16)]^(4/9), Nu_t = C_t Ra^(1/3), C_t the turbulent constant averaged over the surface",
    source: HANDBOOK,
    ranges: &[
        Range::between(Quantity::Rayleigh, 0.0, 1e13),
        Range::at_least(Quantity::Prandtl, 0.6),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The turbulent part by the handbook's surface average beside Churchill's laminar part; the upper end of the range is our own.",
    example: Example {
        groups: Groups::new(1e12, 0.7),
        nusselt: 1042.59,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        blend(
            laminar(g),
            turbulent_sphere_constant(g.prandtl) * g.rayleigh.cbrt(),
            6.0,
        )
    },
};

fn laminar(g: &Groups) -> f64 {
    2.0 + 0.589 * g.rayleigh.powf(0.25) / f9(g.prandtl, 0.469).powf(4.0 / 9.0)
}
