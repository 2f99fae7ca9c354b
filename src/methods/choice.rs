//! The automatic choice.

use super::range::Verdict;

/// Chooses among entered methods the one whose ranges the case is least outside of, the earlier of equals.
pub fn choose<T>(entered: impl Iterator<Item = T>, verdict: impl Fn(&T) -> Verdict) -> Option<T> {
    let mut best: Option<(f64, T)> = None;
    for candidate in entered {
        let distance = verdict(&candidate).distance;
        if distance == 0.0 {
            return Some(candidate);
        }
        if best.as_ref().is_none_or(|(held, _)| distance < *held) {
            best = Some((distance, candidate));
        }
    }
    best.map(|(_, candidate)| candidate)
}

/// The method that the automatic choice would take just across the edge of a range: another one hardly farther from its own ranges than the chosen.
pub fn neighbour<T>(
    entered: impl Iterator<Item = T>,
    verdict: impl Fn(&T) -> Verdict,
    chosen: &Verdict,
) -> Option<T> {
    const NEAR: f64 = 1.0;
    let mut others = entered.map(|other| (verdict(&other).distance, other));
    let close = |distance: f64| distance > 0.0 && distance - chosen.distance <= NEAR;
    others
        .find(|(distance, _)| close(*distance))
        .map(|(_, other)| other)
}
