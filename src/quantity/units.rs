//! The units that each kind is read and written in.

use std::fmt;
use std::sync::LazyLock;

use super::error::{QuantityError, excerpt};
use super::expression::{self, Measure};
use super::kind::Kind;
use super::nearest::nearest;

/// The symbols of a kind's units, the internal one first.
const fn symbols(kind: Kind) -> &'static [&'static str] {
    match kind {
        Kind::Temperature | Kind::TemperatureDifference => &["K", "degC", "degF", "degR"],
        Kind::Length => &["m", "km", "cm", "mm", "µm", "nm", "in", "ft", "yd", "mil"],
        Kind::Area => &["m2", "cm2", "mm2", "ft2", "in2"],
        Kind::Volume => &["m3", "L", "mL", "ft3", "gal"],
        Kind::Speed => &["m/s", "km/h", "cm/s", "mm/s", "ft/s", "ft/min", "mph", "kn"],
        Kind::Pressure => &[
            "Pa", "hPa", "kPa", "MPa", "bar", "mbar", "barg", "bara", "kPag", "mbarg", "psi",
            "psia", "psig", "atm", "mmHg", "torr", "inHg", "inH2O", "mmH2O",
        ],
        Kind::HeatFlow => &[
            "W", "mW", "kW", "MW", "Btu/h", "kBtu/h", "MMBtu/h", "kcal/h", "kJ/h", "hp", "TR",
        ],
        Kind::HeatFlux => &[
            "W/m2",
            "kW/m2",
            "W/cm2",
            "W/ft2",
            "Btu/(h ft2)",
            "kcal/(h m2)",
        ],
        Kind::HeatFlowPerLength => &["W/m", "kW/m", "W/ft", "Btu/(h ft)", "kcal/(h m)"],
        Kind::Coefficient => &["W/(m2 K)", "kW/(m2 K)", "Btu/(h ft2 degF)", "kcal/(h m2 K)"],
        Kind::Conductivity => &[
            "W/(m K)",
            "mW/(m K)",
            "Btu/(h ft degF)",
            "Btu in/(h ft2 degF)",
            "kcal/(h m K)",
        ],
        Kind::Resistance => &["m2 K/W", "h ft2 degF/Btu"],
        Kind::Energy => &[
            "J", "kJ", "MJ", "GJ", "Wh", "kWh", "MWh", "Btu", "kBtu", "MMBtu", "therm", "kcal",
        ],
        Kind::Mass => &["kg", "g", "t", "lb", "oz"],
        Kind::Time => &["s", "min", "h", "d"],
        Kind::Angle => &["deg", "rad"],
        Kind::Acceleration => &["m/s2", "ft/s2"],
        Kind::Density => &["kg/m3", "g/cm3", "kg/L", "lb/ft3"],
        Kind::SpecificHeat => &["J/(kg K)", "kJ/(kg K)", "Btu/(lb degF)", "kcal/(kg K)"],
        Kind::Viscosity => &["Pa s", "mPa s", "cP", "P", "lb/(ft s)", "lb/(ft h)"],
        Kind::KinematicViscosity => &["m2/s", "mm2/s", "cSt", "St", "ft2/s"],
        Kind::Expansion => &["1/K", "1/degF"],
        Kind::Number => &["1", "%"],
    }
}

struct Entry {
    kind: Kind,
    symbol: &'static str,
    measure: Measure,
}

static TABLE: LazyLock<[Vec<Entry>; Kind::ALL.len()]> =
    LazyLock::new(|| Kind::ALL.map(|kind| symbols(kind).iter().map(entry(kind)).collect()));

fn entry(kind: Kind) -> impl Fn(&&'static str) -> Entry {
    move |&symbol| {
        let measure = measured_as(kind, symbol)
            .expect("symbols are written in the words of the table, which a test checks");
        Entry {
            kind,
            symbol,
            measure,
        }
    }
}

/// Reads a unit expression as a unit of `kind`: differences do not know a zero point.
fn measured_as(kind: Kind, text: &str) -> Option<Measure> {
    let measure = expression::read(text)?;
    Some(match kind {
        Kind::TemperatureDifference => Measure {
            scale: measure.scale.step(),
            ..measure
        },
        _ => measure,
    })
}

fn entries(kind: Kind) -> &'static [Entry] {
    &TABLE[kind as usize]
}

/// The internal unit of a kind.
pub(super) fn first(kind: Kind) -> Unit {
    Unit(&entries(kind)[0])
}

/// Every unit of a kind, the internal one first.
pub(super) fn of(kind: Kind) -> impl Iterator<Item = Unit> {
    entries(kind).iter().map(Unit)
}

