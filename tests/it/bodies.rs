//! Every body, with one size to be scaled.

use plumeline::geometry::Geometry::{self, *};
use plumeline::geometry::Space;

use super::support::Draft;

/// A body with one size.
pub struct Body {
    /// Its geometry.
    pub geometry: Geometry,
    /// Its dimensions, m, and its angle, degrees.
    pub dimensions: &'static [(&'static str, f64)],
    /// What it takes in words, where it takes such: field and word.
    pub word: Option<(&'static str, &'static str)>,
}

/// Every body, those that read a side from a word on either side; first the ones that take a
/// heat flux.
pub const BODIES: [Body; 22] = [
    body(VerticalPlate, &[("height", 1.0), ("width", 0.7)]),
    body(InclinedPlate, LEANING).told("facing", "up"),
    body(InclinedPlate, LEANING).told("facing", "down"),
    body(HorizontalPlate, LEVEL).told("facing", "up"),
    body(HorizontalPlate, LEVEL).told("facing", "down"),
    body(HorizontalCylinder, &[("diameter", 0.1), ("length", 3.0)]),
    body(VerticalCylinder, &[("diameter", 0.2), ("height", 1.0)]),
    body(
        InclinedCylinder,
        &[
            ("diameter", 0.1),
            ("length", 1.0),
            ("tilt_from_vertical", 40.0),
        ],
    ),
    body(Sphere, &[("diameter", 0.2)]),
    body(Block, &[("length", 0.6), ("width", 0.4), ("height", 0.5)]),
    body(UprightShortCylinder, &[("diameter", 0.3), ("height", 0.4)]),
    body(LyingShortCylinder, &[("diameter", 0.3), ("length", 0.4)]),
    body(ParallelPlates, CHANNEL).told("heated_walls", "both"),
    body(ParallelPlates, CHANNEL).told("heated_walls", "one"),
    body(HorizontalLayer, &[("gap", 0.05)]).told("heated_from", "below"),
    body(HorizontalLayer, &[("gap", 0.05)]).told("heated_from", "above"),
    body(
        TiltedLayer,
        &[
            ("gap", 0.05),
            ("height", 1.0),
            ("tilt_from_horizontal", 40.0),
        ],
    ),
    body(
        TiltedLayer,
        &[
            ("gap", 0.2),
            ("height", 0.6),
            ("tilt_from_horizontal", 70.0),
        ],
    ),
    body(VerticalCavity, &[("gap", 0.05), ("height", 1.0)]),
    body(VerticalCavity, &[("gap", 0.2), ("height", 0.3)]),
    body(
        ConcentricCylinders,
        &[("inner_diameter", 0.1), ("outer_diameter", 0.2)],
    ),
    body(
        ConcentricSpheres,
        &[("inner_diameter", 0.1), ("outer_diameter", 0.2)],
    ),
];

/// How many of [`BODIES`] take a heat flux.
pub const HEATABLE: usize = 14;

const LEANING: &[(&str, f64)] = &[
    ("length", 1.0),
    ("width", 0.7),
    ("tilt_from_vertical", 40.0),
];
const LEVEL: &[(&str, f64)] = &[("length", 1.0), ("width", 0.7)];
const CHANNEL: &[(&str, f64)] = &[("spacing", 0.03), ("height", 0.3)];

const fn body(geometry: Geometry, dimensions: &'static [(&'static str, f64)]) -> Body {
    Body {
        geometry,
        dimensions,
        word: None,
    }
}

/// Whether a dimension is an angle, which no scale changes.
pub fn is_angle(name: &str) -> bool {
    name.starts_with("tilt")
}

impl Body {
    const fn told(self, field: &'static str, word: &'static str) -> Self {
        Body {
            word: Some((field, word)),
            ..self
        }
    }

    /// The body in a fluid, all lengths times a factor.
    pub fn draft(&self, fluid: &'static str, scale: f64) -> Draft {
        let draft = Draft::new(self.geometry, fluid);
        let told = match self.word {
            Some((field, word)) => draft.word(field, word),
            None => draft,
        };
        self.dimensions.iter().fold(told, |draft, &(name, value)| {
            draft.number(name, if is_angle(name) { value } else { value * scale })
        })
    }

    /// Whether it is a gap, whose sides may be exchanged.
    pub fn is_closed(&self) -> bool {
        self.geometry.entry().space == Space::Closed
    }

    /// Its name in a failure.
    pub fn label(&self) -> String {
        let word = self.word.map_or("", |(_, word)| word);
        format!("{} {word}", self.geometry.as_str())
    }
}

#[test]
fn every_geometry_is_among_the_bodies_and_gaps_come_last() {
    for geometry in Geometry::ALL {
        assert!(BODIES.iter().any(|body| body.geometry == *geometry));
    }
    assert!(BODIES.iter().take(HEATABLE).all(|body| !body.is_closed()));
    assert!(BODIES.iter().skip(HEATABLE).all(Body::is_closed));
}
