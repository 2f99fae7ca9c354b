//! From the text of a table to a fluid.

use super::fault::{Faults, TableFault};
use super::fluid::Fluid;
use super::grid::Grid;
use super::header::{self, Header, PressureText};
use super::pressure::PressureRule;
use super::rows::{self, Body, Row};
use super::saturation::Saturation;
use super::state::Phase;
use super::table::{Layer, Table};

/// The fewest rows that show how a property bends.
const FEWEST_ROWS: usize = 3;

/// The most pressure layers: polynomials of a higher degree begin to swing.
const MOST_LAYERS: usize = 8;

/// The least ratio of the pressures of neighbouring layers: closer ones magnify rounding.
const LAYER_RATIO: f64 = 1.05;

/// The fluid that a text describes, see [`Fluid::read`].
pub(super) fn fluid(text: &str) -> Result<Fluid, Vec<TableFault>> {
    let text = text.strip_prefix('\u{feff}').unwrap_or(text);
    match (header::header(text), rows::body(text)) {
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
        .chunk_by(|row, next| row.pressure == next.pressure)
        .collect();
    let mut faults = Faults::default();
    check_rows(body.line, &layers, &mut faults);
    check_saturation(body, &mut faults);
    let rule = pressure_rule(&header, body, &mut faults);
    let rule = faults.or(rule)?;

    let phase = header.description.phase;
    let grid = Grid::new(layers[0].iter().map(|row| row.temperature).collect());
    let layers = layers.iter().map(|rows| {
        let values: Vec<_> = rows.iter().map(|row| row.values).collect();
        let pressure = rows[0].pressure.unwrap_or(rule.reference());
        Layer::new(phase, grid.nodes(), pressure, &values)
    });
    let table = Table::new(phase, layers.collect());
    if !table.stays_positive() {
        let mut faults = Faults::default();
        let detail = "the properties differ too much from layer to layer to be blended";
        faults.add(body.line, detail);
        return faults.or(None);
    }
    let density_maximum = density_maximum(&grid, &table, rule.reference());
    let saturation: Vec<f64> = body.rows.iter().map_while(|row| row.saturation).collect();
    Ok(Fluid {
        description: header.description,
        pressure_rule: rule,
        table,
        saturation: (!saturation.is_empty()).then(|| Saturation::new(grid.nodes(), saturation)),
        density_maximum,
        grid,
    })
}

/// The first temperature at which the expansion rises through zero, by halving until the interval is lost in rounding.
fn density_maximum(grid: &Grid, table: &Table, pressure: f64) -> Option<f64> {
    let expansion = |temperature: f64| {
        let position = grid.locate(temperature)?;
        Some(table.state(position, temperature, pressure).expansion)
    };
    let crosses = |pair: &&[f64]| {
        let ends = expansion(pair[0]).zip(expansion(pair[1]));
        ends.is_some_and(|(low, high)| low < 0.0 && high > 0.0)
    };
    let interval = grid.nodes().windows(2).find(crosses)?;
    let (mut low, mut high) = (interval[0], interval[1]);
    for _ in 0..64 {
        let middle = 0.5 * (low + high);
        if expansion(middle)? < 0.0 {
            low = middle;
        } else {
            high = middle;
        }
    }
    Some(low)
}

/// Enough rows; rising pressures, and at each the same rising temperatures.
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
    if layers.len() > MOST_LAYERS {
        faults.add(
            line,
            format!("a table has at most {MOST_LAYERS} pressures, each in one run of rows"),
        );
    }
    for pair in layers.windows(2) {
        let (previous, row) = (&pair[0][0], &pair[1][0]);
        let rises = row.pressure.zip(previous.pressure);
        if rises.is_none_or(|(pressure, previous)| pressure < LAYER_RATIO * previous) {
            faults.add(
                row.line,
                "pressures must rise from layer to layer by at least 5 %",
            );
        }
    }
    for layer in layers.iter().skip(1) {
        let temperatures =
            |rows: &[Row]| rows.iter().map(|row| row.temperature).collect::<Vec<_>>();
        if temperatures(layer) != temperatures(first) {
            faults.add(
                layer[0].line,
                "every pressure must have the first one's temperatures",
            );
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
    if last.pressure.is_some() {
        faults.add(
            body.line,
            "saturation pressures do not suit a table with a column of pressures",
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

/// The rule that the header names, if it suits the phase and the columns.
fn pressure_rule(header: &Header, body: &Body, faults: &mut Faults) -> Option<PressureRule> {
    let first = body.rows.first()?;
    let last = body.rows.last()?;
    let rule = match (header.pressure, first.pressure.zip(last.pressure)) {
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

#[cfg(test)]
mod tests {
    use super::fluid;

    const COLUMNS: &str = "temperature [K],density [kg/m3],specific_heat [J/(kg K)],\
                           viscosity [Pa s],conductivity [W/(m K)],expansion [1/K]";

    /// Faults of a text, as `line: detail`.
    fn faults(text: &str) -> Vec<String> {
        let faults = fluid(text).err().unwrap_or_default();
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
        assert_eq!(
            super::rows::body("# id: x\n").err().map(|f| f.len()),
            Some(1)
        );
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
        assert!(layered(high.clone() + &low)[0].contains("pressures must rise"));
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
        let fluid = fluid(&ideal_gas(steep)).expect("each number is plausible by itself");
        for temperature in [1e-12, 1.5e-12, 2e-12, 1.0, 1e6, 1e12] {
            let state = fluid.state(temperature, 1e5).expect("inside");
            assert!(state.density > 0.0 && state.density.is_finite());
            assert!(state.expansion.is_finite() && state.prandtl().is_finite());
        }
    }
}
