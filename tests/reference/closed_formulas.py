"""Layers, cavities and concentric bodies, typed a second time.

Ra and Nu are on the gap; between concentric bodies Ra is on the length of Raithby & Hollands
and Nu is the effective conductivity over that of the fluid. No Nu is below 1, nor is any
part of one before it enters a product or an average. Constants are from memory of the
publications.
"""

import math
from collections.abc import Callable
from dataclasses import dataclass
from itertools import pairwise

ONSET = 1708.0


def positive_part(value):
    return max(value, 0.0)


def at_least_conduction(nusselt):
    return max(nusselt, 1.0)


def beyond_onset(rayleigh):
    """[1 - 1708/Ra], nothing below the onset of convection."""
    return 1.0 - ONSET / rayleigh if rayleigh > ONSET else 0.0


def turbulent_layer(rayleigh):
    """[(Ra/5830)^(1/3) - 1], nothing below 5830."""
    return positive_part((rayleigh / 5830.0) ** (1.0 / 3.0) - 1.0)


# Horizontal layer heated from below.


def layer_hollands_raithby_konicek(g):
    """Hollands, Raithby & Konicek 1975, Int. J. Heat Mass Transfer 18, 879-884: gases."""
    return 1.0 + 1.44 * beyond_onset(g.rayleigh) + turbulent_layer(g.rayleigh)


def layer_hollands(g):
    """Hollands 1984, Int. J. Heat Mass Transfer 27, 466-468: any Pr."""
    if g.rayleigh <= ONSET:
        return 1.0
    first = 1.44 / (1.0 + 0.018 / g.prandtl + 0.00136 / g.prandtl**2)
    reach = g.rayleigh ** (1.0 / 3.0) / (75.0 * math.exp(1.5 / math.sqrt(g.prandtl)))
    rolls = first + 2.0 * reach ** (1.0 - math.log(reach))
    return 1.0 + beyond_onset(g.rayleigh) * rolls + turbulent_layer(g.rayleigh)


def layer_globe_dropkin(g):
    """Globe & Dropkin 1959, J. Heat Transfer 81, 24-28."""
    return at_least_conduction(0.069 * g.rayleigh ** (1.0 / 3.0) * g.prandtl**0.074)


def en673(factor, exponent):
    """EN 673: max{1, A (Gr Pr)^n}."""
    return lambda g: at_least_conduction(factor * g.rayleigh**exponent)


layer_en673 = en673(0.16, 0.28)
slope_en673 = en673(0.10, 0.31)
cavity_en673 = en673(0.035, 0.38)

# Vertical cavity.


def cavity_elsherbiny(g):
    """ElSherbiny, Raithby & Hollands 1982, J. Heat Transfer 104, 96-102: gases."""
    rayleigh = g.rayleigh
    turbulent = 0.0605 * rayleigh ** (1.0 / 3.0)
    # 0.104 Ra^0.293/[1 + (6310/Ra)^1.36], written so that Ra may be zero.
    middle = 0.104 * rayleigh**1.653 / (rayleigh**1.36 + 6310.0**1.36)
    layers = 0.242 * (rayleigh / g.aspect) ** 0.272
    return at_least_conduction(max(turbulent, (1.0 + middle**3) ** (1.0 / 3.0), layers))


def catton_rayleigh(g):
    """Ra Pr/(0.2 + Pr), of Catton's two forms for short cavities."""
    return g.rayleigh * g.prandtl / (0.2 + g.prandtl)


def cavity_berkovsky_polevikov(g):
    """Berkovsky & Polevikov 1977, by way of Catton 1978: height one to two gaps."""
    return at_least_conduction(0.18 * catton_rayleigh(g) ** 0.29)


def cavity_catton(g):
    """Catton 1978, Proc. 6th Int. Heat Transfer Conf. 6, 13-31: height two to ten gaps."""
    return at_least_conduction(0.22 * catton_rayleigh(g) ** 0.28 / g.aspect**0.25)


