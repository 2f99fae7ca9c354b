//! Nominal pipe sizes and their outside diameters.

use super::kind::Kind;
use super::parse::parse;
use super::units::Unit;

/// Nominal diameter, nominal pipe size in inches, outside diameters in mm (EN 10220, series 1) and in inches (ASME B36.10M).
///
/// # Source
/// EN 10220:2002 table 1 and ASME B36.10M, from memory; the outside diameters of the two agree within 0.3 mm but for DN 65, 125 and the largest.
const SIZES: [(u16, &str, f64, f64); 25] = [
    (6, "1/8", 10.2, 0.405),
    (8, "1/4", 13.5, 0.540),
    (10, "3/8", 17.2, 0.675),
    (15, "1/2", 21.3, 0.840),
    (20, "3/4", 26.9, 1.050),
    (25, "1", 33.7, 1.315),
    (32, "1 1/4", 42.4, 1.660),
    (40, "1 1/2", 48.3, 1.900),
    (50, "2", 60.3, 2.375),
    (65, "2 1/2", 76.1, 2.875),
    (80, "3", 88.9, 3.500),
    (100, "4", 114.3, 4.500),
    (125, "5", 139.7, 5.563),
    (150, "6", 168.3, 6.625),
    (200, "8", 219.1, 8.625),
    (250, "10", 273.0, 10.75),
    (300, "12", 323.9, 12.75),
    (350, "14", 355.6, 14.0),
    (400, "16", 406.4, 16.0),
    (450, "18", 457.0, 18.0),
    (500, "20", 508.0, 20.0),
    (600, "24", 610.0, 24.0),
    (700, "28", 711.0, 28.0),
    (750, "30", 762.0, 30.0),
    (800, "32", 813.0, 32.0),
];

/// The outside diameter of `"DN 80"` or `"NPS 3"` in m; none where the text is no nominal size at all.
///
/// # Errors
/// The text names a nominal size that does not exist; says which do.
pub fn nominal_diameter(text: &str) -> Result<Option<f64>, String> {
    let text = text.trim();
    let series = |prefix: &str| {
        let (head, rest) = text.split_at_checked(prefix.len())?;
        head.eq_ignore_ascii_case(prefix).then(|| rest.trim())
    };
    if let Some(size) = series("DN") {
        let found = SIZES.iter().find(|(dn, ..)| size.parse() == Ok(*dn));
        let Some(&(_, _, millimetres, _)) = found else {
            let known = SIZES.map(|(dn, ..)| dn.to_string()).join(", ");
            return Err(format!(
                "there is no nominal diameter {text:?}; there are DN {known}"
            ));
        };
        return Ok(read(&format!("{millimetres} mm")));
    }
    if let Some(size) = series("NPS") {
        let size = size
            .trim_end_matches(['"', ' '])
            .trim_end_matches("in")
            .trim_end();
        let found = SIZES.iter().find(|(_, nps, ..)| *nps == size);
        let Some(&(.., inches)) = found else {
            let known = SIZES.map(|(_, nps, ..)| nps).join(", ");
            return Err(format!(
                "there is no nominal pipe size {text:?}; there are NPS {known}"
            ));
        };
        return Ok(read(&format!("{inches} in")));
    }
    Ok(None)
}

/// Whether a length is an inch size that is also a nominal size with another outside diameter.
pub fn looks_nominal(text: &str) -> bool {
    let Ok(reading) = parse(text, Kind::Length, Kind::Length.si_unit()) else {
        return false;
    };
    let inches = Unit::find(Kind::Length, "in");
    if reading.bare || inches.as_ref() != Ok(&reading.unit) {
        return false;
    }
    SIZES.iter().any(|&(_, nps, _, outside)| {
        let nominal = read(&format!("{nps} in"));
        nominal.is_some_and(|nominal| (nominal / reading.value - 1.0).abs() < 1e-9)
            && read(&format!("{outside} in")) != nominal
    })
}

fn read(text: &str) -> Option<f64> {
    parse(text, Kind::Length, Kind::Length.si_unit())
        .ok()
        .map(|reading| reading.value)
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn nominal_sizes_are_outside_diameters() {
        assert_eq!(nominal_diameter("DN 80"), Ok(Some(0.0889)));
        assert_eq!(nominal_diameter("dn80"), Ok(Some(0.0889)));
        assert_eq!(nominal_diameter("NPS 3"), Ok(Some(0.0889)));
        assert_eq!(nominal_diameter("NPS 1 1/4"), Ok(Some(0.042164)));
        assert_eq!(nominal_diameter("nps 3 in"), Ok(Some(0.0889)));
        assert_eq!(nominal_diameter("88.9 mm"), Ok(None));
        assert!(
            nominal_diameter("DN 81")
                .unwrap_err()
                .contains("DN 6, 8, 10")
        );
        assert!(nominal_diameter("NPS 3.1").is_err());
    }

    #[test]
    fn inch_sizes_that_look_nominal() {
        assert!(looks_nominal("3 in"));
        assert!(looks_nominal("1 1/4\""));
        assert!(looks_nominal("0.5 in"));
        assert!(!looks_nominal("3.5 in"));
        assert!(!looks_nominal("14 in"));
        assert!(!looks_nominal("3"));
        assert!(!looks_nominal("3 mm"));
        assert!(!looks_nominal("nonsense"));
    }

    /// Where the two series differ, EN 10220 rounds the inch size to tenths of a millimetre and, from DN 450 on, to whole ones.
    #[test]
    fn the_two_series_agree() {
        for (dn, nps, millimetres, inches) in SIZES {
            let difference = (millimetres / 25.4 - inches).abs() * 25.4;
            let allowed = match dn {
                65 => 3.2,
                125 => 1.7,
                _ => 0.45,
            };
            assert!(difference < allowed, "DN {dn} NPS {nps}: {difference} mm");
        }
    }
}
