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
    fields: Vec<(String, Unit)>,
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
    /// Reads pairs of a key and a unit; `fields` knows the kind of every field.
    ///
    /// A key is a field or a kind; `kind.length` is the kind where a field has that name too.
    ///
    /// # Errors
    /// Every fault of every pair.
    pub fn parse_pairs<'a>(
        pairs: impl Iterator<Item = (&'a str, &'a str)>,
        fields: &dyn Fn(&str) -> Option<Kind>,
    ) -> Result<UnitChoice, Vec<ChoiceFault>> {
        collect(pairs.map(Ok), fields)
    }

    /// Reads the form of a query, `temperature:degC,length:mm`.
    ///
    /// # Errors
    /// Every fault of every pair.
    pub fn parse_text(
        text: &str,
        fields: &dyn Fn(&str) -> Option<Kind>,
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
        let own = self
            .fields
            .iter()
            .find(|(name, unit)| name == field && unit.kind() == kind);
        own.map(|&(_, unit)| unit)
            .or_else(|| self.kinds.iter().copied().find(|unit| unit.kind() == kind))
            .unwrap_or_else(|| kind.si_unit())
    }

    fn add(
        &mut self,
        key: &str,
        symbol: &str,
        fields: &dyn Fn(&str) -> Option<Kind>,
    ) -> Result<(), ChoiceFault> {
        let fault = |code, detail| ChoiceFault {
            key: excerpt(key),
            code,
            detail,
        };
        let field = fields(key);
        let kind = field
            .or_else(|| Kind::from_name(key.strip_prefix(KIND_PREFIX).unwrap_or(key)))
            .ok_or_else(|| fault("unknown-key", unknown(key)))?;
        let unit =
            Unit::find(kind, symbol).map_err(|error| fault(error.code(), error.to_string()))?;
        let taken = match field {
            Some(_) => self.fields.iter().any(|(name, _)| name == key),
            None => self.kinds.iter().any(|unit| unit.kind() == kind),
        };
        if taken {
            let detail = format!("\"{}\" has a unit already: give one", excerpt(key));
            return Err(fault("duplicate-key", detail));
        }
        match field {
            Some(_) => self.fields.push((key.to_owned(), unit)),
            None => self.kinds.push(unit),
        }
        Ok(())
    }
}

/// Gathers a choice from pairs, or from texts in their place that are none.
fn collect<'a>(
    pairs: impl Iterator<Item = Result<(&'a str, &'a str), &'a str>>,
    fields: &dyn Fn(&str) -> Option<Kind>,
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

fn unknown(key: &str) -> String {
    let name = key.strip_prefix(KIND_PREFIX).unwrap_or(key);
    let given = excerpt(key);
    match nearest(name, Kind::ALL.into_iter().map(Kind::name)) {
        Some(kind) => format!("\"{given}\" is no field or kind: did you mean {kind}?"),
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

    fn fields(name: &str) -> Option<Kind> {
        match name {
            "length" | "diameter" => Some(Kind::Length),
            "surface_temperature" => Some(Kind::Temperature),
            _ => None,
        }
    }

    fn choose(text: &str) -> Result<UnitChoice, Vec<ChoiceFault>> {
        UnitChoice::parse_text(text, &fields)
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
    fn a_name_that_is_both_is_the_field_unless_put_down_as_the_kind() {
        let field = choose("length:mm").unwrap();
        assert_eq!(symbol(&field, "length", Kind::Length), "mm");
        assert_eq!(symbol(&field, "diameter", Kind::Length), "m");
        let both = choose("kind.length:in,length:ft").unwrap();
        assert_eq!(symbol(&both, "length", Kind::Length), "ft");
        assert_eq!(symbol(&both, "diameter", Kind::Length), "in");
    }

    #[test]
    fn pairs_read_as_text_does() {
        let pairs = [("temperature", "degC"), ("diameter", "mm")];
        let choice = UnitChoice::parse_pairs(pairs.into_iter(), &fields);
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
            details[7].contains("temperature_difference"),
            "{}",
            details[7]
        );
    }
}
