//! What has no answer is refused, at the field and by the name that mends it.

use plumeline::fluids::Fluids;
use serde_json::json;

use super::requests::{bath, lid, pipe, wall, with};
use crate::support::{outcome, read, request};

#[test]
fn what_has_no_answer_is_refused_by_name() {
    let mut failures = Vec::new();
    for (base, changes, code, pointer) in [
        (
            pipe(),
            json!({"surface_temperature": 85, "ambient_temperature": 20}),
            "outside-table",
            "#/surface_temperature",
        ),
        (
            pipe(),
            json!({"surface_temperature": 85, "ambient_temperature": 20}),
            "outside-table",
            "#/ambient_temperature",
        ),
        (
            bath(),
            json!({"surface_temperature": "2 degC", "ambient_temperature": "10 degC"}),
            "density-maximum",
            "#/surface_temperature",
        ),
        (
            bath(),
            json!({"emissivity": 0.9}),
            "unexpected-field",
            "#/emissivity",
        ),
        (
            bath(),
            json!({"surface_temperature": "150 degC", "ambient_temperature": "90 degC"}),
            "outside-table",
            "#/surface_temperature",
        ),
        (
            pipe(),
            json!({"surface_temperature": "40 C deg"}),
            "unknown-unit",
            "#/surface_temperature",
        ),
        (
            pipe(),
            json!({"surface_temperature": "40 K/W"}),
            "unknown-unit",
            "#/surface_temperature",
        ),
        (
            pipe(),
            json!({"diameter": "88,9 mm"}),
            "decimal-comma",
            "#/diameter",
        ),
        (
            pipe(),
            json!({"diameter": "88.9 kg"}),
            "wrong-kind",
            "#/diameter",
        ),
        (
            pipe(),
            json!({"diameter": 0}),
            "outside-limits",
            "#/diameter",
        ),
        (
            pipe(),
            json!({"pressure": "-2 barg"}),
            "outside-limits",
            "#/pressure",
        ),
        (
            pipe(),
            json!({"pressure": "40 bar"}),
            "outside-table",
            "#/pressure",
        ),
        (
            pipe(),
            json!({"method": "sphere-yuge"}),
            "method-does-not-fit",
            "#/method",
        ),
        (
            lid(),
            json!({"method": "horizontal-plate-mcadams"}),
            "method-does-not-fit",
            "#/method",
        ),
        (
            pipe(),
            json!({"method": "horizontal-cylinder-power-law", "diameter": "1 mm"}),
            "outside-method-range",
            "#/method",
        ),
        (
            wall(),
            json!({"height": "15 m", "extrapolate": "none", "method": "vertical-plate-raithby-hollands"}),
            "outside-method-range",
            "#/method",
        ),
        (
            pipe(),
            json!({"surface_temperature": null, "heat_flux": "10000 kW/m2"}),
            "no-solution",
            "#/heat_flux",
        ),
    ] {
        let request = request(with(&base, &changes));
        let faults = match read(&request) {
            Err(faults) => faults,
            Ok(case) => {
                let failure = outcome(&case).err();
                failure
                    .map(|failure| failure.fault(&case, Fluids::built_in()))
                    .into_iter()
                    .collect()
            }
        };
        if !faults
            .iter()
            .any(|fault| fault.code == code && fault.pointer == pointer)
        {
            failures.push(format!("{changes}: {code} at {pointer}, but {faults:#?}"));
        }
    }
    assert!(failures.is_empty(), "{}", failures.join("\n"));
}
