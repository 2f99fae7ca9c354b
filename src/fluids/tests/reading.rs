//! Tables as operators may write them.

use crate::fluids::{Conditions, Fluid, rows};

const COLUMNS: &str = "temperature [K],density [kg/m3],specific_heat [J/(kg K)],\
                       viscosity [Pa s],conductivity [W/(m K)],expansion [1/K]";

/// Faults of a text, as `line: detail`.
fn faults(text: &str) -> Vec<String> {
    let faults = Fluid::read(text).err().unwrap_or_default();
    faults.iter().map(ToString::to_string).collect()
}

fn gas(rule: &str, columns: &str, rows: &str) -> String {
    format!(
        "# id: test-gas\n# name: a gas\n# phase: gas\n# source: invented\n# pressure rule: {rule}\n{columns}\n{rows}"
    )
}

fn ideal_gas(rows: &str) -> String {
    gas("ideal-gas at 1e5 Pa, 5e4 to 2e5 Pa", COLUMNS, rows)
}

const GOOD_ROWS: &str = "300,1.2,1000,2e-5,0.03,0.0033\n400,0.9,1010,2.4e-5,0.035,0.0025\n500,0.7,1020,2.8e-5,0.04,0.002\n";

#[test]
fn a_table_is_read_whatever_its_writer() {
    assert_eq!(faults(&ideal_gas(GOOD_ROWS)), [""; 0]);
    let other = ideal_gas(&GOOD_ROWS.replace(',', " , ")).replace('\n', "\r\n");
    let other = format!("\u{feff}{other}");
    assert_eq!(faults(&other), [""; 0]);
    let quoted = ideal_gas(GOOD_ROWS).replace("density [kg/m3]", "\"density [kg/m3]\"");
    assert_eq!(faults(&quoted), [""; 0]);
}

#[test]
fn every_fault_of_header_and_cells_is_told() {
    let text = "# id: Test Gas\n# nmae: a gas\n# phase: plasma\n# source: invented\n\
                # pressure rule: ideal-gas at 1e5 Pa, 2e5 to 5e4 Pa\n# flash point: hot\n\
                # freezing: 270 K\n# freezing: 270 K\n# remark\n# pressure error: density 0.1\n"
        .to_owned()
        + COLUMNS
        + "\n300,1.2,1000,2e-5,0.03,0.0033\n400,-0.9,,2.4e-5,NaN,inf\n500,0.7\n";
    let faults = faults(&text);
    let starts: Vec<&str> = faults.iter().map(|fault| &fault[..8]).collect();
    assert_eq!(
        starts,
        [
            "line 2: ", "line 8: ", "line 9: ", "line 1: ", "line 1: ", "line 3: ", "line 5: ",
            "line 6: ", "line 10:", "line 13:", "line 13:", "line 13:", "line 13:", "line 14:"
        ],
        "{faults:#?}"
    );
    assert!(faults[0].contains("unknown key \"nmae\""));
    assert!(faults[4].contains("\"# name: …\""));
    assert!(faults[9].contains("density is a positive number"));
    assert!(faults[13].ends_with("2 cells under 6 column names"));
}

#[test]
fn every_fault_of_the_columns_is_told() {
    let columns = COLUMNS.replace("density [kg/m3]", "density [lb/ft3]") + ",temperature [K]";
    let faults = faults(&gas("layers", &columns, ""));
    assert_eq!(faults.len(), 3, "{faults:#?}");
    assert!(faults[0].contains("unknown column \"density [lb/ft3]\""));
    assert!(faults[1].contains("temperature [K] stands twice"));
    assert!(faults[2].contains("density [kg/m3] is missing"));
    assert_eq!(rows::body("# id: x\n").err().map(|f| f.len()), Some(1));
}

#[test]
fn rows_must_rise_and_suffice() {
    let two: String = GOOD_ROWS.split_inclusive('\n').take(2).collect();
    assert!(faults(&ideal_gas(&two))[0].contains("at least 3 rows"));
    assert!(!faults(&ideal_gas("")).is_empty());
    let swapped: String = GOOD_ROWS.split_inclusive('\n').rev().collect();
    let faults = faults(&ideal_gas(&swapped));
    assert_eq!(faults.len(), 2, "{faults:#?}");
    assert!(faults[0].starts_with("line 8: temperatures must rise"));
}

#[test]
fn layers_must_agree() {
    let columns = format!("pressure [Pa],{COLUMNS}");
    let layer = |pressure: &str, rows: &str| -> String {
        rows.lines()
            .map(|row| format!("{pressure},{row}\n"))
            .collect()
    };
    let layered = |rows: String| faults(&gas("layers", &columns, &rows));
    let (low, high) = (layer("1e5", GOOD_ROWS), layer("2e5", GOOD_ROWS));
    assert_eq!(layered(low.clone() + &high), [""; 0]);
    assert!(layered(high.clone() + &low)[0].contains("at least 5 % above"));
    let shifted = high.replace("400", "401");
    assert!(layered(low.clone() + &shifted)[0].contains("the first one's temperatures"));
    let wild = high.replace("0.03", "3");
    assert!(layered(low.clone() + &wild).is_empty());
    let third = layer("4e5", GOOD_ROWS);
    assert!(layered(low.clone() + &wild + &third)[0].contains("too much from layer to layer"));
    let many: String = (1..=9)
        .map(|step| layer(&format!("{step}e5"), GOOD_ROWS))
        .collect();
    assert!(layered(many)[0].contains("at most 8"));
    assert!(faults(&gas("layers", COLUMNS, GOOD_ROWS))[0].contains("needs a column"));
    let rule = "ideal-gas at 1e5 Pa, 5e4 to 2e5 Pa";
    assert!(faults(&gas(rule, &columns, &low))[0].contains("no use for a column"));
}

