//! An answer, and the one list of its columns that every reader of answers uses.

use crate::fluids::State;
use crate::geometry::choice;
use crate::methods::{MethodId, RangeStatus};
use crate::quantity::Kind;

use super::note::Notes;

choice! {
    /// What moves in the layer.
    Regime {
        /// Hardly anything; heat is conducted.
        Conduction = "conduction",
        /// An orderly layer.
        Laminar = "laminar",
        /// Neither.
        Transition = "transition",
        /// A layer full of eddies.
        Turbulent = "turbulent",
    }
}

/// A heat flow, as far as the body's size is known.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Heat {
    /// In all, W.
    pub flow: Option<f64>,
    /// Per length of the body, W/m.
    pub flow_per_length: Option<f64>,
    /// Per area, W/m2.
    pub flux: f64,
}

/// What a draught comes to.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct DraughtResult {
    /// Richardson number, Grashof over the square of Reynolds, on the body's own length.
    pub richardson: f64,
    /// Reynolds number that the forced method is entered with.
    pub reynolds: f64,
    /// Prandtl number that it is entered with.
    pub prandtl: f64,
    /// Coefficient of the draught alone.
    pub forced_coefficient: f64,
    /// Coefficient of free convection and draught together.
    pub combined_coefficient: f64,
    /// Whether the two oppose each other and nearly cancel.
    pub cancels: bool,
}

/// What was found for a case, flat and in SI.
#[derive(Clone, Copy, Debug, PartialEq)]
pub struct Answer {
    /// Free-convection coefficient.
    pub heat_transfer_coefficient: f64,
    /// Nusselt number.
    pub nusselt: f64,
    /// Rayleigh number.
    pub rayleigh: f64,
    /// Prandtl number.
    pub prandtl: f64,
    /// Characteristic length.
    pub characteristic_length: f64,
    /// Mean of surface and ambient.
    pub film_temperature: f64,
    /// Surface, given or found.
    pub surface_temperature: f64,
    /// Hottest (or coldest) place of a surface with uniform flux.
    pub surface_temperature_max: Option<f64>,
    /// Regime.
    pub regime: Regime,
    /// Area of the face.
    pub area: Option<f64>,
    /// By convection.
    pub convective: Heat,
    /// By radiation, where an emissivity is given.
    pub radiative: Option<Heat>,
    /// By both.
    pub total: Heat,
    /// Coefficient of radiation on the difference to the surroundings.
    pub radiative_coefficient: Option<f64>,
    /// The draught, where there is one.
    pub draught: Option<DraughtResult>,
    /// Conductivity of a still fluid that would carry the same heat across a gap.
    pub effective_conductivity: Option<f64>,
    /// Resistance of a plane gap by convection and, where counted, radiation.
    pub thermal_resistance: Option<f64>,
    /// Spacing at which a stack of channels loses most heat.
    pub best_spacing: Option<f64>,
    /// Method.
    pub method: MethodId,
    /// How the case lies to its ranges.
    pub range_status: RangeStatus,
    /// Spread of data about it.
    pub scatter: f64,
    /// Smallest coefficient of all methods within range.
    pub low: Option<f64>,
    /// Largest.
    pub high: Option<f64>,
    /// The chosen method over the one that is chosen just across a range's edge, less one; 0 away from edges.
    pub method_step: f64,
    /// Notes.
    pub notes: Notes,
    /// Properties at the method's reference temperature.
    pub state: State,
}

/// One column's value in one answer.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum Cell {
    /// A quantity in SI; none where the case does not say enough.
    Number(Option<f64>),
    /// One of a set of words.
    Word(&'static str),
    /// Note codes.
    Notes(Notes),
}

/// What a column holds.
#[derive(Clone, Copy, Debug, PartialEq)]
pub enum ColumnType {
    /// A quantity that every answer has.
    Quantity(Kind),
    /// A quantity that is null where the case does not say enough.
    Optional(Kind),
    /// One of a closed set of words.
    Choice(&'static [&'static str]),
    /// A method's id.
    Method,
    /// Notes.
    Notes,
}

