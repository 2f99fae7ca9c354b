//! A caller's own fluid: a table inline in a request.

use serde_json::value::RawValue;

use crate::case::{Fault, Given, duplicate_field, unknown_field};
use crate::fluids::{Fluid, OwnTable, Phase};
use crate::quantity::{Kind, UnitChoice, parse};

use super::MOST_FAULTS;
use super::json::{read_members, read_value};

/// The id under which a request's own table goes.
pub const OWN_TABLE: &str = "own-table";

/// The columns of a table with their kinds.
pub const COLUMNS: [(&str, Kind); 7] = [
    ("temperature", Kind::Temperature),
    ("density", Kind::Density),
    ("specific_heat", Kind::SpecificHeat),
    ("viscosity", Kind::Viscosity),
    ("kinematic_viscosity", Kind::KinematicViscosity),
    ("conductivity", Kind::Conductivity),
    ("expansion", Kind::Expansion),
];

/// Members of a table that are not columns.
const OTHERS: [&str; 3] = ["source", "flash_point", "phase"];

/// Reads a table; its faults point into `#/fluid`.
pub fn read_own_table(
    raw: &RawValue,
    units: &UnitChoice,
    faults: &mut Vec<Fault>,
) -> Option<Fluid> {
    let before = faults.len();
    let members = read_members(raw.get().as_bytes()).unwrap_or_default();
    let mut columns: [Option<Vec<f64>>; COLUMNS.len()] = [const { None }; COLUMNS.len()];
    let mut table = OwnTable {
        id: OWN_TABLE.to_owned(),
        ..OwnTable::default()
    };
    let mut seen = Vec::new();
    for (name, raw) in &members {
        if seen.contains(name) {
            faults.push(inside(duplicate_field(name)));
            continue;
        }
        seen.push(name.clone());
        if let Some(place) = COLUMNS.iter().position(|(column, _)| column == name) {
            if raw.get() != "null" {
                columns[place] = read_column(COLUMNS[place], raw, units, faults);
            }
        } else if let Err(fault) = read_other(name, raw, units, &mut table) {
            faults.push(inside(fault));
        }
    }
    let [
        temperature,
        density,
        specific_heat,
        viscosity,
        kinematic_viscosity,
        conductivity,
        expansion,
    ] = columns;
    let is_named = |name: &str| seen.iter().any(|seen| seen == name);
    let mut required = |name: &str, column: Option<Vec<f64>>| {
        if !is_named(name) {
            let detail =
                format!("{name} is not given; an own fluid needs it as a list of at least three");
            faults.push(Fault::under(&["fluid", name], "missing-field", detail));
        }
        column.unwrap_or_default()
    };
    table.temperature = required("temperature", temperature);
    table.density = required("density", density);
    table.specific_heat = required("specific_heat", specific_heat);
    table.conductivity = required("conductivity", conductivity);
    table.viscosity = viscosity;
    table.kinematic_viscosity = kinematic_viscosity;
    table.expansion = expansion;
    if faults.len() > before {
        return None;
    }
    match Fluid::from_own(table) {
        Ok(fluid) => Some(fluid),
        Err(found) => {
            faults.extend(found.into_iter().map(|fault| {
                let row = fault.row.map(|row| row.to_string());
                let names: Vec<&str> = ["fluid", fault.column]
                    .into_iter()
                    .chain(row.as_deref())
                    .collect();
                Fault::under(&names, "bad-table", fault.detail)
            }));
            None
        }
    }
}

/// A fault of a member, moved to where the table stands.
fn inside(fault: Fault) -> Fault {
    Fault {
        pointer: fault.pointer.replacen('#', "#/fluid", 1),
        ..fault
    }
}

fn read_other(
    name: &str,
    raw: &RawValue,
    units: &UnitChoice,
    table: &mut OwnTable,
) -> Result<(), Fault> {
    let columns = COLUMNS.iter().map(|&(column, _)| column);
    match (name, read_value(raw)) {
        ("source" | "phase" | "flash_point", None) => {}
        ("source", Some(Given::Text(text))) => table.source = Some(text.into_owned()),
        ("phase", Some(Given::Text(text))) if text == Phase::Gas.name() => table.phase = Phase::Gas,
        ("phase", Some(Given::Text(text))) if text == Phase::Liquid.name() => {}
        ("phase", _) => {
            return Err(Fault::under(
                &[name],
                "unknown-value",
                "phase is liquid or gas",
            ));
        }
        ("flash_point", Some(given)) => {
            table.flash_point = Some(read_number(&[name], Kind::Temperature, given, units)?);
        }
        ("source", _) => {
            return Err(Fault::under(&[name], "wrong-type", "source is a text"));
        }
        _ => return Err(unknown_field(name, columns.chain(OTHERS))),
    }
    Ok(())
}

fn read_column(
    (name, kind): (&str, Kind),
    raw: &RawValue,
    units: &UnitChoice,
    faults: &mut Vec<Fault>,
) -> Option<Vec<f64>> {
    let Ok(rows) = serde_json::from_str::<Vec<&RawValue>>(raw.get()) else {
        let detail = format!("{name} is not a list; it takes one value a row");
        faults.push(Fault::under(&["fluid", name], "wrong-type", detail));
        return None;
    };
    let before = faults.len();
    let mut values = Vec::with_capacity(rows.len());
    for (row, raw) in rows.into_iter().enumerate() {
        if faults.len() >= MOST_FAULTS {
            break;
        }
        let number = row.to_string();
        let given = read_value(raw).unwrap_or(Given::Other("null"));
        match read_number(&["fluid", name, &number], kind, given, units) {
            Ok(value) => values.push(value),
            Err(fault) => faults.push(fault),
        }
    }
    (faults.len() == before).then_some(values)
}

fn read_number(names: &[&str], kind: Kind, given: Given, units: &UnitChoice) -> Result<f64, Fault> {
    let name = names
        .iter()
        .rev()
        .find(|name| name.parse::<usize>().is_err());
    let name = name.copied().unwrap_or_default();
    let unit = units.unit(name, kind);
    match given {
        Given::Number(number) if number.is_finite() => Ok(unit.to_si(number)),
        Given::Text(text) => parse(&text, kind, unit)
            .map(|reading| reading.value)
            .map_err(|error| Fault::under(names, error.code(), format!("{name}: {error}"))),
        Given::Number(_) => {
            let detail = format!("{name} is not finite");
            Err(Fault::under(names, "not-finite", detail))
        }
        Given::Other(found) => {
            let detail = format!("{name} is {found}; it takes a number or a text with a unit");
            Err(Fault::under(names, "wrong-type", detail))
        }
    }
}
