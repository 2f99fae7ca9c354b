//! Rules that hold for every entry of the registry.

use std::collections::HashSet;

use proptest::prelude::*;

use crate::geometry::Space;

use super::*;

/// Runs a rule over every method and reports all that break it.
fn every_method(rule: impl Fn(MethodId, &Method) -> Result<(), String>) {
    let faults: Vec<String> = MethodId::ALL
        .iter()
        .filter_map(|&id| {
            rule(id, id.method())
                .err()
                .map(|fault| format!("{}: {fault}", id.as_str()))
        })
        .collect();
    assert!(faults.is_empty(), "{}", faults.join("\n"));
}

fn require(holds: bool, fault: impl FnOnce() -> String) -> Result<(), String> {
    if holds { Ok(()) } else { Err(fault()) }
}

/// The Rayleigh numbers that all ranges of a method allow, for groups that are otherwise its example's.
fn rayleigh_band(method: &Method) -> (f64, f64) {
    let mut band = (1e-12_f64, 1e14_f64);
    for range in method.ranges {
        let scale = match range.quantity {
            Quantity::Rayleigh => 1.0,
            quantity if quantity.is_buoyancy() => {
                quantity.of(&method.example.groups.at_rayleigh(1.0))
            }
            _ => continue,
        };
        band = (
            band.0.max(range.minimum / scale),
            band.1.min(range.maximum / scale),
        );
    }
    band
}

#[test]
fn examples_reproduce() {
    every_method(|_, method| {
        let example = method.example;
        let found = (method.nusselt)(&example.groups);
        let exponent = example.nusselt.abs().log10().floor() as i32 + 1;
        let tolerance = 0.5 * 10_f64.powi(exponent - i32::from(example.figures));
        require(
            (found - example.nusselt).abs() <= tolerance * 1.0001,
            || {
                format!(
                    "{found} instead of {} from {}",
                    example.nusselt, example.from
                )
            },
        )
    });
}

#[test]
fn ids_are_unique_and_begin_with_their_body() {
    let mut seen = HashSet::new();
    every_method(|id, method| {
        require(id.as_str().starts_with(method.geometry.as_str()), || {
            format!("does not begin with {}", method.geometry.as_str())
        })
    });
    for id in MethodId::ALL {
        assert!(seen.insert(id.as_str()), "{} stands twice", id.as_str());
        assert_eq!(MethodId::from_text(id.as_str()), Some(*id));
    }
}

#[test]
fn sources_formulas_and_examples_are_complete() {
    every_method(|_, method| {
        let Source {
            authors,
            year,
            work,
            locator,
        } = method.source;
        require(
            !authors.is_empty()
                && !work.is_empty()
                && !locator.is_empty()
                && (1900..2030).contains(&year),
            || format!("source {:?}", method.source),
        )?;
        require(
            method.formula.contains("Nu") || method.formula.contains("k_eff"),
            || "formula without Nu".to_owned(),
        )?;
        require(
            !method.example.from.is_empty() && method.example.figures >= 3,
            || "example without origin or figures".to_owned(),
        )
    });
}

#[test]
fn ranges_are_sane_and_hold_the_example() {
    every_method(|_, method| {
        for range in method.ranges {
            require(
                range.minimum <= range.maximum && range.minimum >= 0.0,
                || format!("{range:?}"),
            )?;
        }
        let bounds_rayleigh = method
            .ranges
            .iter()
            .any(|range| range.quantity.is_buoyancy());
        require(bounds_rayleigh, || "no Rayleigh range".to_owned())?;
        require(method.holds(&method.example.groups), || {
            "example out of range".to_owned()
        })
    });
}

/// The largest step that the sources' own bands make is McAdams' on the cylinder, 38 %.
#[test]
fn bands_meet_within_the_step_that_the_entry_states() {
    every_method(|_, method| {
        for edge in method.edges.iter().map(|edge| edge(&method.example.groups)) {
            let at = |rayleigh: f64| (method.nusselt)(&method.example.groups.at_rayleigh(rayleigh));
            let step = 100.0 * (at(edge * (1.0 + 1e-12)) / at(edge) - 1.0);
            let stated = stated_step(method.remark)
                .ok_or_else(|| "bands without a stated step".to_owned())?;
            require(step.abs() <= stated.abs() + 0.5, || {
                format!("steps by {step:.2} % at {edge:e}, {stated} % stated")
            })?;
        }
        Ok(())
    });
}

