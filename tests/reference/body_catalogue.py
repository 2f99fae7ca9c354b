"""The method ids of inclined cylinders, blocks, closed spaces and channels, typed a second time."""

import math

import body_formulas
import channel_formulas
import closed_formulas
from method import TABULATED, Method, product

SLENDERNESSES = (0.3, 1.0, 5.0, 20.0, 100.0)
CYLINDER_TILTS = (0.0, 10.0, 30.0, 45.0, 60.0, 80.0, 90.0)
# At 90 degrees the tangent is 1.6e16 in binary and Ra never reaches the transition.
KHAMIS_TRANSITIONS = tuple(
    body_formulas.al_arabi_khamis_transition(tilt) * side
    for tilt in CYLINDER_TILTS[:-1]
    for side in (1.0 - 1e-6, 1.0 + 1e-6)
)
SHORT_SLENDERNESSES = (0.05, 0.3, math.sqrt(math.pi / 4.0), 1.0, 2.0, 8.0)
ASPECTS = (1.0, 2.0, 5.0, 10.0, 40.0, 110.0)
CATTON_ASPECTS = (0.5, 1.0, 1.5, 2.0, 3.0, 5.0, 6.0, 9.0, 10.0, 12.0, 15.0, 40.0, 60.0, 110.0)
CATTON_TILTS = (0.0, 12.0, 25.0, 40.0, 53.0, 60.0, 67.0, 70.0, 80.0, 90.0, 120.0, 150.0, 180.0)
# The ends of the ranges of the automatic choice for the two ends of a tilted layer.
CHOICE_EDGES = (1708.0, 5830.0, 1e4, 1e6, 1e7, 2e7, 1e8, 1e9, 1e10)
LAYER_EDGES = (1708.0, 5830.0)
CHANNEL_ASPECTS = (1.0, 10.0, 300.0)
DIAMETER_RATIOS = product(diameter_ratio=(1.1, 2.0, 10.0))


def block(length, width, height):
    """The sides of a block over the square root of its total area."""
    scale = math.sqrt(2.0 * (length * width + width * height + height * length))
    return {
        "block_length": length / scale,
        "block_width": width / scale,
        "block_height": height / scale,
    }


CUBE = block(1.0, 1.0, 1.0)
BLOCKS = (
    CUBE,
    block(1.0, 1.0, 0.02),
    block(1.0, 1.0, 5.0),
    block(3.0, 1.0, 1.0),
    block(2.0, 0.5, 1.5),
    block(20.0, 1.0, 1.0),
    block(1.0, 0.02, 1.0),
)


def short_cylinder(nusselt, relative_tolerance=1e-9):
    return Method(
        nusselt,
        (1e-3, 1e12),
        shapes=product(slenderness=SHORT_SLENDERNESSES),
        relative_tolerance=relative_tolerance,
    )


def layer(nusselt):
    return Method(nusselt, (1e2, 1e11), edges=LAYER_EDGES)


def tilted_layer(nusselt, tilts):
    shapes = product(tilt=tilts, aspect=(12.0, 20.0, 110.0))
    return Method(nusselt, (1e2, 1e8), edges=LAYER_EDGES, shapes=shapes)


def cavity(nusselt, edges=()):
    return Method(nusselt, (1e2, 1e10), edges=edges, shapes=product(aspect=ASPECTS))


def concentric(nusselt):
    return Method(nusselt, (1.0, 1e7), shapes=DIAMETER_RATIOS)


def channel(nusselt, heated_walls):
    """`nusselt` takes E = Ra S/H and the number of heated walls."""
    return Method(
        lambda g: nusselt(g.rayleigh / g.aspect, g.heated_walls),
        (1e-2, 1e7),
        shapes=product(aspect=CHANNEL_ASPECTS, heated_walls=heated_walls),
    )


