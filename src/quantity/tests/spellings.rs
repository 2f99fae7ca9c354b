//! The ways to write a unit.

use super::super::{Kind, Unit};
use super::units;

#[test]
fn every_symbol_finds_its_unit_among_all_ways_to_write_it() {
    let mut lost = Vec::new();
    for unit in units() {
        let symbol = unit.symbol();
        let written = [
            symbol.to_owned(),
            format!(" {symbol} "),
            symbol.replace(' ', "·"),
            symbol.replace(' ', "*"),
            symbol.replace(' ', "."),
            symbol
                .replace("m2", "m²")
                .replace("ft2", "ft²")
                .replace("m3", "m³"),
            symbol
                .replace("m2", "m^2")
                .replace("ft2", "ft^2")
                .replace("m3", "m^3"),
            symbol.replace('/', " per "),
            symbol.replace(['(', ')'], ""),
            symbol
                .replace("degC", "°C")
                .replace("degF", "°F")
                .replace("degR", "°R"),
            symbol.replace("degC", "deg. C").replace("degF", "deg F"),
            symbol
                .replace("Btu", "BTU")
                .replace("/h", "/hr")
                .replace("(h", "(hr"),
        ];
        for text in written {
            if Unit::find(unit.kind(), &text) != Ok(unit) {
                lost.push((unit, text));
            }
        }
    }
    assert!(lost.is_empty(), "{lost:?}");
}

#[test]
fn what_is_no_unit_of_any_kind_is_refused() {
    let texts = [
        "furlong",
        "W/(m2 K",
        "W/m2)",
        "m/",
        "m//s",
        "/",
        "1/2",
        "1 m",
        "m^",
        "m-",
        "m22",
        "m0",
        "mw",
        "MPA",
        "inC",
        "m-/s",
        "degC m/m",
        "m degC/m",
        "barg °C/°C",
        "()",
        "per",
        "sq",
        "m per",
        "W/m/(/K)",
        "m^-",
        "",
        "1 1",
        "x\0",
    ];
    let mut read = Vec::new();
    for text in texts {
        let found = Kind::ALL
            .into_iter()
            .filter_map(|kind| Unit::find(kind, text).ok());
        read.extend(found.map(|unit| (text, unit)));
    }
    assert!(read.is_empty(), "{read:?}");
}

