//! What the checks from outside share: requests to cases, cases to answers.

use plumeline::case::{Answer, Case, Entries, Fault, Given, Wanted};
use plumeline::film::{Outcome, evaluate};
use plumeline::fluids::{Composition, Fluid, Fluids};
use plumeline::geometry::{Field, Geometry, Space};
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
    read_among(request, Fluids::built_in())
}

/// Makes a case of a request that may name any of some fluids.
pub fn read_among(request: &Request, fluids: &Fluids) -> Result<Case, Vec<Fault>> {
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
    match Case::read(&entries, &units, fluids) {
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
    outcome_among(case, wanted, Fluids::built_in())
}

/// The outcome of one case in one of some fluids.
pub fn outcome_among(case: &Case, wanted: Wanted, fluids: &Fluids) -> Outcome {
    let mut outcomes = Vec::with_capacity(1);
    evaluate(std::slice::from_ref(case), fluids, wanted, &mut outcomes);
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

/// The composition of a fluid that a check takes where it says nothing of it: the middle of a
/// mixture's mass fractions, a pure fluid's and dry air's otherwise.
pub fn middle_composition(fluid: &Fluid) -> f64 {
    match *fluid.composition() {
        Composition::MassFraction {
            minimum, maximum, ..
        } => 0.5 * (minimum + maximum),
        Composition::Pure | Composition::Humidity => 0.0,
    }
}

/// A case under construction, bare numbers in SI.
#[derive(Clone, Debug)]
pub struct Draft {
    geometry: Geometry,
    fields: Vec<(&'static str, Given<'static>)>,
}

impl Draft {
    /// A body in a fluid, a mixture of the middle composition.
    pub fn new(geometry: Geometry, fluid: &'static str) -> Self {
        let draft = Draft {
            geometry,
            fields: Vec::new(),
        };
        let draft = draft
            .word("geometry", geometry.as_str())
            .word("fluid", fluid);
        let id = Fluids::built_in().find(fluid).expect("a built-in fluid");
        match middle_composition(Fluids::built_in().get(id)) {
            0.0 => draft,
            middle => draft.number("concentration", middle),
        }
    }

    /// The body.
    pub fn geometry(&self) -> Geometry {
        self.geometry
    }

    /// The same with a field that holds a word; the last one given counts.
    pub fn word(self, name: &'static str, word: &'static str) -> Self {
        self.with(name, Given::Text(word.into()))
    }

    /// The same with a field that holds a number; the last one given counts.
    pub fn number(self, name: &'static str, number: f64) -> Self {
        self.with(name, Given::Number(number))
    }

    /// The same with several fields that hold numbers.
    pub fn numbers(self, numbers: &[(&'static str, f64)]) -> Self {
        numbers
            .iter()
            .fold(self, |draft, &(name, number)| draft.number(name, number))
    }

    /// The same between two temperatures, K: of surface and ambient, or of the two sides of a
    /// gap, where the order does not matter.
    pub fn between(&self, surface: f64, ambient: f64) -> Self {
        let draft = self.clone();
        match self.geometry.entry().space {
            Space::Closed => draft
                .number("hot_temperature", surface.max(ambient))
                .number("cold_temperature", surface.min(ambient)),
            Space::Open | Space::Channel => draft
                .number("surface_temperature", surface)
                .number("ambient_temperature", ambient),
        }
    }

    /// The same with every number written as `text` has it; none leaves it as it is.
    pub fn rewritten(&self, text: impl Fn(&str, f64) -> Option<String>) -> Self {
        let rewrite = |(name, given): &(&'static str, Given<'static>)| match given {
            Given::Number(number) => match text(name, *number) {
                Some(text) => (*name, Given::Text(text.into())),
                None => (*name, given.clone()),
            },
            _ => (*name, given.clone()),
        };
        Draft {
            fields: self.fields.iter().map(rewrite).collect(),
            ..*self
        }
    }

    /// The case.
    pub fn read(&self) -> Result<Case, Vec<Fault>> {
        let mut entries = Entries::default();
        for (name, given) in &self.fields {
            entries
                .put(name, Some(given.clone()), &[])
                .expect("a field that is not given twice");
        }
        Case::read(&entries, &UnitChoice::default(), Fluids::built_in())
    }

    fn with(mut self, name: &'static str, given: Given<'static>) -> Self {
        self.fields.retain(|(known, _)| *known != name);
        self.fields.push((name, given));
        self
    }
}

/// What to do outside ranges, the boldest last.
pub const EXTRAPOLATE: [&str; 3] = ["none", "near", "any"];
