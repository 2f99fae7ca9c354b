//! Random well-formed cases over the whole domain.

use plumeline::case::Case;
use plumeline::fluids::{Composition, Conditions, Fluid, Fluids, Phase, PressureRule};
use plumeline::geometry::{DraughtDirection, Space};
use plumeline::methods::{Heating, MethodId};
use proptest::prelude::*;

use crate::bodies::{BODIES, HEATABLE, is_angle};
use crate::support::{Draft, EXTRAPOLATE};

/// A place in the domain of all cases, in shares of it.
#[derive(Clone, Debug)]
pub struct Sample {
    body: usize,
    fluid: usize,
    /// Powers of ten of up to three dimensions, m.
    sizes: [f64; 3],
    /// Share of the angles that the body takes.
    tilt: f64,
    /// Share of the mass fractions of a mixture.
    concentration: f64,
    /// Of air, at its ambient temperature.
    humidity: Option<f64>,
    film: f64,
    /// Power of ten of the difference, K.
    difference: f64,
    warmer: bool,
    pressure: f64,
    /// Power of ten of gravity, m/s2.
    gravity: f64,
    emissivity: Option<f64>,
    /// Temperature of the surroundings over that of the film.
    surroundings: Option<f64>,
    /// Power of ten of a draught's speed, m/s, and the place of its direction.
    draught: Option<(f64, usize)>,
    /// Power of ten of the distance to a neighbour, m.
    clearance: Option<f64>,
    extrapolate: usize,
    method: Option<usize>,
}

prop_compose! {
    pub fn sample()(
        body in 0..BODIES.len(),
        fluid in 0..Fluids::built_in().iter().count(),
        scale in -4.0..2.0_f64,
        aspects in prop::array::uniform3(-1.0..1.0_f64),
        tilt in 0.0..=1.0_f64,
        concentration in 0.0..=1.0_f64,
        humidity in prop::option::of(0.0..=1.0_f64),
        film in 0.0..=1.0_f64,
        difference in -6.0..3.0_f64,
        warmer: bool,
        pressure in 0.0..=1.0_f64,
        gravity in prop_oneof![Just(9.80665_f64.log10()), -4.0..4.0_f64],
        emissivity in prop::option::of(0.0..=1.0_f64),
        surroundings in prop::option::of(0.5..1.5_f64),
        draught in prop::option::of((-4.0..1.5_f64, 0..DraughtDirection::ALL.len())),
        clearance in prop::option::of(-4.0..1.0_f64),
        extrapolate in 0..EXTRAPOLATE.len(),
        method in prop::option::of(0..16_usize),
    ) -> Sample {
        Sample {
            body, fluid, sizes: aspects.map(|aspect| scale + aspect), tilt, concentration,
            humidity, film, difference, warmer, pressure, gravity, emissivity, surroundings,
            draught, clearance, extrapolate, method,
        }
    }
}

/// What a sample comes to, its temperatures apart.
pub struct Place {
    /// The body, its fluid and what else the sample says.
    pub draft: Draft,
    /// Mean of surface and ambient, K.
    pub film: f64,
    /// Surface over ambient, K; not negative across a gap.
    pub difference: f64,
    /// Relative humidity of air at its ambient temperature.
    humidity: Option<f64>,
    fluid: &'static Fluid,
    pressure: f64,
}

impl Sample {
    /// Puts it into the domain of its body and fluid.
    pub fn place(&self, heating: Heating) -> Place {
        let (_, fluid) = Fluids::built_in()
            .iter()
            .nth(self.fluid)
            .expect("a place within the list");
        let body = &BODIES[self.body];
        let pressure = self.pressure(fluid);
        let conditions = Conditions {
            pressure,
            composition: self.composition(fluid),
        };
        let (coldest, hottest) = fluid.temperatures_at(&conditions);
        // Rounding in the mean of surface and ambient must not leave the table.
        let inner = 1e-9 + (1.0 - 2e-9) * self.film;
        let film = coldest + inner * (hottest - coldest);
        let turn = fluid.density_maximum(&conditions);
        let room = turn.map_or(film - 1.0, |turn| (film - turn).abs().min(film - 1.0));
        let size = 10_f64.powf(self.difference).min(1.99 * room);
        let draft = self
            .draft(fluid, film, heating)
            .number("pressure", pressure);
        let is_mixture = matches!(fluid.composition(), Composition::MassFraction { .. });
        let is_air = matches!(fluid.composition(), Composition::Humidity);
        Place {
            draft: if is_mixture {
                draft.number("concentration", conditions.composition)
            } else {
                draft
            },
            film,
            difference: if self.warmer || body.is_closed() {
                size
            } else {
                -size
            },
            humidity: self.humidity.filter(|_| is_air),
            fluid,
            pressure,
        }
    }

