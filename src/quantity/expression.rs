//! Unit expressions: `Btu/(h ft2 degF)`, `W/m²·K`, `kJ/kgK`, `kg m^-3` to dimension and scale.
//!
//! As in engineering print, everything after the first solidus divides: `Btu/h·ft` is
//! `Btu/(h ft)`. A reading that this rule gets wrong has the wrong dimension and is refused.

use super::scale::{Dimension, Scale};
use super::words::{self, ANGLE, PRESSURE, TEMPERATURE, Word};

/// Beyond this many factors no unit is meant.
const MOST_FACTORS: u8 = 8;

/// The word that stands for a solidus.
const PER: &str = "per";

/// What a unit expression says.
#[derive(Clone, Copy, Debug)]
pub(super) struct Measure {
    pub dimension: Dimension,
    pub scale: Scale,
    /// The symbol of the first word, by which equal units are told apart: `cP` and `mPa s`.
    pub lead: &'static str,
    /// How many words were multiplied.
    pub factors: u8,
}

/// Reads a unit expression; `None` when it is none.
pub(super) fn read(text: &str) -> Option<Measure> {
    let text = text.trim();
    let mut reader = Reader {
        rest: words::expand(text).unwrap_or(text),
        measure: Measure {
            dimension: Dimension::NONE,
            scale: Scale::ONE,
            lead: "1",
            factors: 0,
        },
        below: false,
        shifted: false,
        awaiting: true,
        open: 0,
    };
    reader.read()?;
    Some(reader.measure)
}

struct Reader<'a> {
    rest: &'a str,
    measure: Measure,
    /// A solidus has been passed.
    below: bool,
    /// A word with a zero of its own has been read.
    shifted: bool,
    /// The text cannot end here.
    awaiting: bool,
    /// Brackets not closed yet.
    open: u8,
}

impl<'a> Reader<'a> {
    fn read(&mut self) -> Option<()> {
        if let Some(rest) = self.rest.strip_prefix('1') {
            self.rest = rest.trim_start();
            self.awaiting = false;
            if !(self.rest.is_empty() || self.rest.starts_with('/') || self.at_per()) {
                return None;
            }
        }
        while let Some(next) = self.rest.chars().next() {
            match next {
                '(' => self.open = self.open.checked_add(1)?,
                ')' => self.open = self.open.checked_sub(1)?,
                '/' => self.divide()?,
                '-' if !self.awaiting => self.awaiting = true,
                _ if is_product(next) => {}
                _ => {
                    self.factor()?;
                    continue;
                }
            }
            self.rest = &self.rest[next.len_utf8()..];
        }
        let whole = !self.awaiting && self.open == 0;
        (whole && !self.loses_its_zero()).then_some(())
    }

    /// Whether a product has the kind of a word in it whose zero it does not keep: `barg m/m`.
    fn loses_its_zero(&self) -> bool {
        let kept = self.measure.factors == 1 && self.measure.scale.is_shifted();
        self.shifted && !kept && [TEMPERATURE, PRESSURE].contains(&self.measure.dimension)
    }

    /// Passes a solidus; a leading one, as in `/K`, stands for `1/`.
    fn divide(&mut self) -> Option<()> {
        let leads = self.measure.factors == 0 && self.open == 0 && !self.below;
        if self.awaiting && !leads {
            return None;
        }
        self.below = true;
        self.awaiting = true;
        Some(())
    }

    /// Reads one word with its power, or `per`.
    fn factor(&mut self) -> Option<()> {
        if self.at_per() {
            self.rest = &self.rest[PER.len()..];
            return self.divide();
        }
        let prefix = self.power_word();
        let word = self.word()?;
        let power = prefix * self.exponent()?;
        self.multiply(word, if self.below { -power } else { power })
    }

