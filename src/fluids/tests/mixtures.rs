//! Mixtures by mass fraction.

use super::*;

fn mixed(id: &str, temperature: f64, composition: f64) -> Result<State, StateError> {
    let conditions = Conditions {
        pressure: ATMOSPHERE,
        composition,
    };
    fluid(id).state(temperature, &conditions)
}

const MIXTURES: [&str; 2] = ["ethylene-glycol-water", "propylene-glycol-water"];

/// CoolProp 8.0.0, the fits of Melinder 2010, between rows and between layers; expansion as the
/// slope of density over density.
#[test]
fn glycols_between_layers() {
    for (id, composition, temperature, expected) in [
        (
            "ethylene-glycol-water",
            0.35,
            279.3,
            [
                1_050.644_754_4,
                3_570.646_986_7,
                0.003_940_292_433_4,
                0.432_877_747_7,
                0.000_350_035_283,
            ],
        ),
        (
            "propylene-glycol-water",
            0.5,
            251.7,
            [
                1_061.009_330_3,
                3_370.044_651_9,
                0.096_078_537_113,
                0.339_780_898_33,
                0.000_371_459_599_6,
            ],
        ),
        (
            "ethylene-glycol-water",
            0.6,
            231.9,
            [
                1_102.334_535_9,
                2_675.333_204_9,
                0.173_456_186_33,
                0.328_745_777_88,
                0.000_183_887_183_5,
            ],
        ),
    ] {
        let found = mixed(id, temperature, composition).expect("inside");
        assert_within(2e-4, &found, expected);
    }
}

#[test]
fn a_mixture_freezes_by_its_concentration() {
    let glycol = fluid("ethylene-glycol-water");
    for (composition, freezing) in [(0.1, 269.792_81), (0.35, 254.308_63), (0.6, 221.949_08)] {
        let conditions = Conditions {
            pressure: ATMOSPHERE,
            composition,
        };
        let found = glycol.limits_at(&conditions).freezing.expect("a curve");
        assert!((found - freezing).abs() < 1e-4, "{found} for {freezing}");
        let refused = Err(StateError::Freezes { freezing: found });
        assert_eq!(glycol.state(found - 0.01, &conditions), refused);
        assert_eq!(glycol.state(100.0, &conditions), refused);
        assert!(glycol.state(found, &conditions).is_ok());
        assert_eq!(glycol.temperatures_at(&conditions), (found, 373.15));
        assert_eq!(
            glycol.state(373.2, &conditions),
            Err(StateError::AboveTable { maximum: 373.15 })
        );
    }
}

#[test]
fn a_mixture_needs_its_concentration() {
    for id in MIXTURES {
        let refused = Err(StateError::CompositionOutside {
            minimum: 0.1,
            maximum: 0.6,
        });
        for composition in [0.0, 0.09, 0.61, -0.3, 35.0] {
            assert_eq!(mixed(id, 300.0, composition), refused);
        }
        let conditions = Conditions::pure(ATMOSPHERE);
        assert_eq!(fluid(id).limits_at(&conditions).freezing, None);
        assert!(matches!(
            fluid(id).composition(),
            Composition::MassFraction { of, .. } if of.ends_with("glycol")
        ));
    }
    let refused = Err(StateError::CompositionOutside {
        minimum: 0.0,
        maximum: 0.0,
    });
    assert_eq!(mixed("water", 300.0, 0.3), refused);
    assert_eq!(mixed("nitrogen", 300.0, 0.01), refused);
}

/// Above freezing none of the mixtures contracts on heating, and all answer everywhere.
#[test]
fn mixtures_answer_everywhere_above_freezing() {
    for id in MIXTURES {
        for composition in (0..=100).map(|step| 0.1 + 0.005 * f64::from(step)) {
            let conditions = Conditions {
                pressure: ATMOSPHERE,
                composition,
            };
            assert_eq!(fluid(id).density_maximum(&conditions), None);
            let (coldest, hottest) = fluid(id).temperatures_at(&conditions);
            for step in 0..=100 {
                let temperature = coldest + (hottest - coldest) * f64::from(step) / 100.0;
                let found = mixed(id, temperature, composition).expect("inside");
                assert!(properties(&found).iter().all(|&value| value > 0.0));
            }
        }
    }
}

/// An invented brine, as wide as its two layers, whose expansion falls linearly with temperature
/// and concentration: at 5 % it is zero at 277 K.
#[test]
fn a_mixture_may_have_a_density_maximum() {
    let row = |fraction: f64, temperature: f64| {
        let expansion = 1e-5 * (temperature - 280.0) + 6e-4 * fraction;
        format!("{fraction},{temperature},1010,4000,0.0015,0.55,{expansion}\n")
    };
    let rows: String = [0.0, 0.1]
        .into_iter()
        .flat_map(|fraction| [270.0, 275.0, 285.0, 300.0].map(|at| row(fraction, at)))
        .collect();
    let brine = Fluid::read(&format!(
        "# id: brine\n# name: a brine\n# phase: liquid\n# source: invented\n\
         # composition: mass fraction of salt\n# freezing: 273 K, 271 K\n\
         # pressure rule: incompressible at 1e5 Pa, 5e4 to 2e5 Pa\n\
         mass_fraction [1],temperature [K],density [kg/m3],specific_heat [J/(kg K)],\
         viscosity [Pa s],conductivity [W/(m K)],expansion [1/K]\n{rows}"
    ))
    .expect("a table");
    let turn = |composition| {
        brine.density_maximum(&Conditions {
            pressure: 1e5,
            composition,
        })
    };
    assert!((turn(0.0).expect("a maximum") - 280.0).abs() < 1e-6);
    assert!((turn(0.05).expect("a maximum") - 277.0).abs() < 1e-6);
    assert!((turn(0.1).expect("a maximum") - 274.0).abs() < 1e-6);
    assert_eq!(turn(f64::NAN), None);
    let refused = StateError::Freezes { freezing: 273.0 };
    assert_eq!(brine.state(272.0, &Conditions::pure(1e5)), Err(refused));
}
