#!/usr/bin/env python3
"""Compare a running service's fluid states with independent references.

    python3 tests/reference/check_fluids.py http://127.0.0.1:8347

Every fluid is asked between the rows of its table, and where its pressure rule serves more than
one pressure, at those too; mixtures between their mass fractions, air at many humidities.
References: CoolProp for real fluids, mixtures and humid air, the iapws package for water and
steam besides, SciPy's PCHIP through the source rows for the oils. Prints the largest deviation
per fluid and property; exits 1 after listing every failure.
"""

import json
import re
import sys
import urllib.error
import urllib.parse
import urllib.request
from pathlib import Path

import iapws
import numpy as np
from CoolProp import CoolProp as library
from CoolProp.CoolProp import HAPropsSI, PropsSI
from scipy.interpolate import PchipInterpolator

from gas_entries import ATMOSPHERE, GASES
from glycol_entries import CODES, GLYCOLS, PRESSURE
from oil_tables import OILS

TABLES = Path(__file__).resolve().parents[2] / "src" / "fluids" / "tables"
PROPERTIES = ["density", "specific_heat", "viscosity", "conductivity", "expansion"]
GROUPS = {
    "kinematic_viscosity": lambda p: p["viscosity"] / p["density"],
    "diffusivity": lambda p: p["conductivity"] / (p["density"] * p["specific_heat"]),
    "prandtl": lambda p: p["viscosity"] * p["specific_heat"] / p["conductivity"],
}
GOLDEN = 0.6180339887498949

# Water's expansion passes through zero: a deviation of up to this many 1/K is within tolerance.
WATER_EXPANSION = 1e-6

# An expansion that CoolProp does not give is a difference over this many K to either side.
SLOPE_STEP = 0.05

# Humid air against HAPropsSI, as the notes of the table of air state. That
# library takes the vapour in the transport properties saturated at the total pressure, near
# 100 degC, whatever the air's temperature, hence the third and fourth figure.
HUMID_TOLERANCES = [1e-3, 8e-3, 2.4e-2, 4e-2, 6e-3]

# kg/mol, dry air and water as the equations of state have them.
MOLAR_MASSES = np.array([0.02896546, 0.018015268])

REFUSED = [
    ("air", 149, ATMOSPHERE),
    ("air", 2001, ATMOSPHERE),
    ("air", 300, 29e3),
    ("air", 300, 1.01e6),
    ("nitrogen", 300, 201e3),
    ("water", 400, ATMOSPHERE),
    ("water", 300, 3e6),
    ("steam", 350, ATMOSPHERE),
    ("steam", 390, 200e3),
    ("engine-oil", 272, ATMOSPHERE),
    ("ethylene-glycol", 361, ATMOSPHERE),
    ("ethylene-glycol-water", 300, ATMOSPHERE),
    ("ethylene-glycol-water", 260, ATMOSPHERE, {"concentration": 0.27}),
    ("propylene-glycol-water", 300, ATMOSPHERE, {"concentration": 0.62}),
    ("propylene-glycol-water", 374, ATMOSPHERE, {"concentration": 0.5}),
    ("air", 300, ATMOSPHERE, {"relative_humidity": 1.1}),
    ("air", 380, ATMOSPHERE, {"relative_humidity": 1.0}),
]


class Service:
    def __init__(self, url):
        self.url = url.rstrip("/")

    def get(self, path, **query):
        """Status and decoded body."""
        address = f"{self.url}{path}?{urllib.parse.urlencode(query)}" if query else self.url + path
        try:
            with urllib.request.urlopen(address, timeout=10) as answer:
                return answer.status, json.load(answer)
        except urllib.error.HTTPError as error:
            return error.code, None

    def ask(self, fluid, **numbers):
        """Status and body of a state."""
        numbers = {name: repr(float(number)) for name, number in numbers.items()}
        return self.get(f"/v1/fluids/{fluid}/state", **numbers)

    def state(self, fluid, temperature, pressure, **composition):
        """Properties, or none when the service refuses."""
        status, body = self.ask(fluid, temperature=temperature, pressure=pressure, **composition)
        return body["properties"] if status == 200 else None


