//! Which notes an answer earns.

use crate::case::{Answer, Case, NoteCode, Notes, Surface};
use crate::fluids::{Fluid, Phase, PressureRule};
use crate::geometry::{Geometry, Space};
use crate::methods::curvature_factor;

use super::layer::Entered;

/// Below this share of the side, two end faces are not worth a note: 10 diameters of length.
const SHORT_CYLINDER: f64 = 10.0;
/// A layer that gains less than this by bending around a cylinder is flat.
const THIN_CYLINDER: f64 = 1.05;
/// Below this emissivity an infrared thermometer at its usual setting misleads.
const SHINY: f64 = 0.5;
/// The methods disagree when the largest coefficient exceeds the smallest by more than this share.
const DISAGREEMENT: f64 = 0.20;
/// Viscosity ratio of liquids, and temperature ratio of gases, beyond which one reference temperature is too simple.
const STRONG_VARIATION: f64 = 2.0;
/// A film closer than this to the greatest density, K, is told.
const DENSITY_MAXIMUM_SPAN: f64 = 6.0;
/// Ambient temperatures outside this, K, are unlikely in a plant.
const PLAUSIBLE_AMBIENT: std::ops::RangeInclusive<f64> = 220.0..=350.0;
/// Contact for hours can burn from here, K: ISO 13732-1, 43 degrees Celsius (from memory).
const BURNS_FROM: f64 = 316.15;
/// A gap whose Nusselt number is below this conducts.
pub(super) const CONDUCTION: f64 = 1.01;
/// A step between neighbouring methods smaller than this is not told.
const STEP: f64 = 0.01;
/// Below this Richardson number a draught is not small (common practice).
const DRAUGHT_MATTERS: f64 = 10.0;
/// Below this Richardson number a draught decides (common practice).
const DRAUGHT_GOVERNS: f64 = 0.1;
/// Pressures that differ by less than this share are one.
const PRESSURE_TOLERANCE: f64 = 1e-3;
/// Grashof numbers between which an upright layer is neither laminar nor turbulent.
pub(super) const UPRIGHT_TRANSITION: (f64, f64) = (1e8, 3e10);

/// The notes of an answer that is otherwise complete.
pub(super) fn notes(case: &Case, fluid: &Fluid, entered: &Entered, answer: &Answer) -> Notes {
    let mut notes = Notes::default();
    method_notes(case, entered, answer, &mut notes);
    fluid_notes(case, fluid, answer, &mut notes);
    surface_notes(case, fluid, answer, &mut notes);
    notes
}

fn method_notes(case: &Case, entered: &Entered, answer: &Answer, notes: &mut Notes) {
    let verdict = entered.verdict;
    let moves = answer.rayleigh > 0.0;
    notes.add_if(
        moves && verdict.rayleigh_below,
        NoteCode::RayleighBelowRange,
    );
    notes.add_if(verdict.rayleigh_above, NoteCode::RayleighAboveRange);
    notes.add_if(verdict.prandtl_outside, NoteCode::PrandtlOutsideRange);
    notes.add_if(moves && verdict.shape_outside, NoteCode::ShapeOutsideRange);
    notes.add_if(answer.method_step.abs() > STEP, NoteCode::MethodStep);
    let upright = matches!(
        case.geometry,
        Geometry::VerticalPlate
            | Geometry::InclinedPlate
            | Geometry::VerticalCylinder
            | Geometry::InclinedCylinder
    );
    let (laminar_to, turbulent_from) = UPRIGHT_TRANSITION;
    let grashof = answer.rayleigh / answer.prandtl;
    notes.add_if(
        upright && (laminar_to..=turbulent_from).contains(&grashof),
        NoteCode::Transition,
    );
    if let (Some(low), Some(high)) = (answer.low, answer.high) {
        notes.add_if(high > low * (1.0 + DISAGREEMENT), NoteCode::MethodsDisagree);
    }
    if matches!(
        case.geometry,
        Geometry::VerticalCylinder | Geometry::InclinedCylinder
    ) {
        let bends = moves && curvature_factor(&entered.groups) > THIN_CYLINDER;
        notes.add_if(bends, NoteCode::ThinCylinder);
    }
    let cylinder = matches!(
        case.geometry,
        Geometry::VerticalCylinder | Geometry::HorizontalCylinder | Geometry::InclinedCylinder
    );
    let slenderness = case.size.shape.slenderness;
    notes.add_if(
        cylinder && slenderness > 0.0 && slenderness < SHORT_CYLINDER,
        NoteCode::EndsNotCounted,
    );
    notes.add_if(!moves, NoteCode::EqualTemperatures);
    let closed = case.geometry.entry().space == Space::Closed;
    notes.add_if(
        moves && closed && answer.nusselt < CONDUCTION,
        NoteCode::PureConduction,
    );
    if let Some(draught) = answer.draught {
        let richardson = draught.richardson;
        notes.add_if(richardson < DRAUGHT_GOVERNS, NoteCode::DraughtGoverns);
        let matters = (DRAUGHT_GOVERNS..DRAUGHT_MATTERS).contains(&richardson);
        notes.add_if(matters || draught.cancels, NoteCode::DraughtMatters);
    }
    let thickness = layer_thickness(answer);
    notes.add_if(
        moves
            && case
                .clearance
                .is_some_and(|clearance| clearance < thickness),
        NoteCode::Confined,
    );
    notes.add_if(case.nominal_size, NoteCode::NominalSize);
}

