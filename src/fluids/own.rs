//! A caller's own table, such as an oil's data sheet.

use crate::digest::sha256;

use super::conditions::{Composition, Conditions};
use super::density_maximum::{self, DensityMaximum};
use super::fault::OwnFault;
use super::fit::least_squares;
use super::fluid::{Description, Fluid};
use super::grid::Grid;
use super::own_check::{self, Column};
use super::pressure::PressureRule;
use super::state::Phase;
use super::table::{Axis, Layer, Table};

/// Standard atmosphere, Pa (ISO 2533): the pressure that data sheets are taken at.
const ATMOSPHERE: f64 = 101_325.0;

/// Pressures at which a liquid hardly differs from its data sheet, Pa: as for the built-in oils.
const LIQUID_PRESSURES: (f64, f64) = (30e3, 2e6);

/// Pressures over which a gas stays near an ideal one, Pa: as for the built-in gases.
const GAS_PRESSURES: (f64, f64) = (50e3, 200e3);

/// Densities that miss a smooth curve by more than this share of their own change, root mean
/// square, are too rough to take an expansion from. Those of the built-in engine oil miss it by
/// 0.4 %, those of pure ethylene glycol, whose slopes from row to row lie up to 80 % apart, by 3 %.
const ROUGH: f64 = 0.01;

/// A fluid as columns of numbers, one place a row.
///
/// The rows' temperatures rise or fall. Without `expansion` it is taken from a polynomial
/// through the logarithm of density: see [`Fluid::expansion_is_rough`].
///
/// # Units
/// SI: K, kg/m³, J/(kg K), Pa s, m²/s, W/(m K), 1/K
#[derive(Clone, PartialEq, Debug, Default)]
pub struct OwnTable {
    /// What the fluid is called in answers.
    pub id: String,
    /// Where the properties come from.
    pub source: Option<String>,
    /// Flash point.
    pub flash_point: Option<f64>,
    /// Liquid unless told otherwise.
    pub phase: Phase,
    /// Of every row.
    pub temperature: Vec<f64>,
    /// Of every row.
    pub density: Vec<f64>,
    /// Of every row, at constant pressure.
    pub specific_heat: Vec<f64>,
    /// Of every row, dynamic; this or `kinematic_viscosity`.
    pub viscosity: Option<Vec<f64>>,
    /// Of every row; this or `viscosity`.
    pub kinematic_viscosity: Option<Vec<f64>>,
    /// Of every row.
    pub conductivity: Vec<f64>,
    /// Of every row, isobaric, of volume.
    pub expansion: Option<Vec<f64>>,
}

impl OwnTable {
    /// The columns that are given, by name.
    pub(super) fn columns(&self) -> impl Iterator<Item = Column<'_>> {
        let columns = [
            ("temperature", Some(&self.temperature)),
            ("density", Some(&self.density)),
            ("specific_heat", Some(&self.specific_heat)),
            ("viscosity", self.viscosity.as_ref()),
            ("kinematic_viscosity", self.kinematic_viscosity.as_ref()),
            ("conductivity", Some(&self.conductivity)),
            ("expansion", self.expansion.as_ref()),
        ];
        columns
            .into_iter()
            .filter_map(|(name, values)| values.map(|values| Column { name, values }))
    }

    /// Of everything that properties depend on.
    fn digest(&self) -> String {
        let mut bytes = self.phase.name().as_bytes().to_vec();
        bytes.extend(self.flash_point.map(f64::to_be_bytes).into_iter().flatten());
        for Column { name, values } in self.columns() {
            bytes.push(b'\n');
            bytes.extend_from_slice(name.as_bytes());
            bytes.extend(values.iter().flat_map(|value| value.to_be_bytes()));
        }
        sha256(&bytes)
    }

    /// The same rows from cold to hot.
    fn rising(mut self) -> Self {
        if self.temperature.first() > self.temperature.last() {
            let given = [
                &mut self.temperature,
                &mut self.density,
                &mut self.specific_heat,
                &mut self.conductivity,
            ];
            let optional = [
                &mut self.viscosity,
                &mut self.kinematic_viscosity,
                &mut self.expansion,
            ];
            for column in given.into_iter().chain(optional.into_iter().flatten()) {
                column.reverse();
            }
        }
        self
    }
}