class Report:
    """Largest deviations by fluid, reference and property, and all failures."""

    def __init__(self):
        self.largest = {}
        self.failures = []
        self.compared = 0

    def fail(self, text):
        self.failures.append(text)

    def compare(self, label, where, found, expected, tolerances, expansion=0.0):
        """Found against expected properties; a tolerance per property, as a fraction, and what
        is allowed of expansion in 1/K where that is more."""
        if found is None:
            return self.fail(f"{label} {where}: refused")
        for name, value, tolerance in zip(PROPERTIES, expected, tolerances):
            scale = max(abs(value), expansion / tolerance) if name == "expansion" else abs(value)
            self.one(label, where, name, found[name], value, tolerance, scale)
        for name, group in GROUPS.items():
            self.one(label, where, name, found[name], group(found), 1e-12, group(found))

    def one(self, label, where, name, found, expected, tolerance, scale):
        self.compared += 1
        deviation = abs(found - expected) / scale
        if not deviation <= tolerance:
            self.fail(f"{label} {where}: {name} {found:.8g}, reference {expected:.8g}, off by {deviation:.2e}")
        if name in PROPERTIES:
            key = (label, name)
            self.largest[key] = max(self.largest.get(key, 0.0), deviation)

    def print(self):
        print(f"{'largest deviation, as a fraction':<44}" + "".join(f"{name:>15}" for name in PROPERTIES))
        for label in dict.fromkeys(label for label, _ in self.largest):
            largest = [self.largest.get((label, name)) for name in PROPERTIES]
            figures = "".join(f"{'' if e is None else f'{e:.1e}':>15}" for e in largest)
            print(f"{label:<44}{figures}")
        print(f"{self.compared} figures compared, {len(self.failures)} failures")
        for failure in self.failures:
            print("FAIL", failure)


def coolprop(name, temperature, pressure):
    keys = ["Dmass", "Cpmass", "viscosity", "conductivity", "isobaric_expansion_coefficient"]
    return [PropsSI(key, "T", temperature, "P", pressure, name) for key in keys]


def iapws95(temperature, pressure):
    state = iapws.IAPWS95(T=temperature, P=pressure / 1e6)
    return [state.rho, state.cp * 1e3, state.mu, state.k, state.alfav]


def between(temperatures):
    """One point in each interval, at a place that varies from interval to interval."""
    shares = 0.05 + 0.9 * (np.arange(1, len(temperatures)) * GOLDEN % 1)
    return temperatures[:-1] + shares * np.diff(temperatures)


def stated(fluid, key):
    """The fractions that a table's header states under a key, by property."""
    header = (TABLES / f"{fluid}.csv").read_text()
    line = re.search(rf"^# {key}: (.*)$", header, re.MULTILINE).group(1)
    fractions = dict(part.split(" ") for part in line.split(", "))
    return np.array([float(fractions[name]) for name in PROPERTIES])


def check_gas(service, report, gas):
    points = between(gas.temperatures)
    for temperature in points:
        if gas.id == "air":
            tolerance = 1e-3 if 200 <= temperature <= 1300 else 2e-3
        else:
            tolerance = 5e-3
        found = service.state(gas.id, temperature, ATMOSPHERE)
        expected = coolprop(gas.library_name, temperature, ATMOSPHERE)
        report.compare(f"{gas.id}, 1 atm", f"{temperature:.2f} K", found, expected, [tolerance] * 5)
    if len(gas.layers) > 1:
        pressures = [gas.layers[0], 0.6e5, 0.9e5, 1.5e5, 3e5, 7.3e5, 9.2e5, gas.layers[-1]]
        tolerances = np.full(5, 2e-3)
    else:
        pressures = [gas.range[0], 0.8e5, 1.4e5, gas.range[1]]
        tolerances = stated(gas.id, "interpolation error") + stated(gas.id, "pressure error")
    for pressure in pressures:
        for temperature in points[::3]:
            if gas.saturates and temperature < PropsSI("T", "P", pressure, "Q", 1, "Water") + 0.01:
                continue
            found = service.state(gas.id, temperature, pressure)
            expected = coolprop(gas.library_name, temperature, pressure)
            where = f"{temperature:.2f} K, {pressure:.0f} Pa"
            report.compare(f"{gas.id}, other pressures", where, found, expected, tolerances)


def check_steam(service, report):
    for temperature in [373.2, 374.1, 379, 388, 404, 431, 477, 555, 666, 777, 888, 1111, 1234]:
        found = service.state("steam", temperature, ATMOSPHERE)
        expected = iapws95(temperature, ATMOSPHERE)
        report.compare("steam, 1 atm, iapws", f"{temperature} K", found, expected, [5e-3] * 5)