    fn multiply(&mut self, word: &'static Word, power: i16) -> Option<()> {
        let measure = &mut self.measure;
        if measure.factors == 0 {
            measure.lead = word.symbol;
        }
        let alone = measure.factors == 0 && power == 1;
        self.shifted |= word.scale.is_shifted();
        measure.factors += 1;
        measure.dimension = measure.dimension.times(word.dimension, power);
        measure.scale = if alone {
            word.scale
        } else {
            measure.scale.times(word.scale, power)
        };
        self.awaiting = false;
        (measure.factors <= MOST_FACTORS).then_some(())
    }

    /// Passes `square`, `sq`, `cubic` or `cu` before a word, also joined as in `sqft`.
    fn power_word(&mut self) -> i16 {
        const POWERS: [(&str, i16); 4] = [("square", 2), ("sq", 2), ("cubic", 3), ("cu", 3)];
        let letters = self.letters();
        let split = |(name, power): (&str, i16)| {
            let (start, joined) = letters.split_at_checked(name.len())?;
            let follows = joined.is_empty() || words::find(joined).is_some();
            (start.eq_ignore_ascii_case(name) && follows).then_some((name.len(), power))
        };
        match POWERS.into_iter().find_map(split) {
            Some((length, power)) => {
                self.rest = self.rest[length..].trim_start_matches(is_product);
                power
            }
            None => 1,
        }
    }

    /// Reads one word; the longest that stands here, so that `kgK` is `kg` and `K`.
    fn word(&mut self) -> Option<&'static Word> {
        let with_digits = run(self.rest, |c| c.is_alphabetic() || c.is_ascii_digit());
        let letters = self.letters();
        let shorter = letters.char_indices().rev().map(|(end, _)| &letters[..end]);
        let mut candidates = [with_digits, letters].into_iter().chain(shorter);
        let (length, word) =
            match candidates.find_map(|text| Some((text.len(), words::find(text)?))) {
                Some(found) => found,
                None => {
                    let mark = self.rest.chars().next()?.len_utf8();
                    (mark, words::find(&self.rest[..mark])?)
                }
            };
        self.rest = &self.rest[length..];
        Some(if word.dimension == ANGLE {
            self.degree().unwrap_or(word)
        } else {
            word
        })
    }

    /// Reads the scale's name after a degree sign or word: `° C`, `deg. F`.
    fn degree(&mut self) -> Option<&'static Word> {
        let rest = self.rest.trim_start_matches(is_product);
        let name = run(rest, char::is_alphabetic);
        let word = words::find(name).filter(|word| word.dimension == TEMPERATURE)?;
        self.rest = &rest[name.len()..];
        Some(word)
    }

    /// Reads the power after a word, 1 when there is none: the hyphen of `ft-s` joins words.
    fn exponent(&mut self) -> Option<i16> {
        let raised = self.rest.strip_prefix('^');
        let signed = raised.unwrap_or(self.rest);
        let unsigned = signed.strip_prefix(['-', '−', '⁻']);
        let digits = unsigned.unwrap_or(signed);
        let sign = if unsigned.is_some() { -1 } else { 1 };
        let Some((digit, length)) = digits.chars().next().and_then(digit) else {
            return raised.is_none().then_some(1);
        };
        self.rest = &digits[length..];
        let ends = self.rest.chars().next().and_then(self::digit).is_none();
        ends.then_some(sign * digit)
    }

    fn at_per(&self) -> bool {
        self.letters().eq_ignore_ascii_case(PER)
    }

    fn letters(&self) -> &'a str {
        run(self.rest, char::is_alphabetic)
    }
}

fn is_product(c: char) -> bool {
    c.is_whitespace() || matches!(c, '·' | '⋅' | '*' | '.')
}

/// The longest start of `text` whose characters all belong.
fn run(text: &str, belongs: impl Fn(char) -> bool) -> &str {
    text.split(|c| !belongs(c)).next().unwrap_or_default()
}

/// The value of a plain or raised digit, and its length in bytes.
fn digit(c: char) -> Option<(i16, usize)> {
    let value = match c {
        '1'..='9' => c as i16 - '0' as i16,
        '¹' => 1,
        '²' => 2,
        '³' => 3,
        _ => return None,
    };
    Some((value, c.len_utf8()))
}
