//! The words that units are written in, and every conversion factor of the service.
//!
//! # Source
//! The factors are exact by definition. International yard (0.9144 m) and pound
//! (0.453 592 37 kg), and what follows from them; US gallon of 231 in³; standard gravity
//! (9.806 65 m/s²) and atmosphere (101 325 Pa, also the zero of gauge units); torr of 1/760
//! atmosphere; mercury of 13 595.1 kg/m³ and water of 1000 kg/m³ under standard gravity
//! ("conventional"); International Table calorie (4.1868 J) and the Btu of the same table,
//! 1 Btu/lb = 2326 J/kg; EC therm of 100 000 Btu; ton of refrigeration of 12 000 Btu/h;
//! mechanical horsepower of 550 ft·lbf/s. All as in NIST Special Publication 811 (2008),
//! appendix B, written from memory; inch, pound, psi, gallon, horsepower, torr, knot and Btu
//! agree with `scipy.constants`.

use std::collections::HashMap;
use std::sync::LazyLock;

use super::scale::{Dimension, Scale};

/// One word of a unit: a symbol with its other spellings, what it measures and its size.
#[derive(Debug)]
pub(super) struct Word {
    /// The spelling that answers use.
    pub symbol: &'static str,
    /// Further spellings read in exactly this case, blanks between.
    exact: &'static str,
    /// Spellings read in any case, blanks between.
    spoken: &'static str,
    pub dimension: Dimension,
    pub scale: Scale,
}

/// The word that is spelt so.
pub(super) fn find(text: &str) -> Option<&'static Word> {
    static EXACT: LazyLock<HashMap<&str, &Word>> = LazyLock::new(|| {
        let spellings = |word: &'static Word| {
            let further = word.exact.split_ascii_whitespace();
            further
                .chain([word.symbol])
                .map(move |spelling| (spelling, word))
        };
        WORDS.iter().flat_map(spellings).collect()
    });
    static SPOKEN: LazyLock<HashMap<Letters, &Word>> = LazyLock::new(|| {
        let spellings = |word: &'static Word| {
            let letters = word.spoken.split_ascii_whitespace().filter_map(letters);
            letters.map(move |letters| (letters, word))
        };
        WORDS.iter().flat_map(spellings).collect()
    });
    if text.len() > ROOM {
        return None;
    }
    let exact = EXACT.get(text);
    exact.or_else(|| SPOKEN.get(&letters(text)?)).copied()
}

/// The usual form of a unit whose name is not made of the words it seems to consist of.
///
/// Read in any case, with or without blanks, full stops and brackets: `bar(g)`, `in. w.c.`.
pub(super) fn expand(text: &str) -> Option<&'static str> {
    static EXPANSIONS: LazyLock<HashMap<Letters, &str>> = LazyLock::new(|| {
        let expansion = |&(phrase, symbol)| Some((letters(phrase)?, symbol));
        PHRASES.iter().filter_map(expansion).collect()
    });
    EXPANSIONS.get(&letters(text)?).copied()
}

/// No spelling is longer; a longer text is not looked up, however long it is.
const ROOM: usize = 24;

/// A spelling without regard to case, blanks, full stops and brackets.
type Letters = [u8; ROOM];

/// The letters of a spelling; `None` when it has too many, or others than ASCII.
fn letters(text: &str) -> Option<Letters> {
    let mut letters = Letters::default();
    let mut room = letters.iter_mut();
    let dropped = |c: &char| c.is_whitespace() || matches!(c, '.' | '(' | ')');
    for c in text.chars().filter(|c| !dropped(c)) {
        let letter = u8::try_from(c).ok().filter(u8::is_ascii)?;
        *room.next()? = letter.to_ascii_lowercase();
    }
    Some(letters)
}

