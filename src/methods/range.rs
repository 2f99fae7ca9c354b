//! The ranges of groups in which a method holds, and how a case lies to them.

use std::fmt;

use crate::geometry::choice;

use super::groups::Groups;

choice! {
    /// A quantity that a range bounds.
    Quantity {
        /// Rayleigh number.
        Rayleigh = "rayleigh",
        /// Rayleigh number with gravity along the slope.
        RayleighAlong = "rayleigh_along_slope",
        /// Rayleigh number weighted for thin boundary layers, `Ra Pr/(0.2 + Pr)`.
        RayleighWeighted = "rayleigh_weighted",
        /// Rayleigh number of a channel, `Ra S/H`.
        RayleighChannel = "rayleigh_channel",
        /// Grashof number on the diameter of an inclined cylinder.
        DiameterGrashof = "diameter_grashof",
        /// Prandtl number.
        Prandtl = "prandtl",
        /// Angle from the vertical, degrees.
        Tilt = "tilt_from_vertical",
        /// Angle of a layer from the horizontal, degrees.
        LayerTilt = "tilt_from_horizontal",
        /// Curvature of the boundary layer on an upright cylinder.
        Curvature = "curvature",
        /// Height over gap.
        Aspect = "aspect",
        /// How many walls of a channel are heated.
        HeatedWalls = "heated_walls",
    }
}

choice! {
    /// How a case lies to a method's range.
    RangeStatus {
        /// Inside.
        Within = "within",
        /// Outside, by no more than a decade in Rayleigh number, a factor 1.5 in Prandtl number and shape, 5 degrees in tilt.
        Near = "near",
        /// Farther out.
        Beyond = "beyond",
    }
}

impl Quantity {
    /// Its value for a case.
    pub fn of(self, groups: &Groups) -> f64 {
        match self {
            Quantity::Rayleigh => groups.rayleigh,
            Quantity::RayleighAlong => groups.rayleigh_along(),
            Quantity::RayleighWeighted => groups.rayleigh_weighted(),
            Quantity::RayleighChannel => groups.rayleigh / groups.aspect,
            Quantity::DiameterGrashof => {
                groups.rayleigh / (groups.prandtl * groups.slenderness.powi(3))
            }
            Quantity::Prandtl => groups.prandtl,
            Quantity::Tilt | Quantity::LayerTilt => groups.tilt,
            Quantity::Curvature => groups.curvature(),
            Quantity::Aspect => groups.aspect,
            Quantity::HeatedWalls => groups.heated_walls,
        }
    }

    /// The symbol in ranges that people read.
    pub fn symbol(self) -> &'static str {
        match self {
            Quantity::Rayleigh => "Ra",
            Quantity::RayleighAlong => "Ra cos(tilt)",
            Quantity::RayleighWeighted => "Ra Pr/(0.2 + Pr)",
            Quantity::RayleighChannel => "Ra S/H",
            Quantity::DiameterGrashof => "Gr on the diameter",
            Quantity::Prandtl => "Pr",
            Quantity::Tilt => "tilt from vertical",
            Quantity::LayerTilt => "tilt from horizontal",
            Quantity::Curvature => "32^(1/2) Gr^(-1/4) H/D",
            Quantity::Aspect => "height over gap",
            Quantity::HeatedWalls => "heated walls",
        }
    }

    /// The widest value below and above a bound that still counts as near it.
    fn near(self, bound: f64) -> (f64, f64) {
        match self {
            Quantity::Rayleigh
            | Quantity::RayleighAlong
            | Quantity::RayleighWeighted
            | Quantity::RayleighChannel
            | Quantity::DiameterGrashof => (bound / 10.0, bound * 10.0),
            Quantity::Prandtl | Quantity::Curvature | Quantity::Aspect => {
                (bound / 1.5, bound * 1.5)
            }
            Quantity::Tilt | Quantity::LayerTilt => (bound - 5.0, bound + 5.0),
            Quantity::HeatedWalls => (bound, bound),
        }
    }

    /// Whether it is a Rayleigh or Grashof number.
    pub fn is_buoyancy(self) -> bool {
        matches!(self.aspect(), Aspect::Rayleigh)
    }

    /// Whether it is a tilt or a proportion.
    pub fn is_shape(self) -> bool {
        matches!(self.aspect(), Aspect::Shape)
    }

    /// What lies outside when this quantity does.
    fn aspect(self) -> Aspect {
        match self {
            Quantity::Rayleigh
            | Quantity::RayleighAlong
            | Quantity::RayleighWeighted
            | Quantity::RayleighChannel
            | Quantity::DiameterGrashof => Aspect::Rayleigh,
            Quantity::Prandtl => Aspect::Prandtl,
            Quantity::Tilt
            | Quantity::LayerTilt
            | Quantity::Curvature
            | Quantity::Aspect
            | Quantity::HeatedWalls => Aspect::Shape,
        }
    }
}

