"""Inclined cylinders, blocks and short cylinders, typed a second time.

Nu, Ra and Pr are on the length of an inclined cylinder, and on the square root of the total
area of a block or a short cylinder. Constants are from memory of the publications.
"""

import math

from formulas import (
    Groups,
    blended,
    cylinder_churchill_chu,
    prandtl_function,
    turbulent_average,
    turbulent_upward,
    turbulent_vertical,
    vertical_cylinder_popiel,
)

# Inclined cylinder.


def inclined_cylinder_tilt_rule(g):
    """The tilt rule of Raithby & Hollands 1998 for plates, carried over to cylinders."""
    upright = vertical_cylinder_popiel(
        Groups(g.rayleigh * g.cosine, g.prandtl, slenderness=g.slenderness)
    )
    on_diameter = g.rayleigh * g.sine / g.slenderness**3
    level = cylinder_churchill_chu(Groups(on_diameter, g.prandtl))
    return max(upright, level * g.slenderness)


def al_arabi_khamis_transition(tilt):
    """Ra_L up to which the laminar form of Al-Arabi & Khamis 1982 holds."""
    return 2.6e9 + 1.1e9 * math.tan(math.radians(tilt))


def inclined_cylinder_al_arabi_khamis(g):
    """Al-Arabi & Khamis 1982, Int. J. Heat Mass Transfer 25, 3-15: air."""
    grashof_on_diameter = g.rayleigh / g.prandtl / g.slenderness**3
    if g.rayleigh <= al_arabi_khamis_transition(g.tilt):
        factor = 2.9 - 2.32 * g.sine**0.8
        exponent = 1.0 / 4.0 + g.sine**1.2 / 12.0
    else:
        factor = 0.47 + 0.11 * g.sine**0.8
        exponent = 1.0 / 3.0
    return factor * grashof_on_diameter ** (-1.0 / 12.0) * g.rayleigh**exponent


# Convex bodies: Yovanovich 1987, ASME HTD-82, 121-129, with the constants of Clark &
# Yovanovich 1986; Hassani & Hollands 1989, J. Heat Transfer 111, 363-371, for the blend.

BODY_BLEND = 6


def body_prandtl_function(prandtl):
    return 0.670 / prandtl_function(prandtl, 0.5) ** (4.0 / 9.0)


def block_gravity_function(length, width, height):
    """G of a block, `length` the longer horizontal side; any one unit of length."""
    area = 0.625 * length ** (4.0 / 3.0) * width + height * (length + width) ** (4.0 / 3.0)
    scale = (length * width + height * width + length * height) ** (7.0 / 6.0)
    return 2.0 ** (1.0 / 8.0) * (area / scale) ** (3.0 / 4.0)


def block_conduction(length, width, height):
    """Nu as Ra tends to 0, of the block with a square base of the same area."""
    proportion = height / math.sqrt(length * width)
    return (3.192 + 1.868 * proportion**0.76) / math.sqrt(1.0 + 1.189 * proportion)


def short_cylinder_conduction(proportion):
    """Nu as Ra tends to 0; `proportion` is the length along the axis over the diameter."""
    return (3.1915 + 2.7726 * proportion**0.76) / math.sqrt(1.0 + 2.0 * proportion)


# The square of the same area as a disc of diameter one.
EQUAL_SIDE = math.sqrt(math.pi / 4.0)


def upright_short_cylinder_gravity_function(slenderness):
    """0.967 at H = D; other heights in proportion to the block on the square of equal area."""
    block = block_gravity_function(EQUAL_SIDE, EQUAL_SIDE, slenderness)
    return 0.967 * block / block_gravity_function(EQUAL_SIDE, EQUAL_SIDE, 1.0)


def lying_short_cylinder_gravity_function(slenderness):
    """1.019 at L = D; other lengths in proportion to the block on the square of equal area."""
    longer, shorter = max(slenderness, EQUAL_SIDE), min(slenderness, EQUAL_SIDE)
    block = block_gravity_function(longer, shorter, EQUAL_SIDE)
    return 1.019 * block / block_gravity_function(1.0, EQUAL_SIDE, EQUAL_SIDE)


def body_laminar(g, conduction, gravity_function):
    return conduction + gravity_function * body_prandtl_function(g.prandtl) * g.rayleigh**0.25


def body_blend(laminar, turbulent_coefficient, g):
    return blended(laminar, turbulent_coefficient * g.rayleigh ** (1.0 / 3.0), BODY_BLEND)


def block_yovanovich(g):
    sides = g.block_length, g.block_width, g.block_height
    return body_laminar(g, block_conduction(*sides), block_gravity_function(*sides))


def block_hassani_hollands(g):
    """The sides' and the top's turbulent coefficient by area; the bottom carries none."""
    level = g.block_length * g.block_width
    upright = 2.0 * g.block_height * (g.block_length + g.block_width)
    coefficient = (
        turbulent_upward(g.prandtl) * level + turbulent_vertical(g.prandtl) * upright
    ) / (2.0 * level + upright)
    return body_blend(block_yovanovich(g), coefficient, g)


def upright_short_cylinder_yovanovich(g):
    return body_laminar(
        g,
        short_cylinder_conduction(g.slenderness),
        upright_short_cylinder_gravity_function(g.slenderness),
    )


def upright_short_cylinder_hassani_hollands(g):
    """Areas in discs: one on top, one below, four slendernesses around."""
    around = 4.0 * g.slenderness
    coefficient = (turbulent_upward(g.prandtl) + turbulent_vertical(g.prandtl) * around) / (
        2.0 + around
    )
    return body_blend(upright_short_cylinder_yovanovich(g), coefficient, g)


def lying_short_cylinder_yovanovich(g):
    return body_laminar(
        g,
        short_cylinder_conduction(g.slenderness),
        lying_short_cylinder_gravity_function(g.slenderness),
    )


def lying_short_cylinder_hassani_hollands(g):
    """Both ends upright; around, the average of the horizontal cylinder."""
    around = 4.0 * g.slenderness
    coefficient = (
        2.0 * turbulent_vertical(g.prandtl) + turbulent_average(g.prandtl, "cylinder") * around
    ) / (2.0 + around)
    return body_blend(lying_short_cylinder_yovanovich(g), coefficient, g)
