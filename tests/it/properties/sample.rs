//! Random well-formed cases over the whole domain.

use plumeline::case::Case;
use plumeline::fluids::{Fluid, Fluids, Phase, PressureRule};
use plumeline::methods::{Heating, MethodId};
use proptest::prelude::*;

use crate::support::{BODIES, Draft, EXTRAPOLATE};

/// A place in the domain of all cases, in shares of it.
#[derive(Clone, Debug)]
pub struct Sample {
    body: usize,
    fluid: usize,
    /// Powers of ten of up to three dimensions, m.
    sizes: [f64; 3],
    tilt: f64,
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
    extrapolate: usize,
    method: Option<usize>,
}

prop_compose! {
    pub fn sample()(
        body in 0..BODIES.len(),
        fluid in 0..Fluids::built_in().iter().count(),
        scale in -4.0..2.0_f64,
        aspects in prop::array::uniform3(-1.0..1.0_f64),
        tilt in 0.0..=90.0_f64,
        film in 0.0..=1.0_f64,
        difference in -6.0..3.0_f64,
        warmer: bool,
        pressure in 0.0..=1.0_f64,
        gravity in prop_oneof![Just(9.80665_f64.log10()), -4.0..4.0_f64],
        emissivity in prop::option::of(0.0..=1.0_f64),
        surroundings in prop::option::of(0.5..1.5_f64),
        extrapolate in 0..EXTRAPOLATE.len(),
        method in prop::option::of(0..16_usize),
    ) -> Sample {
        Sample {
            body, fluid, sizes: aspects.map(|aspect| scale + aspect), tilt, film, difference,
            warmer, pressure, gravity, emissivity, surroundings, extrapolate, method,
        }
    }
}

/// What a sample comes to, its temperatures apart.
pub struct Place {
    /// The body, its fluid and what else the sample says.
    pub draft: Draft,
    /// Mean of surface and ambient, K.
    pub film: f64,
    /// Surface over ambient, K.
    pub difference: f64,
}

impl Sample {
    /// Puts it into the domain of its body and fluid.
    pub fn place(&self, heating: Heating) -> Place {
        let (_, fluid) = Fluids::built_in()
            .iter()
            .nth(self.fluid)
            .expect("a place within the list");
        let pressure = self.pressure(fluid);
        let (coldest, hottest) = fluid.temperatures_at(pressure);
        // Rounding in the mean of surface and ambient must not leave the table.
        let inner = 1e-9 + (1.0 - 2e-9) * self.film;
        let film = coldest + inner * (hottest - coldest);
        let turn = fluid.density_maximum();
        let room = turn.map_or(film - 1.0, |turn| (film - turn).abs().min(film - 1.0));
        let size = 10_f64.powf(self.difference).min(1.99 * room);
        Place {
            draft: self
                .draft(fluid, film, heating)
                .number("pressure", pressure),
            film,
            difference: if self.warmer { size } else { -size },
        }
    }

    fn draft(&self, fluid: &'static Fluid, film: f64, heating: Heating) -> Draft {
        let body = &BODIES[self.body];
        let mut sizes = self.sizes.iter().map(|exponent| 10_f64.powf(*exponent));
        let mut draft = body
            .draft(fluid.id(), 1.0)
            .number("gravity", 10_f64.powf(self.gravity))
            .word("extrapolate", EXTRAPOLATE[self.extrapolate]);
        for &(name, _) in body.dimensions {
            let value = match name {
                "tilt_from_vertical" => self.tilt,
                _ => sizes.next().expect("three sizes are enough"),
            };
            draft = draft.number(name, value);
        }
        if let (Some(emissivity), Phase::Gas) = (self.emissivity, fluid.phase()) {
            draft = draft.number("emissivity", emissivity);
            if let Some(share) = self.surroundings {
                draft = draft.number("surroundings_temperature", share * film);
            }
        }
        match self.method {
            Some(place) => {
                let fitting: Vec<_> = MethodId::ALL
                    .iter()
                    .filter(|id| {
                        let method = id.method();
                        method.geometry.as_str() == body.geometry
                            && (method.heating == Heating::Either || method.heating == heating)
                    })
                    .collect();
                draft.word("method", fitting[place % fitting.len()].as_str())
            }
            None => draft,
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
        self.draft
            .clone()
            .number("surface_temperature", self.film + 0.5 * self.difference)
            .number("ambient_temperature", self.film - 0.5 * self.difference)
    }
}

/// The case of a draft, which must be well-formed.
pub fn case_of(draft: &Draft) -> Case {
    draft
        .read()
        .unwrap_or_else(|faults| panic!("{draft:?}: {faults:#?}"))
}
