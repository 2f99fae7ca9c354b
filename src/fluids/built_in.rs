//! The fluids that come with the service.

use std::sync::LazyLock;

use super::collection::Fluids;
use super::fluid::Fluid;

/// The texts of the built-in tables; air, the default, stands first.
const TEXTS: [&str; 15] = [
    include_str!("tables/air.csv"),
    include_str!("tables/nitrogen.csv"),
    include_str!("tables/oxygen.csv"),
    include_str!("tables/carbon-dioxide.csv"),
    include_str!("tables/argon.csv"),
    include_str!("tables/helium.csv"),
    include_str!("tables/hydrogen.csv"),
    include_str!("tables/methane.csv"),
    include_str!("tables/steam.csv"),
    include_str!("tables/water.csv"),
    include_str!("tables/ethylene-glycol.csv"),
    include_str!("tables/ethylene-glycol-water.csv"),
    include_str!("tables/propylene-glycol-water.csv"),
    include_str!("tables/engine-oil.csv"),
    include_str!("tables/transformer-oil.csv"),
];

/// All of them, read once.
pub(super) static BUILT_IN: LazyLock<Fluids> = LazyLock::new(|| {
    let read = |text: &&str| Fluid::read(text).expect("embedded tables are read by a test");
    Fluids::new(TEXTS.iter().map(read).map(Into::into).collect())
});
