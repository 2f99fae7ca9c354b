//! The surface temperature that a known heat flux implies.

use roots::{SimpleConvergency, find_root_brent};

use crate::case::Case;
use crate::fluids::Fluid;
use crate::geometry::Extrapolate;
use crate::methods::ReferenceTemperature;

use super::failure::Failure;
use super::layer::Layer;
use super::radiation;

/// Temperatures closer than this, and fluxes smaller than this, are one.
const TOLERANCE: f64 = 1e-10;

/// A flux missed by more than this share, and by more than [`SMALLEST`] W/m2, lies in the step between two methods or bands.
const STEP: f64 = 1e-4;
const SMALLEST: f64 = 1e-6;

/// The share of the film's temperature span that is kept off its ends, where rounding could leave the table.
const MARGIN: f64 = 1e-9;

/// Finds the surface temperature, K, at which convection and radiation carry a flux away.
///
/// # Errors
/// No temperature within the fluid's table does.
pub(super) fn surface_temperature(case: &Case, fluid: &Fluid, flux: f64) -> Result<f64, Failure> {
    let (minimum, maximum) = span(case, fluid);
    let excess =
        |surface: f64| heat_flux(case, fluid, surface).map_or(f64::NAN, |heat| heat - flux);
    let mut convergency = SimpleConvergency {
        eps: TOLERANCE,
        max_iter: 200,
    };
    let (low, high) = bracket(&excess, case.ambient_temperature, minimum, maximum)
        .ok_or(Failure::Unsolved { minimum, maximum })?;
    find_root_brent(low, high, excess, &mut convergency)
        .ok()
        .filter(|&surface| excess(surface).abs() <= (STEP * flux.abs()).max(SMALLEST))
        .ok_or(Failure::Unsolved { minimum, maximum })
}

/// Two temperatures between which the excess changes its sign.
///
/// Where a cold liquid grows so thick that a colder surface takes less, both ends of the span can be on one side; the way from the ambient outwards then shows the nearer of two solutions.
fn bracket(
    excess: &impl Fn(f64) -> f64,
    ambient: f64,
    minimum: f64,
    maximum: f64,
) -> Option<(f64, f64)> {
    const STEPS: i32 = 256;
    if excess(minimum) * excess(maximum) <= 0.0 {
        return Some((minimum, maximum));
    }
    let sign = excess(ambient).signum();
    let end = if sign < 0.0 { maximum } else { minimum };
    let at = |step: i32| ambient + (end - ambient) * (f64::from(step) / f64::from(STEPS)).powi(2);
    let across = (1..=STEPS).find(|&step| excess(at(step)).signum() == -sign)?;
    Some((at(across - 1), at(across)))
}

/// Surface temperatures whose reference temperatures the fluid's table holds, on the ambient's side of the greatest density.
fn span(case: &Case, fluid: &Fluid) -> (f64, f64) {
    let ambient = case.ambient_temperature;
    let (coldest, hottest) = fluid.temperatures_at(&case.conditions);
    let margin = MARGIN * (hottest - coldest);
    let share = reference_share(case);
    let lowest = (ambient + (coldest + margin - ambient) / share).max(1.0);
    let highest = ambient + (hottest - margin - ambient) / share;
    match fluid.density_maximum(&case.conditions) {
        Some(turn) if ambient < turn => (lowest, highest.min(turn)),
        Some(turn) => (lowest.max(turn), highest),
        None => (lowest, highest),
    }
}

/// The largest share of the temperature difference at which properties are wanted.
fn reference_share(case: &Case) -> f64 {
    const FILM: f64 = 0.5;
    match case.method.map(|id| id.method().reference) {
        Some(ReferenceTemperature::Weighted {
            properties,
            expansion,
        }) => properties.max(expansion).max(FILM),
        _ => FILM,
    }
}

/// Heat flux that leaves a surface at a temperature, W/m2.
fn heat_flux(case: &Case, fluid: &Fluid, surface: f64) -> Result<f64, Failure> {
    let layer = Layer::new(case, fluid, surface)?;
    let entered = layer
        .choose(case.extrapolate)
        .or_else(|_| layer.choose(Extrapolate::Any));
    let free = match entered {
        Ok(entered) => entered.result(case).1,
        // On the side that the method is not for, nothing but radiation counts.
        Err(Failure::Side { .. }) => 0.0,
        Err(failure) => return Err(failure),
    };
    let draught = layer.draught(free)?;
    let coefficient = draught.map_or(free, |draught| draught.combined_coefficient);
    let radiative = case.emissivity.map_or(0.0, |emissivity| {
        radiation::coefficient(emissivity, surface, case.surroundings_temperature)
            * (surface - case.surroundings_temperature)
    });
    Ok(coefficient * (surface - case.ambient_temperature) + radiative)
}
