//! The known name that a misspelt one resembles.

/// No name worth a suggestion is longer.
const LONGEST: usize = 64;

/// The known name that `given` was probably meant to be, if one is near enough.
///
/// Near is one slip in three letters: a letter wrong, missing, added or exchanged with its
/// neighbour. Case does not count, nor does the choice of hyphen, underscore or blank.
///
/// # Source
/// Optimal string alignment distance: Damerau, F. J. (1964), Commun. ACM 7, 171-176, and
/// Levenshtein, V. I. (1966), Sov. Phys. Dokl. 10, 707-710; from memory.
pub fn nearest<'a>(given: &str, known: impl Iterator<Item = &'a str>) -> Option<&'a str> {
    let given = letters(given)?;
    known
        .filter_map(|name| {
            let letters = letters(name)?;
            let slips = slips(&given, &letters);
            (slips <= given.len().max(letters.len()) / 3).then_some((slips, name))
        })
        .min_by_key(|&(slips, _)| slips)
        .map(|(_, name)| name)
}

/// The letters that are compared; `None` for nothing at all or more than a name.
fn letters(name: &str) -> Option<Vec<char>> {
    let plain = |c| match c {
        '_' | ' ' => '-',
        _ => c,
    };
    let letters: Vec<char> = name
        .trim()
        .chars()
        .flat_map(char::to_lowercase)
        .map(plain)
        .take(LONGEST + 1)
        .collect();
    (1..=LONGEST).contains(&letters.len()).then_some(letters)
}

fn slips(a: &[char], b: &[char]) -> usize {
    let mut before = vec![0; b.len() + 1];
    let mut above: Vec<usize> = (0..=b.len()).collect();
    for i in 1..=a.len() {
        let mut row = vec![i; b.len() + 1];
        for j in 1..=b.len() {
            let wrong = above[j - 1] + usize::from(a[i - 1] != b[j - 1]);
            row[j] = wrong.min(above[j] + 1).min(row[j - 1] + 1);
            let exchanged = i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1];
            if exchanged {
                row[j] = row[j].min(before[j - 2] + 1);
            }
        }
        before = std::mem::replace(&mut above, row);
    }
    above[b.len()]
}

#[cfg(test)]
mod tests {
    use super::{letters, nearest, slips};

    #[test]
    fn distances_count_slips() {
        for (a, b, distance) in [
            ("kitten", "sitting", 3),
            ("length", "lenght", 1),
            ("degC", "degc", 0),
            ("vertical_plate", "vertical-plate", 0),
            ("ab", "abcd", 2),
            ("abcd", "b", 3),
        ] {
            assert_eq!(
                slips(&letters(a).unwrap(), &letters(b).unwrap()),
                distance,
                "{a} {b}"
            );
        }
    }

    #[test]
    fn near_names_are_offered_and_far_ones_are_not() {
        let known = ["diameter", "inner_diameter", "height", "length"];
        let offer = |given| nearest(given, known.into_iter());
        assert_eq!(offer("diametre"), Some("diameter"));
        assert_eq!(offer("inner-diamter"), Some("inner_diameter"));
        assert_eq!(offer("Lenght"), Some("length"));
        assert_eq!(offer("hight"), Some("height"));
        assert_eq!(offer("emissivity"), None);
        assert_eq!(offer("x"), None);
        assert_eq!(offer(""), None);
        assert_eq!(offer(&"length".repeat(1000)), None);
        assert_eq!(nearest("length", std::iter::empty()), None);
    }
}
