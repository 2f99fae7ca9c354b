//! The number at the start of a quantity.

use super::error::{QuantityError, excerpt};
use super::kind::Kind;

/// Room for a number whose exponent has a sign that `f64` does not read.
const ROOM: usize = 64;

/// Reads the number that `text` starts with and returns what follows it.
///
/// A decimal with or without exponent (`.5`, `1e-3`), a fraction (`1/2`) or a mixed one
/// (`1 1/2`, `1-1/2`), with an ASCII or Unicode sign.
///
/// # Errors
/// Every [`QuantityError`] but those of units; `kind` says what is wanted.
pub(super) fn read(text: &str, kind: Kind) -> Result<(f64, &str), QuantityError> {
    let given = text.trim();
    if given.is_empty() {
        return Err(QuantityError::Empty { kind });
    }
    let (negative, unsigned) = match strip_minus(given) {
        Some(rest) => (true, rest),
        None => (false, given.strip_prefix('+').unwrap_or(given)),
    };
    let unsigned = unsigned.trim_start();
    if is_not_finite(unsigned) {
        return Err(QuantityError::NotFinite {
            given: excerpt(given),
        });
    }
    let (size, rest) = mixed(unsigned)
        .or_else(|| decimal(unsigned))
        .ok_or_else(|| stray(given, kind))?;
    if continues(rest) {
        return Err(stray(given, kind));
    }
    let value = if negative { -size } else { size };
    if value.is_finite() {
        Ok((value, rest))
    } else {
        Err(QuantityError::NotFinite {
            given: excerpt(given),
        })
    }
}

fn strip_minus(text: &str) -> Option<&str> {
    text.strip_prefix(['-', '−'])
}

/// Whether a text starts with a word for what is not finite.
fn is_not_finite(text: &str) -> bool {
    let end = text
        .find(|c: char| !c.is_alphabetic())
        .unwrap_or(text.len());
    ["nan", "inf", "infinity"]
        .iter()
        .any(|name| text[..end].eq_ignore_ascii_case(name))
}

/// Whether what follows a number would go on with it. `1/K` is a unit, not a number.
fn continues(rest: &str) -> bool {
    let rest = rest.trim_start();
    match rest
        .strip_prefix('1')
        .map(|rest| rest.trim_start().strip_prefix('/'))
    {
        Some(Some(unit)) => unit.trim_start().starts_with(|c: char| c.is_ascii_digit()),
        _ => rest.starts_with(|c: char| {
            c.is_ascii_digit() || matches!(c, '.' | ',' | '_' | '+' | '-' | '−')
        }),
    }
}

fn digits(text: &str) -> Option<(&str, &str)> {
    let end = text
        .find(|c: char| !c.is_ascii_digit())
        .unwrap_or(text.len());
    (end > 0).then(|| text.split_at(end))
}

/// Reads `1/2`, `1 1/2` or `1-1/2`.
fn mixed(text: &str) -> Option<(f64, &str)> {
    if let Some(found) = fraction(text) {
        return Some(found);
    }
    let (whole, rest) = digits(text)?;
    let parted = rest.strip_prefix('-').or_else(|| {
        let trimmed = rest.trim_start();
        (trimmed.len() < rest.len()).then_some(trimmed)
    })?;
    let (part, rest) = fraction(parted)?;
    Some((whole.parse::<f64>().ok()? + part, rest))
}

fn fraction(text: &str) -> Option<(f64, &str)> {
    let (numerator, rest) = digits(text)?;
    let (denominator, rest) = digits(rest.trim_start().strip_prefix('/')?.trim_start())?;
    Some((
        numerator.parse::<f64>().ok()? / denominator.parse::<f64>().ok()?,
        rest,
    ))
}

fn decimal(text: &str) -> Option<(f64, &str)> {
    let after_whole = digits(text).map_or(text, |(_, rest)| rest);
    let after_part = match after_whole.strip_prefix('.') {
        Some(part) => digits(part).map_or(part, |(_, rest)| rest),
        None => after_whole,
    };
    let rest = after_exponent(after_part).unwrap_or(after_part);
    let number = &text[..text.len() - rest.len()];
    Some((parse(number)?, rest))
}

fn is_decimal(text: &str) -> bool {
    decimal(text).is_some_and(|(_, rest)| rest.is_empty())
}

fn after_exponent(text: &str) -> Option<&str> {
    let power = text.strip_prefix(['e', 'E'])?;
    let unsigned = power.strip_prefix(['+', '-', '−']).unwrap_or(power);
    digits(unsigned).map(|(_, rest)| rest)
}

fn parse(number: &str) -> Option<f64> {
    let Some((mantissa, power)) = number.split_once('−') else {
        return number.parse().ok();
    };
    let mut room = [0; ROOM];
    let length = mantissa.len() + 1 + power.len();
    let plain = room.get_mut(..length)?;
    plain[..mantissa.len()].copy_from_slice(mantissa.as_bytes());
    plain[mantissa.len()] = b'-';
    plain[mantissa.len() + 1..].copy_from_slice(power.as_bytes());
    std::str::from_utf8(plain).ok()?.parse().ok()
}

