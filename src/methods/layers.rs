//! Laminar and turbulent layers: the constants and blends that several bodies share.
//!
//! # Source
//! Raithby, G. D.; Hollands, K. G. T. 1998, Handbook of Heat Transfer, 3rd ed., ch. 4, unless said otherwise.

use std::f64::consts::{FRAC_PI_2, PI};
use std::sync::LazyLock;

/// `1 + (c/Pr)^(9/16)`.
pub fn f9(prandtl: f64, c: f64) -> f64 {
    1.0 + (c / prandtl).powf(9.0 / 16.0)
}

/// `C_l = 0.671 / [1 + (0.492/Pr)^(9/16)]^(4/9)`.
pub fn laminar_constant(prandtl: f64) -> f64 {
    0.671 / f9(prandtl, 0.492).powf(4.0 / 9.0)
}

/// `C_V = 0.13 Pr^0.22 / (1 + 0.61 Pr^0.81)^0.42`, turbulent on upright surfaces.
pub fn turbulent_vertical_constant(prandtl: f64) -> f64 {
    0.13 * prandtl.powf(0.22) / (1.0 + 0.61 * prandtl.powf(0.81)).powf(0.42)
}

/// `C_U = 0.14 (1 + 0.0107 Pr)/(1 + 0.01 Pr)`, turbulent on level surfaces whose layer leaves them.
pub fn turbulent_upward_constant(prandtl: f64) -> f64 {
    0.14 * (1.0 + 0.0107 * prandtl) / (1.0 + 0.01 * prandtl)
}

/// `(a^m + b^m)^(1/m)` of two non-negative numbers.
pub fn blend(a: f64, b: f64, exponent: f64) -> f64 {
    let (small, large) = if a < b { (a, b) } else { (b, a) };
    if large == 0.0 {
        return 0.0;
    }
    large * (1.0 + (small / large).powf(exponent)).powf(1.0 / exponent)
}

/// `a / ln(1 + a/Nu_T)`: a thin laminar layer thickened by conduction at its edges.
pub fn thickened(thin: f64, a: f64) -> f64 {
    a / (a / thin).ln_1p()
}

/// Laminar layer of an upright plate on its height.
pub fn vertical_laminar(rayleigh: f64, prandtl: f64) -> f64 {
    thickened(laminar_constant(prandtl) * rayleigh.powf(0.25), 2.0)
}

/// Turbulent layer of an upright plate on its height.
pub fn vertical_turbulent(rayleigh: f64, prandtl: f64) -> f64 {
    turbulent_vertical_constant(prandtl) * rayleigh.cbrt() / (1.0 + 1.4e9 * prandtl / rayleigh)
}

/// Upright plate, laminar to turbulent.
pub fn vertical_blend(rayleigh: f64, prandtl: f64) -> f64 {
    blend(
        vertical_laminar(rayleigh, prandtl),
        vertical_turbulent(rayleigh, prandtl),
        6.0,
    )
}

/// Level plate whose layer leaves it, on area over perimeter.
pub fn horizontal_unstable_blend(rayleigh: f64, prandtl: f64) -> f64 {
    let laminar = thickened(0.835 * laminar_constant(prandtl) * rayleigh.powf(0.25), 1.4);
    blend(
        laminar,
        turbulent_upward_constant(prandtl) * rayleigh.cbrt(),
        10.0,
    )
}

/// Level plate whose layer clings to it, on area over perimeter.
pub fn horizontal_stable(rayleigh: f64, prandtl: f64) -> f64 {
    let thin = 0.527 * rayleigh.powf(0.2) / (1.0 + (1.9 / prandtl).powf(0.9)).powf(2.0 / 9.0);
    thickened(thin, 2.5)
}

/// `C_t` of a lying cylinder: the turbulent constant averaged over its circumference.
pub fn turbulent_cylinder_constant(prandtl: f64) -> f64 {
    static TABLE: LazyLock<SurfaceAverage> = LazyLock::new(|| SurfaceAverage::new(|_| 1.0 / PI));
    TABLE.at(prandtl)
}

/// `C_t` of a sphere: the turbulent constant averaged over its surface.
pub fn turbulent_sphere_constant(prandtl: f64) -> f64 {
    static TABLE: LazyLock<SurfaceAverage> =
        LazyLock::new(|| SurfaceAverage::new(|polar| 0.5 * polar.sin()));
    TABLE.at(prandtl)
}

/// A turbulent constant averaged over a round surface, tabulated by ln Pr because the average is a pair of integrals.
struct SurfaceAverage {
    values: Vec<f64>,
}