impl Fluid {
    /// The fluid that a caller's own table describes.
    ///
    /// A liquid is taken as incompressible from 0.3 to 20 bar, the density of a gas in
    /// proportion to pressure from 0.5 to 2 bar, about 101 325 Pa.
    ///
    /// # Errors
    /// All faults of the table.
    pub fn from_own(table: OwnTable) -> Result<Self, Vec<OwnFault>> {
        own_check::check(&table)?;
        let table = table.rising();
        let phase = table.phase;
        let digest = table.digest();
        let mut notes = Vec::new();
        let (expansion, expansion_is_rough) = match table.expansion {
            Some(expansion) => (expansion, false),
            None => {
                let fitted = fitted_expansion(phase, &table.temperature, &table.density)
                    .map_err(|fault| vec![fault])?;
                notes.push(format!(
                    "expansion is the slope of a least-squares polynomial of degree {} through \
                     ln({}), which misses the densities by {:.1e} of their change",
                    degree(table.temperature.len()),
                    match phase {
                        Phase::Gas => "density x temperature",
                        Phase::Liquid => "density",
                    },
                    fitted.roughness
                ));
                (fitted.expansion, fitted.roughness > ROUGH)
            }
        };
        let rows: Vec<_> = (0..table.temperature.len())
            .map(|row| {
                let viscosity = match (&table.viscosity, &table.kinematic_viscosity) {
                    (Some(dynamic), _) => dynamic[row],
                    (None, kinematic) => kinematic
                        .as_ref()
                        .map_or(f64::NAN, |kinematic| kinematic[row] * table.density[row]),
                };
                [
                    table.density[row],
                    table.specific_heat[row],
                    viscosity,
                    table.conductivity[row],
                    expansion[row],
                ]
            })
            .collect();
        let grid = Grid::new(table.temperature);
        let layer = Layer::new(phase, grid.nodes(), ATMOSPHERE, &rows);
        let interpolants = Table::new(phase, Axis::Pressure, vec![layer]);
        let conditions = Conditions::pure(ATMOSPHERE);
        let turn = density_maximum::search(&grid, &interpolants, &conditions, grid.minimum());
        Ok(Self {
            description: Description {
                name: "the caller's own table".to_owned(),
                phase,
                source: table
                    .source
                    .unwrap_or_else(|| "the caller's own table".to_owned()),
                id: table.id,
                notes,
                freezing: Vec::new(),
                flash_point: table.flash_point,
                interpolation_error: None,
                pressure_error: None,
                expansion_error_floor: None,
                digest,
            },
            composition: Composition::Pure,
            pressure_rule: pressure_rule(phase),
            table: interpolants,
            saturation: None,
            density_maximum: turn.map_or(DensityMaximum::None, DensityMaximum::At),
            expansion_is_rough,
            grid,
        })
    }
}

fn pressure_rule(phase: Phase) -> PressureRule {
    let reference = ATMOSPHERE;
    match phase {
        Phase::Gas => PressureRule::IdealGas {
            reference,
            minimum: GAS_PRESSURES.0,
            maximum: GAS_PRESSURES.1,
        },
        Phase::Liquid => PressureRule::Incompressible {
            reference,
            minimum: LIQUID_PRESSURES.0,
            maximum: LIQUID_PRESSURES.1,
        },
    }
}

/// An expansion by row, and how roughly the densities gave it.
struct FittedExpansion {
    expansion: Vec<f64>,
    /// What the densities miss the curve by, root mean square, over their own change.
    roughness: f64,
}

/// Expansion as the slope of a smooth curve, never from row to row: through ln(density) of a
/// liquid; through ln(density × T) of a gas, which is level when the gas is ideal.
fn fitted_expansion(
    phase: Phase,
    temperatures: &[f64],
    densities: &[f64],
) -> Result<FittedExpansion, OwnFault> {
    let is_gas = phase == Phase::Gas;
    let by_temperature = |temperature: f64| if is_gas { temperature } else { 1.0 };
    let logarithms: Vec<f64> = temperatures
        .iter()
        .zip(densities)
        .map(|(&temperature, density)| (density * by_temperature(temperature)).ln())
        .collect();
    let fit = least_squares(temperatures, &logarithms, degree(temperatures.len()));
    let fitted = temperatures.iter().zip(&fit.values);
    let smooth = fitted.map(|(&temperature, value)| value - by_temperature(temperature).ln());
    let (low, high) = smooth.fold((f64::INFINITY, f64::NEG_INFINITY), |(low, high), value| {
        (low.min(value), high.max(value))
    });
    let roughness = fit.residual / (high - low);
    if !roughness.is_finite() {
        return Err(OwnFault {
            column: "density",
            row: None,
            detail:
                "density does not change with temperature, so it tells no expansion; give expansion"
                    .to_owned(),
        });
    }
    let ideal = |temperature: f64| if is_gas { temperature.recip() } else { 0.0 };
    let expansion = temperatures
        .iter()
        .zip(&fit.slopes)
        .map(|(&temperature, slope)| ideal(temperature) - slope)
        .collect();
    Ok(FittedExpansion {
        expansion,
        roughness,
    })
}

/// Low enough that there are rows to smooth with, and higher where more rows show how the
/// expansion bends.
fn degree(rows: usize) -> usize {
    match rows {
        0..5 => 1,
        5..9 => 2,
        _ => 3,
    }
}
