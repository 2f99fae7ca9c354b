//! What every part of this module must answer, seen from outside.

mod folders;
mod humid_air;
mod mixtures;
mod own;
mod reading;
mod states;

use super::*;

const ATMOSPHERE: f64 = 101_325.0;

fn fluid(id: &str) -> &'static Fluid {
    let fluids = Fluids::built_in();
    fluids.get(fluids.find(id).expect("a built-in fluid"))
}

fn state(id: &str, temperature: f64, pressure: f64) -> State {
    let conditions = Conditions::pure(pressure);
    fluid(id).state(temperature, &conditions).expect("a state")
}

fn properties(state: &State) -> [f64; 5] {
    [
        state.density,
        state.specific_heat,
        state.viscosity,
        state.conductivity,
        state.expansion,
    ]
}

fn assert_within(tolerance: f64, found: &State, expected: [f64; 5]) {
    for (found, expected) in properties(found).into_iter().zip(expected) {
        assert_near(found, expected, tolerance);
    }
}

fn assert_near(found: f64, expected: f64, tolerance: f64) {
    assert!(
        (found / expected - 1.0).abs() < tolerance,
        "{found} for {expected}"
    );
}
