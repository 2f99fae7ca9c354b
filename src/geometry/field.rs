//! The fields of a case: the one list that requests, queries, schemas and faults read.

use crate::quantity::Kind;

use super::choice::choice;

choice! {
    /// The side of a plate that touches the fluid.
    Facing {
        /// The fluid is above the surface.
        Up = "up",
        /// The fluid is below the surface.
        Down = "down",
    }
}

choice! {
    /// The side from which a level layer is heated.
    HeatedFrom {
        /// The lower plate is the hot one.
        Below = "below",
        /// The upper plate is the hot one.
        Above = "above",
    }
}

choice! {
    /// Which walls of a channel are heated.
    HeatedWalls {
        /// Both walls.
        Both = "both",
        /// One wall, the other insulated.
        One = "one",
    }
}

choice! {
    /// How a draught meets the rising or sinking fluid.
    DraughtDirection {
        /// It blows the same way.
        Assisting = "assisting",
        /// It blows the opposite way.
        Opposing = "opposing",
        /// It blows across.
        Across = "across",
    }
}

choice! {
    /// What to do when a method is asked for outside its range.
    Extrapolate {
        /// Refuse.
        None = "none",
        /// Answer with a warning close to the range, refuse farther out.
        Near = "near",
        /// Always answer, with a warning.
        Any = "any",
    }
}

/// The values that a quantity field accepts, in SI.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Limits {
    /// Smallest value.
    pub minimum: f64,
    /// Largest value.
    pub maximum: f64,
    /// Whether the smallest value itself is refused.
    pub above_minimum: bool,
}

impl Limits {
    const fn above(minimum: f64, maximum: f64) -> Self {
        Limits {
            minimum,
            maximum,
            above_minimum: true,
        }
    }

    const fn from(minimum: f64, maximum: f64) -> Self {
        Limits {
            minimum,
            maximum,
            above_minimum: false,
        }
    }

    /// Whether a value lies inside.
    pub fn contains(self, value: f64) -> bool {
        value <= self.maximum
            && (value > self.minimum || (value == self.minimum && !self.above_minimum))
    }
}

/// What a field holds.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum FieldValue {
    /// A physical quantity.
    Quantity(Kind, Limits),
    /// One of a closed set of words.
    Choice(&'static [&'static str]),
    /// A fluid's id.
    Fluid,
    /// A method's id, or `auto`.
    Method,
    /// The caller's own text.
    Label,
}

/// What stands in the list for one field.
#[derive(Clone, Copy, Debug)]
pub struct FieldEntry {
    /// Its name in requests.
    pub name: &'static str,
    /// What it holds.
    pub value: FieldValue,
    /// Its meaning.
    pub text: &'static str,
    /// A value that a caller could send, as JSON.
    pub example: &'static str,
}