/// Thickness of a layer whose temperature falls as a parabola, m: twice conductivity over coefficient.
pub(super) fn layer_thickness(answer: &Answer) -> f64 {
    2.0 * answer.state.conductivity / answer.heat_transfer_coefficient
}

fn fluid_notes(case: &Case, fluid: &Fluid, answer: &Answer, notes: &mut Notes) {
    let (surface, ambient) = (answer.surface_temperature, case.ambient_temperature);
    notes.add_if(
        fluid.near_edge(answer.film_temperature),
        NoteCode::TableEdge,
    );
    if let PressureRule::IdealGas { reference, .. } = *fluid.pressure_rule() {
        let away = (case.conditions.pressure / reference - 1.0).abs() > PRESSURE_TOLERANCE;
        notes.add_if(away, NoteCode::IdealGasFallback);
    }
    notes.add_if(fluid.expansion_is_rough(), NoteCode::RoughExpansion);
    let varies = match fluid.phase() {
        Phase::Gas => surface.max(ambient) > STRONG_VARIATION * surface.min(ambient),
        Phase::Liquid => match (
            fluid.state(surface, &case.conditions),
            fluid.state(ambient, &case.conditions),
        ) {
            (Ok(at_surface), Ok(at_ambient)) => {
                let ratio = at_surface.viscosity / at_ambient.viscosity;
                !(1.0 / STRONG_VARIATION..=STRONG_VARIATION).contains(&ratio)
            }
            _ => true,
        },
    };
    notes.add_if(varies, NoteCode::StrongPropertyVariation);
    if let Some(turn) = fluid.density_maximum(&case.conditions) {
        let near = [surface, ambient, answer.film_temperature]
            .iter()
            .any(|temperature| (temperature - turn).abs() <= DENSITY_MAXIMUM_SPAN);
        notes.add_if(near, NoteCode::DensityMaximum);
    }
    let liquid = fluid.phase() == Phase::Liquid;
    let changes = fluid.is_past_saturation(surface, &case.conditions);
    notes.add_if(changes && liquid, NoteCode::MayBoil);
    notes.add_if(changes && !liquid, NoteCode::MayCondense);
    let limits = fluid.limits_at(&case.conditions);
    let is_past = |limit: Option<f64>, past: fn(f64, f64) -> bool| {
        limit.is_some_and(|limit| past(surface, limit) || past(ambient, limit))
    };
    notes.add_if(
        is_past(limits.freezing, |t, limit| t < limit),
        NoteCode::MayFreeze,
    );
    notes.add_if(
        is_past(limits.flash_point, |t, limit| t >= limit),
        NoteCode::AboveFlashPoint,
    );
}

fn surface_notes(case: &Case, fluid: &Fluid, answer: &Answer, notes: &mut Notes) {
    let space = case.geometry.entry().space;
    let gas = fluid.phase() == Phase::Gas;
    notes.add_if(
        gas && case.emissivity.is_none() && space != Space::Channel,
        NoteCode::RadiationNotCounted,
    );
    let measured = matches!(case.surface, Surface::Temperature(_));
    notes.add_if(
        measured && case.emissivity.is_some_and(|emissivity| emissivity < SHINY),
        NoteCode::LowEmissivityReading,
    );
    let hottest = answer
        .surface_temperature_max
        .unwrap_or(answer.surface_temperature);
    notes.add_if(
        space != Space::Closed && hottest.max(answer.surface_temperature) >= BURNS_FROM,
        NoteCode::BurnHazard,
    );
    notes.add_if(
        case.bare_ambient && !PLAUSIBLE_AMBIENT.contains(&case.ambient_temperature),
        NoteCode::BareNumberAsKelvin,
    );
}
