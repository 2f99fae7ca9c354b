//! Every note, by a case that earns it and a near one that does not.

use plumeline::case::{NoteCode, Severity, Wanted};
use plumeline::film::note;
use plumeline::fluids::{Fluid, Fluids, OwnTable};
use serde_json::{Value, json};

use super::requests::{attic, ball, bath, glazing, lid, pipe, riser, slope, wall, with};
use crate::support::{answer, case, outcome_among, read_among, request};

/// A code, a base, what earns the note and what does not.
type Row = (NoteCode, Value, Value, Value);

fn rows() -> Vec<Row> {
    use NoteCode::*;
    let oil = |surface: &str| json!({"fluid": "engine-oil", "surface_temperature": surface, "ambient_temperature": "100 degC"});
    vec![
        (
            RayleighBelowRange,
            lid(),
            json!({"length": "1 mm", "width": "1 mm"}),
            json!({}),
        ),
        (
            RayleighAboveRange,
            wall(),
            json!({"height": "15 m"}),
            json!({}),
        ),
        (
            PrandtlOutsideRange,
            with(
                &riser(),
                &json!({"emissivity": null, "fluid": "ethylene-glycol"}),
            ),
            json!({"surface_temperature": "40 degC", "ambient_temperature": "30 degC"}),
            json!({"surface_temperature": "70 degC", "ambient_temperature": "60 degC"}),
        ),
        (
            ShapeOutsideRange,
            slope(),
            json!({"tilt_from_vertical": 61}),
            json!({"tilt_from_vertical": 60}),
        ),
        (MethodStep, ball(), json!({"diameter": "5 m"}), json!({})),
        (
            MethodStep,
            glazing(),
            json!({"gap": "0.51 m", "height": "1 m"}),
            json!({"gap": "0.8 m", "height": "1 m"}),
        ),
        (
            Transition,
            wall(),
            json!({"height": "1 m"}),
            json!({"height": "0.2 m"}),
        ),
        (
            Transition,
            wall(),
            json!({"height": "1 m"}),
            json!({"height": "4 m"}),
        ),
        (
            ShapeOutsideRange,
            glazing(),
            json!({"gap": "1.2 m", "height": "1 m"}),
            json!({"gap": "1 m", "height": "1 m"}),
        ),
        (
            PureConduction,
            attic(),
            json!({"heated_from": "above"}),
            json!({}),
        ),
        (
            PureConduction,
            attic(),
            json!({"gap": "9 mm"}),
            json!({"gap": "12 mm"}),
        ),
        (
            DraughtMatters,
            pipe(),
            json!({"draught_speed": "0.1 m/s"}),
            json!({"draught_speed": "0.05 m/s"}),
        ),
        (
            DraughtMatters,
            pipe(),
            json!({"draught_speed": "0.5 m/s"}),
            json!({"draught_speed": "1 m/s"}),
        ),
        (
            DraughtGoverns,
            pipe(),
            json!({"draught_speed": "1 m/s"}),
            json!({"draught_speed": "0.5 m/s"}),
        ),
        (
            Confined,
            pipe(),
            json!({"clearance": "10 mm"}),
            json!({"clearance": "20 mm"}),
        ),
        (
            NominalSize,
            pipe(),
            json!({"diameter": "3 in"}),
            json!({"diameter": "NPS 3"}),
        ),
        (
            ThinCylinder,
            riser(),
            json!({"diameter": "25 mm"}),
            json!({"diameter": "1 m"}),
        ),
        (
            EndsNotCounted,
            riser(),
            json!({"diameter": "0.21 m"}),
            json!({"diameter": "0.2 m"}),
        ),
        (
            RadiationNotCounted,
            pipe(),
            json!({"emissivity": null}),
            json!({}),
        ),
        (
            RadiationNotCounted,
            pipe(),
            json!({"emissivity": null}),
            json!({"emissivity": null, "fluid": "water"}),
        ),
        (
            LowEmissivityReading,
            pipe(),
            json!({"emissivity": 0.49}),
            json!({"emissivity": 0.5}),
        ),
        (
            LowEmissivityReading,
            pipe(),
            json!({"emissivity": 0.1}),
            json!({"emissivity": 0.1, "surface_temperature": null, "heat_flux": "100 W/m2"}),
        ),
        (
            MethodsDisagree,
            wall(),
            json!({"height": "0.8 m"}),
            json!({"height": "50 mm"}),
        ),
        (
            StrongPropertyVariation,
            pipe(),
            json!({"surface_temperature": "320 degC"}),
            json!({"surface_temperature": "310 degC"}),
        ),
        (
            StrongPropertyVariation,
            bath(),
            json!({"surface_temperature": "70 degC"}),
            json!({}),
        ),
        (
            DensityMaximum,
            bath(),
            json!({"surface_temperature": "12 degC", "ambient_temperature": "9 degC"}),
            json!({"surface_temperature": "13 degC", "ambient_temperature": "11 degC"}),
        ),
        (
            MayBoil,
            bath(),
            json!({"surface_temperature": "105 degC"}),
            json!({"surface_temperature": "105 degC", "pressure": "3 bar"}),
        ),
        (
            MayCondense,
            with(
                &pipe(),
                &json!({"fluid": "steam", "ambient_temperature": "150 degC"}),
            ),
            json!({"surface_temperature": "90 degC"}),
            json!({"surface_temperature": "101 degC"}),
        ),
        (
            MayCondense,
            with(&pipe(), &json!({"relative_humidity": 0.6})),
            json!({"surface_temperature": "10 degC"}),
            json!({"surface_temperature": "14 degC"}),
        ),
        (
            MayFreeze,
            with(
                &bath(),
                &json!({"fluid": "ethylene-glycol-water", "concentration": 0.3, "ambient_temperature": "0 degC"}),
            ),
            json!({"surface_temperature": "-20 degC"}),
            json!({"surface_temperature": "-5 degC"}),
        ),
        (
            MayFreeze,
            bath(),
            json!({"surface_temperature": "-1 degC", "ambient_temperature": "3 degC"}),
            json!({"surface_temperature": "1 degC", "ambient_temperature": "3 degC"}),
        ),
        (
            BurnHazard,
            pipe(),
            json!({"surface_temperature": "43 degC"}),
            json!({"surface_temperature": "42 degC"}),
        ),
        (
            AboveFlashPoint,
            with(&pipe(), &json!({"emissivity": null})),
            oil("200 degC"),
            oil("199 degC"),
        ),
        (
            BareNumberAsKelvin,
            pipe(),
            json!({"surface_temperature": 230, "ambient_temperature": 200}),
            json!({"surface_temperature": 230, "ambient_temperature": "200 K"}),
        ),
        (
            IdealGasFallback,
            with(&pipe(), &json!({"fluid": "argon"})),
            json!({"pressure": "1.1 bar"}),
            json!({}),
        ),
        (
            RoughExpansion,
            bath(),
            json!({"fluid": "rough-oil"}),
            json!({"fluid": "smooth-oil"}),
        ),
        (
            TableEdge,
            pipe(),
            json!({"surface_temperature": "156 K", "ambient_temperature": "154 K"}),
            json!({"surface_temperature": "166 K", "ambient_temperature": "164 K"}),
        ),
        (
            EqualTemperatures,
            pipe(),
            json!({"surface_temperature": "20 degC"}),
            json!({"surface_temperature": "20.001 degC"}),
        ),
    ]
}

