//! What holds for every unit, and conversions known from elsewhere.

mod spellings;

use proptest::prelude::*;

use super::{Kind, QuantityError, Unit, parse};

fn units() -> impl Iterator<Item = Unit> {
    Kind::ALL.into_iter().flat_map(Kind::units)
}

fn si(text: &str, kind: Kind) -> f64 {
    match parse(text, kind, kind.si_unit()) {
        Ok(reading) => reading.value,
        Err(error) => panic!("{text}: {error}"),
    }
}

fn error(text: &str, kind: Kind) -> QuantityError {
    parse(text, kind, kind.si_unit()).unwrap_err()
}

fn differs(a: f64, b: f64, tolerance: f64) -> bool {
    (a - b).abs() > tolerance * b.abs()
}

/// Exact definitions, or figures to the digits that NIST SP 811 appendix B prints, from memory;
/// the tolerance is the rounding of the figure.
#[test]
fn conversions_agree_with_published_figures() {
    let mut off = Vec::new();
    for (kind, text, value, tolerance) in [
        (Kind::Temperature, "32 degF", 273.15, 1e-15),
        (Kind::Temperature, "212 °F", 373.15, 1e-15),
        (Kind::Temperature, "-40 degF", 233.15, 1e-15),
        (Kind::Temperature, "85 °C", 358.15, 1e-15),
        (Kind::Temperature, "491.67 degR", 273.15, 1e-15),
        (Kind::TemperatureDifference, "10 degC", 10.0, 0.0),
        (Kind::TemperatureDifference, "9 degF", 5.0, 0.0),
        (Kind::TemperatureDifference, "9 degR", 5.0, 0.0),
        (Kind::Length, "8 in", 0.2032, 0.0),
        (Kind::Length, "1 1/2 in", 0.0381, 0.0),
        (Kind::Length, "1 mil", 2.54e-5, 1e-15),
        (Kind::Length, "9 mm", 0.009, 0.0),
        (Kind::Area, "1 ft2", 0.092_903_04, 0.0),
        (Kind::Volume, "1 gal", 3.785_411_784e-3, 1e-15),
        (Kind::Speed, "1 mph", 0.447_04, 1e-15),
        (Kind::Speed, "1 kn", 0.514_444, 1e-6),
        (Kind::Speed, "100 fpm", 0.508, 1e-15),
        (Kind::Pressure, "1 psi", 6894.757, 1e-7),
        (Kind::Pressure, "14.503773773 psi", 1e5, 1e-10),
        (Kind::Pressure, "1 psia", 6894.757, 1e-7),
        (Kind::Pressure, "3 barg", 401_325.0, 0.0),
        (Kind::Pressure, "45 psig", 411_589.078, 1e-9),
        (Kind::Pressure, "0 kPag", 101_325.0, 0.0),
        (Kind::Pressure, "1 inHg", 3386.389, 1e-6),
        (Kind::Pressure, "1 inH2O", 249.0889, 1e-6),
        (Kind::Pressure, "1 mmHg", 133.3224, 1e-6),
        (Kind::Pressure, "1 mmH2O", 9.806_65, 1e-15),
        (Kind::Pressure, "760 torr", 101_325.0, 1e-15),
        (Kind::HeatFlow, "1 Btu/h", 0.293_071_07, 1e-8),
        (Kind::HeatFlow, "1 hp", 745.699_871_582_270_1, 1e-14),
        (Kind::HeatFlow, "1 TR", 3516.853, 1e-6),
        (Kind::HeatFlow, "1 kcal/h", 1.163, 1e-15),
        (Kind::HeatFlux, "1 Btu/(h ft2)", 3.154_591, 1e-6),
        (Kind::HeatFlowPerLength, "1 Btu/h·ft", 0.9615, 1e-4),
        (Kind::Coefficient, "1 Btu/(h ft2 degF)", 5.678_263, 1e-7),
        (Kind::Coefficient, "1 kcal/(h m2 K)", 1.163, 1e-15),
        (Kind::Conductivity, "1 Btu/(h ft degF)", 1.730_735, 1e-6),
        (
            Kind::Conductivity,
            "1 Btu in/(h ft2 degF)",
            0.144_227_9,
            1e-6,
        ),
        (Kind::Energy, "1 Btu", 1_055.055_852_62, 1e-15),
        (Kind::Energy, "1 therm", 1.055_06e8, 1e-5),
        (Kind::Energy, "1 kWh", 3.6e6, 0.0),
        (Kind::Mass, "16 oz", 0.453_592_37, 1e-15),
        (Kind::Time, "1 d", 86_400.0, 0.0),
        (Kind::Angle, "3.141592653589793 rad", 180.0, 0.0),
        (Kind::Angle, "45 °", 45.0, 0.0),
        (Kind::Acceleration, "32.174 ft/s2", 9.806_65, 2e-5),
        (Kind::Density, "1 lb/ft3", 16.018_46, 1e-6),
        (Kind::SpecificHeat, "1 Btu/(lb degF)", 4186.8, 1e-14),
        (Kind::Viscosity, "1 cP", 1e-3, 0.0),
        (Kind::Viscosity, "1 lb/(ft s)", 1.488_164, 1e-6),
        (Kind::KinematicViscosity, "220 cSt", 220e-6, 1e-15),
        (Kind::KinematicViscosity, "1 ft2/s", 0.092_903_04, 0.0),
        (Kind::Expansion, "1 1/degF", 1.8, 1e-15),
        (Kind::Number, "5 %", 0.05, 0.0),
    ] {
        let found = si(text, kind);
        if differs(found, value, tolerance) {
            off.push((text, found, value));
        }
    }
    assert!(off.is_empty(), "{off:?}");
}

