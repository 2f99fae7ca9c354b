#!/usr/bin/env python3
"""Write the built-in fluid tables, or compare them with what would be written.

    python3 tests/reference/make_tables.py            writes src/fluids/tables/*.csv
    python3 tests/reference/make_tables.py --check    exits 1 when a file has drifted

Real fluids come from reference equations, see gas_entries.py, evaluated by CoolProp 8.0.0.
The oils and the pure glycol are handbook tables, see oil_tables.py. Mixtures of water and a
glycol come from fits by temperature and mass fraction, see glycol_entries.py.

Each header states two figures per property, measured here and rounded up:
interpolation error   between rows, against the reference equation, at nine points of every
                      interval, in the variables that the service interpolates; of a mixture
                      also between its mass fractions;
pressure error        of the pressure rule over its whole range, at the rows' temperatures and
                      just above saturation.
"""

import re
import sys
from dataclasses import dataclass
from pathlib import Path

import CoolProp
import numpy as np
from CoolProp import CoolProp as library
from scipy.interpolate import PchipInterpolator

from gas_entries import ATMOSPHERE, GASES, WATER_SOURCE
from glycol_entries import GLYCOLS, MELINDER, Fit
from oil_tables import OILS

TABLES = Path(__file__).resolve().parents[2] / "src" / "fluids" / "tables"
LIBRARY = f"evaluated by CoolProp {CoolProp.__version__}"

PROPERTIES = ["density", "specific_heat", "viscosity", "conductivity", "expansion"]
UNITS = ["kg/m3", "J/(kg K)", "Pa s", "W/(m K)", "1/K"]
DENSITY, VISCOSITY, EXPANSION = 0, 2, 4

# Below this expansion (1/K) a liquid's deviation is stated in 1/K: its expansion changes sign.
SMALL_EXPANSION = 2e-4


@dataclass
class Table:
    """One file: header lines, then rows by layer of pressure or mass fraction."""

    header: list[str]
    temperatures: np.ndarray
    layers: dict[float, np.ndarray]
    saturation: np.ndarray | None = None
    layer_column: str = "pressure [Pa]"

    def text(self):
        layered = len(self.layers) > 1
        columns = [self.layer_column] * layered + ["temperature [K]"]
        columns += [f"{name} [{unit}]" for name, unit in zip(PROPERTIES, UNITS)]
        columns += ["saturation_pressure [Pa]"] * (self.saturation is not None)
        lines = [f"# {line}" for line in self.header] + [",".join(columns)]
        for layer, rows in self.layers.items():
            for index, (temperature, row) in enumerate(zip(self.temperatures, rows)):
                cells = (
                    [digits(layer)] * layered + [digits(temperature)] + [digits(v) for v in row]
                )
                if self.saturation is not None:
                    at = self.saturation[index]
                    cells.append("" if np.isnan(at) else digits(at))
                lines.append(",".join(cells))
        return "\n".join(lines) + "\n"


def digits(value):
    """Eight significant digits."""
    return f"{value:.8g}"


def rounded(values):
    """What a reader of the file gets back."""
    return np.array([float(digits(v)) for v in np.ravel(values)]).reshape(np.shape(values))


def rounded_up(value):
    """Two significant digits, never below the value nor below the eight digits of a cell."""
    value = max(value, 5e-8)
    scale = 10.0 ** (np.floor(np.log10(value)) - 1)
    return f"{np.ceil(value / scale) * scale:.1e}"


def stated(errors):
    return ", ".join(f"{name} {rounded_up(error)}" for name, error in zip(PROPERTIES, errors))


class Reference:
    """A fluid's reference equations in one phase."""

    def __init__(self, name, phase):
        self.state = library.AbstractState("HEOS", name)
        self.saturated = library.AbstractState("HEOS", name)
        self.state.specify_phase(phase)

    def row(self, temperature, pressure):
        s = self.state
        s.update(library.PT_INPUTS, pressure, temperature)
        return [
            s.rhomass(),
            s.cpmass(),
            s.viscosity(),
            s.conductivity(),
            s.isobaric_expansion_coefficient(),
        ]

    def rows(self, temperatures, pressures):
        pressures = np.broadcast_to(pressures, np.shape(temperatures))
        return np.array([self.row(t, p) for t, p in zip(temperatures, pressures)])

    def saturation_pressure(self, temperature):
        if temperature >= self.saturated.T_critical():
            return np.nan
        self.saturated.update(library.QT_INPUTS, 1.0, temperature)
        return self.saturated.p()

    def saturation_temperature(self, pressure):
        if pressure >= self.saturated.p_critical():
            return 0.0
        self.saturated.update(library.PQ_INPUTS, pressure, 1.0)
        return self.saturated.T()