macro_rules! fields {
    ($($variant:ident = $name:literal, $value:expr, $text:literal, $example:literal;)+) => {
        /// A field of a case.
        #[derive(Clone, Copy, Debug, PartialEq, Eq, Hash, PartialOrd, Ord)]
        pub enum Field { $(#[doc = $text] $variant,)+ }

        impl Field {
            /// Every field, in the order in which requests are shown.
            pub const ALL: &'static [Field] = &[$(Field::$variant,)+];

            const ENTRIES: &'static [FieldEntry] =
                &[$(FieldEntry { name: $name, value: $value, text: $text, example: $example },)+];

            /// The field of a name.
            pub fn from_name(name: &str) -> Option<Field> {
                match name { $($name => Some(Field::$variant),)+ _ => None }
            }
        }
    };
}

const LENGTH: FieldValue = FieldValue::Quantity(Kind::Length, Limits::from(1e-6, 1e4));
const TEMPERATURE: FieldValue = FieldValue::Quantity(Kind::Temperature, Limits::from(1.0, 1e5));

fields! {
    Geometry = "geometry", FieldValue::Choice(super::Geometry::TEXTS),
        "the body, one of the ids of /v1/geometries", "\"horizontal-cylinder\"";
    Height = "height", LENGTH, "vertical extent of the surface", "\"1.5 m\"";
    Length = "length", LENGTH, "extent along the slope, the axis or the longer side", "\"6 m\"";
    Width = "width", LENGTH, "horizontal extent of a plate", "\"2.8 m\"";
    Diameter = "diameter", LENGTH, "outside diameter", "\"88.9 mm\"";
    Area = "area", FieldValue::Quantity(Kind::Area, Limits::from(1e-12, 1e8)),
        "area of the face that is asked about", "\"4.2 m2\"";
    Perimeter = "perimeter", LENGTH, "length of the edge around a horizontal plate", "\"8.6 m\"";
    Gap = "gap", LENGTH, "distance between the two surfaces of a closed space", "\"16 mm\"";
    Spacing = "spacing", LENGTH, "distance between the walls of an open channel", "\"8 mm\"";
    InnerDiameter = "inner_diameter", LENGTH, "diameter of the inner of two concentric surfaces", "\"50 mm\"";
    OuterDiameter = "outer_diameter", LENGTH, "diameter of the outer of two concentric surfaces", "\"100 mm\"";
    TiltFromVertical = "tilt_from_vertical",
        FieldValue::Quantity(Kind::Angle, Limits::from(0.0, 90.0)),
        "angle between the surface and the vertical", "30";
    TiltFromHorizontal = "tilt_from_horizontal",
        FieldValue::Quantity(Kind::Angle, Limits::from(0.0, 180.0)),
        "angle between a layer and the horizontal: 0 is heated from below, 90 upright, 180 heated from above", "45";
    Facing = "facing", FieldValue::Choice(Facing::TEXTS),
        "the side of a plate that touches the fluid", "\"up\"";
    HeatedFrom = "heated_from", FieldValue::Choice(HeatedFrom::TEXTS),
        "the side of a level layer that is hot", "\"below\"";
    HeatedWalls = "heated_walls", FieldValue::Choice(HeatedWalls::TEXTS),
        "the walls of a channel that are heated; the other of one is insulated", "\"both\"";
    SurfaceTemperature = "surface_temperature", TEMPERATURE,
        "temperature of the surface", "\"160 degC\"";
    HeatFlux = "heat_flux", FieldValue::Quantity(Kind::HeatFlux, Limits::from(-1e8, 1e8)),
        "heat leaving the surface per area, radiation included when an emissivity is given; stands instead of surface_temperature",
        "\"500 W/m2\"";
    HeatFlow = "heat_flow", FieldValue::Quantity(Kind::HeatFlow, Limits::from(-1e12, 1e12)),
        "heat leaving the surface, radiation included when an emissivity is given; stands instead of surface_temperature and needs an area",
        "\"350 W\"";
    AmbientTemperature = "ambient_temperature", TEMPERATURE,
        "temperature of the fluid away from the surface", "\"20 degC\"";
    HotTemperature = "hot_temperature", TEMPERATURE,
        "temperature of the hotter surface of a closed space; of concentric bodies the inner one is taken as the hotter", "\"20 degC\"";
    ColdTemperature = "cold_temperature", TEMPERATURE,
        "temperature of the colder surface of a closed space", "\"5 degC\"";
    Fluid = "fluid", FieldValue::Fluid, "the fluid around the body, one of the ids of /v1/fluids", "\"air\"";
    Pressure = "pressure", FieldValue::Quantity(Kind::Pressure, Limits::above(0.0, 1e9)),
        "absolute pressure of the fluid, 101325 Pa when neither it nor altitude is given", "\"1.2 bar\"";
    Altitude = "altitude", FieldValue::Quantity(Kind::Length, Limits::from(-500.0, 11000.0)),
        "height above sea level, turned into a pressure by the standard atmosphere; stands instead of pressure", "\"1500 m\"";
    Concentration = "concentration", FieldValue::Quantity(Kind::Number, Limits::from(0.0, 1.0)),
        "mass fraction of a mixture's named part", "0.3";
    RelativeHumidity = "relative_humidity", FieldValue::Quantity(Kind::Number, Limits::from(0.0, 1.0)),
        "relative humidity of air at the ambient temperature, across a gap at the colder surface", "0.6";
    Emissivity = "emissivity", FieldValue::Quantity(Kind::Number, Limits::from(0.0, 1.0)),
        "emissivity of the surface; radiation is counted when it is given", "0.9";
    EmissivityHot = "emissivity_hot", FieldValue::Quantity(Kind::Number, Limits::from(0.0, 1.0)),
        "emissivity of the hotter surface of a closed space; radiation is counted when both are given", "0.84";
    EmissivityCold = "emissivity_cold", FieldValue::Quantity(Kind::Number, Limits::from(0.0, 1.0)),
        "emissivity of the colder surface of a closed space", "0.84";
    SurroundingsTemperature = "surroundings_temperature", TEMPERATURE,
        "temperature of the walls that the surface sees, the ambient temperature when not given", "\"18 degC\"";
    DraughtSpeed = "draught_speed", FieldValue::Quantity(Kind::Speed, Limits::from(0.0, 300.0)),
        "speed of the fluid that blows past the body", "\"0.5 m/s\"";
    DraughtDirection = "draught_direction", FieldValue::Choice(DraughtDirection::TEXTS),
        "how the draught meets the rising or sinking fluid, across when not given", "\"across\"";
    Clearance = "clearance", LENGTH,
        "distance to the nearest wall or neighbour", "\"50 mm\"";
    Gravity = "gravity", FieldValue::Quantity(Kind::Acceleration, Limits::above(0.0, 1e4)),
        "acceleration of gravity, 9.80665 m/s2 when not given", "9.80665";
    Method = "method", FieldValue::Method, "one of the ids of /v1/methods, or auto", "\"auto\"";
    Extrapolate = "extrapolate", FieldValue::Choice(Extrapolate::TEXTS),
        "what to do outside a method's range: none refuses, near answers close to it, any always answers; near when not given",
        "\"near\"";
    Id = "id", FieldValue::Label, "the caller's own label, given back in the answer", "\"boiler-house-17\"";
}

impl Field {
    /// How many fields there are.
    pub const COUNT: usize = Self::ALL.len();

    /// What the list says of this field.
    pub fn entry(self) -> &'static FieldEntry {
        &Self::ENTRIES[self as usize]
    }

    /// Its name in requests.
    pub fn name(self) -> &'static str {
        self.entry().name
    }

    /// The kind of quantity it holds, if it holds one.
    pub fn kind(self) -> Option<Kind> {
        match self.entry().value {
            FieldValue::Quantity(kind, _) => Some(kind),
            _ => None,
        }
    }
}
