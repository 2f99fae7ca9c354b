"""Open channels between upright walls, typed a second time.

Ra and Nu are on the spacing, Nu with the difference between wall and inlet; E is Ra over the
aspect. Bar-Cohen & Rohsenow 1984, J. Heat Transfer 106, 116-123; constants from memory.
"""

import math

from scipy.optimize import brentq, minimize_scalar

# (C1, C2) by the number of heated walls.
ISOTHERMAL = {2: (576.0, 2.87), 1: (144.0, 2.87)}
UNIFORM_FLUX = {2: (48.0, 2.51), 1: (24.0, 2.51)}


def channel_isothermal(channel, heated_walls):
    developed, single = ISOTHERMAL[heated_walls]
    return (developed / channel**2 + single / math.sqrt(channel)) ** -0.5


def channel_elenbaas(channel):
    """Elenbaas 1942, Physica 9, 1-28: two isothermal walls in air."""
    return channel / 24.0 * (-math.expm1(-35.0 / channel)) ** 0.75


def channel_uniform_flux(channel, heated_walls):
    """Nu with the difference at the top edge, where E* = E Nu."""
    developed, single = UNIFORM_FLUX[heated_walls]

    def excess(log_nusselt):
        modified = channel * math.exp(log_nusselt)
        return log_nusselt + 0.5 * math.log(developed / modified + single / modified**0.4)

    return math.exp(brentq(excess, math.log(1e-15), math.log(1e15), xtol=1e-14, rtol=1e-14))


def best_spacing(heated_walls):
    """Spacing of most heat from a given width of isothermal walls, and Nu there.

    The spacing is over (Ra_S/(S^3 H))^(-1/4), so that E is its fourth power; with walls as
    thin as one likes their number goes as 1/S, and the heat as Nu/S^2.
    """
    found = minimize_scalar(
        lambda spacing: spacing**2 / channel_isothermal(spacing**4, heated_walls),
        bounds=(1.0, 5.0),
        method="bounded",
        options={"xatol": 1e-10},
    )
    return found.x, channel_isothermal(found.x**4, heated_walls)
