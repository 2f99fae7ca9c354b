//! Upright plates, on their height.

use crate::geometry::Geometry::VerticalPlate;

use super::entry::{
    COMPUTED, Example, Heating, Method, ReferenceTemperature, Scatter, Side, Source,
};
use super::groups::Groups;
use super::layers::{f9, vertical_blend};
use super::range::{Quantity, Range};
use super::sources::{CHURCHILL_CHU_PLATE, HANDBOOK, MCADAMS, VLIET};

pub static RAITHBY_HOLLANDS: Method = Method {
    geometry: VerticalPlate,
    heating: Heating::Either,
    side: Side::Any,
    automatic: true,
    formula: "Nu = (Nu_l^6 + Nu_t^6)^(1/6), Nu_l = 2/ln(1 + 2/Nu_T), Nu_T = C_l Ra^(1/4), Nu_t = C_V Ra^(1/3)/(1 + 1.4e9 Pr/Ra), C_l = 0.671/[1 + (0.492/Pr)^(9/16)]^(4/9), C_V = 0.13 Pr^0.22/(1 + 0.61 Pr^0.81)^0.42",
    source: HANDBOOK,
    ranges: &[Range::between(Quantity::Rayleigh, 0.1, 1e12).answered_below()],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "With the mid-height temperature difference it also serves a uniform flux: -1.9 % of the exact laminar solution at Pr 0.7, -0.2 % at 6.7, +0.4 % at 100.",
    example: Example {
        groups: Groups::new(2.787e9, 0.7309),
        nusselt: 127.879,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| vertical_blend(g.rayleigh, g.prandtl),
};

pub static CHURCHILL_CHU: Method = Method {
    geometry: VerticalPlate,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: false,
    formula: "Nu = {0.825 + 0.387 Ra^(1/6) / [1 + (0.492/Pr)^(9/16)]^(8/27)}^2",
    source: CHURCHILL_CHU_PLATE,
    ranges: &[Range::between(Quantity::Rayleigh, 0.1, 1e12).answered_below()],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Above the exact laminar solution by 1.5 % at Ra 1e6, 8 % at 1e7, 18 % at 1e8 and 34 % at 1e9 (Pr 0.7). Tends to 0.68 as Ra tends to 0.",
    example: Example {
        groups: Groups::new(7.65e8, 0.7202),
        nusselt: 113.3,
        figures: 4,
        from: "Cengel, Heat Transfer, example 9-2 (from memory)",
    },
    edges: &[],
    nusselt: |g| full_range(g, 0.492),
};

pub static CHURCHILL_CHU_LAMINAR: Method = Method {
    geometry: VerticalPlate,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: false,
    formula: "Nu = 0.68 + 0.670 Ra^(1/4) / [1 + (0.492/Pr)^(9/16)]^(4/9)",
    source: CHURCHILL_CHU_PLATE,
    ranges: &[Range::between(Quantity::Rayleigh, 0.1, 1e9).answered_below()],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Tends to 0.68 as Ra tends to 0.",
    example: Example {
        groups: Groups::new(7.65e8, 0.7202),
        nusselt: 86.3401,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| laminar(g, 0.492),
};

pub static LEFEVRE: Method = Method {
    geometry: VerticalPlate,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: false,
    formula: "Nu = (4/3)(Gr/4)^(1/4) 0.75 Pr^(1/2) / (0.609 + 1.221 Pr^(1/2) + 1.238 Pr)^(1/4)",
    source: Source {
        authors: "LeFevre, E. J.",
        year: 1956,
        work: "Proc. 9th Int. Congress of Applied Mechanics 4",
        locator: "168-174",
    },
    ranges: &[Range::between(Quantity::Rayleigh, 1e4, 1e9)],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "A fit to the similarity solution of the laminar layer (Ostrach 1953, NACA Report 1111).",
    example: Example {
        groups: Groups::new(1e6, 0.72),
        nusselt: 16.3216,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let root = g.prandtl.sqrt();
        (g.rayleigh / (4.0 * g.prandtl)).powf(0.25) * root
            / (0.609 + 1.221 * root + 1.238 * g.prandtl).powf(0.25)
    },
};

pub static SQUIRE_ECKERT: Method = Method {
    geometry: VerticalPlate,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: false,
    formula: "Nu = 0.678 Ra^(1/4) [Pr/(0.952 + Pr)]^(1/4)",
    source: Source {
        authors: "Squire, H. B.; Eckert, E. R. G.",
        year: 1950,
        work: "Eckert, Introduction to the Transfer of Heat and Mass",
        locator: "integral method",
    },
    ranges: &[Range::between(Quantity::Rayleigh, 1e5, 1e9)],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "",
    example: Example {
        groups: Groups::new(1.648e8, 0.7108),
        nusselt: 62.1,
        figures: 3,
        from: "Lienhard, A Heat Transfer Textbook, example 8.1 (h 4.06 W/m2K, 0.4 m, k 0.02614 W/mK)",
    },
    edges: &[],
    nusselt: |g| 0.678 * (g.rayleigh * g.prandtl / (0.952 + g.prandtl)).powf(0.25),
};

pub static POWER_LAW: Method = Method {
    geometry: VerticalPlate,
    heating: Heating::Isothermal,
    side: Side::Any,
    automatic: false,
    formula: "Nu = 0.59 Ra^(1/4) to Ra 1e9, 0.10 Ra^(1/3) beyond",
    source: MCADAMS,
    ranges: &[
        Range::between(Quantity::Rayleigh, 1e4, 1e13),
        Range::at_least(Quantity::Prandtl, 0.6),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "0.10 is Warner and Arpaci 1968; McAdams gives 0.13 for the turbulent band. The lower Prandtl end is for gases and above. The bands step by -4.7 % at Ra 1e9.",
    example: Example {
        groups: Groups::new(9.44e9, 4.34),
        nusselt: 211.0,
        figures: 3,
        from: "Som, example 8.1 (inputs of the book, h 664 W/m2K, 0.2 m, k 0.628 W/mK)",
    },
    edges: &[|_| 1e9],
    nusselt: |g| {
        if g.rayleigh <= 1e9 {
            0.59 * g.rayleigh.powf(0.25)
        } else {
            0.10 * g.rayleigh.cbrt()
        }
    },
};

pub static CHURCHILL_CHU_UNIFORM_FLUX: Method = Method {
    geometry: VerticalPlate,
    heating: Heating::UniformFlux,
    side: Side::Any,
    automatic: false,
    formula: "Nu = {0.825 + 0.387 Ra^(1/6) / [1 + (0.437/Pr)^(9/16)]^(8/27)}^2, with the mid-height temperature difference",
    source: CHURCHILL_CHU_PLATE,
    ranges: &[Range::between(Quantity::Rayleigh, 0.1, 1e12).answered_below()],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Tends to 0.68 as Ra tends to 0.",
    example: Example {
        groups: Groups::new(1e8, 0.7),
        nusselt: 61.9099,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| full_range(g, 0.437),
};

pub static CHURCHILL_CHU_LAMINAR_UNIFORM_FLUX: Method = Method {
    geometry: VerticalPlate,
    heating: Heating::UniformFlux,
    side: Side::Any,
    automatic: false,
    formula: "Nu = 0.68 + 0.670 Ra^(1/4) / [1 + (0.437/Pr)^(9/16)]^(4/9), with the mid-height temperature difference",
    source: CHURCHILL_CHU_PLATE,
    ranges: &[Range::between(Quantity::Rayleigh, 0.1, 1e9).answered_below()],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Tends to 0.68 as Ra tends to 0.",
    example: Example {
        groups: Groups::new(1e8, 0.7),
        nusselt: 52.7001,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| laminar(g, 0.437),
};

pub static FUJII_FUJII: Method = Method {
    geometry: VerticalPlate,
    heating: Heating::UniformFlux,
    side: Side::Any,
    automatic: false,
    formula: "Nu_x = [Pr/(4 + 9 Pr^(1/2) + 10 Pr)]^(1/5) (Ra*_x)^(1/5) at mid-height, which is Nu = (2 c)^(5/4) (Ra/16)^(1/4) with c the first factor",
    source: Source {
        authors: "Fujii, T.; Fujii, M.",
        year: 1976,
        work: "Int. J. Heat Mass Transfer 19",
        locator: "121-122",
    },
    ranges: &[Range::between(Quantity::Rayleigh, 1e4, 1e9)],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "A fit to the laminar layer of a uniform flux, within 0.12 % of it. The range is that of the laminar layer.",
    example: Example {
        groups: Groups::new(1e8, 0.7),
        nusselt: 52.428,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| {
        let factor = g.prandtl / (4.0 + 9.0 * g.prandtl.sqrt() + 10.0 * g.prandtl);
        2_f64.powf(1.25) * (factor * g.rayleigh / 16.0).powf(0.25)
    },
};

pub static VLIET_UNIFORM_FLUX: Method = Method {
    geometry: VerticalPlate,
    heating: Heating::UniformFlux,
    side: Side::Any,
    automatic: false,
    formula: "Nu_x = 0.17 (Ra*_x)^(1/4), which is Nu = 0.17^(4/3) Ra^(1/3) at any height",
    source: VLIET,
    ranges: &[
        Range::between(Quantity::Rayleigh, 2.6e11, 4.7e13),
        Range::at_least(Quantity::Prandtl, 0.6),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "Turbulent layer. The range is Ra*_x 1e13 to 1e16 at mid-height (from memory), as Ra.",
    example: Example {
        groups: Groups::new(1e12, 6.0),
        nusselt: 941.742,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| 0.17_f64.powf(4.0 / 3.0) * g.rayleigh.cbrt(),
};

/// Churchill and Chu's form for all flows.
pub(super) fn full_range(g: &Groups, c: f64) -> f64 {
    (0.825 + 0.387 * g.rayleigh.powf(1.0 / 6.0) / f9(g.prandtl, c).powf(8.0 / 27.0)).powi(2)
}

/// Churchill and Chu's form for laminar flow.
pub(super) fn laminar(g: &Groups, c: f64) -> f64 {
    0.68 + 0.670 * g.rayleigh.powf(0.25) / f9(g.prandtl, c).powf(4.0 / 9.0)
}