/// What is wrong with a text that is no number to its end.
fn stray(given: &str, kind: Kind) -> QuantityError {
    let end = given
        .find(|c: char| !(c.is_ascii_digit() || matches!(c, '+' | '-' | '−' | ',' | '.')))
        .unwrap_or(given.len());
    let (number, rest) = given.split_at(end);
    let mut meant = without_comma(number)
        .into_iter()
        .filter(|number| is_decimal(number.trim_start_matches(['+', '-', '−'])))
        .map(|number| excerpt(&format!("{number}{rest}")));
    let given = excerpt(given);
    match meant.next() {
        Some(instead) => QuantityError::DecimalComma {
            given,
            instead,
            or: meant.next(),
        },
        None => QuantityError::NotAQuantity { given, kind },
    }
}

/// What a number with a comma may mean, the likelier first: `1,000` is 1000 or else 1.000.
fn without_comma(number: &str) -> Vec<String> {
    let Some((before, after)) = number.rsplit_once(',') else {
        return Vec::new();
    };
    let mut groups = number.split('.').next().unwrap_or_default().split(',');
    let first = groups.next().unwrap_or_default();
    let leads = !first.is_empty() && !first.trim_start_matches(['+', '-', '−']).starts_with('0');
    let grouped = leads && groups.all(|group| group.len() == 3) && !before.contains('.');
    let fractional = !before.contains(',') && !after.contains('.');
    let mut meant = Vec::new();
    if grouped {
        meant.push(number.replace(',', ""));
    }
    if fractional {
        meant.push(format!("{}.{after}", before.replace('.', "")));
    }
    meant
}

#[cfg(test)]
mod tests {
    use super::super::error::QuantityError;
    use super::super::kind::Kind;
    use super::read;

    #[test]
    fn numbers_are_read_up_to_their_unit() {
        for (text, value, rest) in [
            ("0.2", 0.2, ""),
            ("  8 in", 8.0, " in"),
            ("8in", 8.0, "in"),
            (".5", 0.5, ""),
            ("5.", 5.0, ""),
            ("+5", 5.0, ""),
            ("- 5 degC", -5.0, " degC"),
            ("−5 degC", -5.0, " degC"),
            ("1e-3 m", 1e-3, " m"),
            ("1E3Pa", 1e3, "Pa"),
            ("1.5e−3", 1.5e-3, ""),
            ("2e", 2.0, "e"),
            ("1/2 in", 0.5, " in"),
            ("1 / 2in", 0.5, "in"),
            ("1 1/2 in", 1.5, " in"),
            ("1-1/2 in", 1.5, " in"),
            ("-1\u{a0}1/4\"", -1.25, "\""),
            ("3.4e-3 1/K", 3.4e-3, " 1/K"),
            ("3/K", 3.0, "/K"),
            ("1/2/K", 0.5, "/K"),
            ("\u{2009}5\u{202f}mm", 5.0, "\u{202f}mm"),
        ] {
            assert_eq!(read(text, Kind::Length), Ok((value, rest)), "{text}");
        }
    }

    #[test]
    fn what_is_no_number_is_refused() {
        let texts = [
            "abc",
            "mm",
            "-",
            "+",
            ".",
            "1.2.3",
            "1 2 mm",
            "1 000 mm",
            "5-10 mm",
            "--5",
            "1_000",
            "1.5 1/2 in",
            "1/2.5 in",
            "/2",
            ",",
            "1,2,3",
            "1,5-2",
            "5 +3",
        ];
        for text in texts {
            let error = read(text, Kind::Length).unwrap_err();
            assert_eq!(error.code(), "not-a-quantity", "{text}");
        }
        for text in ["", "  ", "\u{a0}"] {
            assert_eq!(
                read(text, Kind::Mass),
                Err(QuantityError::Empty { kind: Kind::Mass })
            );
        }
    }

    #[test]
    fn numbers_without_bounds_are_refused() {
        for text in [
            "nan",
            "NaN",
            "-inf",
            "+Infinity",
            "inf m",
            "1e999",
            "-1e999 m",
            "1/0 in",
        ] {
            let error = read(text, Kind::Length).unwrap_err();
            assert_eq!(
                error,
                QuantityError::NotFinite {
                    given: text.to_owned()
                }
            );
        }
    }

    #[test]
    fn a_comma_is_refused_with_what_it_may_mean() {
        for (text, instead, or) in [
            ("0,2", "0.2", None),
            ("-0,2 m", "-0.2 m", None),
            ("0,200", "0.200", None),
            (",5", ".5", None),
            ("5, mm", "5. mm", None),
            ("12,5e-3 m", "12.5e-3 m", None),
            ("1,000 mm", "1000 mm", Some("1.000 mm")),
            ("10,000", "10000", Some("10.000")),
            ("−1,000", "−1000", Some("−1.000")),
            ("1,234.5", "1234.5", None),
            ("1,234,567", "1234567", None),
            ("1.234,5", "1234.5", None),
            ("1.234.567,8", "1234567.8", None),
        ] {
            let expected = QuantityError::DecimalComma {
                given: text.to_owned(),
                instead: instead.to_owned(),
                or: or.map(str::to_owned),
            };
            assert_eq!(read(text, Kind::Length), Err(expected), "{text}");
        }
    }
}
