//! The registry of published methods: from dimensionless groups to a Nusselt number.
//!
//! A method is one literal in its body's file; the list below names it, and is the only list of ids.
//! Within a body, heating and side, the first one listed is the automatic choice.

mod entry;
mod groups;
mod horizontal_cylinder;
mod horizontal_plate;
mod inclined_plate;
mod layers;
mod sources;
mod sphere;
mod vertical_cylinder;
mod vertical_plate;

use std::fmt::Write;
use std::sync::LazyLock;

use crate::digest::sha256;
use crate::geometry::{Geometry, choice};

pub use entry::{Example, Heating, Method, ReferenceTemperature, Scatter, Side, Source};
pub use groups::{Groups, Quantity, Range, RangeStatus, Verdict};
pub use vertical_cylinder::curvature_factor;

macro_rules! registry {
    ($($body:ident { $($variant:ident = $id:literal, $entry:ident;)+ })+) => {
        choice! {
            /// The id of a published method.
            MethodId { $($(#[doc = $id] $variant = $id,)+)+ }
        }

        static METHODS: &[&Method] = &[$($(&$body::$entry,)+)+];
    };
}

registry! {
    vertical_plate {
        VerticalPlateRaithbyHollands = "vertical-plate-raithby-hollands", RAITHBY_HOLLANDS;
        VerticalPlateChurchillChu = "vertical-plate-churchill-chu", CHURCHILL_CHU;
        VerticalPlateChurchillChuLaminar = "vertical-plate-churchill-chu-laminar", CHURCHILL_CHU_LAMINAR;
        VerticalPlateLefevre = "vertical-plate-lefevre", LEFEVRE;
        VerticalPlateSquireEckert = "vertical-plate-squire-eckert", SQUIRE_ECKERT;
        VerticalPlatePowerLaw = "vertical-plate-power-law", POWER_LAW;
        VerticalPlateChurchillChuUniformFlux = "vertical-plate-churchill-chu-uniform-flux", CHURCHILL_CHU_UNIFORM_FLUX;
        VerticalPlateChurchillChuLaminarUniformFlux = "vertical-plate-churchill-chu-laminar-uniform-flux", CHURCHILL_CHU_LAMINAR_UNIFORM_FLUX;
        VerticalPlateFujiiFujii = "vertical-plate-fujii-fujii", FUJII_FUJII;
        VerticalPlateVliet = "vertical-plate-vliet", VLIET_UNIFORM_FLUX;
    }
    inclined_plate {
        InclinedPlateRaithbyHollandsUnstable = "inclined-plate-raithby-hollands-unstable", RAITHBY_HOLLANDS_UNSTABLE;
        InclinedPlateVliet = "inclined-plate-vliet", VLIET_UNSTABLE;
        InclinedPlateFujiiImuraUnstable = "inclined-plate-fujii-imura-unstable", FUJII_IMURA_UNSTABLE;
        InclinedPlateRaithbyHollandsStable = "inclined-plate-raithby-hollands-stable", RAITHBY_HOLLANDS_STABLE;
        InclinedPlateChurchillChuLaminar = "inclined-plate-churchill-chu-laminar", CHURCHILL_CHU_LAMINAR;
        InclinedPlateVlietRoss = "inclined-plate-vliet-ross", VLIET_ROSS;
        InclinedPlateFujiiImura = "inclined-plate-fujii-imura", FUJII_IMURA_STABLE;
    }
    horizontal_plate {
        HorizontalPlateRaithbyHollandsUnstable = "horizontal-plate-raithby-hollands-unstable", RAITHBY_HOLLANDS_UNSTABLE;
        HorizontalPlateLloydMoran = "horizontal-plate-lloyd-moran", LLOYD_MORAN;
        HorizontalPlateGoldsteinSparrowJones = "horizontal-plate-goldstein-sparrow-jones", GOLDSTEIN_SPARROW_JONES;
        HorizontalPlateRaithbyHollandsStable = "horizontal-plate-raithby-hollands-stable", RAITHBY_HOLLANDS_STABLE;
        HorizontalPlateRadziemskaLewandowski = "horizontal-plate-radziemska-lewandowski", RADZIEMSKA_LEWANDOWSKI;
        HorizontalPlateMcadams = "horizontal-plate-mcadams", MCADAMS_STABLE;
    }
    horizontal_cylinder {
        HorizontalCylinderChurchillChu = "horizontal-cylinder-churchill-chu", CHURCHILL_CHU;
        HorizontalCylinderChurchillChuLaminar = "horizontal-cylinder-churchill-chu-laminar", CHURCHILL_CHU_LAMINAR;
        HorizontalCylinderMorgan = "horizontal-cylinder-morgan", MORGAN;
        HorizontalCylinderRaithbyHollands = "horizontal-cylinder-raithby-hollands", RAITHBY_HOLLANDS;
        HorizontalCylinderKuehnGoldstein = "horizontal-cylinder-kuehn-goldstein", KUEHN_GOLDSTEIN;
        HorizontalCylinderPowerLaw = "horizontal-cylinder-power-law", POWER_LAW;
    }
    vertical_cylinder {
        VerticalCylinderPopiel = "vertical-cylinder-popiel", POPIEL;
        VerticalCylinderLefevreEde = "vertical-cylinder-lefevre-ede", LEFEVRE_EDE;
        VerticalCylinderChurchillChu = "vertical-cylinder-churchill-chu", CHURCHILL_CHU;
    }
    sphere {
        SphereChurchill = "sphere-churchill", CHURCHILL;
        SphereYuge = "sphere-yuge", YUGE;
        SphereRaithbyHollands = "sphere-raithby-hollands", RAITHBY_HOLLANDS;
    }
}

impl MethodId {
    /// What the registry knows of it.
    pub fn method(self) -> &'static Method {
        METHODS[self as usize]
    }

    /// Whether it is the automatic choice of its body for some heating and side.
    pub fn is_automatic(self) -> bool {
        let geometry = self.method().geometry;
        [Heating::Isothermal, Heating::UniformFlux]
            .iter()
            .any(|&heating| {
                let mut sides = Side::ALL.iter();
                sides.any(|&side| MethodId::serving(geometry, heating, side).first() == Some(&self))
            })
    }

    /// The methods of a body for a heating and a side, the automatic choice first.
    pub fn serving(geometry: Geometry, heating: Heating, side: Side) -> &'static [MethodId] {
        static TABLE: LazyLock<Vec<Vec<MethodId>>> = LazyLock::new(|| {
            let heatings = || {
                Heating::ALL
                    .iter()
                    .flat_map(|&h| Side::ALL.iter().map(move |&s| (h, s)))
            };
            let cases = Geometry::ALL
                .iter()
                .flat_map(|&g| heatings().map(move |(h, s)| (g, h, s)));
            cases
                .map(|(geometry, heating, side)| listed(geometry, heating, side))
                .collect()
        });
        let place = geometry as usize * Heating::ALL.len() + heating as usize;
        &TABLE[place * Side::ALL.len() + side as usize]
    }
}

fn listed(geometry: Geometry, heating: Heating, side: Side) -> Vec<MethodId> {
    let serves = |id: &MethodId| {
        let method = id.method();
        method.geometry == geometry && method.serves(heating, side)
    };
    MethodId::ALL.iter().copied().filter(serves).collect()
}

/// Digest of everything the registry says of its methods: ids, formulas, sources, ranges and examples.
pub fn registry_digest() -> &'static str {
    static DIGEST: LazyLock<String> = LazyLock::new(|| {
        let mut text = String::new();
        for id in MethodId::ALL {
            let m = id.method();
            let example = (
                m.example.groups,
                m.example.nusselt,
                (m.nusselt)(&m.example.groups),
            );
            // Writing to a String does not fail.
            let _ = writeln!(
                text,
                "{} {:?} {:?} {:?} {} {:?} {:?} {:?} {:?} {:?}",
                id.as_str(),
                m.geometry,
                m.heating,
                m.side,
                m.formula,
                m.source,
                m.ranges,
                m.reference,
                m.scatter,
                example
            );
        }
        sha256(text.as_bytes())
    });
    &DIGEST
}

#[cfg(test)]
mod tests;
