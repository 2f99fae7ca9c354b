"""Every open-surface correlation of the catalogue, typed a second time.

The functions are typed from the publications named beside them and from nothing in the
Rust sources, so that a slip of the pen on either side shows as a difference. Constants
are from memory of the publications unless said otherwise.

Nu, Ra and Pr are on the characteristic length of the body: height of vertical plates and
cylinders, length along the slope of inclined plates, area over perimeter of horizontal
plates, diameter of horizontal cylinders and spheres.
"""

import math
from dataclasses import dataclass
from functools import cache
from itertools import pairwise

from scipy.integrate import quad
from scipy.optimize import brentq


@dataclass(frozen=True)
class Groups:
    """What a method is given.

    `tilt` in degrees, from the vertical for plates and cylinders, from the horizontal for
    layers; `slenderness` is length or height over diameter; `aspect` height over gap or over
    spacing; the three sides of a block are over the root of its total area.
    """

    rayleigh: float
    prandtl: float
    tilt: float = 0.0
    slenderness: float = 0.0
    length_ratio: float = 0.0
    aspect: float = 0.0
    diameter_ratio: float = 0.0
    block_length: float = 0.0
    block_width: float = 0.0
    block_height: float = 0.0
    heated_walls: int = 0

    @property
    def cosine(self) -> float:
        return math.cos(math.radians(self.tilt))

    @property
    def sine(self) -> float:
        return math.sin(math.radians(self.tilt))


def prandtl_function(prandtl, constant):
    """1 + (c/Pr)^(9/16), Churchill & Usagi 1972."""
    return 1.0 + (constant / prandtl) ** (9.0 / 16.0)


def blended(laminar, turbulent, exponent):
    """(a^m + b^m)^(1/m), Churchill & Usagi 1972."""
    return (laminar**exponent + turbulent**exponent) ** (1.0 / exponent)


def thick_layer(thin_layer, constant):
    """c / ln(1 + c/Nu_T), Raithby & Hollands 1998; zero where nothing moves."""
    return constant / math.log1p(constant / thin_layer) if thin_layer > 0.0 else 0.0


# Raithby & Hollands 1998, Handbook of Heat Transfer, ch. 4: laminar coefficient, and
# turbulent coefficients of vertical and of upward surfaces.


def laminar_coefficient(prandtl):
    return 0.671 / prandtl_function(prandtl, 0.492) ** (4.0 / 9.0)


def turbulent_vertical(prandtl):
    return 0.13 * prandtl**0.22 / (1.0 + 0.61 * prandtl**0.81) ** 0.42


def turbulent_upward(prandtl):
    return 0.14 * (1.0 + 0.0107 * prandtl) / (1.0 + 0.01 * prandtl)


@cache
def turbulent_average(prandtl, body):
    """Surface average of the local turbulent coefficient over a `cylinder` or a `sphere`.

    The polar angle runs from the upward vertical; the larger of the two coefficients
    holds on the upper half, the vertical one on the lower. The integral is split where
    they cross, tan^(1/3) = C_U/C_V, and at the horizontal.
    """
    upward, vertical = turbulent_upward(prandtl), turbulent_vertical(prandtl)

    def local(angle):
        sideways = vertical * abs(math.sin(angle)) ** (1.0 / 3.0)
        if angle < math.pi / 2.0:
            return max(upward * math.cos(angle) ** (1.0 / 3.0), sideways)
        return sideways

    def weighted(angle):
        return local(angle) * (math.sin(angle) / 2.0 if body == "sphere" else 1.0 / math.pi)

    cuts = (0.0, math.atan((upward / vertical) ** 3), math.pi / 2.0, math.pi)
    return sum(
        quad(weighted, low, high, epsabs=0.0, epsrel=1e-11, limit=200)[0]
        for low, high in pairwise(cuts)
    )


# Vertical plate.


def plate_blend(laminar_rayleigh, turbulent_rayleigh, prandtl, factor=1.0):
    """Raithby & Hollands 1998; `factor` multiplies the laminar part."""
    laminar = thick_layer(laminar_coefficient(prandtl) * laminar_rayleigh**0.25, 2.0)
    turbulent = 0.0
    if turbulent_rayleigh > 0.0:
        turbulent = (
            turbulent_vertical(prandtl)
            * turbulent_rayleigh ** (1.0 / 3.0)
            / (1.0 + 1.4e9 * prandtl / turbulent_rayleigh)
        )
    return blended(factor * laminar, turbulent, 6)


def plate_churchill_chu(g, constant=0.492):
    """Churchill & Chu 1975, Int. J. Heat Mass Transfer 18, 1323-1329; 0.437 at uniform flux."""
    divisor = prandtl_function(g.prandtl, constant) ** (8.0 / 27.0)
    return (0.825 + 0.387 * g.rayleigh ** (1.0 / 6.0) / divisor) ** 2


def plate_churchill_chu_laminar(rayleigh, prandtl, constant=0.492):
    """Same paper, laminar form."""
    return 0.68 + 0.670 * rayleigh**0.25 / prandtl_function(prandtl, constant) ** (4.0 / 9.0)


