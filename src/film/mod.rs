//! The film answer: convection by a chosen method, radiation beside it, and what to know about it.

mod basis;
mod draught;
mod failure;
mod flux;
mod gap;
mod layer;
mod note_text;
mod notes;
mod radiation;

use crate::case::{Answer, Case, Column, Heat, Notes, Regime, Surface, Wanted};
use crate::fluids::{Fluid, Fluids};
use crate::geometry::{Geometry, Space};
use crate::methods::{MethodId, RangeStatus, Side};

use layer::{Entered, Layer};

pub use basis::basis;
pub use failure::Failure;
pub use note_text::{Note, note};

/// An answer, or why there is none.
pub type Outcome = Result<Answer, Failure>;

/// Mid-height to end of a laminar layer under a uniform flux: the difference grows as the fifth root of the height.
///
/// # Source
/// Sparrow, E. M.; Gregg, J. L. 1956, Trans. ASME 78, 435-440.
const FLUX_END_FACTOR: f64 = 1.148_698_354_997_035;

/// Answers a block of cases; one outcome a case is added to `out`, in order.
///
/// Columns that are not wanted may be left out where they cost work: `low`, `high` and the notes.
pub fn evaluate(rows: &[Case], fluids: &Fluids, wanted: Wanted, out: &mut Vec<Outcome>) {
    out.reserve(rows.len());
    for case in rows {
        out.push(answer(case, fluids.get(case.fluid), wanted));
    }
}

/// Another method's result for the same layer.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Alternative {
    /// The method.
    pub method: MethodId,
    /// Its Nusselt number.
    pub nusselt: f64,
    /// Its coefficient, W/(m2 K).
    pub heat_transfer_coefficient: f64,
    /// How the case lies to its range.
    pub range_status: RangeStatus,
}

/// Every other method of the body within or near its range, at the answer's surface temperature.
pub fn alternatives(case: &Case, answer: &Answer, fluids: &Fluids) -> Vec<Alternative> {
    let Ok(layer) = Layer::new(case, fluids.get(case.fluid), answer.surface_temperature) else {
        return Vec::new();
    };
    layer
        .others(answer.method)
        .filter(|entered| entered.verdict.status != RangeStatus::Beyond)
        .map(|entered| {
            let (nusselt, heat_transfer_coefficient) = entered.result(case);
            Alternative {
                method: entered.id,
                nusselt,
                heat_transfer_coefficient,
                range_status: entered.verdict.status,
            }
        })
        .collect()
}

fn answer(case: &Case, fluid: &Fluid, wanted: Wanted) -> Outcome {
    let surface = match case.surface {
        Surface::Temperature(temperature) => temperature,
        Surface::HeatFlux(flux) => flux::surface_temperature(case, fluid, flux)?,
    };
    let layer = Layer::new(case, fluid, surface)?;
    let entered = layer.choose(case.extrapolate)?;
    let (nusselt, coefficient) = entered.result(case);
    let draught = layer.draught(coefficient)?;
    let difference = surface - case.ambient_temperature;
    let carrying = draught.map_or(coefficient, |draught| draught.combined_coefficient);
    let convective = heat(case, carrying * difference);
    let radiative_coefficient = case.emissivity.map(|emissivity| {
        radiation::coefficient(emissivity, surface, case.surroundings_temperature)
    });
    let radiative = radiative_coefficient.map(|coefficient| {
        heat(
            case,
            coefficient * (surface - case.surroundings_temperature),
        )
    });
    let regime = regime(case, layer.side, &entered, nusselt);
    let spread = wanted
        .any(&[Column::Low, Column::High, Column::Notes])
        .then(|| match draught {
            Some(draught) if draught.cancels => (0.0, draught.forced_coefficient.max(coefficient)),
            _ => layer.spread(entered.id, coefficient),
        });
    let gap = gap::figures(case, &entered, nusselt, coefficient, radiative_coefficient);
    let mut answer = Answer {
        heat_transfer_coefficient: coefficient,
        nusselt,
        rayleigh: entered.groups.rayleigh,
        prandtl: entered.groups.prandtl,
        characteristic_length: case.size.characteristic_length,
        film_temperature: 0.5 * (surface + case.ambient_temperature),
        surface_temperature: surface,
        surface_temperature_max: surface_temperature_max(case, difference),
        regime,
        area: case.size.area,
        convective,
        radiative,
        total: heat(
            case,
            convective.flux + radiative.map_or(0.0, |radiative| radiative.flux),
        ),
        radiative_coefficient,
        draught,
        effective_conductivity: gap.effective_conductivity,
        thermal_resistance: gap.thermal_resistance,
        best_spacing: gap.best_spacing,
        method: entered.id,
        range_status: entered.verdict.status,
        scatter: entered
            .id
            .method()
            .scatter
            .fraction(matches!(regime, Regime::Conduction | Regime::Laminar)),
        low: spread.map(|(low, _)| low),
        high: spread.map(|(_, high)| high),
        method_step: layer.step(&entered, coefficient),
        notes: Notes::default(),
        state: entered.state,
    };
    if wanted.any(&[Column::Notes]) {
        answer.notes = notes::notes(case, fluid, &entered, &answer);
    }
    Ok(answer)
}

