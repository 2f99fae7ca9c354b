//! The rows of a table's text.
//!
//! Every cell is a number and no column name holds a comma, so a line is split at its commas;
//! quotation marks around a cell, as some writers put them, are taken off.

use std::ops::RangeInclusive;

use super::fault::{Faults, TableFault};
use super::table::{PROPERTIES, Values};

const TEMPERATURE: &str = "temperature [K]";
const PRESSURE: &str = "pressure [Pa]";
const SATURATION: &str = "saturation_pressure [Pa]";

/// Far wider than any fluid's properties in SI, and narrow enough that no coefficient of an
/// interpolant through them overflows.
const PLAUSIBLE: RangeInclusive<f64> = 1e-12..=1e12;

/// The rows of a table in the order of its text.
pub(super) struct Body {
    /// Where the column names stand.
    pub(super) line: usize,
    pub(super) rows: Vec<Row>,
}

/// One row; pressures only where the table has them.
pub(super) struct Row {
    pub(super) line: usize,
    pub(super) temperature: f64,
    pub(super) pressure: Option<f64>,
    pub(super) values: Values,
    pub(super) saturation: Option<f64>,
}

/// The rows of a text, or all faults of its columns and cells.
pub(super) fn body(text: &str) -> Result<Body, Vec<TableFault>> {
    let mut faults = Faults::default();
    let mut lines = (1..)
        .zip(text.lines())
        .filter(|(_, text)| !text.starts_with('#') && !text.trim().is_empty());
    let Some((line, names)) = lines.next() else {
        faults.add(1, "there is no row of column names");
        return faults.or(None);
    };
    let Some(columns) = Columns::new(line, &cells(names), &mut faults) else {
        return faults.or(None);
    };
    let rows = lines
        .filter_map(|(line, text)| columns.row(line, &cells(text), &mut faults))
        .collect();
    faults.or(Some(Body { line, rows }))
}

fn cells(line: &str) -> Vec<&str> {
    line.split(',')
        .map(|cell| cell.trim().trim_matches('"').trim())
        .collect()
}

/// Where each column stands.
struct Columns {
    count: usize,
    temperature: usize,
    pressure: Option<usize>,
    properties: [usize; PROPERTIES.len()],
    saturation: Option<usize>,
}

impl Columns {
    fn new(line: usize, names: &[&str], faults: &mut Faults) -> Option<Self> {
        let properties =
            PROPERTIES.map(|property| format!("{} [{}]", property.name, property.unit));
        for (index, &name) in names.iter().enumerate() {
            let known = [TEMPERATURE, PRESSURE, SATURATION].contains(&name)
                || properties.iter().any(|property| property == name);
            if !known {
                let detail = format!(
                    "unknown column \"{name}\"; the columns are {TEMPERATURE}, {} and where the \
                     table has them {PRESSURE}, {SATURATION}",
                    properties.join(", ")
                );
                faults.add(line, detail);
            } else if names[..index].contains(&name) {
                faults.add(line, format!("the column {name} stands twice"));
            }
        }
        let find = |wanted: &str| names.iter().position(|&name| name == wanted);
        let mut place = |wanted: &str| {
            find(wanted).unwrap_or_else(|| {
                faults.add(line, format!("the column {wanted} is missing"));
                names.len()
            })
        };
        let columns = Self {
            count: names.len(),
            temperature: place(TEMPERATURE),
            pressure: find(PRESSURE),
            properties: properties.map(|property| place(&property)),
            saturation: find(SATURATION),
        };
        faults.is_empty().then_some(columns)
    }

    /// The row of a line; none if it has too few or too many cells. A cell at fault is NaN, and
    /// its fault keeps the row from being used.
    fn row(&self, line: usize, cells: &[&str], faults: &mut Faults) -> Option<Row> {
        if cells.len() != self.count {
            let (found, count) = (cells.len(), self.count);
            faults.add(line, format!("{found} cells under {count} column names"));
            return None;
        }
        let mut read = |name: &str, cell: &str, signed: bool| {
            number(cell, signed).unwrap_or_else(|wanted| {
                faults.add(line, format!("{name} is {wanted}, not \"{cell}\""));
                f64::NAN
            })
        };
        let given = |place: Option<usize>| place.map(|place| cells[place]);
        Some(Row {
            line,
            temperature: read(TEMPERATURE, cells[self.temperature], false),
            pressure: given(self.pressure).map(|cell| read(PRESSURE, cell, false)),
            values: std::array::from_fn(|index| {
                let property = &PROPERTIES[index];
                read(
                    property.name,
                    cells[self.properties[index]],
                    property.signed,
                )
            }),
            saturation: given(self.saturation)
                .filter(|cell| !cell.is_empty())
                .map(|cell| read(SATURATION, cell, false)),
        })
    }
}

/// A number of plausible size, positive unless it may have either sign.
fn number(cell: &str, signed: bool) -> Result<f64, &'static str> {
    if signed {
        let number = cell.parse().ok();
        number
            .filter(|number: &f64| number.abs() <= *PLAUSIBLE.end())
            .ok_or("a number up to 1e12")
    } else {
        positive(cell).ok_or("a positive number, 1e-12 to 1e12")
    }
}

/// A positive number of plausible size.
pub(super) fn positive(text: &str) -> Option<f64> {
    text.parse()
        .ok()
        .filter(|number| PLAUSIBLE.contains(number))
}
