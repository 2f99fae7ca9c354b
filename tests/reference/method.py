"""What the catalogues list: a formula with the span over which it is compared."""

import itertools
from collections.abc import Callable
from dataclasses import dataclass

from formulas import Groups

# A surface average is tabulated on the Rust side, and integrated here.
TABULATED = 1e-6


@dataclass(frozen=True)
class Method:
    """A formula with the span of Ra and Pr over which it is compared.

    `edges` are the Ra at which a banded formula changes; the edge belongs to the band below.
    `shapes` are the other groups asked for, see `product`. `relative_tolerance` is 1e-9 for
    closed formulas.
    """

    nusselt: Callable[[Groups], float]
    rayleigh: tuple[float, float]
    prandtl: tuple[float, float] = (0.01, 1e4)
    edges: tuple[float, ...] = ()
    shapes: tuple[dict[str, float], ...] = ({},)
    relative_tolerance: float = 1e-9


def product(**axes):
    """Every combination of the values of the groups named."""
    return tuple(
        dict(zip(axes, values, strict=True)) for values in itertools.product(*axes.values())
    )
