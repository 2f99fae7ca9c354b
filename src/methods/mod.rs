//! The registry of published methods: from dimensionless groups to a Nusselt number.
//!
//! A method is one literal in its body's file; the list below names it, and is the only list of ids.
//! Within a body, heating and side, the automatic choice goes through the ones marked for it in the order of the list.

mod choice;
mod concentric;
mod convex_body;
mod entry;
mod evidence;
pub mod forced;
mod groups;
mod horizontal_cylinder;
mod horizontal_layer;
mod horizontal_plate;
mod inclined_cylinder;
mod inclined_plate;
mod layers;
mod parallel_plates;
mod range;
mod sources;
mod sphere;
mod tilted_layer;
mod vertical_cavity;
mod vertical_cylinder;
mod vertical_plate;

use std::fmt::Write;
use std::sync::LazyLock;

use crate::digest::sha256;
use crate::geometry::{Geometry, choice};

pub use choice::{choose, neighbour};
pub use entry::{Example, Heating, Method, ReferenceTemperature, Scatter, Side, Source};
pub use evidence::{Evidence, evidence};
pub use groups::Groups;
pub use range::{Quantity, Range, RangeStatus, Verdict};
pub use tilted_layer::step_of_ends;
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
    inclined_cylinder {
        InclinedCylinderRaithbyHollands = "inclined-cylinder-raithby-hollands", RAITHBY_HOLLANDS;
        InclinedCylinderAlArabiKhamis = "inclined-cylinder-al-arabi-khamis", AL_ARABI_KHAMIS;
    }
    convex_body {
        BlockHassaniHollands = "block-hassani-hollands", BLOCK;
        BlockYovanovich = "block-yovanovich", BLOCK_LAMINAR;
        UprightShortCylinderHassaniHollands = "upright-short-cylinder-hassani-hollands", UPRIGHT;
        UprightShortCylinderYovanovich = "upright-short-cylinder-yovanovich", UPRIGHT_LAMINAR;
        LyingShortCylinderHassaniHollands = "lying-short-cylinder-hassani-hollands", LYING;
        LyingShortCylinderYovanovich = "lying-short-cylinder-yovanovich", LYING_LAMINAR;
    }
    horizontal_layer {
        HorizontalLayerHollandsRaithbyKonicek = "horizontal-layer-hollands-raithby-konicek", HOLLANDS_RAITHBY_KONICEK;
        HorizontalLayerHollands = "horizontal-layer-hollands", HOLLANDS;
        HorizontalLayerGlobeDropkin = "horizontal-layer-globe-dropkin", GLOBE_DROPKIN;
        HorizontalLayerEn673 = "horizontal-layer-en673", GLAZING;
        HorizontalLayerConduction = "horizontal-layer-conduction", CONDUCTION;
    }
    tilted_layer {
        TiltedLayerHollandsUnnyRaithbyKonicek = "tilted-layer-hollands-unny-raithby-konicek", HOLLANDS_UNNY_RAITHBY_KONICEK;
        TiltedLayerElsherbiny = "tilted-layer-elsherbiny", ELSHERBINY;
        TiltedLayerCatton = "tilted-layer-catton", CATTON;
        TiltedLayerEn673 = "tilted-layer-en673", GLAZING;
    }
    vertical_cavity {
        VerticalCavityElsherbiny = "vertical-cavity-elsherbiny", ELSHERBINY;
        VerticalCavityBerkovskyPolevikov = "vertical-cavity-berkovsky-polevikov", LOW;
        VerticalCavityCatton = "vertical-cavity-catton", CATTON;
        VerticalCavityMacgregorEmeryTurbulent = "vertical-cavity-macgregor-emery-turbulent", MACGREGOR_EMERY_TURBULENT;
        VerticalCavityMacgregorEmery = "vertical-cavity-macgregor-emery", TALL;
        VerticalCavityWright = "vertical-cavity-wright", WRIGHT;
        VerticalCavityEn673 = "vertical-cavity-en673", GLAZING;
    }
    concentric {
        ConcentricCylindersRaithbyHollands = "concentric-cylinders-raithby-hollands", CYLINDERS;
        ConcentricSpheresRaithbyHollands = "concentric-spheres-raithby-hollands", SPHERES;
    }
    parallel_plates {
        ParallelPlatesBarCohenRohsenow = "parallel-plates-bar-cohen-rohsenow", ISOTHERMAL;
        ParallelPlatesElenbaas = "parallel-plates-elenbaas", ELENBAAS;
        ParallelPlatesBarCohenRohsenowUniformFlux = "parallel-plates-bar-cohen-rohsenow-uniform-flux", UNIFORM_FLUX;
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

/// The methods of an isothermal body's automatic choice.
fn automatic(geometry: Geometry, side: Side) -> impl Iterator<Item = &'static Method> {
    let methods = MethodId::serving(geometry, Heating::Isothermal, side).iter();
    methods
        .map(|id| id.method())
        .filter(|method| method.automatic)
}

/// Nusselt number of an isothermal body by the automatic choice.
fn automatic_nusselt(geometry: Geometry, side: Side, groups: &Groups) -> f64 {
    choose(automatic(geometry, side), |method| method.verdict(groups))
        .map_or(1.0, |method| (method.nusselt)(groups))
}

/// Digest of everything that figures rest on: ids in their order, formulas, sources, ranges and examples of the methods, and what is said of the forced parts.
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
                "{} {:?} {:?} {:?} {} {} {:?} {:?} {:?} {:?} {:?}",
                id.as_str(),
                m.geometry,
                m.heating,
                m.side,
                m.automatic,
                m.formula,
                m.source,
                m.ranges,
                m.reference,
                m.scatter,
                example
            );
        }
        for part in [&forced::PLATE, &forced::CYLINDER, &forced::SPHERE] {
            let nusselt = (part.nusselt)(1e4, 1.0, 1.0);
            let _ = writeln!(text, "{} {:?} {nusselt}", part.formula, part.source);
        }
        sha256(text.as_bytes())
    });
    &DIGEST
}

#[cfg(test)]
mod tests;
