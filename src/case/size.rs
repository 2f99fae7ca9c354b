//! From a body's dimensions to the lengths, areas and proportions that its methods want.

use std::f64::consts::PI;

use crate::geometry::{Field, Geometry, HeatedWalls};
use crate::methods::Groups;

use super::fault::Fault;
use super::fields::Fields;
use super::form::{choose_form, report};

/// What a body's dimensions come to.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Size {
    /// The length in the Nusselt and Rayleigh numbers, m.
    pub characteristic_length: f64,
    /// The length over which a Nusselt number becomes a coefficient, m; not the same for concentric bodies, whose coefficient is on the inner area.
    pub conduction_length: f64,
    /// Area of the face, m2.
    pub area: Option<f64>,
    /// Area of the face per length of the body, m2/m.
    pub area_per_length: Option<f64>,
    /// Area of the hotter surface of a gap over that of the colder.
    pub area_ratio: f64,
    /// The body a draught meets.
    pub flow: Flow,
    /// Tilt and proportions; no Rayleigh and Prandtl numbers yet.
    pub shape: Groups,
}

/// A body as a draught meets it.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Flow {
    /// Length of the surface along a flow that assists or opposes, m.
    pub along: f64,
    /// What a flow across meets.
    pub across: Across,
}

/// What a flow across a body meets.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum Across {
    /// A plate of this length along the flow, m.
    Plate(f64),
    /// A cylinder of this diameter, m.
    Cylinder(f64),
    /// A sphere of this diameter, m.
    Sphere(f64),
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
                    ..Size::open(0.25 * PI * diameter, Across::Plate(diameter))
                }),
                None => upright_strip(number(Field::Height)?, fields),
            },
            Geometry::InclinedPlate => {
                let length = number(Field::Length)?;
                let strip = upright_strip(length, fields)?;
                let width = number(Field::Width).or(strip.area.map(|area| area / length));
                let length_ratio = width.map_or(0.5, |width| 0.5 * width / (length + width));
                Some(Size {
                    shape: Groups {
                        tilt: number(Field::TiltFromVertical)?,
                        length_ratio,
                        ..Groups::default()
                    },
                    ..strip
                })
            }
            Geometry::HorizontalPlate => level_plate(fields, faults),
            Geometry::HorizontalCylinder => {
                let diameter = number(Field::Diameter)?;
                let length = number(Field::Length);
                Some(Size {
                    area: length.map(|length| PI * diameter * length),
                    area_per_length: Some(PI * diameter),
                    shape: slender(length.map_or(0.0, |length| length / diameter)),
                    ..Size::open(diameter, Across::Cylinder(diameter))
                })
            }
            Geometry::VerticalCylinder => Some(long_cylinder(
                number(Field::Diameter)?,
                number(Field::Height)?,
            )),
            Geometry::InclinedCylinder => {
                let size = long_cylinder(number(Field::Diameter)?, number(Field::Length)?);
                Some(Size {
                    shape: size.shape.tilted(number(Field::TiltFromVertical)?),
                    ..size
                })
            }
            Geometry::Sphere => {
                let diameter = number(Field::Diameter)?;
                Some(Size {
                    area: Some(PI * diameter * diameter),
                    ..Size::open(diameter, Across::Sphere(diameter))
                })
            }
            Geometry::Block => Some(block(
                number(Field::Length)?,
                number(Field::Width)?,
                number(Field::Height)?,
            )),
            Geometry::UprightShortCylinder => Some(short_cylinder(
                number(Field::Diameter)?,
                number(Field::Height)?,
            )),
            Geometry::LyingShortCylinder => Some(short_cylinder(
                number(Field::Diameter)?,
                number(Field::Length)?,
            )),
            Geometry::HorizontalLayer => Some(Size {
                area: number(Field::Area),
                ..Size::gap(number(Field::Gap)?)
            }),
            Geometry::VerticalCavity | Geometry::TiltedLayer => {
                let (gap, height) = (number(Field::Gap)?, number(Field::Height)?);
                let by_width = number(Field::Width).map(|width| height * width);
                Some(Size {
                    area: by_width.or(number(Field::Area)),
                    area_per_length: Some(height),
                    shape: Groups {
                        tilt: number(Field::TiltFromHorizontal).unwrap_or(90.0),
                        ..Groups::default().with_aspect(height / gap)
                    },
                    ..Size::gap(gap)
                })
            }
            Geometry::ConcentricCylinders | Geometry::ConcentricSpheres => {
                let (inner, outer) = (number(Field::InnerDiameter)?, number(Field::OuterDiameter)?);
                if outer <= inner {
                    faults.push(Fault::at(
                        Field::OuterDiameter,
                        "conflicting-fields",
                        format!(
                            "outer_diameter is {outer} m, not larger than inner_diameter, {inner} m"
                        ),
                    ));
                    return None;
                }
                Some(if geometry == Geometry::ConcentricCylinders {
                    concentric_cylinders(inner, outer, number(Field::Length))
                } else {
                    concentric_spheres(inner, outer)
                })
            }
            Geometry::ParallelPlates => {
                let (spacing, height) = (number(Field::Spacing)?, number(Field::Height)?);
                let walls = match fields.heated_walls? {
                    HeatedWalls::Both => 2.0,
                    HeatedWalls::One => 1.0,
                };
                Some(Size {
                    area: number(Field::Width).map(|width| walls * height * width),
                    area_per_length: Some(walls * height),
                    shape: Groups {
                        heated_walls: walls,
                        ..Groups::default().with_aspect(height / spacing)
                    },
                    ..Size::gap(spacing)
                })
            }
        }
    }

    /// A surface in open fluid.
    fn open(characteristic_length: f64, across: Across) -> Size {
        Size {
            characteristic_length,
            conduction_length: characteristic_length,
            area: None,
            area_per_length: None,
            area_ratio: 1.0,
            flow: Flow {
                along: characteristic_length,
                across,
            },
            shape: Groups::default(),
        }
    }

    /// A gap, which no draught meets.
    fn gap(gap: f64) -> Size {
        Size::open(gap, Across::Plate(gap))
    }
}