impl ColumnType {
    /// The kind of quantity, if it holds one.
    pub fn kind(self) -> Option<Kind> {
        match self {
            ColumnType::Quantity(kind) | ColumnType::Optional(kind) => Some(kind),
            _ => None,
        }
    }
}

/// What stands in the list for one column.
pub struct ColumnEntry {
    /// Its name in answers.
    pub name: &'static str,
    /// What it holds.
    pub holds: ColumnType,
    /// Its meaning.
    pub text: &'static str,
    /// A value of it, as JSON.
    pub example: &'static str,
    /// Its value in an answer.
    pub cell: fn(&Answer) -> Cell,
}

macro_rules! columns {
    ($($variant:ident = $name:literal, $holds:expr, $text:literal, $example:literal, $cell:expr;)+) => {
        /// A column of an answer.
        #[derive(Clone, Copy, Debug, PartialEq, Eq, Hash, PartialOrd, Ord)]
        pub enum Column { $(#[doc = $text] $variant,)+ }

        impl Column {
            /// Every column, in the order in which answers are shown.
            pub const ALL: &'static [Column] = &[$(Column::$variant,)+];

            const ENTRIES: &'static [ColumnEntry] = &[$(ColumnEntry {
                name: $name, holds: $holds, text: $text, example: $example, cell: $cell,
            },)+];

            /// The column of a name.
            pub fn from_name(name: &str) -> Option<Column> {
                match name { $($name => Some(Column::$variant),)+ _ => None }
            }
        }
    };
}

use ColumnType::{Choice, Optional, Quantity};

fn number(value: f64) -> Cell {
    Cell::Number(Some(value))
}

