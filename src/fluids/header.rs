//! The `# key: value` lines of a table.

use super::fault::{Faults, TableFault};
use super::fluid::{Description, StatedError};
use super::pressure::PressureRule;
use super::rows::positive;
use super::state::Phase;
use super::table::PROPERTIES;

/// The one key that may stand any number of times.
const NOTE: &str = "note";

/// Keys that may stand once.
const KEYS: [&str; 11] = [
    "id",
    "name",
    "composition",
    "phase",
    "source",
    "pressure rule",
    "freezing",
    "flash point",
    "interpolation error",
    "pressure error",
    "expansion error floor",
];

/// What the header of a table says.
pub(super) struct Header {
    pub(super) description: Description,
    pub(super) composition: CompositionText,
    pub(super) pressure: PressureText,
}

/// The composition as written: the fractions of layers stand in the rows.
pub(super) enum CompositionText {
    Pure,
    MassFraction { of: String },
    Humidity,
}

/// The pressure rule as written: the pressures of layers stand in the rows.
#[derive(Clone, Copy)]
pub(super) enum PressureText {
    Layers,
    Rule(PressureRule),
}

/// The header of a table with this digest, or all its faults.
pub(super) fn header(text: &str, digest: String) -> Result<Header, Vec<TableFault>> {
    let mut entries = Entries::new(text);
    let id = entries.required("id", id);
    let name = entries.required("name", words);
    let phase = entries.required("phase", phase);
    let source = entries.required("source", words);
    let pressure = entries.required("pressure rule", pressure);
    let composition = entries.optional("composition", composition);
    let freezing = entries.optional("freezing", freezing);
    let flash_point = entries.optional("flash point", |value| quantity(value, "K"));
    let interpolation_error = entries.optional("interpolation error", stated_error);
    let pressure_error = entries.optional("pressure error", stated_error);
    let expansion_error_floor =
        entries.optional("expansion error floor", |value| quantity(value, "1/K"));
    let Entries { notes, faults, .. } = entries;
    let header = match (id, name, phase, source, pressure) {
        (Some(id), Some(name), Some(phase), Some(source), Some(pressure)) => Some(Header {
            description: Description {
                id,
                name,
                phase,
                source,
                notes,
                freezing: freezing.unwrap_or_default(),
                flash_point,
                interpolation_error,
                pressure_error,
                expansion_error_floor,
                digest,
            },
            composition: composition.unwrap_or(CompositionText::Pure),
            pressure,
        }),
        _ => None,
    };
    faults.or(header)
}

struct Entry<'a> {
    line: usize,
    key: &'a str,
    value: &'a str,
}

struct Entries<'a> {
    entries: Vec<Entry<'a>>,
    notes: Vec<String>,
    faults: Faults,
}

impl<'a> Entries<'a> {
    fn new(text: &'a str) -> Self {
        let mut entries = Self {
            entries: Vec::new(),
            notes: Vec::new(),
            faults: Faults::default(),
        };
        for (line, text) in (1..).zip(text.lines()) {
            if let Some(comment) = text.strip_prefix('#') {
                entries.add(line, comment);
            }
        }
        entries
    }

    fn add(&mut self, line: usize, comment: &'a str) {
        let Some((key, value)) = comment.split_once(':') else {
            let detail = "a line that begins with # has the form \"# key: value\"";
            return self.faults.add(line, detail);
        };
        let (key, value) = (key.trim(), value.trim());
        if key == NOTE {
            self.notes.push(value.to_owned());
        } else if let Some(first) = self.entries.iter().find(|entry| entry.key == key) {
            let detail = format!("\"{key}\" stands on line {} already", first.line);
            self.faults.add(line, detail);
        } else if KEYS.contains(&key) {
            self.entries.push(Entry { line, key, value });
        } else {
            let known = KEYS.join(", ");
            self.faults.add(
                line,
                format!("unknown key \"{key}\"; the keys are {known}, {NOTE}"),
            );
        }
    }

    /// A key's value; a fault and none if it cannot be read.
    fn optional<T>(&mut self, key: &str, read: impl Fn(&str) -> Result<T, String>) -> Option<T> {
        let entry = self.entries.iter().find(|entry| entry.key == key)?;
        let (line, value) = (entry.line, entry.value);
        read(value)
            .map_err(|wanted| {
                self.faults
                    .add(line, format!("\"{key}\" is {wanted}, not \"{value}\""))
            })
            .ok()
    }