const NONE: Dimension = Dimension::NONE;
const LENGTH: Dimension = Dimension([1, 0, 0, 0, 0]);
const MASS: Dimension = Dimension([0, 1, 0, 0, 0]);
const TIME: Dimension = Dimension([0, 0, 1, 0, 0]);
pub(super) const TEMPERATURE: Dimension = Dimension([0, 0, 0, 1, 0]);
pub(super) const ANGLE: Dimension = Dimension([0, 0, 0, 0, 1]);
const VOLUME: Dimension = Dimension([3, 0, 0, 0, 0]);
const SPEED: Dimension = Dimension([1, 0, -1, 0, 0]);
const FORCE: Dimension = Dimension([1, 1, -2, 0, 0]);
pub(super) const PRESSURE: Dimension = Dimension([-1, 1, -2, 0, 0]);
const ENERGY: Dimension = Dimension([2, 1, -2, 0, 0]);
const POWER: Dimension = Dimension([2, 1, -3, 0, 0]);
const VISCOSITY: Dimension = Dimension([-1, 1, -1, 0, 0]);
const KINEMATIC: Dimension = Dimension([2, 0, -1, 0, 0]);

const UNITY: Scale = Scale::ONE;
const MILLI: Scale = part(1e3);
const CENTI: Scale = part(100.0);
const MINUTE: Scale = many(60.0);
const HOUR: Scale = many(3600.0);
const INCH: Scale = Scale::ratio(254.0, 10_000.0);
const FAHRENHEIT: Scale = Scale::ratio(5.0, 9.0);
const FOOT: Scale = Scale::ratio(3048.0, 10_000.0);
const MILE: Scale = Scale::ratio(1_609_344.0, 1000.0);
const NAUTICAL_MILE: Scale = many(1852.0);
const POUND: Scale = Scale::ratio(45_359_237.0, 1e8);
const GRAVITY: Scale = Scale::ratio(980_665.0, 1e5);
const POUND_FORCE: Scale = POUND.times(GRAVITY, 1);
const PSI: Scale = POUND_FORCE.times(INCH, -2);
const ATMOSPHERE: f64 = 101_325.0;
const MERCURY: Scale = Scale::ratio(135_951.0, 10.0).times(GRAVITY, 1);
const WATER: Scale = many(1000.0).times(GRAVITY, 1);
const CALORIE: Scale = Scale::ratio(41_868.0, 10_000.0);
const BTU: Scale = Scale::ratio(105_505_585_262.0, 1e8);

const fn many(count: f64) -> Scale {
    Scale::ratio(count, 1.0)
}

const fn part(count: f64) -> Scale {
    Scale::ratio(1.0, count)
}

const fn gauge(scale: Scale) -> Scale {
    scale.zero_at(ATMOSPHERE)
}

const fn word(
    symbol: &'static str,
    exact: &'static str,
    spoken: &'static str,
    dimension: Dimension,
    scale: Scale,
) -> Word {
    Word {
        symbol,
        exact,
        spoken,
        dimension,
        scale,
    }
}

