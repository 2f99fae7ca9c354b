//! The comparison of neighbours along a sweep.

use plumeline::case::{Case, Column, NoteCode, Wanted};

use crate::support::{answer, outcome_of};

/// The share by which neighbours may differ.
const STEP: f64 = 0.01;

/// How often the span between two neighbours that differ by more is halved, which tells a step
/// from a slope: no coefficient here changes by 1 % over a four-thousandth of such a span.
const HALVINGS: u32 = 12;

/// A place in a sweep, its case and its coefficient.
#[derive(Clone)]
struct Point {
    position: f64,
    case: Case,
    coefficient: f64,
}

/// Neighbours compared, and all unannounced steps between them.
#[derive(Default)]
pub struct Findings {
    pairs: usize,
    steps: Vec<String>,
}

impl Findings {
    /// Compares the neighbours of one sweep; where a case has no answer the sweep begins anew.
    pub fn sweep(
        &mut self,
        label: &str,
        positions: impl Iterator<Item = f64>,
        case_at: impl Fn(f64) -> Option<Case>,
    ) {
        let wanted = Wanted::of(&[Column::HeatTransferCoefficient]);
        let point_at = |position| {
            let case = case_at(position)?;
            let coefficient = outcome_of(&case, wanted).ok()?.heat_transfer_coefficient;
            Some(Point {
                position,
                case,
                coefficient,
            })
        };
        let mut before: Option<Point> = None;
        for position in positions {
            let found = point_at(position);
            if let (Some(first), Some(second)) = (&before, &found) {
                self.pairs += 1;
                if let Some((first, second)) = narrowed(first, second, &point_at) {
                    self.compare(label, &first, &second);
                }
            }
            before = found;
        }
    }

    fn compare(&mut self, label: &str, first: &Point, second: &Point) {
        let answers = [&first.case, &second.case].map(answer);
        let announced = answers
            .iter()
            .any(|answer| answer.notes.contains(NoteCode::MethodStep));
        if !announced {
            self.steps.push(format!(
                "{label} from {} to {}: {:+.3} %, {} to {}",
                first.position,
                second.position,
                100.0 * (second.coefficient / first.coefficient - 1.0),
                answers[0].method.as_str(),
                answers[1].method.as_str(),
            ));
        }
    }

    /// Fails with all steps found, or when fewer neighbours were compared than the sweeps are worth.
    pub fn assert_none(self, fewest_pairs: usize) {
        assert!(
            self.steps.is_empty(),
            "{} steps of {} pairs\n{}",
            self.steps.len(),
            self.pairs,
            self.steps.join("\n")
        );
        assert!(
            self.pairs >= fewest_pairs,
            "only {} pairs compared",
            self.pairs
        );
    }
}

fn is_step(first: &Point, second: &Point) -> bool {
    (second.coefficient / first.coefficient - 1.0).abs() > STEP
}

/// The two sides of a step between neighbours, as close as halving brings them; none if there is
/// only a slope, or cases without an answer, between them.
fn narrowed(
    first: &Point,
    second: &Point,
    point_at: &impl Fn(f64) -> Option<Point>,
) -> Option<(Point, Point)> {
    if !is_step(first, second) {
        return None;
    }
    let (mut first, mut second) = (first.clone(), second.clone());
    for _ in 0..HALVINGS {
        let middle = point_at(0.5 * (first.position + second.position))?;
        let distance = |point: &Point| (point.coefficient / middle.coefficient).ln().abs();
        if distance(&first) > distance(&second) {
            second = middle;
        } else {
            first = middle;
        }
    }
    is_step(&first, &second).then_some((first, second))
}