columns! {
    HeatTransferCoefficient = "heat_transfer_coefficient", Quantity(Kind::Coefficient),
        "coefficient of free convection alone", "7.41", |a| number(a.heat_transfer_coefficient);
    Nusselt = "nusselt", Quantity(Kind::Number),
        "Nusselt number on the characteristic length", "21.3", |a| number(a.nusselt);
    Rayleigh = "rayleigh", Quantity(Kind::Number),
        "Rayleigh number that the method is entered with", "3671000.0", |a| number(a.rayleigh);
    Grashof = "grashof", Quantity(Kind::Number),
        "Grashof number, Rayleigh over Prandtl", "5200000.0", |a| number(a.rayleigh / a.prandtl);
    Prandtl = "prandtl", Quantity(Kind::Number),
        "Prandtl number at the reference temperature", "0.706", |a| number(a.prandtl);
    CharacteristicLength = "characteristic_length", Quantity(Kind::Length),
        "length in the Nusselt and Rayleigh numbers", "0.0889", |a| number(a.characteristic_length);
    FilmTemperature = "film_temperature", Quantity(Kind::Temperature),
        "mean of surface and ambient temperature", "363.15", |a| number(a.film_temperature);
    SurfaceTemperature = "surface_temperature", Quantity(Kind::Temperature),
        "surface temperature, given or found; with a heat flux that at mid-height", "433.15", |a| number(a.surface_temperature);
    SurfaceTemperatureMax = "surface_temperature_max", Optional(Kind::Temperature),
        "with a heat flux on an upright or inclined surface: the temperature at the end of a laminar layer, an upper estimate",
        "440.0", |a| Cell::Number(a.surface_temperature_max);
    FlowRegime = "regime", Choice(Regime::TEXTS),
        "what moves in the layer", "\"laminar\"", |a| Cell::Word(a.regime.as_str());
    Area = "area", Optional(Kind::Area),
        "area of the face; null when the case does not say", "1.68", |a| Cell::Number(a.area);
    ConvectiveHeatFlow = "convective_heat_flow", Optional(Kind::HeatFlow),
        "heat by free convection, positive when it leaves the surface", "1740.0", |a| Cell::Number(a.convective.flow);
    ConvectiveHeatFlowPerLength = "convective_heat_flow_per_length", Optional(Kind::HeatFlowPerLength),
        "the same per length of the body", "290.0", |a| Cell::Number(a.convective.flow_per_length);
    ConvectiveHeatFlux = "convective_heat_flux", Quantity(Kind::HeatFlux),
        "the same per area", "1037.0", |a| number(a.convective.flux);
    RadiativeHeatFlow = "radiative_heat_flow", Optional(Kind::HeatFlow),
        "heat by radiation; null without an emissivity", "2376.0", |a| Cell::Number(a.radiative.and_then(|heat| heat.flow));
    RadiativeHeatFlowPerLength = "radiative_heat_flow_per_length", Optional(Kind::HeatFlowPerLength),
        "the same per length of the body", "396.0", |a| Cell::Number(a.radiative.and_then(|heat| heat.flow_per_length));
    RadiativeHeatFlux = "radiative_heat_flux", Optional(Kind::HeatFlux),
        "the same per area", "1418.0", |a| Cell::Number(a.radiative.map(|heat| heat.flux));
    TotalHeatFlow = "total_heat_flow", Optional(Kind::HeatFlow),
        "convection and, where an emissivity is given, radiation", "4116.0", |a| Cell::Number(a.total.flow);
    TotalHeatFlowPerLength = "total_heat_flow_per_length", Optional(Kind::HeatFlowPerLength),
        "the same per length of the body", "686.0", |a| Cell::Number(a.total.flow_per_length);
    TotalHeatFlux = "total_heat_flux", Quantity(Kind::HeatFlux),
        "the same per area", "2455.0", |a| number(a.total.flux);
    RadiativeCoefficient = "radiative_coefficient", Optional(Kind::Coefficient),
        "radiative heat flux over the difference between surface and surroundings", "10.1", |a| Cell::Number(a.radiative_coefficient);
    HeatPerHour = "heat_per_hour", Optional(Kind::Energy),
        "total heat in one hour", "14800000.0", |a| Cell::Number(a.total.flow.map(|flow| flow * 3600.0));
    Richardson = "richardson", Optional(Kind::Number),
        "with a draught: Grashof number over the square of the Reynolds number, on the body's own length", "4.2", |a| Cell::Number(a.draught.map(|draught| draught.richardson));
    ForcedCoefficient = "forced_coefficient", Optional(Kind::Coefficient),
        "with a draught: its coefficient alone", "6.1", |a| Cell::Number(a.draught.map(|draught| draught.forced_coefficient));
    CombinedCoefficient = "combined_coefficient", Optional(Kind::Coefficient),
        "with a draught: the coefficient of both together, which the heat flows use", "8.3", |a| Cell::Number(a.draught.map(|draught| draught.combined_coefficient));
    EffectiveConductivity = "effective_conductivity", Optional(Kind::Conductivity),
        "of a gap: the conductivity of a still fluid that would carry the same heat, radiation not counted", "0.071", |a| Cell::Number(a.effective_conductivity);
    ThermalResistance = "thermal_resistance", Optional(Kind::Resistance),
        "of a plane gap: temperature difference over heat flux, radiation included when emissivities are given", "0.18", |a| Cell::Number(a.thermal_resistance);
    BestSpacing = "best_spacing", Optional(Kind::Length),
        "of a channel with one wall temperature: the spacing at which a stack of them loses most heat", "0.0075", |a| Cell::Number(a.best_spacing);
    Method = "method", ColumnType::Method,
        "the method that was used", "\"horizontal-cylinder-churchill-chu\"", |a| Cell::Word(a.method.as_str());
    Range = "range_status", Choice(RangeStatus::TEXTS),
        "how the case lies to the method's range", "\"within\"", |a| Cell::Word(a.range_status.as_str());
    Scatter = "scatter", Quantity(Kind::Number),
        "spread of measurements about the method, a fraction", "0.15", |a| number(a.scatter);
    Low = "low", Quantity(Kind::Coefficient),
        "smallest coefficient of the method used and all others within range, scatter not counted", "7.28", |a| Cell::Number(a.low);
    High = "high", Quantity(Kind::Coefficient),
        "largest coefficient of the method used and all others within range, scatter not counted", "8.21", |a| Cell::Number(a.high);
    Notes = "notes", ColumnType::Notes,
        "what to know about this answer", "[]", |a| Cell::Notes(a.notes);
}

