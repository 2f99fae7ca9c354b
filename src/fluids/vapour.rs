//! Water vapour thin enough to mix with air, below and above the boiling point alike.

use std::ops::RangeInclusive;

/// Molar mass of water, kg/mol (IAPWS-95).
pub(super) const MOLAR_MASS: f64 = 0.018_015_268;

/// Specific gas constant, J/(kg K) (IAPWS-95).
pub(super) const GAS_CONSTANT: f64 = 461.518_05;

/// Critical temperature, K, and density, kg/m³ (IAPWS-95).
const CRITICAL_TEMPERATURE: f64 = 647.096;
const CRITICAL_DENSITY: f64 = 322.0;

/// Triple point, K and Pa (IAPWS R14-08).
const TRIPLE_TEMPERATURE: f64 = 273.16;
const TRIPLE_PRESSURE: f64 = 611.657;

/// The coldest frost that is looked for, K: far below any plant, far above the 50 K to which the
/// sublimation equation holds.
const COLDEST_FROST: f64 = 150.0;

/// Halvings after which an interval of 500 K is lost in rounding.
const HALVINGS: u32 = 54;

/// Temperatures at which vapour can be saturated, K.
pub(super) const SATURATED: RangeInclusive<f64> = COLDEST_FROST..=CRITICAL_TEMPERATURE;

/// Specific heat of the ideal gas.
///
/// # Units
/// K → J/(kg K)
///
/// # Source
/// IAPWS-95: Wagner & Pruss 2002, J. Phys. Chem. Ref. Data 31, 387-535, table 6.1.
pub(super) fn ideal_specific_heat(temperature: f64) -> f64 {
    const TRANSLATION_AND_ROTATION: f64 = 4.006_32;
    const VIBRATIONS: [(f64, f64); 5] = [
        (0.012436, 1.287_289_67),
        (0.97315, 3.537_342_22),
        (1.27950, 7.740_737_08),
        (0.96956, 9.244_377_96),
        (0.24873, 27.507_510_5),
    ];
    let vibration: f64 = VIBRATIONS
        .iter()
        .map(|(share, scale)| {
            let ratio = scale * CRITICAL_TEMPERATURE / temperature;
            let decay = (-ratio).exp();
            share * ratio * ratio * decay / ((1.0 - decay) * (1.0 - decay))
        })
        .sum();
    GAS_CONSTANT * (TRANSLATION_AND_ROTATION + vibration)
}

/// Viscosity in the limit of zero density.
///
/// # Units
/// K → Pa s
///
/// # Source
/// IAPWS R12-08, equation 11 and table 1; Huber et al. 2009, J. Phys. Chem. Ref. Data 38, 101-125.
pub(super) fn viscosity(temperature: f64) -> f64 {
    1e-4 * thin_gas(temperature, &[1.67752, 2.20462, 0.636_656_4, -0.241605])
}

/// Conductivity in the limit of zero density.
///
/// # Units
/// K → W/(m K)
///
/// # Source
/// IAPWS R15-11, equation 16 and table 1; Huber et al. 2012, J. Phys. Chem. Ref. Data 41, 033102.
pub(super) fn conductivity(temperature: f64) -> f64 {
    const COEFFICIENTS: [f64; 5] = [
        2.443_221e-3,
        1.323_095e-2,
        6.770_357e-3,
        -3.454_586e-3,
        4.096_266e-4,
    ];
    1e-3 * thin_gas(temperature, &COEFFICIENTS)
}

/// √T̄ / Σ cᵢ/T̄ⁱ with T̄ = T/T_c, the form of both releases.
fn thin_gas(temperature: f64, coefficients: &[f64]) -> f64 {
    let reduced = temperature / CRITICAL_TEMPERATURE;
    let sum = |sum: f64, coefficient: &f64| sum / reduced + coefficient;
    reduced.sqrt() / coefficients.iter().rev().fold(0.0, sum)
}

/// Second virial coefficient B of v = R T/p + B and its slopes, by mass.
///
/// # Units
/// m³/kg
pub(super) struct Virial {
    /// B
    pub(super) value: f64,
    /// T dB/dT
    pub(super) slope: f64,
    /// T² d²B/dT²
    pub(super) curvature: f64,
}

/// The departure of thin vapour from an ideal gas.
///
/// # Units
/// K
///
/// # Source
/// The terms of IAPWS-95 that are linear in density, as [`ideal_specific_heat`], table 6.2. Its
/// terms about the critical point vanish at zero density to within 1e-12.
pub(super) fn virial(temperature: f64) -> Virial {
    const TERMS: [(f64, f64); 7] = [
        (0.012_533_547_935_523, -0.5),
        (7.895_763_472_282_8, 0.875),
        (-8.780_320_330_356_1, 1.0),
        (-0.668_565_723_079_65, 4.0),
        (0.204_338_109_509_65, 6.0),
        (-6.621_260_503_968_7e-5, 12.0),
        (-0.107_936_009_089_32, 7.0),
    ];
    let inverse = CRITICAL_TEMPERATURE / temperature;
    let mut virial = Virial {
        value: 0.0,
        slope: 0.0,
        curvature: 0.0,
    };
    for (factor, power) in TERMS {
        let term = factor * inverse.powf(power) / CRITICAL_DENSITY;
        virial.value += term;
        virial.slope -= power * term;
        virial.curvature += power * (power + 1.0) * term;
    }
    virial
}

