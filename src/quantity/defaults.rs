//! The units that a request chose for its bare numbers or its answers.

use super::error::excerpt;
use super::kind::Kind;
use super::nearest::nearest;
use super::units::Unit;

/// Puts a key down as a kind where a field has the same name.
const KIND_PREFIX: &str = "kind.";

/// The chosen units; SI where nothing was chosen.
#[derive(Clone, Debug, Default, PartialEq)]
pub struct UnitChoice {
    kinds: Vec<Unit>,
    fields: Vec<(&'static str, Unit)>,
}

/// What is wrong with one entry of a choice.
#[derive(Clone, Debug, PartialEq)]
pub struct ChoiceFault {
    /// The key at fault, as given.
    pub key: String,
    /// `unknown-key`, `duplicate-key`, `not-a-pair` or the code of a [`QuantityError`].
    ///
    /// [`QuantityError`]: super::QuantityError
    pub code: &'static str,
    /// What was given, what is wrong and what would do.
    pub detail: String,
}

impl UnitChoice {
    /// Reads pairs of a key and a unit; `fields` are the names of all fields with their kinds.
    ///
    /// A key is a field or a kind, and a field beats its kind. A name that is both serves the
    /// field and, where `kind.length` does not say otherwise, every other field of the kind.
    ///
    /// # Errors
    /// Every fault of every pair.
    pub fn parse_pairs<'a>(
        pairs: impl Iterator<Item = (&'a str, &'a str)>,
        fields: &[(&'static str, Kind)],
    ) -> Result<UnitChoice, Vec<ChoiceFault>> {
        collect(pairs.map(Ok), fields)
    }

    /// Reads the form of a query, `temperature:degC,length:mm`.
    ///
    /// # Errors
    /// Every fault of every pair.
    pub fn parse_text(
        text: &str,
        fields: &[(&'static str, Kind)],
    ) -> Result<UnitChoice, Vec<ChoiceFault>> {
        if text.trim().is_empty() {
            return Ok(UnitChoice::default());
        }
        collect(
            text.split(',').map(|pair| pair.split_once(':').ok_or(pair)),
            fields,
        )
    }

    /// The unit of bare numbers in `field`, which is of `kind`: the field's own, the kind's,
    /// or that of SI.
    pub fn unit(&self, field: &str, kind: Kind) -> Unit {
        let of_field = |wanted: &str| {
            let mut fields = self.fields.iter();
            fields
                .find(|(name, unit)| *name == wanted && unit.kind() == kind)
                .map(|&(_, unit)| unit)
        };
        of_field(field)
            .or_else(|| self.kinds.iter().copied().find(|unit| unit.kind() == kind))
            .or_else(|| of_field(kind.name()))
            .unwrap_or_else(|| kind.si_unit())
    }

    fn add(
        &mut self,
        key: &str,
        symbol: &str,
        fields: &[(&'static str, Kind)],
    ) -> Result<(), ChoiceFault> {
        let fault = |code, detail| ChoiceFault {
            key: excerpt(key),
            code,
            detail,
        };
        let field = fields.iter().find(|(name, _)| *name == key);
        let kind = field
            .map(|&(_, kind)| kind)
            .or_else(|| Kind::from_name(key.strip_prefix(KIND_PREFIX).unwrap_or(key)))
            .ok_or_else(|| fault("unknown-key", unknown(key, fields)))?;
        let unit =
            Unit::find(kind, symbol).map_err(|error| fault(error.code(), error.to_string()))?;
        let taken = match field {
            Some(_) => self.fields.iter().any(|(name, _)| *name == key),
            None => self.kinds.iter().any(|unit| unit.kind() == kind),
        };
        if taken {
            let detail = format!("\"{}\" has a unit already: give one", excerpt(key));
            return Err(fault("duplicate-key", detail));
        }
        match field {
            Some(&(name, _)) => self.fields.push((name, unit)),
            None => self.kinds.push(unit),
        }
        Ok(())
    }
}

/// Gathers a choice from pairs, or from texts in their place that are none.
fn collect<'a>(
    pairs: impl Iterator<Item = Result<(&'a str, &'a str), &'a str>>,
    fields: &[(&'static str, Kind)],
) -> Result<UnitChoice, Vec<ChoiceFault>> {
    let mut choice = UnitChoice::default();
    let mut faults = Vec::new();
    for pair in pairs {
        let added = match pair {
            Ok((key, symbol)) => choice.add(key.trim(), symbol, fields),
            Err(text) => Err(not_a_pair(text.trim())),
        };
        faults.extend(added.err());
    }
    if faults.is_empty() {
        Ok(choice)
    } else {
        Err(faults)
    }
}

fn not_a_pair(text: &str) -> ChoiceFault {
    let key = excerpt(text);
    let detail = format!("\"{key}\" is no pair: write a kind or field and its unit, length:mm");
    ChoiceFault {
        key,
        code: "not-a-pair",
        detail,
    }
}

fn unknown(key: &str, fields: &[(&'static str, Kind)]) -> String {
    let name = key.strip_prefix(KIND_PREFIX).unwrap_or(key);
    let given = excerpt(key);
    let known = fields.iter().map(|&(name, _)| name);
    match nearest(name, Kind::ALL.into_iter().map(Kind::name).chain(known)) {
        Some(near) => format!("\"{given}\" is no field or kind: did you mean {near}?"),
        None => {
            let kinds = Kind::ALL.map(Kind::name).join(", ");
            format!("\"{given}\" is no field or kind: write a field's name or one of {kinds}")
        }
    }
}

#[cfg(test)]
mod tests {
    use super::super::kind::Kind;
    use super::{ChoiceFault, UnitChoice};

    const FIELDS: [(&str, Kind); 3] = [
        ("length", Kind::Length),
        ("diameter", Kind::Length),
        ("surface_temperature", Kind::Temperature),
    ];

    fn choose(text: &str) -> Result<UnitChoice, Vec<ChoiceFault>> {
        UnitChoice::parse_text(text, &FIELDS)
    }

    fn symbol(choice: &UnitChoice, field: &str, kind: Kind) -> &'static str {
        choice.unit(field, kind).symbol()
    }

    #[test]
    fn nothing_chosen_is_si() {
        for text in ["", "  "] {
            let choice = choose(text).unwrap();
            assert_eq!(choice, UnitChoice::default());
            for kind in Kind::ALL {
                assert_eq!(choice.unit("anything", kind), kind.si_unit());
            }
        }
    }

    #[test]
    fn a_field_beats_its_kind() {
        let choice = choose("temperature:°C, surface_temperature : degF").unwrap();
        assert_eq!(
            symbol(&choice, "surface_temperature", Kind::Temperature),
            "degF"
        );
        assert_eq!(
            symbol(&choice, "ambient_temperature", Kind::Temperature),
            "degC"
        );
        assert_eq!(symbol(&choice, "rise", Kind::TemperatureDifference), "K");
    }

    #[test]
    fn a_name_that_is_both_serves_the_field_and_the_kind() {
        let field = choose("length:mm").unwrap();
        assert_eq!(symbol(&field, "length", Kind::Length), "mm");
        assert_eq!(symbol(&field, "diameter", Kind::Length), "mm");
        let own = choose("length:mm,diameter:in").unwrap();
        assert_eq!(symbol(&own, "diameter", Kind::Length), "in");
        let both = choose("kind.length:in,length:ft").unwrap();
        assert_eq!(symbol(&both, "length", Kind::Length), "ft");
        assert_eq!(symbol(&both, "diameter", Kind::Length), "in");
    }

    #[test]
    fn pairs_read_as_text_does() {
        let pairs = [("temperature", "degC"), ("diameter", "mm")];
        let choice = UnitChoice::parse_pairs(pairs.into_iter(), &FIELDS);
        assert_eq!(choice, choose("temperature:degC,diameter:mm"));
        assert!(choice.is_ok());
    }

    #[test]
    fn every_fault_is_reported() {
        let faults = choose(
            "temprature:degC,mass:mm,area:furlong,diameter,,speed:m/s,kind.speed:mph,\
             diameter:in,diameter:mm,kind.diameter:mm",
        )
        .unwrap_err();
        let found: Vec<_> = faults
            .iter()
            .map(|fault| (fault.key.as_str(), fault.code))
            .collect();
        assert_eq!(
            found,
            [
                ("temprature", "unknown-key"),
                ("mass", "wrong-kind"),
                ("area", "unknown-unit"),
                ("diameter", "not-a-pair"),
                ("", "not-a-pair"),
                ("kind.speed", "duplicate-key"),
                ("diameter", "duplicate-key"),
                ("kind.diameter", "unknown-key"),
            ]
        );
        let details: Vec<_> = faults.iter().map(|fault| fault.detail.as_str()).collect();
        assert!(
            details[0].ends_with("did you mean temperature?"),
            "{}",
            details[0]
        );
        assert_eq!(
            details[1],
            "\"mm\" is a unit of length, not of mass: write one of kg, g, t, lb, oz"
        );
        assert!(
            details[2].contains("write one of m2, cm2"),
            "{}",
            details[2]
        );
        assert!(
            details[7].ends_with("did you mean diameter?"),
            "{}",
            details[7]
        );
    }
}
