//! Air with water vapour.

use super::*;

fn humid(temperature: f64, pressure: f64, composition: f64) -> Result<State, StateError> {
    let conditions = Conditions {
        pressure,
        composition,
    };
    fluid("air").state(temperature, &conditions)
}

/// CoolProp 8.0.0 at 30 °C and 60 %, 60 °C and 90 %, 85 °C and 95 %, 5 °C and 50 %: density,
/// specific heat and expansion by `HAPropsSI`; viscosity and conductivity by Wilke's and
/// Wassiljewa's rules typed anew, from dry air and water vapour at 1e-9 kg/m³.
#[test]
fn mixes_as_the_reference() {
    for (temperature, pressure, ratio, expected) in [
        (
            303.15,
            101_325.0,
            0.016_116_408_413_589_262,
            [
                1.153_721_647,
                1_020.520_226,
                1.845_058_566_5e-5,
                0.026_408_485_054,
                0.003_308_121_321,
            ],
        ),
        (
            333.15,
            101_325.0,
            0.134_860_744_860_852_2,
            [
                0.989_316_760_7,
                1_119.719_579,
                1.838_641_899_6e-5,
                0.027_368_089_168,
                0.003_022_971_193,
            ],
        ),
        (
            358.15,
            90_000.0,
            0.986_693_595_884_261_8,
            [
                0.676_821_020_5,
                1_507.688_042,
                1.535_723_910_3e-5,
                0.025_863_153_841,
                0.002_888_443_279,
            ],
        ),
        (
            278.15,
            110_000.0,
            0.002_487_457_506_631,
            [
                1.376_485_428_6,
                1_008.072_642,
                1.743_314_081_9e-5,
                0.024_712_244_256,
                0.003_608_387_703,
            ],
        ),
    ] {
        let found = humid(temperature, pressure, ratio).expect("inside");
        let tolerances = [6e-4, 5e-3, 1e-5, 1e-5, 4e-3];
        let pairs = properties(&found).into_iter().zip(expected);
        for ((found, expected), tolerance) in pairs.zip(tolerances) {
            assert_near(found, expected, tolerance);
        }
    }
}

#[test]
fn dry_air_is_dry_air() {
    for temperature in [150.0, 217.3, 305.0, 1999.0] {
        for pressure in [30e3, ATMOSPHERE, 734e3] {
            let dry = state("air", temperature, pressure);
            assert_eq!(humid(temperature, pressure, 0.0), Ok(dry));
            assert_eq!(humid(temperature, pressure, -0.0), Ok(dry));
        }
    }
}

#[test]
fn a_trace_of_vapour_changes_a_trace() {
    for temperature in [223.15, 250.0, 300.0, 800.0, 1173.15] {
        let dry = state("air", temperature, ATMOSPHERE);
        let moist = humid(temperature, ATMOSPHERE, 1e-9).expect("inside");
        assert_within(1e-8, &moist, properties(&dry));
    }
}

/// The expansion is the slope of the volume: by differences of the density, between rows.
#[test]
fn expansion_is_that_of_the_mixture() {
    for (temperature, ratio) in [(303.0, 0.02), (345.0, 0.2), (363.0, 1.3), (700.0, 0.1)] {
        let density = |at: f64| humid(at, ATMOSPHERE, ratio).expect("inside").density;
        let step = 0.05;
        let slope = (density(temperature - step) / density(temperature + step)).ln() / (2.0 * step);
        let found = humid(temperature, ATMOSPHERE, ratio)
            .expect("inside")
            .expansion;
        assert_near(found, slope, 1e-4);
    }
}

/// CoolProp 8.0.0, `HAPropsSI`: humidity ratio and dew point, below 0 °C frost point.
#[test]
fn relative_humidity_and_dew_point() {
    for (temperature, pressure, humidity, ratio, dew) in [
        (303.15, 101_325.0, 0.6, 0.016_116_408, 294.541_445),
        (333.15, 101_325.0, 0.9, 0.134_860_745, 330.893_345),
        (358.15, 90_000.0, 0.95, 0.986_693_596, 356.840_733),
        (263.15, 101_325.0, 0.5, 0.000_802_064_77, 255.567_188),
    ] {
        let found = Fluids::humidity_ratio(humidity, temperature, pressure).expect("inside");
        assert_near(found, ratio, 1.2e-2);
        let found = Fluids::dew_point(found, pressure).expect("inside");
        assert!((found - dew).abs() < 0.01, "{found} for {dew}");
    }
    assert_eq!(Fluids::humidity_ratio(0.0, 300.0, ATMOSPHERE), Ok(0.0));
    assert_eq!(Fluids::dew_point(0.0, ATMOSPHERE), None);
    assert_eq!(Fluids::dew_point(-0.1, ATMOSPHERE), None);
    assert_eq!(Fluids::dew_point(f64::NAN, ATMOSPHERE), None);
}

