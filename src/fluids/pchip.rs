//! Piecewise cubic Hermite interpolation that keeps the shape of its data.

/// One interval's polynomial: coefficients of rising powers of the distance from its left node.
pub(super) type Cubic = [f64; 4];

/// The value of a cubic at a distance from its left node.
pub(super) fn value(&[constant, linear, quadratic, cubic]: &Cubic, offset: f64) -> f64 {
    ((cubic * offset + quadratic) * offset + linear) * offset + constant
}

/// The interpolant through at least three rising nodes: one cubic per interval, then a constant
/// for the last node itself, so that every node returns its own value exactly.
///
/// # Source
/// Fritsch, F. N.; Butland, J. (1984), SIAM J. Sci. Stat. Comput. 5, 300-304: harmonic mean
/// slopes; three-point end slopes by Moler, C. (2004), Numerical Computing with MATLAB, ch. 3.
/// Both as in SciPy's `PchipInterpolator`, which the tests compare with.
pub(super) fn cubics(nodes: &[f64], values: &[f64]) -> Vec<Cubic> {
    let widths: Vec<f64> = nodes.windows(2).map(|pair| pair[1] - pair[0]).collect();
    let secants: Vec<f64> = values
        .windows(2)
        .zip(&widths)
        .map(|(pair, width)| (pair[1] - pair[0]) / width)
        .collect();
    let slopes = slopes(&widths, &secants);
    let intervals = widths.iter().zip(&secants).enumerate();
    intervals
        .map(|(left, (width, secant))| {
            let curvature = (slopes[left] + slopes[left + 1] - 2.0 * secant) / width;
            let quadratic = (secant - slopes[left]) / width - curvature;
            [values[left], slopes[left], quadratic, curvature / width]
        })
        .chain(values.last().map(|&last| [last, 0.0, 0.0, 0.0]))
        .collect()
}

fn slopes(widths: &[f64], secants: &[f64]) -> Vec<f64> {
    let last = secants.len() - 1;
    let mut slopes = Vec::with_capacity(secants.len() + 1);
    slopes.push(end_slope([widths[0], widths[1]], [secants[0], secants[1]]));
    for (width, secant) in widths.windows(2).zip(secants.windows(2)) {
        slopes.push(inner_slope([width[0], width[1]], [secant[0], secant[1]]));
    }
    slopes.push(end_slope(
        [widths[last], widths[last - 1]],
        [secants[last], secants[last - 1]],
    ));
    slopes
}

/// Weighted harmonic mean of the neighbouring secants; level at an extremum.
fn inner_slope([left, right]: [f64; 2], [before, after]: [f64; 2]) -> f64 {
    if sign(before) != sign(after) || before == 0.0 {
        return 0.0;
    }
    let (before_weight, after_weight) = (left + 2.0 * right, 2.0 * left + right);
    (before_weight + after_weight) / (before_weight / before + after_weight / after)
}

/// Three-point slope at an end, limited so that the end interval keeps its shape.
fn end_slope([near, far]: [f64; 2], [first, second]: [f64; 2]) -> f64 {
    let slope = ((2.0 * near + far) * first - near * second) / (near + far);
    if sign(slope) != sign(first) {
        0.0
    } else if sign(first) != sign(second) && slope.abs() > 3.0 * first.abs() {
        3.0 * first
    } else {
        slope
    }
}

/// -1, 0 or 1; `f64::signum` has no zero.
fn sign(value: f64) -> i8 {
    i8::from(value > 0.0) - i8::from(value < 0.0)
}

#[cfg(test)]
mod tests {
    use super::{cubics, value};

    fn at(nodes: &[f64], values: &[f64], point: f64) -> f64 {
        let node = nodes.partition_point(|&node| node <= point) - 1;
        value(&cubics(nodes, values)[node], point - nodes[node])
    }

    struct Curve {
        nodes: &'static [f64],
        values: &'static [f64],
        /// Point and value by SciPy 1.17.1's `PchipInterpolator`.
        expected: &'static [(f64, f64)],
    }

    const CURVES: [Curve; 7] = [
        Curve {
            nodes: &[0.0, 1.0, 2.0, 3.0, 4.0],
            values: &[1.0, 1.5, 2.5, 4.5, 8.5],
            expected: &[
                (0.25, 1.08203125),
                (1.5, 1.9166666666666665),
                (2.75, 3.875),
                (3.9, 8.007),
            ],
        },
        Curve {
            nodes: &[0.0, 1.0, 2.0, 3.0, 4.0, 5.0],
            values: &[0.0, 3.0, 1.0, 1.0, 4.0, 2.0],
            expected: &[
                (0.5, 2.1875),
                (1.5, 2.0),
                (2.5, 1.0),
                (3.3, 1.6479999999999995),
                (4.7, 3.0934999999999997),
            ],
        },
        Curve {
            nodes: &[0.0, 0.5, 2.0, 7.0, 7.25],
            values: &[10.0, 9.0, 8.5, 2.0, 1.9],
            expected: &[
                (0.1, 9.75171171171171),
                (1.0, 8.779521716607809),
                (3.0, 7.60142377250353),
                (6.0, 2.936877682256317),
                (7.2, 1.9176082815734987),
            ],
        },
        Curve {
            nodes: &[273.0, 280.0, 300.0],
            values: &[3.85, 2.17, 0.486],
            expected: &[
                (275.0, 3.2859595763048888),
                (290.0, 0.9902938914288544),
                (299.0, 0.49179258393714814),
            ],
        },
        Curve {
            nodes: &[0.0, 1.0, 3.0],
            values: &[0.0, 1.0, -5.0],
            expected: &[
                (0.5, 0.7916666666666667),
                (2.0, -0.5833333333333333),
                (2.9, -4.445083333333333),
            ],
        },
        Curve {
            nodes: &[0.0, 1.0, 2.0, 3.0],
            values: &[0.0, 0.1, 5.0, 5.1],
            expected: &[
                (0.5, 0.0255),
                (1.5, 2.5500000000000003),
                (2.5, 5.0745000000000005),
            ],
        },
        Curve {
            nodes: &[0.0, 1.0, 2.0, 3.0],
            values: &[0.0, 1.0, -9.0, -9.0],
            expected: &[
                (0.5, 0.875),
                (0.9, 0.9990000000000001),
                (1.5, -4.0),
                (2.5, -9.0),
            ],
        },
    ];

    #[test]
    fn equals_scipy() {
        for curve in &CURVES {
            for &(point, expected) in curve.expected {
                let found = at(curve.nodes, curve.values, point);
                assert!(
                    (found - expected).abs() <= 1e-14 * expected.abs().max(1.0),
                    "{found} for {expected} at {point} of {:?}",
                    curve.values
                );
            }
        }
    }

    #[test]
    fn nodes_keep_their_values() {
        for curve in &CURVES {
            for (&node, &expected) in curve.nodes.iter().zip(curve.values) {
                assert_eq!(at(curve.nodes, curve.values, node), expected);
            }
        }
    }

    #[test]
    fn keeps_the_shape() {
        for curve in &CURVES {
            for (node, value) in curve.nodes.windows(2).zip(curve.values.windows(2)) {
                let direction = value[1] - value[0];
                let mut previous = value[0];
                for step in 1..=100 {
                    let point = node[0] + (node[1] - node[0]) * f64::from(step) / 100.0;
                    let next = at(curve.nodes, curve.values, point);
                    assert!(
                        (next - previous) * direction >= -1e-13,
                        "turns at {point} of {:?}",
                        curve.values
                    );
                    previous = next;
                }
            }
        }
    }
}