    /// A key's value; a fault and none if it is missing or cannot be read.
    fn required<T>(&mut self, key: &str, read: impl Fn(&str) -> Result<T, String>) -> Option<T> {
        if !self.entries.iter().any(|entry| entry.key == key) {
            self.faults
                .add(1, format!("the header lacks \"# {key}: …\""));
        }
        self.optional(key, read)
    }
}

fn id(value: &str) -> Result<String, String> {
    let letters = |c: char| c.is_ascii_lowercase() || c.is_ascii_digit() || c == '-';
    if value.starts_with(|c: char| c.is_ascii_lowercase()) && value.chars().all(letters) {
        Ok(value.to_owned())
    } else {
        Err("lower-case letters, digits and hyphens, a letter first".to_owned())
    }
}

fn words(value: &str) -> Result<String, String> {
    if value.is_empty() {
        Err("a few words".to_owned())
    } else {
        Ok(value.to_owned())
    }
}

fn phase(value: &str) -> Result<Phase, String> {
    [Phase::Gas, Phase::Liquid]
        .into_iter()
        .find(|phase| phase.name() == value)
        .ok_or_else(|| "gas or liquid".to_owned())
}

/// A positive number followed by this unit.
fn quantity(value: &str, unit: &str) -> Result<f64, String> {
    value
        .strip_suffix(unit)
        .and_then(|number| positive(number.trim()))
        .ok_or_else(|| format!("a positive number of {unit}"))
}

fn composition(value: &str) -> Result<CompositionText, String> {
    match value.strip_prefix("mass fraction of ") {
        Some(of) => words(of.trim()).map(|of| CompositionText::MassFraction { of }),
        None if value == "humidity" => Ok(CompositionText::Humidity),
        None => Err("\"humidity\" or \"mass fraction of …\"".to_owned()),
    }
}

/// One freezing point, or as many as a mixture has layers.
fn freezing(value: &str) -> Result<Vec<f64>, String> {
    value
        .split(',')
        .map(|part| quantity(part.trim(), "K"))
        .collect()
}

fn pressure(value: &str) -> Result<PressureText, String> {
    if value == "layers" {
        return Ok(PressureText::Layers);
    }
    pressure_rule(value).map(PressureText::Rule).ok_or_else(|| {
        "\"layers\", \"ideal-gas at 101325 Pa, 50000 to 200000 Pa\", \
         \"incompressible at 101325 Pa, 50000 to 2000000 Pa\" or \
         \"along-saturation at 101325 Pa, 2000000 Pa above\", with the first pressure in the range"
            .to_owned()
    })
}

fn pressure_rule(value: &str) -> Option<PressureRule> {
    let (word, pressures) = value.split_once(" at ")?;
    let (reference, rest) = pressures.split_once(',')?;
    let reference = quantity(reference, "Pa").ok()?;
    if word == "along-saturation" {
        let headroom = quantity(rest.strip_suffix("above")?.trim(), "Pa").ok()?;
        return Some(PressureRule::AlongSaturation {
            reference,
            headroom,
        });
    }
    let (minimum, maximum) = rest.split_once(" to ")?;
    let minimum = positive(minimum.trim())?;
    let maximum = quantity(maximum, "Pa").ok()?;
    if !(minimum..=maximum).contains(&reference) {
        return None;
    }
    match word {
        "ideal-gas" => Some(PressureRule::IdealGas {
            reference,
            minimum,
            maximum,
        }),
        "incompressible" => Some(PressureRule::Incompressible {
            reference,
            minimum,
            maximum,
        }),
        _ => None,
    }
}

/// Fractions by property, in the order of the columns.
fn stated_error(value: &str) -> Result<StatedError, String> {
    let fractions: Vec<f64> = value
        .split(',')
        .zip(PROPERTIES)
        .filter_map(|(part, property)| positive(part.trim().strip_prefix(property.name)?.trim()))
        .collect();
    match *fractions.as_slice() {
        [density, specific_heat, viscosity, conductivity, expansion]
            if value.split(',').count() == PROPERTIES.len() =>
        {
            Ok(StatedError {
                density,
                specific_heat,
                viscosity,
                conductivity,
                expansion,
            })
        }
        _ => {
            let wanted = PROPERTIES.map(|property| format!("{} 0.001", property.name));
            Err(format!("fractions such as \"{}\"", wanted.join(", ")))
        }
    }
}