#[test]
fn decimal_and_other_whole_multiples_are_exact() {
    let mut off = Vec::new();
    for (kind, text, value) in [
        (Kind::Length, "1 km", 1e3),
        (Kind::Length, "1 cm", 1e-2),
        (Kind::Length, "1 µm", 1e-6),
        (Kind::Length, "1 nm", 1e-9),
        (Kind::Length, "1 yd", 0.9144),
        (Kind::Volume, "1 L", 1e-3),
        (Kind::Volume, "1 mL", 1e-6),
        (Kind::Speed, "36 km/h", 10.0),
        (Kind::Pressure, "1 hPa", 1e2),
        (Kind::Pressure, "1 kPa", 1e3),
        (Kind::Pressure, "1 MPa", 1e6),
        (Kind::Pressure, "1 mbar", 1e2),
        (Kind::Pressure, "1.2 bar", 1.2e5),
        (Kind::Pressure, "1.2 bara", 1.2e5),
        (Kind::Pressure, "1 mbarg", 101_425.0),
        (Kind::Pressure, "1 atm", 101_325.0),
        (Kind::HeatFlow, "1 mW", 1e-3),
        (Kind::HeatFlow, "1 kW", 1e3),
        (Kind::HeatFlow, "1 MW", 1e6),
        (Kind::HeatFlow, "3.6 kJ/h", 1.0),
        (Kind::Energy, "1 kJ", 1e3),
        (Kind::Energy, "1 MJ", 1e6),
        (Kind::Energy, "1 GJ", 1e9),
        (Kind::Energy, "1 Wh", 3.6e3),
        (Kind::Energy, "1 MWh", 3.6e9),
        (Kind::Energy, "1 kBtu", 1_055_055.852_62),
        (Kind::Energy, "1 MMBtu", 1_055_055_852.62),
        (Kind::Energy, "1 kcal", 4_186.8),
        (Kind::Mass, "1 g", 1e-3),
        (Kind::Mass, "1 t", 1e3),
        (Kind::Mass, "1 lb", 0.453_592_37),
        (Kind::Time, "1 min", 60.0),
        (Kind::Time, "1 h", 3600.0),
        (Kind::Density, "0.85 g/cm3", 850.0),
        (Kind::SpecificHeat, "2.1 kJ/(kg K)", 2100.0),
        (Kind::Viscosity, "1 P", 0.1),
        (Kind::Viscosity, "1 mPa s", 1e-3),
        (Kind::KinematicViscosity, "1 St", 1e-4),
    ] {
        let found = si(text, kind);
        if found != value {
            off.push((text, found, value));
        }
    }
    assert!(off.is_empty(), "{off:?}");
}

#[test]
fn differences_are_scaled_and_never_shifted() {
    for unit in Kind::TemperatureDifference.units() {
        assert_eq!(unit.to_si(0.0), 0.0, "{unit:?}");
        let point = Unit::find(Kind::Temperature, unit.symbol()).unwrap();
        let step = point.to_si(300.0) - point.to_si(200.0);
        assert!(!differs(unit.to_si(100.0), step, 1e-14), "{unit:?}");
    }
    assert!(!differs(si("1 W/(m2 °C)", Kind::Coefficient), 1.0, 0.0));
    assert!(!differs(si("1 1/°C", Kind::Expansion), 1.0, 0.0));
}