def check_water(service, report):
    for index, temperature in enumerate(between(np.arange(274.0, 373.1, 0.9))):
        found = service.state("water", temperature, ATMOSPHERE)
        references = {"water, 1 atm": coolprop("Water", temperature, ATMOSPHERE)}
        if index % 5 == 0:
            references["water, 1 atm, iapws"] = iapws95(temperature, ATMOSPHERE)
        tolerances = [2e-3 if 275 <= temperature <= 370 else 5e-3] * 5
        for label, expected in references.items():
            where = f"{temperature:.2f} K"
            report.compare(label, where, found, expected, tolerances, WATER_EXPANSION)
    for temperature in between(np.arange(374.0, 573.0, 4.7)):
        pressure = 1.0001 * PropsSI("P", "T", temperature, "Q", 0, "Water")
        found = service.state("water", temperature, pressure)
        expected = coolprop("Water", temperature, pressure)
        report.compare("water, saturated", f"{temperature:.2f} K", found, expected, [5e-3] * 5)
    allowed = stated("water", "interpolation error") + stated("water", "pressure error")
    for temperature in between(np.arange(294.0, 573.0, 7.3)):
        saturation = PropsSI("P", "T", temperature, "Q", 0, "Water")
        for pressure in [1.0001 * saturation, max(ATMOSPHERE, saturation) + 1.999e6]:
            found = service.state("water", temperature, pressure)
            expected = coolprop("Water", temperature, pressure)
            where = f"{temperature:.2f} K, {pressure:.0f} Pa"
            report.compare("water, other pressures", where, found, expected, allowed)


def check_oil(service, report, oil):
    """As SciPy interpolates the source's rows, viscosity by its logarithm.

    A missing expansion is taken from the densities by the same rule as the table's: the slope of
    a least-squares parabola through ln(density), here by a plain polynomial fit.
    """
    rows = np.array(oil.rows, float)
    temperatures = rows[:, 0]
    if np.isnan(rows[:, 5]).any():
        middle = temperatures.mean()
        quadratic, linear, _ = np.polyfit(temperatures - middle, np.log(rows[:, 1]), 2)
        rows[:, 5] = -(2 * quadratic * (temperatures - middle) + linear)
    rows[:, 3] = np.log(rows[:, 3])
    curves = PchipInterpolator(temperatures, rows[:, 1:])
    for temperature in np.concatenate([temperatures, between(temperatures)]):
        expected = curves(temperature)
        expected[2] = np.exp(expected[2])
        for pressure in (ATMOSPHERE, 30e3, 2e6):
            found = service.state(oil.id, temperature, pressure)
            where = f"{temperature:.2f} K, {pressure:.0f} Pa"
            report.compare(f"{oil.id}, source rows", where, found, expected, [2e-7] * 5)


def mixture(name, fraction, temperature):
    """CoolProp has no expansion of mixtures: the slope of its logarithm of density."""
    fluid = f"INCOMP::{name}[{float(fraction)!r}]"
    density, *others = [PropsSI(c, "T", temperature, "P", PRESSURE, fluid) for c in CODES]
    cold, hot = (
        PropsSI("D", "T", temperature + step, "P", PRESSURE, fluid)
        for step in (-SLOPE_STEP, SLOPE_STEP)
    )
    return [density, *others, np.log(cold / hot) / (2 * SLOPE_STEP)]


def check_glycol(service, report, glycol):
    allowed = stated(glycol.id, "interpolation error") + 1e-5
    for fraction in [0.1, 0.137, 0.2, 0.25, 0.3, 0.35, 0.4, 0.49, 0.57, 0.6]:
        name = f"INCOMP::{glycol.library_name}[{fraction}]"
        freezing = PropsSI("T_freeze", "T", 300, "P", PRESSURE, name)
        for temperature in between(np.linspace(freezing + 0.1, 373.0, 40)):
            expected = mixture(glycol.library_name, fraction, temperature)
            for pressure in (ATMOSPHERE, 30e3, 2e6):
                found = service.state(glycol.id, temperature, pressure, concentration=fraction)
                where = f"{fraction}, {temperature:.2f} K, {pressure:.0f} Pa"
                report.compare(glycol.id, where, found, expected, allowed, WATER_EXPANSION)
        status, _ = service.ask(glycol.id, temperature=freezing - 0.1, concentration=fraction)
        if status != 422:
            report.fail(f"{glycol.id} {fraction} below freezing answers {status}, not 422")


