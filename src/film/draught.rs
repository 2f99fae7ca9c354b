//! A draught beside free convection.

use crate::case::{Across, Case, Draught, DraughtResult};
use crate::fluids::{Fluid, State, StateError};
use crate::geometry::{DraughtDirection, Geometry};
use crate::methods::forced::{CYLINDER, Forced, PLATE, SPHERE};

/// Share of the larger part above which opposing parts nearly cancel and no value is safe.
const CANCELLATION: f64 = 0.5;

/// The method for what a draught meets, and its length.
pub fn forced_part(case: &Case, draught: Draught) -> (&'static Forced, f64) {
    let flow = case.size.flow;
    match (draught.direction, flow.across) {
        (_, Across::Sphere(diameter)) => (&SPHERE, diameter),
        (DraughtDirection::Across, Across::Plate(length)) => (&PLATE, length),
        (DraughtDirection::Across, Across::Cylinder(diameter)) => (&CYLINDER, diameter),
        (_, Across::Cylinder(diameter)) if case.geometry == Geometry::HorizontalCylinder => {
            (&CYLINDER, diameter)
        }
        (_, Across::Plate(_) | Across::Cylinder(_)) => (&PLATE, flow.along),
    }
}

/// Adds a draught to a free coefficient.
///
/// # Errors
/// The fluid is not known at a temperature that the forced method wants.
///
/// # Source
/// `h^m = |h_forced^m + h_free^m|`, minus when opposing: Churchill, S. W. 1977, AIChE Journal 23, 10-16; m as in handbooks.
pub(super) fn combine(
    case: &Case,
    draught: Draught,
    fluid: &Fluid,
    film: &State,
    surface: f64,
    free: f64,
) -> Result<DraughtResult, StateError> {
    let (method, length) = forced_part(case, draught);
    let stream;
    let (state, viscosity_ratio) = if method.stream_properties {
        stream = fluid.state(case.ambient_temperature, &case.conditions)?;
        // Where the surface is hotter than the table, the film's viscosity is the nearest known.
        let at_surface = fluid.state(surface, &case.conditions).unwrap_or(*film);
        (&stream, stream.viscosity / at_surface.viscosity)
    } else {
        (film, 1.0)
    };
    let reynolds = draught.speed * length / state.kinematic_viscosity();
    let nusselt = (method.nusselt)(reynolds, state.prandtl(), viscosity_ratio);
    let per_nusselt = state.conductivity / length;
    let rest = method.at_rest * per_nusselt;
    let forced = nusselt * per_nusselt;
    let opposing = draught.direction == DraughtDirection::Opposing;
    let exponent = exponent(case, draught);
    let (moved, rising) = ((forced - rest).max(0.0), (free - rest).max(0.0));
    let large = moved.max(rising);
    let combined = if large == 0.0 {
        0.0
    } else {
        let sum =
            |sign: f64| (moved / large).powf(exponent) + sign * (rising / large).powf(exponent);
        large
            * sum(if opposing { -1.0 } else { 1.0 })
                .abs()
                .powf(1.0 / exponent)
    };
    let difference = (surface - case.ambient_temperature).abs();
    Ok(DraughtResult {
        richardson: case.gravity
            * film.expansion.abs()
            * difference
            * case.size.characteristic_length
            / draught.speed.powi(2),
        reynolds,
        prandtl: state.prandtl(),
        forced_coefficient: forced,
        combined_coefficient: combined + rest.min(free),
        cancels: opposing && moved.min(rising) > CANCELLATION * large,
    })
}

/// The exponent of the combination: 3, 3.5 for level plates, 4 for cylinders and spheres across the flow.
fn exponent(case: &Case, draught: Draught) -> f64 {
    match (case.geometry, case.size.flow.across) {
        (Geometry::HorizontalPlate, _) => 3.5,
        (_, Across::Sphere(_)) => 4.0,
        (_, Across::Cylinder(_)) if draught.direction == DraughtDirection::Across => 4.0,
        (Geometry::HorizontalCylinder, _) => 4.0,
        _ => 3.0,
    }
}
