//! What the checks from outside share: requests to cases, cases to answers.

use plumeline::case::{Answer, Case, Entries, Fault, Given, Wanted};
use plumeline::film::{Outcome, evaluate};
use plumeline::fluids::Fluids;
use plumeline::geometry::Field;
use plumeline::quantity::{Kind, UnitChoice};
use serde_json::{Map, Value};

/// A request as `POST /v1/film` takes it, `units` included.
pub type Request = Map<String, Value>;

/// The request of a JSON object.
pub fn request(value: Value) -> Request {
    match value {
        Value::Object(request) => request,
        other => panic!("no object: {other}"),
    }
}

/// Makes a case of a request.
pub fn read(request: &Request) -> Result<Case, Vec<Fault>> {
    let mut entries = Entries::default();
    let mut units = UnitChoice::default();
    let mut faults = Vec::new();
    for (name, value) in request {
        if name == "units" {
            units = chosen_units(value);
        } else if let Err(fault) = entries.put(name, given(value), &["units"]) {
            faults.push(fault);
        }
    }
    match Case::read(&entries, &units, Fluids::built_in()) {
        Ok(case) if faults.is_empty() => Ok(case),
        Ok(_) => Err(faults),
        Err(found) => Err(faults.into_iter().chain(found).collect()),
    }
}

/// The case of a request that must be well-formed.
pub fn case(value: Value) -> Case {
    let request = request(value);
    read(&request).unwrap_or_else(|faults| panic!("{request:?}: {faults:#?}"))
}

/// The whole outcome of one case.
pub fn outcome(case: &Case) -> Outcome {
    outcome_of(case, Wanted::ALL)
}

/// The outcome of one case as far as it is wanted.
pub fn outcome_of(case: &Case, wanted: Wanted) -> Outcome {
    let mut outcomes = Vec::with_capacity(1);
    evaluate(
        std::slice::from_ref(case),
        Fluids::built_in(),
        wanted,
        &mut outcomes,
    );
    outcomes.pop().expect("one outcome a case")
}

/// The answer to one case that must have one.
pub fn answer(case: &Case) -> Answer {
    outcome(case).unwrap_or_else(|failure| panic!("{case:?}: {failure:?}"))
}

fn given(value: &Value) -> Option<Given<'_>> {
    Some(match value {
        Value::Null => return None,
        Value::Number(number) => Given::Number(number.as_f64().unwrap_or(f64::NAN)),
        Value::String(text) => Given::Text(text.into()),
        Value::Bool(_) => Given::Other("true or false"),
        Value::Array(_) => Given::Other("a list"),
        Value::Object(_) => Given::Other("an object"),
    })
}

fn chosen_units(value: &Value) -> UnitChoice {
    let kinds: Vec<(&'static str, Kind)> = Field::ALL
        .iter()
        .filter_map(|field| Some((field.name(), field.kind()?)))
        .collect();
    let members = value.as_object().expect("units are an object");
    let pairs = members
        .iter()
        .map(|(key, unit)| (key.as_str(), unit.as_str().expect("a unit is a text")));
    UnitChoice::parse_pairs(pairs, &kinds).unwrap_or_else(|faults| panic!("{faults:#?}"))
}
