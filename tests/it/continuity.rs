//! The automatic coefficient follows its case without steps, or says where it steps.

use plumeline::case::{Case, Column, NoteCode, Wanted};
use plumeline::fluids::{Fluid, Fluids};

use super::support::{BODIES, Body, Draft, EXTRAPOLATE, answer, outcome_of};

/// The share by which neighbours may differ.
const STEP: f64 = 0.01;

/// Fluids with an ambient temperature in the middle of their tables, K; water on both sides of
/// its greatest density.
const FLUIDS: [(&str, f64); 8] = [
    ("air", 293.15),
    ("helium", 300.0),
    ("carbon-dioxide", 400.0),
    ("steam", 500.0),
    ("water", 313.15),
    ("water", 275.15),
    ("ethylene-glycol", 320.0),
    ("engine-oil", 350.0),
];

/// Neighbours compared, and all unannounced steps between them.
#[derive(Default)]
struct Findings {
    pairs: usize,
    steps: Vec<String>,
}

impl Findings {
    /// Compares the neighbours of one sweep; where a case has no answer the sweep begins anew.
    fn sweep(
        &mut self,
        label: &str,
        positions: impl Iterator<Item = f64>,
        case_at: impl Fn(f64) -> Option<Case>,
    ) {
        let wanted = Wanted::of(&[Column::HeatTransferCoefficient]);
        let mut before: Option<(f64, Case, f64)> = None;
        for position in positions {
            let found = case_at(position).and_then(|case| {
                let answer = outcome_of(&case, wanted).ok()?;
                Some((position, case, answer.heat_transfer_coefficient))
            });
            if let (Some(first), Some(second)) = (&before, &found) {
                self.pairs += 1;
                self.compare(label, first, second);
            }
            before = found;
        }
    }

    fn compare(&mut self, label: &str, first: &(f64, Case, f64), second: &(f64, Case, f64)) {
        let step = second.2 / first.2 - 1.0;
        if step.abs() <= STEP {
            return;
        }
        let answers = [&first.1, &second.1].map(answer);
        let announced = answers
            .iter()
            .any(|answer| answer.notes.contains(NoteCode::MethodStep));
        if !announced {
            self.steps.push(format!(
                "{label} from {} to {}: {:+.3} %, {} to {}",
                first.0,
                second.0,
                100.0 * step,
                answers[0].method.as_str(),
                answers[1].method.as_str(),
            ));
        }
    }

    /// Fails with all steps found, or when fewer neighbours were compared than the sweeps are worth.
    fn assert_none(self, fewest_pairs: usize) {
        assert!(
            self.steps.is_empty(),
            "{} steps of {} pairs\n{}",
            self.steps.len(),
            self.pairs,
            self.steps.join("\n")
        );
        assert!(
            self.pairs >= fewest_pairs,
            "only {} pairs compared",
            self.pairs
        );
    }
}

/// From one power of ten to another in thousandths of a decade.
fn decades(from: i32, to: i32) -> impl Iterator<Item = f64> {
    (1000 * from..=1000 * to).map(|k| 10_f64.powf(f64::from(k) / 1000.0))
}

/// Evenly spaced, both ends included.
fn evenly(from: f64, to: f64, intervals: u32) -> impl Iterator<Item = f64> {
    (0..=intervals).map(move |k| from + (to - from) * f64::from(k) / f64::from(intervals))
}

/// Tilts from upright to level: a fortieth of a degree apart, and towards level, where the gravity
/// along the plate vanishes, a thousandth of a decade of what is left.
fn tilts() -> impl Iterator<Item = f64> {
    const TOWARDS_LEVEL: f64 = 80.0;
    let left = 90.0 - TOWARDS_LEVEL;
    let rest = (0..=4000).map(move |k| 90.0 - left * 10_f64.powf(f64::from(-k) / 1000.0));
    evenly(0.0, TOWARDS_LEVEL, 3200).chain(rest).chain([90.0])
}

/// Film temperatures over a table: a tenth of a kelvin apart, since the viscosity of cold oil
/// changes by 8 % a kelvin, and on both sides of a greatest density, where the expansion vanishes,
/// a thousandth of a decade of the distance to it.
fn films(fluid: &Fluid) -> Vec<f64> {
    let (coldest, hottest) = fluid.temperatures();
    match fluid.density_maximum() {
        None => evenly(coldest, hottest, (10.0 * (hottest - coldest)) as u32).collect(),
        Some(turn) => {
            let below = decades(-1, 1).map(|distance| turn - distance);
            let above = decades(-1, 3).map(|distance| turn + distance);
            below.chain(above).collect()
        }
    }
}

fn between(draft: &Draft, surface: f64, ambient: f64) -> Draft {
    draft
        .clone()
        .number("surface_temperature", surface)
        .number("ambient_temperature", ambient)
}

