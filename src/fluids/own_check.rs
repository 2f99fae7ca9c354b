//! What a caller's own table must be.

use super::fault::OwnFault;
use super::own::OwnTable;
use super::rows::PLAUSIBLE;

/// The fewest rows that show how a property bends.
const FEWEST_ROWS: usize = 3;

/// The most rows: ten times a long data sheet.
const MOST_ROWS: usize = 1000;

/// A step of temperature may be this many times the middle one: a curve through a wider gap
/// would be guesswork.
const WIDEST_STEP: f64 = 10.0;

/// A step of temperature may be this share of the middle one: between closer rows rounding
/// makes the slope.
const NARROWEST_STEP: f64 = 0.01;

/// A column by name.
pub(super) struct Column<'a> {
    pub(super) name: &'static str,
    pub(super) values: &'a [f64],
}

/// All faults of a table.
pub(super) fn check(table: &OwnTable) -> Result<(), Vec<OwnFault>> {
    let mut faults = Vec::new();
    let rows = table.temperature.len();
    if !(FEWEST_ROWS..=MOST_ROWS).contains(&rows) {
        let detail = format!("{rows} rows; a table has {FEWEST_ROWS} to {MOST_ROWS}");
        faults.push(whole("temperature", detail));
    }
    for Column { name, values } in table.columns() {
        if values.len() != rows {
            let found = values.len();
            faults.push(whole(
                name,
                format!("{found} rows beside {rows} temperatures"),
            ));
        }
        check_numbers(name, values, &mut faults);
    }
    check_viscosity(table, &mut faults);
    if let Some(flash_point) = table.flash_point
        && !PLAUSIBLE.contains(&flash_point)
    {
        let detail = format!("{flash_point} K; it is a positive temperature");
        faults.push(whole("flash_point", detail));
    }
    if faults.is_empty() {
        check_steps(&table.temperature, &mut faults);
    }
    if faults.is_empty() {
        Ok(())
    } else {
        Err(faults)
    }
}

fn whole(column: &'static str, detail: impl Into<String>) -> OwnFault {
    OwnFault {
        column,
        row: None,
        detail: detail.into(),
    }
}

fn check_numbers(column: &'static str, values: &[f64], faults: &mut Vec<OwnFault>) {
    let is_signed = column == "expansion";
    for (row, value) in values.iter().take(MOST_ROWS).enumerate() {
        let size = if is_signed {
            value.abs().max(1.0)
        } else {
            *value
        };
        if !PLAUSIBLE.contains(&size) {
            let wanted = if is_signed {
                "a number up to 1e12"
            } else {
                "a positive number, 1e-12 to 1e12"
            };
            faults.push(OwnFault {
                column,
                row: Some(row),
                detail: format!("{value}; it takes {wanted}"),
            });
        }
    }
}

fn check_viscosity(table: &OwnTable, faults: &mut Vec<OwnFault>) {
    match (&table.viscosity, &table.kinematic_viscosity) {
        (None, None) => faults.push(whole(
            "viscosity",
            "neither viscosity nor kinematic_viscosity is given; give one",
        )),
        (Some(_), Some(_)) => faults.push(whole(
            "kinematic_viscosity",
            "viscosity and kinematic_viscosity are both given; give one",
        )),
        _ => {}
    }
}

/// Temperatures go one way, in steps of about one size.
fn check_steps(temperatures: &[f64], faults: &mut Vec<OwnFault>) {
    let mut at_fault = |row: usize, detail: String| {
        faults.push(OwnFault {
            column: "temperature",
            row: Some(row),
            detail,
        });
    };
    let falls = temperatures.first() > temperatures.last();
    let steps: Vec<f64> = temperatures
        .windows(2)
        .map(|pair| {
            if falls {
                pair[0] - pair[1]
            } else {
                pair[1] - pair[0]
            }
        })
        .collect();
    let mut sorted = steps.clone();
    sorted.sort_by(f64::total_cmp);
    let middle = sorted[sorted.len() / 2];
    for (row, &step) in (1..).zip(&steps) {
        let (from, to) = (temperatures[row - 1], temperatures[row]);
        if step <= 0.0 {
            at_fault(
                row,
                format!("{to} K after {from} K; the temperatures must all rise or all fall"),
            );
        } else if step > WIDEST_STEP * middle {
            at_fault(
                row,
                format!(
                    "{to} K after {from} K leaves a gap more than {WIDEST_STEP} times the usual step; give rows between"
                ),
            );
        } else if step < NARROWEST_STEP * middle {
            at_fault(
                row,
                format!("{to} K nearly repeats {from} K; leave one of the rows out"),
            );
        }
    }
}