impl Column {
    /// What the list says of this column.
    pub fn entry(self) -> &'static ColumnEntry {
        &Self::ENTRIES[self as usize]
    }

    /// Its name in answers.
    pub fn name(self) -> &'static str {
        self.entry().name
    }
}

/// A property in an answer: name, kind, meaning, value.
pub struct Property {
    /// Its name in answers.
    pub name: &'static str,
    /// The kind of quantity.
    pub kind: Kind,
    /// Its meaning.
    pub text: &'static str,
    /// Its value in a state.
    pub of: fn(&State) -> f64,
}

/// The properties of a fluid that answers show.
pub const PROPERTIES: &[Property] = &[
    Property {
        name: "density",
        kind: Kind::Density,
        text: "density",
        of: |s| s.density,
    },
    Property {
        name: "specific_heat",
        kind: Kind::SpecificHeat,
        text: "specific heat at constant pressure",
        of: |s| s.specific_heat,
    },
    Property {
        name: "viscosity",
        kind: Kind::Viscosity,
        text: "dynamic viscosity",
        of: |s| s.viscosity,
    },
    Property {
        name: "kinematic_viscosity",
        kind: Kind::KinematicViscosity,
        text: "kinematic viscosity",
        of: State::kinematic_viscosity,
    },
    Property {
        name: "conductivity",
        kind: Kind::Conductivity,
        text: "thermal conductivity",
        of: |s| s.conductivity,
    },
    Property {
        name: "diffusivity",
        kind: Kind::KinematicViscosity,
        text: "thermal diffusivity",
        of: State::diffusivity,
    },
    Property {
        name: "expansion",
        kind: Kind::Expansion,
        text: "volumetric thermal expansion",
        of: |s| s.expansion,
    },
    Property {
        name: "prandtl",
        kind: Kind::Number,
        text: "Prandtl number",
        of: State::prandtl,
    },
];

/// The names of all figures in an answer with their kinds.
pub fn answer_kinds() -> impl Iterator<Item = (&'static str, Kind)> {
    let columns = Column::ALL.iter().filter_map(|column| {
        let entry = column.entry();
        Some((entry.name, entry.holds.kind()?))
    });
    let properties = PROPERTIES
        .iter()
        .map(|property| (property.name, property.kind));
    columns.chain(properties)
}

/// A set of columns.
#[derive(Clone, Copy, Debug, PartialEq, Eq)]
pub struct Wanted(u64);

impl Wanted {
    /// Every column.
    pub const ALL: Wanted = Wanted(u64::MAX);

    /// Some columns.
    pub fn of(columns: &[Column]) -> Wanted {
        Wanted(
            columns
                .iter()
                .fold(0, |set, &column| set | 1 << column as u32),
        )
    }

    /// Whether any of these columns is wanted.
    pub fn any(self, columns: &[Column]) -> bool {
        self.0 & Wanted::of(columns).0 != 0
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn names_lead_back_to_their_columns_and_fit_the_set() {
        assert!(Column::ALL.len() <= 64);
        for &column in Column::ALL {
            assert_eq!(Column::from_name(column.name()), Some(column));
        }
    }

    #[test]
    fn a_name_stands_for_one_kind() {
        for (name, kind) in answer_kinds() {
            assert!(
                answer_kinds().all(|(other, its)| other != name || its == kind),
                "{name}"
            );
        }
    }
}
