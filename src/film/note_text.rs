//! Notes in words, written where an answer leaves.

use crate::case::{Answer, Case, NoteCode, Severity};
use crate::fluids::{Composition, Fluids};
use crate::geometry::{Field, Space};
use crate::methods::{Groups, Quantity, curvature_factor};
use crate::quantity::{Kind, Unit};

use super::draught::forced_part;
use super::notes::layer_thickness;

/// A note as a caller reads it.
#[derive(Clone, Debug, PartialEq)]
pub struct Note {
    /// What it says, for programs.
    pub code: NoteCode,
    /// How much it matters.
    pub severity: Severity,
    /// What it says, for people.
    pub text: String,
    /// The field it is about.
    pub field: Option<Field>,
}

/// Contact for a minute burns from here, K: ISO 13732-1, 51 degrees Celsius on bare metal (from memory).
const BURNS_IN_A_MINUTE: f64 = 324.15;
/// Guards are asked for from here, K: 60 degrees Celsius (common practice).
const GUARDED_FROM: f64 = 333.15;

/// Writes a note of an answer.
pub fn note(code: NoteCode, case: &Case, answer: &Answer, fluids: &Fluids) -> Note {
    let closed = case.geometry.entry().space == Space::Closed;
    Note {
        code,
        severity: severity(code, answer),
        text: text(code, case, answer, fluids),
        field: code.field().map(|field| match field {
            Field::SurfaceTemperature if closed => Field::HotTemperature,
            Field::Emissivity if closed => Field::EmissivityHot,
            field => field,
        }),
    }
}

fn severity(code: NoteCode, answer: &Answer) -> Severity {
    match code {
        NoteCode::BurnHazard => {
            let hottest = hottest(answer);
            if hottest >= GUARDED_FROM {
                Severity::Warning
            } else if hottest >= BURNS_IN_A_MINUTE {
                Severity::Caution
            } else {
                Severity::Info
            }
        }
        NoteCode::RayleighAboveRange
        | NoteCode::PrandtlOutsideRange
        | NoteCode::ShapeOutsideRange
        | NoteCode::DensityMaximum
        | NoteCode::MayBoil
        | NoteCode::MayFreeze
        | NoteCode::AboveFlashPoint
        | NoteCode::BareNumberAsKelvin => Severity::Warning,
        NoteCode::DraughtMatters if answer.draught.is_some_and(|draught| draught.cancels) => {
            Severity::Warning
        }
        NoteCode::RayleighBelowRange
        | NoteCode::MethodStep
        | NoteCode::Transition
        | NoteCode::RadiationNotCounted
        | NoteCode::LowEmissivityReading
        | NoteCode::MethodsDisagree
        | NoteCode::StrongPropertyVariation
        | NoteCode::RoughExpansion
        | NoteCode::MayCondense
        | NoteCode::DraughtMatters
        | NoteCode::DraughtGoverns
        | NoteCode::Confined
        | NoteCode::NominalSize => Severity::Caution,
        NoteCode::PureConduction
        | NoteCode::IdealGasFallback
        | NoteCode::ThinCylinder
        | NoteCode::EndsNotCounted
        | NoteCode::TableEdge
        | NoteCode::EqualTemperatures => Severity::Info,
    }
}

