//! What holds for every well-formed case, over all bodies, fluids, methods and ranges.

mod notes;
mod refusals;
mod requests;
mod sample;

use plumeline::case::{Answer, Case, Cell, Column, NoteCode, PROPERTIES, Surface, Wanted};
use plumeline::film::{Failure, Outcome, alternatives, evaluate, note};
use plumeline::fluids::Fluids;
use plumeline::geometry::{Extrapolate, Facing, Field, Space};
use plumeline::methods::{Heating, MethodId, RangeStatus, ReferenceTemperature, Side};
use plumeline::quantity::{Kind, Unit};
use proptest::prelude::*;
use proptest::test_runner::RngSeed;

use super::bodies::{BODIES, HEATABLE};
use super::support::{outcome, outcome_of};
use sample::{Sample, case_of, sample};

/// Where every run starts, so that a failure is the same on every machine.
const SEED: u64 = 20_251_201;

fn config(cases: u32) -> ProptestConfig {
    ProptestConfig {
        cases,
        rng_seed: RngSeed::Fixed(SEED),
        failure_persistence: None,
        ..ProptestConfig::default()
    }
}

/// Everything in an answer that is no finite number or out of its bounds.
fn flaws(case: &Case, answer: &Answer) -> Vec<String> {
    let mut flaws = Vec::new();
    for column in Column::ALL {
        if let Cell::Number(Some(number)) = (column.entry().cell)(answer)
            && !number.is_finite()
        {
            flaws.push(format!("{} is {number}", column.name()));
        }
    }
    for property in PROPERTIES {
        let value = (property.of)(&answer.state);
        let positive = value > 0.0 || property.name == "expansion";
        if !(value.is_finite() && positive) {
            flaws.push(format!("{} is {value}", property.name));
        }
    }
    let difference = answer.surface_temperature - case.ambient_temperature;
    if difference != 0.0 && answer.nusselt <= 0.0 {
        flaws.push(format!("nusselt is {} at {difference} K", answer.nusselt));
    }
    if answer.convective.flux * difference < 0.0 {
        flaws.push(format!("{:?} at {difference} K", answer.convective));
    }
    // Only conduction across a still gap has none.
    let is_exact = answer.method == MethodId::HorizontalLayerConduction;
    if is_exact != (answer.scatter == 0.0) || !(0.0..1.0).contains(&answer.scatter) {
        flaws.push(format!("scatter is {}", answer.scatter));
    }
    if case.geometry.entry().space == Space::Closed && answer.nusselt < 1.0 {
        flaws.push(format!("nusselt is {} in a gap", answer.nusselt));
    }
    let coefficient = answer.heat_transfer_coefficient;
    match (answer.low, answer.high) {
        (Some(low), Some(high)) if low <= coefficient && coefficient <= high => {}
        spread => flaws.push(format!("{spread:?} about {coefficient}")),
    }
    for other in alternatives(case, answer, Fluids::built_in()) {
        let finite = other.nusselt.is_finite() && other.heat_transfer_coefficient.is_finite();
        if !finite || difference != 0.0 && other.nusselt <= 0.0 {
            flaws.push(format!("{other:?}"));
        }
    }
    for code in answer.notes.iter() {
        let text = note(code, case, answer, Fluids::built_in()).text;
        let mut words = text.split(|character: char| !character.is_alphabetic());
        if text.is_empty() || words.any(|word| word == "NaN" || word == "inf") {
            flaws.push(format!("{code:?}: {text}"));
        }
    }
    flaws
}

/// Whether the range status, the notes about it and what the caller allowed go together.
fn is_consistent(case: &Case, answer: &Answer) -> bool {
    let outside = [
        NoteCode::RayleighBelowRange,
        NoteCode::RayleighAboveRange,
        NoteCode::PrandtlOutsideRange,
        NoteCode::ShapeOutsideRange,
    ];
    let told = outside.iter().any(|&code| answer.notes.contains(code));
    let moves = answer.rayleigh > 0.0;
    let allowed = match case.extrapolate.as_str() {
        "none" => answer.range_status == RangeStatus::Within,
        "near" => answer.range_status != RangeStatus::Beyond,
        _ => true,
    };
    let steps = answer.notes.contains(NoteCode::MethodStep);
    let held = case.method.is_none_or(|id| id == answer.method && !steps);
    let ranged = allowed && told == (answer.range_status != RangeStatus::Within);
    (ranged || !moves) && held && steps == (answer.method_step.abs() > 0.01)
}