def plate_lefevre(g):
    """LeFevre 1956: fit to the similarity solution of the isothermal plate."""
    root = math.sqrt(g.prandtl)
    gradient = 0.75 * root / (0.609 + 1.221 * root + 1.238 * g.prandtl) ** 0.25
    return 4.0 / 3.0 * (g.rayleigh / g.prandtl / 4.0) ** 0.25 * gradient


def plate_squire_eckert(g):
    """Squire (in Goldstein 1938) and Eckert: integral method."""
    return 0.678 * g.rayleigh**0.25 * (g.prandtl / (0.952 + g.prandtl)) ** 0.25


def plate_power_law(g):
    """McAdams 1954 (laminar); Warner & Arpaci 1968 (turbulent)."""
    if g.rayleigh <= 1e9:
        return 0.59 * g.rayleigh**0.25
    return 0.10 * g.rayleigh ** (1.0 / 3.0)


def at_mid_height(local_law, rayleigh):
    """Nu = q H/(k dT) with dT at mid-height, from a law Nu_x = F(Ra*_x) for uniform flux.

    Solved numerically: at x = H/2, Nu_x = Nu/2 and Ra*_x = Ra_x Nu_x = (Ra/8)(Nu/2).
    """

    def excess(log_nusselt):
        half = math.exp(log_nusselt) / 2.0
        return math.log(half) - math.log(local_law(rayleigh / 8.0 * half))

    return math.exp(brentq(excess, math.log(1e-12), math.log(1e12), xtol=1e-13, rtol=1e-14))


def plate_fujii_fujii(g):
    """Fujii & Fujii 1976, Int. J. Heat Mass Transfer 19, 121-122: laminar, uniform flux."""
    factor = (g.prandtl / (4.0 + 9.0 * math.sqrt(g.prandtl) + 10.0 * g.prandtl)) ** 0.2
    return at_mid_height(lambda modified: factor * modified**0.2, g.rayleigh)


def plate_vliet(g):
    """Vliet 1969, J. Heat Transfer 91, 511-516: turbulent, uniform flux."""
    return at_mid_height(lambda modified: 0.17 * modified**0.25, g.rayleigh)


# Inclined plate.


def tilt_rule(g, horizontal):
    """Raithby & Hollands 1998: the larger heat flow of the upright and of the level plate."""
    upright_rayleigh = g.rayleigh * g.cosine
    upright = plate_blend(upright_rayleigh, upright_rayleigh, g.prandtl)
    level = horizontal(Groups(g.rayleigh * g.sine * g.length_ratio**3, g.prandtl))
    return max(upright, level / g.length_ratio)


def inclined_vliet_ross(g):
    """Vliet & Ross 1975, J. Heat Transfer 97, 549-554: hot face down."""
    return plate_blend(g.rayleigh * g.cosine, g.rayleigh * g.cosine**2, g.prandtl)


def inclined_vliet(g):
    """Vliet 1969: hot face up, turbulent part with plain g."""
    return plate_blend(g.rayleigh * g.cosine, g.rayleigh, g.prandtl)


def inclined_fujii_imura(g):
    """Fujii & Imura 1972, Int. J. Heat Mass Transfer 15, 755-767: hot face down."""
    return 0.56 * (g.rayleigh * g.cosine) ** 0.25


def inclined_fujii_imura_unstable(g):
    """Same paper, hot face up; the critical Gr log-interpolated, held beyond its table."""
    angles, grashofs = (15.0, 30.0, 60.0, 75.0), (5e9, 2e9, 1e8, 1e6)
    tilt = min(max(g.tilt, angles[0]), angles[-1])
    step = next(i for i in range(3) if tilt <= angles[i + 1])
    part = (tilt - angles[step]) / (angles[step + 1] - angles[step])
    critical = g.prandtl * grashofs[step] * (grashofs[step + 1] / grashofs[step]) ** part
    if g.rayleigh <= critical:
        return inclined_fujii_imura(g)
    third = 1.0 / 3.0
    separated = 0.145 * (g.rayleigh**third - critical**third)
    return separated + 0.56 * (critical * g.cosine) ** 0.25


# Horizontal plate.


def horizontal_unstable(g):
    """Raithby & Hollands 1998: hot face up or cold face down."""
    thin = 0.835 * laminar_coefficient(g.prandtl) * g.rayleigh**0.25
    turbulent = turbulent_upward(g.prandtl) * g.rayleigh ** (1.0 / 3.0)
    return blended(thick_layer(thin, 1.4), turbulent, 10)


def horizontal_stable(g):
    """Raithby & Hollands 1998: hot face down or cold face up."""
    thin = 0.527 * g.rayleigh**0.2 / (1.0 + (1.9 / g.prandtl) ** 0.9) ** (2.0 / 9.0)
    return thick_layer(thin, 2.5)