def cavity_macgregor_emery(g):
    """MacGregor & Emery 1969, J. Heat Transfer 91, 391-403."""
    return at_least_conduction(0.42 * g.rayleigh**0.25 * g.prandtl**0.012 / g.aspect**0.3)


def cavity_macgregor_emery_turbulent(g):
    """Same paper; the larger of its two forms."""
    return max(cavity_macgregor_emery(g), 0.046 * g.rayleigh ** (1.0 / 3.0))


def cavity_wright(g):
    """Wright 1996, ASHRAE Trans. 102 (1), 940-946; ISO 15099."""
    rayleigh = g.rayleigh
    if rayleigh <= 1e4:
        high = 1.0 + 1.7596678e-10 * rayleigh**2.2984755
    elif rayleigh <= 5e4:
        high = 0.028154 * rayleigh**0.4134
    else:
        high = 0.0673838 * rayleigh ** (1.0 / 3.0)
    return at_least_conduction(max(high, 0.242 * (rayleigh / g.aspect) ** 0.272))


# The automatic choice, for the two ends of Catton's tilted layer.

# What counts as one step away from a range: a decade in Ra, a factor of 1.5 in Pr and in aspect.
STEPS = {"rayleigh": 10.0, "catton_rayleigh": 10.0, "prandtl": 1.5, "aspect": 1.5}


@dataclass(frozen=True)
class Candidate:
    """A formula with its ranges by the name of the group: see `within`."""

    nusselt: Callable
    ranges: dict

    def distance(self, g):
        """How many steps outside its ranges a case is; none on an answered side."""
        farthest = 0.0
        for name, (low, high, answered_below, answered_above) in self.ranges.items():
            value = catton_rayleigh(g) if name == "catton_rayleigh" else getattr(g, name)
            if value < low and not answered_below:
                ratio = low / value if value > 0.0 else math.inf
            elif value > high and not answered_above:
                ratio = value / high
            else:
                continue
            farthest = max(farthest, math.log(ratio) / math.log(STEPS[name]))
        return farthest


def candidate(nusselt, **ranges):
    return Candidate(nusselt, ranges)


def first_fit(candidates, g):
    """The formula whose ranges the case is least outside of, the earlier of equals."""
    return min(candidates, key=lambda one: one.distance(g)).nusselt(g)


def within(low, high, answered_below=False, answered_above=False):
    """Ends included; a formula is used beyond an answered side without another being sought."""
    return low, high, answered_below, answered_above


LAYERS = (
    candidate(layer_hollands_raithby_konicek, prandtl=within(0.6, 1.1), rayleigh=within(0.0, 1e8)),
    candidate(layer_hollands, rayleigh=within(0.0, 1e11)),
)
CAVITIES = (
    candidate(
        cavity_elsherbiny,
        prandtl=within(0.6, 1.1),
        aspect=within(5.0, 110.0, answered_above=True),
        rayleigh=within(1e2, 2e7, answered_below=True),
    ),
    candidate(
        cavity_berkovsky_polevikov,
        aspect=within(1.0, 2.0, answered_below=True),
        catton_rayleigh=within(1e3, math.inf, answered_below=True),
        rayleigh=within(0.0, 1e10),
    ),
    candidate(
        cavity_catton,
        aspect=within(2.0, 10.0),
        rayleigh=within(1e3, 1e10, answered_below=True),
    ),
    candidate(
        cavity_macgregor_emery_turbulent,
        aspect=within(10.0, 40.0),
        prandtl=within(1.0, 20.0),
        rayleigh=within(1e6, 1e9),
    ),
    candidate(
        cavity_macgregor_emery,
        aspect=within(10.0, 40.0, answered_above=True),
        prandtl=within(1.0, 2e4),
        rayleigh=within(1e4, 1e7, answered_below=True),
    ),
)


def layer_automatic(g):
    return first_fit(LAYERS, g)


def cavity_automatic(g):
    return first_fit(CAVITIES, g)


# Tilted layer, tilt from the horizontal: 0 heated from below, 90 upright, 180 from above.