#[test]
fn ordinary_heat_fluxes_have_a_temperature() {
    let mut failures = Vec::new();
    for body in &BODIES[..HEATABLE] {
        for (fluid, ambient) in [("air", 293.15), ("water", 313.15), ("engine-oil", 350.0)] {
            for scale in [0.1, 1.0, 3.0] {
                for flux in [-100.0, -10.0, -1.0, 1.0, 10.0, 100.0, 400.0] {
                    let case = case_of(
                        &body
                            .draft(fluid, scale)
                            .number("ambient_temperature", ambient)
                            .number("heat_flux", flux)
                            .word("extrapolate", "any"),
                    );
                    let surface = outcome(&case).map(|answer| answer.surface_temperature);
                    if !surface.is_ok_and(|surface| (surface > ambient) == (flux > 0.0)) {
                        failures.push(format!(
                            "{} in {fluid}, {scale}, {flux} W/m2: {surface:?}",
                            body.label()
                        ));
                    }
                }
            }
        }
    }
    assert!(failures.is_empty(), "{}", failures.join("\n"));
}

fn relative(found: f64, expected: f64) -> f64 {
    (found - expected).abs() / expected.abs().max(f64::MIN_POSITIVE)
}

proptest! {
    #![proptest_config(config(20_000))]

    #[test]
    fn every_number_of_an_answer_is_finite_and_in_its_bounds(sample in sample()) {
        let case = sample.isothermal();
        match outcome(&case) {
            Ok(answer) => {
                let flaws = flaws(&case, &answer);
                prop_assert!(flaws.is_empty(), "{case:#?}\n{}", flaws.join("\n"));
                prop_assert!(is_consistent(&case, &answer), "{case:#?}\n{answer:#?}");
            }
            // Neither words nor the digest of a refusal may fail.
            Err(failure) => prop_assert!(!failure.fault(&case, Fluids::built_in()).detail.is_empty()),
        }
    }

    #[test]
    fn the_automatic_choice_always_answers_where_any_range_will_do(sample in sample()) {
        let case = sample.automatic().anywhere().still().isothermal();
        let outcome = outcome(&case);
        prop_assert!(outcome.is_ok(), "{case:#?}\n{outcome:#?}");
    }

    #[test]
    fn the_mirrored_case_has_the_mirrored_heat(sample in sample()) {
        let place = sample.heatable().still().dry().place(Heating::Isothermal);
        let case = case_of(&place.isothermal());
        let mut mirror = case_of(&place.mirrored().isothermal());
        mirror.facing = case.facing.map(|facing| match facing {
            Facing::Up => Facing::Down,
            Facing::Down => Facing::Up,
        });
        if let (Ok(answer), Ok(other)) = (outcome(&case), outcome(&mirror))
            && answer.method.method().reference == ReferenceTemperature::Film
        {
            prop_assert_eq!(answer.method, other.method);
            let (flux, mirrored) = (answer.convective.flux, other.convective.flux);
            prop_assert!(relative(-mirrored, flux) < 1e-9, "{flux} and {mirrored}\n{case:#?}");
        }
    }

    #[test]
    fn equal_temperatures_have_no_heat(sample in sample()) {
        let mut case = sample.isothermal();
        case.surface = Surface::Temperature(case.ambient_temperature);
        case.surroundings_temperature = case.ambient_temperature;
        if Fluids::built_in().get(case.fluid).state(case.ambient_temperature, &case.conditions).is_ok() {
            match outcome(&case) {
                Ok(answer) => {
                    let flaws = flaws(&case, &answer);
                    prop_assert!(flaws.is_empty(), "{case:#?}\n{}", flaws.join("\n"));
                    prop_assert_eq!(answer.total.flux, 0.0);
                    prop_assert!(answer.notes.contains(NoteCode::EqualTemperatures));
                }
                Err(failure) => {
                    prop_assert!(matches!(failure, Failure::Side { .. }), "{failure:?}\n{case:#?}");
                }
            }
        }
    }

    #[test]
    fn wanted_columns_do_not_depend_on_what_else_is_wanted(
        sample in sample(), column in 0..Column::ALL.len(),
    ) {
        let (case, column) = (sample.isothermal(), Column::ALL[column]);
        let cell = |outcome: Outcome| outcome.map(|answer| bits((column.entry().cell)(&answer)));
        let alone = outcome_of(&case, Wanted::of(&[column]));
        prop_assert_eq!(cell(alone), cell(outcome(&case)));
    }
}