BODY_METHODS = {
    "inclined-cylinder-raithby-hollands": Method(
        body_formulas.inclined_cylinder_tilt_rule,
        (1.0, 1e12),
        prandtl=(0.01, 100.0),
        shapes=product(tilt=CYLINDER_TILTS, slenderness=SLENDERNESSES),
    ),
    "inclined-cylinder-al-arabi-khamis": Method(
        body_formulas.inclined_cylinder_al_arabi_khamis,
        (1e6, 1e12),
        edges=KHAMIS_TRANSITIONS,
        shapes=product(tilt=CYLINDER_TILTS, slenderness=SLENDERNESSES),
    ),
    "block-hassani-hollands": Method(
        body_formulas.block_hassani_hollands, (1e-3, 1e12), shapes=BLOCKS
    ),
    "block-yovanovich": Method(body_formulas.block_yovanovich, (1e-3, 1e12), shapes=BLOCKS),
    "upright-short-cylinder-hassani-hollands": short_cylinder(
        body_formulas.upright_short_cylinder_hassani_hollands
    ),
    "upright-short-cylinder-yovanovich": short_cylinder(
        body_formulas.upright_short_cylinder_yovanovich
    ),
    "lying-short-cylinder-hassani-hollands": short_cylinder(
        body_formulas.lying_short_cylinder_hassani_hollands, TABULATED
    ),
    "lying-short-cylinder-yovanovich": short_cylinder(
        body_formulas.lying_short_cylinder_yovanovich
    ),
    "horizontal-layer-hollands-raithby-konicek": layer(
        closed_formulas.layer_hollands_raithby_konicek
    ),
    "horizontal-layer-hollands": layer(closed_formulas.layer_hollands),
    "horizontal-layer-globe-dropkin": layer(closed_formulas.layer_globe_dropkin),
    "horizontal-layer-en673": layer(closed_formulas.layer_en673),
    # Heated from above nothing moves.
    "horizontal-layer-conduction": layer(lambda _: 1.0),
    "tilted-layer-hollands-unny-raithby-konicek": tilted_layer(
        closed_formulas.tilted_hollands_unny_raithby_konicek, (0.0, 15.0, 30.0, 45.0, 60.0, 65.0)
    ),
    "tilted-layer-elsherbiny": tilted_layer(
        closed_formulas.tilted_elsherbiny, (60.0, 65.0, 75.0, 89.0, 90.0)
    ),
    "tilted-layer-catton": Method(
        closed_formulas.tilted_catton,
        (1e2, 1e10),
        edges=CHOICE_EDGES,
        shapes=product(tilt=CATTON_TILTS, aspect=CATTON_ASPECTS),
    ),
    "tilted-layer-en673": tilted_layer(
        closed_formulas.tilted_en673, (0.0, 20.0, 45.0, 60.0, 80.0, 90.0)
    ),
    "vertical-cavity-elsherbiny": cavity(closed_formulas.cavity_elsherbiny),
    "vertical-cavity-berkovsky-polevikov": cavity(closed_formulas.cavity_berkovsky_polevikov),
    "vertical-cavity-catton": cavity(closed_formulas.cavity_catton),
    "vertical-cavity-macgregor-emery-turbulent": cavity(
        closed_formulas.cavity_macgregor_emery_turbulent
    ),
    "vertical-cavity-macgregor-emery": cavity(closed_formulas.cavity_macgregor_emery),
    "vertical-cavity-wright": cavity(closed_formulas.cavity_wright, edges=(1e4, 5e4)),
    "vertical-cavity-en673": cavity(closed_formulas.cavity_en673),
    "concentric-cylinders-raithby-hollands": concentric(closed_formulas.concentric_cylinders),
    "concentric-spheres-raithby-hollands": concentric(closed_formulas.concentric_spheres),
    "parallel-plates-bar-cohen-rohsenow": channel(channel_formulas.channel_isothermal, (2, 1)),
    "parallel-plates-elenbaas": channel(
        lambda channel, _: channel_formulas.channel_elenbaas(channel), (2,)
    ),
    "parallel-plates-bar-cohen-rohsenow-uniform-flux": channel(
        channel_formulas.channel_uniform_flux, (2, 1)
    ),
}
