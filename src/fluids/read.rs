//! From the text of a table to a fluid.

use crate::digest::sha256;

use super::conditions::{Composition, Conditions};
use super::density_maximum::{self, DensityMaximum};
use super::fault::{Faults, TableFault};
use super::fluid::{Description, Fluid};
use super::grid::Grid;
use super::header::{self, CompositionText, Header, PressureText};
use super::pressure::PressureRule;
use super::rows::{self, Body, Row};
use super::saturation::Saturation;
use super::state::Phase;
use super::table::{Axis, EXPANSION, Layer, Table};

/// The fewest rows that show how a property bends.
const FEWEST_ROWS: usize = 3;

/// The most layers: polynomials of a higher degree begin to swing.
const MOST_LAYERS: usize = 8;

/// The least ratio of the pressures of neighbouring layers: closer ones magnify rounding.
const LAYER_RATIO: f64 = 1.05;

/// The least difference between the mass fractions of neighbouring layers, as for pressures.
const LAYER_STEP: f64 = 0.01;

/// The fluid that a text describes, see [`Fluid::read`].
pub(super) fn fluid(text: &str) -> Result<Fluid, Vec<TableFault>> {
    let digest = sha256(text.as_bytes());
    let text = text.strip_prefix('\u{feff}').unwrap_or(text);
    match (header::header(text, digest), rows::body(text)) {
        (Ok(header), Ok(body)) => assemble(header, &body),
        (header, body) => {
            let mut faults = header.err().unwrap_or_default();
            faults.extend(body.err().unwrap_or_default());
            Err(faults)
        }
    }
}

fn assemble(header: Header, body: &Body) -> Result<Fluid, Vec<TableFault>> {
    let layers: Vec<&[Row]> = body
        .rows
        .chunk_by(|row, next| row.layer == next.layer)
        .collect();
    let mut faults = Faults::default();
    check_rows(body.line, &layers, &mut faults);
    check_layers(body, &layers, &mut faults);
    check_saturation(body, &mut faults);
    check_freezing(&header.description, body, &layers, &mut faults);
    let composition = composition(&header, body, &mut faults);
    let rule = pressure_rule(&header, body, &mut faults);
    let (composition, rule) = faults.or(composition.zip(rule))?;

    let phase = header.description.phase;
    let grid = Grid::new(layers[0].iter().map(|row| row.temperature).collect());
    let by_layer = layers.iter().map(|rows| {
        let values: Vec<_> = rows.iter().map(|row| row.values).collect();
        let place = rows[0].layer.unwrap_or(rule.reference());
        Layer::new(phase, grid.nodes(), place, &values)
    });
    let table = Table::new(
        phase,
        body.axis.unwrap_or(Axis::Pressure),
        by_layer.collect(),
    );
    if !table.stays_positive() {
        let mut faults = Faults::default();
        let detail = "the properties differ too much from layer to layer to be blended";
        faults.add(body.line, detail);
        return faults.or(None);
    }
    let density_maximum = match composition {
        Composition::MassFraction { .. } if turns_round(&header.description, &layers) => {
            DensityMaximum::ByComposition
        }
        Composition::MassFraction { .. } => DensityMaximum::None,
        Composition::Pure | Composition::Humidity => {
            let conditions = Conditions::pure(rule.reference());
            density_maximum::search(&grid, &table, &conditions, grid.minimum())
                .map_or(DensityMaximum::None, DensityMaximum::At)
        }
    };
    let saturation: Vec<f64> = body.rows.iter().map_while(|row| row.saturation).collect();
    Ok(Fluid {
        description: header.description,
        composition,
        pressure_rule: rule,
        table,
        saturation: (!saturation.is_empty()).then(|| Saturation::new(grid.nodes(), saturation)),
        density_maximum,
        expansion_is_rough: false,
        grid,
    })
}

/// Whether a mixture contracts on heating anywhere that it is not frozen.
fn turns_round(description: &Description, layers: &[&[Row]]) -> bool {
    layers.iter().enumerate().any(|(index, rows)| {
        let freezing = description.freezing.get(index).copied().unwrap_or(0.0);
        rows.iter()
            .any(|row| row.temperature >= freezing && row.values[EXPANSION] < 0.0)
    })
}

/// Enough rows, with rising temperatures.
fn check_rows(line: usize, layers: &[&[Row]], faults: &mut Faults) {
    let first = layers.first().copied().unwrap_or_default();
    if first.len() < FEWEST_ROWS {
        faults.add(line, format!("a table has at least {FEWEST_ROWS} rows"));
    }
    for pair in first.windows(2) {
        if pair[1].temperature <= pair[0].temperature {
            faults.add(pair[1].line, "temperatures must rise from row to row");
        }
    }
}

