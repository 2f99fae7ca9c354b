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

/// A case under construction, bare numbers in SI.
#[derive(Clone, Debug)]
pub struct Draft(Vec<(&'static str, Given<'static>)>);

impl Draft {
    /// A body in a fluid.
    pub fn new(geometry: &'static str, fluid: &'static str) -> Self {
        Draft(Vec::new())
            .word("geometry", geometry)
            .word("fluid", fluid)
    }

    /// The same with a field that holds a word; the last one given counts.
    pub fn word(self, name: &'static str, word: &'static str) -> Self {
        self.with(name, Given::Text(word.into()))
    }

    /// The same with a field that holds a number; the last one given counts.
    pub fn number(self, name: &'static str, number: f64) -> Self {
        self.with(name, Given::Number(number))
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
        Draft(self.0.iter().map(rewrite).collect())
    }

    /// The case.
    pub fn read(&self) -> Result<Case, Vec<Fault>> {
        let mut entries = Entries::default();
        for (name, given) in &self.0 {
            entries
                .put(name, Some(given.clone()), &[])
                .expect("a field that is not given twice");
        }
        Case::read(&entries, &UnitChoice::default(), Fluids::built_in())
    }

    fn with(mut self, name: &'static str, given: Given<'static>) -> Self {
        self.0.retain(|(known, _)| *known != name);
        self.0.push((name, given));
        self
    }
}

/// What to do outside ranges, the boldest last.
pub const EXTRAPOLATE: [&str; 3] = ["none", "near", "any"];

/// A body with one size, to be scaled.
pub struct Body {
    /// Its geometry.
    pub geometry: &'static str,
    /// Its dimensions, m, and the angle of an inclined plate.
    pub dimensions: &'static [(&'static str, f64)],
    /// The side of a plate.
    pub facing: Option<&'static str>,
}

/// Every open body, plates with either side to the fluid.
pub const BODIES: [Body; 8] = [
    body("vertical-plate", &[("height", 1.0), ("width", 0.7)], None),
    body("inclined-plate", LEANING, Some("up")),
    body("inclined-plate", LEANING, Some("down")),
    body("horizontal-plate", LEVEL, Some("up")),
    body("horizontal-plate", LEVEL, Some("down")),
    body(
        "horizontal-cylinder",
        &[("diameter", 0.1), ("length", 3.0)],
        None,
    ),
    body(
        "vertical-cylinder",
        &[("diameter", 0.2), ("height", 1.0)],
        None,
    ),
    body("sphere", &[("diameter", 0.2)], None),
];

const LEANING: &[(&str, f64)] = &[("length", 1.0), ("width", 0.7), (TILT, 40.0)];
const LEVEL: &[(&str, f64)] = &[("length", 1.0), ("width", 0.7)];
const TILT: &str = "tilt_from_vertical";

const fn body(
    geometry: &'static str,
    dimensions: &'static [(&'static str, f64)],
    facing: Option<&'static str>,
) -> Body {
    Body {
        geometry,
        dimensions,
        facing,
    }
}

impl Body {
    /// The body in a fluid, all lengths times a factor.
    pub fn draft(&self, fluid: &'static str, scale: f64) -> Draft {
        let draft = Draft::new(self.geometry, fluid);
        let faced = match self.facing {
            Some(facing) => draft.word("facing", facing),
            None => draft,
        };
        self.dimensions.iter().fold(faced, |draft, &(name, value)| {
            draft.number(name, if name == TILT { value } else { value * scale })
        })
    }

    /// Its name in a failure.
    pub fn label(&self) -> String {
        format!("{} {}", self.geometry, self.facing.unwrap_or_default())
    }
}