def horizontal_lloyd_moran(g):
    """Lloyd & Moran 1974, J. Heat Transfer 96, 443-447: hot face up."""
    if g.rayleigh <= 1e7:
        return 0.54 * g.rayleigh**0.25
    return 0.15 * g.rayleigh ** (1.0 / 3.0)


def horizontal_goldstein_sparrow_jones(g):
    """Goldstein, Sparrow & Jones 1973, Int. J. Heat Mass Transfer 16, 1025-1035: hot face up."""
    if g.rayleigh <= 200.0:
        return 0.96 * g.rayleigh ** (1.0 / 6.0)
    return 0.59 * g.rayleigh**0.25


# Horizontal cylinder.


def cylinder_churchill_chu(g):
    """Churchill & Chu 1975, Int. J. Heat Mass Transfer 18, 1049-1053."""
    divisor = prandtl_function(g.prandtl, 0.559) ** (8.0 / 27.0)
    return (0.60 + 0.387 * g.rayleigh ** (1.0 / 6.0) / divisor) ** 2


def cylinder_churchill_chu_laminar(g):
    """Same paper, laminar form."""
    return 0.36 + 0.518 * g.rayleigh**0.25 / prandtl_function(g.prandtl, 0.559) ** (4.0 / 9.0)


def cylinder_morgan(g):
    """Morgan 1975, Advances in Heat Transfer 11, 199-264."""
    for upper_end, factor, exponent in (
        (1e-2, 0.675, 0.058),
        (1e2, 1.02, 0.148),
        (1e4, 0.850, 0.188),
        (1e7, 0.480, 0.250),
    ):
        if g.rayleigh <= upper_end:
            return factor * g.rayleigh**exponent
    return 0.125 * g.rayleigh**0.333


def cylinder_raithby_hollands(g):
    """Raithby & Hollands 1998."""
    thin = 0.772 * laminar_coefficient(g.prandtl) * g.rayleigh**0.25
    correction = 1.0 - 0.13 / thin**0.16
    turbulent = turbulent_average(g.prandtl, "cylinder") * g.rayleigh ** (1.0 / 3.0)
    return blended(thick_layer(thin, 2.0 * correction), turbulent, 10)


def cylinder_kuehn_goldstein(g):
    """Kuehn & Goldstein 1976, Int. J. Heat Mass Transfer 19, 1127-1134."""
    laminar = 0.518 * g.rayleigh**0.25 * (1.0 + (0.559 / g.prandtl) ** 0.6) ** (-5.0 / 12.0)
    return thick_layer(blended(laminar, 0.1 * g.rayleigh ** (1.0 / 3.0), 15), 2.0)


def cylinder_power_law(g):
    """McAdams 1954."""
    if g.rayleigh <= 1e9:
        return 0.53 * g.rayleigh**0.25
    return 0.13 * g.rayleigh ** (1.0 / 3.0)


# Vertical cylinder.


def popiel_factor(curvature, prandtl):
    """Popiel, Wojtkowiak & Bober 2007, Exp. Thermal Fluid Sci. 32, 607-613: fit to Cebeci 1974.

    `curvature` is 32^(1/2) Gr_H^(-1/4) H/D.
    """
    factor = 0.0571322 + 0.20305 * prandtl**-0.43
    exponent = (
        0.9165 - 0.0043 * math.sqrt(prandtl) + 0.01333 * math.log(prandtl) + 0.0004809 / prandtl
    )
    return 1.0 + factor * curvature**exponent


def vertical_cylinder_popiel(g):
    """The plate with Popiel's factor on its laminar part.

    The factor grows without bound as Ra tends to 0; plumeline holds it below Ra 100.
    """
    grashof = max(g.rayleigh, 100.0) / g.prandtl
    curvature = math.sqrt(32.0) * grashof**-0.25 * g.slenderness
    factor = popiel_factor(curvature, g.prandtl)
    return plate_blend(g.rayleigh, g.rayleigh, g.prandtl, factor)


def vertical_cylinder_lefevre_ede(g):
    """Le Fevre & Ede 1956, Proc. 9th Int. Congress of Applied Mechanics 4, 175-183."""
    prandtl = g.prandtl
    plate = 4.0 / 3.0 * (7.0 * g.rayleigh * prandtl / (5.0 * (20.0 + 21.0 * prandtl))) ** 0.25
    curvature = 4.0 * (272.0 + 315.0 * prandtl) / (35.0 * (64.0 + 63.0 * prandtl))
    return plate + curvature * g.slenderness


# Sphere.


def sphere_churchill_laminar_part(g):
    return 0.589 * g.rayleigh**0.25 / prandtl_function(g.prandtl, 0.469) ** (4.0 / 9.0)


def sphere_raithby_hollands(g):
    """Churchill's laminar form, blended with the turbulent part of Raithby & Hollands 1998."""
    laminar = 2.0 + sphere_churchill_laminar_part(g)
    turbulent = turbulent_average(g.prandtl, "sphere") * g.rayleigh ** (1.0 / 3.0)
    return blended(laminar, turbulent, 6)