fn text(code: NoteCode, case: &Case, answer: &Answer, fluids: &Fluids) -> String {
    let fluid = fluids.get(case.fluid);
    let surface = celsius(answer.surface_temperature);
    match code {
        NoteCode::RayleighBelowRange
        | NoteCode::RayleighAboveRange
        | NoteCode::PrandtlOutsideRange
        | NoteCode::ShapeOutsideRange => {
            format!("{}: {}.", answer.method.as_str(), breaches(code, case, answer))
        }
        NoteCode::MethodStep => format!(
            "Close by, the automatic choice changes to another method; this one gives {:+.1} % against it, and figures step by that much.",
            100.0 * answer.method_step
        ),
        NoteCode::Transition => format!(
            "Grashof number {:.1e}: the layer is changing from laminar to turbulent, and measurements scatter most here.",
            answer.rayleigh / answer.prandtl
        ),
        NoteCode::PureConduction => format!(
            "The {} in the gap hardly moves: heat crosses it by conduction{}.",
            fluid.name(),
            if case.emissivity.is_some() { " and radiation" } else { "" }
        ),
        NoteCode::DraughtMatters | NoteCode::DraughtGoverns => draught_text(code, case, answer),
        NoteCode::Confined => format!(
            "The clearance is smaller than the layer, about {:.1e} m thick: a wall or neighbour hinders it, and the figures for an open body are only a guide.",
            layer_thickness(answer)
        ),
        NoteCode::NominalSize => "The inch size is also a nominal pipe size, whose outside diameter is larger; write \"NPS 3\" or \"DN 80\" when that is meant.".to_owned(),
        NoteCode::IdealGasFallback => format!(
            "The table of {} is for another pressure; its density here follows the ideal rule, whose error /v1/fluids states.",
            fluid.id()
        ),
        NoteCode::ThinCylinder => format!(
            "The layer bends around the cylinder, which raises its laminar part by about {:.0} % over a flat plate's.",
            100.0 * (curvature_factor(&groups(case, answer)) - 1.0)
        ),
        NoteCode::EndsNotCounted => format!(
            "The cylinder is only {:.1} diameters long; its end faces are surfaces of their own and are not in these figures.",
            case.size.shape.slenderness
        ),
        NoteCode::RadiationNotCounted if case.geometry.entry().space == Space::Closed => "The emissivities are not given, so heat radiation across the gap is left out; between dull surfaces it is often more than half of the heat.".to_owned(),
        NoteCode::RadiationNotCounted => "No emissivity is given, so heat radiation is left out; on a dull hot surface it is often more than half of the loss.".to_owned(),
        NoteCode::LowEmissivityReading => "On a shiny surface an infrared thermometer at its usual setting reads far too low; measure with contact, or on dull tape or paint.".to_owned(),
        NoteCode::MethodsDisagree => format!(
            "The methods within range lie between {:.3} and {:.3} W/(m2 K); take the figure with that spread.",
            answer.low.unwrap_or(answer.heat_transfer_coefficient),
            answer.high.unwrap_or(answer.heat_transfer_coefficient)
        ),
        NoteCode::StrongPropertyVariation => format!(
            "The properties of {} change by a factor of two or more between surface and ambient; one reference temperature is a rough rule here.",
            fluid.id()
        ),
        NoteCode::DensityMaximum => format!(
            "{} is densest at {}; near it the expansion changes fast and the buoyancy can turn round.",
            fluid.name(),
            fluid.density_maximum(&case.conditions).map_or_else(String::new, celsius)
        ),
        NoteCode::MayBoil => format!(
            "The surface at {surface} is above the boiling point of {} at this pressure, {}; with boiling it loses far more heat.",
            fluid.name(),
            fluid.saturation_temperature(&case.conditions).map_or_else(String::new, celsius)
        ),
        NoteCode::MayCondense => format!(
            "The surface at {surface} is below the condensation point of {} at this pressure, {}; condensation gives it far more heat.",
            match fluid.composition() {
                Composition::Humidity => "the air's moisture",
                _ => fluid.name(),
            },
            fluid.saturation_temperature(&case.conditions).map_or_else(String::new, celsius)
        ),
        NoteCode::MayFreeze => format!(
            "Surface or fluid is below the freezing point of {}, {}; ice changes the heat flow and can burst pipes.",
            fluid.name(),
            fluid.limits_at(&case.conditions).freezing.map_or_else(String::new, celsius)
        ),
        NoteCode::AboveFlashPoint => format!(
            "Surface or fluid is above the flash point of {}, about {}: fire hazard. Local codes and the supplier's data sheet govern.",
            fluid.name(),
            fluid.limits_at(&case.conditions).flash_point.map_or_else(String::new, celsius)
        ),
        NoteCode::BurnHazard => burn_text(answer),
        NoteCode::BareNumberAsKelvin => format!(
            "The ambient temperature came without a unit and was read as {} K; if degrees Celsius are meant, write \"{} degC\".",
            case.ambient_temperature, case.ambient_temperature
        ),
        NoteCode::RoughExpansion => "The table gives no expansion and its densities scatter by more than a hundredth of their change: the expansion taken from them is doubtful.".to_owned(),
        NoteCode::TableEdge => format!(
            "The film is at the edge of the table of {}; beyond it there is no answer.",
            fluid.id()
        ),
        NoteCode::EqualTemperatures => "Surface and ambient have one temperature: no heat flows, and the coefficient is the limit for a vanishing difference.".to_owned(),
    }
}

