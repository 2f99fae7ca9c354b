//! The layer of fluid next to a surface of known temperature, and the methods that serve it.

use crate::case::{Case, DraughtResult};
use crate::fluids::{Fluid, State, StateError};
use crate::geometry::{Extrapolate, Facing, Geometry};
use crate::methods::{
    Groups, MethodId, RangeStatus, ReferenceTemperature, Side, Verdict, choose, neighbour,
    step_of_ends,
};

use super::draught::combine;
use super::failure::Failure;

/// A surface temperature and what it makes of the fluid.
#[derive(Clone, Copy)]
pub(super) struct Layer<'a> {
    case: &'a Case,
    fluid: &'a Fluid,
    surface: f64,
    film: State,
    /// Which way the layer pulls.
    pub side: Side,
    /// Tilt as the methods mean it, degrees: a gap whose warm fluid sinks is one upside down.
    tilt: f64,
}

/// A method entered with a layer's groups.
#[derive(Clone, Copy, Debug)]
pub(super) struct Entered {
    pub id: MethodId,
    pub groups: Groups,
    pub state: State,
    pub verdict: Verdict,
}

impl Entered {
    /// Nusselt number and coefficient.
    pub fn result(&self, case: &Case) -> (f64, f64) {
        let nusselt = (self.id.method().nusselt)(&self.groups);
        (
            nusselt,
            nusselt * self.state.conductivity / case.size.conduction_length,
        )
    }

    fn is_within(&self) -> bool {
        self.verdict.status == RangeStatus::Within
    }

    /// Whether the caller takes an answer so far out; the limit of no difference is always answered.
    fn is_allowed(&self, extrapolate: Extrapolate) -> bool {
        self.groups.rayleigh == 0.0
            || match extrapolate {
                Extrapolate::None => self.is_within(),
                Extrapolate::Near => self.verdict.status != RangeStatus::Beyond,
                Extrapolate::Any => true,
            }
    }
}

impl<'a> Layer<'a> {
    /// The layer at a surface temperature.
    pub fn new(case: &'a Case, fluid: &'a Fluid, surface: f64) -> Result<Self, StateError> {
        let film = fluid.state(0.5 * (surface + case.ambient_temperature), &case.conditions)?;
        let rises = film.expansion * (surface - case.ambient_temperature) >= 0.0;
        let side = match case.facing {
            None => Side::Any,
            Some(facing) if rises == (facing == Facing::Up) => Side::Unstable,
            Some(_) => Side::Stable,
        };
        let tilt = case.size.shape.tilt;
        let turned = case.geometry == Geometry::TiltedLayer && !rises;
        Ok(Layer {
            tilt: if turned { 180.0 - tilt } else { tilt },
            case,
            fluid,
            surface,
            film,
            side,
        })
    }

    /// The methods that serve it, in the order of the registry.
    pub fn methods(&self) -> &'static [MethodId] {
        MethodId::serving(self.case.geometry, self.case.heating(), self.side)
    }

    /// Enters a method, with the properties that it wants.
    pub fn enter(&self, id: MethodId) -> Result<Entered, StateError> {
        let method = id.method();
        let case = self.case;
        let state = match method.reference {
            ReferenceTemperature::Film => self.film,
            ReferenceTemperature::Weighted { .. } => {
                let (properties, expansion) = method
                    .reference
                    .temperatures(self.surface, case.ambient_temperature);
                State {
                    expansion: self.fluid.state(expansion, &case.conditions)?.expansion,
                    ..self.fluid.state(properties, &case.conditions)?
                }
            }
        };
        let difference = (self.surface - case.ambient_temperature).abs();
        let viscosity = state.kinematic_viscosity();
        let groups = Groups {
            rayleigh: case.gravity
                * state.expansion.abs()
                * difference
                * case.size.characteristic_length.powi(3)
                / (viscosity * state.diffusivity()),
            prandtl: state.prandtl(),
            tilt: self.tilt,
            ..case.size.shape
        };
        let verdict = method.verdict(&groups);
        Ok(Entered {
            id,
            groups,
            state,
            verdict,
        })
    }

    /// The method asked for, or the automatic choice.
    pub fn choose(&self, extrapolate: Extrapolate) -> Result<Entered, Failure> {
        if let Some(id) = self.case.method {
            if !self.methods().contains(&id) {
                return Err(Failure::Side {
                    method: id,
                    side: self.side,
                });
            }
            let entered = self.enter(id)?;
            return self.allow(entered, extrapolate);
        }
        // The registry's tests prove that every body, heating and side has an automatic method.
        let entered =
            choose(self.automatic(), |entered| entered.verdict).ok_or(Failure::Unchosen)?;
        self.allow(entered, extrapolate)
    }

    /// The methods of the automatic choice whose properties are known.
    fn automatic(&self) -> impl Iterator<Item = Entered> {
        self.methods()
            .iter()
            .filter(|id| id.method().automatic)
            .filter_map(|&id| self.enter(id).ok())
    }

    /// How far the chosen method is from the one that takes over just across the edge of a range, less one; 0 away from edges.
    pub fn step(&self, chosen: &Entered, coefficient: f64) -> f64 {
        if self.case.method.is_some() {
            return 0.0;
        }
        let others = self.automatic().filter(|other| other.id != chosen.id);
        match neighbour(others, |other| other.verdict, &chosen.verdict) {
            Some(other) => coefficient / other.result(self.case).1 - 1.0,
            None if chosen.id == MethodId::TiltedLayerCatton => step_of_ends(&chosen.groups),
            None => 0.0,
        }
    }

    /// What the case's draught makes of a free coefficient.
    pub fn draught(&self, free: f64) -> Result<Option<DraughtResult>, StateError> {
        let Some(draught) = self.case.draught else {
            return Ok(None);
        };
        combine(
            self.case,
            draught,
            self.fluid,
            &self.film,
            self.surface,
            free,
        )
        .map(Some)
    }

    /// Smallest and largest coefficient of a chosen method and all others within range.
    pub fn spread(&self, chosen: MethodId, coefficient: f64) -> (f64, f64) {
        self.others(chosen)
            .filter(Entered::is_within)
            .map(|entered| entered.result(self.case).1)
            .fold((coefficient, coefficient), |(low, high), other| {
                (low.min(other), high.max(other))
            })
    }

    /// Every other method that serves the layer and whose properties are known.
    pub fn others(&self, chosen: MethodId) -> impl Iterator<Item = Entered> {
        self.methods()
            .iter()
            .filter(move |&&id| id != chosen)
            .filter_map(|&id| self.enter(id).ok())
    }

    fn allow(&self, entered: Entered, extrapolate: Extrapolate) -> Result<Entered, Failure> {
        if entered.is_allowed(extrapolate) {
            Ok(entered)
        } else {
            Err(Failure::Range {
                method: entered.id,
                groups: entered.groups,
            })
        }
    }
}