/// The percentage in the remark's sentence on steps.
fn stated_step(remark: &str) -> Option<f64> {
    let sentence = &remark[remark.find("bands step by")?..];
    let number = sentence
        .split(' ')
        .find(|word| word.parse::<f64>().is_ok())?;
    number.parse().ok()
}

#[test]
fn formulas_are_continuous_away_from_their_edges() {
    every_method(|_, method| {
        let (low, high) = rayleigh_band(method);
        let mut rayleigh = low.max(1e-10);
        while rayleigh < high {
            let next = rayleigh * 1.0023;
            let crosses = method.changes_between(
                &method.example.groups.at_rayleigh(rayleigh),
                &method.example.groups.at_rayleigh(next),
            );
            let at = |r: f64| (method.nusselt)(&method.example.groups.at_rayleigh(r));
            let step = at(next) / at(rayleigh) - 1.0;
            require(crosses || step.abs() < 0.01, || {
                format!("steps by {step} at {rayleigh:e}")
            })?;
            rayleigh = next;
        }
        Ok(())
    });
}

#[test]
fn every_body_heating_and_side_has_an_automatic_choice() {
    for &geometry in Geometry::ALL {
        let heatings: &[Heating] = match geometry.entry().space {
            Space::Closed => &[Heating::Isothermal],
            Space::Open | Space::Channel => &[Heating::Isothermal, Heating::UniformFlux],
        };
        let sides: &[Side] = match geometry {
            Geometry::InclinedPlate | Geometry::HorizontalPlate | Geometry::HorizontalLayer => {
                &[Side::Unstable, Side::Stable]
            }
            _ => &[Side::Any],
        };
        for &heating in heatings {
            for &side in sides {
                let serving = MethodId::serving(geometry, heating, side);
                assert!(
                    serving.iter().any(|id| id.method().automatic),
                    "{geometry:?} {heating:?} {side:?}"
                );
            }
        }
    }
}

/// The Nusselt number of a gap is 1 when nothing moves, and never less.
#[test]
fn gaps_conduct_when_nothing_moves() {
    every_method(|_, method| {
        if method.geometry.entry().space != Space::Closed {
            return Ok(());
        }
        for rayleigh in [0.0, 1e-9, 1e-3] {
            let nusselt = (method.nusselt)(&method.example.groups.at_rayleigh(rayleigh));
            require((nusselt - 1.0).abs() < 1e-12, || {
                format!("{nusselt} at Ra {rayleigh}")
            })?;
        }
        Ok(())
    });
}

/// A layer heated from below begins to move at 1708 (Jeffreys 1928: 1707.76).
#[test]
fn a_level_layer_moves_from_its_onset() {
    for id in [
        MethodId::HorizontalLayerHollandsRaithbyKonicek,
        MethodId::HorizontalLayerHollands,
    ] {
        let at = |rayleigh: f64| (id.method().nusselt)(&Groups::new(rayleigh, 0.71));
        assert_eq!(at(1708.0), 1.0);
        assert!(at(1709.0) > 1.0);
    }
}

#[test]
fn a_tilted_layer_ends_as_a_level_one_and_as_a_cavity() {
    for prandtl in [0.7, 6.0, 200.0] {
        for aspect in [1.0, 3.0, 8.0, 30.0] {
            for rayleigh in [1e3, 1e4, 1e5, 1e6, 1e7] {
                let groups = Groups::new(rayleigh, prandtl).with_aspect(aspect);
                let tilted = |tilt: f64| {
                    automatic_nusselt(Geometry::TiltedLayer, Side::Any, &groups.tilted(tilt))
                };
                let level = automatic_nusselt(Geometry::HorizontalLayer, Side::Unstable, &groups);
                let upright = automatic_nusselt(Geometry::VerticalCavity, Side::Any, &groups);
                assert!((tilted(0.0) / level - 1.0).abs() < 1e-12, "{groups:?}");
                assert!((tilted(90.0) / upright - 1.0).abs() < 1e-12, "{groups:?}");
                assert!((tilted(180.0) - 1.0).abs() < 1e-12, "{groups:?}");
            }
        }
    }
}