/// Vapour pressure over ice below the triple point and over water above it, up to the critical
/// point; none outside [`SATURATED`].
///
/// # Units
/// K → Pa
///
/// # Source
/// Over water Wagner & Pruss 2002, equation 2.5; over ice IAPWS R14-08, equation 6.
pub(super) fn saturation_pressure(temperature: f64) -> Option<f64> {
    if !SATURATED.contains(&temperature) {
        return None;
    }
    let logarithm = if temperature < TRIPLE_TEMPERATURE {
        const TERMS: [(f64, f64); 3] = [
            (-21.214_400_6, 0.333_333_333e-2),
            (27.320_381_9, 1.206_666_67),
            (-6.105_981_30, 1.703_333_33),
        ];
        let reduced = temperature / TRIPLE_TEMPERATURE;
        TRIPLE_PRESSURE.ln() + series(&TERMS, reduced) / reduced
    } else {
        const CRITICAL_PRESSURE: f64 = 22.064e6;
        const TERMS: [(f64, f64); 6] = [
            (-7.859_517_83, 1.0),
            (1.844_082_59, 1.5),
            (-11.786_649_7, 3.0),
            (22.680_741_1, 3.5),
            (-15.961_871_9, 4.0),
            (1.801_225_02, 7.5),
        ];
        let reduced = temperature / CRITICAL_TEMPERATURE;
        CRITICAL_PRESSURE.ln() + series(&TERMS, 1.0 - reduced) / reduced
    };
    Some(logarithm.exp())
}

fn series(terms: &[(f64, f64)], base: f64) -> f64 {
    let term = |(factor, power): &(f64, f64)| factor * base.powf(*power);
    terms.iter().map(term).sum()
}

/// The temperature at which vapour of a pressure is saturated; none outside [`SATURATED`].
///
/// # Units
/// Pa → K
pub(super) fn saturation_temperature(pressure: f64) -> Option<f64> {
    let is_below = |temperature| saturation_pressure(temperature).is_some_and(|at| at <= pressure);
    let (mut low, mut high) = (*SATURATED.start(), *SATURATED.end());
    if !is_below(low) || pressure > saturation_pressure(high)? {
        return None;
    }
    for _ in 0..HALVINGS {
        let middle = 0.5 * (low + high);
        if is_below(middle) {
            low = middle;
        } else {
            high = middle;
        }
    }
    Some(low)
}

#[cfg(test)]
mod tests {
    use super::*;

    fn assert_near(found: f64, expected: f64, tolerance: f64) {
        assert!(
            (found / expected - 1.0).abs() < tolerance,
            "{found} for {expected}"
        );
    }

    /// CoolProp 8.0.0, water at 1e-9 kg/m³: ideal specific heat, viscosity, conductivity, second
    /// virial coefficient (by mole) and its slope (by mole).
    #[test]
    fn thin_vapour_is_that_of_the_reference_equations() {
        for (temperature, expected) in [
            (
                273.16,
                [
                    1859.0184991403025,
                    8.948025244282643e-06,
                    0.016764587832154013,
                    -0.0020251798231984267,
                    4.3992689936134626e-05,
                ],
            ),
            (
                363.0,
                [
                    1885.6029510494216,
                    1.1960573601247147e-05,
                    0.02332479613341542,
                    -0.0005027195260177374,
                    5.533328897318314e-06,
                ],
            ),
            (
                1100.0,
                [
                    2361.0985831261783,
                    4.144891262270238e-05,
                    0.1094224466278545,
                    -1.4532438028097352e-05,
                    5.687996568406761e-08,
                ],
            ),
        ] {
            let Virial { value, slope, .. } = virial(temperature);
            let [heat, thickness, conducted, second, second_slope] = expected;
            assert_near(ideal_specific_heat(temperature), heat, 1e-12);
            assert_near(viscosity(temperature), thickness, 1e-9);
            assert_near(conductivity(temperature), conducted, 1e-9);
            assert_near(value * MOLAR_MASS, second, 1e-9);
            assert_near(slope * MOLAR_MASS / temperature, second_slope, 1e-9);
        }
    }

    /// By differences of the slope.
    #[test]
    fn curvature_is_the_slope_of_the_slope() {
        for temperature in [250.0, 300.0, 400.0, 900.0] {
            let step = 1e-3;
            let by_temperature = |at: f64| virial(at).slope / at;
            let difference =
                by_temperature(temperature + step) - by_temperature(temperature - step);
            let expected = difference / (2.0 * step) * temperature * temperature;
            assert_near(virial(temperature).curvature, expected, 1e-6);
        }
    }

    /// Over ice the check value of IAPWS R14-08 and the iapws package 1.5.5, over water CoolProp
    /// 8.0.0, whose saturation is that of IAPWS-95: the auxiliary equation used here meets it
    /// within 4e-5.
    #[test]
    fn vapour_saturates() {
        for (temperature, expected, tolerance) in [
            (230.0, 8.947_352_740_189_152, 1e-12),
            (265.0, 305.9132880433945, 1e-12),
            (273.16, 611.6548, 1e-5),
            (300.0, 3_536.806_752_3, 4e-5),
            (550.0, 6_117_183.639_6, 4e-5),
        ] {
            let found = saturation_pressure(temperature).expect("inside");
            assert_near(found, expected, tolerance);
            let back = saturation_temperature(found).expect("inside");
            assert!(
                (back - temperature).abs() < 1e-9,
                "{back} for {temperature}"
            );
        }
        assert_eq!(saturation_pressure(149.0), None);
        assert_eq!(saturation_pressure(648.0), None);
        assert_eq!(saturation_pressure(f64::NAN), None);
        assert_eq!(saturation_temperature(1e-9), None);
        assert_eq!(saturation_temperature(23e6), None);
        assert_eq!(saturation_temperature(f64::NAN), None);
    }
}
