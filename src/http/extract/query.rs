//! A case in a query string.

use std::borrow::Cow;

use axum::extract::FromRequestParts;
use axum::http::request::Parts;

use crate::case::{Column, Fault, Given, duplicate_field, shown, unknown_field};
use crate::quantity::{UnitChoice, nearest};

use super::{ANSWER_KINDS, FIELD_KINDS, FilmInput, keep_choice};

/// A query's parameters as they stand in the URL.
pub struct Query(String);

impl<S: Sync> FromRequestParts<S> for Query {
    type Rejection = std::convert::Infallible;

    async fn from_request_parts(parts: &mut Parts, _: &S) -> Result<Self, Self::Rejection> {
        Ok(Query(parts.uri.query().unwrap_or_default().to_owned()))
    }
}

/// What a query asks of the answer.
#[derive(Debug, Default)]
pub struct QueryOptions {
    /// The figures wanted as plain text, none for the whole answer.
    pub want: Vec<Column>,
    /// The unit of the one figure wanted.
    pub unit: Option<String>,
    /// Whether errors are to be cells.
    pub error_cells: bool,
}

/// Parameters beside the fields of the case.
const OPTIONS: [&str; 5] = ["units", "answer_units", "want", "as", "errors"];

impl Query {
    /// The parameters, decoded, in their order.
    pub fn pairs(&self) -> impl Iterator<Item = (Cow<'_, str>, Cow<'_, str>)> {
        form_urlencoded::parse(self.0.as_bytes())
    }

    /// Whether errors are to be cells, however broken the rest is.
    pub fn wants_error_cells(&self) -> bool {
        self.pairs()
            .any(|(name, value)| name == "errors" && value == "cell")
    }

    /// Reads one case and what is asked of its answer; faults stay in the input.
    pub fn read_film(&self) -> (FilmInput<'_>, QueryOptions) {
        let mut input = FilmInput::default();
        let mut options = QueryOptions::default();
        let mut seen = [false; OPTIONS.len()];
        for (name, value) in self.pairs() {
            if input.is_hopeless() {
                break;
            }
            let place = OPTIONS.iter().position(|option| *option == name);
            if place.is_some_and(|place| std::mem::replace(&mut seen[place], true)) {
                input.faults.push(duplicate_field(&name));
                continue;
            }
            match name.as_ref() {
                "units" => {
                    let choice = UnitChoice::parse_text(&value, &FIELD_KINDS);
                    input.units = keep_choice(choice, "units", &mut input.faults);
                }
                "answer_units" => {
                    let choice = UnitChoice::parse_text(&value, &ANSWER_KINDS);
                    input.answer_units = keep_choice(choice, "answer_units", &mut input.faults);
                }
                "want" => options.want = read_want(&value, &mut input.faults),
                "as" => options.unit = Some(value.into_owned()),
                "errors" if value == "cell" => options.error_cells = true,
                "errors" => input.faults.push(Fault::under(
                    &["errors"],
                    "unknown-value",
                    format!("errors is {}; it takes cell", shown(&value)),
                )),
                _ => {
                    let given = (!value.is_empty()).then_some(Given::Text(value));
                    if let Err(fault) = input.entries.put(&name, given, &OPTIONS) {
                        input.faults.push(fault);
                    }
                }
            }
        }
        (input, options)
    }

    /// Reads the parameters of a resource that takes just these; unknown and repeated ones are faults.
    pub fn read_named<const N: usize>(
        &self,
        known: [&str; N],
        faults: &mut Vec<Fault>,
    ) -> [Option<Cow<'_, str>>; N] {
        let mut values = [const { None }; N];
        for (name, value) in self.pairs() {
            match known.iter().position(|known| *known == name) {
                Some(place) if values[place].is_some() => faults.push(duplicate_field(&name)),
                Some(place) => values[place] = Some(value),
                None => faults.push(unknown_field(&name, known.into_iter())),
            }
        }
        values
    }
}

fn read_want(text: &str, faults: &mut Vec<Fault>) -> Vec<Column> {
    let mut columns = Vec::new();
    for name in text.split(',').map(str::trim) {
        match Column::from_name(name) {
            Some(column) => columns.push(column),
            None => {
                let names = Column::ALL.iter().map(|column| column.name());
                let hint = match nearest(name, names) {
                    Some(near) => format!("did you mean {near}?"),
                    None => "the figures are the members of an answer, listed in /docs".to_owned(),
                };
                faults.push(Fault::under(
                    &["want"],
                    "unknown-value",
                    format!("there is no figure {}; {hint}", shown(name)),
                ));
            }
        }
    }
    columns
}
