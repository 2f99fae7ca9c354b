//! How each method was checked: the tests' own fixtures, embedded.

use std::collections::HashMap;
use std::sync::LazyLock;

use include_dir::{Dir, include_dir};
use serde::Deserialize;
use serde_json::Value;

use super::MethodId;

static FIXTURES: Dir = include_dir!("$CARGO_MANIFEST_DIR/fixtures/checks");

/// One figure that a method was checked against.
#[derive(Clone, Debug, PartialEq)]
pub struct Evidence {
    /// The check's name in `fixtures/checks`.
    pub check: String,
    /// Where the figure stands.
    pub source: String,
    /// How it came here: found in public text, from memory, common practice, or computed without this service.
    pub read: String,
    /// What it is.
    pub figure: String,
    /// The published value; of two cases' ratio where the check compares two.
    pub value: f64,
    /// How far the service is known to lie from it, a fraction.
    pub deviation: f64,
    /// The cause of the deviation and of the tolerance.
    pub reason: String,
}

#[derive(Deserialize)]
struct File {
    checks: Vec<Check>,
}

#[derive(Deserialize)]
struct Check {
    id: String,
    source: String,
    read: String,
    request: Option<Value>,
    formula: Option<Value>,
    expect: Vec<Expectation>,
}

#[derive(Deserialize)]
struct Expectation {
    figure: String,
    value: Value,
    #[serde(default)]
    deviation: f64,
    #[serde(default)]
    reason: String,
}

/// The figures that a method was checked against, in the order of the files; the tests prove every one of them.
pub fn evidence(id: MethodId) -> &'static [Evidence] {
    static EVIDENCE: LazyLock<HashMap<MethodId, Vec<Evidence>>> = LazyLock::new(read_all);
    EVIDENCE.get(&id).map_or(&[], Vec::as_slice)
}

fn read_all() -> HashMap<MethodId, Vec<Evidence>> {
    let mut files: Vec<_> = FIXTURES.files().collect();
    files.sort_by_key(|file| file.path());
    let mut all: HashMap<MethodId, Vec<Evidence>> = HashMap::new();
    for file in files {
        // The fixtures are read by a test.
        let Ok(File { checks }) = serde_json::from_slice(file.contents()) else {
            continue;
        };
        for check in checks {
            if let Some(id) = method_of(&check) {
                all.entry(id).or_default().extend(figures(check));
            }
        }
    }
    all
}

/// The method that a check speaks of: the formula's, else the request's, else the one it expects.
fn method_of(check: &Check) -> Option<MethodId> {
    let named = |subject: &Option<Value>| {
        let text = subject.as_ref()?.get("method")?.as_str()?;
        MethodId::from_text(text)
    };
    let mut expected = check
        .expect
        .iter()
        .filter(|expect| expect.figure == "method");
    named(&check.formula)
        .or_else(|| named(&check.request))
        .or_else(|| MethodId::from_text(expected.next()?.value.as_str()?))
}

fn figures(check: Check) -> impl Iterator<Item = Evidence> {
    let Check {
        id,
        source,
        read,
        expect,
        ..
    } = check;
    expect.into_iter().filter_map(move |expect| {
        Some(Evidence {
            check: id.clone(),
            source: source.clone(),
            read: read.clone(),
            figure: expect.figure,
            value: expect.value.as_f64()?,
            deviation: expect.deviation,
            reason: expect.reason,
        })
    })
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn every_file_is_read_and_speaks_of_methods() {
        let mut unread = Vec::new();
        for file in FIXTURES.files() {
            let name = file.path().display().to_string();
            match serde_json::from_slice::<File>(file.contents()) {
                Ok(File { checks }) => unread.extend(
                    checks
                        .iter()
                        .filter(|check| method_of(check).is_none())
                        .map(|check| format!("{name}: {} speaks of no method", check.id)),
                ),
                Err(error) => unread.push(format!("{name}: {error}")),
            }
        }
        assert!(unread.is_empty(), "{}", unread.join("\n"));
    }

    #[test]
    fn a_published_pipe_stands_by_its_method() {
        let figures = evidence(MethodId::HorizontalCylinderChurchillChu);
        let nusselt = figures
            .iter()
            .find(|found| found.check == "cengel-9-1-formula");
        assert_eq!(nusselt.map(|found| found.value), Some(17.4));
    }
}
