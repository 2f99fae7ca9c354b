//! Callers' own tables.

use super::*;

/// Rows of the built-in transformer oil, without its expansion.
fn oil() -> OwnTable {
    OwnTable {
        id: "own".to_owned(),
        temperature: vec![273.15, 293.15, 313.15, 333.15, 353.15, 373.15, 393.15],
        density: vec![892.5, 880.3, 868.2, 856.0, 843.9, 831.8, 819.6],
        specific_heat: vec![1549.0, 1666.0, 1788.0, 1905.0, 2026.0, 2144.0, 2261.0],
        viscosity: Some(vec![
            0.062921, 0.019807, 0.0089425, 0.0049477, 0.0030887, 0.0021294, 0.0015736,
        ]),
        conductivity: vec![0.1123, 0.1106, 0.1090, 0.1072, 0.1056, 0.1038, 0.1022],
        ..OwnTable::default()
    }
}

/// What the columns and rows at fault are.
fn faults(table: OwnTable) -> Vec<(&'static str, Option<usize>)> {
    let faults = Fluid::from_own(table).err().unwrap_or_default();
    faults
        .iter()
        .map(|fault| (fault.column, fault.row))
        .collect()
}

fn own_state(fluid: &Fluid, temperature: f64) -> State {
    let conditions = Conditions::pure(ATMOSPHERE);
    fluid.state(temperature, &conditions).expect("inside")
}

#[test]
fn own_rows_answer_as_built_in_ones() {
    let own = Fluid::from_own(oil()).expect("a table");
    for temperature in [273.15, 300.0, 333.15, 391.0] {
        let found = own_state(&own, temperature);
        let built_in = state("transformer-oil", temperature, ATMOSPHERE);
        assert_eq!(properties(&found)[..4], properties(&built_in)[..4]);
    }
    assert_eq!(own.phase(), Phase::Liquid);
    assert_eq!(own.source(), "the caller's own table");
    assert_eq!(own.temperatures(), (273.15, 393.15));
    let state = |pressure| own.state(300.0, &Conditions::pure(pressure));
    assert_eq!(state(30e3), state(2e6));
    assert!(state(29e3).is_err() && state(2.1e6).is_err());
}

/// The source of the oil prints 6.80e-4 to 7.40e-4 at the ends; NumPy's parabola through
/// ln(density) gives 6.8016e-4 and 7.3898e-4, missing the densities by 4.1555e-4 of their change.
#[test]
fn expansion_follows_the_densities() {
    let own = Fluid::from_own(oil()).expect("a table");
    assert_near(own_state(&own, 273.15).expansion, 6.8016e-4, 1e-5);
    assert_near(own_state(&own, 393.15).expansion, 7.3898e-4, 1e-5);
    assert!(!own.expansion_is_rough());
    assert!(own.notes()[0].contains("degree 2") && own.notes()[0].contains("4.2e-4"));
    let given = OwnTable {
        expansion: Some(vec![7e-4; 7]),
        ..oil()
    };
    let own = Fluid::from_own(given).expect("a table");
    assert_near(own_state(&own, 300.0).expansion, 7e-4, 1e-12);
    assert!(own.notes().is_empty());
}

/// The densities that a textbook prints for ethylene glycol are known to be rough.
#[test]
fn rough_densities_are_told() {
    let rough = OwnTable {
        temperature: vec![280.0, 300.0, 320.0, 340.0, 360.0],
        density: vec![1125.8, 1114.4, 1096.2, 1083.8, 1074.0],
        specific_heat: vec![2400.0; 5],
        viscosity: Some(vec![0.042, 0.0157, 0.00757, 0.00431, 0.00278]),
        conductivity: vec![0.25; 5],
        ..OwnTable::default()
    };
    let own = Fluid::from_own(rough).expect("a table");
    assert!(own.expansion_is_rough());
}

/// Three rows are smoothed by a straight line, and an ideal gas is met by any.
#[test]
fn a_gas_expands_by_its_temperature() {
    let temperature = vec![300.0, 400.0, 550.0];
    let gas = OwnTable {
        phase: Phase::Gas,
        density: temperature.iter().map(|at| 400.0 / at).collect(),
        temperature,
        specific_heat: vec![1000.0, 1010.0, 1040.0],
        viscosity: Some(vec![1.8e-5, 2.3e-5, 2.9e-5]),
        conductivity: vec![0.026, 0.033, 0.043],
        ..OwnTable::default()
    };
    let own = Fluid::from_own(gas).expect("a table");
    for temperature in [300.0, 333.0, 550.0] {
        let found = own_state(&own, temperature);
        assert_near(found.expansion, 1.0 / temperature, 1e-12);
        assert_near(found.density, 400.0 / temperature, 1e-12);
    }
    assert!(!own.expansion_is_rough());
    let state = |pressure| own.state(300.0, &Conditions::pure(pressure));
    assert_near(
        state(200e3).expect("inside").density,
        400.0 / 300.0 * 200e3 / ATMOSPHERE,
        1e-12,
    );
    assert!(state(49e3).is_err() && state(201e3).is_err());
}

#[test]
fn falling_rows_and_kinematic_viscosity_do_too() {
    let mut other = oil();
    let dynamic = other.viscosity.take().expect("given");
    let kinematic = dynamic.iter().zip(&other.density).map(|(mu, rho)| mu / rho);
    other.kinematic_viscosity = Some(kinematic.rev().collect());
    for column in [
        &mut other.temperature,
        &mut other.density,
        &mut other.specific_heat,
        &mut other.conductivity,
    ] {
        column.reverse();
    }
    let other = Fluid::from_own(other).expect("a table");
    let own = Fluid::from_own(oil()).expect("a table");
    for temperature in [273.15, 300.0, 390.0] {
        assert_within(
            1e-13,
            &own_state(&other, temperature),
            properties(&own_state(&own, temperature)),
        );
    }
}

