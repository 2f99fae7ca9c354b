//! The parts of a case, read from its fields: surface or gap, pressure, radiation, method.

use crate::fluids::{Composition, Conditions, Fluid, FluidId, Fluids, Phase};
use crate::geometry::{DIMENSIONS, DraughtDirection, Facing, Field, Geometry, HeatedFrom, Space};
use crate::methods::{Heating, MethodId};

use crate::quantity::UnitChoice;

use super::entries::Entries;
use super::fault::Fault;
use super::fields::Fields;
use super::model::{Draught, STANDARD_GRAVITY, STANDARD_PRESSURE, Surface};
use super::size::Size;

pub(super) fn require(fields: &Fields, field: Field, why: &str, faults: &mut Vec<Fault>) {
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

/// What is known of the surface: its temperature, or the heat that leaves it.
pub(super) fn read_surface(
    fields: &Fields,
    size: Option<Size>,
    faults: &mut Vec<Fault>,
) -> Option<Surface> {
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

/// A fluid's pressure and composition at a temperature, without a case around them.
///
/// # Errors
/// What is wrong is added to `faults`.
pub fn read_conditions_alone(
    entries: &Entries,
    fluids: &Fluids,
    fluid: &Fluid,
    temperature: Option<f64>,
    faults: &mut Vec<Fault>,
) -> Option<Conditions> {
    let fields = Fields::read(entries, &UnitChoice::default(), fluids, faults);
    read_conditions(&fields, fluid, temperature, faults)
}

/// The fluid's pressure and composition.
pub(super) fn read_conditions(
    fields: &Fields,
    fluid: &Fluid,
    ambient: Option<f64>,
    faults: &mut Vec<Fault>,
) -> Option<Conditions> {
    let pressure = read_pressure(fields, faults);
    let composition = match fluid.composition() {
        Composition::Pure => {
            refuse(fields, Field::Concentration, fluid, faults);
            refuse(fields, Field::RelativeHumidity, fluid, faults);
            Some(0.0)
        }
        Composition::MassFraction {
            of,
            minimum,
            maximum,
        } => {
            refuse(fields, Field::RelativeHumidity, fluid, faults);
            let why = format!("{} is a mixture", fluid.id());
            require(fields, Field::Concentration, &why, faults);
            let given = fields.number(Field::Concentration);
            if given.is_some_and(|given| !(*minimum..=*maximum).contains(&given)) {
                faults.push(Fault::at(
                    Field::Concentration,
                    "outside-table",
                    format!(
                        "concentration is {}; {} is known from {minimum} to {maximum} by mass of {of}",
                        given.unwrap_or_default(),
                        fluid.id()
                    ),
                ));
            }
            given
        }
        Composition::Humidity => {
            refuse(fields, Field::Concentration, fluid, faults);
            match fields.number(Field::RelativeHumidity) {
                Some(humidity) => humidity_ratio(humidity, ambient?, pressure?, faults),
                None => Some(0.0),
            }
        }
    };
    Some(Conditions {
        pressure: pressure?,
        composition: composition?,
    })
}

fn humidity_ratio(
    humidity: f64,
    ambient: f64,
    pressure: f64,
    faults: &mut Vec<Fault>,
) -> Option<f64> {
    match Fluids::humidity_ratio(humidity, ambient, pressure) {
        Ok(ratio) => Some(ratio),
        Err(error) => {
            let detail = format!("relative_humidity {humidity} at {ambient} K: {error}");
            faults.push(Fault::at(Field::RelativeHumidity, "outside-table", detail));
            None
        }
    }
}

/// A field of mixtures that the fluid does not take.
fn refuse(fields: &Fields, field: Field, fluid: &Fluid, faults: &mut Vec<Fault>) {
    if fields.is_given(field) {
        let detail = format!(
            "{} is given, but {} does not take it",
            field.name(),
            fluid.id()
        );
        faults.push(Fault::at(field, "unexpected-field", detail));
    }
}

/// Radiation needs its emissivities and a fluid that lets it through.
pub(super) fn check_radiation(
    fields: &Fields,
    fluids: &Fluids,
    fluid: FluidId,
    faults: &mut Vec<Fault>,
) {
    const NEEDS: [(Field, Field); 3] = [
        (Field::SurroundingsTemperature, Field::Emissivity),
        (Field::EmissivityHot, Field::EmissivityCold),
        (Field::EmissivityCold, Field::EmissivityHot),
    ];
    for (given, needed) in NEEDS {
        if fields.is_given(given) {
            let why = format!("{} has no effect without it", given.name());
            require(fields, needed, &why, faults);
        }
    }
    if fluids.get(fluid).phase() == Phase::Gas {
        return;
    }
    for field in [
        Field::Emissivity,
        Field::EmissivityHot,
        Field::EmissivityCold,
    ] {
        if fields.is_given(field) {
            faults.push(Fault::at(
                field,
                "unexpected-field",
                format!(
                    "{} is given, but {} lets no heat radiation through; leave it out",
                    field.name(),
                    fluids.get(fluid).id()
                ),
            ));
        }
    }
}

/// Emissivity of two surfaces that see only each other, on the area of the hotter; 0 where either is.
///
/// # Source
/// `1/(1/e_hot + (A_hot/A_cold)(1/e_cold - 1))`, exchange between two grey enclosing surfaces, e.g. VDI Heat Atlas, K.
pub(super) fn exchange(fields: &Fields, area_ratio: f64) -> Option<f64> {
    let hot = fields.number(Field::EmissivityHot)?;
    let cold = fields.number(Field::EmissivityCold)?;
    Some(1.0 / (1.0 / hot + area_ratio * (1.0 / cold - 1.0)))
}

/// The draught, unless it is so slow that the fluid is as good as still.
pub(super) fn read_draught(fields: &Fields) -> Option<Draught> {
    const STILL: f64 = 1e-6;
    let speed = fields.number(Field::DraughtSpeed)?;
    let direction = fields.draught_direction.unwrap_or(DraughtDirection::Across);
    (speed >= STILL).then_some(Draught { speed, direction })
}

/// The hotter and the colder temperature of a gap.
pub(super) fn read_gap(fields: &Fields, faults: &mut Vec<Fault>) -> (Option<Surface>, Option<f64>) {
    let hot = fields.number(Field::HotTemperature);
    let cold = fields.number(Field::ColdTemperature);
    if let (Some(hot), Some(cold)) = (hot, cold)
        && hot < cold
    {
        faults.push(Fault::at(
            Field::HotTemperature,
            "conflicting-fields",
            format!("hot_temperature is {hot} K, below cold_temperature, {cold} K; exchange them"),
        ));
    }
    (hot.map(Surface::Temperature), cold)
}

/// The facing of a level layer's hot plate: one that is below faces up.
pub(super) fn hot_side(from: HeatedFrom) -> Facing {
    match from {
        HeatedFrom::Below => Facing::Up,
        HeatedFrom::Above => Facing::Down,
    }
}

/// Whether the fields beside the size are those that the body takes.
pub(super) fn check_fields(
    geometry: Geometry,
    space: Space,
    fields: &Fields,
    faults: &mut Vec<Fault>,
) {
    let taken = space.fields();
    for &field in taken.required {
        let why = match space {
            Space::Closed => "heat crosses the gap between the two",
            Space::Open | Space::Channel => "heat is lost to it",
        };
        require(fields, field, why, faults);
    }
    let unexpected = fields.given().filter(|field| {
        *field != Field::Geometry
            && !DIMENSIONS.contains(field)
            && !taken.all().any(|known| known == *field)
    });
    for field in unexpected {
        let names: Vec<_> = taken.all().map(Field::name).collect();
        faults.push(Fault::at(
            field,
            "unexpected-field",
            format!(
                "{} does not belong here; beside its size {} takes {}",
                field.name(),
                geometry.as_str(),
                names.join(", ")
            ),
        ));
    }
    if fields.is_given(Field::DraughtDirection) {
        let why = "draught_direction has no effect without it";
        require(fields, Field::DraughtSpeed, why, faults);
    }
}

/// Whether the method asked for is for the body and its heating.
pub(super) fn check_method(geometry: Geometry, fields: &Fields, faults: &mut Vec<Fault>) {
    let Some(id) = fields.method else {
        return;
    };
    let flux = fields.is_given(Field::HeatFlux) || fields.is_given(Field::HeatFlow);
    let heating = if flux {
        Heating::UniformFlux
    } else {
        Heating::Isothermal
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