def gas_interpolant(temperatures, rows, pressure):
    """density T/p and expansion T are interpolated, so that the ideal gas is exact."""
    scale = np.ones_like(rows)
    scale[:, DENSITY] = temperatures / pressure
    scale[:, EXPANSION] = temperatures
    curves = PchipInterpolator(temperatures, rows * scale)

    def at(points, pressures):
        values = curves(points)
        values[:, DENSITY] *= pressures / points
        values[:, EXPANSION] /= points
        return values

    return at


def lanes(rows):
    """What is interpolated of a liquid: the logarithm of viscosity, the rest as it stands."""
    lanes = rows.copy()
    lanes[:, VISCOSITY] = np.log(lanes[:, VISCOSITY])
    return lanes


def liquid_interpolant(temperatures, rows):
    curves = PchipInterpolator(temperatures, lanes(rows))

    def at(points):
        values = curves(points)
        values[:, VISCOSITY] = np.exp(values[:, VISCOSITY])
        return values

    return at


def lagrange_weight(layer, layers, at):
    """The share of a layer in a Lagrange polynomial through all of them."""
    return np.prod([(at - other) / (layer - other) for other in layers if other != layer])


def between(temperatures):
    """Nine points inside every interval."""
    steps = np.arange(0.1, 0.95, 0.1)
    return (temperatures[:-1, None] + np.diff(temperatures)[:, None] * steps).ravel()


def deviations(found, expected):
    """Largest relative deviation of every property."""
    return np.abs(found / expected - 1).max(axis=0)


def liquid_deviations(found, expected):
    """Largest relative deviation of every property, and of small expansions in 1/K."""
    small = np.abs(expected[:, EXPANSION]) < SMALL_EXPANSION
    errors = deviations(found, expected)
    errors[EXPANSION] = deviations(found[~small], expected[~small])[EXPANSION]
    return errors, np.abs(found - expected)[small, EXPANSION].max()


def saturation_error(reference, temperatures, saturation):
    """T ln(p) is interpolated by T, in which vapour pressure is nearly straight."""
    known = ~np.isnan(saturation)
    nodes = temperatures[known]
    points = between(nodes)
    found = np.exp(PchipInterpolator(nodes, nodes * np.log(saturation[known]))(points) / points)
    expected = np.array([reference.saturation_pressure(t) for t in points])
    return np.abs(found / expected - 1).max()


def gas(entry):
    """Real gas properties at every layer."""
    reference = Reference(entry.library_name, library.iphase_gas)
    temperatures = entry.temperatures
    layers = {p: rounded(reference.rows(temperatures, p)) for p in entry.layers}
    saturation = None
    notes = list(entry.notes)
    if entry.saturates:
        saturation = rounded([reference.saturation_pressure(t) for t in temperatures])
        error = saturation_error(reference, temperatures, saturation)
        notes.append(f"saturation pressure between rows within {rounded_up(error)} of the reference equation")
    if len(layers) > 1:
        rule = "layers"
        pressures = np.geomspace(entry.layers[0], entry.layers[-1], 25)
    else:
        rule = f"ideal-gas at {digits(ATMOSPHERE)} Pa, {digits(entry.range[0])} to {digits(entry.range[1])} Pa"
        pressures = entry.range
    header = [
        f"id: {entry.id}",
        f"name: {entry.name}",
        *entry.composition,
        "phase: gas",
        f"source: {entry.source}; {LIBRARY}",
        f"pressure rule: {rule}",
        f"interpolation error: {stated(gas_interpolation_error(reference, temperatures, layers))}",
        f"pressure error: {stated(gas_pressure_error(reference, temperatures, layers, pressures))}",
    ]
    return Table(header + [f"note: {note}" for note in notes], temperatures, layers, saturation)


def gas_interpolation_error(reference, temperatures, layers):
    points = between(temperatures)
    errors = []
    for pressure, rows in layers.items():
        found = gas_interpolant(temperatures, rows, pressure)(points, pressure)
        errors.append(deviations(found, reference.rows(points, pressure)))
    return np.max(errors, axis=0)


