//! Notes on an answer: a set of codes, as light as a number.

use crate::geometry::{Field, choice};

choice! {
    /// How much a note matters.
    Severity {
        /// Worth knowing.
        Info = "info",
        /// The figure or the surface wants care.
        Caution = "caution",
        /// The figure is doubtful, or the surface is dangerous.
        Warning = "warning",
    }
}

choice! {
    /// What a note says.
    NoteCode {
        /// The Rayleigh number is below the method's range.
        RayleighBelowRange = "rayleigh-below-range",
        /// The Rayleigh number is above the method's range.
        RayleighAboveRange = "rayleigh-above-range",
        /// The Prandtl number is outside the method's range.
        PrandtlOutsideRange = "prandtl-outside-range",
        /// A tilt or a proportion is outside the method's range.
        ShapeOutsideRange = "shape-outside-range",
        /// The automatic choice left the body's usual method.
        MethodStep = "method-step",
        /// The layer is neither laminar nor turbulent.
        Transition = "transition",
        /// The gap's fluid conducts and hardly moves.
        PureConduction = "pure-conduction",
        /// The draught is not small against free convection.
        DraughtMatters = "draught-matters",
        /// The draught decides the loss.
        DraughtGoverns = "draught-governs",
        /// A wall or neighbour is closer than the layer is thick.
        Confined = "confined",
        /// An inch size looks like a nominal pipe size.
        NominalSize = "nominal-size",
        /// The layer is thick against the cylinder's diameter.
        ThinCylinder = "thin-cylinder",
        /// The ends are surfaces of their own.
        EndsNotCounted = "ends-not-counted",
        /// No emissivity was given.
        RadiationNotCounted = "radiation-not-counted",
        /// A shiny surface misleads infrared thermometers.
        LowEmissivityReading = "low-emissivity-reading",
        /// The methods within range differ by more than 20 %.
        MethodsDisagree = "methods-disagree",
        /// The properties differ much between surface and ambient.
        StrongPropertyVariation = "strong-property-variation",
        /// The film is close to the fluid's greatest density.
        DensityMaximum = "density-maximum",
        /// The surface is above the boiling point.
        MayBoil = "may-boil",
        /// The surface is below the condensation point.
        MayCondense = "may-condense",
        /// The surface is below the freezing point.
        MayFreeze = "may-freeze",
        /// The surface can burn.
        BurnHazard = "burn-hazard",
        /// The surface is above the fluid's flash point.
        AboveFlashPoint = "above-flash-point",
        /// The ambient temperature looks like degrees Celsius taken as kelvin.
        BareNumberAsKelvin = "bare-number-as-kelvin",
        /// The gas's density away from the table's pressure follows the ideal rule.
        IdealGasFallback = "ideal-gas-fallback",
        /// The densities of a caller's table are too rough for their slope.
        RoughExpansion = "rough-expansion",
        /// The film is at the edge of the fluid's table.
        TableEdge = "table-edge",
        /// Surface and ambient have one temperature.
        EqualTemperatures = "equal-temperatures",
    }
}

impl NoteCode {
    /// The field that the note is about.
    pub fn field(self) -> Option<Field> {
        match self {
            NoteCode::RayleighBelowRange
            | NoteCode::RayleighAboveRange
            | NoteCode::PrandtlOutsideRange
            | NoteCode::ShapeOutsideRange
            | NoteCode::MethodStep
            | NoteCode::MethodsDisagree => Some(Field::Method),
            NoteCode::ThinCylinder | NoteCode::NominalSize => Some(Field::Diameter),
            NoteCode::DraughtMatters | NoteCode::DraughtGoverns => Some(Field::DraughtSpeed),
            NoteCode::Confined => Some(Field::Clearance),
            NoteCode::IdealGasFallback => Some(Field::Pressure),
            NoteCode::RadiationNotCounted | NoteCode::LowEmissivityReading => {
                Some(Field::Emissivity)
            }
            NoteCode::MayBoil
            | NoteCode::MayCondense
            | NoteCode::MayFreeze
            | NoteCode::BurnHazard
            | NoteCode::AboveFlashPoint
            | NoteCode::EqualTemperatures => Some(Field::SurfaceTemperature),
            NoteCode::BareNumberAsKelvin => Some(Field::AmbientTemperature),
            NoteCode::StrongPropertyVariation
            | NoteCode::DensityMaximum
            | NoteCode::RoughExpansion
            | NoteCode::TableEdge => Some(Field::Fluid),
            NoteCode::Transition | NoteCode::EndsNotCounted | NoteCode::PureConduction => None,
        }
    }
}

/// A set of note codes.
#[derive(Clone, Copy, Debug, Default, PartialEq, Eq)]
pub struct Notes(u64);

impl Notes {
    /// Adds a code when a condition holds.
    pub fn add_if(&mut self, condition: bool, code: NoteCode) {
        self.0 |= u64::from(condition) << code as u32;
    }

    /// Whether a code is in the set.
    pub fn contains(self, code: NoteCode) -> bool {
        self.0 & (1 << code as u32) != 0
    }

    /// The codes, in the order of the list.
    pub fn iter(self) -> impl Iterator<Item = NoteCode> {
        NoteCode::ALL
            .iter()
            .copied()
            .filter(move |&code| self.contains(code))
    }
}
