//! A well-formed case.

use crate::digest::sha256;
use crate::fluids::{Conditions, FluidId, Fluids};
use crate::geometry::{DraughtDirection, Extrapolate, Facing, Field, Geometry, Space};
use crate::methods::{Heating, MethodId};
use crate::quantity::UnitChoice;

use super::entries::Entries;
use super::fault::Fault;
use super::fields::Fields;
use super::fluid_check::check_temperatures;
use super::parts::{
    check_fields, check_method, check_radiation, exchange, hot_side, read_conditions, read_draught,
    read_gap, read_surface, require,
};
use super::size::{Across, Size};

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

/// Fluid that blows past a body.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Draught {
    /// Its speed, m/s.
    pub speed: f64,
    /// How it meets the rising or sinking fluid.
    pub direction: DraughtDirection,
}

/// One surface in one fluid, or one gap between two: all that an answer depends on, in SI.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Case {
    /// The body.
    pub geometry: Geometry,
    /// What its dimensions come to.
    pub size: Size,
    /// The side of a plate that touches the fluid; of a level layer the side of its hot plate.
    pub facing: Option<Facing>,
    /// What is known of the surface; of a gap the hotter one.
    pub surface: Surface,
    /// Temperature of the fluid away from the surface, at a channel's inlet, or of a gap's colder surface, K.
    pub ambient_temperature: f64,
    /// The fluid.
    pub fluid: FluidId,
    /// Its absolute pressure and its composition.
    pub conditions: Conditions,
    /// Emissivity, where radiation is to be counted; across a gap that of both surfaces together.
    pub emissivity: Option<f64>,
    /// Temperature of what the surface sees, K.
    pub surroundings_temperature: f64,
    /// The draught that meets the body.
    pub draught: Option<Draught>,
    /// Distance to the nearest wall or neighbour, m.
    pub clearance: Option<f64>,
    /// Acceleration of gravity, m/s2.
    pub gravity: f64,
    /// The method asked for, none for the automatic choice.
    pub method: Option<MethodId>,
    /// What to do outside ranges.
    pub extrapolate: Extrapolate,
    /// Whether the ambient temperature came as a number without a unit.
    pub bare_ambient: bool,
    /// Whether a diameter came as an inch size that is also a nominal pipe size.
    pub nominal_size: bool,
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
        let Some(geometry) = fields.geometry else {
            require(
                fields,
                Field::Geometry,
                "the body decides the method",
                faults,
            );
            return None;
        };
        let space = geometry.entry().space;
        let size = Size::read(geometry, fields, faults);
        check_fields(geometry, space, fields, faults);
        let fluid = fields.fluid.unwrap_or_else(Fluids::default_fluid);
        check_radiation(fields, fluids, fluid, faults);
        check_method(geometry, fields, faults);
        let (surface, ambient_temperature) = match space {
            Space::Closed => read_gap(fields, faults),
            Space::Open | Space::Channel => (
                read_surface(fields, size, faults),
                fields.number(Field::AmbientTemperature),
            ),
        };
        let conditions = read_conditions(fields, fluids.get(fluid), ambient_temperature, faults);

        let (size, ambient_temperature) = (size?, ambient_temperature?);
        let case = Case {
            geometry,
            size,
            facing: fields.facing.or(fields.heated_from.map(hot_side)),
            surface: surface?,
            ambient_temperature,
            fluid,
            conditions: conditions?,
            emissivity: match space {
                Space::Closed => exchange(fields, size.area_ratio),
                Space::Open | Space::Channel => fields.number(Field::Emissivity),
            },
            surroundings_temperature: fields
                .number(Field::SurroundingsTemperature)
                .unwrap_or(ambient_temperature),
            draught: read_draught(fields),
            clearance: fields.number(Field::Clearance),
            gravity: fields.number(Field::Gravity).unwrap_or(STANDARD_GRAVITY),
            method: fields.method,
            extrapolate: fields.extrapolate.unwrap_or(Extrapolate::Near),
            bare_ambient: fields.is_bare(Field::AmbientTemperature),
            nominal_size: fields.nominal_size,
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
        let (size, shape) = (self.size, self.size.shape);
        let (temperature, flux) = match self.surface {
            Surface::Temperature(value) => (Some(value), None),
            Surface::HeatFlux(value) => (None, Some(value)),
        };
        let (across, across_length) = match size.flow.across {
            Across::Plate(length) => ("plate", length),
            Across::Cylinder(diameter) => ("cylinder", diameter),
            Across::Sphere(diameter) => ("sphere", diameter),
        };
        let words = [
            self.geometry.as_str(),
            self.facing.map_or("", Facing::as_str),
            fluids.get(self.fluid).digest(),
            self.method.map_or("auto", MethodId::as_str),
            self.extrapolate.as_str(),
            across,
            self.draught
                .map_or("", |draught| draught.direction.as_str()),
        ];
        let numbers = [
            Some(size.characteristic_length),
            Some(size.conduction_length),
            size.area,
            size.area_per_length,
            Some(size.area_ratio),
            Some(size.flow.along),
            Some(across_length),
            Some(shape.tilt),
            Some(shape.slenderness),
            Some(shape.length_ratio),
            Some(shape.aspect),
            Some(shape.block_length),
            Some(shape.block_width),
            Some(shape.block_height),
            Some(shape.heated_walls),
            temperature,
            flux,
            Some(self.ambient_temperature),
            Some(self.conditions.pressure),
            Some(self.conditions.composition),
            self.emissivity,
            Some(self.surroundings_temperature),
            self.draught.map(|draught| draught.speed),
            self.clearance,
            Some(self.gravity),
        ];
        let mut bytes = Vec::with_capacity(384);
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