#[test]
fn engineers_spellings_find_their_units() {
    let mut lost = Vec::new();
    for (kind, symbol, spellings) in [
        (
            Kind::Temperature,
            "degC",
            "C|celsius|deg C|° C|degrees Celsius|DegC|℃",
        ),
        (Kind::Temperature, "degF", "F|deg F|Fahrenheit|degree F"),
        (Kind::Temperature, "K", "kelvin|°K"),
        (Kind::Temperature, "degR", "R|°R|rankine"),
        (Kind::TemperatureDifference, "degC", "°C|C|celsius"),
        (Kind::TemperatureDifference, "degF", "°F|F"),
        (Kind::Length, "in", "inch|inches|\"|in.|IN|″"),
        (Kind::Length, "ft", "foot|feet|'|FT"),
        (Kind::Length, "µm", "um|\u{b5}m|\u{3bc}m|micron"),
        (Kind::Length, "mm", "MM|millimetres"),
        (Kind::Area, "ft2", "sq ft|sqft|sq. ft.|square feet|ft²|ft^2"),
        (Kind::Area, "in2", "sq in|square inches"),
        (Kind::Volume, "L", "l|litre|liters"),
        (Kind::Volume, "mL", "ml|cm3"),
        (Kind::Volume, "ft3", "cu ft|cubic feet"),
        (Kind::Speed, "m/s", "m s-1|m·s⁻¹|m s^-1|metres per second"),
        (Kind::Speed, "ft/min", "fpm|FPM|ft per min"),
        (Kind::Speed, "km/h", "kph|km/hr"),
        (
            Kind::Pressure,
            "barg",
            "bar(g)|bar g|bar (g)|BARG|bar gauge",
        ),
        (Kind::Pressure, "bara", "bar(a)|bar abs"),
        (Kind::Pressure, "psig", "psi(g)|PSIG|psi g"),
        (Kind::Pressure, "psia", "psi(a)"),
        (Kind::Pressure, "psi", "PSI|lbf/in2"),
        (Kind::Pressure, "kPa", "KPA|kPa abs"),
        (Kind::Pressure, "Pa", "N/m2|N/m²|pascal"),
        (Kind::Pressure, "inH2O", "in H2O|in. w.c.|INH2O"),
        (Kind::Pressure, "mmHg", "mm Hg|MMHG"),
        (
            Kind::HeatFlow,
            "Btu/h",
            "BTU/hr|Btu/hr|BTUH|btu/h|Btu per hour",
        ),
        (Kind::HeatFlow, "kBtu/h", "MBH|kBTU/hr"),
        (Kind::HeatFlow, "W", "J/s|watts"),
        (Kind::HeatFlow, "kW", "KW"),
        (
            Kind::HeatFlow,
            "TR",
            "ton of refrigeration|Tons of Refrigeration",
        ),
        (
            Kind::HeatFlux,
            "W/m2",
            "W/m²|W/m^2|W m-2|W·m^-2|W per square metre",
        ),
        (
            Kind::HeatFlux,
            "Btu/(h ft2)",
            "Btu/h·ft²|Btu/hr/sqft|BTU/(hr.ft2)|Btu/hft2",
        ),
        (
            Kind::HeatFlowPerLength,
            "Btu/(h ft)",
            "Btu/h·ft|Btu/h/ft|BTU/hr-ft",
        ),
        (
            Kind::Coefficient,
            "W/(m2 K)",
            "W/m2K|W/m²K|W/m2/K|W/(m² °C)|W/m2.K|W m-2 K-1|W/m²·C",
        ),
        (
            Kind::Coefficient,
            "Btu/(h ft2 degF)",
            "Btu/h·ft²·°F|BTU/hr/ft2/F|BTU/(hr sq ft °F)|Btu/hft2F",
        ),
        (Kind::Coefficient, "kcal/(h m2 K)", "kcal/m2h°C|kcal/h m2 C"),
        (
            Kind::Conductivity,
            "W/(m K)",
            "W/mK|W/m·K|W/m/K|W/m°C|W/(m·°C)|W m-1 K-1",
        ),
        (Kind::Conductivity, "mW/(m K)", "mW/mK"),
        (
            Kind::Conductivity,
            "Btu in/(h ft2 degF)",
            "Btu·in/h·ft²·°F|BTU-in/hr-ft²-°F",
        ),
        (Kind::Density, "kg/m3", "kg/m³|kg m^-3|g/L"),
        (Kind::Density, "g/cm3", "g/ml|g/mL|t/m3|g/cm³"),
        (
            Kind::SpecificHeat,
            "kJ/(kg K)",
            "kJ/kgK|kJ/kg·K|kJ/kg°C|J/(g K)",
        ),
        (
            Kind::SpecificHeat,
            "Btu/(lb degF)",
            "BTU/lb°F|Btu/lbF|Btu/(lbm °F)",
        ),
        (Kind::SpecificHeat, "kcal/(kg K)", "kcal/kg°C"),
        (Kind::Viscosity, "Pa s", "Pa·s|Pas|kg/(m s)|N s/m2"),
        (Kind::Viscosity, "mPa s", "mPa·s|mPas"),
        (Kind::Viscosity, "cP", "centipoise"),
        (Kind::KinematicViscosity, "cSt", "CST|centistokes"),
        (Kind::Expansion, "1/K", "K^-1|K-1|/K|1/°C|per K|K⁻¹"),
        (Kind::Expansion, "1/degF", "1/°F|1/F"),
        (Kind::Angle, "deg", "°|degrees"),
        (Kind::Time, "h", "hr|hours"),
        (Kind::Number, "%", "percent"),
        (Kind::Number, "1", "kg/kg|m/m"),
    ] {
        for spelling in spellings.split('|') {
            let found = Unit::find(kind, spelling).map(Unit::symbol);
            if found != Ok(symbol) {
                lost.push((spelling, symbol, found));
            }
        }
    }
    assert!(lost.is_empty(), "{lost:#?}");
}
