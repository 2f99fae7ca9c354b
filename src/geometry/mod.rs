//! The bodies, and what each of them asks for.

mod choice;
mod entries;
mod field;

pub(crate) use choice::choice;
pub use field::{
    DraughtDirection, Extrapolate, Facing, Field, FieldEntry, FieldValue, HeatedFrom, HeatedWalls,
    Limits,
};

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
        /// A pipe, rod or cable between upright and lying.
        InclinedCylinder = "inclined-cylinder",
        /// A ball.
        Sphere = "sphere",
        /// A box, cabinet or block as one body.
        Block = "block",
        /// A short upright cylinder with its ends, as one body.
        UprightShortCylinder = "upright-short-cylinder",
        /// A short lying cylinder with its ends, as one body.
        LyingShortCylinder = "lying-short-cylinder",
        /// A level gap between two plates.
        HorizontalLayer = "horizontal-layer",
        /// A leaning gap between two plates.
        TiltedLayer = "tilted-layer",
        /// An upright gap between two walls.
        VerticalCavity = "vertical-cavity",
        /// The gap between two lying concentric cylinders.
        ConcentricCylinders = "concentric-cylinders",
        /// The gap between two concentric spheres.
        ConcentricSpheres = "concentric-spheres",
        /// An open channel between two upright plates.
        ParallelPlates = "parallel-plates",
    }
}

/// How a body meets its fluid.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub enum Space {
    /// A surface in open fluid.
    Open,
    /// A closed gap between a hotter and a colder surface.
    Closed,
    /// A gap open below and above.
    Channel,
}

/// The fields beside a body's size that a space takes.
#[derive(Clone, Copy, Debug)]
pub struct SpaceFields {
    /// Fields that must be given.
    pub required: &'static [Field],
    /// Fields of which exactly one must be given, where there are any.
    pub one_of: &'static [Field],
    /// Fields that may be given: the space's own, and those of every space.
    pub optional: [&'static [Field]; 2],
}

impl SpaceFields {
    /// All of them.
    pub fn all(&self) -> impl Iterator<Item = Field> {
        let [own, common] = self.optional;
        [self.required, self.one_of, own, common]
            .into_iter()
            .flatten()
            .copied()
    }
}

/// Fields that every space may be given.
const COMMON: &[Field] = &[
    Field::Fluid,
    Field::Pressure,
    Field::Altitude,
    Field::Concentration,
    Field::RelativeHumidity,
    Field::Gravity,
    Field::Method,
    Field::Extrapolate,
    Field::Id,
];

/// What is known of a surface that loses heat to a fluid.
const HEATING: &[Field] = &[Field::SurfaceTemperature, Field::HeatFlux, Field::HeatFlow];

impl Space {
    /// The fields beside a body's size.
    pub fn fields(self) -> SpaceFields {
        match self {
            Space::Open => SpaceFields {
                required: &[Field::AmbientTemperature],
                one_of: HEATING,
                optional: [
                    &[
                        Field::Emissivity,
                        Field::SurroundingsTemperature,
                        Field::DraughtSpeed,
                        Field::DraughtDirection,
                        Field::Clearance,
                    ],
                    COMMON,
                ],
            },
            Space::Closed => SpaceFields {
                required: &[Field::HotTemperature, Field::ColdTemperature],
                one_of: &[],
                optional: [&[Field::EmissivityHot, Field::EmissivityCold], COMMON],
            },
            Space::Channel => SpaceFields {
                required: &[Field::AmbientTemperature],
                one_of: HEATING,
                optional: [&[], COMMON],
            },
        }
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
    /// How it meets its fluid.
    pub space: Space,
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
    Field::Gap,
    Field::Spacing,
    Field::InnerDiameter,
    Field::OuterDiameter,
    Field::TiltFromVertical,
    Field::TiltFromHorizontal,
    Field::Facing,
    Field::HeatedFrom,
    Field::HeatedWalls,
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
            Geometry::InclinedCylinder => &entries::INCLINED_CYLINDER,
            Geometry::Sphere => &entries::SPHERE,
            Geometry::Block => &entries::BLOCK,
            Geometry::UprightShortCylinder => &entries::UPRIGHT_SHORT_CYLINDER,
            Geometry::LyingShortCylinder => &entries::LYING_SHORT_CYLINDER,
            Geometry::HorizontalLayer => &entries::HORIZONTAL_LAYER,
            Geometry::TiltedLayer => &entries::TILTED_LAYER,
            Geometry::VerticalCavity => &entries::VERTICAL_CAVITY,
            Geometry::ConcentricCylinders => &entries::CONCENTRIC_CYLINDERS,
            Geometry::ConcentricSpheres => &entries::CONCENTRIC_SPHERES,
            Geometry::ParallelPlates => &entries::PARALLEL_PLATES,
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
