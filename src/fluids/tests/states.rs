//! The built-in fluids against their reference equations, pure.
//!
//! Figures marked CoolProp were given by CoolProp 8.0.0, whose equations each table's header
//! names; they lie between the tables' rows.

use std::collections::HashSet;

use super::*;

#[test]
fn every_table_is_read_and_answers() {
    let fluids = Fluids::built_in();
    let mut ids = HashSet::new();
    for (id, fluid) in fluids.iter() {
        assert!(ids.insert(fluid.id()), "{} stands twice", fluid.id());
        assert_eq!(fluids.find(fluid.id()), Some(id));
        assert!(fluid.interpolation_error().is_some(), "{}", fluid.id());
        let (minimum, maximum) = fluid.temperatures();
        for step in 0..=1000 {
            let temperature = minimum + (maximum - minimum) * f64::from(step) / 1000.0;
            let saturation = fluid.saturation_pressure(temperature);
            let pressure = match fluid.phase() {
                Phase::Gas => ATMOSPHERE.min(saturation.unwrap_or(ATMOSPHERE)),
                Phase::Liquid => ATMOSPHERE.max(saturation.unwrap_or(ATMOSPHERE)),
            };
            let conditions = Conditions {
                pressure,
                composition: fluid.composition().bounds().1,
            };
            let (coldest, hottest) = fluid.temperatures_at(&conditions);
            if !(coldest..=hottest).contains(&temperature) {
                continue;
            }
            let state = fluid.state(temperature, &conditions).expect("inside");
            let [.., expansion] = properties(&state);
            assert!(expansion.is_finite());
            assert!(properties(&state)[..4].iter().all(|&value| value > 0.0));
            assert!(state.prandtl() > 0.0 && state.diffusivity() > 0.0);
        }
    }
    assert_eq!(ids.len(), 15);
}

#[test]
fn the_default_is_air() {
    let fluids = Fluids::built_in();
    assert_eq!(fluids.get(Fluids::default_fluid()).id(), "air");
    assert_eq!(fluids.find("Air"), None);
}

#[test]
fn the_digest_names_its_kind() {
    let digest = Fluids::built_in().digest();
    let hexadecimal = digest.strip_prefix("sha256:").expect("a prefix");
    assert_eq!(hexadecimal.len(), 64);
    assert!(hexadecimal.chars().all(|digit| digit.is_ascii_hexdigit()));
}

/// CoolProp, air.
#[test]
fn air_at_one_atmosphere() {
    let warm = state("air", 305.0, ATMOSPHERE);
    assert_within(
        2e-5,
        &warm,
        [
            1.1576508,
            1006.5654,
            1.8777428e-5,
            0.026754811,
            0.0032869928,
        ],
    );
    let cold = state("air", 155.0, ATMOSPHERE);
    assert_within(
        2e-5,
        &cold,
        [
            2.2901489,
            1011.2066,
            1.0685261e-5,
            0.014601246,
            0.0065654226,
        ],
    );
}

/// CoolProp, air.
#[test]
fn air_at_other_pressures() {
    for (temperature, pressure, expected) in [
        (
            305.0,
            500e3,
            [
                5.7183223,
                1012.6208,
                1.8834863e-5,
                0.026881026,
                0.0033193557,
            ],
        ),
        (
            305.0,
            30e3,
            [0.34268894, 1005.484, 1.876742e-5, 0.026732951, 0.0032811506],
        ),
        (
            180.0,
            800e3,
            [15.917151, 1051.3485, 1.232794e-5, 0.017236515, 0.0060929878],
        ),
        (
            1234.5,
            200e3,
            [
                0.56409254,
                1179.4883,
                4.9636612e-5,
                0.079249434,
                0.00080970727,
            ],
        ),
    ] {
        assert_within(5e-5, &state("air", temperature, pressure), expected);
    }
}

#[test]
fn layers_join_without_a_step() {
    let at = state("air", 217.3, ATMOSPHERE);
    let beside = state("air", 217.3, ATMOSPHERE * (1.0 + 1e-12));
    assert_within(1e-11, &beside, properties(&at));
}

/// CoolProp: helium, carbon dioxide, oxygen, methane, steam.
#[test]
fn other_gases() {
    for (id, temperature, expected) in [
        (
            "helium",
            305.0,
            [
                0.15985277,
                5193.1907,
                2.0156453e-5,
                0.15776658,
                0.0032769746,
            ],
        ),
        (
            "carbon-dioxide",
            333.0,
            [
                1.6162252,
                883.65813,
                1.6566988e-5,
                0.019344279,
                0.0030385248,
            ],
        ),
        (
            "oxygen",
            333.0,
            [1.1714585, 925.50193, 2.2434782e-5, 0.02904282, 0.0030099975],
        ),
        (
            "methane",
            333.0,
            [
                0.58777709,
                2320.521,
                1.2280548e-5,
                0.039178797,
                0.0030171472,
            ],
        ),
        (
            "steam",
            383.0,
            [
                0.58109715,
                2044.153,
                1.2613033e-5,
                0.025389928,
                0.0027912129,
            ],
        ),
        (
            "steam",
            451.7,
            [
                0.48914822,
                1975.659,
                1.5335302e-5,
                0.031430434,
                0.0022742087,
            ],
        ),
    ] {
        assert_within(5e-5, &state(id, temperature, ATMOSPHERE), expected);
    }
}

