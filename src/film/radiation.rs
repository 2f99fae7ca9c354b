//! Radiation beside convection.

/// Stefan-Boltzmann constant, W/(m2 K4).
///
/// # Source
/// Exact by the 2019 revision of the SI: `2 pi^5 k^4/(15 h^3 c^2)` (CODATA 2018).
const STEFAN_BOLTZMANN: f64 = 5.670_374_419e-8;

/// Heat flux of a grey surface to much larger surroundings, over their temperature difference.
///
/// # Units
/// K, K → W/(m2 K)
pub(super) fn coefficient(emissivity: f64, surface: f64, surroundings: f64) -> f64 {
    emissivity
        * STEFAN_BOLTZMANN
        * (surface * surface + surroundings * surroundings)
        * (surface + surroundings)
}
