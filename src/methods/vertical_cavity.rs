//! Upright cavities between two walls, on their gap.

use crate::geometry::Geometry::VerticalCavity;

use super::entry::{
    COMPUTED, Example, Heating, Method, ReferenceTemperature, Scatter, Side, Source,
};
use super::groups::Groups;
use super::horizontal_layer::GASES;
use super::range::{Quantity, Range};
use super::sources::EN_673;

/// Gases between upright and leaning walls.
pub(super) const ELSHERBINY_SOURCE: Source = Source {
    authors: "ElSherbiny, S. M.; Raithby, G. D.; Hollands, K. G. T.",
    year: 1982,
    work: "J. Heat Transfer 104",
    locator: "96-102",
};

const BERKOVSKY_POLEVIKOV: Source = Source {
    authors: "Berkovsky, B. M.; Polevikov, V. K., as given by Catton, I. 1978",
    year: 1977,
    work: "Heat Transfer and Turbulent Buoyant Convection",
    locator: "443-455",
};

const MACGREGOR_EMERY: Source = Source {
    authors: "MacGregor, R. K.; Emery, A. F.",
    year: 1969,
    work: "J. Heat Transfer 91",
    locator: "391-403",
};

pub static ELSHERBINY: Method = Method {
    geometry: VerticalCavity,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: true,
    formula: "Nu = max{0.0605 Ra^(1/3), [1 + (0.104 Ra^0.293/(1 + (6310/Ra)^1.36))^3]^(1/3), 0.242 (Ra L/H)^0.272}",
    source: ELSHERBINY_SOURCE,
    ranges: &[
        Range::between(Quantity::Rayleigh, 1e2, 2e7).answered_below(),
        Range::between(Quantity::Aspect, 5.0, 110.0).answered_above(),
        GASES,
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Above H/L 110, where no method exists, it is the nearest.",
    example: Example {
        groups: Groups::new(1e5, 0.71).with_aspect(20.0),
        nusselt: 3.00238,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: elsherbiny,
};

pub static LOW: Method = Method {
    geometry: VerticalCavity,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: true,
    formula: "Nu = 0.18 [Pr Ra/(0.2 + Pr)]^0.29",
    source: BERKOVSKY_POLEVIKOV,
    ranges: &[
        Range::at_least(Quantity::RayleighWeighted, 1e3).answered_below(),
        Range::between(Quantity::Rayleigh, 0.0, 1e10),
        Range::between(Quantity::Aspect, 1.0, 2.0).answered_below(),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Against computed cavities +8, +4, +4 % at H/L 1 (Pr 0.71, Ra 1e4, 1e5, 1e6), +14, +7, +6 % (Pr 7), +3, +10, +17 % at H/L 2. Below H/L 1, where no method exists, it is the nearest. Nu is at least 1. The upper Rayleigh end is that of the form for taller cavities.",
    example: Example {
        groups: Groups::new(1e6, 0.71).with_aspect(1.0),
        nusselt: 9.20482,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| (0.18 * g.rayleigh_weighted().powf(0.29)).max(1.0),
};

pub static CATTON: Method = Method {
    geometry: VerticalCavity,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: true,
    formula: "Nu = 0.22 [Pr Ra/(0.2 + Pr)]^0.28 (H/L)^(-1/4)",
    source: BERKOVSKY_POLEVIKOV,
    ranges: &[
        Range::between(Quantity::Rayleigh, 1e3, 1e10).answered_below(),
        Range::between(Quantity::Aspect, 2.0, 10.0),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Against computed cavities at H/L 2 -3 to +1 % (Pr 0.71) and +1 to +5 % (Pr 7), at H/L 5 to 10 -4 to -11 % (Pr 0.71) and -9 to +2 % (Pr 7). Nu is at least 1.",
    example: Example {
        groups: Groups::new(1e6, 6.0).with_aspect(5.0),
        nusselt: 6.97739,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| (0.22 * g.rayleigh_weighted().powf(0.28) * g.aspect.powf(-0.25)).max(1.0),
};

pub static MACGREGOR_EMERY_TURBULENT: Method = Method {
    geometry: VerticalCavity,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: true,
    formula: "Nu = max{0.046 Ra^(1/3), 0.42 Ra^(1/4) Pr^0.012 (H/L)^(-0.3)}",
    source: MACGREGOR_EMERY,
    ranges: &[
        Range::between(Quantity::Rayleigh, 1e6, 1e9),
        Range::between(Quantity::Aspect, 10.0, 40.0),
        Range::between(Quantity::Prandtl, 1.0, 20.0),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The source gives the first form from H/L 1; the larger of the two is taken where both hold. Nu is at least 1.",
    example: Example {
        groups: Groups::new(1e8, 6.0).with_aspect(20.0),
        nusselt: 21.3513,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| tall_liquid(g).max(0.046 * g.rayleigh.cbrt()),
};

pub static TALL: Method = Method {
    geometry: VerticalCavity,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: true,
    formula: "Nu = 0.42 Ra^(1/4) Pr^0.012 (H/L)^(-0.3)",
    source: MACGREGOR_EMERY,
    ranges: &[
        Range::between(Quantity::Rayleigh, 1e4, 1e7).answered_below(),
        Range::between(Quantity::Aspect, 10.0, 40.0).answered_above(),
        Range::between(Quantity::Prandtl, 1.0, 2e4),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "+13 to +29 % of computed cavities at H/L 10. Above H/L 40 and below Ra 1e4, where no method for liquids exists, it is the nearest. Nu is at least 1.",
    example: Example {
        groups: Groups::new(1e6, 100.0).with_aspect(20.0),
        nusselt: 5.714,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: tall_liquid,
};

pub static WRIGHT: Method = Method {
    geometry: VerticalCavity,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: false,
    formula: "Nu = max{Nu_1, 0.242 (Ra L/H)^0.272}, Nu_1 = 0.0673838 Ra^(1/3) above Ra 5e4, 0.028154 Ra^0.4134 from 1e4, 1 + 1.7596678e-10 Ra^2.2984755 below",
    source: Source {
        authors: "Wright, J. L.",
        year: 1996,
        work: "ASHRAE Transactions 102 (1), also ISO 15099",
        locator: "940-946 (from memory)",
    },
    ranges: &[
        Range::between(Quantity::Rayleigh, 0.0, 1e6),
        Range::at_least(Quantity::Aspect, 5.0),
        GASES,
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "For glazing. The ranges are from memory. The bands step by up to 0.7 % at their edges.",
    example: Example {
        groups: Groups::new(2e4, 0.71).with_aspect(40.0),
        nusselt: 1.68883,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[|_| 1e4, |_| 5e4],
    nusselt: |g| {
        let first = if g.rayleigh > 5e4 {
            0.0673838 * g.rayleigh.cbrt()
        } else if g.rayleigh > 1e4 {
            0.028154 * g.rayleigh.powf(0.4134)
        } else {
            1.0 + 1.7596678e-10 * g.rayleigh.powf(2.2984755)
        };
        first.max(end_layers(g))
    },
};

pub static GLAZING: Method = Method {
    geometry: VerticalCavity,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: false,
    formula: "Nu = max{1, 0.035 (Gr Pr)^0.38}",
    source: EN_673,
    ranges: &[Range::between(Quantity::Rayleigh, 0.0, 1e6), GASES],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The standard's rule for upright glazing, with the gas data here instead of its own at 283 K. It states no range; 1e6 covers glazing.",
    example: Example {
        groups: Groups::new(1e5, 0.71).with_aspect(40.0),
        nusselt: 2.78015,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| (0.035 * g.rayleigh.powf(0.38)).max(1.0),
};

pub(super) fn elsherbiny(g: &Groups) -> f64 {
    let cells = 0.104 * g.rayleigh.powf(0.293) / (1.0 + (6310.0 / g.rayleigh).powf(1.36));
    let first = (1.0 + cells.powi(3)).cbrt();
    first.max(0.0605 * g.rayleigh.cbrt()).max(end_layers(g))
}

/// `0.242 (Ra L/H)^0.272`: the boundary layers of low cavities.
fn end_layers(g: &Groups) -> f64 {
    0.242 * (g.rayleigh / g.aspect).powf(0.272)
}

fn tall_liquid(g: &Groups) -> f64 {
    let nusselt = 0.42 * g.rayleigh.powf(0.25) * g.prandtl.powf(0.012) * g.aspect.powf(-0.3);
    nusselt.max(1.0)
}
