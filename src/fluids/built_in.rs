//! The fluids that come with the service.

use std::sync::LazyLock;

use crate::digest::sha256;

use super::fluid::Fluid;

/// The texts of the built-in tables; air, the default, stands first.
const TEXTS: [&str; 11] = [
    include_str!("tables/air.csv"),
    include_str!("tables/nitrogen.csv"),
    include_str!("tables/carbon-dioxide.csv"),
    include_str!("tables/argon.csv"),
    include_str!("tables/helium.csv"),
    include_str!("tables/hydrogen.csv"),
    include_str!("tables/steam.csv"),
    include_str!("tables/water.csv"),
    include_str!("tables/ethylene-glycol.csv"),
    include_str!("tables/engine-oil.csv"),
    include_str!("tables/transformer-oil.csv"),
];

static BUILT_IN: LazyLock<Fluids> = LazyLock::new(|| Fluids {
    fluids: TEXTS
        .iter()
        .map(|text| Fluid::read(text).expect("embedded tables are read by a test"))
        .collect(),
    digest: sha256(TEXTS.concat().as_bytes()),
});

/// A fluid's place in [`Fluids`].
#[derive(Clone, Copy, PartialEq, Eq, Hash, Debug)]
pub struct FluidId(u16);

/// Fluids by id.
pub struct Fluids {
    fluids: Vec<Fluid>,
    digest: String,
}

impl Fluids {
    /// The fluids that come with the service, read once.
    pub fn built_in() -> &'static Self {
        &BUILT_IN
    }

    /// The fluid taken where a request names none: air.
    pub fn default_fluid() -> FluidId {
        FluidId(0)
    }

    /// The fluid of this id, exactly as written.
    pub fn find(&self, id: &str) -> Option<FluidId> {
        self.iter()
            .find(|(_, fluid)| fluid.id() == id)
            .map(|(id, _)| id)
    }

    /// The fluid of an id that this collection gave out.
    pub fn get(&self, id: FluidId) -> &Fluid {
        &self.fluids[usize::from(id.0)]
    }

    /// Every fluid with its id, in a fixed order.
    pub fn iter(&self) -> impl Iterator<Item = (FluidId, &Fluid)> {
        (0..).map(FluidId).zip(&self.fluids)
    }

    /// `sha256:` and the hexadecimal digest of the tables' texts, in order.
    pub fn digest(&self) -> &str {
        &self.digest
    }
}
