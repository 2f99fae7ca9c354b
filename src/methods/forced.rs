//! The forced part of a draught: from Reynolds and Prandtl numbers to a Nusselt number.

use super::entry::Source;

/// The band of one quantity in which a method holds, both ends included.
#[derive(Clone, Copy, Debug)]
pub struct FlowRange {
    /// What is bounded, as people write it.
    pub symbol: &'static str,
    /// Its value from Reynolds and Prandtl numbers.
    pub of: fn(f64, f64) -> f64,
    /// Lower end.
    pub minimum: f64,
    /// Upper end, infinite where there is none.
    pub maximum: f64,
}

const fn reynolds(minimum: f64, maximum: f64) -> FlowRange {
    FlowRange {
        symbol: "Re",
        of: |reynolds, _| reynolds,
        minimum,
        maximum,
    }
}

const fn prandtl(minimum: f64, maximum: f64) -> FlowRange {
    FlowRange {
        symbol: "Pr",
        of: |_, prandtl| prandtl,
        minimum,
        maximum,
    }
}

impl FlowRange {
    /// What is outside in words, if the flow is.
    fn breach(&self, reynolds: f64, prandtl: f64) -> Option<String> {
        let (symbol, value) = (self.symbol, (self.of)(reynolds, prandtl));
        if value < self.minimum {
            Some(format!("{symbol} is {value:.3}, below {}", self.minimum))
        } else if value > self.maximum {
            Some(format!("{symbol} is {value:.3e}, above {:e}", self.maximum))
        } else {
            None
        }
    }
}

/// A published method for flow past a body.
#[derive(Clone, Copy, Debug)]
pub struct Forced {
    /// What the flow meets.
    pub body: &'static str,
    /// The formula as text.
    pub formula: &'static str,
    /// Where it was published.
    pub source: Source,
    /// Where it holds.
    pub ranges: &'static [FlowRange],
    /// Whether properties are those of the stream instead of the film.
    pub stream_properties: bool,
    /// Nusselt number from Reynolds and Prandtl numbers and the viscosity of the stream over that at the surface.
    pub nusselt: fn(f64, f64, f64) -> f64,
    /// Nusselt number of the fluid at rest, which a draught adds to.
    pub at_rest: f64,
}

impl Forced {
    /// What of a flow lies outside the method's ranges, in words; empty when nothing does.
    pub fn breaches(&self, reynolds: f64, prandtl: f64) -> Vec<String> {
        let breach = |range: &FlowRange| range.breach(reynolds, prandtl);
        self.ranges.iter().filter_map(breach).collect()
    }
}

/// Flow along a plate; the ranges are those of handbooks, from memory.
pub static PLATE: Forced = Forced {
    body: "plate along the flow",
    formula: "Nu = 0.664 Re^(1/2) Pr^(1/3) to Re 5e5, (0.037 Re^0.8 - 871) Pr^(1/3) beyond",
    source: Source {
        authors: "Pohlhausen, E.; with Colburn's turbulent part",
        year: 1921,
        work: "Z. angew. Math. Mech. 1",
        locator: "115-121, as in handbooks",
    },
    ranges: &[reynolds(0.0, 1e8), prandtl(0.6, 60.0)],
    stream_properties: false,
    nusselt: |reynolds, prandtl, _| {
        let layer = if reynolds <= 5e5 {
            0.664 * reynolds.sqrt()
        } else {
            0.037 * reynolds.powf(0.8) - 871.0
        };
        layer * prandtl.cbrt()
    },
    at_rest: 0.0,
};

/// Flow across a cylinder; Re Pr from 0.2 by the source, data to Re 1e7 (from memory).
pub static CYLINDER: Forced = Forced {
    body: "cylinder across the flow",
    formula: "Nu = 0.3 + 0.62 Re^(1/2) Pr^(1/3)/[1 + (0.4/Pr)^(2/3)]^(1/4) [1 + (Re/282000)^(5/8)]^(4/5)",
    source: Source {
        authors: "Churchill, S. W.; Bernstein, M.",
        year: 1977,
        work: "J. Heat Transfer 99",
        locator: "300-306",
    },
    ranges: &[
        FlowRange {
            symbol: "Re Pr",
            of: |reynolds, prandtl| reynolds * prandtl,
            minimum: 0.2,
            maximum: f64::INFINITY,
        },
        reynolds(0.0, 1e7),
    ],
    stream_properties: false,
    nusselt: |reynolds, prandtl, _| {
        let layer = 0.62 * reynolds.sqrt() * prandtl.cbrt()
            / (1.0 + (0.4 / prandtl).powf(2.0 / 3.0)).powf(0.25);
        0.3 + layer * (1.0 + (reynolds / 282_000.0).powf(0.625)).powf(0.8)
    },
    at_rest: 0.0,
};

/// Flow past a sphere; the source's ranges, from memory; its Pr from 0.71 is for gases and above.
pub static SPHERE: Forced = Forced {
    body: "sphere in the flow",
    formula: "Nu = 2 + (0.4 Re^(1/2) + 0.06 Re^(2/3)) Pr^0.4 (mu_stream/mu_surface)^(1/4), properties of the stream",
    source: Source {
        authors: "Whitaker, S.",
        year: 1972,
        work: "AIChE Journal 18",
        locator: "361-371",
    },
    ranges: &[reynolds(3.5, 7.6e4), prandtl(0.6, 380.0)],
    stream_properties: true,
    nusselt: |reynolds, prandtl, viscosity_ratio| {
        let layer = 0.4 * reynolds.sqrt() + 0.06 * reynolds.powf(2.0 / 3.0);
        2.0 + layer * prandtl.powf(0.4) * viscosity_ratio.powf(0.25)
    },
    at_rest: 2.0,
};

#[cfg(test)]
mod tests {
    use super::*;

    /// Computed independently, tests/reference/forced_formulas.py.
    #[test]
    fn figures_of_the_second_typing() {
        for (forced, reynolds, prandtl, ratio, expected) in [
            (&PLATE, 1e4, 0.7, 1.0, 58.9568257157),
            (&PLATE, 1e6, 0.7, 1.0, 1299.48495353),
            (&CYLINDER, 1e4, 0.7, 1.0, 53.3277886702),
            (&CYLINDER, 1e6, 6.0, 1.0, 2754.61254943),
            (&SPHERE, 1e4, 0.7, 0.8, 57.6363429582),
        ] {
            let found = (forced.nusselt)(reynolds, prandtl, ratio);
            assert!(
                (found / expected - 1.0_f64).abs() < 1e-9,
                "{} {found}",
                forced.body
            );
        }
    }

    #[test]
    fn breaches_are_told_and_only_then() {
        assert!(SPHERE.breaches(1e4, 0.7).is_empty());
        assert_eq!(SPHERE.breaches(1.0, 0.7), ["Re is 1.000, below 3.5"]);
        assert_eq!(SPHERE.breaches(1e5, 500.0).len(), 2);
        assert!(CYLINDER.breaches(0.2, 0.7)[0].starts_with("Re Pr is 0.140"));
        assert!(PLATE.breaches(1e9, 0.7)[0].ends_with("above 1e8"));
    }

    #[test]
    fn the_plate_hardly_steps_where_its_layer_turns_turbulent() {
        let at = |reynolds: f64| (PLATE.nusselt)(reynolds, 0.7, 1.0);
        assert!((at(5e5 * (1.0 + 1e-12)) / at(5e5) - 1.0).abs() < 0.002);
    }
}
