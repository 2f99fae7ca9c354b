//! Level plates, on area over perimeter.

use crate::geometry::Geometry::HorizontalPlate;

use super::entry::{
    COMPUTED, Example, Heating, Method, ReferenceTemperature, Scatter, Side, Source,
};
use super::groups::Groups;
use super::layers::{horizontal_stable, horizontal_unstable_blend};
use super::range::{Quantity, Range};
use super::sources::{HANDBOOK, MCADAMS};

pub static RAITHBY_HOLLANDS_UNSTABLE: Method = Method {
    geometry: HorizontalPlate,
    heating: Heating::Either,
    side: Side::Unstable,
    automatic: true,
    formula: "Nu = (Nu_l^10 + Nu_t^10)^(1/10), Nu_l = 1.4/ln(1 + 1.4/Nu_T), Nu_T = 0.835 C_l Ra^(1/4), Nu_t = C_U Ra^(1/3), C_l = 0.671/[1 + (0.492/Pr)^(9/16)]^(4/9), C_U = 0.14 (1 + 0.0107 Pr)/(1 + 0.01 Pr)",
    source: HANDBOOK,
    ranges: &[Range::between(Quantity::Rayleigh, 1.0, 1e11).answered_below()],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "",
    example: Example {
        groups: Groups::new(1e7, 0.7),
        nusselt: 30.5819,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| horizontal_unstable_blend(g.rayleigh, g.prandtl),
};

pub static LLOYD_MORAN: Method = Method {
    geometry: HorizontalPlate,
    heating: Heating::Either,
    side: Side::Unstable,
    automatic: false,
    formula: "Nu = 0.54 Ra^(1/4) to Ra 1e7, 0.15 Ra^(1/3) beyond",
    source: Source {
        authors: "Lloyd, J. R.; Moran, W. R.",
        year: 1974,
        work: "J. Heat Transfer 96",
        locator: "443-447",
    },
    ranges: &[
        Range::between(Quantity::Rayleigh, 1e4, 1e11),
        Range::at_least(Quantity::Prandtl, 0.6),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The originals cover 2.2e4 to 8e6 and 8e6 to 1.6e9; the wider bands are handbook practice. The bands step by +6 % at Ra 1e7.",
    example: Example {
        groups: Groups::new(1e9, 0.7),
        nusselt: 150.0,
        figures: 4,
        from: "0.15 times 1000, by hand",
    },
    edges: &[|_| 1e7],
    nusselt: |g| {
        if g.rayleigh <= 1e7 {
            0.54 * g.rayleigh.powf(0.25)
        } else {
            0.15 * g.rayleigh.cbrt()
        }
    },
};

pub static GOLDSTEIN_SPARROW_JONES: Method = Method {
    geometry: HorizontalPlate,
    heating: Heating::Either,
    side: Side::Unstable,
    automatic: false,
    formula: "Nu = 0.96 Ra^(1/6) to Ra 200, 0.59 Ra^(1/4) beyond",
    source: Source {
        authors: "Goldstein, R. J.; Sparrow, E. M.; Jones, D. C.",
        year: 1973,
        work: "Int. J. Heat Mass Transfer 16",
        locator: "1025-1035",
    },
    ranges: &[Range::between(Quantity::Rayleigh, 1.0, 1e4)],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "From the sublimation of naphthalene (Schmidt number 2.5) in air. The bands step by -4.4 % at Ra 200.",
    example: Example {
        groups: Groups::new(64.0, 2.5),
        nusselt: 1.92,
        figures: 3,
        from: "0.96 times 2, by hand",
    },
    edges: &[|_| 200.0],
    nusselt: |g| {
        if g.rayleigh <= 200.0 {
            0.96 * g.rayleigh.powf(1.0 / 6.0)
        } else {
            0.59 * g.rayleigh.powf(0.25)
        }
    },
};

pub static RAITHBY_HOLLANDS_STABLE: Method = Method {
    geometry: HorizontalPlate,
    heating: Heating::Either,
    side: Side::Stable,
    automatic: true,
    formula: "Nu = 2.5/ln(1 + 2.5/Nu_T), Nu_T = 0.527 Ra^(1/5)/[1 + (1.9/Pr)^0.9]^(2/9)",
    source: HANDBOOK,
    ranges: &[Range::between(Quantity::Rayleigh, 1e3, 1e10).answered_below()],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The constant 2.5 is carried as read; the original could not be consulted. It lies -19 to +11 % from Radziemska and Lewandowski, from which McAdams differs more still (-26 to +107 % from this one, Pr 0.7).",
    example: Example {
        groups: Groups::new(1e7, 0.7),
        nusselt: 11.2526,
        figures: 6,
        from: COMPUTED,
    },
    edges: &[],
    nusselt: |g| horizontal_stable(g.rayleigh, g.prandtl),
};

pub static RADZIEMSKA_LEWANDOWSKI: Method = Method {
    geometry: HorizontalPlate,
    heating: Heating::Either,
    side: Side::Stable,
    automatic: false,
    formula: "Nu = 0.52 Ra^(1/5)",
    source: Source {
        authors: "Radziemska, E.; Lewandowski, W. M.",
        year: 2001,
        work: "Applied Energy 68",
        locator: "347-366",
    },
    ranges: &[
        Range::between(Quantity::Rayleigh, 1e4, 1e9),
        Range::at_least(Quantity::Prandtl, 0.6),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "",
    example: Example {
        groups: Groups::new(1e5, 0.7),
        nusselt: 5.2,
        figures: 3,
        from: "0.52 times 10, by hand",
    },
    edges: &[],
    nusselt: |g| 0.52 * g.rayleigh.powf(0.2),
};

pub static MCADAMS_STABLE: Method = Method {
    geometry: HorizontalPlate,
    heating: Heating::Either,
    side: Side::Stable,
    automatic: false,
    formula: "Nu = 0.27 Ra^(1/4)",
    source: MCADAMS,
    ranges: &[
        Range::between(Quantity::Rayleigh, 1e5, 1e10),
        Range::at_least(Quantity::Prandtl, 0.6),
    ],
    reference: ReferenceTemperature::Film,
    scatter: Scatter::CommonPractice,
    remark: "The source measures length along the side of the plate; later practice, followed here, keeps the constant with area over perimeter.",
    example: Example {
        groups: Groups::new(1e8, 0.7),
        nusselt: 27.0,
        figures: 4,
        from: "0.27 times 100, by hand",
    },
    edges: &[],
    nusselt: |g| 0.27 * g.rayleigh.powf(0.25),
};
