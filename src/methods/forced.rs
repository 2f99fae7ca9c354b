//! The forced part of a draught: from Reynolds and Prandtl numbers to a Nusselt number.

use super::entry::Source;

/// A published method for flow past a body.
#[derive(Clone, Copy, Debug)]
pub struct Forced {
    /// What the flow meets.
    pub body: &'static str,
    /// The formula as text.
    pub formula: &'static str,
    /// Where it was published.
    pub source: Source,
    /// Whether properties are those of the stream instead of the film.
    pub stream_properties: bool,
    /// Nusselt number from Reynolds and Prandtl numbers and the viscosity of the stream over that at the surface.
    pub nusselt: fn(f64, f64, f64) -> f64,
    /// Nusselt number of the fluid at rest, which a draught adds to.
    pub at_rest: f64,
}

/// Flow along a plate.
pub static PLATE: Forced = Forced {
    body: "plate along the flow",
    formula: "Nu = 0.664 Re^(1/2) Pr^(1/3) to Re 5e5, (0.037 Re^0.8 - 871) Pr^(1/3) beyond",
    source: Source {
        authors: "Pohlhausen, E.; with Colburn's turbulent part",
        year: 1921,
        work: "Z. angew. Math. Mech. 1",
        locator: "115-121, as in handbooks",
    },
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

/// Flow across a cylinder.
pub static CYLINDER: Forced = Forced {
    body: "cylinder across the flow",
    formula: "Nu = 0.3 + 0.62 Re^(1/2) Pr^(1/3)/[1 + (0.4/Pr)^(2/3)]^(1/4) [1 + (Re/282000)^(5/8)]^(4/5)",
    source: Source {
        authors: "Churchill, S. W.; Bernstein, M.",
        year: 1977,
        work: "J. Heat Transfer 99",
        locator: "300-306",
    },
    stream_properties: false,
    nusselt: |reynolds, prandtl, _| {
        let layer = 0.62 * reynolds.sqrt() * prandtl.cbrt()
            / (1.0 + (0.4 / prandtl).powf(2.0 / 3.0)).powf(0.25);
        0.3 + layer * (1.0 + (reynolds / 282_000.0).powf(0.625)).powf(0.8)
    },
    at_rest: 0.0,
};

/// Flow past a sphere.
pub static SPHERE: Forced = Forced {
    body: "sphere in the flow",
    formula: "Nu = 2 + (0.4 Re^(1/2) + 0.06 Re^(2/3)) Pr^0.4 (mu_stream/mu_surface)^(1/4), properties of the stream",
    source: Source {
        authors: "Whitaker, S.",
        year: 1972,
        work: "AIChE Journal 18",
        locator: "361-371",
    },
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
    fn the_plate_hardly_steps_where_its_layer_turns_turbulent() {
        let at = |reynolds: f64| (PLATE.nusselt)(reynolds, 0.7, 1.0);
        assert!((at(5e5 * (1.0 + 1e-12)) / at(5e5) - 1.0).abs() < 0.002);
    }
}