enum Aspect {
    Rayleigh,
    Prandtl,
    Shape,
}

/// The band of one quantity in which a method holds, both ends included.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Range {
    /// What is bounded.
    pub quantity: Quantity,
    /// Lower end.
    pub minimum: f64,
    /// Upper end, infinite where the source sets none.
    pub maximum: f64,
    /// Whether any value below the band is answered with a note: the formula tends to the right limit, or is the nearest there is.
    pub answered_below: bool,
    /// Whether any value above the band is answered with a note, as the nearest there is.
    pub answered_above: bool,
}

impl Range {
    /// A band with two ends.
    pub const fn between(quantity: Quantity, minimum: f64, maximum: f64) -> Self {
        Range {
            quantity,
            minimum,
            maximum,
            answered_below: false,
            answered_above: false,
        }
    }

    /// A band without an upper end.
    pub const fn at_least(quantity: Quantity, minimum: f64) -> Self {
        Self::between(quantity, minimum, f64::INFINITY)
    }

    /// The same band, answered below with a note.
    pub const fn answered_below(self) -> Self {
        Range {
            answered_below: true,
            ..self
        }
    }

    /// The same band, answered above with a note.
    pub const fn answered_above(self) -> Self {
        Range {
            answered_above: true,
            ..self
        }
    }

    /// What is outside in words, if the groups are.
    pub fn breach(&self, groups: &Groups) -> Option<String> {
        let value = self.quantity.of(groups);
        let outside = self.status(value) != RangeStatus::Within;
        outside.then(|| {
            format!(
                "{} is {}, outside {self}",
                self.quantity.symbol(),
                shown(value)
            )
        })
    }

    fn status(&self, value: f64) -> RangeStatus {
        let (lowest, _) = self.quantity.near(self.minimum);
        let (_, highest) = self.quantity.near(self.maximum);
        if (self.minimum..=self.maximum).contains(&value) {
            RangeStatus::Within
        } else if (lowest..=highest).contains(&value) || self.is_answered(value) {
            RangeStatus::Near
        } else {
            RangeStatus::Beyond
        }
    }

    /// How far outside a value is, 1 at the edge of what is near.
    fn distance(&self, value: f64) -> f64 {
        let (low, high) = if value < self.minimum {
            (value, self.minimum)
        } else {
            (self.maximum, value)
        };
        match self.quantity {
            Quantity::Rayleigh
            | Quantity::RayleighAlong
            | Quantity::RayleighWeighted
            | Quantity::RayleighChannel
            | Quantity::DiameterGrashof => (high / low).log10(),
            Quantity::Prandtl | Quantity::Curvature | Quantity::Aspect => {
                (high / low).ln() / 1.5_f64.ln()
            }
            Quantity::Tilt | Quantity::LayerTilt => (high - low) / 5.0,
            Quantity::HeatedWalls => f64::INFINITY,
        }
    }

