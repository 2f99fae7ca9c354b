//! Published figures of `fixtures/checks`, each through the whole path from request to answer.
//!
//! A file is `{"about": text, "checks": [check, ...]}`. A check is
//!
//! - `id`: its name, unlike every other;
//! - `source`: where the figures stand, in words;
//! - `read`: how they came here: `found` in public text, from `memory`, `common practice`, or
//!   `computed` by a solution or a program of our own that shares nothing with the service;
//! - `request`, as `POST /v1/film` takes it, or `formula`: a method with the groups that it is
//!   entered with;
//! - `against`, optional: a second one of the same form; then all figures are the first's over
//!   the second's;
//! - `expect`: a list of figures. Each names a `figure` (a column or property of an answer, for
//!   a formula `nusselt`), the published `value`, a tolerance (`absolute` or `relative`) and
//!   the `reason` for it. `unit` is the value's where it is not SI, `per` divides by another
//!   figure of the same answer. `deviation` is how far, as a fraction of the published value,
//!   the figure is known to lie from it; the reason names the cause, and the tolerance is then
//!   about the figure that the deviation leads to. A `value` that is a text is a word of the
//!   answer and takes nothing else.
//!
//! The method that a check speaks of is the formula's, else the request's, else the expected
//! `method`; every check has one.

use std::collections::HashSet;
use std::fs;
use std::path::PathBuf;

use plumeline::case::{Answer, Cell, Column, PROPERTIES, answer_kinds};
use plumeline::methods::{Groups, MethodId};
use plumeline::quantity::Unit;
use serde::Deserialize;
use serde_json::Value;

use super::support::{Request, outcome, read, request};

/// As many checks as stood here when this was written; a lost file shows.
const FEWEST_CHECKS: usize = 330;

/// How a figure can have come here.
const READINGS: [&str; 4] = ["found", "memory", "common practice", "computed"];

#[derive(Deserialize)]
#[serde(deny_unknown_fields)]
struct File {
    about: String,
    checks: Vec<Check>,
}

#[derive(Deserialize)]
#[serde(deny_unknown_fields)]
struct Check {
    id: String,
    source: String,
    read: String,
    request: Option<Value>,
    formula: Option<Value>,
    against: Option<Value>,
    expect: Vec<Expectation>,
}

#[derive(Deserialize)]
#[serde(deny_unknown_fields)]
struct Expectation {
    figure: String,
    per: Option<String>,
    unit: Option<String>,
    value: Value,
    deviation: Option<f64>,
    absolute: Option<f64>,
    relative: Option<f64>,
    reason: Option<String>,
}

#[derive(Deserialize)]
#[serde(deny_unknown_fields)]
struct Formula {
    method: String,
    rayleigh: f64,
    prandtl: f64,
    #[serde(default)]
    tilt: f64,
    #[serde(default)]
    slenderness: f64,
    #[serde(default)]
    length_ratio: f64,
    #[serde(default)]
    aspect: f64,
    #[serde(default)]
    block_length: f64,
    #[serde(default)]
    block_width: f64,
    #[serde(default)]
    block_height: f64,
    #[serde(default)]
    heated_walls: f64,
}

/// What a figure is read from.
enum Subject {
    Answer(Box<Answer>),
    Nusselt(f64, MethodId),
}

#[test]
fn published_figures_are_met() {
    let mut failures = Vec::new();
    let mut ids = HashSet::new();
    let mut checks = 0;
    for (name, file) in files() {
        if file.about.is_empty() {
            failures.push(format!("{name}: about nothing"));
        }
        for check in &file.checks {
            checks += 1;
            if !ids.insert(check.id.clone()) {
                failures.push(format!("{name}: {} stands twice", check.id));
            }
            let found = check.failures();
            failures.extend(
                found
                    .iter()
                    .map(|failure| format!("{name}: {}: {failure}", check.id)),
            );
        }
    }
    assert!(
        failures.is_empty(),
        "{} failures\n{}",
        failures.len(),
        failures.join("\n")
    );
    assert!(checks >= FEWEST_CHECKS, "only {checks} checks");
}