#[rustfmt::skip]
static WORDS: &[Word] = &[
    word("m", "", "metre metres meter meters", LENGTH, UNITY),
    word("km", "", "km kilometre kilometres kilometer kilometers", LENGTH, many(1e3)),
    word("cm", "", "cm centimetre centimetres centimeter centimeters", LENGTH, CENTI),
    word("mm", "", "mm millimetre millimetres millimeter millimeters", LENGTH, MILLI),
    word("µm", "μm um", "micron microns micrometre micrometer", LENGTH, part(1e6)),
    word("nm", "", "nanometre nanometres nanometer nanometers", LENGTH, part(1e9)),
    word("in", "\" ″", "in inch inches", LENGTH, INCH),
    word("ft", "' ′", "ft foot feet", LENGTH, FOOT),
    word("yd", "", "yd yard yards", LENGTH, Scale::ratio(9144.0, 10_000.0)),
    word("mil", "", "mil mils thou", LENGTH, INCH.times(MILLI, 1)),
    word("L", "l", "litre litres liter liters", VOLUME, MILLI),
    word("mL", "ml", "millilitre millilitres milliliter milliliters", VOLUME, part(1e6)),
    word("gal", "", "gal gallon gallons", VOLUME, many(231.0).times(INCH, 3)),
    word("kg", "", "kg kilogram kilograms", MASS, UNITY),
    word("g", "", "gram grams", MASS, MILLI),
    word("t", "", "tonne tonnes", MASS, many(1e3)),
    word("lb", "", "lb lbs lbm pound pounds", MASS, POUND),
    word("oz", "", "oz ounce ounces", MASS, POUND.times(many(16.0), -1)),
    word("s", "", "sec secs second seconds", TIME, UNITY),
    word("min", "", "min mins minute minutes", TIME, MINUTE),
    word("h", "", "hr hrs hour hours", TIME, HOUR),
    word("d", "", "day days", TIME, many(86_400.0)),
    word("K", "", "kelvin degk", TEMPERATURE, UNITY),
    word("degC", "C ℃", "degc celsius centigrade", TEMPERATURE, UNITY.zero_at(273.15)),
    word("degF", "F ℉", "degf fahrenheit", TEMPERATURE, FAHRENHEIT.offset(5.0 * 459.67)),
    word("degR", "R", "degr rankine", TEMPERATURE, FAHRENHEIT),
    word("deg", "°", "deg degree degrees", ANGLE, UNITY),
    word("rad", "", "rad radian radians", ANGLE, Scale::ratio(180.0, std::f64::consts::PI)),
    word("mph", "", "mph", SPEED, MILE.times(HOUR, -1)),
    word("kn", "kt", "knot knots", SPEED, NAUTICAL_MILE.times(HOUR, -1)),
    word("N", "", "newton newtons", FORCE, UNITY),
    word("lbf", "", "", FORCE, POUND_FORCE),
    word("Pa", "", "pa pascal pascals", PRESSURE, UNITY),
    word("hPa", "", "hpa", PRESSURE, many(100.0)),
    word("kPa", "", "kpa", PRESSURE, many(1e3)),
    word("MPa", "", "", PRESSURE, many(1e6)),
    word("mPa", "", "", PRESSURE, MILLI),
    word("bar", "", "bar bars", PRESSURE, many(1e5)),
    word("mbar", "", "mbar millibar millibars", PRESSURE, many(100.0)),
    word("barg", "", "barg", PRESSURE, gauge(many(1e5))),
    word("bara", "", "bara", PRESSURE, many(1e5)),
    word("kPag", "", "kpag", PRESSURE, gauge(many(1e3))),
    word("mbarg", "", "mbarg", PRESSURE, gauge(many(100.0))),
    word("psi", "", "psi", PRESSURE, PSI),
    word("psia", "", "psia", PRESSURE, PSI),
    word("psig", "", "psig", PRESSURE, gauge(PSI)),
    word("atm", "", "atm atmosphere atmospheres", PRESSURE, many(ATMOSPHERE)),
    word("mmHg", "", "mmhg", PRESSURE, MERCURY.times(MILLI, 1)),
    word("torr", "", "torr", PRESSURE, Scale::ratio(ATMOSPHERE, 760.0)),
    word("inHg", "", "inhg", PRESSURE, MERCURY.times(INCH, 1)),
    word("inH2O", "", "inh2o", PRESSURE, WATER.times(INCH, 1)),
    word("mmH2O", "", "mmh2o", PRESSURE, WATER.times(MILLI, 1)),
    word("J", "", "joule joules", ENERGY, UNITY),
    word("kJ", "", "kj kilojoule kilojoules", ENERGY, many(1e3)),
    word("MJ", "", "megajoule megajoules", ENERGY, many(1e6)),
    word("GJ", "", "gigajoule gigajoules", ENERGY, many(1e9)),
    word("Wh", "", "", ENERGY, HOUR),
    word("kWh", "", "kwh", ENERGY, many(1e3).times(HOUR, 1)),
    word("MWh", "", "", ENERGY, many(1e6).times(HOUR, 1)),
    word("Btu", "", "btu btus", ENERGY, BTU),
    word("kBtu", "", "kbtu", ENERGY, many(1e3).times(BTU, 1)),
    word("MMBtu", "", "mmbtu", ENERGY, many(1e6).times(BTU, 1)),
    word("therm", "", "therm therms", ENERGY, many(1e5).times(BTU, 1)),
    word("kcal", "", "kcal kilocalorie kilocalories", ENERGY, many(1e3).times(CALORIE, 1)),
    word("W", "", "watt watts", POWER, UNITY),
    word("mW", "", "milliwatt milliwatts", POWER, MILLI),
    word("kW", "", "kw kilowatt kilowatts", POWER, many(1e3)),
    word("MW", "", "megawatt megawatts", POWER, many(1e6)),
    word("hp", "", "hp horsepower", POWER, many(550.0).times(FOOT, 1).times(POUND_FORCE, 1)),
    word("TR", "", "", POWER, many(12_000.0).times(BTU, 1).times(HOUR, -1)),
    word("P", "", "poise", VISCOSITY, part(10.0)),
    word("cP", "", "centipoise", VISCOSITY, MILLI),
    word("St", "", "stokes", KINEMATIC, part(1e4)),
    word("cSt", "", "cst centistokes", KINEMATIC, part(1e6)),
    word("%", "", "percent", NONE, CENTI),
];