/// A unit of one kind.
#[derive(Clone, Copy)]
pub struct Unit(&'static Entry);

impl Unit {
    /// Finds a unit of `kind` by its symbol or any other way of writing it.
    ///
    /// # Errors
    /// [`QuantityError::UnknownUnit`] and [`QuantityError::WrongKind`].
    pub fn find(kind: Kind, symbol: &str) -> Result<Unit, QuantityError> {
        let symbol = symbol.trim();
        let listed = of(kind).find(|unit| unit.symbol() == symbol);
        listed
            .or_else(|| equal(kind, symbol))
            .ok_or_else(|| unfit(kind, symbol))
    }

    /// The symbol that answers use.
    pub fn symbol(self) -> &'static str {
        self.0.symbol
    }

    /// The kind it is a unit of.
    pub fn kind(self) -> Kind {
        self.0.kind
    }

    /// Whether it is the unit that values have inside the service.
    pub fn is_si(self) -> bool {
        self == first(self.kind())
    }

    /// The value in SI (degrees for angles) of `value` in this unit.
    pub fn to_si(self, value: f64) -> f64 {
        self.0.measure.scale.apply(value)
    }

    /// The value in this unit of `value` in SI (degrees for angles).
    pub fn from_si(self, value: f64) -> f64 {
        self.0.measure.scale.invert(value)
    }
}

impl PartialEq for Unit {
    fn eq(&self, other: &Unit) -> bool {
        std::ptr::eq(self.0, other.0)
    }
}

impl Eq for Unit {}

impl fmt::Debug for Unit {
    fn fmt(&self, f: &mut fmt::Formatter<'_>) -> fmt::Result {
        write!(f, "Unit({} {})", self.kind().name(), self.symbol())
    }
}

/// The unit of the same size that an expression means, best the one that starts alike.
fn equal(kind: Kind, text: &str) -> Option<Unit> {
    let meant = measured_as(kind, text)?;
    let fits = |entry: &&Entry| {
        entry.measure.dimension == meant.dimension && entry.measure.scale.agrees_with(meant.scale)
    };
    let mut equals = entries(kind).iter().filter(fits);
    let alike = equals
        .clone()
        .find(|entry| entry.measure.lead == meant.lead);
    alike.or_else(|| equals.next()).map(Unit)
}

/// Why a text is not a unit of `kind`.
fn unfit(kind: Kind, text: &str) -> QuantityError {
    let unit = excerpt(text);
    let dimension = |kind: Kind| entries(kind)[0].measure.dimension;
    let of_its_own = expression::read(text).and_then(|meant| {
        Kind::ALL
            .into_iter()
            .find(|&other| dimension(other) == meant.dimension)
    });
    match of_its_own {
        Some(measures) if dimension(measures) != dimension(kind) => QuantityError::WrongKind {
            unit,
            measures,
            kind,
        },
        _ => {
            let resembles = nearest(text, symbols(kind).iter().copied());
            QuantityError::UnknownUnit {
                unit,
                kind,
                resembles,
            }
        }
    }
}

#[cfg(test)]
mod tests {
    use std::collections::HashSet;

    use super::super::kind::Kind;
    use super::entries;

    #[test]
    fn the_units_of_a_kind_are_distinct_and_measure_the_same() {
        for kind in Kind::ALL {
            let mut symbols = HashSet::new();
            for entry in entries(kind) {
                assert_eq!(entry.kind, kind);
                assert!(symbols.insert(entry.symbol), "{} twice", entry.symbol);
                let first = entries(kind)[0].measure.dimension;
                assert_eq!(entry.measure.dimension, first, "{}", entry.symbol);
            }
        }
    }

    #[test]
    fn units_of_one_size_start_with_different_words() {
        for kind in Kind::ALL {
            for (index, entry) in entries(kind).iter().enumerate() {
                let alike = entries(kind)[..index].iter().find(|other| {
                    other.measure.lead == entry.measure.lead
                        && other.measure.scale.agrees_with(entry.measure.scale)
                });
                let symbol = entry.symbol;
                assert!(
                    alike.is_none(),
                    "{symbol} is {:?}",
                    alike.map(|other| other.symbol)
                );
            }
        }
    }

    #[test]
    fn no_two_kinds_measure_the_same_but_temperatures_and_their_differences() {
        let mut shared = Vec::new();
        for (index, kind) in Kind::ALL.into_iter().enumerate() {
            let dimension = |kind: Kind| entries(kind)[0].measure.dimension;
            let earlier = Kind::ALL[..index].iter();
            shared.extend(
                earlier
                    .filter(|&&other| dimension(other) == dimension(kind))
                    .map(|&k| (k, kind)),
            );
        }
        assert_eq!(shared, [(Kind::Temperature, Kind::TemperatureDifference)]);
    }
}