    fn draft(&self, fluid: &'static Fluid, film: f64, heating: Heating) -> Draft {
        let body = &BODIES[self.body];
        let mut sizes = self.sizes.iter().map(|exponent| 10_f64.powf(*exponent));
        let mut draft = body
            .draft(fluid.id(), 1.0)
            .number("gravity", 10_f64.powf(self.gravity))
            .word("extrapolate", EXTRAPOLATE[self.extrapolate]);
        let mut inner = 0.0;
        for &(name, _) in body.dimensions {
            let value = match name {
                "tilt_from_horizontal" => 180.0 * self.tilt,
                _ if is_angle(name) => 90.0 * self.tilt,
                _ => inner + sizes.next().expect("three sizes are enough"),
            };
            if name == "inner_diameter" {
                inner = value;
            }
            draft = draft.number(name, value);
        }
        if fluid.phase() == Phase::Gas {
            draft = self.radiating(draft, film);
        }
        let draft = self.in_the_open(draft);
        match self.method {
            Some(place) => {
                let fitting: Vec<_> = MethodId::ALL
                    .iter()
                    .filter(|id| {
                        let method = id.method();
                        method.geometry == body.geometry
                            && (method.heating == Heating::Either || method.heating == heating)
                    })
                    .collect();
                draft.word("method", fitting[place % fitting.len()].as_str())
            }
            None => draft,
        }
    }

    /// The draft with the sample's radiation, as its body takes it.
    fn radiating(&self, draft: Draft, film: f64) -> Draft {
        let Some(emissivity) = self.emissivity else {
            return draft;
        };
        match BODIES[self.body].geometry.entry().space {
            Space::Open => {
                let draft = draft.number("emissivity", emissivity);
                match self.surroundings {
                    Some(share) => draft.number("surroundings_temperature", share * film),
                    None => draft,
                }
            }
            Space::Closed => draft
                .number("emissivity_hot", emissivity)
                .number("emissivity_cold", 1.0 - emissivity),
            Space::Channel => draft,
        }
    }

    /// The draft with the sample's draught and neighbour, if it is a body in open fluid.
    fn in_the_open(&self, mut draft: Draft) -> Draft {
        if BODIES[self.body].geometry.entry().space != Space::Open {
            return draft;
        }
        if let Some((speed, direction)) = self.draught {
            draft = draft
                .number("draught_speed", 10_f64.powf(speed))
                .word("draught_direction", DraughtDirection::TEXTS[direction]);
        }
        match self.clearance {
            Some(clearance) => draft.number("clearance", 10_f64.powf(clearance)),
            None => draft,
        }
    }

    /// The mass fraction of a mixture, none of anything else.
    fn composition(&self, fluid: &Fluid) -> f64 {
        match *fluid.composition() {
            Composition::MassFraction {
                minimum, maximum, ..
            } => minimum + self.concentration * (maximum - minimum),
            Composition::Pure | Composition::Humidity => 0.0,
        }
    }

    /// A pressure that the fluid's rule serves at all temperatures of its table.
    fn pressure(&self, fluid: &Fluid) -> f64 {
        let (minimum, maximum) = match *fluid.pressure_rule() {
            PressureRule::Layers { minimum, maximum }
            | PressureRule::IdealGas {
                minimum, maximum, ..
            }
            | PressureRule::Incompressible {
                minimum, maximum, ..
            } => (minimum, maximum),
            PressureRule::AlongSaturation {
                reference,
                headroom,
            } => (reference, reference + headroom),
        };
        minimum + self.pressure * (maximum - minimum)
    }

    /// The same, answered however far out of range.
    pub fn anywhere(self) -> Self {
        Sample {
            extrapolate: EXTRAPOLATE.len() - 1,
            ..self
        }
    }

    /// The same with the automatic choice.
    pub fn automatic(self) -> Self {
        Sample {
            method: None,
            ..self
        }
    }

    /// The same among the bodies that take a heat flux.
    pub fn heatable(self) -> Self {
        Sample {
            body: self.body % HEATABLE,
            ..self
        }
    }

    /// The same without a draught.
    pub fn still(self) -> Self {
        Sample {
            draught: None,
            ..self
        }
    }

    /// The same in dry air.
    pub fn dry(self) -> Self {
        Sample {
            humidity: None,
            ..self
        }
    }

    /// The same with surroundings as warm as the ambient.
    pub fn in_ambient(self) -> Self {
        Sample {
            surroundings: None,
            ..self
        }
    }

    /// The same with a difference of ten to this power, K.
    pub fn with_difference(self, difference: f64) -> Self {
        Sample { difference, ..self }
    }

    /// Its case with a surface temperature.
    pub fn isothermal(&self) -> Case {
        case_of(&self.place(Heating::Isothermal).isothermal())
    }
}

impl Place {
    /// The sample with a surface temperature.
    pub fn isothermal(&self) -> Draft {
        let (surface, ambient) = (
            self.film + 0.5 * self.difference,
            self.film - 0.5 * self.difference,
        );
        self.humid(ambient).between(surface, ambient)
    }

    /// Surface and ambient exchanged.
    pub fn mirrored(self) -> Self {
        Place {
            difference: -self.difference,
            ..self
        }
    }

    /// The sample in an ambient, with its humidity where air of that temperature and pressure
    /// holds it.
    pub fn humid(&self, ambient: f64) -> Draft {
        let is_held = |&humidity: &f64| {
            let ratio = Fluids::humidity_ratio(humidity, ambient, self.pressure);
            ratio.is_ok_and(|composition| {
                let conditions = Conditions {
                    pressure: self.pressure,
                    composition,
                };
                self.fluid.state(self.film, &conditions).is_ok()
            })
        };
        match self.humidity.filter(is_held) {
            Some(humidity) => self.draft.clone().number("relative_humidity", humidity),
            None => self.draft.clone(),
        }
    }
}

/// The case of a draft, which must be well-formed.
pub fn case_of(draft: &Draft) -> Case {
    draft
        .read()
        .unwrap_or_else(|faults| panic!("{draft:?}: {faults:#?}"))
}