fn slender(slenderness: f64) -> Groups {
    Groups::default().with_slenderness(slenderness)
}

/// A strip along which the fluid rises: per metre of width, and in all if a width or an area is given.
fn upright_strip(length: f64, fields: &Fields) -> Option<Size> {
    let width = fields.number(Field::Width);
    let by_width = width.map(|width| length * width);
    Some(Size {
        area: by_width.or(fields.number(Field::Area)),
        area_per_length: Some(length),
        ..Size::open(length, Across::Plate(width.unwrap_or(length)))
    })
}

fn level_plate(fields: &Fields, faults: &mut Vec<Fault>) -> Option<Size> {
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
    let length = fields
        .number(Field::Length)
        .or(fields.number(Field::Diameter))
        .unwrap_or(area.sqrt());
    let size = Size::open(area / perimeter, Across::Plate(length));
    Some(Size {
        area: Some(area),
        flow: Flow {
            along: length,
            ..size.flow
        },
        ..size
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

/// The side of a cylinder along which the fluid rises.
fn long_cylinder(diameter: f64, length: f64) -> Size {
    Size {
        area: Some(PI * diameter * length),
        area_per_length: Some(PI * diameter),
        shape: slender(length / diameter),
        ..Size::open(length, Across::Cylinder(diameter))
    }
}

fn block(length: f64, width: f64, height: f64) -> Size {
    let area = 2.0 * (length * width + length * height + width * height);
    let root = area.sqrt();
    let size = Size::open(root, Across::Sphere((area / PI).sqrt()));
    Size {
        area: Some(area),
        flow: Flow {
            along: height,
            ..size.flow
        },
        shape: Groups {
            block_length: length.max(width) / root,
            block_width: length.min(width) / root,
            block_height: height / root,
            ..Groups::default()
        },
        ..size
    }
}

/// A cylinder with both ends as one body.
fn short_cylinder(diameter: f64, length: f64) -> Size {
    let area = PI * diameter * (length + 0.5 * diameter);
    let size = Size::open(area.sqrt(), Across::Cylinder(diameter));
    Size {
        area: Some(area),
        flow: Flow {
            along: length,
            ..size.flow
        },
        shape: slender(length / diameter),
        ..size
    }
}

/// # Source
/// Raithby and Hollands 1975, Advances in Heat Transfer 11, 265-315.
fn concentric_cylinders(inner: f64, outer: f64, length: Option<f64>) -> Size {
    let (ri, ro) = (0.5 * inner, 0.5 * outer);
    let logarithm = (ro / ri).ln();
    let own_length =
        2.0 * logarithm.powf(4.0 / 3.0) / (ri.powf(-0.6) + ro.powf(-0.6)).powf(5.0 / 3.0);
    Size {
        conduction_length: ri * logarithm,
        area: length.map(|length| PI * inner * length),
        area_per_length: Some(PI * inner),
        area_ratio: inner / outer,
        ..Size::gap(own_length)
    }
}

/// # Source
/// Raithby and Hollands 1975, Advances in Heat Transfer 11, 265-315.
fn concentric_spheres(inner: f64, outer: f64) -> Size {
    let (ri, ro) = (0.5 * inner, 0.5 * outer);
    let own_length = (1.0 / ri - 1.0 / ro).powf(4.0 / 3.0)
        / (2_f64.cbrt() * (ri.powf(-1.4) + ro.powf(-1.4)).powf(5.0 / 3.0));
    Size {
        conduction_length: ri * (ro - ri) / ro,
        area: Some(PI * inner * inner),
        area_ratio: (inner / outer).powi(2),
        ..Size::gap(own_length)
    }
}
