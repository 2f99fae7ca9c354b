//! From a body's dimensions to the lengths, areas and proportions that its methods want.

use std::f64::consts::PI;

use crate::geometry::{DIMENSIONS, Field, Geometry, SizeForm};

use super::fault::Fault;
use super::fields::Fields;

/// What a body's dimensions come to.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Size {
    /// The length in the Nusselt and Rayleigh numbers, m.
    pub characteristic_length: f64,
    /// Area of the face, m2.
    pub area: Option<f64>,
    /// Area of the face per length of the body, m2/m.
    pub area_per_length: Option<f64>,
    /// Angle between an inclined plate and the vertical, degrees.
    pub tilt: f64,
    /// Height of an upright cylinder over its diameter.
    pub slenderness: f64,
    /// Area over perimeter of an inclined plate, over its length along the slope.
    pub length_ratio: f64,
}

impl Size {
    /// Reads the dimensions of a body.
    ///
    /// # Errors
    /// Missing, superfluous and contradicting dimensions are added to `faults`.
    pub fn read(geometry: Geometry, fields: &Fields, faults: &mut Vec<Fault>) -> Option<Size> {
        let form = choose_form(geometry, fields);
        let before = faults.len();
        report(geometry, form, fields, faults);
        if faults.len() > before {
            return None;
        }
        let number = |field| fields.number(field);
        match geometry {
            Geometry::VerticalPlate => match number(Field::Diameter) {
                Some(diameter) => Some(Size {
                    area: Some(0.25 * PI * diameter * diameter),
                    ..Size::of_length(0.25 * PI * diameter)
                }),
                None => upright_strip(number(Field::Height)?, fields),
            },
            Geometry::InclinedPlate => {
                let length = number(Field::Length)?;
                let strip = upright_strip(length, fields)?;
                let width = number(Field::Width).or(strip.area.map(|area| area / length));
                Some(Size {
                    tilt: number(Field::TiltFromVertical)?,
                    length_ratio: match width {
                        Some(width) => 0.5 * width / (length + width),
                        None => 0.5,
                    },
                    ..strip
                })
            }
            Geometry::HorizontalPlate => {
                let (area, perimeter) = level_face(fields)?;
                if perimeter * perimeter < 4.0 * PI * area * (1.0 - 1e-9) {
                    faults.push(Fault::at(
                        Field::Perimeter,
                        "conflicting-fields",
                        format!(
                            "perimeter is {perimeter} m, but a face of {area} m2 has at least {} m",
                            (4.0 * PI * area).sqrt()
                        ),
                    ));
                    return None;
                }
                Some(Size {
                    area: Some(area),
                    ..Size::of_length(area / perimeter)
                })
            }
            Geometry::HorizontalCylinder => {
                let diameter = number(Field::Diameter)?;
                Some(Size {
                    area: number(Field::Length).map(|length| PI * diameter * length),
                    area_per_length: Some(PI * diameter),
                    ..Size::of_length(diameter)
                })
            }
            Geometry::VerticalCylinder => {
                let (diameter, height) = (number(Field::Diameter)?, number(Field::Height)?);
                Some(Size {
                    area: Some(PI * diameter * height),
                    area_per_length: Some(PI * diameter),
                    slenderness: height / diameter,
                    ..Size::of_length(height)
                })
            }
            Geometry::Sphere => {
                let diameter = number(Field::Diameter)?;
                Some(Size {
                    area: Some(PI * diameter * diameter),
                    ..Size::of_length(diameter)
                })
            }
        }
    }

    fn of_length(characteristic_length: f64) -> Size {
        Size {
            characteristic_length,
            area: None,
            area_per_length: None,
            tilt: 0.0,
            slenderness: 0.0,
            length_ratio: 0.0,
        }
    }
}

/// A strip along which the fluid rises: per metre of width, and in all if a width or an area is given.
fn upright_strip(length: f64, fields: &Fields) -> Option<Size> {
    let by_width = fields.number(Field::Width).map(|width| length * width);
    Some(Size {
        area: by_width.or(fields.number(Field::Area)),
        area_per_length: Some(length),
        ..Size::of_length(length)
    })
}

/// Area and perimeter of a level face.
fn level_face(fields: &Fields) -> Option<(f64, f64)> {
    if let Some(diameter) = fields.number(Field::Diameter) {
        return Some((0.25 * PI * diameter * diameter, PI * diameter));
    }
    if let Some(length) = fields.number(Field::Length) {
        let width = fields.number(Field::Width)?;
        return Some((length * width, 2.0 * (length + width)));
    }
    Some((
        fields.number(Field::Area)?,
        fields.number(Field::Perimeter)?,
    ))
}

/// The form that the given dimensions come closest to.
fn choose_form(geometry: Geometry, fields: &Fields) -> &'static SizeForm {
    let forms = geometry.entry().forms;
    let distance = |form: &&SizeForm| {
        let missing = form
            .required
            .iter()
            .filter(|&&field| !fields.is_given(field));
        missing.count() + unexpected(form, fields).count()
    };
    // Every body has at least one form; the first wins a tie.
    forms.iter().min_by_key(distance).unwrap_or(&forms[0])
}

fn unexpected(form: &SizeForm, fields: &Fields) -> impl Iterator<Item = Field> {
    DIMENSIONS.iter().copied().filter(move |field| {
        fields.is_given(*field) && !form.required.contains(field) && !form.optional.contains(field)
    })
}

fn report(geometry: Geometry, form: &SizeForm, fields: &Fields, faults: &mut Vec<Fault>) {
    for &field in form
        .required
        .iter()
        .filter(|&&field| !fields.is_given(field))
    {
        faults.push(Fault::at(
            field,
            "missing-field",
            format!(
                "{} is not given; {} takes {}",
                field.name(),
                geometry.as_str(),
                forms_in_words(geometry)
            ),
        ));
    }
    for field in unexpected(form, fields) {
        faults.push(Fault::at(
            field,
            "unexpected-field",
            format!(
                "{} does not belong here; {} takes {}",
                field.name(),
                geometry.as_str(),
                forms_in_words(geometry)
            ),
        ));
    }
    let mut optional = form
        .optional
        .iter()
        .filter(|&&field| fields.is_given(field));
    if let (Some(first), Some(second)) = (optional.next(), optional.next()) {
        faults.push(Fault::at(
            *second,
            "conflicting-fields",
            format!(
                "{} and {} are both given; give one",
                first.name(),
                second.name()
            ),
        ));
    }
}

/// The ways to give a body's size, as a sentence's end.
pub fn forms_in_words(geometry: Geometry) -> String {
    let names = |fields: &[Field], joint: &str| {
        fields
            .iter()
            .map(|field| field.name())
            .collect::<Vec<_>>()
            .join(joint)
    };
    let one = |form: &SizeForm| match form.optional {
        [] => names(form.required, ", "),
        optional => format!(
            "{} [{}]",
            names(form.required, ", "),
            names(optional, " or ")
        ),
    };
    geometry
        .entry()
        .forms
        .iter()
        .map(one)
        .collect::<Vec<_>>()
        .join("; or ")
}
