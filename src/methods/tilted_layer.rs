//! Layers at any tilt from the horizontal, on their gap: 0 is heated from below, 90 upright, 180 heated from above.

use crate::geometry::Geometry::{self, TiltedLayer};

use super::entry::{
    COMPUTED, Example, Heating, Method, ReferenceTemperature, Scatter, Side, Source,
};
use super::groups::Groups;
use super::horizontal_layer::{GASES, gas_layer};
use super::range::{Quantity, Range};
use super::sources::EN_673;
use super::vertical_cavity;
use super::{automatic, automatic_nusselt, choose, neighbour};

pub static HOLLANDS_UNNY_RAITHBY_KONICEK: Method = Method {
    geometry: TiltedLayer,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: true,
    formula: "Nu = 1 + 1.44 [1 - 1708/(Ra cos t)]+ [1 - 1708 (sin 1.8 t)^1.6/(Ra cos t)]+ + [(Ra cos t/5830)^(1/3) - 1]+",
    source: Source {
        authors: "Hollands, K. G. T.; Unny, T. E.; Raithby, G. D.; Konicek, L.",
        year: 1976,
        work: "J. Heat Transfer 98",
        locator: "189-193",
    },
    ranges: &[
        Range::between(Quantity::Rayleigh, 0.0, 1e5).answered_above(),
        Range::between(Quantity::Rayleigh, 0.0, 1e8),
        Range::between(Quantity::LayerTilt, 0.0, 60.0),
        Range::at_least(Quantity::Aspect, 12.0),
        GASES,
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Measured to Ra 1e5; used to 1e8 with a note.",
    example: Example {
        groups: Groups::new(5e4, 0.71).with_aspect(40.0).tilted(30.0),
        nusselt: 3.29542,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let tilt = g.tilt.to_radians();
        let across = g.rayleigh * tilt.cos().max(0.0);
        gas_layer(across, across, (1.8 * tilt).sin().max(0.0).powf(1.6))
    },
};

pub static ELSHERBINY: Method = Method {
    geometry: TiltedLayer,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: true,
    formula: "Nu linear in t between 60 and 90: max{[1 + (0.0936 Ra^0.314/(1 + G))^7]^(1/7), (0.104 + 0.175 L/H) Ra^0.283}, G = 0.5/[1 + (Ra/3160)^20.6]^0.1, and the upright cavity's form by the same authors",
    source: vertical_cavity::ELSHERBINY_SOURCE,
    ranges: &[
        Range::between(Quantity::Rayleigh, 1e2, 2e7).answered_below(),
        Range::between(Quantity::LayerTilt, 60.0, 90.0),
        Range::between(Quantity::Aspect, 5.0, 110.0).answered_above(),
        GASES,
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Also in ISO 15099. At 60 degrees within +14 to -6 % of the method for smaller tilts up to Ra 1e5 (+19 % at H/L 12), 23 to 35 % apart at 1e6 to 1e7.",
    example: Example {
        groups: Groups::new(5e4, 0.71).with_aspect(40.0).tilted(75.0),
        nusselt: 2.5945,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let share = ((g.tilt - 60.0) / 30.0).clamp(0.0, 1.0);
        (1.0 - share) * at_sixty(g) + share * vertical_cavity::elsherbiny(g)
    },
};

pub static CATTON: Method = Method {
    geometry: TiltedLayer,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: true,
    formula: "Nu = Nu_0 (Nu_90/Nu_0)^(t/t*) (sin t*)^(t/(4 t*)) to the critical tilt t*, Nu_90 (sin t)^(1/4) to 90, 1 + (Nu_90 - 1) sin t beyond; t* 25 degrees at H/L 1, 53 at 3, 60 at 6, 67 at 12, 70 beyond, interpolated in log H/L; Nu_0 and Nu_90 by the automatic methods of the level layer and the upright cavity",
    source: Source {
        authors: "Catton, I.",
        year: 1978,
        work: "Proc. 6th Int. Heat Transfer Conference 6",
        locator: "13-31",
    },
    ranges: &[
        Range::between(Quantity::Rayleigh, 0.0, 1e10),
        Range::between(Quantity::LayerTilt, 0.0, 180.0),
        Range::at_least(Quantity::Aspect, 1.0).answered_below(),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "For low layers and for liquids; every part is at least 1. Where one of the two ends changes its method the figures step by up to 36 %, which a note tells.",
    example: Example {
        groups: Groups::new(1e6, 6.0).with_aspect(4.0).tilted(30.0),
        nusselt: 7.59183,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let level = automatic_nusselt(Geometry::HorizontalLayer, Side::Unstable, g);
        let upright = automatic_nusselt(Geometry::VerticalCavity, Side::Any, g);
        between(level, upright, g)
    },
};

/// Catton's rule between the Nusselt numbers of the level and the upright layer.
fn between(level: f64, upright: f64, g: &Groups) -> f64 {
    let critical = critical_tilt(g.aspect);
    let sine = g.tilt.to_radians().sin();
    let nusselt = if g.tilt <= critical {
        let share = g.tilt / critical;
        level * (upright / level).powf(share) * critical.to_radians().sin().powf(0.25 * share)
    } else if g.tilt <= 90.0 {
        upright * sine.powf(0.25)
    } else {
        1.0 + (upright - 1.0) * sine
    };
    nusselt.max(1.0)
}

/// How far Catton's rule steps close by, less one, where a method of its two ends takes over from another; 0 away from such places.
pub fn step_of_ends(g: &Groups) -> f64 {
    let ends = [
        (Geometry::HorizontalLayer, Side::Unstable),
        (Geometry::VerticalCavity, Side::Any),
    ];
    let here = ends.map(|(geometry, side)| automatic_nusselt(geometry, side, g));
    let across = ends.map(|(geometry, side)| {
        let judge = |method: &&'static Method| method.verdict(g);
        let chosen = choose(automatic(geometry, side), judge)?;
        let others = automatic(geometry, side).filter(|other| !std::ptr::eq(*other, chosen));
        neighbour(others, judge, &chosen.verdict(g)).map(|other| (other.nusselt)(g))
    });
    if across == [None, None] {
        return 0.0;
    }
    let [level, upright] = [0, 1].map(|end| across[end].unwrap_or(here[end]));
    between(here[0], here[1], g) / between(level, upright, g) - 1.0
}

pub static GLAZING: Method = Method {
    geometry: TiltedLayer,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: false,
    formula: "Nu = max{1, A (Gr Pr)^n}, linear in t between A 0.16, n 0.28 at 0, 0.10, 0.31 at 45 and 0.035, 0.38 at 90",
    source: EN_673,
    ranges: &[
        Range::between(Quantity::Rayleigh, 0.0, 1e6),
        Range::between(Quantity::LayerTilt, 0.0, 90.0),
        GASES,
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The standard's rule for glazing, with the gas data here instead of its own at 283 K. It states no range; 1e6 covers glazing.",
    example: Example {
        groups: Groups::new(5e4, 0.71).with_aspect(40.0).tilted(30.0),
        nusselt: 3.01139,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let law = |factor: f64, exponent: f64| (factor * g.rayleigh.powf(exponent)).max(1.0);
        let (low, high, share) = if g.tilt <= 45.0 {
            (law(0.16, 0.28), law(0.10, 0.31), g.tilt / 45.0)
        } else {
            (
                law(0.10, 0.31),
                law(0.035, 0.38),
                (g.tilt / 45.0 - 1.0).min(1.0),
            )
        };
        (1.0 - share) * low + share * high
    },
};

/// ElSherbiny's form at 60 degrees.
fn at_sixty(g: &Groups) -> f64 {
    let bend = 0.5 / (1.0 + (g.rayleigh / 3160.0).powf(20.6)).powf(0.1);
    let cells = 0.0936 * g.rayleigh.powf(0.314) / (1.0 + bend);
    let first = (1.0 + cells.powi(7)).powf(1.0 / 7.0);
    first.max((0.104 + 0.175 / g.aspect) * g.rayleigh.powf(0.283))
}

/// The tilt beyond which the layer behaves as an upright one, by height over gap.
fn critical_tilt(aspect: f64) -> f64 {
    const POINTS: [(f64, f64); 4] = [(1.0, 25.0), (3.0, 53.0), (6.0, 60.0), (12.0, 67.0)];
    if aspect > 12.0 {
        return 70.0;
    }
    let aspect = aspect.max(1.0);
    let above = POINTS.iter().position(|&(at, _)| aspect <= at);
    let i = above.unwrap_or(POINTS.len() - 1).max(1);
    let ((low, from), (high, to)) = (POINTS[i - 1], POINTS[i]);
    from + (to - from) * (aspect / low).ln() / (high / low).ln()
}
