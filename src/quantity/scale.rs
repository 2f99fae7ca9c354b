//! The arithmetic of conversion factors.

/// Exponents of length, mass, time, temperature and angle.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub(super) struct Dimension(pub [i16; 5]);

impl Dimension {
    /// That of a pure number.
    pub const NONE: Dimension = Dimension([0; 5]);

    /// That of a product in which `other` stands to the `power`.
    pub const fn times(self, other: Dimension, power: i16) -> Dimension {
        let Dimension(mut exponents) = self;
        let mut index = 0;
        while index < exponents.len() {
            exponents[index] += other.0[index] * power;
            index += 1;
        }
        Dimension(exponents)
    }
}

/// An affine conversion to SI, `(x * times + offset) / over`.
///
/// The factor is kept as a fraction of whole numbers wherever its definition is one: then
/// `9 mm` is `9 / 1000`, the same `f64` as `0.009`, which `9 * 0.001` is not.
#[derive(Clone, Copy, Debug)]
pub(super) struct Scale {
    times: f64,
    over: f64,
    offset: f64,
}

impl Scale {
    /// The conversion that changes nothing.
    pub const ONE: Scale = Scale::ratio(1.0, 1.0);

    /// `x * times / over`.
    pub const fn ratio(times: f64, over: f64) -> Scale {
        Scale {
            times,
            over,
            offset: 0.0,
        }
    }

    /// The same step from a zero that lies at `numerator / over` in SI.
    pub const fn offset(self, numerator: f64) -> Scale {
        Scale {
            offset: numerator,
            ..self
        }
    }

    /// The same step from a zero that lies at `zero` in SI.
    pub const fn zero_at(self, zero: f64) -> Scale {
        self.offset(zero * self.over)
    }

    /// The same step from the zero of SI, as differences and products take it.
    pub const fn step(self) -> Scale {
        self.offset(0.0)
    }

    /// Whether its zero is not that of SI.
    pub fn is_shifted(self) -> bool {
        self.offset != 0.0
    }

    /// The step of a product in which `other` stands to the `power`.
    pub const fn times(self, other: Scale, power: i16) -> Scale {
        let (times, over) = if power < 0 {
            (other.over, other.times)
        } else {
            (other.times, other.over)
        };
        let mut product = self.step();
        let mut left = power.unsigned_abs();
        while left > 0 {
            product.times *= times;
            product.over *= over;
            left -= 1;
        }
        product
    }

    /// Whether both are one conversion, told apart only by the order of multiplication.
    pub fn agrees_with(self, other: Scale) -> bool {
        let near = |a: f64, b: f64| (a - b).abs() <= 1e-12 * b.abs();
        near(self.times * other.over, other.times * self.over)
            && near(self.offset * other.over, other.offset * self.over)
    }

    /// The value in SI of `value` in this unit.
    pub fn apply(self, value: f64) -> f64 {
        (value * self.times + self.offset) / self.over
    }

    /// The value in this unit of `value` in SI.
    pub fn invert(self, value: f64) -> f64 {
        (value * self.over - self.offset) / self.times
    }
}

#[cfg(test)]
mod tests {
    use super::{Dimension, Scale};

    #[test]
    fn whole_numbers_of_a_decimal_unit_are_the_nearest_double() {
        let milli = Scale::ratio(1.0, 1000.0);
        for count in 1..10_000_u32 {
            let written: f64 = format!("{count}e-3").parse().unwrap();
            assert_eq!(milli.apply(f64::from(count)), written);
        }
    }

    #[test]
    fn negative_powers_divide() {
        let half = Scale::ratio(1.0, 2.0);
        assert_eq!(Scale::ONE.times(half, -3).apply(1.0), 8.0);
        assert_eq!(Scale::ONE.times(half, 2).apply(1.0), 0.25);
        assert_eq!(Scale::ONE.times(half, 0).apply(7.0), 7.0);
        let area = Dimension([2, 0, 0, 0, 0]);
        assert_eq!(Dimension::NONE.times(area, -2), Dimension([-4, 0, 0, 0, 0]));
    }

    #[test]
    fn products_forget_the_zero_point() {
        let shifted = Scale::ONE.zero_at(273.15);
        assert_eq!(shifted.apply(20.0), 293.15);
        assert_eq!(Scale::ONE.times(shifted, 1).apply(20.0), 20.0);
        assert!(!shifted.agrees_with(Scale::ONE));
        assert!(shifted.step().agrees_with(Scale::ONE));
    }
}
