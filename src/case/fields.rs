//! A case's fields in SI: what was given, and nothing derived from it.

use crate::fluids::{FluidId, Fluids};
use crate::geometry::{
    DraughtDirection, Extrapolate, Facing, Field, FieldValue, Geometry, HeatedFrom, HeatedWalls,
    Limits,
};
use crate::methods::MethodId;
use crate::quantity::{
    Kind, UnitChoice, looks_nominal, nearest, nominal_diameter, number_text, parse,
};

use super::entries::{Entries, Given, shown};
use super::fault::Fault;

/// The given fields, flat and in SI.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Fields {
    numbers: [f64; Field::COUNT],
    given: u64,
    read: u64,
    bare: u64,
    /// The body.
    pub geometry: Option<Geometry>,
    /// The side that touches the fluid.
    pub facing: Option<Facing>,
    /// The hot side of a level layer.
    pub heated_from: Option<HeatedFrom>,
    /// The heated walls of a channel.
    pub heated_walls: Option<HeatedWalls>,
    /// How a draught meets the fluid's own motion.
    pub draught_direction: Option<DraughtDirection>,
    /// Whether a diameter came as an inch size that is also a nominal pipe size.
    pub nominal_size: bool,
    /// The fluid.
    pub fluid: Option<FluidId>,
    /// The method asked for, none for the automatic choice.
    pub method: Option<MethodId>,
    /// What to do outside ranges.
    pub extrapolate: Option<Extrapolate>,
}

impl Default for Fields {
    fn default() -> Self {
        Fields {
            numbers: [0.0; Field::COUNT],
            given: 0,
            read: 0,
            bare: 0,
            geometry: None,
            facing: None,
            heated_from: None,
            heated_walls: None,
            draught_direction: None,
            nominal_size: false,
            fluid: None,
            method: None,
            extrapolate: None,
        }
    }
}

const fn bit(field: Field) -> u64 {
    1 << field as u32
}

impl Fields {
    /// Gives every raw value its meaning.
    ///
    /// # Errors
    /// All values that have none are added to `faults`; their fields then count as not given, but [`Self::is_given`] still holds.
    pub fn read(
        entries: &Entries,
        units: &UnitChoice,
        fluids: &Fluids,
        faults: &mut Vec<Fault>,
    ) -> Fields {
        let mut fields = Fields::default();
        for &field in Field::ALL {
            let Some(given) = entries.get(field) else {
                continue;
            };
            fields.given |= bit(field);
            if let Err(fault) = fields.read_one(field, given, units, fluids) {
                faults.push(fault);
            }
        }
        fields
    }

    fn read_one(
        &mut self,
        field: Field,
        given: &Given,
        units: &UnitChoice,
        fluids: &Fluids,
    ) -> Result<(), Fault> {
        match field.entry().value {
            FieldValue::Quantity(kind, limits) => {
                let (value, bare) = match self.read_nominal(field, given)? {
                    Some(diameter) => (diameter, false),
                    None => read_quantity(field, kind, given, units)?,
                };
                check_limits(field, kind, limits, value)?;
                self.numbers[field as usize] = value;
                self.read |= bit(field);
                if bare {
                    self.bare |= bit(field);
                }
            }
            FieldValue::Choice(known) => {
                let text = read_text(field, given)?;
                match field {
                    Field::Geometry => self.geometry = Geometry::from_text(text),
                    Field::Facing => self.facing = Facing::from_text(text),
                    Field::HeatedFrom => self.heated_from = HeatedFrom::from_text(text),
                    Field::HeatedWalls => self.heated_walls = HeatedWalls::from_text(text),
                    Field::DraughtDirection => {
                        self.draught_direction = DraughtDirection::from_text(text);
                    }
                    Field::Extrapolate => self.extrapolate = Extrapolate::from_text(text),
                    _ => {}
                }
                if !known.contains(&text) {
                    return Err(unknown_value(field, text, known.iter().copied()));
                }
            }
            FieldValue::Fluid => {
                let text = read_text(field, given)?;
                self.fluid = fluids.find(text);
                if self.fluid.is_none() {
                    let known = fluids.iter().map(|(_, fluid)| fluid.id());
                    return Err(unknown_value(field, text, known));
                }
            }
            FieldValue::Method => {
                let text = read_text(field, given)?;
                self.method = MethodId::from_text(text);
                if self.method.is_none() && text != "auto" {
                    let of_body = MethodId::ALL.iter().filter(|id| {
                        self.geometry
                            .is_none_or(|body| id.method().geometry == body)
                    });
                    let known = of_body.map(|id| id.as_str()).chain(["auto"]);
                    return Err(unknown_value(field, text, known));
                }
            }
            FieldValue::Label => {
                read_text(field, given)?;
            }
        }
        Ok(())
    }

