//! The rows of a table's text.
//!
//! Every cell is a number and no column name holds a comma, so a line is split at its commas;
//! quotation marks around a cell, as some writers put them, are taken off.

use std::ops::RangeInclusive;

use super::fault::{Faults, TableFault};
use super::table::{Axis, PROPERTIES, Values};

const TEMPERATURE: &str = "temperature [K]";
const PRESSURE: &str = "pressure [Pa]";
const MASS_FRACTION: &str = "mass_fraction [1]";
const SATURATION: &str = "saturation_pressure [Pa]";

/// Far wider than any fluid's properties in SI, and narrow enough that no coefficient of an
/// interpolant through them overflows.
pub(super) const PLAUSIBLE: RangeInclusive<f64> = 1e-12..=1e12;

/// The rows of a table in the order of its text.
pub(super) struct Body {
    /// Where the column names stand.
    pub(super) line: usize,
    /// What the column of layers holds, where there is one.
    pub(super) axis: Option<Axis>,
    pub(super) rows: Vec<Row>,
}

/// One row; its layer and its saturation pressure only where the table has them.
pub(super) struct Row {
    pub(super) line: usize,
    pub(super) temperature: f64,
    /// Its place on the axis.
    pub(super) layer: Option<f64>,
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
    let axis = columns.layer.map(|(axis, _)| axis);
    faults.or(Some(Body { line, axis, rows }))
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
    layer: Option<(Axis, usize)>,
    properties: [usize; PROPERTIES.len()],
    saturation: Option<usize>,
}

impl Columns {
    fn new(line: usize, names: &[&str], faults: &mut Faults) -> Option<Self> {
        let properties =
            PROPERTIES.map(|property| format!("{} [{}]", property.name, property.unit));
        for (index, &name) in names.iter().enumerate() {
            let known = [TEMPERATURE, PRESSURE, MASS_FRACTION, SATURATION].contains(&name)
                || properties.iter().any(|property| property == name);
            if !known {
                let detail = format!(
                    "unknown column \"{name}\"; the columns are {TEMPERATURE}, {} and where the \
                     table has them {PRESSURE} or {MASS_FRACTION}, {SATURATION}",
                    properties.join(", ")
                );
                faults.add(line, detail);
            } else if names[..index].contains(&name) {
                faults.add(line, format!("the column {name} stands twice"));
            }
        }
        let find = |wanted: &str| names.iter().position(|&name| name == wanted);
        let pressure = find(PRESSURE).map(|place| (Axis::Pressure, place));
        let mass_fraction = find(MASS_FRACTION).map(|place| (Axis::MassFraction, place));
        if pressure.is_some() && mass_fraction.is_some() {
            let detail = format!("{PRESSURE} and {MASS_FRACTION} cannot stand in one table");
            faults.add(line, detail);
        }
        let mut place = |wanted: &str| {
            find(wanted).unwrap_or_else(|| {
                faults.add(line, format!("the column {wanted} is missing"));
                names.len()
            })
        };
        let columns = Self {
            count: names.len(),
            temperature: place(TEMPERATURE),
            layer: pressure.or(mass_fraction),
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
        let mut read = |name: &str, cell: &str, kind: Number| {
            kind.read(cell).unwrap_or_else(|| {
                let wanted = kind.wanted();
                faults.add(line, format!("{name} is {wanted}, not \"{cell}\""));
                f64::NAN
            })
        };
        Some(Row {
            line,
            temperature: read(TEMPERATURE, cells[self.temperature], Number::Positive),
            layer: self.layer.map(|(axis, place)| match axis {
                Axis::Pressure => read(PRESSURE, cells[place], Number::Positive),
                Axis::MassFraction => read(MASS_FRACTION, cells[place], Number::Fraction),
            }),
            values: std::array::from_fn(|index| {
                let property = &PROPERTIES[index];
                let kind = if property.signed {
                    Number::Signed
                } else {
                    Number::Positive
                };
                read(property.name, cells[self.properties[index]], kind)
            }),
            saturation: self
                .saturation
                .map(|place| cells[place])
                .filter(|cell| !cell.is_empty())
                .map(|cell| read(SATURATION, cell, Number::Positive)),
        })
    }
}

/// The numbers that a column takes.
#[derive(Clone, Copy)]
enum Number {
    Positive,
    Signed,
    Fraction,
}

impl Number {
    fn read(self, cell: &str) -> Option<f64> {
        let number = cell.parse().ok()?;
        let fits = match self {
            Self::Positive => PLAUSIBLE.contains(&number),
            Self::Signed => number.abs() <= *PLAUSIBLE.end(),
            Self::Fraction => (0.0..=1.0).contains(&number),
        };
        fits.then_some(number)
    }

    fn wanted(self) -> &'static str {
        match self {
            Self::Positive => "a positive number, 1e-12 to 1e12",
            Self::Signed => "a number up to 1e12",
            Self::Fraction => "a number from 0 to 1",
        }
    }
}

/// A positive number of plausible size.
pub(super) fn positive(text: &str) -> Option<f64> {
    Number::Positive.read(text)
}