#[test]
fn a_bare_number_is_in_the_default_unit_and_says_so() {
    let millimetre = Unit::find(Kind::Length, "mm").unwrap();
    let bare = parse("200", Kind::Length, millimetre).unwrap();
    assert_eq!((bare.value, bare.unit, bare.bare), (0.2, millimetre, true));
    let own = parse("200 m", Kind::Length, millimetre).unwrap();
    assert_eq!(
        (own.value, own.unit, own.bare),
        (200.0, Kind::Length.si_unit(), false)
    );
}

#[test]
fn faults_say_what_was_given_what_is_wrong_and_what_would_do() {
    for (text, kind, code, message) in [
        (
            "",
            Kind::Mass,
            "empty",
            "no mass was given: write a number such as 0.2, alone or with one of kg, g, t, lb, oz",
        ),
        (
            "wide",
            Kind::Number,
            "not-a-quantity",
            "\"wide\" is no number: write a number such as 0.2 or \"20 %\"",
        ),
        (
            "0,2",
            Kind::Length,
            "decimal-comma",
            "\"0,2\" has a comma: write \"0.2\"",
        ),
        (
            "1,000 mm",
            Kind::Length,
            "decimal-comma",
            "\"1,000 mm\" has a comma: write \"1000 mm\", or \"1.000 mm\" if it is a decimal comma",
        ),
        (
            "5 kg",
            Kind::Time,
            "wrong-kind",
            "\"kg\" is a unit of mass, not of time: write one of s, min, h, d",
        ),
        (
            "5 ib",
            Kind::Mass,
            "unknown-unit",
            "\"ib\" is no known unit of mass: write one of kg, g, t, lb, oz",
        ),
        (
            "5 Radd",
            Kind::Angle,
            "unknown-unit",
            "\"Radd\" is no known unit of angle: did you mean rad? Known: deg, rad",
        ),
        (
            "W",
            Kind::Temperature,
            "not-a-quantity",
            "\"W\" is no temperature: write a number such as 0.2, alone or with one of \
             K, degC, degF, degR",
        ),
        (
            "1e999",
            Kind::Length,
            "not-finite",
            "\"1e999\" is not a finite number: write one, or leave it out",
        ),
        (
            "1e308 km",
            Kind::Length,
            "not-finite",
            "\"1e308 km\" is not a finite number: write one, or leave it out",
        ),
    ] {
        let error = error(text, kind);
        assert_eq!((error.code(), error.to_string().as_str()), (code, message));
    }
}

#[test]
fn long_texts_are_not_repeated_whole() {
    for text in [
        "x".repeat(100_000),
        format!("5 {}", "µ".repeat(100_000)),
        "(".repeat(100_000),
    ] {
        assert!(error(&text, Kind::Length).to_string().len() < 400);
    }
}

fn any_unit() -> impl Strategy<Value = Unit> {
    prop::sample::select(units().collect::<Vec<_>>())
}

fn any_kind() -> impl Strategy<Value = Kind> {
    prop::sample::select(Kind::ALL.to_vec())
}

proptest! {
    /// Near the zero of SI a shifted unit can keep no more digits than its zero point has.
    #[test]
    fn every_unit_round_trips(unit in any_unit(), value in -1e12..1e12_f64) {
        let there = unit.to_si(value);
        let zero = unit.from_si(0.0).abs();
        prop_assert!((unit.from_si(there) - value).abs() <= 1e-14 * value.abs().max(zero));
        let back = unit.from_si(value);
        let zero = unit.to_si(0.0).abs();
        prop_assert!((unit.to_si(back) - value).abs() <= 1e-14 * value.abs().max(zero));
    }

    #[test]
    fn written_values_are_read_back(unit in any_unit(), value in -1e6..1e6_f64) {
        let text = match unit.symbol() {
            "1" => value.to_string(),
            symbol => format!("{value} {symbol}"),
        };
        let reading = parse(&text, unit.kind(), unit.kind().si_unit());
        prop_assert_eq!(reading.map(|reading| reading.value), Ok(unit.to_si(value)));
    }

    #[test]
    fn random_texts_give_a_finite_value_or_a_fault(text in ".*", kind in any_kind()) {
        if let Ok(reading) = parse(&text, kind, kind.si_unit()) {
            prop_assert!(reading.value.is_finite());
        }
    }

    #[test]
    fn texts_of_the_right_letters_do_too(
        text in "[-+−0-9.,/eE ]{0,8}[ ()/^*.·²⁻°µ'\"%0-9a-zA-Z-]{0,16}",
        kind in any_kind(),
    ) {
        match parse(&text, kind, kind.si_unit()) {
            Ok(reading) => prop_assert!(reading.value.is_finite()),
            Err(error) => prop_assert!(!error.to_string().is_empty()),
        }
    }
}