#[test]
fn an_ideal_gas_scales_its_density() {
    let low = state("nitrogen", 333.0, 50e3);
    let high = state("nitrogen", 333.0, 200e3);
    assert!((high.density / low.density - 4.0).abs() < 1e-14);
    assert_eq!(properties(&low)[1..], properties(&high)[1..]);
    let refused = StateError::PressureOutside {
        minimum: 50e3,
        maximum: 200e3,
    };
    assert_eq!(
        fluid("nitrogen").state(333.0, &Conditions::pure(49.9e3)),
        Err(refused)
    );
    assert_eq!(
        fluid("nitrogen").state(333.0, &Conditions::pure(201e3)),
        Err(refused)
    );
}

/// CoolProp, water.
#[test]
fn water_between_rows() {
    let warm = state("water", 321.5, ATMOSPHERE);
    assert_within(
        2e-4,
        &warm,
        [
            988.77235,
            4180.8982,
            0.00056200725,
            0.63874408,
            0.00044638127,
        ],
    );
}

/// CoolProp, water: expansion 2.9962901e-8 at 277.13 K, -1.5022969e-5 at 276.2 K.
#[test]
fn water_is_densest_near_four_degrees() {
    for (temperature, expected) in [(277.13, 2.9962901e-8), (276.2, -1.5022969e-5)] {
        let found = state("water", temperature, ATMOSPHERE).expansion;
        assert!((found - expected).abs() < 1e-7, "{found} for {expected}");
    }
    assert!(state("water", 277.0, ATMOSPHERE).expansion < 0.0);
    assert!(state("water", 277.2, ATMOSPHERE).expansion > 0.0);
}

/// Viscosities as printed, at two rows of the engine oil's source; between rows the logarithm is
/// interpolated, so that the geometric mean lies nearer than the arithmetic one.
#[test]
fn oil_thins_steeply() {
    assert!((state("engine-oil", 300.0, ATMOSPHERE).viscosity / 0.486 - 1.0).abs() < 1e-14);
    assert!((state("engine-oil", 430.0, ATMOSPHERE).viscosity / 0.00470 - 1.0).abs() < 1e-14);
    let between = state("engine-oil", 305.0, ATMOSPHERE).viscosity;
    let geometric = (0.486_f64 * 0.253).sqrt();
    assert!((between / geometric - 1.0).abs() < 0.01, "{between}");
}

/// The source prints 7.0e-4; its densities give 6.0e-4 to 7.7e-4.
#[test]
fn oil_expansion_follows_its_densities() {
    let cold = state("engine-oil", 273.0, ATMOSPHERE).expansion;
    let hot = state("engine-oil", 430.0, ATMOSPHERE).expansion;
    assert!(6.0e-4 < cold && cold < 7.0e-4, "{cold}");
    assert!(7.0e-4 < hot && hot < 7.7e-4, "{hot}");
}

#[test]
fn liquids_ignore_pressure_within_reason() {
    let low = state("transformer-oil", 320.0, 30e3);
    let high = state("transformer-oil", 320.0, 2e6);
    assert_eq!(low, high);
    assert!(
        fluid("transformer-oil")
            .state(320.0, &Conditions::pure(2.1e6))
            .is_err()
    );
    assert!(matches!(
        fluid("transformer-oil").pressure_rule(),
        PressureRule::Incompressible { .. }
    ));
}

#[test]
fn limits_are_known_where_they_exist() {
    let limits = |id| fluid(id).limits_at(&Conditions::pure(ATMOSPHERE));
    assert_eq!(limits("water").freezing, Some(273.15));
    assert_eq!(limits("ethylene-glycol").freezing, Some(260.0));
    assert_eq!(limits("transformer-oil").flash_point, Some(408.15));
    assert_eq!(limits("air"), Limits::default());
}

#[test]
fn outside_is_refused() {
    let air = fluid("air");
    assert_eq!(
        air.state(149.9, &Conditions::pure(ATMOSPHERE)),
        Err(StateError::BelowTable { minimum: 150.0 })
    );
    assert_eq!(
        air.state(2000.1, &Conditions::pure(ATMOSPHERE)),
        Err(StateError::AboveTable { maximum: 2000.0 })
    );
    assert_eq!(
        air.state(300.0, &Conditions::pure(29e3)),
        Err(StateError::PressureOutside {
            minimum: 30e3,
            maximum: 1e6
        })
    );
    assert!(air.state(300.0, &Conditions::pure(-ATMOSPHERE)).is_err());
    assert!(
        air.state(150.0, &Conditions::pure(1e6)).is_ok()
            && air.state(2000.0, &Conditions::pure(30e3)).is_ok()
    );
}

#[test]
fn what_is_not_a_number_is_refused() {
    for (_, fluid) in Fluids::built_in().iter() {
        for wrong in [f64::NAN, f64::INFINITY, f64::NEG_INFINITY] {
            assert_eq!(
                fluid.state(wrong, &Conditions::pure(ATMOSPHERE)),
                Err(StateError::NotFinite)
            );
            assert_eq!(
                fluid.state(400.0, &Conditions::pure(wrong)),
                Err(StateError::NotFinite)
            );
            assert_eq!(fluid.saturation_pressure(wrong), None);
            let conditions = Conditions::pure(wrong);
            assert_eq!(fluid.saturation_temperature(&conditions), None);
            let conditions = Conditions {
                pressure: ATMOSPHERE,
                composition: wrong,
            };
            assert_eq!(fluid.state(400.0, &conditions), Err(StateError::NotFinite));
        }
    }
}

#[test]
fn edges_are_known() {
    let air = fluid("air");
    let near = [150.0, 159.0, 161.0, 1989.0, 1991.0, 2000.0].map(|at| air.near_edge(at));
    assert_eq!(near, [true, true, false, false, true, true]);
}
