"""Mixtures of water and a glycol, as data with their sources, and the fits evaluated.

The fits are polynomials in temperature and mass fraction (of viscosity: its logarithm).
CoolProp evaluates them above the freezing curve only, so their coefficients are recovered by
least squares from values there; they are met within rounding.
"""

from dataclasses import dataclass, field

import numpy as np
from CoolProp.CoolProp import PropsSI

MELINDER = (
    "Melinder 2010, Properties of Secondary Working Fluids for Indirect Systems, "
    "International Institute of Refrigeration"
)
CODES = ["D", "C", "V", "L"]
ASHRAE_COLDEST = 238.15  # K
DEGREES = (6, 4)  # terms in mass fraction and in temperature
FITTED = (0.0, 0.6)  # mass fractions
HOTTEST = 373.15
PRESSURE = 200e3  # Pa; the fits know none


@dataclass
class Glycol:
    """A mixture and the grid of its table."""

    id: str
    name: str
    solute: str
    library_name: str
    ashrae_name: str
    temperatures: np.ndarray
    # Close to Chebyshev's points, between which a polynomial swings least.
    fractions: list[float] = field(default_factory=lambda: [0.1, 0.15, 0.27, 0.43, 0.55, 0.6])
    notes: list[str] = field(default_factory=list)


class Fit:
    """A glycol's fits, continued below the freezing curve."""

    def __init__(self, library_name):
        self.name = library_name
        places = np.array(
            [
                (fraction, temperature)
                for fraction in np.linspace(*FITTED, 13)
                for temperature in np.linspace(self.freezing(fraction) + 0.1, HOTTEST - 0.01, 25)
            ]
        )
        wanted = np.array([self.library_row(t, x) for x, t in places])
        basis = self.basis(places[:, 1], places[:, 0])
        self.coefficients, *_ = np.linalg.lstsq(basis, wanted, rcond=None)
        miss = np.abs(basis @ self.coefficients / wanted - 1).max()
        if miss > 1e-12:
            raise ValueError(f"{library_name} is not a polynomial: off by {miss:.1e}")

    def freezing(self, fraction):
        return PropsSI("T_freeze", "T", 300, "P", PRESSURE, f"INCOMP::{self.name}[{float(fraction)!r}]")

    def ashrae_spread(self, name, fractions):
        """Largest deviation from the fits to the ASHRAE Handbook's tables, without expansion."""
        errors = []
        for fraction in fractions:
            coldest = max(self.freezing(fraction) + 1, ASHRAE_COLDEST)
            for temperature in np.linspace(coldest, HOTTEST - 1, 30):
                mixture = f"INCOMP::{name}[{float(fraction)!r}]"
                other = [PropsSI(c, "T", temperature, "P", PRESSURE, mixture) for c in CODES]
                errors.append(np.abs(self.rows([temperature], fraction)[0, :4] / other - 1))
        return np.max(errors, axis=0)

    def library_row(self, temperature, fraction):
        """Density, specific heat, logarithm of viscosity, conductivity."""
        mixture = f"INCOMP::{self.name}[{float(fraction)!r}]"
        row = [PropsSI(code, "T", temperature, "P", PRESSURE, mixture) for code in CODES]
        row[2] = np.log(row[2])
        return row

    def basis(self, temperatures, fractions, slope=False):
        """Powers of scaled mass fraction times powers of scaled temperature, or their slopes by
        temperature."""
        by_fraction = np.polynomial.polynomial.polyvander(fractions / 0.3 - 1, DEGREES[0] - 1)
        scaled = (temperatures - 300) / 75
        by_temperature = np.polynomial.polynomial.polyvander(scaled, DEGREES[1] - 1)
        if slope:
            powers = np.arange(1, DEGREES[1])
            by_temperature[:, 1:] = by_temperature[:, :-1] * powers / 75
            by_temperature[:, 0] = 0
        return (by_fraction[:, :, None] * by_temperature[:, None, :]).reshape(len(scaled), -1)

    def rows(self, temperatures, fraction):
        """The five properties; expansion is the slope of the density fit over it."""
        temperatures = np.asarray(temperatures, float)
        fractions = np.full_like(temperatures, fraction)
        density, heat, viscosity, conductivity = (
            self.basis(temperatures, fractions) @ self.coefficients
        ).T
        slope = self.basis(temperatures, fractions, slope=True) @ self.coefficients[:, 0]
        return np.column_stack(
            [density, heat, np.exp(viscosity), conductivity, -slope / density]
        )


COMPRESSIBILITY = (
    "pressure error not measured; at 2000000 Pa about 0.08 % in density and less than 1 % in viscosity "
    "by typical compressibility and pressure-viscosity coefficients (memory)"
)

GLYCOLS = [
    Glycol(
        "ethylene-glycol-water",
        "ethylene glycol and water",
        "ethylene glycol",
        "MEG",
        "AEG",
        np.arange(221.15, 373.2, 4),
        notes=[COMPRESSIBILITY],
    ),
    Glycol(
        "propylene-glycol-water",
        "propylene glycol and water",
        "propylene glycol",
        "MPG",
        "APG",
        np.arange(221.15, 373.2, 4),
        notes=[COMPRESSIBILITY],
    ),
]
