//! What can be wrong with a quantity.

use std::fmt;

use super::kind::Kind;

/// Why a text is not the quantity that is wanted.
#[derive(Clone, Debug, PartialEq)]
pub enum QuantityError {
    /// Nothing was given.
    Empty {
        /// What is wanted.
        kind: Kind,
    },
    /// The text is no number with or without a unit.
    NotAQuantity {
        /// The text.
        given: String,
        /// What is wanted.
        kind: Kind,
    },
    /// The number has a comma.
    DecimalComma {
        /// The text.
        given: String,
        /// The text without the comma.
        instead: String,
        /// Its other meaning, where it has two.
        or: Option<String>,
    },
    /// No unit of that name is known, or not for this kind.
    UnknownUnit {
        /// The unit given.
        unit: String,
        /// What is wanted.
        kind: Kind,
        /// The unit that it resembles.
        resembles: Option<&'static str>,
    },
    /// The unit measures something else.
    WrongKind {
        /// The unit given.
        unit: String,
        /// What it measures.
        measures: Kind,
        /// What is wanted.
        kind: Kind,
    },
    /// The number is NaN, infinite or too large.
    NotFinite {
        /// The text.
        given: String,
    },
}

impl QuantityError {
    /// The code that problem reports carry.
    pub const fn code(&self) -> &'static str {
        match self {
            QuantityError::Empty { .. } => "empty",
            QuantityError::NotAQuantity { .. } => "not-a-quantity",
            QuantityError::DecimalComma { .. } => "decimal-comma",
            QuantityError::UnknownUnit { .. } => "unknown-unit",
            QuantityError::WrongKind { .. } => "wrong-kind",
            QuantityError::NotFinite { .. } => "not-finite",
        }
    }
}

impl fmt::Display for QuantityError {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self {
            QuantityError::Empty { kind } => {
                write!(f, "no {} was given: write {}", Name(*kind), Form(*kind))
            }
            QuantityError::NotAQuantity { given, kind } => {
                write!(
                    f,
                    "\"{given}\" is no {}: write {}",
                    Name(*kind),
                    Form(*kind)
                )
            }
            QuantityError::DecimalComma { given, instead, or } => {
                write!(f, "\"{given}\" has a comma: write \"{instead}\"")?;
                match or {
                    Some(or) => write!(f, ", or \"{or}\" if it is a decimal comma"),
                    None => Ok(()),
                }
            }
            QuantityError::UnknownUnit {
                unit,
                kind,
                resembles,
            } => {
                write!(f, "\"{unit}\" is no known unit of {}: ", Name(*kind))?;
                match resembles {
                    Some(symbol) => write!(f, "did you mean {symbol}? Known: {}", Units(*kind)),
                    None => write!(f, "write one of {}", Units(*kind)),
                }
            }
            QuantityError::WrongKind {
                unit,
                measures,
                kind,
            } => write!(
                f,
                "\"{unit}\" is a unit of {}, not of {}: write one of {}",
                Name(*measures),
                Name(*kind),
                Units(*kind)
            ),
            QuantityError::NotFinite { given } => {
                write!(
                    f,
                    "\"{given}\" is not a finite number: write one, or leave it out"
                )
            }
        }
    }
}

impl std::error::Error for QuantityError {}

/// The start of a text, short enough to be repeated in a message.
pub(super) fn excerpt(text: &str) -> String {
    const LONGEST: usize = 60;
    match text.char_indices().nth(LONGEST) {
        Some((end, _)) => format!("{}…", &text[..end]),
        None => text.to_owned(),
    }
}

/// A kind's name in running text.
struct Name(Kind);

impl fmt::Display for Name {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        f.write_str(&self.0.name().replace('_', " "))
    }
}

/// The symbols of a kind's units.
struct Units(Kind);

impl fmt::Display for Units {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        let symbols: Vec<_> = self.0.units().map(|unit| unit.symbol()).collect();
        f.write_str(&symbols.join(", "))
    }
}

/// How a quantity of a kind is written.
struct Form(Kind);

impl fmt::Display for Form {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        match self.0 {
            Kind::Number => f.write_str("a number such as 0.2 or \"20 %\""),
            kind => write!(
                f,
                "a number such as 0.2, alone or with one of {}",
                Units(kind)
            ),
        }
    }
}
