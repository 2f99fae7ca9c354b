"""Compares every method of a command with the formulas typed here; exit 1 on any difference.

python3 tests/reference/check_formulas.py cargo run -q --example nusselt --
"""

import itertools
import math
import sys

from catalogue import METHODS
from formulas import Groups, turbulent_average
from nusselt_command import NusseltCommand

PRANDTLS = (0.01, 0.03, 0.1, 0.3, 0.66, 0.71, 1.0, 2.0, 6.7, 13.0, 100.0, 2000.0, 1e4)

# Surface averages of the turbulent coefficient of a horizontal cylinder as the catalogue
# lists them (Raithby & Hollands 1998), half a unit of their last digit allowed. The list has
# 0.0772 at Pr 0.01; the integral of its own formula gives 0.07710, so 0.0771 stands here.
LISTED_AVERAGES = (
    (0.01, 0.0771, 4),
    (0.71, 0.103, 3),
    (2.0, 0.108, 3),
    (6.0, 0.109, 3),
    (50.0, 0.101, 3),
    (100.0, 0.099, 3),
    (2000.0, 0.088, 3),
)


def rayleighs(method):
    """Half-decades from a tenth of the lowest to ten times the highest Ra, and band edges."""
    low, high = (round(math.log10(end)) for end in method.rayleigh)
    decades = [float(f"1e{exponent}") for exponent in range(low - 1, high + 2)]
    between = [decade * math.sqrt(10.0) for decade in decades[:-1]]
    edges = [edge * side for edge in method.edges for side in (1.0 - 1e-9, 1.0, 1.0 + 1e-9)]
    return sorted({*decades, *between, *edges})


def grid(method):
    low, high = method.prandtl
    prandtls = [prandtl for prandtl in PRANDTLS if low <= prandtl <= high]
    return [
        Groups(rayleigh, prandtl, **shape)
        for rayleigh, prandtl, shape in itertools.product(
            rayleighs(method), prandtls, method.shapes
        )
    ]


def compare(command, method_id, method):
    """Prints the largest deviation; returns a line for every point beyond the tolerance."""
    points = grid(method)
    largest, failures = 0.0, []
    for point, found in zip(points, command.nusselt(method_id, points), strict=True):
        expected = method.nusselt(point)
        deviation = abs(found / expected - 1.0) if math.isfinite(found) else math.inf
        largest = max(largest, deviation)
        if deviation > method.relative_tolerance:
            failures.append(f"{method_id}: {point}: found {found}, expected {expected}")
    print(f"{method_id:52} {len(points):6} points, largest deviation {largest:.1e}")
    return failures


def check_ids(listed):
    failures = [f"not listed by the command: {name}" for name in METHODS if name not in listed]
    failures += [f"not typed here: {name}" for name in listed if name not in METHODS]
    failures += [f"listed twice: {name}" for name in set(listed) if listed.count(name) > 1]
    return failures


def check_averages():
    return [
        f"surface average at Pr {prandtl}: listed {listed}, integral {average:.5f}"
        for prandtl, listed, digits in LISTED_AVERAGES
        if abs((average := turbulent_average(prandtl, "cylinder")) - listed) > 0.5 * 10.0**-digits
    ]


def main():
    command = NusseltCommand.from_arguments()
    listed = command.method_ids()
    failures = check_ids(listed) + check_averages()
    for method_id, method in METHODS.items():
        if method_id in listed:
            failures += compare(command, method_id, method)
    for failure in failures:
        print(failure, file=sys.stderr)
    print(f"{len(METHODS)} methods, {len(failures)} failures")
    return 1 if failures else 0


if __name__ == "__main__":
    sys.exit(main())
