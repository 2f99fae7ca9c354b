//! Between concentric cylinders and spheres: k_eff/k, on the source's own length.

use crate::geometry::Geometry::{ConcentricCylinders, ConcentricSpheres};

use super::entry::{
    COMPUTED, Example, Heating, Method, ReferenceTemperature, Scatter, Side, Source,
};
use super::groups::Groups;
use super::range::{Quantity, Range};

const RAITHBY_HOLLANDS: Source = Source {
    authors: "Raithby, G. D.; Hollands, K. G. T.",
    year: 1975,
    work: "Advances in Heat Transfer 11",
    locator: "265-315",
};

pub static CYLINDERS: Method = Method {
    geometry: ConcentricCylinders,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: true,
    formula: "k_eff/k = max{1, 0.386 [Pr/(0.861 + Pr)]^(1/4) Ra^(1/4)}, Ra on L = 2 [ln(r_o/r_i)]^(4/3)/(r_i^(-3/5) + r_o^(-3/5))^(5/3)",
    source: RAITHBY_HOLLANDS,
    ranges: &[
        Range::between(Quantity::Rayleigh, 1e2, 1e7).answered_below(),
        Range::between(Quantity::Prandtl, 0.6, 6000.0),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The lower Prandtl end is for gases and above.",
    example: Example {
        groups: Groups::new(1e5, 0.7),
        nusselt: 5.61709,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| enclosed(0.386, g),
};

pub static SPHERES: Method = Method {
    geometry: ConcentricSpheres,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: true,
    formula: "k_eff/k = max{1, 0.74 [Pr/(0.861 + Pr)]^(1/4) Ra^(1/4)}, Ra on L = (1/r_i - 1/r_o)^(4/3)/{2^(1/3) (r_i^(-7/5) + r_o^(-7/5))^(5/3)}",
    source: RAITHBY_HOLLANDS,
    ranges: &[
        Range::between(Quantity::Rayleigh, 0.0, 1e4),
        Range::between(Quantity::Prandtl, 0.6, 4000.0),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The lower Prandtl end is for gases and above.",
    example: Example {
        groups: Groups::new(1e3, 0.7),
        nusselt: 3.4053,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| enclosed(0.74, g),
};

fn enclosed(factor: f64, g: &Groups) -> f64 {
    (factor * (g.prandtl / (0.861 + g.prandtl) * g.rayleigh).powf(0.25)).max(1.0)
}