/// Every body in every fluid, warmer and colder than it.
fn every(mut each: impl FnMut(&Body, &'static str, f64, f64)) {
    for body in &BODIES {
        for (fluid, ambient) in FLUIDS {
            for sign in [1.0, -1.0] {
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
        let label = format!("{} in {fluid} of {ambient} K, difference", body.label());
        findings.sweep(&label, decades(-3, 3), |difference| {
            between(&draft, ambient + sign * difference, ambient)
                .read()
                .ok()
        });
    });
    findings.assert_none(500_000);
}

#[test]
fn over_the_size() {
    let mut findings = Findings::default();
    every(|body, fluid, ambient, sign| {
        let label = format!("{} in {fluid} of {ambient} K, scale", body.label());
        findings.sweep(&label, decades(-5, 3), |scale| {
            between(&body.draft(fluid, scale), ambient + sign * 1.5, ambient)
                .read()
                .ok()
        });
    });
    findings.assert_none(800_000);
}

#[test]
fn over_the_diameter_of_an_upright_cylinder() {
    let mut findings = Findings::default();
    for (fluid, ambient) in FLUIDS {
        for extrapolate in EXTRAPOLATE {
            let draft = Draft::new("vertical-cylinder", fluid)
                .number("height", 2.0)
                .word("extrapolate", extrapolate);
            let label = format!("vertical-cylinder in {fluid}, {extrapolate}, diameter");
            findings.sweep(&label, decades(-5, 2), |diameter| {
                between(&draft, ambient + 1.5, ambient)
                    .number("diameter", diameter)
                    .read()
                    .ok()
            });
        }
    }
    findings.assert_none(100_000);
}

#[test]
fn over_gravity() {
    let mut findings = Findings::default();
    for extrapolate in EXTRAPOLATE {
        for body in &BODIES {
            for (fluid, ambient) in [("air", 293.15), ("engine-oil", 350.0)] {
                let draft = between(&body.draft(fluid, 1.0), ambient + 10.0, ambient)
                    .word("extrapolate", extrapolate);
                let label = format!("{} in {fluid}, {extrapolate}, gravity", body.label());
                findings.sweep(&label, decades(-9, 4), |gravity| {
                    draft.clone().number("gravity", gravity).read().ok()
                });
            }
        }
    }
    findings.assert_none(500_000);
}

#[test]
fn over_the_heat_flux() {
    let mut findings = Findings::default();
    for body in &BODIES {
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
    findings.assert_none(100_000);
}

/// Plates of Ra 1e4 and more on their length; for smaller ones see the next check.
#[test]
fn over_the_tilt() {
    let mut findings = Findings::default();
    for facing in ["up", "down"] {
        for (fluid, ambient) in FLUIDS {
            for difference in [1.5, -1.5] {
                for scale in [0.3, 1.0, 10.0] {
                    let draft = Draft::new("inclined-plate", fluid)
                        .word("facing", facing)
                        .number("length", scale)
                        .number("width", 0.7 * scale);
                    let draft = between(&draft, ambient + difference, ambient);
                    let label = format!("{facing} in {fluid} at {difference} K, {scale} m, tilt");
                    findings.sweep(&label, tilts(), |tilt| {
                        draft.clone().number("tilt_from_vertical", tilt).read().ok()
                    });
                }
            }
        }
    }
    findings.assert_none(300_000);
}

/// A known difference of the source: below about Ra 1e4 its tilt rule is as good as a step at 0°.
///
/// The rule takes the larger of an upright and a level plate's heat flow. Conduction from the
/// edges of a level plate outweighs conduction from an upright one as soon as there is any tilt,
/// since it fades only with the logarithm of the gravity across the plate.
#[test]
fn a_small_plate_leaves_the_upright_at_once() {
    let coefficient = |tilt| {
        let plate = Draft::new("inclined-plate", "helium")
            .word("facing", "down")
            .number("length", 0.01)
            .number("width", 0.007)
            .number("tilt_from_vertical", tilt);
        let case = between(&plate, 301.5, 300.0).read();
        answer(&case.expect("a well-formed case")).heat_transfer_coefficient
    };
    let step = coefficient(0.025) / coefficient(0.0) - 1.0;
    assert!((step - 1.087).abs() < 5e-4, "{step}");
}

#[test]
fn over_the_altitude() {
    let mut findings = Findings::default();
    for body in &BODIES {
        let draft = between(&body.draft("air", 1.0), 353.15, 293.15);
        let label = format!("{}, altitude", body.label());
        findings.sweep(&label, evenly(-500.0, 9000.0, 1900), |altitude| {
            draft.clone().number("altitude", altitude).read().ok()
        });
    }
    findings.assert_none(8 * 1900);
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
                between(&draft, film + 0.1, film - 0.1).read().ok()
            });
        }
    }
    findings.assert_none(750_000);
}

/// The largest relative distance between two coefficients of one case.
const SAME: f64 = 1e-12;

/// Where the upright plate's answer leaves its blend, far above Ra 1e12, there is nothing to compare.
#[test]
fn an_inclined_plate_ends_as_an_upright_and_as_a_level_one() {
    let mut failures = Vec::new();
    let mut compared = 0;
    for facing in ["up", "down"] {
        for (fluid, ambient) in FLUIDS {
            for difference in [1.5, -1.5] {
                for scale in decades(-3, 2).step_by(250) {
                    let of = |draft: Draft| {
                        let draft = between(&draft, ambient + difference, ambient);
                        let case = draft.word("extrapolate", "any").read();
                        answer(&case.expect("a well-formed case"))
                    };
                    let faced = |geometry| {
                        Draft::new(geometry, fluid)
                            .word("facing", facing)
                            .number("length", scale)
                            .number("width", 0.7 * scale)
                    };
                    let inclined =
                        |tilt| of(faced("inclined-plate").number("tilt_from_vertical", tilt));
                    let upright = of(Draft::new("vertical-plate", fluid).number("height", scale));
                    let level = of(faced("horizontal-plate"));
                    for (found, expected) in [(inclined(0.0), upright), (inclined(90.0), level)] {
                        if expected.notes.contains(NoteCode::MethodStep) {
                            continue;
                        }
                        compared += 1;
                        let (found, coefficient) = (
                            found.heat_transfer_coefficient,
                            expected.heat_transfer_coefficient,
                        );
                        if (found / coefficient - 1.0).abs() > SAME {
                            failures.push(format!(
                                "{facing} in {fluid}, {scale} m: {found} for {coefficient} of {}",
                                expected.method.as_str()
                            ));
                        }
                    }
                }
            }
        }
    }
    assert!(failures.is_empty(), "{}", failures.join("\n"));
    assert!(compared > 1000, "only {compared} compared");
}
