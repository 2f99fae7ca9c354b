//! Whole convex bodies, on the root of their whole area: blocks, short upright and short lying cylinders.

use std::f64::consts::PI;

use crate::geometry::Geometry::{Block, LyingShortCylinder, UprightShortCylinder};

use super::entry::{
    COMPUTED, Example, Heating, Method, ReferenceTemperature, Scatter, Side, Source,
};
use super::groups::Groups;
use super::layers::{
    blend, turbulent_cylinder_constant, turbulent_upward_constant, turbulent_vertical_constant,
};
use super::range::{Quantity, Range};

const HASSANI_HOLLANDS: Source = Source {
    authors: "Hassani, A. V.; Hollands, K. G. T.",
    year: 1989,
    work: "J. Heat Transfer 111",
    locator: "363-371",
};

const YOVANOVICH: Source = Source {
    authors: "Yovanovich, M. M.",
    year: 1987,
    work: "AIAA paper 87-1643, with Clark and Yovanovich 1986, AIAA paper 86-1262",
    locator: "On the effect of shape, aspect ratio and orientation",
};

const BLEND_REMARK: &str = "Yovanovich's laminar part beside the turbulent constants of Raithby and Hollands 1998, averaged by area: the idea of the source, not its own constants. For blocks of far from square base the conduction limit is up to 14 % off a computed one. Above Ra 1e9 a large body is better taken face by face.";

/// The whole-body methods of one geometry differ in their shape alone.
macro_rules! whole_body {
    ($blend:ident, $laminar:ident, $geometry:ident, $shape:expr, $example:expr, $blended:expr, $alone:expr, $shape_text:literal) => {
        pub static $blend: Method = Method {
            geometry: $geometry,
            heating: Heating::Either,
            side: Side::Any,
            automatic: true,
            formula: concat!(
                "Nu = (Nu_l^6 + Nu_t^6)^(1/6), Nu_l = Nu_0 + G F Ra^(1/4), F = 0.670/[1 + (0.5/Pr)^(9/16)]^(4/9), Nu_t = C_t Ra^(1/3), C_t the turbulent constant averaged by area; ",
                $shape_text
            ),
            source: HASSANI_HOLLANDS,
            ranges: &[Range::between(Quantity::Rayleigh, 0.0, 1e12)],
            reference: ReferenceTemperature::Film,
            scatter: Scatter::CommonPractice,
            remark: BLEND_REMARK,
            example: Example {
                groups: $example,
                nusselt: $blended,
                figures: 6,
                from: COMPUTED,
            },
            edges: &[],
            nusselt: |g| {
                let shape: Shape = $shape(g);
                blend(
                    laminar(&shape, g),
                    shape.turbulent * g.rayleigh.cbrt(),
                    6.0,
                )
            },
        };

        pub static $laminar: Method = Method {
            geometry: $geometry,
            heating: Heating::Either,
            side: Side::Any,
            automatic: false,
            formula: concat!(
                "Nu = Nu_0 + G F Ra^(1/4), F = 0.670/[1 + (0.5/Pr)^(9/16)]^(4/9); ",
                $shape_text
            ),
            source: YOVANOVICH,
            ranges: &[Range::between(Quantity::Rayleigh, 0.0, 1e8)],
            reference: ReferenceTemperature::Film,
            scatter: Scatter::CommonPractice,
            remark: "Laminar alone; the upper end of the range, where the turbulent part begins to count, is our own.",
            example: Example {
                groups: $example.at_rayleigh(1e6),
                nusselt: $alone,
                figures: 6,
                from: COMPUTED,
            },
            edges: &[],
            nusselt: |g| laminar(&$shape(g), g),
        };
    };
}

whole_body!(
    BLOCK,
    BLOCK_LAMINAR,
    Block,
    block,
    CUBE,
    103.801,
    19.3800,
    "G = 2^(1/8) [(0.625 L^(4/3) W + H (L + W)^(4/3))/(L W + H W + L H)^(7/6)]^(3/4), L the longer horizontal side; Nu_0 = (3.192 + 1.868 x^0.76)/(1 + 1.189 x)^(1/2), x = H/(L W)^(1/2)"
);

