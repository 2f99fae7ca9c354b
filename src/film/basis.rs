//! The assumptions behind an answer, in words.

use crate::case::{Answer, Case, Surface};
use crate::fluids::{Fluids, Phase};
use crate::geometry::Geometry;

/// What an answer takes for granted, each a sentence.
pub fn basis(case: &Case, answer: &Answer, fluids: &Fluids) -> Vec<String> {
    let entry = case.geometry.entry();
    let mut basis = vec![
        "An estimate for still surroundings: steady free convection, no wind or forced flow."
            .to_owned(),
        format!("Characteristic length: {}.", entry.characteristic_length),
        format!(
            "Properties of {} at {} Pa; reference temperature: {}.",
            fluids.get(case.fluid).id(),
            case.conditions.pressure,
            answer.method.method().reference.text()
        ),
    ];
    if matches!(case.surface, Surface::HeatFlux(_)) {
        basis.push(match case.geometry {
            Geometry::VerticalPlate | Geometry::VerticalCylinder | Geometry::InclinedPlate => {
                "Uniform heat flux; the surface temperature is that at mid-height.".to_owned()
            }
            _ => "Uniform heat flux; the surface temperature is the mean, used as if it were uniform.".to_owned(),
        });
    }
    if case.geometry == Geometry::InclinedPlate && case.size.area.is_none() {
        basis.push("No width is given: the plate is taken as much wider than long.".to_owned());
    }
    match case.emissivity {
        Some(emissivity) => basis.push(format!(
            "Radiation: grey surface of emissivity {emissivity} that sees only large surroundings at {} K.",
            case.surroundings_temperature
        )),
        None if fluids.get(case.fluid).phase() == Phase::Gas => {
            basis.push("Radiation is not counted: no emissivity is given.".to_owned());
        }
        None => basis.push("Radiation is not counted: the liquid lets none through.".to_owned()),
    }
    basis
}
