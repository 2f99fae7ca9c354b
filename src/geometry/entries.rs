//! What the catalogue says of each body.

use super::Field::{
    AmbientTemperature, Area, ColdTemperature, Diameter, Emissivity, EmissivityCold, EmissivityHot,
    Facing, Fluid, Gap, HeatedFrom, HeatedWalls, Height, HotTemperature, InnerDiameter, Length,
    OuterDiameter, Perimeter, Spacing, SurfaceTemperature, TiltFromHorizontal, TiltFromVertical,
    Width,
};
use super::{GeometryEntry, SizeForm, Space};

const fn form(required: &'static [super::Field], optional: &'static [super::Field]) -> SizeForm {
    SizeForm { required, optional }
}

pub static VERTICAL_PLATE: GeometryEntry = GeometryEntry {
    name: "upright flat surface or upright disc",
    space: Space::Open,
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
    space: Space::Open,
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
    space: Space::Open,
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
    space: Space::Open,
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
    space: Space::Open,
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
    space: Space::Open,
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

pub static INCLINED_CYLINDER: GeometryEntry = GeometryEntry {
    name: "pipe, rod or cable between upright and lying",
    space: Space::Open,
    characteristic_length: "length along the axis",
    per_length_of: Some("length"),
    forms: &[form(&[Diameter, Length, TiltFromVertical], &[])],
    example_title: "Sloping condensate line",
    example: &[
        (Diameter, "\"60.3 mm\""),
        (Length, "\"3 m\""),
        (TiltFromVertical, "70"),
        (SurfaceTemperature, "\"98 degC\""),
        (AmbientTemperature, "\"24 degC\""),
        (Emissivity, "0.85"),
    ],
};

pub static BLOCK: GeometryEntry = GeometryEntry {
    name: "box, cabinet or block as one body",
    space: Space::Open,
    characteristic_length: "square root of the whole area",
    per_length_of: None,
    forms: &[form(&[Length, Width, Height], &[])],
    example_title: "Pump motor in the dairy hall",
    example: &[
        (Length, "\"420 mm\""),
        (Width, "\"300 mm\""),
        (Height, "\"320 mm\""),
        (SurfaceTemperature, "\"62 degC\""),
        (AmbientTemperature, "\"23 degC\""),
        (Emissivity, "0.9"),
    ],
};

pub static UPRIGHT_SHORT_CYLINDER: GeometryEntry = GeometryEntry {
    name: "short upright cylinder with its ends, as one body",
    space: Space::Open,
    characteristic_length: "square root of the whole area",
    per_length_of: None,
    forms: &[form(&[Diameter, Height], &[])],
    example_title: "Small expansion vessel",
    example: &[
        (Diameter, "\"400 mm\""),
        (Height, "\"520 mm\""),
        (SurfaceTemperature, "\"58 degC\""),
        (AmbientTemperature, "\"21 degC\""),
        (Emissivity, "0.9"),
    ],
};

pub static LYING_SHORT_CYLINDER: GeometryEntry = GeometryEntry {
    name: "short lying cylinder with its ends, as one body",
    space: Space::Open,
    characteristic_length: "square root of the whole area",
    per_length_of: None,
    forms: &[form(&[Diameter, Length], &[])],
    example_title: "Steam trap body",
    example: &[
        (Diameter, "\"110 mm\""),
        (Length, "\"160 mm\""),
        (SurfaceTemperature, "\"135 degC\""),
        (AmbientTemperature, "\"25 degC\""),
        (Emissivity, "0.8"),
    ],
};

pub static HORIZONTAL_LAYER: GeometryEntry = GeometryEntry {
    name: "level gap between two plates",
    space: Space::Closed,
    characteristic_length: "gap",
    per_length_of: None,
    forms: &[form(&[Gap, HeatedFrom], &[Area])],
    example_title: "Air gap over a warm ceiling",
    example: &[
        (Gap, "\"50 mm\""),
        (HeatedFrom, "\"below\""),
        (Area, "\"12 m2\""),
        (HotTemperature, "\"24 degC\""),
        (ColdTemperature, "\"8 degC\""),
        (EmissivityHot, "0.9"),
        (EmissivityCold, "0.9"),
    ],
};

pub static TILTED_LAYER: GeometryEntry = GeometryEntry {
    name: "leaning gap between two plates",
    space: Space::Closed,
    characteristic_length: "gap",
    per_length_of: Some("width"),
    forms: &[form(&[Gap, Height, TiltFromHorizontal], &[Width, Area])],
    example_title: "Double roof light",
    example: &[
        (Gap, "\"20 mm\""),
        (Height, "\"1.2 m\""),
        (TiltFromHorizontal, "35"),
        (Width, "\"0.9 m\""),
        (HotTemperature, "\"20 degC\""),
        (ColdTemperature, "\"2 degC\""),
        (EmissivityHot, "0.84"),
        (EmissivityCold, "0.84"),
    ],
};

pub static VERTICAL_CAVITY: GeometryEntry = GeometryEntry {
    name: "upright gap between two walls",
    space: Space::Closed,
    characteristic_length: "gap",
    per_length_of: Some("width"),
    forms: &[form(&[Gap, Height], &[Width, Area])],
    example_title: "Double glazing of the control room",
    example: &[
        (Gap, "\"16 mm\""),
        (Height, "\"1.4 m\""),
        (Width, "\"1.1 m\""),
        (Fluid, "\"argon\""),
        (HotTemperature, "\"17.5 degC\""),
        (ColdTemperature, "\"2.5 degC\""),
        (EmissivityHot, "0.84"),
        (EmissivityCold, "0.84"),
    ],
};

pub static CONCENTRIC_CYLINDERS: GeometryEntry = GeometryEntry {
    name: "gap between two lying concentric cylinders",
    space: Space::Closed,
    characteristic_length: "the gap's own length, 2 [ln(ro/ri)]^(4/3)/(ri^(-3/5) + ro^(-3/5))^(5/3)",
    per_length_of: Some("length"),
    forms: &[form(&[InnerDiameter, OuterDiameter], &[Length])],
    example_title: "Milk line in its jacket pipe",
    example: &[
        (InnerDiameter, "\"50 mm\""),
        (OuterDiameter, "\"100 mm\""),
        (Length, "\"6 m\""),
        (HotTemperature, "\"54 degC\""),
        (ColdTemperature, "\"26 degC\""),
    ],
};

pub static CONCENTRIC_SPHERES: GeometryEntry = GeometryEntry {
    name: "gap between two concentric spheres",
    space: Space::Closed,
    characteristic_length: "the gap's own length, (1/ri - 1/ro)^(4/3)/{2^(1/3) (ri^(-7/5) + ro^(-7/5))^(5/3)}",
    per_length_of: None,
    forms: &[form(&[InnerDiameter, OuterDiameter], &[])],
    example_title: "Double-walled sample flask",
    example: &[
        (InnerDiameter, "\"90 mm\""),
        (OuterDiameter, "\"110 mm\""),
        (HotTemperature, "\"60 degC\""),
        (ColdTemperature, "\"45 degC\""),
    ],
};

pub static PARALLEL_PLATES: GeometryEntry = GeometryEntry {
    name: "open channel between two upright plates",
    space: Space::Channel,
    characteristic_length: "spacing",
    per_length_of: Some("width"),
    forms: &[form(&[Spacing, Height, HeatedWalls], &[Width])],
    example_title: "Fins of an oil cooler at rest",
    example: &[
        (Spacing, "\"8 mm\""),
        (Height, "\"180 mm\""),
        (HeatedWalls, "\"both\""),
        (Width, "\"24 mm\""),
        (SurfaceTemperature, "\"80 degC\""),
        (AmbientTemperature, "\"30 degC\""),
    ],
};
