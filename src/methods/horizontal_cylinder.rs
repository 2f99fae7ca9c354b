//! Lying cylinders, on their diameter.

use crate::geometry::Geometry::HorizontalCylinder;

use super::entry::{
    COMPUTED, Example, Heating, Method, ReferenceTemperature, Scatter, Side, Source,
};
use super::groups::Groups;
use super::layers::{blend, f9, laminar_constant, thickened, turbulent_cylinder_constant};
use super::range::{Quantity, Range};
use super::sources::{CHURCHILL_CHU_CYLINDER, HANDBOOK, MCADAMS};

pub static CHURCHILL_CHU: Method = Method {
    geometry: HorizontalCylinder,
    heating: Heating::Either,
    side: Side::Any,
    automatic: true,
    formula: "Nu = {0.60 + 0.387 Ra^(1/6) / [1 + (0.559/Pr)^(9/16)]^(8/27)}^2",
    source: CHURCHILL_CHU_CYLINDER,
    ranges: &[Range::between(Quantity::Rayleigh, 1e-5, 1e12).answered_below()],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "17 to 20 % below the banded and blended methods at Ra 1 to 100, up to 16 % above the blend at 1e7 to 1e9. Tends to 0.36 as Ra tends to 0.",
    example: Example {
        groups: Groups::new(1.869e6, 0.7241),
        nusselt: 17.40,
        figures: 4,
        from: "Cengel, Heat Transfer, example 9-1",
    },
    edges: &[],
    nusselt: full_range,
};

pub static CHURCHILL_CHU_LAMINAR: Method = Method {
    geometry: HorizontalCylinder,
    heating: Heating::Either,
    side: Side::Any,
    automatic: false,
    formula: "Nu = 0.36 + 0.518 Ra^(1/4) / [1 + (0.559/Pr)^(9/16)]^(4/9)",
    source: CHURCHILL_CHU_CYLINDER,
    ranges: &[Range::between(Quantity::Rayleigh, 1e-6, 1e9).answered_below()],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Tends to 0.36 as Ra tends to 0.",
    example: Example {
        groups: Groups::new(1.869e6, 0.7241),
        nusselt: 14.8804,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| 0.36 + 0.518 * g.rayleigh.powf(0.25) / f9(g.prandtl, 0.559).powf(4.0 / 9.0),
};

pub static MORGAN: Method = Method {
    geometry: HorizontalCylinder,
    heating: Heating::Either,
    side: Side::Any,
    automatic: false,
    formula: "Nu = C Ra^n: (0.675, 0.058) to Ra 1e-2, (1.02, 0.148) to 1e2, (0.850, 0.188) to 1e4, (0.480, 0.250) to 1e7, (0.125, 0.333) to 1e12",
    source: Source {
        authors: "Morgan, V. T.",
        year: 1975,
        work: "Advances in Heat Transfer 11",
        locator: "199-264",
    },
    ranges: &[
        Range::between(Quantity::Rayleigh, 1e-10, 1e12),
        Range::at_least(Quantity::Prandtl, 0.6),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::Stated(0.05),
    remark: "The spread of 5 % is the author's for his own fit (from memory). The bands step by up to 2 % at their edges.",
    example: Example {
        groups: Groups::new(1e6, 0.7),
        nusselt: 15.18,
        figures: 4,
        from: "0.480 times 31.623, by hand",
    },
    edges: &[|_| 1e-2, |_| 1e2, |_| 1e4, |_| 1e7],
    nusselt: |g| {
        let (factor, exponent) = match g.rayleigh {
            r if r <= 1e-2 => (0.675, 0.058),
            r if r <= 1e2 => (1.02, 0.148),
            r if r <= 1e4 => (0.850, 0.188),
            r if r <= 1e7 => (0.480, 0.250),
            _ => (0.125, 0.333),
        };
        factor * g.rayleigh.powf(exponent)
    },
};

pub static RAITHBY_HOLLANDS: Method = Method {
    geometry: HorizontalCylinder,
    heating: Heating::Either,
    side: Side::Any,
    automatic: false,
    formula: "Nu = (Nu_l^10 + Nu_t^10)^(1/10), Nu_l = 2 f/ln(1 + 2 f/Nu_T), f = 1 - 0.13/Nu_T^0.16, Nu_T = 0.772 C_l Ra^(1/4), Nu_t = C_t Ra^(1/3), C_t the turbulent constant averaged over the circumference",
    source: HANDBOOK,
    ranges: &[Range::between(Quantity::Rayleigh, 1e-10, 1e12).answered_below()],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "f is held at 0.3 below Nu_T 2.7e-5, where the printed form would turn negative.",
    example: Example {
        groups: Groups::new(1e6, 0.7),
        nusselt: 13.5368,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let thin = 0.772 * laminar_constant(g.prandtl) * g.rayleigh.powf(0.25);
        let f = (1.0 - 0.13 / thin.powf(0.16)).max(0.3);
        blend(
            thickened(thin, 2.0 * f),
            turbulent_cylinder_constant(g.prandtl) * g.rayleigh.cbrt(),
            10.0,
        )
    },
};

pub static KUEHN_GOLDSTEIN: Method = Method {
    geometry: HorizontalCylinder,
    heating: Heating::Either,
    side: Side::Any,
    automatic: false,
    formula: "2/Nu = ln(1 + 2/{[0.518 Ra^(1/4) (1 + (0.559/Pr)^(3/5))^(-5/12)]^15 + (0.1 Ra^(1/3))^15}^(1/15))",
    source: Source {
        authors: "Kuehn, T. H.; Goldstein, R. J.",
        year: 1976,
        work: "Int. J. Heat Mass Transfer 19",
        locator: "1127-1134",
    },
    ranges: &[Range::between(Quantity::Rayleigh, 1e-10, 1e12).answered_below()],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "",
    example: Example {
        groups: Groups::new(1e6, 0.7),
        nusselt: 13.6107,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let laminar =
            0.518 * g.rayleigh.powf(0.25) / (1.0 + (0.559 / g.prandtl).powf(0.6)).powf(5.0 / 12.0);
        thickened(blend(laminar, 0.1 * g.rayleigh.cbrt(), 15.0), 2.0)
    },
};

pub static POWER_LAW: Method = Method {
    geometry: HorizontalCylinder,
    heating: Heating::Either,
    side: Side::Any,
    automatic: false,
    formula: "Nu = 0.53 Ra^(1/4) to Ra 1e9, 0.13 Ra^(1/3) beyond",
    source: MCADAMS,
    ranges: &[
        Range::between(Quantity::Rayleigh, 1e4, 1e12),
        Range::at_least(Quantity::Prandtl, 0.6),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The bands step by +38 % at Ra 1e9.",
    example: Example {
        groups: Groups::new(1e8, 0.7),
        nusselt: 53.0,
        figures: 4,
        from: "0.53 times 100, by hand",
    },
    edges: &[|_| 1e9],
    nusselt: |g| {
        if g.rayleigh <= 1e9 {
            0.53 * g.rayleigh.powf(0.25)
        } else {
            0.13 * g.rayleigh.cbrt()
        }
    },
};

/// Churchill and Chu's form for all flows.
pub(super) fn full_range(g: &Groups) -> f64 {
    (0.60 + 0.387 * g.rayleigh.powf(1.0 / 6.0) / f9(g.prandtl, 0.559).powf(8.0 / 27.0)).powi(2)
}
