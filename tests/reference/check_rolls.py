"""Compares the Nu stated for rolls and crescents with solved flow; exit 1 on any difference.

python3 tests/reference/check_rolls.py

The stated figures are read from `fixtures/checks`. Every solution is first compared with itself
on fewer points, and rolls at the onset with the expansion about it. Prints are from memory.
"""

import json
import math
import sys
from pathlib import Path

import closed_formulas
import onset
import rolls
from checks import Checks

FIXTURES = Path(__file__).resolve().parents[2] / "fixtures" / "checks"

# Wavenumber of the onset, and the air of Clever & Busse.
WAVENUMBER, LAYER_AIR = 3.117, 0.71
# Clever & Busse 1974, J. Fluid Mech. 65, 625-645: Ra, Nu, and the relative error of the print
# itself, from the solution here.
CLEVER_BUSSE = (
    (2.5e3, 1.475, 2.2e-3),
    (5e3, 2.116, 2.7e-3),
    (1e4, 2.661, 3.2e-3),
    (3e4, 3.662, 1.16e-2),
)

# Ratio of diameters and air of Kuehn & Goldstein.
DIAMETER_RATIO, ANNULUS_AIR = 2.6, 0.7
# Kuehn & Goldstein 1976, J. Fluid Mech. 74, 695-719: Ra on the gap, k_eff/k at the inner
# cylinder by finite differences, and the relative error of the print itself, from the solution
# here.
KUEHN_GOLDSTEIN = (
    (1e3, 1.081, -1.1e-3),
    (3e3, 1.404, 5.3e-3),
    (6e3, 1.736, 1.25e-2),
    (1e4, 2.010, 1.6e-2),
    (5e4, 3.024, 2.24e-2),
)
# Shu 1999, Int. J. Numer. Methods Fluids 30, 977-993: the same by differential quadrature.
SHU = ((1e3, 1.082), (3e3, 1.397), (6e3, 1.715), (1e4, 1.979), (5e4, 2.958))

# Half a unit of the last digit of prints and of stated figures.
PRINTED, STATED = 5e-4, 5e-5


def stated(name, start):
    """Ra, Pr and Nu of the entries of a fixture whose id starts with `start`, each once."""
    entries = json.loads((FIXTURES / name).read_text(encoding="utf-8"))["checks"]
    return sorted(
        {
            (entry["formula"]["rayleigh"], entry["formula"]["prandtl"], figure["value"])
            for entry in entries
            if entry["id"].startswith(start)
            for figure in entry["expect"]
        }
    )


def solved(checks, name, strip, coarser, prandtl, rayleighs):
    """Nu at each Ra and Pr on the points of `strip`."""
    flows = strip.ladder(prandtl, rayleighs)
    fewer = coarser.ladder(prandtl, rayleighs)
    for rayleigh, flow, coarse in zip(rayleighs, flows, fewer, strict=True):
        where = f"{name} at Ra {rayleigh:g}"
        checks.within(f"{where} on fewer points", coarse.nusselt / flow.nusselt - 1.0, 5e-5)
        middle = flow.nusselt_middle / flow.nusselt - 1.0
        checks.within(f"{where}, wall against middle", middle, 1e-5)
    groups = ((rayleigh, prandtl) for rayleigh in rayleighs)
    return dict(zip(groups, (flow.nusselt for flow in flows), strict=True))


def check_onset(checks):
    # Schlueter, Lortz & Busse 1965, J. Fluid Mech. 23, 129-144: (Nu - 1) Ra/(Ra - Ra_c) there.
    # At every Pr it is 1e-4 to 2e-4 below the solution: the 0.69942 would be 0.6993.
    critical = onset.marginal_rayleigh(WAVENUMBER, 24)
    layer = rolls.Layer(WAVENUMBER, 8, 14)
    # Down from where the guess is good; the rest to the onset is a straight line.
    factors = 1.5, 1.3, 1.2, 1.1, 1.05, 1.02, 1.01, 1.005, 1.0025
    rayleighs = [factor * critical for factor in factors]
    for prandtl in (0.1, LAYER_AIR, 7.0, 1e3):
        *_, far, near = (
            (flow.nusselt - 1.0) / (1.0 - critical / rayleigh)
            for rayleigh, flow in zip(rayleighs, layer.ladder(prandtl, rayleighs), strict=True)
        )
        slope = 2.0 * near - far
        expanded = 1.0 / (0.69942 - 0.00472 / prandtl + 0.00832 / prandtl**2)
        what = f"rolls at the onset, Pr {prandtl:g}, slope {slope:.4f}"
        checks.within(what, slope / expanded - 1.0, 3e-4)


def check_rolls(checks):
    rayleighs = [rayleigh for rayleigh, _, _ in CLEVER_BUSSE]
    strips = rolls.Layer(WAVENUMBER, 24, 28), rolls.Layer(WAVENUMBER, 20, 24)
    nusselts = solved(checks, "rolls", *strips, LAYER_AIR, rayleighs)
    for rayleigh, printed, own_error in CLEVER_BUSSE:
        found = nusselts[rayleigh, LAYER_AIR]
        left = printed / (1.0 + own_error) - found
        checks.within(f"Clever & Busse at Ra {rayleigh:g}, {found:.5f}", left, PRINTED)
    figures = stated("layers.json", "rolls-")
    checks.within("rolls stated, beside those solved", len(figures) - len(rayleighs), 0)
    for rayleigh, prandtl, figure in figures:
        left = figure - nusselts.get((rayleigh, prandtl), math.nan)
        checks.within(f"rolls stated at Ra {rayleigh:g}, {figure}", left, STATED)


def check_crescents(checks):
    rayleighs = [rayleigh for rayleigh, _, _ in KUEHN_GOLDSTEIN]
    strips = rolls.Annulus(DIAMETER_RATIO, 36, 32), rolls.Annulus(DIAMETER_RATIO, 32, 28)
    nusselts = solved(checks, "crescents", *strips, ANNULUS_AIR, rayleighs)
    for rayleigh, printed, own_error in KUEHN_GOLDSTEIN:
        found = nusselts[rayleigh, ANNULUS_AIR]
        left = printed / (1.0 + own_error) - found
        checks.within(f"Kuehn & Goldstein at Ra {rayleigh:g}, {found:.5f}", left, PRINTED)
    for rayleigh, printed in SHU:
        # To a unit of the last digit: 1.979 is not 1.9784 rounded.
        left = printed - nusselts[rayleigh, ANNULUS_AIR]
        checks.within(f"Shu at Ra {rayleigh:g}", left, 2.0 * PRINTED)
    figures = stated("concentric.json", "crescents-")
    checks.within("crescents stated, beside two", len(figures) - 2, 0)
    # The method's Ra is on a length of its own, and stated to five figures.
    inner_radius = 1.0 / (DIAMETER_RATIO - 1.0)
    length = closed_formulas.concentric_cylinders_length(
        inner_radius, DIAMETER_RATIO * inner_radius
    )
    for own_rayleigh, prandtl, figure in figures:
        rayleigh = float(f"{own_rayleigh / length**3:.4g}")
        left = figure - nusselts.get((rayleigh, prandtl), math.nan)
        checks.within(f"crescents stated at Ra {rayleigh:g}, {figure}", left, STATED)


def main():
    checks = Checks()
    check_onset(checks)
    check_rolls(checks)
    check_crescents(checks)
    return checks.finish()


if __name__ == "__main__":
    sys.exit(main())