impl SurfaceAverage {
    const FIRST: f64 = -10.0;
    const STEP: f64 = 1.0 / 32.0;
    const INTERVALS: usize = 832;

    /// Tabulates the average with the weight of each polar angle (from the upward vertical).
    fn new(weight: fn(f64) -> f64) -> Self {
        let values = (0..=Self::INTERVALS)
            .map(|i| average((Self::FIRST + Self::STEP * i as f64).exp(), weight))
            .collect();
        SurfaceAverage { values }
    }

    /// Lagrange's cubic through the four nodes around; the end values outside 5e-5 to 9e6.
    fn at(&self, prandtl: f64) -> f64 {
        let position =
            ((prandtl.ln() - Self::FIRST) / Self::STEP).clamp(1.0, (Self::INTERVALS - 2) as f64);
        let base = position.floor();
        let t = position - base;
        let i = base as usize;
        let [a, b, c, d] = [
            self.values[i - 1],
            self.values[i],
            self.values[i + 1],
            self.values[i + 2],
        ];
        let (before, after, beyond) = (t + 1.0, t - 1.0, t - 2.0);
        (before * after * beyond * b - before * t * beyond * c) / 2.0
            + (before * t * after * d - t * after * beyond * a) / 6.0
    }
}

/// Integral over the polar angle of `max(C_U cos^(1/3), C_V sin^(1/3))` on the upper half and of `C_V sin^(1/3)` on the lower half.
fn average(prandtl: f64, weight: fn(f64) -> f64) -> f64 {
    let upward = turbulent_upward_constant(prandtl);
    let vertical = turbulent_vertical_constant(prandtl);
    let change = (upward / vertical).powi(3).atan();
    let level = |polar: f64| upward * polar.cos().cbrt() * weight(polar);
    let upright = |polar: f64| vertical * polar.sin().cbrt() * weight(polar);
    // The cube roots end in a vertical tangent at a quarter and at half a turn; the cube of a new variable removes it.
    simpson(
        |u| 3.0 * u * u * level(FRAC_PI_2 - u.powi(3)),
        (FRAC_PI_2 - change).cbrt(),
        FRAC_PI_2.cbrt(),
    ) + simpson(upright, change, FRAC_PI_2)
        + simpson(
            |u| 3.0 * u * u * upright(PI - u.powi(3)),
            0.0,
            FRAC_PI_2.cbrt(),
        )
}

/// Simpson's rule on 256 intervals.
fn simpson(f: impl Fn(f64) -> f64, from: f64, to: f64) -> f64 {
    const INTERVALS: usize = 256;
    let step = (to - from) / INTERVALS as f64;
    let inner: f64 = (1..INTERVALS)
        .map(|i| {
            let factor = if i % 2 == 1 { 4.0 } else { 2.0 };
            factor * f(from + step * i as f64)
        })
        .sum();
    (f(from) + inner + f(to)) * step / 3.0
}

#[cfg(test)]
mod tests {
    use super::*;

    /// Three figures each, integrated independently in tests/reference.
    #[test]
    fn cylinder_constants() {
        for (prandtl, expected) in [
            (0.01, 0.0771),
            (0.71, 0.103),
            (2.0, 0.108),
            (6.0, 0.109),
            (50.0, 0.101),
            (100.0, 0.099),
            (2000.0, 0.088),
        ] {
            let found = turbulent_cylinder_constant(prandtl);
            let half_figure = if prandtl < 0.1 { 5e-5 } else { 5e-4 };
            assert!(
                (found - expected).abs() <= half_figure,
                "{prandtl}: {found}"
            );
        }
    }

    #[test]
    fn tables_agree_with_their_integrals_between_nodes() {
        for k in 0..200 {
            let prandtl = (-7.0 + 0.093 * f64::from(k)).exp();
            let cylinder = average(prandtl, |_| 1.0 / PI);
            let sphere = average(prandtl, |polar| 0.5 * polar.sin());
            assert!((turbulent_cylinder_constant(prandtl) / cylinder - 1.0).abs() < 1e-7);
            assert!((turbulent_sphere_constant(prandtl) / sphere - 1.0).abs() < 1e-7);
        }
    }

    #[test]
    fn blends_have_their_limits() {
        assert_eq!(blend(0.0, 0.0, 6.0), 0.0);
        assert_eq!(blend(3.0, 0.0, 6.0), 3.0);
        assert_eq!(blend(1e3, 1e-3, 10.0), 1e3);
        assert_eq!(thickened(0.0, 2.0), 0.0);
        assert!((thickened(1e9, 2.0) / 1e9 - 1.0).abs() < 1e-8);
    }
}
