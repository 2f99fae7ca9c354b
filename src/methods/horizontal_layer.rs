//! Level layers between two plates, on their gap.

use crate::geometry::Geometry::HorizontalLayer;

use super::entry::{
    COMPUTED, Example, Heating, Method, ReferenceTemperature, Scatter, Side, Source,
};
use super::groups::Groups;
use super::range::{Quantity, Range};
use super::sources::{EN_673, HANDBOOK};

/// Rayleigh number at which a layer heated from below begins to move.
///
/// # Source
/// Jeffreys 1928, Pellew and Southwell 1940: 1707.76, as 1708 in the methods.
pub(super) const ONSET: f64 = 1708.0;

/// Prandtl numbers of gases; air itself falls to 0.698, helium and argon to 0.66, steam rises to 1.03.
pub(super) const GASES: Range = Range::between(Quantity::Prandtl, 0.6, 1.1);

pub static HOLLANDS_RAITHBY_KONICEK: Method = Method {
    geometry: HorizontalLayer,
    heating: Heating::Isothermal,
    side: Side::Unstable,
    automatic: true,
    formula: "Nu = 1 + 1.44 [1 - 1708/Ra]+ + [(Ra/5830)^(1/3) - 1]+",
    source: Source {
        authors: "Hollands, K. G. T.; Raithby, G. D.; Konicek, L.",
        year: 1975,
        work: "Int. J. Heat Mass Transfer 18",
        locator: "879-884",
    },
    ranges: &[Range::between(Quantity::Rayleigh, 0.0, 1e8), GASES],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The gases' form, which the tilted layer's method takes at no tilt.",
    example: Example {
        groups: Groups::new(1e5, 0.71),
        nusselt: 3.99436,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| gas_layer(g.rayleigh, g.rayleigh, 0.0),
};

pub static HOLLANDS: Method = Method {
    geometry: HorizontalLayer,
    heating: Heating::Isothermal,
    side: Side::Unstable,
    automatic: true,
    formula: "Nu = 1 + [1 - 1708/Ra]+ {k1 + 2 (Ra^(1/3)/k2)^(1 - ln(Ra^(1/3)/k2))} + [(Ra/5830)^(1/3) - 1]+, k1 = 1.44/(1 + 0.018/Pr + 0.00136/Pr^2), k2 = 75 exp(1.5 Pr^(-1/2))",
    source: Source {
        authors: "Hollands, K. G. T.",
        year: 1984,
        work: "Int. J. Heat Mass Transfer 27",
        locator: "466-468",
    },
    ranges: &[Range::between(Quantity::Rayleigh, 0.0, 1e11)],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "About 1 % below the gases' form at Ra 1e5 and 8 % above it at 1e8 (Pr 0.7). The upper end of the range is from memory.",
    example: Example {
        groups: Groups::new(1e7, 6.0),
        nusselt: 15.9651,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let k1 = 1.44 / (1.0 + 0.018 / g.prandtl + 0.00136 / g.prandtl.powi(2));
        let k2 = 75.0 * (1.5 / g.prandtl.sqrt()).exp();
        let ratio = g.rayleigh.cbrt() / k2;
        let thermals = if ratio > 0.0 {
            2.0 * ratio.powf(1.0 - ratio.ln())
        } else {
            0.0
        };
        1.0 + cells(g.rayleigh) * (k1 + thermals) + plumes(g.rayleigh)
    },
};

pub static GLOBE_DROPKIN: Method = Method {
    geometry: HorizontalLayer,
    heating: Heating::Isothermal,
    side: Side::Unstable,
    automatic: false,
    formula: "Nu = 0.069 Ra^(1/3) Pr^0.074",
    source: Source {
        authors: "Globe, S.; Dropkin, D.",
        year: 1959,
        work: "J. Heat Transfer 81",
        locator: "24-28",
    },
    ranges: &[
        Range::between(Quantity::Rayleigh, 3e5, 7e9),
        Range::between(Quantity::Prandtl, 0.02, 8750.0),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The Prandtl range is that of the author's liquids (from memory).",
    example: Example {
        groups: Groups::new(1e6, 1.0),
        nusselt: 6.9,
        figures: 3,
        from: "0.069 times 100, by hand",
    },
    edges: &[],
    nusselt: |g| (0.069 * g.rayleigh.cbrt() * g.prandtl.powf(0.074)).max(1.0),
};

pub static GLAZING: Method = Method {
    geometry: HorizontalLayer,
    heating: Heating::Isothermal,
    side: Side::Unstable,
    automatic: false,
    formula: "Nu = max{1, 0.16 (Gr Pr)^0.28}",
    source: EN_673,
    ranges: &[Range::between(Quantity::Rayleigh, 0.0, 1e6), GASES],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The standard's rule for level glazing heated from below, with the gas data here instead of its own at 283 K. It states no range; 1e6 covers glazing.",
    example: Example {
        groups: Groups::new(1e5, 0.71),
        nusselt: 4.01902,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| (0.16 * g.rayleigh.powf(0.28)).max(1.0),
};

pub static CONDUCTION: Method = Method {
    geometry: HorizontalLayer,
    heating: Heating::Isothermal,
    side: Side::Stable,
    automatic: true,
    formula: "Nu = 1",
    source: HANDBOOK,
    ranges: &[Range::at_least(Quantity::Rayleigh, 0.0)],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::Stated(0.0),
    remark: "Lighter fluid lies above: heat is conducted.",
    example: Example {
        groups: Groups::new(1e5, 0.71),
        nusselt: 1.0,
        figures: 6,
        from: "by definition",
    },
    edges: &[],
    nusselt: |_| 1.0,
};

/// `[1 - 1708/Ra]+`: the first cells.
fn cells(rayleigh: f64) -> f64 {
    (1.0 - ONSET / rayleigh).max(0.0)
}

/// `[(Ra/5830)^(1/3) - 1]+`: the plumes that follow.
fn plumes(rayleigh: f64) -> f64 {
    ((rayleigh / 5830.0).cbrt() - 1.0).max(0.0)
}

/// The gases' form with the part of gravity across the layer, its cells damped where the layer is tilted.
pub(super) fn gas_layer(across: f64, onset_rayleigh: f64, damping: f64) -> f64 {
    let damped = (1.0 - ONSET * damping / onset_rayleigh).max(0.0);
    1.0 + 1.44 * cells(across) * damped + plumes(across)
}
