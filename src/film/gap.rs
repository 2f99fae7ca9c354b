//! What gaps and channels answer beside the coefficient.

use crate::case::{Case, Surface};
use crate::geometry::{Geometry, Space};

use super::layer::Entered;

/// Figures that only gaps and channels have.
#[derive(Clone, Copy, Debug, Default, PartialEq)]
pub(super) struct GapFigures {
    /// Conductivity of a still fluid that would carry the same heat.
    pub effective_conductivity: Option<f64>,
    /// Resistance of a plane gap.
    pub thermal_resistance: Option<f64>,
    /// Spacing at which a stack of channels loses most heat.
    pub best_spacing: Option<f64>,
}

/// The figures of a case, none for surfaces in open fluid.
pub(super) fn figures(
    case: &Case,
    entered: &Entered,
    nusselt: f64,
    coefficient: f64,
    radiative_coefficient: Option<f64>,
) -> GapFigures {
    match case.geometry.entry().space {
        Space::Open => GapFigures::default(),
        Space::Closed => GapFigures {
            effective_conductivity: Some(nusselt * entered.state.conductivity),
            thermal_resistance: is_plane(case.geometry)
                .then(|| 1.0 / (coefficient + radiative_coefficient.unwrap_or(0.0))),
            best_spacing: None,
        },
        Space::Channel => GapFigures {
            best_spacing: best_spacing(case, entered),
            ..GapFigures::default()
        },
    }
}

fn is_plane(geometry: Geometry) -> bool {
    matches!(
        geometry,
        Geometry::HorizontalLayer | Geometry::TiltedLayer | Geometry::VerticalCavity
    )
}

/// Spacing at which a stack of isothermal channels loses most heat, m; none when nothing moves.
///
/// # Source
/// Bar-Cohen and Rohsenow 1984: `c (Ra_S/(S^3 H))^(-1/4)`, c 2.71 with both walls heated, 2.15 with one.
fn best_spacing(case: &Case, entered: &Entered) -> Option<f64> {
    let groups = &entered.groups;
    let isothermal = matches!(case.surface, Surface::Temperature(_));
    if !isothermal || groups.rayleigh == 0.0 {
        return None;
    }
    let factor = if groups.heated_walls > 1.0 {
        2.71
    } else {
        2.15
    };
    let spacing = case.size.characteristic_length;
    Some(factor * spacing * (groups.aspect / groups.rayleigh).powf(0.25))
}