    /// Whether a value outside lies on a side that is answered all the same.
    fn is_answered(&self, value: f64) -> bool {
        value < self.minimum && self.answered_below || value > self.maximum && self.answered_above
    }
}

impl fmt::Display for Range {
    fn fmt(&self, out: &mut fmt::Formatter<'_>) -> fmt::Result {
        let minimum = shown(self.minimum);
        if self.maximum.is_finite() {
            write!(out, "{minimum} to {}", shown(self.maximum))
        } else {
            write!(out, "{minimum} and above")
        }
    }
}

/// A group in a sentence: three figures, with an exponent when it is far from one.
fn shown(value: f64) -> String {
    if value == 0.0 || (0.01..1e4).contains(&value.abs()) {
        let rounded: f64 = format!("{value:.2e}").parse().unwrap_or(value);
        rounded.to_string()
    } else {
        let text = format!("{value:.2e}");
        text.replace(".00e", "e").replace("0e", "e")
    }
}

/// Where a case lies to all ranges of a method.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Verdict {
    /// The worst of all.
    pub status: RangeStatus,
    /// How far the case is outside, 1 at the edge of what is near; 0 inside and on sides that are answered all the same.
    pub distance: f64,
    /// A Rayleigh number is too small.
    pub rayleigh_below: bool,
    /// A Rayleigh number is too large.
    pub rayleigh_above: bool,
    /// The Prandtl number is outside.
    pub prandtl_outside: bool,
    /// A tilt or a proportion is outside.
    pub shape_outside: bool,
}

impl Verdict {
    /// Judges a case by a method's ranges.
    pub fn of(ranges: &[Range], groups: &Groups) -> Self {
        let mut verdict = Verdict {
            status: RangeStatus::Within,
            distance: 0.0,
            rayleigh_below: false,
            rayleigh_above: false,
            prandtl_outside: false,
            shape_outside: false,
        };
        for range in ranges {
            let value = range.quantity.of(groups);
            let status = range.status(value);
            if status == RangeStatus::Within {
                continue;
            }
            verdict.status = verdict.status.max(status);
            if !range.is_answered(value) {
                verdict.distance = verdict.distance.max(range.distance(value));
            }
            match range.quantity.aspect() {
                Aspect::Rayleigh if value < range.minimum => verdict.rayleigh_below = true,
                Aspect::Rayleigh => verdict.rayleigh_above = true,
                Aspect::Prandtl => verdict.prandtl_outside = true,
                Aspect::Shape => verdict.shape_outside = true,
            }
        }
        verdict
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn a_decade_of_rayleigh_is_near() {
        let range = Range::between(Quantity::Rayleigh, 1e4, 1e9);
        let status = |value| range.status(value);
        assert_eq!(status(1e4), RangeStatus::Within);
        assert_eq!(status(1e9), RangeStatus::Within);
        assert_eq!(status(1e3), RangeStatus::Near);
        assert_eq!(status(1e10), RangeStatus::Near);
        assert_eq!(status(9.9e2), RangeStatus::Beyond);
        assert_eq!(status(1.1e10), RangeStatus::Beyond);
        assert_eq!(range.answered_below().status(0.0), RangeStatus::Near);
    }

    #[test]
    fn a_verdict_is_the_worst_of_its_ranges_and_names_each() {
        let ranges = [
            Range::between(Quantity::Rayleigh, 1e4, 1e9),
            Range::at_least(Quantity::Prandtl, 0.6),
            Range::between(Quantity::Tilt, 0.0, 60.0),
        ];
        let verdict = Verdict::of(&ranges, &Groups::new(2e9, 0.1).tilted(64.0));
        assert_eq!(verdict.status, RangeStatus::Beyond);
        assert!(verdict.rayleigh_above && verdict.prandtl_outside && verdict.shape_outside);
        assert!(!verdict.rayleigh_below);
    }
}
