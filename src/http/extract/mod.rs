//! What handlers want of a request, checked before they run.

mod accept;
mod body;
mod json;
mod own_table;
mod query;

pub use accept::AcceptsJson;
pub use body::JsonBody;
pub use json::read_film_body;
pub use own_table::COLUMNS;
pub use query::{Query, QueryOptions};

use std::sync::LazyLock;

use crate::case::{Entries, Fault, answer_kinds};
use crate::fluids::Fluid;
use crate::geometry::Field;
use crate::quantity::{ChoiceFault, Kind, UnitChoice, parse};

/// A case as it came, and the units chosen for its numbers and for its answer.
#[derive(Default)]
pub struct FilmInput<'a> {
    /// The case's raw values.
    pub entries: Entries<'a>,
    /// Units of bare numbers.
    pub units: UnitChoice,
    /// Units of the answer.
    pub answer_units: UnitChoice,
    /// The caller's own fluid, where the request brings one.
    pub own_fluid: Option<Fluid>,
    /// Whether the request brings an own fluid that is not in order.
    pub bad_own_fluid: bool,
    /// What is wrong so far.
    pub faults: Vec<Fault>,
    /// Whether the rest was left unread because so much is wrong.
    pub unread: bool,
}

/// With more faults than this the rest of a request is not read.
const MOST_FAULTS: usize = 100;

impl FilmInput<'_> {
    /// Whether the faults are so many that the rest need not be read; says so among them.
    fn is_hopeless(&mut self) -> bool {
        if self.faults.len() < MOST_FAULTS {
            return false;
        }
        self.faults.push(Fault::under(
            &[],
            "too-many-faults",
            format!("the request has {MOST_FAULTS} faults and more; the rest was not read"),
        ));
        self.unread = true;
        true
    }
}

/// Members of a request beside the fields of its case.
const UNIT_MEMBERS: [&str; 2] = ["units", "answer_units"];

/// The quantity fields of a case with their kinds.
static FIELD_KINDS: LazyLock<Vec<(&str, Kind)>> = LazyLock::new(|| {
    let fields = Field::ALL.iter();
    fields
        .filter_map(|field| Some((field.name(), field.kind()?)))
        .collect()
});

/// The figures of an answer with their kinds.
static ANSWER_KINDS: LazyLock<Vec<(&str, Kind)>> = LazyLock::new(|| answer_kinds().collect());

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
