//! Whether a case's temperatures and pressure lie where its fluid is known.

use crate::fluids::{Fluid, StateError};
use crate::geometry::{Field, Space};

use super::fault::Fault;
use super::fields::Fields;
use super::model::{Case, Surface};

/// Adds what the fluid's table refuses to `faults`.
pub(super) fn check_temperatures(
    case: &Case,
    fields: &Fields,
    fluid: &Fluid,
    faults: &mut Vec<Fault>,
) {
    let ambient = case.ambient_temperature;
    let (checked, what) = match case.surface {
        Surface::Temperature(surface) => {
            check_density_maximum(case, surface, fluid, faults);
            (0.5 * (surface + ambient), "the film temperature")
        }
        Surface::HeatFlux(_) => (ambient, "the ambient temperature"),
    };
    let Err(error) = fluid.state(checked, &case.conditions) else {
        return;
    };
    let detail = format!(
        "{what} is {checked} K in {} at {} Pa: {error}",
        fluid.id(),
        case.conditions.pressure
    );
    for field in blamed(fields, error) {
        faults.push(Fault::at(
            field,
            "outside-table",
            detail.clone() + &hint(field, fields),
        ));
    }
}

/// The fields that a caller would look at first.
fn blamed(fields: &Fields, error: StateError) -> Vec<Field> {
    if let StateError::PressureOutside { .. } = error {
        let field = if fields.is_given(Field::Altitude) {
            Field::Altitude
        } else {
            Field::Pressure
        };
        return vec![field];
    }
    let temperatures = [
        Field::SurfaceTemperature,
        Field::HotTemperature,
        Field::AmbientTemperature,
        Field::ColdTemperature,
    ];
    let given = temperatures
        .into_iter()
        .filter(|&field| fields.is_given(field));
    let (bare, unit): (Vec<_>, Vec<_>) = given.partition(|&field| fields.is_bare(field));
    match (bare.is_empty(), unit.first()) {
        (true, Some(&first)) => vec![first],
        _ => bare,
    }
}

fn hint(field: Field, fields: &Fields) -> String {
    match fields.number(field) {
        Some(value)
            if fields.is_bare(field) && field.kind() == Field::SurfaceTemperature.kind() =>
        {
            format!(
                "; {} was read as {value} K; if degrees Celsius are meant, write \"{value} degC\"",
                field.name()
            )
        }
        _ => String::new(),
    }
}

/// Refuses two temperatures between which the buoyancy turns round.
fn check_density_maximum(case: &Case, surface: f64, fluid: &Fluid, faults: &mut Vec<Fault>) {
    let Some(turn) = fluid.density_maximum(&case.conditions) else {
        return;
    };
    let ambient = case.ambient_temperature;
    if surface.min(ambient) < turn && turn < surface.max(ambient) {
        let field = match case.geometry.entry().space {
            Space::Closed => Field::HotTemperature,
            Space::Open | Space::Channel => Field::SurfaceTemperature,
        };
        faults.push(Fault::at(
            field,
            "density-maximum",
            format!(
                "{surface} K and {ambient} K lie on both sides of {turn:.2} K, where {} is densest: part of the layer rises and part sinks, and no method here covers that; give two temperatures on one side",
                fluid.id()
            ),
        ));
    }
}
