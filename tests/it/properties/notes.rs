//! Every note, by a case that earns it and a near one that does not.

use plumeline::case::{NoteCode, Severity};
use plumeline::film::note;
use plumeline::fluids::Fluids;
use serde_json::{Value, json};

use super::requests::{ball, bath, lid, pipe, riser, slope, wall, with};
use crate::support::{answer, case};

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
        (MethodStep, ball(), json!({"diameter": "10 m"}), json!({})),
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

#[test]
fn every_note_is_earned_by_one_case_and_not_by_the_next() {
    let mut failures = Vec::new();
    for (code, base, earns, quiet) in rows() {
        for (changes, expected) in [(&earns, true), (&quiet, false)] {
            let case = case(with(&base, changes));
            let answer = answer(&case);
            if answer.notes.contains(code) != expected {
                let found: Vec<_> = answer.notes.iter().collect();
                failures.push(format!("{code:?} {changes}: {found:?}"));
            }
            if expected
                && note(code, &case, &answer, Fluids::built_in())
                    .text
                    .is_empty()
            {
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