    /// The outside diameter of a nominal size; marks inch sizes that look like one.
    fn read_nominal(&mut self, field: Field, given: &Given) -> Result<Option<f64>, Fault> {
        const DIAMETERS: [Field; 3] = [Field::Diameter, Field::InnerDiameter, Field::OuterDiameter];
        let Given::Text(text) = given else {
            return Ok(None);
        };
        if !DIAMETERS.contains(&field) {
            return Ok(None);
        }
        self.nominal_size |= looks_nominal(text);
        nominal_diameter(text).map_err(|detail| {
            Fault::at(
                field,
                "unknown-value",
                format!("{}: {detail}", field.name()),
            )
        })
    }

    /// Whether the caller gave this field, well or badly.
    pub fn is_given(&self, field: Field) -> bool {
        self.given & bit(field) != 0
    }

    /// The fields that the caller gave, in the order of the list.
    pub fn given(&self) -> impl Iterator<Item = Field> {
        Field::ALL
            .iter()
            .copied()
            .filter(|&field| self.is_given(field))
    }

    /// The value of a quantity field, in SI, if it was given and could be read.
    pub fn number(&self, field: Field) -> Option<f64> {
        (self.read & bit(field) != 0).then_some(self.numbers[field as usize])
    }

    /// Whether the value came as a number without a unit, in the default unit.
    pub fn is_bare(&self, field: Field) -> bool {
        self.bare & bit(field) != 0
    }
}

fn read_text<'a>(field: Field, given: &'a Given) -> Result<&'a str, Fault> {
    let found = match given {
        Given::Text(text) => return Ok(text),
        Given::Number(_) => "a number",
        Given::Other(found) => found,
    };
    Err(Fault::at(
        field,
        "wrong-type",
        format!(
            "{} is {found}; it takes a text such as {}",
            field.name(),
            field.entry().example
        ),
    ))
}

/// A value in SI, and whether it came in the default unit of SI itself.
fn read_quantity(
    field: Field,
    kind: Kind,
    given: &Given,
    units: &UnitChoice,
) -> Result<(f64, bool), Fault> {
    let unit = units.unit(field.name(), kind);
    match given {
        Given::Number(number) if number.is_finite() => Ok((unit.to_si(*number), unit.is_si())),
        Given::Number(number) => Err(Fault::at(
            field,
            "not-finite",
            format!("{} is {number}; it takes a finite number", field.name()),
        )),
        Given::Text(text) => match parse(text, kind, unit) {
            Ok(reading) => Ok((reading.value, reading.bare && unit.is_si())),
            Err(error) => Err(Fault::at(
                field,
                error.code(),
                format!("{}: {error}", field.name()),
            )),
        },
        Given::Other(found) => Err(Fault::at(
            field,
            "wrong-type",
            format!(
                "{} is {found}; it takes a number or a text such as {}",
                field.name(),
                field.entry().example
            ),
        )),
    }
}

fn check_limits(field: Field, kind: Kind, limits: Limits, value: f64) -> Result<(), Fault> {
    if limits.contains(value) {
        return Ok(());
    }
    let unit = kind.si_unit().symbol();
    let from = if limits.above_minimum {
        "above"
    } else {
        "from"
    };
    Err(Fault::at(
        field,
        "outside-limits",
        format!(
            "{} is {} {unit}; it takes values {from} {} {unit} to {} {unit}",
            field.name(),
            number_text(value),
            number_text(limits.minimum),
            number_text(limits.maximum)
        ),
    ))
}

fn unknown_value<'a>(field: Field, text: &str, known: impl Iterator<Item = &'a str>) -> Fault {
    let known: Vec<&str> = known.collect();
    let hint = match nearest(text, known.iter().copied()) {
        Some(near) => format!("did you mean {near}?"),
        None => format!("it takes {}", known.join(", ")),
    };
    Fault::at(
        field,
        "unknown-value",
        format!("{} is {}; {hint}", field.name(), shown(text)),
    )
}