def between(low, high, part):
    return low + (high - low) * part


def tilted_hollands_unny_raithby_konicek(g):
    """Hollands, Unny, Raithby & Konicek 1976, J. Heat Transfer 98, 189-193: gases, to 60."""
    driving = g.rayleigh * g.cosine
    if driving <= ONSET:
        return 1.0 + turbulent_layer(positive_part(driving))
    narrowing = positive_part(math.sin(math.radians(1.8 * g.tilt))) ** 1.6
    rolls = positive_part(1.0 - ONSET * narrowing / driving)
    return 1.0 + 1.44 * beyond_onset(driving) * rolls + turbulent_layer(driving)


def sixty_elsherbiny(g):
    """ElSherbiny, Raithby & Hollands 1982 at 60 degrees; ISO 15099."""
    step = 0.5 / (1.0 + (g.rayleigh / 3160.0) ** 20.6) ** 0.1
    first = (1.0 + (0.0936 * g.rayleigh**0.314 / (1.0 + step)) ** 7) ** (1.0 / 7.0)
    second = (0.104 + 0.175 / g.aspect) * g.rayleigh**0.283
    return max(first, second)


def tilted_elsherbiny(g):
    """Same paper, 60 to 90 degrees: linear in the tilt."""
    return between(sixty_elsherbiny(g), cavity_elsherbiny(g), (g.tilt - 60.0) / 30.0)


# Catton 1978: the tilt of least heat flow by aspect. Above an aspect of 12 it is 70.
CRITICAL_TILTS = ((1.0, 25.0), (3.0, 53.0), (6.0, 60.0), (12.0, 67.0))


def critical_tilt(aspect):
    """Interpolated in the logarithm of the aspect; held below an aspect of one."""
    if aspect <= CRITICAL_TILTS[0][0]:
        return CRITICAL_TILTS[0][1]
    for (low, tilt_low), (high, tilt_high) in pairwise(CRITICAL_TILTS):
        if aspect <= high:
            return between(tilt_low, tilt_high, math.log(aspect / low) / math.log(high / low))
    return 70.0


def tilted_catton(g):
    """Catton 1978."""
    upright = cavity_automatic(g)
    if g.tilt > 90.0:
        return at_least_conduction(1.0 + (upright - 1.0) * g.sine)
    critical = critical_tilt(g.aspect)
    if g.tilt > critical:
        return at_least_conduction(upright * g.sine**0.25)
    level = layer_automatic(g)
    part = g.tilt / critical
    dip = math.sin(math.radians(critical)) ** (part / 4.0)
    return at_least_conduction(level * (upright / level) ** part * dip)


def tilted_en673(g):
    """EN 673, linear in the tilt between its three inclinations."""
    if g.tilt <= 45.0:
        return between(layer_en673(g), slope_en673(g), g.tilt / 45.0)
    return between(slope_en673(g), cavity_en673(g), (g.tilt - 45.0) / 45.0)


# Concentric bodies: Raithby & Hollands 1975, Advances in Heat Transfer 11, 265-315.


def concentric(factor):
    def nusselt(g):
        fluid = (g.prandtl / (0.861 + g.prandtl)) ** 0.25
        return at_least_conduction(factor * fluid * g.rayleigh**0.25)

    return nusselt


concentric_cylinders = concentric(0.386)
concentric_spheres = concentric(0.74)


def concentric_cylinders_length(inner_radius, outer_radius):
    radii = inner_radius**-0.6 + outer_radius**-0.6
    return 2.0 * math.log(outer_radius / inner_radius) ** (4.0 / 3.0) / radii ** (5.0 / 3.0)


def concentric_spheres_length(inner_radius, outer_radius):
    radii = inner_radius**-1.4 + outer_radius**-1.4
    curvature = (1.0 / inner_radius - 1.0 / outer_radius) ** (4.0 / 3.0)
    return curvature / (2.0 ** (1.0 / 3.0) * radii ** (5.0 / 3.0))
