//! Plates between upright and level, on their length along the slope.

use crate::geometry::Geometry::InclinedPlate;

use super::entry::{
    COMPUTED, Example, Heating, Method, ReferenceTemperature, Scatter, Side, Source,
};
use super::groups::Groups;
use super::layers::{
    blend, horizontal_stable, horizontal_unstable_blend, vertical_blend, vertical_laminar,
    vertical_turbulent,
};
use super::range::{Quantity, Range};
use super::sources::{CHURCHILL_CHU_PLATE, FUJII_IMURA, HANDBOOK, VLIET};
use super::vertical_plate;

const ANY_TILT: Range = Range::between(Quantity::Tilt, 0.0, 90.0);
const TILT_RULE_REMARK: &str = "The larger heat flow of the upright plate with gravity along the slope and the level plate with gravity across it, each on its own length.";

pub static RAITHBY_HOLLANDS_UNSTABLE: Method = Method {
    geometry: InclinedPlate,
    heating: Heating::Either,
    side: Side::Unstable,
    automatic: true,
    formula: "Nu = max{Nu_v(Ra cos t), Nu_h(Ra sin t r^3)/r}: Nu_v the upright plate's blend on the length L, Nu_h the level plate's for a layer that leaves it on A/P, t the tilt from vertical, r = (A/P)/L",
    source: HANDBOOK,
    ranges: &[
        Range::between(Quantity::Rayleigh, 0.1, 1e12).answered_below(),
        ANY_TILT,
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: TILT_RULE_REMARK,
    example: Example {
        groups: LEANING,
        nusselt: 180.835,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| tilt_rule(g, horizontal_unstable_blend),
};

pub static VLIET_UNSTABLE: Method = Method {
    geometry: InclinedPlate,
    heating: Heating::Either,
    side: Side::Unstable,
    automatic: false,
    formula: "Nu = (Nu_l^6 + Nu_t^6)^(1/6): the upright plate's blend, laminar part with Ra cos t, turbulent part with Ra",
    source: VLIET,
    ranges: &[
        Range::between(Quantity::Rayleigh, 0.1, 1e12).answered_below(),
        Range::between(Quantity::Tilt, 0.0, 60.0),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Plain gravity in the turbulent part is the finding of the source; the layers are those of the upright plate's blend.",
    example: Example {
        groups: LEANING,
        nusselt: 125.102,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        blend(
            vertical_laminar(g.rayleigh_along(), g.prandtl),
            vertical_turbulent(g.rayleigh, g.prandtl),
            6.0,
        )
    },
};

pub static FUJII_IMURA_UNSTABLE: Method = Method {
    geometry: InclinedPlate,
    heating: Heating::Either,
    side: Side::Unstable,
    automatic: false,
    formula: "Nu = 0.145 (Ra^(1/3) - Ra_c^(1/3)) + 0.56 (Ra_c cos t)^(1/4) above Ra_c = Gr_c Pr, 0.56 (Ra cos t)^(1/4) below; Gr_c 5e9 at 15, 2e9 at 30, 1e8 at 60, 1e6 at 75 degrees, log-interpolated",
    source: FUJII_IMURA,
    ranges: &[
        Range::between(Quantity::RayleighAlong, 1e5, 1e11),
        Range::between(Quantity::Tilt, 15.0, 75.0),
        Range::at_least(Quantity::Prandtl, 0.6),
    ],
    reference: FUJII_IMURA_REFERENCE,
    scatter: Scatter::CommonPractice,
    remark: "With Vliet 1969. One textbook prints 0.14, and whether the critical values are Grashof or Rayleigh numbers is open; read as Grashof numbers.",
    example: Example {
        groups: LEANING,
        nusselt: 178.977,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let critical = critical_grashof(g.tilt) * g.prandtl;
        let laminar = |rayleigh: f64| 0.56 * g.at_rayleigh(rayleigh).rayleigh_along().powf(0.25);
        if g.rayleigh <= critical {
            laminar(g.rayleigh)
        } else {
            0.145 * (g.rayleigh.cbrt() - critical.cbrt()) + laminar(critical)
        }
    },
};

pub static RAITHBY_HOLLANDS_STABLE: Method = Method {
    geometry: InclinedPlate,
    heating: Heating::Either,
    side: Side::Stable,
    automatic: true,
    formula: "Nu = max{Nu_v(Ra cos t), Nu_h(Ra sin t r^3)/r}: Nu_v the upright plate's blend on the length L, Nu_h the level plate's for a layer that clings to it on A/P, t the tilt from vertical, r = (A/P)/L",
    source: HANDBOOK,
    ranges: &[
        Range::between(Quantity::Rayleigh, 0.1, 1e12).answered_below(),
        ANY_TILT,
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: TILT_RULE_REMARK,
    example: Example {
        groups: LEANING,
        nusselt: 116.06,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| tilt_rule(g, horizontal_stable),
};

pub static CHURCHILL_CHU_LAMINAR: Method = Method {
    geometry: InclinedPlate,
    heating: Heating::Either,
    side: Side::Stable,
    automatic: false,
    formula: "Nu = 0.68 + 0.670 (Ra cos t)^(1/4) / [1 + (0.492/Pr)^(9/16)]^(4/9)",
    source: CHURCHILL_CHU_PLATE,
    ranges: &[
        Range::between(Quantity::RayleighAlong, 0.1, 1e9).answered_below(),
        Range::between(Quantity::Tilt, 0.0, 60.0),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The upright plate's laminar form with gravity along the slope, to 60 degrees (common practice).",
    example: Example {
        groups: LEANING.at_rayleigh(1e9),
        nusselt: 84.4038,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| vertical_plate::laminar(&g.at_rayleigh(g.rayleigh_along()), 0.492),
};

pub static VLIET_ROSS: Method = Method {
    geometry: InclinedPlate,
    heating: Heating::Either,
    side: Side::Stable,
    automatic: false,
    formula: "Nu = (Nu_l^6 + Nu_t^6)^(1/6): the upright plate's blend, laminar part with Ra cos t, turbulent part with Ra cos^2 t",
    source: Source {
        authors: "Vliet, G. C.; Ross, D. C.",
        year: 1975,
        work: "J. Heat Transfer 97",
        locator: "549-554",
    },
    ranges: &[
        Range::between(Quantity::Rayleigh, 0.1, 1e12).answered_below(),
        Range::between(Quantity::Tilt, 0.0, 80.0),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The second cosine in the turbulent part is the finding of the source (to 80 degrees, from memory); the layers are those of the upright plate's blend.",
    example: Example {
        groups: LEANING,
        nusselt: 112.567,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let along = g.rayleigh_along();
        let twice = g.at_rayleigh(along).rayleigh_along();
        blend(
            vertical_laminar(along, g.prandtl),
            vertical_turbulent(twice, g.prandtl),
            6.0,
        )
    },
};

pub static FUJII_IMURA_STABLE: Method = Method {
    geometry: InclinedPlate,
    heating: Heating::Either,
    side: Side::Stable,
    automatic: false,
    formula: "Nu = 0.56 (Ra cos t)^(1/4)",
    source: FUJII_IMURA,
    ranges: &[
        Range::between(Quantity::RayleighAlong, 1e5, 1e11),
        Range::between(Quantity::Tilt, 0.0, 88.0),
        Range::at_least(Quantity::Prandtl, 0.6),
    ],
    reference: FUJII_IMURA_REFERENCE,
    scatter: Scatter::CommonPractice,
    remark: "Expansion at ambient + 0.25 x difference; one textbook prints 0.50.",
    example: Example {
        groups: Groups::new(1e8, 6.0).tilted(60.0),
        nusselt: 47.0902,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| 0.56 * g.rayleigh_along().powf(0.25),
};

const FUJII_IMURA_REFERENCE: ReferenceTemperature = ReferenceTemperature::Weighted {
    properties: 0.75,
    expansion: 0.25,
};

const LEANING: Groups = Groups {
    length_ratio: 0.25,
    ..Groups::new(3e9, 0.7).tilted(45.0)
};

/// The larger heat flow of the upright and the level part.
fn tilt_rule(g: &Groups, level: fn(f64, f64) -> f64) -> f64 {
    let upright = vertical_blend(g.rayleigh_along(), g.prandtl);
    let across = g.rayleigh * g.tilt.to_radians().sin() * g.length_ratio.powi(3);
    upright.max(level(across, g.prandtl) / g.length_ratio)
}

/// Grashof number at which the layer on an upward slope leaves it, by the tilt from vertical in degrees.
fn critical_grashof(tilt: f64) -> f64 {
    const POINTS: [(f64, f64); 4] = [(15.0, 5e9), (30.0, 2e9), (60.0, 1e8), (75.0, 1e6)];
    let tilt = tilt.clamp(15.0, 75.0);
    let above = POINTS.iter().position(|&(angle, _)| tilt <= angle);
    let i = above.unwrap_or(POINTS.len() - 1).max(1);
    let ((low, from), (high, to)) = (POINTS[i - 1], POINTS[i]);
    from * (to / from).powf((tilt - low) / (high - low))
}
