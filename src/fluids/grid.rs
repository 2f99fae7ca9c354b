//! The temperatures of a table and the interval in which a temperature lies.

/// Buckets per node, at most, however uneven the nodes are.
const BUCKETS_PER_NODE: usize = 8;

/// Rising nodes with evenly spaced buckets laid over them.
///
/// A bucket is no wider than the narrowest interval (as far as [`BUCKETS_PER_NODE`] allows), so
/// finding the interval of a temperature is a multiplication and rarely more than one step.
pub(super) struct Grid {
    nodes: Vec<f64>,
    hints: Vec<usize>,
    buckets_per_kelvin: f64,
}

/// A place on a grid: the node to the left and the distance from it.
#[derive(Clone, Copy)]
pub(super) struct Position {
    pub(super) node: usize,
    pub(super) offset: f64,
}

impl Grid {
    /// A grid over at least two rising nodes.
    pub(super) fn new(nodes: Vec<f64>) -> Self {
        let span = nodes[nodes.len() - 1] - nodes[0];
        let narrowest = nodes
            .windows(2)
            .map(|pair| pair[1] - pair[0])
            .fold(span, f64::min);
        let most = nodes.len() * BUCKETS_PER_NODE;
        let buckets = ((span / narrowest).round() as usize).clamp(1, most);
        let mut grid = Self {
            hints: vec![0; buckets],
            buckets_per_kelvin: buckets as f64 / span,
            nodes,
        };
        let mut node = 0;
        for bucket in 0..buckets {
            while node + 1 < grid.nodes.len() && grid.bucket(grid.nodes[node + 1]) <= bucket {
                node += 1;
            }
            grid.hints[bucket] = node;
        }
        grid
    }

    pub(super) fn nodes(&self) -> &[f64] {
        &self.nodes
    }

    pub(super) fn minimum(&self) -> f64 {
        self.nodes[0]
    }

    pub(super) fn maximum(&self) -> f64 {
        self.nodes[self.nodes.len() - 1]
    }

    /// Whether a temperature lies within one step of either end, or beyond it.
    pub(super) fn near_edge(&self, temperature: f64) -> bool {
        temperature < self.nodes[1] || temperature > self.nodes[self.nodes.len() - 2]
    }

    /// The place of a temperature; none outside the nodes or for NaN.
    pub(super) fn locate(&self, temperature: f64) -> Option<Position> {
        if !(self.minimum()..=self.maximum()).contains(&temperature) {
            return None;
        }
        let mut node = self.hints[self.bucket(temperature)];
        while self.nodes[node] > temperature {
            node -= 1;
        }
        Some(Position {
            node,
            offset: temperature - self.nodes[node],
        })
    }

    /// Never falls with temperature, so the hint of a bucket is its last node or a later one.
    fn bucket(&self, temperature: f64) -> usize {
        let bucket = (temperature - self.nodes[0]) * self.buckets_per_kelvin;
        (bucket as usize).min(self.hints.len() - 1)
    }
}

#[cfg(test)]
mod tests {
    use super::Grid;

    fn assert_locates(nodes: &[f64]) {
        let grid = Grid::new(nodes.to_vec());
        for (index, pair) in nodes.windows(2).enumerate() {
            for share in [0.0, 1e-12, 0.3, 0.999_999] {
                let temperature = pair[0] + share * (pair[1] - pair[0]);
                let place = grid.locate(temperature).expect("inside the grid");
                assert_eq!(place.node, index, "{temperature} in {nodes:?}");
                assert_eq!(place.offset, temperature - pair[0]);
            }
        }
        let last = grid.locate(grid.maximum()).expect("the last node");
        assert_eq!((last.node, last.offset), (nodes.len() - 1, 0.0));
    }

    #[test]
    fn every_interval_is_found() {
        let even: Vec<f64> = (0..186)
            .map(|step| 150.0 + 10.0 * f64::from(step))
            .collect();
        let tenths: Vec<f64> = (0..301)
            .map(|step| 273.15 + 0.1 * f64::from(step))
            .collect();
        assert_locates(&even);
        assert_locates(&tenths);
        assert_locates(&[273.0, 280.0, 290.0, 300.0, 430.0]);
        assert_locates(&[1.0, 1.000_001, 500.0, 500.000_001, 1e6]);
    }

    /// The last interval aside, whose bucket also holds the last node.
    #[test]
    fn even_nodes_need_no_step() {
        let grid = Grid::new(
            (0..186)
                .map(|step| 150.0 + 10.0 * f64::from(step))
                .collect(),
        );
        for (node, start) in grid.nodes.iter().enumerate().take(184) {
            assert_eq!(grid.hints[grid.bucket(start + 5.0)], node);
        }
    }

    #[test]
    fn outside_is_nowhere() {
        let grid = Grid::new(vec![280.0, 300.0, 320.0]);
        for temperature in [279.999, 320.001, f64::NAN, f64::INFINITY, f64::NEG_INFINITY] {
            assert!(grid.locate(temperature).is_none(), "{temperature}");
        }
    }

    #[test]
    fn edges_are_one_step_wide() {
        let grid = Grid::new(vec![280.0, 290.0, 310.0, 320.0]);
        let near = [285.0, 290.0, 300.0, 310.0, 315.0].map(|at| grid.near_edge(at));
        assert_eq!(near, [true, false, false, false, true]);
    }
}