fn mixture(header: &str, layers: &[f64]) -> String {
    let row = |fraction: &f64| {
        ["280", "300", "320"]
            .map(|temperature| format!("{fraction},{temperature},1050,3500,0.002,0.45,0.0004\n"))
    };
    let rows: String = layers.iter().flat_map(row).collect();
    format!(
        "# id: test-brine\n# name: a brine\n# phase: liquid\n# source: invented\n\
         # pressure rule: incompressible at 1e5 Pa, 5e4 to 2e5 Pa\n{header}\n\
         mass_fraction [1],{COLUMNS}\n{rows}"
    )
}

#[test]
fn mixtures_must_agree() {
    let header = "# composition: mass fraction of salt\n# freezing: 273 K, 270 K, 262 K";
    let mixed = |header: &str, layers: &[f64]| faults(&mixture(header, layers));
    assert_eq!(mixed(header, &[0.0, 0.1, 0.2]), [""; 0]);
    let without_curve = "# composition: mass fraction of salt";
    assert_eq!(mixed(without_curve, &[0.0, 0.1]), [""; 0]);
    assert!(mixed(header, &[0.0, 0.1])[0].contains("3 freezing points stand where 2 would do"));
    assert!(mixed(header, &[0.0, 0.2, 0.1])[0].contains("at least 0.01 above"));
    assert!(mixed(header, &[0.0, 0.1, 0.105])[0].contains("at least 0.01 above"));
    assert!(mixed(header, &[0.0, 0.1, 1.2])[0].contains("a number from 0 to 1"));
    assert!(mixed("# note: pure", &[0.0, 0.1])[0].contains("composition by mass fraction"));
    assert!(mixed("# composition: humidity", &[0.0, 0.1])[0].contains("composition by mass"));
    assert!(mixed("# composition: salt", &[0.0, 0.1])[0].contains("mass fraction of …"));
    let columns = format!("pressure [Pa],mass_fraction [1],{COLUMNS}");
    assert!(faults(&gas("layers", &columns, ""))[0].contains("cannot stand in one table"));
}

#[test]
fn saturation_must_lead_and_rise() {
    let columns = format!("{COLUMNS},saturation_pressure [Pa]");
    let rule = "ideal-gas at 1e5 Pa, 5e4 to 2e5 Pa";
    let with = |pressures: [&str; 4]| {
        let rows = GOOD_ROWS.to_owned() + "600,0.6,1030,3.2e-5,0.045,0.0017\n";
        let rows: String = rows
            .lines()
            .zip(pressures)
            .map(|(row, pressure)| format!("{row},{pressure}\n"))
            .collect();
        faults(&gas(rule, &columns, &rows))
    };
    assert_eq!(with(["1e5", "2e5", "3e5", ""]), [""; 0]);
    assert_eq!(with(["", "", "", ""]), [""; 0]);
    assert!(with(["1e5", "2e5", "", ""])[0].contains("at least 3 saturation"));
    assert!(with(["1e5", "2e5", "", "4e5"])[0].contains("leading rows"));
    assert!(with(["1e5", "3e5", "2e5", ""])[0].contains("saturation pressures must rise"));
    assert!(with(["1e5", "2e5", "3e5", "-1"])[0].contains("saturation_pressure [Pa]"));
}

#[test]
fn the_rule_must_suit_the_phase() {
    for rule in [
        "incompressible at 1e5 Pa, 5e4 to 2e5 Pa",
        "along-saturation at 1e5 Pa, 1e6 Pa above",
    ] {
        let faults = faults(&gas(rule, COLUMNS, GOOD_ROWS));
        assert!(faults[0].contains("does not suit this table"), "{faults:?}");
    }
}

#[test]
fn extreme_numbers_give_finite_states() {
    let steep = "1e-12,1e-12,1e-12,1e-12,1e-12,-1e12\n2e-12,1e12,1e12,1e12,1e12,1e12\n1e12,1e-12,1e12,1e12,1e12,0\n";
    let fluid = Fluid::read(&ideal_gas(steep)).expect("each number is plausible by itself");
    for temperature in [1e-12, 1.5e-12, 2e-12, 1.0, 1e6, 1e12] {
        let state = fluid
            .state(temperature, &Conditions::pure(1e5))
            .expect("inside");
        assert!(state.density > 0.0 && state.density.is_finite());
        assert!(state.expansion.is_finite() && state.prandtl().is_finite());
    }
}
