//! Rules that hold for every entry of the registry.

use std::collections::HashSet;

use proptest::prelude::*;

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
            Quantity::RayleighAlong => method.example.groups.at_rayleigh(1.0).rayleigh_along(),
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
        require(method.formula.contains("Nu"), || {
            "formula without Nu".to_owned()
        })?;
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
                range.minimum < range.maximum && range.minimum >= 0.0,
                || format!("{range:?}"),
            )?;
        }
        let bounds_rayleigh = method
            .ranges
            .iter()
            .any(|range| matches!(range.quantity, Quantity::Rayleigh | Quantity::RayleighAlong));
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
        for &edge in method.edges {
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
            let crosses = method
                .edges
                .iter()
                .any(|&edge| rayleigh <= edge && edge < next);
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
        for heating in [Heating::Isothermal, Heating::UniformFlux] {
            let sides: &[Side] = match geometry {
                Geometry::InclinedPlate | Geometry::HorizontalPlate => {
                    &[Side::Unstable, Side::Stable]
                }
                _ => &[Side::Any],
            };
            for &side in sides {
                assert!(
                    !MethodId::serving(geometry, heating, side).is_empty(),
                    "{geometry:?} {heating:?} {side:?}"
                );
            }
        }
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
        exponent in -20.0..30.0, prandtl_exponent in -3.0..6.0, tilt in 0.0..=90.0,
        slenderness in 1e-6..1e6, length_ratio in 1e-6..0.5,
    ) {
        let groups = Groups {
            rayleigh: 10_f64.powf(exponent),
            prandtl: 10_f64.powf(prandtl_exponent),
            tilt, slenderness, length_ratio,
        };
        for id in MethodId::ALL {
            let nusselt = (id.method().nusselt)(&groups);
            prop_assert!(nusselt.is_finite() && nusselt > 0.0, "{}: {nusselt}", id.as_str());
        }
    }

    #[test]
    fn nusselt_rises_with_rayleigh_inside_a_method(
        share in 0.0..1.0, step in 1e-4..0.1, prandtl in 0.6..100.0, tilt in 0.0..=90.0,
        slenderness in 0.01..100.0, length_ratio in 0.01..0.5,
    ) {
        for id in MethodId::ALL {
            let method = id.method();
            let (low, high) = rayleigh_band(method);
            let rayleigh = low.max(1e-10) * (high / low.max(1e-10)).powf(share);
            let groups = Groups { rayleigh, prandtl, tilt, slenderness, length_ratio };
            let next = groups.at_rayleigh(rayleigh * (1.0 + step));
            let crosses = method.edges.iter().any(|&edge| rayleigh <= edge && edge < next.rayleigh);
            if method.holds(&groups) && method.holds(&next) && !crosses {
                prop_assert!(
                    (method.nusselt)(&next) > (method.nusselt)(&groups),
                    "{} at {groups:?}", id.as_str()
                );
            }
        }
    }
}
