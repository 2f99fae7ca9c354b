//! Smooth curves through scattered points.

/// A polynomial at the nodes that it was fitted to.
pub(super) struct Fit {
    pub(super) values: Vec<f64>,
    pub(super) slopes: Vec<f64>,
    /// Root mean square of what the polynomial misses.
    pub(super) residual: f64,
}

/// The least-squares polynomial through values at more rising nodes than its degree.
///
/// # Source
/// Forsythe, G. E. (1957), J. SIAM 5, 74-88: a sum of polynomials that are orthogonal over the
/// nodes, each from the two before it.
pub(super) fn least_squares(nodes: &[f64], values: &[f64], degree: usize) -> Fit {
    let (first, last) = (nodes[0], nodes[nodes.len() - 1]);
    let half_span = 0.5 * (last - first);
    let scaled = nodes.iter().map(|node| (node - first) / half_span - 1.0);
    let mut points: Vec<Point> = scaled.zip(values).map(Point::new).collect();
    let mut previous_norm = f64::INFINITY;
    for _ in 0..=degree {
        let norm: f64 = points.iter().map(|point| point.basis * point.basis).sum();
        let sum = |of: fn(&Point) -> f64| points.iter().map(of).sum::<f64>() / norm;
        let coefficient = sum(|point| point.residual * point.basis);
        let shift = sum(|point| point.node * point.basis * point.basis);
        let ratio = norm / previous_norm;
        for point in &mut points {
            point.add(coefficient);
            point.raise(shift, ratio);
        }
        previous_norm = norm;
    }
    let squares: f64 = points.iter().map(|at| at.residual * at.residual).sum();
    Fit {
        residual: (squares / points.len() as f64).sqrt(),
        values: points.iter().map(|point| point.value).collect(),
        slopes: points.iter().map(|at| at.slope / half_span).collect(),
    }
}

/// A node with the sum of polynomials so far, the next polynomial and the one before it, each
/// with its slope.
struct Point {
    node: f64,
    residual: f64,
    value: f64,
    slope: f64,
    basis: f64,
    basis_slope: f64,
    previous: f64,
    previous_slope: f64,
}

impl Point {
    fn new((node, &value): (f64, &f64)) -> Self {
        Self {
            node,
            residual: value,
            value: 0.0,
            slope: 0.0,
            basis: 1.0,
            basis_slope: 0.0,
            previous: 0.0,
            previous_slope: 0.0,
        }
    }

    fn add(&mut self, coefficient: f64) {
        self.residual -= coefficient * self.basis;
        self.value += coefficient * self.basis;
        self.slope += coefficient * self.basis_slope;
    }

    /// To the polynomial of the next degree.
    fn raise(&mut self, shift: f64, ratio: f64) {
        let distance = self.node - shift;
        let next = distance * self.basis - ratio * self.previous;
        let next_slope = self.basis + distance * self.basis_slope - ratio * self.previous_slope;
        (self.previous, self.previous_slope) = (self.basis, self.basis_slope);
        (self.basis, self.basis_slope) = (next, next_slope);
    }
}

#[cfg(test)]
mod tests {
    use super::least_squares;

    /// A cubic is met with its slope.
    #[test]
    fn a_polynomial_is_met_exactly() {
        let nodes = [273.0, 280.0, 300.0, 310.0, 350.0, 351.0];
        let cubic = |x: f64| 3.0 + x * (0.5 + x * (-2e-3 + x * 4e-6));
        let slope = |x: f64| 0.5 + x * (-4e-3 + x * 12e-6);
        let fit = least_squares(&nodes, &nodes.map(cubic), 3);
        assert!(fit.residual < 1e-12);
        for (index, &node) in nodes.iter().enumerate() {
            assert!((fit.values[index] - cubic(node)).abs() < 1e-11);
            assert!((fit.slopes[index] - slope(node)).abs() < 1e-11);
        }
    }

    /// NumPy 2.4.6, `polyfit` of degree 2 and 1.
    #[test]
    fn scattered_points_are_met_as_by_numpy() {
        let nodes = [0.0, 1.0, 2.0, 4.0, 5.0];
        let values = [1.0, 3.0, 2.0, 5.0, 4.0];
        for (degree, value, slope, residual) in [
            (2, 4.165584415584414, 0.332792207792208, 0.7274756210491038),
            (
                1,
                4.0232558139534875,
                0.6395348837209299,
                0.7700800320836487,
            ),
        ] {
            let fit = least_squares(&nodes, &values, degree);
            assert!((fit.values[3] - value).abs() < 1e-13);
            assert!((fit.slopes[3] - slope).abs() < 1e-13);
            assert!((fit.residual - residual).abs() < 1e-13);
        }
    }
}
