//! What is wrong with a request, told so that it can be mended.

use std::fmt::Write;

use crate::geometry::Field;

/// One fault of a request.
#[derive(Clone, Debug, PartialEq, Eq)]
pub struct Fault {
    /// JSON pointer to the place, as a URI fragment.
    pub pointer: String,
    /// One of [`CODES`].
    pub code: &'static str,
    /// What was given, what is wrong, what would do.
    pub detail: String,
}

/// Every code a fault can carry, with its meaning.
pub const CODES: &[(&str, &str)] = &[
    ("missing-field", "a field that the case needs is not given"),
    (
        "unexpected-field",
        "a field is given that the case does not take",
    ),
    (
        "conflicting-fields",
        "fields are given that say the same thing twice or exclude each other",
    ),
    ("unknown-field", "no field has this name"),
    ("duplicate-field", "a field is given twice"),
    (
        "wrong-type",
        "the value is not a number, text or null as the field wants",
    ),
    ("unknown-value", "the text is none of the field's values"),
    (
        "not-a-quantity",
        "the text is not a number with an optional unit",
    ),
    ("empty", "the text is empty"),
    ("decimal-comma", "the number is written with a comma"),
    ("unknown-unit", "no unit has this symbol"),
    ("wrong-kind", "the unit measures something else"),
    ("not-finite", "the number is not finite"),
    (
        "unknown-key",
        "a choice of units names no field, figure or kind",
    ),
    ("duplicate-key", "a choice of units names one thing twice"),
    ("not-a-pair", "a choice of units is not a list of name:unit"),
    (
        "too-many-faults",
        "the faults are so many that the rest was not read",
    ),
    (
        "outside-limits",
        "the number is outside what the field accepts",
    ),
    (
        "outside-table",
        "the fluid's properties are not known there",
    ),
    ("bad-table", "a fluid's own table is not in order"),
    (
        "density-maximum",
        "the two temperatures lie on both sides of the fluid's greatest density",
    ),
    (
        "method-does-not-fit",
        "the method is for another body, heating or side",
    ),
    (
        "outside-method-range",
        "the case is outside the range of every method allowed",
    ),
    (
        "no-solution",
        "no surface temperature within the fluid's table gives this heat",
    ),
];

impl Fault {
    /// A fault at a field.
    pub fn at(field: Field, code: &'static str, detail: impl Into<String>) -> Self {
        Fault::under(&[field.name()], code, detail)
    }

    /// A fault at the place that these names lead to.
    pub fn under(names: &[&str], code: &'static str, detail: impl Into<String>) -> Self {
        debug_assert!(CODES.iter().any(|(known, _)| *known == code), "{code}");
        Fault {
            pointer: pointer(names),
            code,
            detail: detail.into(),
        }
    }
}

/// A JSON pointer (RFC 6901) as a URI fragment.
///
/// Names longer than any field's are cut, so that a refusal stays small.
pub fn pointer(names: &[&str]) -> String {
    const LONGEST: usize = 200;
    let mut out = "#".to_owned();
    for name in names {
        out.push('/');
        for character in name.chars().take(LONGEST) {
            match character {
                '~' => out.push_str("~0"),
                '/' => out.push_str("~1"),
                c if c.is_ascii_alphanumeric() || "-._!$&'()*+,;=:@?".contains(c) => out.push(c),
                c => {
                    for byte in c.encode_utf8(&mut [0; 4]).bytes() {
                        // Writing to a String does not fail.
                        let _ = write!(out, "%{byte:02X}");
                    }
                }
            }
        }
    }
    out
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn pointers_escape_what_json_pointers_and_fragments_reserve() {
        assert_eq!(pointer(&[]), "#");
        assert_eq!(pointer(&["diameter"]), "#/diameter");
        assert_eq!(pointer(&["units", "a/b~c d"]), "#/units/a~1b~0c%20d");
        assert_eq!(pointer(&["é"]), "#/%C3%A9");
    }
}
