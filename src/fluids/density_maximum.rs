//! The temperature at which a liquid is densest.

use super::conditions::Conditions;
use super::grid::Grid;
use super::table::Table;

/// What a table tells of its greatest density.
pub(super) enum DensityMaximum {
    /// The expansion does not change its sign.
    None,
    /// It does at this temperature, K.
    At(f64),
    /// It may, by the composition of the mixture.
    ByComposition,
}

/// The first temperature from a lowest one on at which the expansion rises through zero, by
/// halving until the interval is lost in rounding.
///
/// # Units
/// K
pub(super) fn search(
    grid: &Grid,
    table: &Table,
    conditions: &Conditions,
    lowest: f64,
) -> Option<f64> {
    const HALVINGS: u32 = 64;
    let expansion = |temperature: f64| {
        let position = grid.locate(temperature)?;
        Some(table.state(position, temperature, conditions).expansion)
    };
    let crosses = |&(low, high): &(f64, f64)| {
        let ends = expansion(low).zip(expansion(high));
        ends.is_some_and(|(low, high)| low < 0.0 && high > 0.0)
    };
    let mut intervals = grid
        .nodes()
        .windows(2)
        .map(|pair| (pair[0].max(lowest), pair[1]))
        .filter(|(low, high)| low < high);
    let (mut low, mut high) = intervals.find(crosses)?;
    for _ in 0..HALVINGS {
        let middle = 0.5 * (low + high);
        if expansion(middle)? < 0.0 {
            low = middle;
        } else {
            high = middle;
        }
    }
    Some(low)
}