/// The built-in fluids and two of a caller's, one with densities that were rounded to tens.
fn fluids() -> Fluids {
    let oil = |id: &str, density: [f64; 5]| OwnTable {
        id: id.to_owned(),
        temperature: vec![280.0, 300.0, 320.0, 340.0, 360.0],
        density: density.to_vec(),
        specific_heat: vec![1900.0, 1980.0, 2060.0, 2140.0, 2220.0],
        viscosity: Some(vec![0.2, 0.08, 0.035, 0.018, 0.01]),
        conductivity: vec![0.135, 0.133, 0.131, 0.129, 0.127],
        ..OwnTable::default()
    };
    let smooth = oil("smooth-oil", [882.0, 869.2, 856.4, 843.6, 830.8]);
    let rough = oil("rough-oil", [880.0, 870.0, 860.0, 840.0, 830.0]);
    [smooth, rough]
        .into_iter()
        .map(|table| Fluid::from_own(table).unwrap_or_else(|faults| panic!("{faults:#?}")))
        .fold(Fluids::built_in().clone(), |fluids, oil| {
            fluids.with_own(oil).0
        })
}

#[test]
fn every_note_is_earned_by_one_case_and_not_by_the_next() {
    let fluids = fluids();
    let mut failures = Vec::new();
    for (code, base, earns, quiet) in rows() {
        for (changes, expected) in [(&earns, true), (&quiet, false)] {
            let case = read_among(&request(with(&base, changes)), &fluids)
                .unwrap_or_else(|faults| panic!("{changes}: {faults:#?}"));
            let answer = outcome_among(&case, Wanted::ALL, &fluids)
                .unwrap_or_else(|failure| panic!("{changes}: {failure:?}"));
            if answer.notes.contains(code) != expected {
                let found: Vec<_> = answer.notes.iter().collect();
                failures.push(format!("{code:?} {changes}: {found:?}"));
            }
            if expected && note(code, &case, &answer, &fluids).text.is_empty() {
                failures.push(format!("{code:?}: no words"));
            }
        }
    }
    let listed: Vec<_> = rows().into_iter().map(|(code, ..)| code).collect();
    for code in NoteCode::ALL {
        if !listed.contains(code) {
            failures.push(format!("{code:?} is not listed"));
        }
    }
    assert!(failures.is_empty(), "{}", failures.join("\n"));
}

/// Where an opposing draught is as strong as the rising air, no value between nothing and the
/// larger of the two is safe.
#[test]
fn a_draught_that_cancels_free_convection_is_a_warning() {
    let case = case(with(
        &wall(),
        &json!({"draught_speed": "1.7 m/s", "draught_direction": "opposing"}),
    ));
    let answer = answer(&case);
    let draught = answer.draught.expect("a draught");
    assert!(draught.cancels, "{draught:?}");
    let note = note(NoteCode::DraughtMatters, &case, &answer, Fluids::built_in());
    assert_eq!(note.severity, Severity::Warning);
    assert_eq!(answer.low, Some(0.0));
    let larger = draught
        .forced_coefficient
        .max(answer.heat_transfer_coefficient);
    assert_eq!(answer.high, Some(larger));
}

/// 43, 51 and 60 degrees Celsius, at which contact burns in hours, in a minute, and guards are asked for.
#[test]
fn burn_hazards_grow_with_temperature() {
    for (surface, expected) in [
        ("43 degC", Severity::Info),
        ("50.9 degC", Severity::Info),
        ("51 degC", Severity::Caution),
        ("59.9 degC", Severity::Caution),
        ("60 degC", Severity::Warning),
        ("300 degC", Severity::Warning),
    ] {
        let case = case(with(&pipe(), &json!({"surface_temperature": surface})));
        let note = note(
            NoteCode::BurnHazard,
            &case,
            &answer(&case),
            Fluids::built_in(),
        );
        assert_eq!(note.severity, expected, "{surface}");
    }
}