def gas_pressure_error(reference, temperatures, layers, pressures):
    """At the rows' temperatures and where saturation lies above the first of them, just above it."""
    curves = {p: gas_interpolant(temperatures, rows, p) for p, rows in layers.items()}
    errors = []
    for pressure in pressures:
        lowest = max(temperatures[0], reference.saturation_temperature(pressure) + 0.001)
        points = np.append(lowest, temperatures[temperatures > lowest])
        found = np.zeros((len(points), len(PROPERTIES)))
        for layer, curve in curves.items():
            found += lagrange_weight(layer, layers, pressure) * curve(points, pressure)
        errors.append(deviations(found, reference.rows(points, pressure)))
    return np.max(errors, axis=0)


def water():
    """Liquid water along the larger of 1 atm and its saturation pressure."""
    headroom = 2e6
    temperatures = np.arange(273.15, 573.2, 2.5)
    reference = Reference("Water", library.iphase_liquid)

    def pressures_at(points):
        return np.array([max(ATMOSPHERE, reference.saturation_pressure(t)) for t in points])

    saturation = rounded([reference.saturation_pressure(t) for t in temperatures])
    rows = rounded(reference.rows(temperatures, pressures_at(temperatures)))

    points = between(temperatures)
    found = liquid_interpolant(temperatures, rows)(points)
    interpolation, floor = liquid_deviations(found, reference.rows(points, pressures_at(points)))

    def pressure_error(limit):
        chosen = temperatures <= limit
        lowest = reference.rows(temperatures[chosen], saturation[chosen])
        highest = reference.rows(
            temperatures[chosen], pressures_at(temperatures[chosen]) + headroom
        )
        errors = [deviations(rows[chosen], other) for other in (lowest, highest)]
        for error, other in zip(errors, (lowest, highest)):
            large = np.abs(other[:, EXPANSION]) >= SMALL_EXPANSION
            error[EXPANSION] = deviations(rows[chosen][large], other[large])[EXPANSION]
        return np.max(errors, axis=0)

    near_freezing = np.abs(rows[:, EXPANSION]) < SMALL_EXPANSION
    shift = np.abs(
        rows[near_freezing, EXPANSION]
        - reference.rows(temperatures[near_freezing], ATMOSPHERE + headroom)[:, EXPANSION]
    ).max()
    vapour = saturation_error(reference, temperatures, saturation)
    header = [
        "id: water",
        "name: liquid water",
        "phase: liquid",
        f"source: {WATER_SOURCE}; {LIBRARY}",
        f"pressure rule: along-saturation at {digits(ATMOSPHERE)} Pa, {digits(headroom)} Pa above",
        "freezing: 273.15 K",
        f"interpolation error: {stated(interpolation)}",
        f"expansion error floor: {rounded_up(floor)} 1/K",
        f"pressure error: {stated(pressure_error(temperatures[-1]))}",
        f"note: pressure error up to 370 K: {stated(pressure_error(370))}",
        f"note: where expansion is below {SMALL_EXPANSION:g} 1/K its interpolation error is the floor, "
        f"and the pressure rule adds up to {rounded_up(shift)} 1/K",
        f"note: saturation pressure between rows within {rounded_up(vapour)} of the reference equation",
        "note: the first row lies 0.01 K below the triple point (0.003 K below freezing at 1 atm): "
        "the equations continued",
    ]
    return Table(header, temperatures, {ATMOSPHERE: rows}, saturation)


