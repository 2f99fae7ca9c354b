//! The bodies, and what each of them asks for.

mod choice;
mod entries;
mod field;

pub(crate) use choice::choice;
pub use field::{Extrapolate, Facing, Field, FieldEntry, FieldValue, Limits};

choice! {
    /// A body whose surface loses or gains heat.
    Geometry {
        /// An upright flat surface, or an upright disc.
        VerticalPlate = "vertical-plate",
        /// A flat surface between upright and level.
        InclinedPlate = "inclined-plate",
        /// A level flat surface.
        HorizontalPlate = "horizontal-plate",
        /// A lying pipe, rod, cable or wire.
        HorizontalCylinder = "horizontal-cylinder",
        /// The side of an upright pipe, tank or rod.
        VerticalCylinder = "vertical-cylinder",
        /// A ball.
        Sphere = "sphere",
    }
}

/// One way to give a body's size: all of `required`, and at most one of `optional`.
#[derive(Clone, Copy, Debug)]
pub struct SizeForm {
    /// Fields that must all be given.
    pub required: &'static [Field],
    /// Fields of which one may be given.
    pub optional: &'static [Field],
}

/// What the catalogue says of a body.
#[derive(Clone, Copy, Debug)]
pub struct GeometryEntry {
    /// Plain words.
    pub name: &'static str,
    /// The length in its Nusselt and Rayleigh numbers.
    pub characteristic_length: &'static str,
    /// What a figure per length is per, where the body has one.
    pub per_length_of: Option<&'static str>,
    /// The ways to give its size.
    pub forms: &'static [SizeForm],
    /// What the example request is about.
    pub example_title: &'static str,
    /// The fields of an example request beside `geometry`, as JSON values.
    pub example: &'static [(Field, &'static str)],
}

/// The fields that describe size and position; which of them a body takes is in its forms.
pub const DIMENSIONS: &[Field] = &[
    Field::Height,
    Field::Length,
    Field::Width,
    Field::Diameter,
    Field::Area,
    Field::Perimeter,
    Field::TiltFromVertical,
    Field::Facing,
];

impl Geometry {
    /// What the catalogue says of this body.
    pub fn entry(self) -> &'static GeometryEntry {
        match self {
            Geometry::VerticalPlate => &entries::VERTICAL_PLATE,
            Geometry::InclinedPlate => &entries::INCLINED_PLATE,
            Geometry::HorizontalPlate => &entries::HORIZONTAL_PLATE,
            Geometry::HorizontalCylinder => &entries::HORIZONTAL_CYLINDER,
            Geometry::VerticalCylinder => &entries::VERTICAL_CYLINDER,
            Geometry::Sphere => &entries::SPHERE,
        }
    }

    /// The plain words, characteristic length and forms of every body.
    pub fn all() -> impl Iterator<Item = (Geometry, &'static GeometryEntry)> {
        Geometry::ALL
            .iter()
            .map(|&geometry| (geometry, geometry.entry()))
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn names_lead_back_to_their_values() {
        for &field in Field::ALL {
            assert_eq!(Field::from_name(field.name()), Some(field));
        }
        for &geometry in Geometry::ALL {
            assert_eq!(Geometry::from_text(geometry.as_str()), Some(geometry));
        }
    }

    #[test]
    fn forms_use_dimensions_and_every_dimension_is_used() {
        let mut used = Vec::new();
        for (geometry, entry) in Geometry::all() {
            for form in entry.forms {
                for field in form.required.iter().chain(form.optional) {
                    assert!(DIMENSIONS.contains(field), "{geometry:?} {field:?}");
                    used.push(*field);
                }
            }
        }
        for dimension in DIMENSIONS {
            assert!(used.contains(dimension), "{dimension:?}");
        }
    }
}
