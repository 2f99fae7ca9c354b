//! The automatic coefficient follows its case without steps, or says where it steps.

mod findings;

use plumeline::fluids::{Conditions, Fluid, Fluids};
use plumeline::geometry::Geometry;

use super::bodies::{BODIES, Body, HEATABLE};
use super::support::{Draft, EXTRAPOLATE, answer, middle_composition};
use findings::Findings;

/// Fluids with an ambient temperature in the middle of their tables, K; water on both sides of
/// its greatest density.
const FLUIDS: [(&str, f64); 9] = [
    ("air", 293.15),
    ("helium", 300.0),
    ("carbon-dioxide", 400.0),
    ("steam", 500.0),
    ("water", 313.15),
    ("water", 275.15),
    ("ethylene-glycol", 320.0),
    ("ethylene-glycol-water", 300.0),
    ("engine-oil", 350.0),
];

/// From one power of ten to another in hundredths of a decade.
fn decades(from: i32, to: i32) -> impl Iterator<Item = f64> {
    (100 * from..=100 * to).map(|k| 10_f64.powf(f64::from(k) / 100.0))
}

/// Evenly spaced, both ends included.
fn evenly(from: f64, to: f64, intervals: u32) -> impl Iterator<Item = f64> {
    (0..=intervals).map(move |k| from + (to - from) * f64::from(k) / f64::from(intervals))
}

/// Tilts from upright to level: a quarter of a degree apart, and towards level, where the gravity
/// along the surface vanishes, a hundredth of a decade of what is left.
fn tilts() -> impl Iterator<Item = f64> {
    const TOWARDS_LEVEL: f64 = 80.0;
    let left = 90.0 - TOWARDS_LEVEL;
    let rest = (0..=400).map(move |k| 90.0 - left * 10_f64.powf(f64::from(-k) / 100.0));
    evenly(0.0, TOWARDS_LEVEL, 320).chain(rest).chain([90.0])
}

/// Film temperatures over a table: half a kelvin apart, and on both sides of a greatest density,
/// where the expansion vanishes, a hundredth of a decade of the distance to it.
fn films(fluid: &Fluid) -> Vec<f64> {
    let conditions = Conditions {
        pressure: 101_325.0,
        composition: middle_composition(fluid),
    };
    let (coldest, hottest) = fluid.temperatures_at(&conditions);
    match fluid.density_maximum(&conditions) {
        None => evenly(coldest, hottest, (2.0 * (hottest - coldest)) as u32).collect(),
        Some(turn) => {
            let below = decades(-1, 1).map(|distance| turn - distance);
            let above = decades(-1, 3).map(|distance| turn + distance);
            below.chain(above).collect()
        }
    }
}

