//! Fluids by id.

use std::path::Path;
use std::sync::Arc;

use crate::digest::sha256;

use super::built_in::BUILT_IN;
use super::fault::FolderFault;
use super::fluid::Fluid;
use super::folder;
use super::humid_air::{self, HumidityError};
use super::vapour;

/// A fluid's place in [`Fluids`].
#[derive(Clone, Copy, PartialEq, Eq, Hash, Debug)]
pub struct FluidId(usize);

/// The built-in fluids, and behind them those that an operator or a caller adds.
#[derive(Clone)]
pub struct Fluids {
    /// Never empty: every collection begins with the built-in ones.
    fluids: Vec<Arc<Fluid>>,
    digest: String,
}

impl Fluids {
    pub(super) fn new(fluids: Vec<Arc<Fluid>>) -> Self {
        let digests: String = fluids.iter().map(|fluid| fluid.digest()).collect();
        Self {
            fluids,
            digest: sha256(digests.as_bytes()),
        }
    }

    /// The fluids that come with the service, read once.
    pub fn built_in() -> &'static Self {
        &BUILT_IN
    }

    /// The built-in fluids and those of every `*.csv` in a folder, by name of file.
    ///
    /// # Errors
    /// All faults of all files, and ids that stand twice.
    pub fn with_folder(folder: &Path) -> Result<Self, Vec<FolderFault>> {
        folder::read(folder, BUILT_IN.fluids.clone()).map(Self::new)
    }

    /// These fluids and one more, cheap enough for a single request. The ids of these hold
    /// there too; [`Self::digest`] stays, as the one more is part of the request.
    pub fn with_own(&self, fluid: Fluid) -> (Self, FluidId) {
        let mut extended = self.clone();
        extended.fluids.push(Arc::new(fluid));
        (extended, FluidId(self.fluids.len()))
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

    /// The fluid of an id that this collection, or one that it extends, gave out. An id beyond
    /// them, of a fluid added to another collection, gives the default.
    pub fn get(&self, id: FluidId) -> &Fluid {
        self.fluids.get(id.0).unwrap_or(&self.fluids[0])
    }

    /// Every fluid with its id, in a fixed order.
    pub fn iter(&self) -> impl Iterator<Item = (FluidId, &Fluid)> {
        let fluids = self.fluids.iter().map(|fluid| &**fluid);
        (0..).map(FluidId).zip(fluids)
    }

    /// `sha256:` and the hexadecimal digest of the tables' own digests, in order.
    pub fn digest(&self) -> &str {
        &self.digest
    }

    /// The composition of humid air of a relative humidity, 0 to 1: vapour pressure over
    /// saturation pressure, over water above 0 °C and over ice below.
    ///
    /// # Units
    /// K, Pa → kg of vapour per kg of dry air
    ///
    /// # Errors
    /// Outside the temperatures and humidities served.
    ///
    /// # Source
    /// Definition. That saturated vapour is slightly denser in air than alone (0.4 % at 1 bar)
    /// is left out: against CoolProp's `HAPropsSI`, which counts it, within 0.7 % up to 60 °C and
    /// 1.4 % up to 90 °C and 99 %, at 0.8 to 1.2 bar.
    pub fn humidity_ratio(
        relative_humidity: f64,
        temperature: f64,
        pressure: f64,
    ) -> Result<f64, HumidityError> {
        humid_air::humidity_ratio(relative_humidity, temperature, pressure)
    }

    /// The temperature at which humid air begins to condense, below 0 °C to freeze out; none
    /// for dry air and outside 150 K to the critical point.
    ///
    /// # Units
    /// kg of vapour per kg of dry air, Pa → K
    pub fn dew_point(humidity_ratio: f64, pressure: f64) -> Option<f64> {
        vapour::saturation_temperature(humid_air::vapour_pressure(humidity_ratio, pressure))
    }
}
