//! A case in JSON.

use std::borrow::Cow;
use std::fmt;

use serde::de::{Deserializer, IgnoredAny, MapAccess, Visitor};
use serde_json::error::Category;
use serde_json::value::RawValue;

use crate::case::{Fault, Given, duplicate_field};
use crate::geometry::Field;
use crate::http::problem::{Problem, ProblemKind};
use crate::quantity::{Kind, UnitChoice};

use super::own_table::{OWN_TABLE, read_own_table};
use super::{ANSWER_KINDS, FIELD_KINDS, FilmInput, UNIT_MEMBERS, keep_choice};

/// Reads one case; what is wrong with its members stays in the input's faults.
///
/// # Errors
/// The bytes are no JSON, or JSON that is no object.
pub fn read_film_body(bytes: &[u8]) -> Result<FilmInput<'_>, Problem> {
    let members = read_members(bytes).map_err(|error| refusal(bytes, &error))?;
    let mut input = FilmInput::default();
    let mut chosen: [Option<&RawValue>; 2] = [None; 2];
    let mut own_table = None;
    for (name, raw) in &members {
        if input.is_hopeless() {
            break;
        }
        if let Some(place) = UNIT_MEMBERS.iter().position(|member| member == name) {
            if chosen[place].replace(raw).is_some() {
                input.faults.push(duplicate_field(name));
            }
            continue;
        }
        let value = if name == Field::Fluid.name() && raw.get().starts_with('{') {
            own_table = Some(raw);
            Some(Given::Text(OWN_TABLE.into()))
        } else {
            read_value(raw)
        };
        if let Err(fault) = input.entries.put(name, value, &UNIT_MEMBERS) {
            input.faults.push(fault);
        }
    }
    let [units, answer_units] = chosen;
    input.units = read_choice(units, UNIT_MEMBERS[0], &FIELD_KINDS, &mut input.faults);
    input.answer_units = read_choice(
        answer_units,
        UNIT_MEMBERS[1],
        &ANSWER_KINDS,
        &mut input.faults,
    );
    if let Some(raw) = own_table {
        input.own_fluid = read_own_table(raw, &input.units, &mut input.faults);
        input.bad_own_fluid = input.own_fluid.is_none();
        input.is_hopeless();
    }
    Ok(input)
}

/// The refusal of bytes that are no JSON, or JSON of another form.
fn refusal(bytes: &[u8], error: &serde_json::Error) -> Problem {
    let malformed = |error: &serde_json::Error| {
        Problem::new(ProblemKind::Malformed, format!("not JSON: {error}"))
    };
    if error.classify() != Category::Data {
        return malformed(error);
    }
    match serde_json::from_slice::<IgnoredAny>(bytes) {
        Err(error) => malformed(&error),
        Ok(_) => Problem::invalid(vec![Fault::under(
            &[],
            "wrong-type",
            "the body is not a JSON object; send one case as an object of named fields",
        )]),
    }
}

pub(super) type Members<'a> = Vec<(Cow<'a, str>, &'a RawValue)>;

/// The members of an object in their order, duplicates and all.
pub(super) fn read_members(bytes: &[u8]) -> serde_json::Result<Members<'_>> {
    struct MembersVisitor;

    impl<'de> Visitor<'de> for MembersVisitor {
        type Value = Members<'de>;

        fn expecting(&self, out: &mut fmt::Formatter) -> fmt::Result {
            out.write_str("an object")
        }

        fn visit_map<A: MapAccess<'de>>(self, mut map: A) -> Result<Self::Value, A::Error> {
            let mut members = Vec::with_capacity(16);
            while let Some(key) = map.next_key::<Key>()? {
                members.push((key.0, map.next_value()?));
            }
            Ok(members)
        }
    }

    let mut deserializer = serde_json::Deserializer::from_slice(bytes);
    let members = deserializer.deserialize_map(MembersVisitor)?;
    deserializer.end()?;
    Ok(members)
}

/// A member's name, borrowed where it has no escapes.
#[derive(serde::Deserialize)]
struct Key<'a>(#[serde(borrow)] Cow<'a, str>);

/// A raw value's meaning as far as JSON goes; null is *not given*.
pub(super) fn read_value(raw: &RawValue) -> Option<Given<'_>> {
    let text = raw.get();
    Some(match text.as_bytes().first() {
        Some(b'n') => return None,
        Some(b'"') => match serde_json::from_str::<Key>(text) {
            Ok(key) => Given::Text(key.0),
            Err(_) => Given::Other("a text with an escape that means nothing"),
        },
        Some(b't' | b'f') => Given::Other("true or false"),
        Some(b'[') => Given::Other("a list"),
        Some(b'{') => Given::Other("an object"),
        // Rust reads every number that JSON's grammar allows; too large a one becomes infinite.
        _ => Given::Number(text.parse().unwrap_or(f64::NAN)),
    })
}

fn read_choice(
    raw: Option<&RawValue>,
    member: &'static str,
    kinds: &[(&'static str, Kind)],
    faults: &mut Vec<Fault>,
) -> UnitChoice {
    let Some(raw) = raw.filter(|raw| raw.get() != "null") else {
        return UnitChoice::default();
    };
    let pairs: Option<Vec<_>> = read_members(raw.get().as_bytes()).ok().and_then(|members| {
        let text = |(key, raw): (Cow<'_, str>, &RawValue)| match read_value(raw) {
            Some(Given::Text(unit)) => Some((key.into_owned(), unit.into_owned())),
            _ => None,
        };
        members.into_iter().map(text).collect()
    });
    match pairs {
        Some(pairs) => {
            let pairs = pairs
                .iter()
                .map(|(key, unit)| (key.as_str(), unit.as_str()));
            keep_choice(UnitChoice::parse_pairs(pairs, kinds), member, faults)
        }
        None => {
            faults.push(Fault::under(
                &[member],
                "wrong-type",
                format!("{member} is not an object of unit texts; for example {{\"temperature\": \"degC\"}}"),
            ));
            UnitChoice::default()
        }
    }
}