/// Rising pressures or mass fractions, and at each the same temperatures.
fn check_layers(body: &Body, layers: &[&[Row]], faults: &mut Faults) {
    let (what, step) = match body.axis {
        Some(Axis::MassFraction) => ("mass fraction", "0.01"),
        _ => ("pressure", "5 %"),
    };
    if layers.len() > MOST_LAYERS {
        faults.add(
            body.line,
            format!("a table has at most {MOST_LAYERS} layers, each {what} in one run of rows"),
        );
    }
    for pair in layers.windows(2) {
        let (previous, row) = (&pair[0][0], &pair[1][0]);
        let least = |previous: f64| match body.axis {
            Some(Axis::MassFraction) => previous + LAYER_STEP,
            _ => previous * LAYER_RATIO,
        };
        let places = row.layer.zip(previous.layer);
        if places.is_none_or(|(place, previous)| place < least(previous)) {
            let detail = format!("each {what} must lie at least {step} above the one before");
            faults.add(row.line, detail);
        }
    }
    let temperatures = |rows: &[Row]| rows.iter().map(|row| row.temperature).collect::<Vec<_>>();
    for pair in layers.windows(2) {
        if temperatures(pair[1]) != temperatures(layers[0]) {
            let detail = format!("every {what} must have the first one's temperatures");
            faults.add(pair[1][0].line, detail);
        }
    }
}

/// None, or rising ones on the leading rows of a table at one pressure.
fn check_saturation(body: &Body, faults: &mut Faults) {
    let rows: Vec<&Row> = body
        .rows
        .iter()
        .filter(|row| row.saturation.is_some())
        .collect();
    let Some(last) = rows.last() else { return };
    if last.layer.is_some() {
        faults.add(
            body.line,
            "saturation pressures do not suit a table with layers",
        );
    }
    if rows.len() < FEWEST_ROWS {
        faults.add(
            body.line,
            format!("at least {FEWEST_ROWS} saturation pressures are needed"),
        );
    }
    if body
        .rows
        .iter()
        .take(rows.len())
        .any(|row| row.saturation.is_none())
    {
        faults.add(
            last.line,
            "saturation pressures must stand on the leading rows, without a gap",
        );
    }
    for pair in rows.windows(2) {
        if pair[1].saturation <= pair[0].saturation {
            faults.add(
                pair[1].line,
                "saturation pressures must rise from row to row",
            );
        }
    }
}

/// A mixture has a freezing point for every layer or none, other fluids have one at most.
fn check_freezing(description: &Description, body: &Body, layers: &[&[Row]], faults: &mut Faults) {
    let found = description.freezing.len();
    let most = match body.axis {
        Some(Axis::MassFraction) => layers.len(),
        _ => 1,
    };
    if found != 0 && found != most {
        let detail = format!("{found} freezing points stand where {most} would do");
        faults.add(body.line, detail);
    }
}

/// The composition that the header names, if it suits the phase and the columns.
fn composition(header: &Header, body: &Body, faults: &mut Faults) -> Option<Composition> {
    let first = body.rows.first()?;
    let last = body.rows.last()?;
    let fractions = match body.axis {
        Some(Axis::MassFraction) => first.layer.zip(last.layer),
        _ => None,
    };
    let phase = header.description.phase;
    match (&header.composition, fractions, phase) {
        (CompositionText::Pure, None, _) => Some(Composition::Pure),
        (CompositionText::Humidity, None, Phase::Gas) => Some(Composition::Humidity),
        (CompositionText::MassFraction { of }, Some((minimum, maximum)), Phase::Liquid) => {
            Some(Composition::MassFraction {
                of: of.clone(),
                minimum,
                maximum,
            })
        }
        _ => {
            faults.add(
                body.line,
                "a composition by mass fraction is for a liquid and needs a column mass_fraction [1], \
                 which nothing else has; humidity is for a gas",
            );
            None
        }
    }
}

/// The rule that the header names, if it suits the phase and the columns.
fn pressure_rule(header: &Header, body: &Body, faults: &mut Faults) -> Option<PressureRule> {
    let first = body.rows.first()?;
    let last = body.rows.last()?;
    let pressures = match body.axis {
        Some(Axis::Pressure) => first.layer.zip(last.layer),
        _ => None,
    };
    let rule = match (header.pressure, pressures) {
        (PressureText::Layers, Some((minimum, maximum))) => {
            PressureRule::Layers { minimum, maximum }
        }
        (PressureText::Rule(rule), None) => rule,
        (PressureText::Layers, None) => {
            faults.add(
                body.line,
                "the pressure rule layers needs a column pressure [Pa]",
            );
            return None;
        }
        (PressureText::Rule(rule), Some(_)) => {
            let detail = format!(
                "the pressure rule {} has no use for a column of pressures",
                rule.name()
            );
            faults.add(body.line, detail);
            return None;
        }
    };
    let phase = header.description.phase;
    let suits = match rule {
        PressureRule::Layers { .. } | PressureRule::IdealGas { .. } => phase == Phase::Gas,
        PressureRule::Incompressible { .. } => phase == Phase::Liquid,
        PressureRule::AlongSaturation { .. } => {
            phase == Phase::Liquid && body.rows.iter().all(|row| row.saturation.is_some())
        }
    };
    if !suits {
        let detail = format!(
            "the pressure rule {} does not suit this table: layers and ideal-gas are for a gas, \
             incompressible for a liquid, along-saturation for a liquid with a saturation pressure on every row",
            rule.name()
        );
        faults.add(body.line, detail);
    }
    Some(rule)
}