#[test]
fn every_method_has_a_check() {
    let files = files();
    let checked: HashSet<&str> = files
        .iter()
        .flat_map(|(_, file)| &file.checks)
        .filter_map(Check::method)
        .collect();
    let ids = MethodId::TEXTS.iter();
    let missing: Vec<_> = ids.filter(|id| !checked.contains(**id)).collect();
    assert!(missing.is_empty(), "{missing:?}");
}

fn files() -> Vec<(String, File)> {
    let folder = PathBuf::from(env!("CARGO_MANIFEST_DIR")).join("fixtures/checks");
    let mut paths: Vec<PathBuf> = fs::read_dir(&folder)
        .expect("the folder of checks")
        .map(|entry| entry.expect("an entry of the folder").path())
        .collect();
    paths.sort();
    paths
        .iter()
        .map(|path| {
            let text = fs::read_to_string(path).expect("a readable file");
            let file = serde_json::from_str(&text)
                .unwrap_or_else(|error| panic!("{}: {error}", path.display()));
            let name = path.file_name().expect("a file's name").to_string_lossy();
            (name.into_owned(), file)
        })
        .collect()
}

impl Check {
    fn failures(&self) -> Vec<String> {
        let mut failures = Vec::new();
        if self.source.is_empty() || self.expect.is_empty() {
            failures.push("no source or nothing expected".to_owned());
        }
        if !READINGS.contains(&self.read.as_str()) {
            failures.push(format!("read {}", self.read));
        }
        let subjects = self.subject().and_then(|subject| {
            let against = self.against.as_ref();
            Ok((
                subject,
                against.map(|value| self.evaluate(value)).transpose()?,
            ))
        });
        let (subject, against) = match subjects {
            Ok(subjects) => subjects,
            Err(failure) => {
                failures.push(failure);
                return failures;
            }
        };
        if self.method() != Some(subject.method().as_str()) {
            failures.push(format!(
                "the check speaks of {:?}, answered by {}",
                self.method(),
                subject.method().as_str()
            ));
        }
        for expected in &self.expect {
            let outcome = expected
                .is_complete()
                .and_then(|()| expected.compare(&subject, against.as_ref()));
            if let Err(failure) = outcome {
                failures.push(format!("{}: {failure}", expected.figure));
            }
        }
        failures
    }

    /// The method that the check speaks of, without evaluating it.
    fn method(&self) -> Option<&str> {
        let subject = self.formula.as_ref().or(self.request.as_ref())?;
        let mut expected = self.expect.iter();
        match subject.get("method") {
            Some(method) => method.as_str(),
            None => expected
                .find(|expected| expected.figure == "method")?
                .value
                .as_str(),
        }
    }

    fn subject(&self) -> Result<Subject, String> {
        match (&self.request, &self.formula) {
            (Some(value), None) | (None, Some(value)) => self.evaluate(value),
            _ => Err("neither or both of request and formula".to_owned()),
        }
    }

    fn evaluate(&self, value: &Value) -> Result<Subject, String> {
        if self.formula.is_some() {
            let formula: Formula =
                serde_json::from_value(value.clone()).map_err(|error| error.to_string())?;
            formula.evaluate()
        } else {
            answer(&request(value.clone()))
        }
    }
}

fn answer(request: &Request) -> Result<Subject, String> {
    let case = read(request).map_err(|faults| format!("{faults:?}"))?;
    let answer = outcome(&case).map_err(|failure| format!("{failure:?}"))?;
    Ok(Subject::Answer(Box::new(answer)))
}

impl Formula {
    fn evaluate(&self) -> Result<Subject, String> {
        let id = MethodId::from_text(&self.method)
            .ok_or_else(|| format!("no method {}", self.method))?;
        let groups = Groups {
            rayleigh: self.rayleigh,
            prandtl: self.prandtl,
            tilt: self.tilt,
            slenderness: self.slenderness,
            length_ratio: self.length_ratio,
            aspect: self.aspect,
            block_length: self.block_length,
            block_width: self.block_width,
            block_height: self.block_height,
            heated_walls: self.heated_walls,
        };
        Ok(Subject::Nusselt((id.method().nusselt)(&groups), id))
    }
}