def glycol(entry):
    """A mixture's fits at every mass fraction."""
    fit = Fit(entry.library_name)
    temperatures = entry.temperatures
    layers = {x: rounded(fit.rows(temperatures, x)) for x in entry.fractions}
    freezing = {x: float(digits(fit.freezing(x))) for x in layers}
    curves = {x: PchipInterpolator(temperatures, lanes(rows)) for x, rows in layers.items()}
    found, expected, curve_misses = [], [], []
    for fraction in np.linspace(entry.fractions[0], entry.fractions[-1], 51):
        weights = {x: lagrange_weight(x, layers, fraction) for x in layers}
        lowest = fit.freezing(fraction)
        curve_misses.append(abs(sum(weights[x] * freezing[x] for x in layers) - lowest))
        points = np.concatenate([temperatures, between(temperatures)])
        points = points[points >= lowest]
        values = sum(weights[x] * curve(points) for x, curve in curves.items())
        values[:, VISCOSITY] = np.exp(values[:, VISCOSITY])
        found.append(values)
        expected.append(fit.rows(points, fraction))
    found, expected = np.concatenate(found), np.concatenate(expected)
    interpolation, floor = liquid_deviations(found, expected)
    notes = [
        "properties are polynomials in mass fraction of degree 5, which the layers hold exactly",
        f"freezing curve between layers within {rounded_up(max(curve_misses))} K of the fit",
        "rows below the freezing curve continue the fit so that layers share their temperatures; "
        "no state is given there",
        f"where expansion is below {SMALL_EXPANSION:g} 1/K its interpolation error is the floor",
        "fits to the ASHRAE Handbook's tables, as the same library holds them, differ by up to "
        + stated(fit.ashrae_spread(entry.ashrae_name, entry.fractions)),
        *entry.notes,
    ]
    header = [
        f"id: {entry.id}",
        f"name: {entry.name}",
        f"composition: mass fraction of {entry.solute}",
        "phase: liquid",
        f"source: {MELINDER}; {LIBRARY}",
        f"pressure rule: incompressible at {digits(ATMOSPHERE)} Pa, 30000 to 2000000 Pa",
        f"freezing: {', '.join(f'{digits(t)} K' for t in freezing.values())}",
        f"interpolation error: {stated(interpolation)}",
        f"expansion error floor: {rounded_up(floor)} 1/K",
    ]
    header += [f"note: {note}" for note in notes]
    return Table(header, temperatures, layers, layer_column="mass_fraction [1]")


def oil(entry):
    """A handbook table as it stands; no reference equation to measure against."""
    temperatures = np.array([row[0] for row in entry.rows])
    rows = np.array([row[1:] for row in entry.rows], float)
    notes = list(entry.notes)
    if np.isnan(rows[:, EXPANSION]).any():
        middle = temperatures.mean()
        logarithm = np.log(rows[:, DENSITY])
        fit = np.polynomial.Polynomial.fit(temperatures - middle, logarithm, 2)
        rows[:, EXPANSION] = -fit.deriv()(temperatures - middle)
        scatter = np.abs(fit(temperatures - middle) - logarithm).max()
        notes.append(
            "expansion is the slope of a least-squares parabola through ln(density), "
            f"which meets the densities within {rounded_up(scatter)}"
        )
    rows = rounded(rows)
    left_out = []
    for index in range(1, len(rows) - 1):
        kept = np.arange(len(rows)) != index
        found = liquid_interpolant(temperatures[kept], rows[kept])(temperatures[index : index + 1])
        left_out.append(deviations(found, rows[index : index + 1]))
    notes.append(
        "interpolation error: largest miss of an inner row left out, so at twice the spacing; "
        "there is no equation to measure against"
    )
    header = [
        f"id: {entry.id}",
        f"name: {entry.name}",
        "phase: liquid",
        f"source: {entry.source}",
        f"pressure rule: incompressible at {digits(ATMOSPHERE)} Pa, 30000 to 2000000 Pa",
        *entry.limits,
        f"interpolation error: {stated(np.max(left_out, axis=0))}",
    ]
    return Table(header + [f"note: {note}" for note in notes], temperatures, {ATMOSPHERE: rows})


def drifted(expected, found):
    """Whether the texts differ by more than the last of eight digits."""
    number = re.compile(r"-?\d+(?:\.\d+)?(?:e[+-]?\d+)?")
    if number.split(expected) != number.split(found):
        return True
    pairs = zip(number.findall(expected), number.findall(found))
    return any(a != b and abs(float(a) - float(b)) > 1.5e-7 * abs(float(a)) for a, b in pairs)


def main(arguments):
    check = arguments == ["--check"]
    if arguments and not check:
        sys.exit(__doc__)
    library.set_config_bool(library.DONT_CHECK_PROPERTY_LIMITS, True)
    tables = {entry.id: gas(entry) for entry in GASES}
    tables["water"] = water()
    tables |= {entry.id: oil(entry) for entry in OILS}
    tables |= {entry.id: glycol(entry) for entry in GLYCOLS}
    faults = []
    for name, table in tables.items():
        path = TABLES / f"{name}.csv"
        if not check:
            path.write_text(table.text())
        elif not path.exists() or drifted(table.text(), path.read_text()):
            faults.append(f"{path.name} is not what make_tables.py writes")
    faults += [f"{p.name} has no generator" for p in TABLES.glob("*.csv") if p.stem not in tables]
    print("\n".join(faults) or f"{len(tables)} tables {'agree' if check else 'written'}")
    sys.exit(bool(faults))


if __name__ == "__main__":
    main(sys.argv[1:])