#[test]
fn humidity_has_its_limits() {
    let ratio = Fluids::humidity_ratio;
    for wrong in [f64::NAN, f64::INFINITY, f64::NEG_INFINITY] {
        assert_eq!(ratio(wrong, 300.0, 1e5), Err(HumidityError::NotFinite));
        assert_eq!(ratio(0.5, wrong, 1e5), Err(HumidityError::NotFinite));
        assert_eq!(ratio(0.5, 300.0, wrong), Err(HumidityError::NotFinite));
    }
    assert_eq!(ratio(0.5, 300.0, 0.0), Err(HumidityError::NotFinite));
    for humidity in [-0.01, 1.01, 60.0] {
        let refused = HumidityError::RelativeHumidityOutside;
        assert_eq!(ratio(humidity, 300.0, 1e5), Err(refused));
    }
    for temperature in [223.0, 648.0] {
        let refused = ratio(0.5, temperature, 1e7);
        assert!(matches!(
            refused,
            Err(HumidityError::TemperatureOutside { .. })
        ));
    }
    let boiling = ratio(1.0, 374.0, ATMOSPHERE);
    assert!(matches!(boiling, Err(HumidityError::TooMuchVapour { .. })));
    let most = ratio(1.0, 369.8, ATMOSPHERE);
    assert!(
        most.is_ok_and(|most| most <= Composition::MOST_HUMID),
        "{most:?}"
    );
}

#[test]
fn humid_air_has_its_limits() {
    assert_eq!(
        humid(223.0, ATMOSPHERE, 0.001),
        Err(StateError::BelowTable { minimum: 223.15 })
    );
    assert_eq!(
        humid(1174.0, ATMOSPHERE, 0.001),
        Err(StateError::AboveTable { maximum: 1173.15 })
    );
    let refused = Err(StateError::CompositionOutside {
        minimum: 0.0,
        maximum: Composition::MOST_HUMID,
    });
    assert_eq!(humid(300.0, ATMOSPHERE, 5.1), refused);
    assert_eq!(humid(300.0, ATMOSPHERE, -0.01), refused);
    assert!(humid(300.0, 29e3, 0.01).is_err());
    for wrong in [f64::NAN, f64::INFINITY, f64::NEG_INFINITY] {
        let conditions = Conditions {
            pressure: ATMOSPHERE,
            composition: wrong,
        };
        assert!(!fluid("air").is_past_saturation(300.0, &conditions));
        assert_eq!(fluid("air").saturation_temperature(&conditions), None);
    }
    let conditions = Conditions {
        pressure: ATMOSPHERE,
        composition: 0.01,
    };
    assert_eq!(fluid("air").temperatures_at(&conditions), (223.15, 1173.15));
}

/// Next to a cold surface air keeps its vapour: there is a state, and it is told.
#[test]
fn below_the_dew_point_there_is_a_state() {
    let ratio = Fluids::humidity_ratio(0.8, 298.15, ATMOSPHERE).expect("inside");
    let conditions = Conditions {
        pressure: ATMOSPHERE,
        composition: ratio,
    };
    let air = fluid("air");
    let dew = air
        .saturation_temperature(&conditions)
        .expect("a dew point");
    assert_eq!(Some(dew), Fluids::dew_point(ratio, ATMOSPHERE));
    assert!((294.0..295.0).contains(&dew), "{dew}");
    assert!(air.is_past_saturation(dew - 0.01, &conditions));
    assert!(!air.is_past_saturation(dew + 0.01, &conditions));
    assert!(!air.is_past_saturation(270.0, &Conditions::pure(ATMOSPHERE)));
    let above = air.state(dew + 1e-9, &conditions).expect("inside");
    let below = air.state(dew - 1e-9, &conditions).expect("inside");
    assert_within(1e-6, &below, properties(&above));
}

#[test]
fn every_served_state_is_plausible() {
    for pressure in [30e3, 80e3, ATMOSPHERE, 500e3, 1e6] {
        for composition in [1e-300, 1e-6, 0.01, 0.3, 1.0, Composition::MOST_HUMID] {
            for step in 0..=190 {
                let temperature = 223.15 + 5.0 * f64::from(step);
                let found = humid(temperature, pressure, composition).expect("inside");
                let finite = properties(&found).map(|value| value.is_finite() && value > 0.0);
                assert_eq!(
                    finite, [true; 5],
                    "{temperature} K, {pressure} Pa, {composition}"
                );
                assert!((0.5..1.5).contains(&found.prandtl()), "{}", found.prandtl());
            }
        }
    }
}