/// A cell that compares bit for bit.
fn bits(cell: Cell) -> String {
    match cell {
        Cell::Number(number) => format!("{:?}", number.map(f64::to_bits)),
        other => format!("{other:?}"),
    }
}

proptest! {
    #![proptest_config(config(200))]

    #[test]
    fn a_block_answers_as_its_cases_do_alone(samples in prop::collection::vec(sample(), 1..60)) {
        let cases: Vec<Case> = samples.iter().map(Sample::isothermal).collect();
        let mut block = Vec::new();
        evaluate(&cases, Fluids::built_in(), Wanted::ALL, &mut block);
        prop_assert_eq!(block.len(), cases.len());
        for (case, together) in cases.iter().zip(block) {
            let cells = |outcome: Outcome| {
                outcome.map(|answer| {
                    let columns = Column::ALL.iter();
                    columns.map(|column| bits((column.entry().cell)(&answer))).collect::<Vec<_>>()
                })
            };
            prop_assert_eq!(cells(together), cells(outcome(case)));
        }
    }
}

fn is_smooth(id: MethodId) -> bool {
    id.method().edges.is_empty()
}

/// A sample with a heat flux of ten to a power, W/m2, for its surface temperature.
fn heated(sample: Sample, flux: f64) -> (Case, f64) {
    let place = sample.heatable().place(Heating::UniformFlux);
    let flux = place.difference.signum() * 10_f64.powf(flux);
    let draft = place
        .humid(place.film)
        .number("ambient_temperature", place.film)
        .number("heat_flux", flux);
    (case_of(&draft), flux)
}

/// Checks that a found surface temperature carries the flux that it was found for, in the answer
/// and, where the method serves both heatings, in the case of that temperature.
fn comes_back(case: &Case, flux: f64) -> Result<(), TestCaseError> {
    let answer = match outcome(case) {
        Ok(answer) => answer,
        Err(Failure::Unsolved { minimum, maximum }) => {
            let missed = attained(case, flux, minimum, maximum);
            prop_assert!(missed.is_none(), "{flux} at {missed:?} K\n{case:#?}");
            return Ok(());
        }
        Err(failure) => {
            let refused = matches!(failure, Failure::Side { .. } | Failure::Range { .. });
            prop_assert!(refused, "{failure:?}\n{case:#?}");
            return Ok(());
        }
    };
    let flaws = flaws(case, &answer);
    prop_assert!(flaws.is_empty(), "{case:#?}\n{}", flaws.join("\n"));
    let found = answer.total.flux;
    prop_assert!(
        carries(&answer, flux),
        "{found} for {flux}\n{case:#?}\n{answer:#?}"
    );
    if answer.method.method().heating == Heating::Either {
        let back = outcome(&Case {
            surface: Surface::Temperature(answer.surface_temperature),
            method: Some(answer.method),
            ..*case
        });
        let agrees = back.is_ok_and(|back| carries(&back, flux));
        prop_assert!(agrees, "{back:#?} for {flux}\n{case:#?}");
    }
    Ok(())
}

/// Whether an answer's total is a flux to 1e-8, or as far as a temperature found to 1e-10 K allows.
fn carries(answer: &Answer, flux: f64) -> bool {
    let combined = answer.draught.map(|draught| draught.combined_coefficient);
    let slope = combined.unwrap_or(answer.heat_transfer_coefficient)
        + 4.0 * answer.radiative_coefficient.unwrap_or_default();
    (answer.total.flux - flux).abs() <= 1e-8 * flux.abs() + 2e-10 * slope
}

