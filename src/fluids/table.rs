//! The five properties of a fluid by temperature and pressure.

use super::grid::Position;
use super::pchip;
use super::state::{Phase, State};

/// A column of a table that holds a property.
pub(super) struct Property {
    pub(super) name: &'static str,
    pub(super) unit: &'static str,
    /// Whether it may be zero or negative.
    pub(super) signed: bool,
}

/// The properties in the order of [`Values`].
pub(super) const PROPERTIES: [Property; 5] = [
    Property::positive("density", "kg/m3"),
    Property::positive("specific_heat", "J/(kg K)"),
    Property::positive("viscosity", "Pa s"),
    Property::positive("conductivity", "W/(m K)"),
    Property {
        name: "expansion",
        unit: "1/K",
        signed: true,
    },
];

/// One value per property.
pub(super) type Values = [f64; PROPERTIES.len()];

impl Property {
    const fn positive(name: &'static str, unit: &'static str) -> Self {
        Self {
            name,
            unit,
            signed: false,
        }
    }
}

/// Interpolants of a fluid's properties over one grid, by pressure layer.
///
/// What is interpolated are not the properties themselves but, for a gas, density × T/p and
/// expansion × T, both constant in an ideal gas; for a liquid, the logarithm of viscosity.
pub(super) struct Table {
    phase: Phase,
    layers: Vec<Layer>,
}

/// The interpolants at one pressure.
pub(super) struct Layer {
    pressure: f64,
    cells: Vec<Cell>,
}

/// One interval's cubics by power, then by property: what one look-up reads, side by side.
#[derive(Default)]
#[repr(align(32))]
struct Cell([Values; 4]);

impl Cell {
    fn at(&self, offset: f64) -> Values {
        let [constant, linear, quadratic, cubic] = &self.0;
        std::array::from_fn(|property| {
            pchip::value(
                &[
                    constant[property],
                    linear[property],
                    quadratic[property],
                    cubic[property],
                ],
                offset,
            )
        })
    }
}

impl Table {
    /// Layers of one phase and one grid, in order of rising pressure.
    pub(super) fn new(phase: Phase, layers: Vec<Layer>) -> Self {
        Self { phase, layers }
    }

    /// Whether every positive property stays positive between the layers, which only gases have.
    ///
    /// Within an interval each layer's values lie between those at its ends; weights that sum to
    /// one and whose negative ones sum to −n leave at least (1 + n) × the least of those values
    /// less n × the largest.
    pub(super) fn stays_positive(&self) -> bool {
        let negative = self.negative_weight();
        if negative == 0.0 {
            return true;
        }
        let intervals = self.layers.first().map_or(0, |layer| layer.cells.len() - 1);
        let mut positive = (0..PROPERTIES.len()).filter(|&index| !PROPERTIES[index].signed);
        positive.all(|property| {
            (0..intervals).all(|interval| {
                let ends = self.layers.iter().flat_map(|layer| {
                    layer.cells[interval..interval + 2]
                        .iter()
                        .map(|cell| cell.0[0][property])
                });
                let least = ends.clone().fold(f64::INFINITY, f64::min);
                let largest = ends.fold(0.0, f64::max);
                (1.0 + negative) * least > negative * largest
            })
        })
    }

    /// The largest sum of negative weights, without its sign, sampled finely between the layers.
    fn negative_weight(&self) -> f64 {
        const STEPS: u32 = 32;
        let gaps = self.layers.windows(2);
        gaps.flat_map(|pair| {
            let (low, high) = (pair[0].pressure, pair[1].pressure);
            (1..STEPS).map(move |step| low + (high - low) * f64::from(step) / f64::from(STEPS))
        })
        .map(|pressure| {
            let weights = (0..self.layers.len()).map(|index| self.weight(index, pressure));
            -weights.filter(|&weight| weight < 0.0).sum::<f64>()
        })
        .fold(0.0, f64::max)
    }

    /// The properties at a place on the grid.
    ///
    /// Inlined: the caller's only hot call.
    #[inline]
    pub(super) fn state(&self, position: Position, temperature: f64, pressure: f64) -> State {
        let [density, specific_heat, viscosity, conductivity, expansion] =
            self.blend(position, pressure);
        match self.phase {
            Phase::Gas => State {
                density: density * pressure / temperature,
                specific_heat,
                viscosity,
                conductivity,
                expansion: expansion / temperature,
            },
            Phase::Liquid => State {
                density,
                specific_heat,
                viscosity: viscosity.exp(),
                conductivity,
                expansion,
            },
        }
    }

    /// Lagrange's polynomial in pressure; at a layer's own pressure only that layer is read.
    fn blend(&self, position: Position, pressure: f64) -> Values {
        let mut blend = [0.0; PROPERTIES.len()];
        for (index, layer) in self.layers.iter().enumerate() {
            let weight = self.weight(index, pressure);
            if weight != 0.0 {
                let values = layer.cells[position.node].at(position.offset);
                for (sum, value) in blend.iter_mut().zip(values) {
                    *sum += weight * value;
                }
            }
        }
        blend
    }

    /// Exactly one at the layer's own pressure and exactly zero at every other layer's.
    fn weight(&self, index: usize, pressure: f64) -> f64 {
        let own = self.layers[index].pressure;
        self.layers
            .iter()
            .enumerate()
            .filter(|&(other, _)| other != index)
            .map(|(_, other)| (pressure - other.pressure) / (own - other.pressure))
            .product()
    }
}

impl Layer {
    /// The interpolants through the properties at every node of a grid.
    pub(super) fn new(phase: Phase, nodes: &[f64], pressure: f64, rows: &[Values]) -> Self {
        let interpolated: Vec<Values> = nodes
            .iter()
            .zip(rows)
            .map(|(&temperature, &row)| transform(phase, temperature, pressure, row))
            .collect();
        let mut cells: Vec<Cell> = nodes.iter().map(|_| Cell::default()).collect();
        for property in 0..PROPERTIES.len() {
            let column: Vec<f64> = interpolated.iter().map(|row| row[property]).collect();
            for (cell, cubic) in cells.iter_mut().zip(pchip::cubics(nodes, &column)) {
                for (power, coefficient) in cell.0.iter_mut().zip(cubic) {
                    power[property] = coefficient;
                }
            }
        }
        Self { pressure, cells }
    }
}

/// From properties to what is interpolated; [`Table::state`] is the way back.
fn transform(phase: Phase, temperature: f64, pressure: f64, properties: Values) -> Values {
    let [density, specific_heat, viscosity, conductivity, expansion] = properties;
    match phase {
        Phase::Gas => [
            density * temperature / pressure,
            specific_heat,
            viscosity,
            conductivity,
            expansion * temperature,
        ],
        Phase::Liquid => [
            density,
            specific_heat,
            viscosity.ln(),
            conductivity,
            expansion,
        ],
    }
}
