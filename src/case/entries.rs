//! A case as it was written: one raw value a field, whatever the format it came in.

use std::borrow::Cow;

use crate::geometry::Field;
use crate::quantity::nearest;

use super::fault::Fault;

/// A value before its meaning is known.
#[derive(Clone, Debug, PartialEq)]
pub enum Given<'a> {
    /// A number without a unit.
    Number(f64),
    /// A text, perhaps a number with a unit.
    Text(Cow<'a, str>),
    /// Neither: what it is in words.
    Other(&'static str),
}

/// The raw values of one case.
#[derive(Clone, Debug)]
pub struct Entries<'a> {
    values: [Option<Given<'a>>; Field::COUNT],
    seen: u64,
}

impl Default for Entries<'_> {
    fn default() -> Self {
        Entries {
            values: [const { None }; Field::COUNT],
            seen: 0,
        }
    }
}

impl<'a> Entries<'a> {
    /// Takes one named value; `None` is *not given*.
    ///
    /// # Errors
    /// The name is unknown (the nearest of the fields and of `others` is offered), or was given before.
    pub fn put(
        &mut self,
        name: &str,
        value: Option<Given<'a>>,
        others: &[&str],
    ) -> Result<(), Fault> {
        let Some(field) = Field::from_name(name) else {
            let fields = Field::ALL.iter().map(|field| field.name());
            return Err(unknown_field(name, fields.chain(others.iter().copied())));
        };
        let bit = 1 << field as u32;
        if self.seen & bit != 0 {
            return Err(duplicate_field(name));
        }
        self.seen |= bit;
        self.values[field as usize] = value;
        Ok(())
    }

    /// The value of a field, if it was given.
    pub fn get(&self, field: Field) -> Option<&Given<'a>> {
        self.values[field as usize].as_ref()
    }
}

/// The fault of a name that stands twice.
pub fn duplicate_field(name: &str) -> Fault {
    Fault::under(
        &[name],
        "duplicate-field",
        format!("{name} is given more than once; give it once"),
    )
}

/// The fault of a name that is not among those known, with the nearest that is.
pub fn unknown_field<'a>(name: &str, known: impl Iterator<Item = &'a str>) -> Fault {
    let hint = match nearest(name, known) {
        Some(near) => format!("did you mean {near}?"),
        None => "the fields are listed in /docs".to_owned(),
    };
    Fault::under(
        &[name],
        "unknown-field",
        format!("there is no field {}; {hint}", shown(name)),
    )
}

/// A text of the caller's as it is shown in a fault: quoted, and cut when long.
pub fn shown(text: &str) -> String {
    const LONGEST: usize = 60;
    match text.char_indices().nth(LONGEST) {
        Some((end, _)) => format!("{:?}...", &text[..end]),
        None => format!("{text:?}"),
    }
}