whole_body!(
    UPRIGHT,
    UPRIGHT_LAMINAR,
    UprightShortCylinder,
    upright_cylinder,
    Groups::new(1e9, 0.7).with_slenderness(1.0),
    102.889,
    19.115,
    "G = 0.967 at H = D, else in the proportion of the block of equal base area and height; Nu_0 = (3.1915 + 2.7726 x^0.76)/(1 + 2 x)^(1/2), x = H/D"
);

whole_body!(
    LYING,
    LYING_LAMINAR,
    LyingShortCylinder,
    lying_cylinder,
    Groups::new(1e9, 0.7).with_slenderness(1.0),
    112.117,
    19.9577,
    "G = 1.019 at L = D, else in the proportion of the block of equal cross-section and length; Nu_0 = (3.1915 + 2.7726 x^0.76)/(1 + 2 x)^(1/2), x = L/D"
);

const CUBE: Groups = Groups {
    block_length: 0.408_248_290_463_863,
    block_width: 0.408_248_290_463_863,
    block_height: 0.408_248_290_463_863,
    ..Groups::new(1e9, 0.7)
};

/// What a body's shape comes to.
struct Shape {
    /// Nusselt number of pure conduction.
    conduction: f64,
    /// Gravity function of the laminar layer.
    gravity: f64,
    /// Turbulent constant averaged over the surface.
    turbulent: f64,
}

fn laminar(shape: &Shape, g: &Groups) -> f64 {
    let prandtl = 0.670 / (1.0 + (0.5 / g.prandtl).powf(9.0 / 16.0)).powf(4.0 / 9.0);
    shape.conduction + shape.gravity * prandtl * g.rayleigh.powf(0.25)
}

fn block(g: &Groups) -> Shape {
    let (length, width, height) = (g.block_length, g.block_width, g.block_height);
    let x = height / (length * width).sqrt();
    let top = length * width;
    let sides = 2.0 * height * (length + width);
    Shape {
        conduction: (3.192 + 1.868 * x.powf(0.76)) / (1.0 + 1.189 * x).sqrt(),
        gravity: block_gravity(length, width, height),
        turbulent: (top * turbulent_upward_constant(g.prandtl)
            + sides * turbulent_vertical_constant(g.prandtl))
            / (2.0 * top + sides),
    }
}

fn upright_cylinder(g: &Groups) -> Shape {
    let side = square_side();
    let (end, curved) = (0.25 * PI, PI * g.slenderness);
    Shape {
        conduction: cylinder_conduction(g.slenderness),
        gravity: 0.967 * block_gravity(side, side, g.slenderness) / block_gravity(side, side, 1.0),
        turbulent: (end * turbulent_upward_constant(g.prandtl)
            + curved * turbulent_vertical_constant(g.prandtl))
            / (2.0 * end + curved),
    }
}

fn lying_cylinder(g: &Groups) -> Shape {
    let side = square_side();
    let (end, curved) = (0.25 * PI, PI * g.slenderness);
    let gravity = |length: f64| block_gravity(length.max(side), length.min(side), side);
    Shape {
        conduction: cylinder_conduction(g.slenderness),
        gravity: 1.019 * gravity(g.slenderness) / gravity(1.0),
        turbulent: (2.0 * end * turbulent_vertical_constant(g.prandtl)
            + curved * turbulent_cylinder_constant(g.prandtl))
            / (2.0 * end + curved),
    }
}

/// Side of the square with the area of a circle of diameter 1.
fn square_side() -> f64 {
    (0.25 * PI).sqrt()
}

/// Yovanovich's gravity function of a block, `length` its longer horizontal side.
fn block_gravity(length: f64, width: f64, height: f64) -> f64 {
    let moved = 0.625 * length.powf(4.0 / 3.0) * width + height * (length + width).powf(4.0 / 3.0);
    let faces = length * width + height * width + length * height;
    2_f64.powf(0.125) * (moved / faces.powf(7.0 / 6.0)).powf(0.75)
}

/// Nusselt number of pure conduction from a cylinder with both ends.
fn cylinder_conduction(slenderness: f64) -> f64 {
    (3.1915 + 2.7726 * slenderness.powf(0.76)) / (1.0 + 2.0 * slenderness).sqrt()
}
