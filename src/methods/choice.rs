//! The automatic choice.

use super::groups::{RangeStatus, Verdict};

/// Chooses among entered methods, in their order: the first that is usable, else the first near its range, else the first.
pub fn choose<T>(entered: impl Iterator<Item = T>, verdict: impl Fn(&T) -> Verdict) -> Option<T> {
    let mut fallback: Option<T> = None;
    for candidate in entered {
        let found = verdict(&candidate);
        if found.usable {
            return Some(candidate);
        }
        let is_nearer = |held: &T| {
            found.status == RangeStatus::Near && verdict(held).status == RangeStatus::Beyond
        };
        if fallback.as_ref().is_none_or(is_nearer) {
            fallback = Some(candidate);
        }
    }
    fallback
}
