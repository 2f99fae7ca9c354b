//! A well-formed case.

use crate::digest::sha256;
use crate::fluids::{Conditions, FluidId, Fluids, Phase};
use crate::geometry::{Extrapolate, Facing, Field, Geometry};
use crate::methods::{Heating, MethodId};
use crate::quantity::UnitChoice;

use super::entries::Entries;
use super::fault::Fault;
use super::fields::Fields;
use super::fluid_check::check_temperatures;
use super::size::Size;

/// Standard acceleration of gravity, m/s2 (ISO 80000-3).
pub const STANDARD_GRAVITY: f64 = 9.80665;
/// Standard atmosphere, Pa (ISO 2533).
pub const STANDARD_PRESSURE: f64 = 101_325.0;

/// What is known of the surface.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum Surface {
    /// Its temperature, K.
    Temperature(f64),
    /// The heat that leaves it, W/m2.
    HeatFlux(f64),
}

/// One surface in one fluid: all that an answer depends on, in SI.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Case {
    /// The body.
    pub geometry: Geometry,
    /// What its dimensions come to.
    pub size: Size,
    /// The side of a plate that touches the fluid.
    pub facing: Option<Facing>,
    /// What is known of the surface.
    pub surface: Surface,
    /// Temperature of the fluid away from the surface, K.
    pub ambient_temperature: f64,
    /// The fluid.
    pub fluid: FluidId,
    /// Its absolute pressure and its composition.
    pub conditions: Conditions,
    /// Emissivity, where radiation is to be counted.
    pub emissivity: Option<f64>,
    /// Temperature of what the surface sees, K.
    pub surroundings_temperature: f64,
    /// Acceleration of gravity, m/s2.
    pub gravity: f64,
    /// The method asked for, none for the automatic choice.
    pub method: Option<MethodId>,
    /// What to do outside ranges.
    pub extrapolate: Extrapolate,
    /// Whether the ambient temperature came as a number without a unit.
    pub bare_ambient: bool,
}

impl Case {
    /// Makes a case of what was written.
    ///
    /// # Errors
    /// All faults at once.
    pub fn read(
        entries: &Entries,
        units: &UnitChoice,
        fluids: &Fluids,
    ) -> Result<Case, Vec<Fault>> {
        let mut faults = Vec::new();
        let fields = Fields::read(entries, units, fluids, &mut faults);
        let case = Case::build(&fields, fluids, &mut faults);
        match case {
            Some(case) if faults.is_empty() => Ok(case),
            _ => Err(faults),
        }
    }

    /// Makes a case of fields that could be read; adds what is missing or does not go together to `faults`.
    fn build(fields: &Fields, fluids: &Fluids, faults: &mut Vec<Fault>) -> Option<Case> {
        let size = match fields.geometry {
            Some(geometry) => Size::read(geometry, fields, faults),
            None => {
                require(
                    fields,
                    Field::Geometry,
                    "the body decides the method",
                    faults,
                );
                None
            }
        };
        let surface = read_surface(fields, size, faults);
        require(
            fields,
            Field::AmbientTemperature,
            "heat is lost to it",
            faults,
        );
        let pressure = read_pressure(fields, faults);
        let fluid = fields.fluid.unwrap_or_else(Fluids::default_fluid);
        check_radiation(fields, fluids, fluid, faults);
        check_method(fields, faults);

        let ambient_temperature = fields.number(Field::AmbientTemperature)?;
        let case = Case {
            geometry: fields.geometry?,
            size: size?,
            facing: fields.facing,
            surface: surface?,
            ambient_temperature,
            fluid,
            conditions: Conditions::pure(pressure?),
            emissivity: fields.number(Field::Emissivity),
            surroundings_temperature: fields
                .number(Field::SurroundingsTemperature)
                .unwrap_or(ambient_temperature),
            gravity: fields.number(Field::Gravity).unwrap_or(STANDARD_GRAVITY),
            method: fields.method,
            extrapolate: fields.extrapolate.unwrap_or(Extrapolate::Near),
            bare_ambient: fields.is_bare(Field::AmbientTemperature),
        };
        check_temperatures(&case, fields, fluids.get(fluid), faults);
        Some(case)
    }

    /// The heating that its methods must serve.
    pub fn heating(&self) -> Heating {
        match self.surface {
            Surface::Temperature(_) => Heating::Isothermal,
            Surface::HeatFlux(_) => Heating::UniformFlux,
        }
    }

    /// Digest of everything an answer depends on, however the case was written.
    ///
    /// SHA-256 of the words, each ended by a line feed, and of the quantities in SI as 64-bit big-endian floats, each behind a byte 1; a byte 0 stands for one that is not given.
    pub fn digest(&self, fluids: &Fluids) -> String {
        let size = self.size;
        let (temperature, flux) = match self.surface {
            Surface::Temperature(value) => (Some(value), None),
            Surface::HeatFlux(value) => (None, Some(value)),
        };
        let words = [
            self.geometry.as_str(),
            self.facing.map_or("", Facing::as_str),
            fluids.get(self.fluid).id(),
            self.method.map_or("auto", MethodId::as_str),
            self.extrapolate.as_str(),
        ];
        let numbers = [
            Some(size.characteristic_length),
            size.area,
            size.area_per_length,
            Some(size.tilt),
            Some(size.slenderness),
            Some(size.length_ratio),
            temperature,
            flux,
            Some(self.ambient_temperature),
            Some(self.conditions.pressure),
            Some(self.conditions.composition),
            self.emissivity,
            Some(self.surroundings_temperature),
            Some(self.gravity),
        ];
        let mut bytes = Vec::with_capacity(256);
        for word in words {
            bytes.extend_from_slice(word.as_bytes());
            bytes.push(b'\n');
        }
        for number in numbers {
            bytes.push(u8::from(number.is_some()));
            bytes.extend(number.map(f64::to_be_bytes).into_iter().flatten());
        }
        sha256(&bytes)
    }
}

