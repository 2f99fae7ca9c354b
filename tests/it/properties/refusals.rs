//! What has no answer is refused, at the field and by the name that mends it.

use plumeline::fluids::Fluids;
use serde_json::json;

use super::requests::{attic, bath, fins, glazing, jacket, lid, pipe, wall, with};
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
            glazing(),
            json!({"hot_temperature": "0 degC"}),
            "conflicting-fields",
            "#/hot_temperature",
        ),
        (
            glazing(),
            json!({"hot_temperature": 60, "cold_temperature": 20}),
            "outside-table",
            "#/hot_temperature",
        ),
        (
            glazing(),
            json!({"hot_temperature": 60, "cold_temperature": 20}),
            "outside-table",
            "#/cold_temperature",
        ),
        (
            glazing(),
            json!({"fluid": "water", "emissivity_hot": null, "emissivity_cold": null, "cold_temperature": "2 degC"}),
            "density-maximum",
            "#/hot_temperature",
        ),
        (
            glazing(),
            json!({"fluid": "water"}),
            "unexpected-field",
            "#/emissivity_cold",
        ),
        (
            glazing(),
            json!({"emissivity_cold": null}),
            "missing-field",
            "#/emissivity_cold",
        ),
        (
            glazing(),
            json!({"heat_flux": "10 W/m2"}),
            "unexpected-field",
            "#/heat_flux",
        ),
        (
            glazing(),
            json!({"draught_speed": "1 m/s"}),
            "unexpected-field",
            "#/draught_speed",
        ),
        (
            glazing(),
            json!({"method": "vertical-cavity-berkovsky-polevikov"}),
            "outside-method-range",
            "#/method",
        ),
        (
            attic(),
            json!({"heated_from": null}),
            "missing-field",
            "#/heated_from",
        ),
        (
            attic(),
            json!({"heated_from": "left"}),
            "unknown-value",
            "#/heated_from",
        ),
        (
            attic(),
            json!({"method": "horizontal-layer-conduction"}),
            "method-does-not-fit",
            "#/method",
        ),
        (
            jacket(),
            json!({"outer_diameter": "50 mm"}),
            "conflicting-fields",
            "#/outer_diameter",
        ),
        (
            fins(),
            json!({"emissivity": 0.9}),
            "unexpected-field",
            "#/emissivity",
        ),
        (
            fins(),
            json!({"heated_walls": null}),
            "missing-field",
            "#/heated_walls",
        ),
        (
            pipe(),
            json!({"draught_direction": "across"}),
            "missing-field",
            "#/draught_speed",
        ),
        (
            pipe(),
            json!({"diameter": "DN 81"}),
            "unknown-value",
            "#/diameter",
        ),
        (
            bath(),
            json!({"fluid": "ethylene-glycol-water"}),
            "missing-field",
            "#/concentration",
        ),
        (
            bath(),
            json!({"fluid": "ethylene-glycol-water", "concentration": 0.9}),
            "outside-table",
            "#/concentration",
        ),
        (
            bath(),
            json!({"concentration": 0.3}),
            "unexpected-field",
            "#/concentration",
        ),
        (
            bath(),
            json!({"relative_humidity": 0.5}),
            "unexpected-field",
            "#/relative_humidity",
        ),
        (
            pipe(),
            json!({"relative_humidity": 1, "ambient_temperature": "120 degC", "surface_temperature": "130 degC"}),
            "outside-table",
            "#/relative_humidity",
        ),
        (
            bath(),
            json!({"fluid": "ethylene-glycol-water", "concentration": 0.2, "surface_temperature": "-20 degC", "ambient_temperature": "-10 degC"}),
            "outside-table",
            "#/surface_temperature",
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
