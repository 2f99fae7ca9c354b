//! Why a well-formed case has no answer.

use crate::case::{Case, Fault, Surface};
use crate::fluids::{Fluids, StateError};
use crate::geometry::{Field, Space};
use crate::methods::{Groups, MethodId, Side};

/// Why a case has no answer; flat, told in words at the edge.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum Failure {
    /// The fluid is not known at a temperature that a method wants.
    Fluid(StateError),
    /// The method asked for is for the other side of a plate.
    Side {
        /// The method asked for.
        method: MethodId,
        /// The side that the case has.
        side: Side,
    },
    /// The case is too far out of range.
    Range {
        /// The method asked for, or the nearest of the automatic choice.
        method: MethodId,
        /// What it would be entered with.
        groups: Groups,
    },
    /// No method of the body serves the case with properties that are known.
    Unchosen,
    /// No surface temperature within the fluid's table gives the heat.
    Unsolved {
        /// Lowest surface temperature tried, K.
        minimum: f64,
        /// Highest, K.
        maximum: f64,
    },
}

impl From<StateError> for Failure {
    fn from(error: StateError) -> Self {
        Failure::Fluid(error)
    }
}

impl Failure {
    /// The failure of a case as a fault of its request.
    pub fn fault(&self, case: &Case, fluids: &Fluids) -> Fault {
        let closed = case.geometry.entry().space == Space::Closed;
        let surface_field = match case.surface {
            Surface::Temperature(_) if closed => Field::HotTemperature,
            Surface::Temperature(_) => Field::SurfaceTemperature,
            Surface::HeatFlux(_) => Field::HeatFlux,
        };
        match *self {
            Failure::Fluid(error) => Fault::at(
                surface_field,
                "outside-table",
                format!(
                    "{} at {} Pa: {error}",
                    fluids.get(case.fluid).id(),
                    case.conditions.pressure
                ),
            ),
            Failure::Side { method, side } => {
                let heating = case.heating();
                let fitting: Vec<_> = MethodId::serving(case.geometry, heating, side)
                    .iter()
                    .map(|id| id.as_str())
                    .collect();
                Fault::at(
                    Field::Method,
                    "method-does-not-fit",
                    format!(
                        "{} is for a layer that is {}; this one is {}, for which there are {}",
                        method.as_str(),
                        method.method().side.as_str(),
                        side.as_str(),
                        fitting.join(", ")
                    ),
                )
            }
            Failure::Range { method, groups } => {
                let outside: Vec<_> = method
                    .method()
                    .ranges
                    .iter()
                    .filter_map(|range| range.breach(&groups))
                    .collect();
                Fault::at(
                    Field::Method,
                    "outside-method-range",
                    format!(
                        "{}: {}; another method of /v1/methods may serve, and extrapolate any answers with a warning",
                        method.as_str(),
                        outside.join(", ")
                    ),
                )
            }
            Failure::Unchosen => Fault::at(
                Field::Method,
                "outside-method-range",
                "no method of this body can be entered here; force one of /v1/methods",
            ),
            Failure::Unsolved { minimum, maximum } => Fault::at(
                surface_field,
                "no-solution",
                format!(
                    "no surface temperature from {minimum:.1} K to {maximum:.1} K, where {} is known, gives this heat; give a smaller one",
                    fluids.get(case.fluid).id()
                ),
            ),
        }
    }
}