fn require(fields: &Fields, field: Field, why: &str, faults: &mut Vec<Fault>) {
    if !fields.is_given(field) {
        faults.push(Fault::at(
            field,
            "missing-field",
            format!(
                "{} is not given, and {why}; for example {}",
                field.name(),
                field.entry().example
            ),
        ));
    }
}

/// Two fields that say the same thing.
fn exclude(fields: &Fields, first: Field, second: Field, faults: &mut Vec<Fault>) {
    if fields.is_given(first) && fields.is_given(second) {
        faults.push(Fault::at(
            second,
            "conflicting-fields",
            format!(
                "{} and {} are both given; give one",
                first.name(),
                second.name()
            ),
        ));
    }
}

fn read_surface(fields: &Fields, size: Option<Size>, faults: &mut Vec<Fault>) -> Option<Surface> {
    const WAYS: [Field; 3] = [Field::SurfaceTemperature, Field::HeatFlux, Field::HeatFlow];
    for (i, &first) in WAYS.iter().enumerate() {
        for &second in &WAYS[i + 1..] {
            exclude(fields, first, second, faults);
        }
    }
    if !WAYS.iter().any(|&field| fields.is_given(field)) {
        require(
            fields,
            Field::SurfaceTemperature,
            "neither are heat_flux and heat_flow, one of which may stand instead",
            faults,
        );
    }
    if let Some(temperature) = fields.number(Field::SurfaceTemperature) {
        return Some(Surface::Temperature(temperature));
    }
    if let Some(flux) = fields.number(Field::HeatFlux) {
        return Some(Surface::HeatFlux(flux));
    }
    let flow = fields.number(Field::HeatFlow)?;
    match size?.area {
        Some(area) => Some(Surface::HeatFlux(flow / area)),
        None => {
            faults.push(Fault::at(
                Field::HeatFlow,
                "missing-field",
                "heat_flow needs the area that it leaves: give a length, a width or an area as the body takes it, or heat_flux instead",
            ));
            None
        }
    }
}

/// Pressure of the standard atmosphere at an altitude, Pa.
///
/// # Source
/// ISO 2533:1975, troposphere: `p = p0 (1 - L h/T0)^(g/(R L))`.
fn pressure_at(altitude: f64) -> f64 {
    const LAPSE: f64 = 0.0065;
    const SEA_LEVEL_TEMPERATURE: f64 = 288.15;
    const GAS_CONSTANT: f64 = 287.05287;
    let exponent = STANDARD_GRAVITY / (GAS_CONSTANT * LAPSE);
    STANDARD_PRESSURE * (1.0 - LAPSE * altitude / SEA_LEVEL_TEMPERATURE).powf(exponent)
}

fn read_pressure(fields: &Fields, faults: &mut Vec<Fault>) -> Option<f64> {
    exclude(fields, Field::Pressure, Field::Altitude, faults);
    if fields.is_given(Field::Altitude) {
        return fields.number(Field::Altitude).map(pressure_at);
    }
    if fields.is_given(Field::Pressure) {
        return fields.number(Field::Pressure);
    }
    Some(STANDARD_PRESSURE)
}

fn check_radiation(fields: &Fields, fluids: &Fluids, fluid: FluidId, faults: &mut Vec<Fault>) {
    if fields.is_given(Field::SurroundingsTemperature) && !fields.is_given(Field::Emissivity) {
        require(
            fields,
            Field::Emissivity,
            "surroundings_temperature has no effect without it",
            faults,
        );
    }
    if fields.is_given(Field::Emissivity) && fluids.get(fluid).phase() == Phase::Liquid {
        faults.push(Fault::at(
            Field::Emissivity,
            "unexpected-field",
            format!(
                "emissivity is given, but {} lets no heat radiation through; leave it out",
                fluids.get(fluid).id()
            ),
        ));
    }
}

fn check_method(fields: &Fields, faults: &mut Vec<Fault>) {
    let (Some(id), Some(geometry)) = (fields.method, fields.geometry) else {
        return;
    };
    let heating = if fields.is_given(Field::SurfaceTemperature) {
        Heating::Isothermal
    } else {
        Heating::UniformFlux
    };
    let method = id.method();
    let fits_heating = matches!(method.heating, Heating::Either) || method.heating == heating;
    if method.geometry == geometry && fits_heating {
        return;
    }
    let fitting: Vec<_> = MethodId::ALL
        .iter()
        .filter(|other| {
            let other = other.method();
            other.geometry == geometry
                && (other.heating == Heating::Either || other.heating == heating)
        })
        .map(|other| other.as_str())
        .collect();
    faults.push(Fault::at(
        Field::Method,
        "method-does-not-fit",
        format!(
            "{} is for {} with {} heating; for {} with {} heating there are {}",
            id.as_str(),
            method.geometry.as_str(),
            method.heating.as_str(),
            geometry.as_str(),
            heating.as_str(),
            fitting.join(", ")
        ),
    ));
}
