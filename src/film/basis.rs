//! The assumptions behind an answer, in words.

use crate::case::{Answer, Case, Surface};
use crate::fluids::{Composition, Fluid, Fluids, Phase};
use crate::geometry::{Geometry, Space};

use super::draught::forced_part;

/// What an answer takes for granted, each a sentence.
pub fn basis(case: &Case, answer: &Answer, fluids: &Fluids) -> Vec<String> {
    let entry = case.geometry.entry();
    let fluid = fluids.get(case.fluid);
    let mut basis = vec![match (entry.space, case.draught) {
        (Space::Closed, _) => "An estimate for a closed gap between two surfaces of one temperature each; no heat by its edges.".to_owned(),
        (Space::Channel, _) => "An estimate for steady free convection through an open channel; the difference is wall minus inlet. Radiation is not counted: the walls see mostly each other.".to_owned(),
        (Space::Open, None) => "An estimate for still surroundings: steady free convection, no wind or forced flow.".to_owned(),
        (Space::Open, Some(draught)) => {
            let (forced, length) = forced_part(case, draught);
            format!(
                "An estimate for steady free convection with a draught of {} m/s; its part as for a {} of {length:.3} m ({} {}).",
                draught.speed, forced.body, forced.source.authors, forced.source.year
            )
        }
    }];
    basis.push(format!(
        "Characteristic length: {}.",
        entry.characteristic_length
    ));
    basis.push(format!(
        "Properties of {}{} at {} Pa; reference temperature: {}.",
        fluid.id(),
        composition_words(case, fluid),
        case.conditions.pressure,
        answer.method.method().reference.text()
    ));
    if matches!(case.surface, Surface::HeatFlux(_)) {
        basis.push(match case.geometry {
            Geometry::VerticalPlate
            | Geometry::VerticalCylinder
            | Geometry::InclinedPlate
            | Geometry::InclinedCylinder => {
                "Uniform heat flux; the surface temperature is that at mid-height.".to_owned()
            }
            Geometry::ParallelPlates => {
                "Uniform heat flux; the surface temperature is that at the top edge.".to_owned()
            }
            _ => "Uniform heat flux; the surface temperature is the mean, used as if it were uniform.".to_owned(),
        });
    }
    if case.geometry == Geometry::InclinedPlate && case.size.area.is_none() {
        basis.push("No width is given: the plate is taken as much wider than long.".to_owned());
    }
    if is_whole_body(case.geometry) && answer.rayleigh > LARGE_BODY {
        basis.push(
            "The body is large: taken face by face it would be told more closely.".to_owned(),
        );
    }
    if entry.space != Space::Channel {
        basis.push(radiation_words(case, entry.space, fluid));
    }
    basis
}

/// Rayleigh number above which a whole body is better taken face by face.
const LARGE_BODY: f64 = 1e9;

fn is_whole_body(geometry: Geometry) -> bool {
    matches!(
        geometry,
        Geometry::Block | Geometry::UprightShortCylinder | Geometry::LyingShortCylinder
    )
}

fn composition_words(case: &Case, fluid: &Fluid) -> String {
    let amount = case.conditions.composition;
    match fluid.composition() {
        Composition::Pure => String::new(),
        Composition::MassFraction { of, .. } => format!(" with {amount} by mass of {of}"),
        Composition::Humidity if amount == 0.0 => String::new(),
        Composition::Humidity => {
            format!(" with {amount:.5} kg of vapour per kg, which also lightens it")
        }
    }
}

fn radiation_words(case: &Case, space: Space, fluid: &Fluid) -> String {
    match (case.emissivity, space) {
        (Some(emissivity), Space::Closed) => format!(
            "Radiation: two grey surfaces that see only each other, emissivity of both together {emissivity:.4} on the hotter one."
        ),
        (Some(emissivity), _) => format!(
            "Radiation: grey surface of emissivity {emissivity} that sees only large surroundings at {} K.",
            case.surroundings_temperature
        ),
        (None, _) if fluid.phase() == Phase::Gas => {
            "Radiation is not counted: no emissivity is given.".to_owned()
        }
        (None, _) => "Radiation is not counted: the liquid lets none through.".to_owned(),
    }
}