fn draught_text(code: NoteCode, case: &Case, answer: &Answer) -> String {
    let (Some(draught), Some(given)) = (answer.draught, case.draught) else {
        return String::new();
    };
    if draught.cancels {
        return format!(
            "The draught opposes free convection and nearly cancels it (forced {:.3}, free {:.3} W/(m2 K)): no single value is safe; low and high span from nothing to the larger part.",
            draught.forced_coefficient, answer.heat_transfer_coefficient
        );
    }
    let weight = if code == NoteCode::DraughtGoverns {
        "decides the loss"
    } else {
        "is not small against free convection"
    };
    let (method, _) = forced_part(case, given);
    let breaches = method.breaches(draught.reynolds, draught.prandtl);
    let outside = if breaches.is_empty() {
        String::new()
    } else {
        format!(
            " The method for the draught is outside its range: {}.",
            breaches.join(", ")
        )
    };
    format!(
        "Richardson number {:.2e}: the draught {weight}; the flows use the combined coefficient, {:.3} W/(m2 K).{outside}",
        draught.richardson, draught.combined_coefficient
    )
}

fn burn_text(answer: &Answer) -> String {
    let hottest = hottest(answer);
    let contact = if hottest >= GUARDED_FROM {
        "bare metal this hot burns within seconds; guard it or keep people off"
    } else if hottest >= BURNS_IN_A_MINUTE {
        "bare metal this hot burns within a minute of contact"
    } else {
        "contact for hours can burn"
    };
    format!(
        "Surface at {}: {contact}. Guidance by contact times like those of ISO 13732-1, not a limit; local codes and licensed practice govern.",
        celsius(hottest)
    )
}

fn hottest(answer: &Answer) -> f64 {
    answer
        .surface_temperature_max
        .map_or(answer.surface_temperature, |end| {
            end.max(answer.surface_temperature)
        })
}

fn groups(case: &Case, answer: &Answer) -> Groups {
    Groups {
        rayleigh: answer.rayleigh,
        prandtl: answer.prandtl,
        ..case.size.shape
    }
}

/// The ranges that a note of this code is about, in words.
fn breaches(code: NoteCode, case: &Case, answer: &Answer) -> String {
    let groups = groups(case, answer);
    let concerned = |quantity: Quantity| match code {
        NoteCode::PrandtlOutsideRange => quantity == Quantity::Prandtl,
        NoteCode::ShapeOutsideRange => quantity.is_shape(),
        _ => quantity.is_buoyancy(),
    };
    let told: Vec<_> = answer
        .method
        .method()
        .ranges
        .iter()
        .filter(|range| concerned(range.quantity))
        .filter_map(|range| range.breach(&groups))
        .collect();
    told.join(", ")
}

/// A temperature as people in a plant read it.
fn celsius(kelvin: f64) -> String {
    match Unit::find(Kind::Temperature, "degC") {
        Ok(unit) => format!("{} {}", tenths(unit.from_si(kelvin)), unit.symbol()),
        Err(_) => format!("{} K", tenths(kelvin)),
    }
}

/// A number rounded to tenths; the shortest text of it is then short, and far cheaper than an exact one.
fn tenths(value: f64) -> f64 {
    (value * 10.0).round() / 10.0
}