impl Subject {
    fn method(&self) -> MethodId {
        match self {
            Subject::Answer(answer) => answer.method,
            Subject::Nusselt(_, id) => *id,
        }
    }

    fn number(&self, figure: &str) -> Result<f64, String> {
        match self {
            Subject::Nusselt(nusselt, _) if figure == "nusselt" => Ok(*nusselt),
            Subject::Nusselt(..) => Err("a formula has only a nusselt".to_owned()),
            Subject::Answer(answer) => {
                if let Some(property) = PROPERTIES.iter().find(|known| known.name == figure) {
                    return Ok((property.of)(&answer.state));
                }
                match cell(answer, figure)? {
                    Cell::Number(Some(number)) => Ok(number),
                    other => Err(format!("no number but {other:?}")),
                }
            }
        }
    }

    fn word(&self, figure: &str) -> Result<&'static str, String> {
        match self {
            Subject::Nusselt(..) => Err("a formula has no words".to_owned()),
            Subject::Answer(answer) => match cell(answer, figure)? {
                Cell::Word(word) => Ok(word),
                other => Err(format!("no word but {other:?}")),
            },
        }
    }
}

fn cell(answer: &Answer, figure: &str) -> Result<Cell, String> {
    let column = Column::from_name(figure).ok_or("no such figure")?;
    Ok((column.entry().cell)(answer))
}

fn unit(figure: &str, symbol: &str) -> Result<Unit, String> {
    let kind = answer_kinds().find(|(name, _)| *name == figure);
    let (_, kind) = kind.ok_or("no such figure")?;
    Unit::find(kind, symbol).map_err(|error| error.to_string())
}

impl Expectation {
    /// A number wants exactly one tolerance and a reason, a word neither.
    fn is_complete(&self) -> Result<(), String> {
        let tolerances = [self.absolute, self.relative];
        let given: Vec<f64> = tolerances.into_iter().flatten().collect();
        let reason = self.reason.as_deref().unwrap_or_default();
        let complete = if self.value.is_string() {
            let others = [&self.per, &self.unit, &self.reason];
            given.is_empty() && self.deviation.is_none() && others.iter().all(|o| o.is_none())
        } else {
            given.len() == 1 && given[0] > 0.0 && !reason.is_empty()
        };
        if complete && self.deviation != Some(0.0) {
            Ok(())
        } else {
            Err("tolerance, reason or deviation do not go together".to_owned())
        }
    }

    fn compare(&self, subject: &Subject, against: Option<&Subject>) -> Result<(), String> {
        if let Some(expected) = self.value.as_str() {
            let found = subject.word(&self.figure)?;
            return if found == expected {
                Ok(())
            } else {
                Err(format!("{found} instead of {expected}"))
            };
        }
        let value = self.value.as_f64().ok_or("the value is no number")?;
        let mut found = self.figure_of(subject)?;
        if let Some(symbol) = &self.unit {
            found = unit(&self.figure, symbol)?.from_si(found);
        }
        if let Some(against) = against {
            found /= self.figure_of(against)?;
        }
        let expected = value * (1.0 + self.deviation.unwrap_or(0.0));
        let tolerance = match self.relative {
            Some(relative) => relative * expected.abs(),
            None => self.absolute.ok_or("no tolerance")?,
        };
        if (found - expected).abs() <= tolerance {
            Ok(())
        } else {
            Err(format!(
                "{found} instead of {expected} within {tolerance} ({:+.4} of the published {value})",
                found / value - 1.0
            ))
        }
    }

    fn figure_of(&self, subject: &Subject) -> Result<f64, String> {
        let figure = subject.number(&self.figure)?;
        match &self.per {
            Some(per) => Ok(figure / subject.number(per)?),
            None => Ok(figure),
        }
    }
}