/// The surface temperature at which a flux leaves, by halving a span; none if it is not in reach.
fn attained(case: &Case, flux: f64, minimum: f64, maximum: f64) -> Option<f64> {
    let (mut low, mut high) = (minimum, maximum);
    for _ in 0..200 {
        let middle = 0.5 * (low + high);
        if total_at(case, middle) < flux {
            low = middle;
        } else {
            high = middle;
        }
    }
    (relative(total_at(case, high), flux) < 1e-6).then_some(high)
}

/// The heat flux at a surface temperature. Where the case is refused it is answered out of range,
/// and where the method is for the other side it is that of the ambient, where the side changes.
fn total_at(case: &Case, surface: f64) -> f64 {
    let at = |surface, extrapolate| {
        outcome(&Case {
            surface: Surface::Temperature(surface),
            extrapolate,
            ..*case
        })
    };
    at(surface, case.extrapolate)
        .or_else(|_| at(surface, Extrapolate::Any))
        .or_else(|_| at(case.ambient_temperature, Extrapolate::Any))
        .map_or(f64::NAN, |answer| answer.total.flux)
}

proptest! {
    #![proptest_config(config(10_000))]

    #[test]
    fn a_solved_heat_flux_comes_back_from_its_temperature(
        sample in sample(), flux in -1.0..5.0_f64,
    ) {
        let (case, flux) = heated(sample.anywhere(), flux);
        if case.method.is_some_and(|id| id.method().side == Side::Any && is_smooth(id)) {
            comes_back(&case, flux)?;
        }
    }

    #[test]
    fn a_heat_flux_solved_by_a_method_for_one_side_comes_back(
        sample in sample(), flux in -1.0..5.0_f64,
    ) {
        let (case, flux) = heated(sample.anywhere(), flux);
        if case.method.is_some_and(|id| id.method().side != Side::Any && is_smooth(id)) {
            comes_back(&case, flux)?;
        }
    }

    #[test]
    fn a_heat_flux_solved_across_methods_and_bands_comes_back(
        sample in sample(), flux in -1.0..5.0_f64,
    ) {
        let (case, flux) = heated(sample, flux);
        let refused = matches!(outcome(&case), Err(Failure::Unsolved { .. }));
        // A flux in the step between two methods or bands has no temperature.
        if case.method.is_none_or(|id| !is_smooth(id)) && !refused {
            comes_back(&case, flux)?;
        }
    }

    #[test]
    fn other_units_lead_to_the_same_answer(
        sample in sample(), difference in 0.0..2.0_f64, units in prop::array::uniform3(0..4_usize),
    ) {
        let place = sample.in_ambient().with_difference(difference).place(Heating::Isothermal);
        let written = place.isothermal();
        let rewritten = written.rewritten(|name, value| {
            let kind = Field::from_name(name).and_then(Field::kind).unwrap_or(Kind::Number);
            let unit = match kind {
                Kind::Length => ["mm", "in", "ft", "cm"][units[0]],
                Kind::Temperature => ["degC", "degF", "degR", "degC"][units[1]],
                Kind::Pressure => ["bar", "psig", "barg", "kPa"][units[2]],
                Kind::Speed => ["km/h", "ft/s", "mph", "kn"][units[2]],
                _ => return None,
            };
            let unit = Unit::find(kind, unit).expect("a unit of the kind");
            Some(format!("{} {}", unit.from_si(value), unit.symbol()))
        });
        let wide = place.difference.abs() >= 1.0;
        let (case, again) = (case_of(&written), case_of(&rewritten));
        if let (Ok(answer), Ok(other)) = (outcome(&case), outcome(&again)) && wide {
            prop_assert_eq!(answer.method, other.method);
            for column in Column::ALL {
                let cells = [&answer, &other].map(|answer| (column.entry().cell)(answer));
                if let [Cell::Number(Some(one)), Cell::Number(Some(two))] = cells {
                    prop_assert!(relative(two, one) < 1e-12 || one == two, "{}: {one} and {two}\n{case:#?}", column.name());
                }
            }
        }
    }
}