def humid_by_library(temperature, pressure, humidity):
    """HAPropsSI; its expansion as the slope of specific volume at constant humidity ratio."""

    def at(key, temperature, **given):
        (name, value), = given.items()
        return HAPropsSI(key, "T", temperature, "P", pressure, name, value)

    ratio = at("W", temperature, R=humidity)
    cold, middle, hot = (
        at("Vda", temperature + step, W=ratio) for step in (-SLOPE_STEP, 0, SLOPE_STEP)
    )
    others = [at(key, temperature, W=ratio) for key in ("cp_ha", "mu", "k")]
    return [(1 + ratio) / middle, *others, np.log(hot / cold) / (2 * SLOPE_STEP)]


class ThinVapour:
    """Dry air and water vapour so thin that it may be colder than its boiling point."""

    DENSITY = 1e-9  # kg/m3

    def __init__(self):
        self.air = library.AbstractState("HEOS", "Air")
        self.water = library.AbstractState("HEOS", "Water")
        self.water.specify_phase(library.iphase_gas)

    def transport(self, temperature, pressure, humidity):
        """Viscosity by Wilke's rule, conductivity by Wassiljewa's with the same factors."""
        vapour = humidity * PropsSI("P", "T", temperature, "Q", 0, "Water") / pressure
        shares = np.array([1 - vapour, vapour])
        self.air.update(library.PT_INPUTS, pressure, temperature)
        self.water.update(library.DmassT_INPUTS, self.DENSITY, temperature)
        viscosities = np.array([self.air.viscosity(), self.water.viscosity()])
        conductivities = np.array([self.air.conductivity(), self.water.conductivity()])
        masses = MOLAR_MASSES[:, None] / MOLAR_MASSES
        factors = (1 + (viscosities[:, None] / viscosities) ** 0.5 * masses**-0.25) ** 2
        weights = shares / (factors / np.sqrt(8 * (1 + masses)) @ shares)
        return weights @ viscosities, weights @ conductivities


def check_humid_air(service, report):
    vapour = ThinVapour()
    for temperature in 273.15 + np.array([0.3, 7, 15, 24, 33, 42, 51, 60, 69, 78, 84, 90]):
        for humidity in [0.1, 0.3, 0.5, 0.7, 0.9, 1.0]:
            for pressure in [0.8e5, ATMOSPHERE, 1.2e5]:
                found = service.state("air", temperature, pressure, relative_humidity=humidity)
                where = f"{temperature:.2f} K, {humidity}, {pressure:.0f} Pa"
                expected = humid_by_library(temperature, pressure, humidity)
                report.compare("air, humid", where, found, expected, HUMID_TOLERANCES)
                if found is None:
                    continue
                mixed = vapour.transport(temperature, pressure, humidity)
                for name, value in zip(("viscosity", "conductivity"), mixed):
                    label = "air, humid, same mixing rules"
                    report.one(label, where, name, found[name], value, 5e-5, value)


def main(arguments):
    if len(arguments) != 1:
        sys.exit(__doc__)
    service = Service(arguments[0])
    report = Report()
    status, catalogue = service.get("/v1/fluids")
    if status != 200:
        sys.exit(f"/v1/fluids answers {status}")
    served = {fluid["id"] for fluid in catalogue["fluids"]}
    known = {entry.id for entry in GASES + OILS + GLYCOLS} | {"water"}
    for fluid in sorted(served ^ known):
        report.fail(f"{fluid} is {'served but has no reference' if fluid in served else 'not served'}")
    for gas in GASES:
        check_gas(service, report, gas)
    check_steam(service, report)
    check_water(service, report)
    for oil in OILS:
        check_oil(service, report, oil)
    for glycol in GLYCOLS:
        check_glycol(service, report, glycol)
    check_humid_air(service, report)
    for fluid, temperature, pressure, *composition in REFUSED:
        given = composition[0] if composition else {}
        status, _ = service.ask(fluid, temperature=temperature, pressure=pressure, **given)
        if status != 422:
            report.fail(f"{fluid} at {temperature} K, {pressure:.0f} Pa, {given} answers {status}, not 422")
    report.print()
    sys.exit(bool(report.failures))


if __name__ == "__main__":
    main(sys.argv[1:])
