//! What the catalogue says of each body.

use super::Field::{
    AmbientTemperature, Area, Diameter, Emissivity, Facing, Fluid, Height, Length, Perimeter,
    SurfaceTemperature, TiltFromVertical, Width,
};
use super::{GeometryEntry, SizeForm};

const fn form(required: &'static [super::Field], optional: &'static [super::Field]) -> SizeForm {
    SizeForm { required, optional }
}

pub static VERTICAL_PLATE: GeometryEntry = GeometryEntry {
    name: "upright flat surface or upright disc",
    characteristic_length: "height; for a disc its mean height, pi/4 of the diameter",
    per_length_of: Some("width"),
    forms: &[form(&[Height], &[Width, Area]), form(&[Diameter], &[])],
    example_title: "Wall of a whey tank",
    example: &[
        (Height, "\"2.4 m\""),
        (Width, "\"3.1 m\""),
        (SurfaceTemperature, "\"68 degC\""),
        (AmbientTemperature, "\"22 degC\""),
        (Emissivity, "0.9"),
    ],
};

pub static INCLINED_PLATE: GeometryEntry = GeometryEntry {
    name: "flat surface between upright and level",
    characteristic_length: "length along the slope",
    per_length_of: Some("width"),
    forms: &[form(&[Length, TiltFromVertical, Facing], &[Width, Area])],
    example_title: "Sloping lid of a cheese vat",
    example: &[
        (Length, "\"1.2 m\""),
        (Width, "\"2 m\""),
        (TiltFromVertical, "60"),
        (Facing, "\"up\""),
        (SurfaceTemperature, "\"55 degC\""),
        (AmbientTemperature, "\"20 degC\""),
        (Emissivity, "0.3"),
    ],
};

pub static HORIZONTAL_PLATE: GeometryEntry = GeometryEntry {
    name: "level flat surface",
    characteristic_length: "area of the face divided by its perimeter",
    per_length_of: None,
    forms: &[
        form(&[Facing, Length, Width], &[]),
        form(&[Facing, Diameter], &[]),
        form(&[Facing, Area, Perimeter], &[]),
    ],
    example_title: "Roof of a hot-water tank",
    example: &[
        (Diameter, "\"2.2 m\""),
        (Facing, "\"up\""),
        (SurfaceTemperature, "\"75 degC\""),
        (AmbientTemperature, "\"25 degC\""),
        (Emissivity, "0.85"),
    ],
};

pub static HORIZONTAL_CYLINDER: GeometryEntry = GeometryEntry {
    name: "lying pipe, rod, cable or wire",
    characteristic_length: "outside diameter",
    per_length_of: Some("length"),
    forms: &[form(&[Diameter], &[Length])],
    example_title: "Bare steam pipe in the boiler house",
    example: &[
        (Diameter, "\"88.9 mm\""),
        (SurfaceTemperature, "\"160 degC\""),
        (AmbientTemperature, "\"20 degC\""),
        (Emissivity, "0.9"),
    ],
};

pub static VERTICAL_CYLINDER: GeometryEntry = GeometryEntry {
    name: "side of an upright pipe, tank or rod",
    characteristic_length: "height",
    per_length_of: Some("height"),
    forms: &[form(&[Diameter, Height], &[])],
    example_title: "Riser of a pasteuriser",
    example: &[
        (Diameter, "\"60.3 mm\""),
        (Height, "\"4 m\""),
        (SurfaceTemperature, "\"95 degC\""),
        (AmbientTemperature, "\"24 degC\""),
        (Emissivity, "0.8"),
    ],
};

pub static SPHERE: GeometryEntry = GeometryEntry {
    name: "ball",
    characteristic_length: "diameter",
    per_length_of: None,
    forms: &[form(&[Diameter], &[])],
    example_title: "Spray ball of a cleaning circuit in still water",
    example: &[
        (Diameter, "\"65 mm\""),
        (Fluid, "\"water\""),
        (SurfaceTemperature, "\"70 degC\""),
        (AmbientTemperature, "\"40 degC\""),
    ],
};