static PHRASES: &[(&str, &str)] = &[
    ("bar g", "barg"),
    ("bar gauge", "barg"),
    ("mbar g", "mbarg"),
    ("kPa g", "kPag"),
    ("kPa gauge", "kPag"),
    ("psi g", "psig"),
    ("psi gauge", "psig"),
    ("bar a", "bara"),
    ("bar abs", "bara"),
    ("psi a", "psia"),
    ("psi abs", "psia"),
    ("kPa a", "kPa"),
    ("kPa abs", "kPa"),
    ("mm Hg", "mmHg"),
    ("in Hg", "inHg"),
    ("in H2O", "inH2O"),
    ("in w.c.", "inH2O"),
    ("in w.g.", "inH2O"),
    ("mm H2O", "mmH2O"),
    ("mm w.c.", "mmH2O"),
    ("BTUH", "Btu/h"),
    ("MBH", "kBtu/h"),
    ("fpm", "ft/min"),
    ("fps", "ft/s"),
    ("kph", "km/h"),
    ("ton of refrigeration", "TR"),
    ("tons of refrigeration", "TR"),
];

#[cfg(test)]
mod tests {
    use std::collections::{HashMap, HashSet};

    use super::super::expression;
    use super::{BTU, PHRASES, POUND, WORDS, Word, expand, find, many};

    fn spellings(word: &'static Word) -> impl Iterator<Item = &'static str> {
        let further = word
            .exact
            .split_ascii_whitespace()
            .chain(word.spoken.split_ascii_whitespace());
        std::iter::once(word.symbol).chain(further)
    }

    #[test]
    fn no_spelling_belongs_to_two_words() {
        let mut owners: HashMap<&str, &str> = HashMap::new();
        let mut shared = Vec::new();
        for word in WORDS {
            for spelling in spellings(word).collect::<HashSet<_>>() {
                shared.extend(
                    owners
                        .insert(spelling, word.symbol)
                        .map(|other| (spelling, other)),
                );
            }
        }
        assert!(shared.is_empty(), "{shared:?}");
    }

    #[test]
    fn every_spelling_reads_as_its_word() {
        let mut misread = Vec::new();
        for word in WORDS {
            for spelling in spellings(word) {
                let read = expression::read(spelling);
                if !read.is_some_and(|read| read.lead == word.symbol && read.factors == 1) {
                    misread.push(spelling);
                }
            }
        }
        assert!(misread.is_empty(), "{misread:?}");
    }

    #[test]
    fn spoken_spellings_are_read_in_any_case() {
        for word in WORDS {
            for spelling in word.spoken.split_ascii_whitespace() {
                let shouted = spelling.to_ascii_uppercase();
                assert_eq!(
                    find(&shouted).map(|word| word.symbol),
                    Some(word.symbol),
                    "{shouted}"
                );
            }
        }
    }

    #[test]
    fn every_phrase_expands_to_a_unit_however_it_is_set() {
        for &(phrase, symbol) in PHRASES {
            assert_eq!(expand(phrase), Some(symbol));
            assert_eq!(
                expand(&format!("({}.)", phrase.to_uppercase())),
                Some(symbol)
            );
            assert!(expression::read(symbol).is_some(), "{symbol}");
        }
        assert_eq!(expand("bar (g)"), Some("barg"));
        assert_eq!(expand(""), None);
    }

    #[test]
    fn the_btu_of_the_table_is_2326_joule_per_kilogram_to_the_pound() {
        let per_pound = BTU.times(POUND, -1);
        assert!(per_pound.agrees_with(many(2326.0)), "{per_pound:?}");
    }
}