/// Every body in every fluid, surfaces warmer and colder than it.
fn every(mut each: impl FnMut(&Body, &'static str, f64, f64)) {
    for body in &BODIES {
        let signs: &[f64] = if body.is_closed() {
            &[1.0]
        } else {
            &[1.0, -1.0]
        };
        for (fluid, ambient) in FLUIDS {
            for &sign in signs {
                each(body, fluid, ambient, sign);
            }
        }
    }
}

#[test]
fn over_the_temperature_difference() {
    let mut findings = Findings::default();
    every(|body, fluid, ambient, sign| {
        let draft = body.draft(fluid, 1.0);
        let label = format!(
            "{} in {fluid} of {ambient} K, {sign} times a difference",
            body.label()
        );
        findings.sweep(&label, decades(-3, 3), |difference| {
            draft
                .between(ambient + sign * difference, ambient)
                .read()
                .ok()
        });
    });
    findings.assert_none(100_000);
}

#[test]
fn over_the_size() {
    let mut findings = Findings::default();
    every(|body, fluid, ambient, sign| {
        let label = format!("{} in {fluid} of {ambient} K, scale", body.label());
        findings.sweep(&label, decades(-5, 3), |scale| {
            let draft = body.draft(fluid, scale);
            draft.between(ambient + sign * 1.5, ambient).read().ok()
        });
    });
    findings.assert_none(150_000);
}

/// Bodies less one dimension, in a fluid: the dimension, and the powers of ten, m, between which it
/// changes the proportions.
fn proportions(fluid: &'static str) -> [(Draft, &'static str, i32, i32); 12] {
    use Geometry::*;
    let body = |geometry, dimensions: &[(&'static str, f64)]| {
        Draft::new(geometry, fluid).numbers(dimensions)
    };
    let layer = |tilt| {
        body(
            TiltedLayer,
            &[("height", 1.2), ("tilt_from_horizontal", tilt)],
        )
    };
    let channel = body(ParallelPlates, &[("height", 0.3)]).word("heated_walls", "both");
    let leaning = &[("length", 2.0), ("tilt_from_vertical", 30.0)];
    [
        (
            body(VerticalCylinder, &[("height", 2.0)]),
            "diameter",
            -5,
            2,
        ),
        (body(InclinedCylinder, leaning), "diameter", -5, 2),
        (
            body(UprightShortCylinder, &[("height", 0.2)]),
            "diameter",
            -3,
            1,
        ),
        (
            body(LyingShortCylinder, &[("length", 0.2)]),
            "diameter",
            -3,
            1,
        ),
        (
            body(Block, &[("length", 0.3), ("width", 0.2)]),
            "height",
            -3,
            2,
        ),
        (
            body(Block, &[("height", 0.3), ("width", 0.2)]),
            "length",
            -3,
            2,
        ),
        (body(VerticalCavity, &[("height", 1.2)]), "gap", -2, 0),
        (body(VerticalCavity, &[("height", 12.0)]), "gap", -2, 1),
        (layer(20.0), "gap", -2, 0),
        (layer(75.0), "gap", -2, 0),
        (channel, "spacing", -4, 1),
        (
            body(ConcentricCylinders, &[("inner_diameter", 0.05)]),
            "outer_diameter",
            -1,
            2,
        ),
    ]
}

#[test]
fn over_the_proportions() {
    let mut findings = Findings::default();
    for (fluid, ambient) in FLUIDS {
        for (draft, dimension, from, to) in proportions(fluid) {
            for extrapolate in EXTRAPOLATE {
                let draft = draft
                    .between(ambient + 1.5, ambient)
                    .word("extrapolate", extrapolate);
                let body = draft.geometry().as_str();
                let label = format!("{body} in {fluid}, {extrapolate}, {dimension}");
                findings.sweep(&label, decades(from, to), |size| {
                    draft.clone().number(dimension, size).read().ok()
                });
            }
        }
    }
    findings.assert_none(50_000);
}

#[test]
fn over_gravity() {
    let mut findings = Findings::default();
    for extrapolate in EXTRAPOLATE {
        for body in &BODIES {
            for (fluid, ambient) in [("air", 293.15), ("engine-oil", 350.0)] {
                let draft = body
                    .draft(fluid, 1.0)
                    .between(ambient + 10.0, ambient)
                    .word("extrapolate", extrapolate);
                let label = format!("{} in {fluid}, {extrapolate}, gravity", body.label());
                findings.sweep(&label, decades(-9, 4), |gravity| {
                    draft.clone().number("gravity", gravity).read().ok()
                });
            }
        }
    }
    findings.assert_none(100_000);
}

#[test]
fn over_the_heat_flux() {
    let mut findings = Findings::default();
    for body in &BODIES[..HEATABLE] {
        for (fluid, ambient) in [("air", 293.15), ("water", 313.15)] {
            for sign in [1.0, -1.0] {
                let draft = body
                    .draft(fluid, 1.0)
                    .number("ambient_temperature", ambient);
                let label = format!("{} in {fluid} of {ambient} K, heat flux", body.label());
                findings.sweep(&label, decades(0, 4), |flux| {
                    draft.clone().number("heat_flux", sign * flux).read().ok()
                });
            }
        }
    }
    findings.assert_none(15_000);
}

/// Plates of Ra 1e4 and more on their length; for smaller ones see the next check.
#[test]
fn over_the_tilt_of_plates() {
    let mut findings = Findings::default();
    for facing in ["up", "down"] {
        for (fluid, ambient) in FLUIDS {
            for difference in [1.5, -1.5] {
                for scale in [0.3, 1.0, 10.0] {
                    let draft = Draft::new(Geometry::InclinedPlate, fluid)
                        .word("facing", facing)
                        .number("length", scale)
                        .number("width", 0.7 * scale)
                        .between(ambient + difference, ambient);
                    let label = format!("{facing} in {fluid} at {difference} K, {scale} m, tilt");
                    findings.sweep(&label, tilts(), |tilt| {
                        draft.clone().number("tilt_from_vertical", tilt).read().ok()
                    });
                }
            }
        }
    }
    findings.assert_none(60_000);
}

#[test]
fn over_the_tilt_of_cylinders() {
    let mut findings = Findings::default();
    for (fluid, ambient) in FLUIDS {
        for difference in [1.5, -1.5] {
            for (diameter, length) in [(0.3, 0.3), (0.1, 1.0), (0.05, 5.0)] {
                let draft = Draft::new(Geometry::InclinedCylinder, fluid)
                    .number("diameter", diameter)
                    .number("length", length)
                    .between(ambient + difference, ambient);
                let label =
                    format!("{diameter} m by {length} m in {fluid} at {difference} K, tilt");
                findings.sweep(&label, tilts(), |tilt| {
                    draft.clone().number("tilt_from_vertical", tilt).read().ok()
                });
            }
        }
    }
    findings.assert_none(30_000);
}

#[test]
fn over_the_tilt_of_layers() {
    let mut findings = Findings::default();
    for (fluid, ambient) in FLUIDS {
        for gap in [0.005, 0.02, 0.1] {
            for aspect in [1.0, 4.0, 11.0, 12.0, 50.0] {
                for extrapolate in EXTRAPOLATE {
                    let draft = Draft::new(Geometry::TiltedLayer, fluid)
                        .number("gap", gap)
                        .number("height", aspect * gap)
                        .word("extrapolate", extrapolate)
                        .between(ambient + 1.5, ambient);
                    let label =
                        format!("{gap} m by {aspect} in {fluid}, {extrapolate}, tilt of a layer");
                    findings.sweep(&label, evenly(0.0, 180.0, 720), |tilt| {
                        draft
                            .clone()
                            .number("tilt_from_horizontal", tilt)
                            .read()
                            .ok()
                    });
                }
            }
        }
    }
    findings.assert_none(150_000);
}

/// A known difference of the source: below about Ra 1e4 its tilt rule is as good as a step at 0°.
///
/// The rule takes the larger of an upright and a level plate's heat flow. Conduction from the
/// edges of a level plate outweighs conduction from an upright one as soon as there is any tilt,
/// since it fades only with the logarithm of the gravity across the plate.
#[test]
fn a_small_plate_leaves_the_upright_at_once() {
    let coefficient = |tilt| {
        let plate = Draft::new(Geometry::InclinedPlate, "helium")
            .word("facing", "down")
            .number("length", 0.01)
            .number("width", 0.007)
            .number("tilt_from_vertical", tilt);
        let case = plate.between(301.5, 300.0).read();
        answer(&case.expect("a well-formed case")).heat_transfer_coefficient
    };
    let step = coefficient(0.025) / coefficient(0.0) - 1.0;
    assert!((step - 1.087).abs() < 5e-4, "{step}");
}

#[test]
fn over_the_altitude() {
    let mut findings = Findings::default();
    for body in &BODIES {
        let draft = body.draft("air", 1.0).between(353.15, 293.15);
        let label = format!("{}, altitude", body.label());
        findings.sweep(&label, evenly(-500.0, 9000.0, 950), |altitude| {
            draft.clone().number("altitude", altitude).read().ok()
        });
    }
    findings.assert_none(BODIES.len() * 950);
}

#[test]
fn over_the_span_of_every_table() {
    let mut findings = Findings::default();
    for (_, fluid) in Fluids::built_in().iter() {
        let films = films(fluid);
        for body in &BODIES {
            let draft = body.draft(fluid.id(), 1.0);
            let label = format!("{} in {}, film", body.label(), fluid.id());
            findings.sweep(&label, films.iter().copied(), |film| {
                draft.between(film + 0.1, film - 0.1).read().ok()
            });
        }
    }
    findings.assert_none(200_000);
}
