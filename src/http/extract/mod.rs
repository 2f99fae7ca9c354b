//! What handlers want of a request, checked before they run.

mod accept;
mod body;
mod json;
mod query;

pub use accept::AcceptsJson;
pub use body::JsonBody;
pub use json::read_film_body;
pub use query::{Query, QueryOptions};

use crate::case::{Entries, Fault, answer_kind};
use crate::geometry::Field;
use crate::quantity::{ChoiceFault, Kind, UnitChoice, parse};

/// A case as it came, and the units chosen for its numbers and for its answer.
#[derive(Debug, Default)]
pub struct FilmInput<'a> {
    /// The case's raw values.
    pub entries: Entries<'a>,
    /// Units of bare numbers.
    pub units: UnitChoice,
    /// Units of the answer.
    pub answer_units: UnitChoice,
    /// What is wrong so far.
    pub faults: Vec<Fault>,
}

/// Members of a request beside the fields of its case.
const UNIT_MEMBERS: [&str; 2] = ["units", "answer_units"];

/// The kind of quantity that a field of a case holds.
fn field_kind(name: &str) -> Option<Kind> {
    Field::from_name(name).and_then(Field::kind)
}

/// The kind of quantity that a name in an answer stands for.
fn result_kind(name: &str) -> Option<Kind> {
    answer_kind(name)
}

/// Keeps a choice of units, or adds its faults under the member that holds it.
fn keep_choice(
    choice: Result<UnitChoice, Vec<ChoiceFault>>,
    member: &str,
    faults: &mut Vec<Fault>,
) -> UnitChoice {
    choice.unwrap_or_else(|found| {
        faults.extend(found.into_iter().map(|fault| {
            let detail = format!("{member}: {}", fault.detail);
            Fault::under(&[member, &fault.key], fault.code, detail)
        }));
        UnitChoice::default()
    })
}

/// A quantity of a query in SI, or its fault.
pub fn read_query_quantity(
    name: &str,
    kind: Kind,
    text: &str,
    faults: &mut Vec<Fault>,
) -> Option<f64> {
    match parse(text, kind, kind.si_unit()) {
        Ok(reading) => Some(reading.value),
        Err(error) => {
            faults.push(Fault::under(
                &[name],
                error.code(),
                format!("{name}: {error}"),
            ));
            None
        }
    }
}