/// A heat flux over as much of the body as is known.
fn heat(case: &Case, flux: f64) -> Heat {
    Heat {
        flow: case.size.area.map(|area| flux * area),
        flow_per_length: case.size.area_per_length.map(|area| flux * area),
        flux,
    }
}

/// The temperature where a laminar layer under a uniform flux ends; an upper estimate, since eddies even it out.
fn surface_temperature_max(case: &Case, difference: f64) -> Option<f64> {
    let rises_along = matches!(
        case.geometry,
        Geometry::VerticalPlate
            | Geometry::InclinedPlate
            | Geometry::VerticalCylinder
            | Geometry::InclinedCylinder
    );
    match case.surface {
        Surface::HeatFlux(_) if rises_along => {
            Some(case.ambient_temperature + FLUX_END_FACTOR * difference)
        }
        _ => None,
    }
}

/// What moves in a layer, by the bounds that the methods' sources use.
fn regime(case: &Case, side: Side, entered: &Entered, nusselt: f64) -> Regime {
    let groups = &entered.groups;
    let rayleigh = groups.rayleigh;
    let grashof = rayleigh / groups.prandtl;
    let (value, (laminar_to, turbulent_from)) = match case.geometry {
        Geometry::VerticalPlate
        | Geometry::VerticalCylinder
        | Geometry::InclinedPlate
        | Geometry::InclinedCylinder => (grashof, notes::UPRIGHT_TRANSITION),
        // On the height of the channel, as a single wall.
        Geometry::ParallelPlates => (grashof * groups.aspect.powi(3), notes::UPRIGHT_TRANSITION),
        // Lloyd and Moran 1974; a layer that clings to its plate stays laminar.
        Geometry::HorizontalPlate if side == Side::Unstable => (rayleigh, (8e6, 1e7)),
        Geometry::HorizontalPlate => (rayleigh, (f64::INFINITY, f64::INFINITY)),
        // Morgan 1975 ends the laminar band at 1e7, Churchill and Chu 1975 and McAdams 1954 at 1e9.
        Geometry::HorizontalCylinder => (rayleigh, (1e7, 1e9)),
        // By analogy with the cylinder; Churchill 1983 gives his laminar form to 1e11.
        Geometry::Sphere
        | Geometry::Block
        | Geometry::UprightShortCylinder
        | Geometry::LyingShortCylinder => (rayleigh, (1e9, 1e11)),
        // Cells become unsteady and then turbulent in these decades (common practice).
        Geometry::HorizontalLayer | Geometry::TiltedLayer => (rayleigh, (5e4, 1e6)),
        Geometry::VerticalCavity | Geometry::ConcentricCylinders | Geometry::ConcentricSpheres => {
            (rayleigh, (1e6, 1e7))
        }
    };
    let still = match case.geometry.entry().space {
        Space::Closed => nusselt < notes::CONDUCTION,
        Space::Open | Space::Channel => rayleigh < 1.0,
    };
    if still {
        Regime::Conduction
    } else if value < laminar_to {
        Regime::Laminar
    } else if value <= turbulent_from {
        Regime::Transition
    } else {
        Regime::Turbulent
    }
}