#[test]
fn all_faults_are_told_at_once() {
    let mut wrong = oil();
    wrong.density[2] = -868.2;
    wrong.specific_heat[3] = f64::NAN;
    wrong.conductivity.pop();
    wrong.kinematic_viscosity = Some(vec![1e-5; 7]);
    wrong.expansion = Some(vec![7e-4, -7e-4, f64::INFINITY, 0.0, 7e-4, 7e-4, 7e-4]);
    wrong.flash_point = Some(0.0);
    assert_eq!(
        faults(wrong),
        [
            ("density", Some(2)),
            ("specific_heat", Some(3)),
            ("conductivity", None),
            ("expansion", Some(2)),
            ("kinematic_viscosity", None),
            ("flash_point", None),
        ]
    );
    let empty = faults(OwnTable::default());
    assert_eq!(empty, [("temperature", None), ("viscosity", None)]);
}

#[test]
fn rows_are_few_enough_and_many_enough() {
    let rows = |count: usize| {
        let table = OwnTable {
            temperature: (0..count).map(|row| 300.0 + row as f64 / 10.0).collect(),
            density: (0..count).map(|row| 900.0 - row as f64 / 10.0).collect(),
            specific_heat: vec![2000.0; count],
            viscosity: Some(vec![0.01; count]),
            conductivity: vec![0.13; count],
            ..OwnTable::default()
        };
        faults(table)
    };
    assert_eq!(rows(2), [("temperature", None)]);
    assert_eq!(rows(3), []);
    assert_eq!(rows(1000), []);
    assert_eq!(rows(1001), [("temperature", None)]);
}

#[test]
fn temperatures_go_one_way_in_even_steps() {
    let with = |temperatures: [f64; 7]| {
        faults(OwnTable {
            temperature: temperatures.to_vec(),
            ..oil()
        })
    };
    let at = |row| vec![("temperature", Some(row))];
    assert_eq!(
        with([273.0, 283.0, 293.0, 291.0, 313.0, 323.0, 333.0]),
        at(3)
    );
    assert_eq!(
        with([273.0, 283.0, 283.0, 293.0, 313.0, 323.0, 333.0]),
        at(2)
    );
    assert_eq!(
        with([373.0, 353.0, 333.0, 313.0, 333.0, 273.0, 253.0]),
        at(4)
    );
    assert_eq!(
        with([273.0, 278.0, 283.0, 288.0, 293.0, 298.0, 373.0]),
        at(6)
    );
    assert_eq!(
        with([273.0, 283.0, 293.0, 293.01, 303.0, 313.0, 323.0]),
        at(3)
    );
    assert_eq!(with([300.0; 7]).len(), 6);
}

#[test]
fn a_constant_density_tells_no_expansion() {
    let mut constant = oil();
    constant.density = vec![850.0; 7];
    assert_eq!(faults(constant.clone()), [("density", None)]);
    constant.expansion = Some(vec![7e-4; 7]);
    assert_eq!(faults(constant), []);
}

#[test]
fn a_flash_point_is_kept() {
    let table = OwnTable {
        flash_point: Some(420.0),
        source: Some("the supplier".to_owned()),
        ..oil()
    };
    let own = Fluid::from_own(table).expect("a table");
    let limits = own.limits_at(&Conditions::pure(ATMOSPHERE));
    assert_eq!((limits.flash_point, limits.freezing), (Some(420.0), None));
    assert_eq!(own.source(), "the supplier");
    let plain = Fluid::from_own(oil()).expect("a table");
    assert_ne!(own.digest(), plain.digest());
    assert_eq!(
        plain.digest(),
        Fluid::from_own(oil()).expect("a table").digest()
    );
}

#[test]
fn extreme_numbers_give_finite_states() {
    for phase in [Phase::Gas, Phase::Liquid] {
        let steep = OwnTable {
            phase,
            temperature: vec![1e-12, 2e-12, 3e-12, 4e-12, 5e-12],
            density: vec![1e-12, 1e12, 1e-12, 1e12, 1e-12],
            specific_heat: vec![1e12, 1e-12, 1e12, 1e-12, 1e12],
            kinematic_viscosity: Some(vec![1e12, 1e-12, 1e12, 1e-12, 1e12]),
            conductivity: vec![1e-12; 5],
            ..OwnTable::default()
        };
        let own = Fluid::from_own(steep).expect("each number is plausible by itself");
        for step in 0..=40 {
            let state = own_state(&own, 1e-12 + 1e-13 * f64::from(step));
            assert!(properties(&state).iter().all(|value| value.is_finite()));
        }
    }
}

#[test]
fn a_collection_takes_one_more() {
    let built_in = Fluids::built_in();
    let (extended, own) = built_in.with_own(Fluid::from_own(oil()).expect("a table"));
    assert_eq!(extended.get(own).id(), "own");
    assert_eq!(extended.find("own"), Some(own));
    let water = built_in.find("water").expect("a built-in fluid");
    assert_eq!(extended.get(water).id(), "water");
    assert_eq!(extended.digest(), built_in.digest());
    assert_eq!(built_in.find("own"), None);
    assert_eq!(built_in.get(own).id(), "air");
}