/// Bar-Cohen and Rohsenow 1984: fully developed channels, Nu/E 1/24 and 1/12; flux (E*/48)^(1/2), (E*/24)^(1/2).
#[test]
fn narrow_channels_have_their_limits() {
    let narrow = |walls: f64| Groups {
        heated_walls: walls,
        ..Groups::new(1e-6, 0.7).with_aspect(1.0)
    };
    for (walls, isothermal, flux) in [(2.0, 24.0, 48.0), (1.0, 12.0, 24.0)] {
        let groups = narrow(walls);
        let nusselt = (MethodId::ParallelPlatesBarCohenRohsenow.method().nusselt)(&groups);
        assert!((nusselt * isothermal / 1e-6 - 1.0).abs() < 1e-6);
        let id = MethodId::ParallelPlatesBarCohenRohsenowUniformFlux;
        let nusselt = (id.method().nusselt)(&groups);
        let modified = 1e-6 * nusselt;
        assert!((nusselt / (modified / flux).sqrt() - 1.0).abs() < 1e-3);
    }
}

#[test]
fn the_limit_of_no_difference_is_finite() {
    every_method(|_, method| {
        let nusselt = (method.nusselt)(&method.example.groups.at_rayleigh(0.0));
        require(nusselt.is_finite() && nusselt >= 0.0, || {
            format!("{nusselt} at Ra 0")
        })
    });
}

proptest! {
    #![proptest_config(ProptestConfig::with_cases(2000))]

    #[test]
    fn nusselt_is_positive_and_finite_everywhere(
        exponent in -20.0..30.0, prandtl_exponent in -3.0..6.0, shape in shapes(1e-6..1e6),
    ) {
        let groups = Groups {
            rayleigh: 10_f64.powf(exponent),
            prandtl: 10_f64.powf(prandtl_exponent),
            ..shape
        };
        for id in MethodId::ALL {
            let nusselt = (id.method().nusselt)(&groups);
            let least = match id.method().geometry.entry().space {
                Space::Closed => 1.0,
                Space::Open | Space::Channel => f64::MIN_POSITIVE,
            };
            prop_assert!(nusselt.is_finite() && nusselt >= least, "{}: {nusselt}", id.as_str());
        }
    }

    #[test]
    fn nusselt_rises_with_rayleigh_inside_a_method(
        share in 0.0..1.0, step in 1e-4..0.1, prandtl in 0.6..100.0, shape in shapes(0.01..100.0),
    ) {
        for id in MethodId::ALL {
            let method = id.method();
            let (low, high) = rayleigh_band(method);
            let rayleigh = low.max(1e-10) * (high / low.max(1e-10)).powf(share);
            let groups = Groups { rayleigh, prandtl, ..shape };
            let next = groups.at_rayleigh(rayleigh * (1.0 + step));
            let crosses = method.changes_between(&groups, &next)
                || *id == MethodId::TiltedLayerCatton && step_of_ends(&groups) != 0.0;
            if method.holds(&groups) && method.holds(&next) && !crosses {
                let (before, after) = ((method.nusselt)(&groups), (method.nusselt)(&next));
                let rises = match method.geometry.entry().space {
                    Space::Closed => after >= before * (1.0 - 1e-12),
                    Space::Open | Space::Channel => after > before,
                };
                prop_assert!(rises, "{} at {groups:?}", id.as_str());
            }
        }
    }
}

/// Tilts and proportions of all bodies at once.
fn shapes(proportions: std::ops::Range<f64>) -> impl Strategy<Value = Groups> {
    let (low, high) = (proportions.start.ln(), proportions.end.ln());
    let proportion = move || (low..high).prop_map(f64::exp);
    let side = || 0.01..1.0_f64;
    (
        0.0..=90.0_f64,
        proportion(),
        1e-6..0.5_f64,
        proportion(),
        side(),
        side(),
        side(),
        1..=2,
    )
        .prop_map(
            |(tilt, slenderness, length_ratio, aspect, a, b, height, walls)| {
                // The sides of a block over the root of its whole area, whatever they are to one another.
                let area: f64 = 2.0 * (a * b + a * height + b * height);
                Groups {
                    tilt,
                    slenderness,
                    length_ratio,
                    aspect,
                    block_length: a.max(b) / area.sqrt(),
                    block_width: a.min(b) / area.sqrt(),
                    block_height: height / area.sqrt(),
                    heated_walls: f64::from(walls),
                    ..Groups::default()
                }
            },
        )
}
