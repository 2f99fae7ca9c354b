"""The method ids, typed a second time, with the span over which each is compared."""

import formulas
from body_catalogue import BODY_METHODS
from method import TABULATED, Method, product

# 90 degrees is asked only of the tilt rule, where the level plate carries the heat flow: the
# cosine of 90 degrees is 6e-17 in binary, and its fourth root alone is as large as 1e-4.
TILTS = (0.0, 5.0, 15.0, 22.5, 30.0, 45.0, 60.0, 67.5, 75.0, 88.0, 89.9)
SLENDERNESSES = (0.1, 0.3, 1.0, 3.0, 10.0, 30.0, 100.0)
LENGTH_RATIOS = (0.05, 0.1, 0.2, 0.25, 0.5)

TILTED = product(tilt=TILTS)
TILTED_TO_LEVEL = product(tilt=(*TILTS, 90.0), length_ratio=LENGTH_RATIOS)
SLENDER = product(slenderness=SLENDERNESSES)

METHODS = {
    "vertical-plate-raithby-hollands": Method(
        lambda g: formulas.plate_blend(g.rayleigh, g.rayleigh, g.prandtl), (0.1, 1e12)
    ),
    "vertical-plate-churchill-chu": Method(formulas.plate_churchill_chu, (0.1, 1e12)),
    "vertical-plate-churchill-chu-laminar": Method(
        lambda g: formulas.plate_churchill_chu_laminar(g.rayleigh, g.prandtl), (0.1, 1e9)
    ),
    "vertical-plate-lefevre": Method(formulas.plate_lefevre, (1e4, 1e9)),
    "vertical-plate-squire-eckert": Method(formulas.plate_squire_eckert, (1e5, 1e9)),
    "vertical-plate-power-law": Method(formulas.plate_power_law, (1e4, 1e13), edges=(1e9,)),
    "vertical-plate-churchill-chu-uniform-flux": Method(
        lambda g: formulas.plate_churchill_chu(g, 0.437), (0.1, 1e12)
    ),
    "vertical-plate-churchill-chu-laminar-uniform-flux": Method(
        lambda g: formulas.plate_churchill_chu_laminar(g.rayleigh, g.prandtl, 0.437), (0.1, 1e9)
    ),
    "vertical-plate-fujii-fujii": Method(formulas.plate_fujii_fujii, (1e4, 1e9)),
    "vertical-plate-vliet": Method(formulas.plate_vliet, (1e9, 1e13)),
    "inclined-plate-raithby-hollands-unstable": Method(
        lambda g: formulas.tilt_rule(g, formulas.horizontal_unstable),
        (0.1, 1e12),
        shapes=TILTED_TO_LEVEL,
    ),
    "inclined-plate-raithby-hollands-stable": Method(
        lambda g: formulas.tilt_rule(g, formulas.horizontal_stable),
        (0.1, 1e12),
        shapes=TILTED_TO_LEVEL,
    ),
    "inclined-plate-churchill-chu-laminar": Method(
        lambda g: formulas.plate_churchill_chu_laminar(g.rayleigh * g.cosine, g.prandtl),
        (0.1, 1e9),
        shapes=TILTED,
    ),
    "inclined-plate-vliet-ross": Method(formulas.inclined_vliet_ross, (0.1, 1e12), shapes=TILTED),
    "inclined-plate-vliet": Method(formulas.inclined_vliet, (0.1, 1e12), shapes=TILTED),
    "inclined-plate-fujii-imura": Method(formulas.inclined_fujii_imura, (1e5, 1e11), shapes=TILTED),
    "inclined-plate-fujii-imura-unstable": Method(
        formulas.inclined_fujii_imura_unstable, (1e5, 1e12), shapes=TILTED
    ),
    "horizontal-plate-raithby-hollands-unstable": Method(formulas.horizontal_unstable, (1.0, 1e11)),
    "horizontal-plate-raithby-hollands-stable": Method(formulas.horizontal_stable, (1e3, 1e10)),
    "horizontal-plate-lloyd-moran": Method(
        formulas.horizontal_lloyd_moran, (1e4, 1e11), edges=(1e7,)
    ),
    "horizontal-plate-goldstein-sparrow-jones": Method(
        formulas.horizontal_goldstein_sparrow_jones, (1.0, 1e4), edges=(200.0,)
    ),
    # Radziemska & Lewandowski 2001, Applied Energy 68, 347-366: hot face down.
    "horizontal-plate-radziemska-lewandowski": Method(lambda g: 0.52 * g.rayleigh**0.2, (1e4, 1e9)),
    # McAdams 1954: hot face down.
    "horizontal-plate-mcadams": Method(lambda g: 0.27 * g.rayleigh**0.25, (1e5, 1e10)),
    "horizontal-cylinder-churchill-chu": Method(formulas.cylinder_churchill_chu, (1e-5, 1e12)),
    "horizontal-cylinder-churchill-chu-laminar": Method(
        formulas.cylinder_churchill_chu_laminar, (1e-6, 1e9)
    ),
    "horizontal-cylinder-morgan": Method(
        formulas.cylinder_morgan, (1e-10, 1e12), edges=(1e-2, 1e2, 1e4, 1e7)
    ),
    "horizontal-cylinder-raithby-hollands": Method(
        formulas.cylinder_raithby_hollands, (1e-10, 1e12), relative_tolerance=TABULATED
    ),
    "horizontal-cylinder-kuehn-goldstein": Method(formulas.cylinder_kuehn_goldstein, (1e-10, 1e12)),
    "horizontal-cylinder-power-law": Method(formulas.cylinder_power_law, (1e4, 1e12), edges=(1e9,)),
    "vertical-cylinder-popiel": Method(
        formulas.vertical_cylinder_popiel, (0.1, 1e12), prandtl=(0.01, 100.0), shapes=SLENDER
    ),
    "vertical-cylinder-lefevre-ede": Method(
        formulas.vertical_cylinder_lefevre_ede, (1e4, 1e9), shapes=SLENDER
    ),
    "vertical-cylinder-churchill-chu": Method(formulas.plate_churchill_chu, (0.1, 1e12)),
    # Churchill 1983, Heat Exchanger Design Handbook, 2.5.7.
    "sphere-churchill": Method(
        lambda g: 2.0 + formulas.sphere_churchill_laminar_part(g), (1.0, 1e11)
    ),
    # Yuge 1960, J. Heat Transfer 82, 214-220.
    "sphere-yuge": Method(lambda g: 2.0 + 0.43 * g.rayleigh**0.25, (1.0, 1e5)),
    "sphere-raithby-hollands": Method(
        formulas.sphere_raithby_hollands, (1.0, 1e13), relative_tolerance=TABULATED
    ),
}

METHODS |= BODY_METHODS
