//! The five properties of a fluid by temperature and by pressure or mass fraction.

use super::conditions::Conditions;
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

/// Where these stand in [`PROPERTIES`].
pub(super) const VISCOSITY: usize = 2;
pub(super) const EXPANSION: usize = 4;

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

/// What tells a table's layers apart.
#[derive(Clone, Copy, PartialEq, Eq, Debug)]
pub(super) enum Axis {
    Pressure,
    MassFraction,
}

/// Interpolants of a fluid's properties over one grid, by layer.
///
/// What is interpolated are not the properties themselves but, for a gas, density × T/p and
/// expansion × T, both constant in an ideal gas; for a liquid, the logarithm of viscosity.
pub(super) struct Table {
    phase: Phase,
    axis: Axis,
    layers: Vec<Layer>,
}

/// The interpolants at one place on the axis.
pub(super) struct Layer {
    place: f64,
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
    /// Layers of one phase and one grid, in rising order.
    pub(super) fn new(phase: Phase, axis: Axis, layers: Vec<Layer>) -> Self {
        Self {
            phase,
            axis,
            layers,
        }
    }

    /// Whether every positive property stays positive between the layers.
    ///
    /// Within an interval each layer's values lie between those at its ends; weights that sum to
    /// one and whose negative ones sum to −n leave at least (1 + n) × the least of those values
    /// less n × the largest. A liquid's viscosity is positive by its logarithm.
    pub(super) fn stays_positive(&self) -> bool {
        let negative = self.negative_weight();
        if negative == 0.0 {
            return true;
        }
        let intervals = self.layers.first().map_or(0, |layer| layer.cells.len() - 1);
        let by_logarithm = |index| index == VISCOSITY && self.phase == Phase::Liquid;
        let mut positive = (0..PROPERTIES.len())
            .filter(|&index| !PROPERTIES[index].signed && !by_logarithm(index));
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
            let (low, high) = (pair[0].place, pair[1].place);
            (1..STEPS).map(move |step| low + (high - low) * f64::from(step) / f64::from(STEPS))
        })
        .map(|place| {
            let weights = (0..self.layers.len()).map(|index| self.weight(index, place));
            -weights.filter(|&weight| weight < 0.0).sum::<f64>()
        })
        .fold(0.0, f64::max)
    }

    /// The properties at a place on the grid.
    ///
    /// Inlined: the caller's only hot call.
    #[inline]
    pub(super) fn state(
        &self,
        position: Position,
        temperature: f64,
        conditions: &Conditions,
    ) -> State {
        let &Conditions {
            pressure,
            composition,
        } = conditions;
        let place = match self.axis {
            Axis::Pressure => pressure,
            Axis::MassFraction => composition,
        };
        let [density, specific_heat, viscosity, conductivity, expansion] =
            self.blend(position, place);
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

    /// The value at a place on the axis of Lagrange's polynomial through one value per layer.
    pub(super) fn across(&self, by_layer: &[f64], place: f64) -> f64 {
        let values = by_layer.iter().enumerate();
        values
            .map(|(index, value)| self.weight(index, place) * value)
            .sum()
    }

    /// Lagrange's polynomial along the axis; at a layer's own place only that layer is read.
    fn blend(&self, position: Position, place: f64) -> Values {
        let mut blend = [0.0; PROPERTIES.len()];
        for (index, layer) in self.layers.iter().enumerate() {
            let weight = self.weight(index, place);
            if weight != 0.0 {
                let values = layer.cells[position.node].at(position.offset);
                for (sum, value) in blend.iter_mut().zip(values) {
                    *sum += weight * value;
                }
            }
        }
        blend
    }

    /// Exactly one at the layer's own place and exactly zero at every other layer's.
    fn weight(&self, index: usize, place: f64) -> f64 {
        let own = self.layers[index].place;
        self.layers
            .iter()
            .enumerate()
            .filter(|&(other, _)| other != index)
            .map(|(_, other)| (place - other.place) / (own - other.place))
            .product()
    }
}

impl Layer {
    /// The interpolants through the properties at every node of a grid; `place` of a gas is its
    /// pressure.
    pub(super) fn new(phase: Phase, nodes: &[f64], place: f64, rows: &[Values]) -> Self {
        let interpolated: Vec<Values> = nodes
            .iter()
            .zip(rows)
            .map(|(&temperature, &row)| transform(phase, temperature, place, row))
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
        Self { place, cells }
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
