"""Laminar free-convection boundary layers that reduce to ordinary differential equations.

    f''' + a f f'' - b f'^2 + theta = 0,    theta'' + Pr (a f theta' - c f' theta) = 0
    f = f' = 0, theta = 1 at the wall;      f' = theta = 0 far away

solved by collocation on an adaptive mesh. The layer's outer edge is placed where the slower
of its two exponential tails has fallen to 1e-15, so it follows Pr by itself.
"""

from dataclasses import dataclass
from functools import cache

import numpy
from scipy.integrate import solve_bvp


@dataclass(frozen=True)
class Family:
    """The coefficients a, b, c above."""

    entrainment: float
    inertia: float
    wall_growth: float


def power_law_wall(exponent):
    """Vertical plate whose dT grows as x^n, eta = (Gr_x/4)^(1/4) y/x.

    Ostrach 1953, NACA Report 1111 (n = 0); Sparrow & Gregg 1958, Trans. ASME 80, 379-386.
    """
    return Family(3.0 + exponent, 2.0 + 2.0 * exponent, 4.0 * exponent)


ISOTHERMAL_PLATE = power_law_wall(0.0)
# Uniform heat flux: Nu_x grows as (x^3 dT)^(1/4), so dT/x (x^3 dT)^(1/4) is constant for n = 1/5.
# The same problem as Sparrow & Gregg 1956, Trans. ASME 78, 435-440, in other variables.
UNIFORM_FLUX_PLATE = power_law_wall(0.2)
# Lowest point of a round body of radius a, eta = Gr_a^(1/4) y/a.
CYLINDER_STAGNATION = Family(1.0, 1.0, 0.0)
SPHERE_STAGNATION = Family(2.0, 1.0, 0.0)

TAIL = -numpy.log(1e-15)


@dataclass(frozen=True)
class Layer:
    """A solved layer: `profile(eta)` gives f, f', f'', theta, theta'."""

    profile: object
    edge: float
    wall_gradient: float

    def decay_rate(self, family, prandtl):
        """Slower rate of the two exponential tails, a f(inf) and Pr a f(inf)."""
        return family.entrainment * self.profile(self.edge)[0] * min(1.0, prandtl)


def _solve(family, prandtl, edge, guess, tolerance):
    """One solution on [0, edge]; the mesh runs over 0-1 so that the edge can be moved."""

    def slopes(_, y):
        stream, speed, shear, theta, flux = y
        momentum = -family.entrainment * stream * shear + family.inertia * speed**2 - theta
        energy = prandtl * (family.wall_growth * speed * theta - family.entrainment * stream * flux)
        return edge * numpy.vstack([speed, shear, momentum, flux, energy])

    def ends(wall, far):
        return numpy.array([wall[0], wall[1], wall[3] - 1.0, far[1], far[3]])

    mesh = numpy.linspace(0.0, 1.0, 400) ** 2
    found = solve_bvp(slopes, ends, mesh, guess(mesh * edge), tol=tolerance, max_nodes=100_000)
    if not found.success:
        raise ArithmeticError(f"Pr {prandtl}: {found.message}")
    return Layer(lambda eta: found.sol(numpy.asarray(eta) / edge), edge, -found.sol(0.0)[4])


def _held_beyond(layer):
    """The profile as a first guess on a wider or narrower layer."""
    return lambda eta: layer.profile(numpy.minimum(eta, layer.edge))


def _rough_guess(eta):
    decay = numpy.exp(-0.6 * eta)
    return numpy.vstack(
        [0.5 * (1.0 - decay) ** 2, eta * decay / 3.0, 0.6 * decay, decay, -0.6 * decay]
    )


@cache
def solve(family, prandtl, tolerance=1e-8):
    """The layer at one Pr, reached from Pr = 1 in steps of at most a factor of two."""
    layer = _solve(family, 1.0, 12.0, _rough_guess, 1e-4)
    steps = max(1, int(numpy.ceil(abs(numpy.log2(prandtl)))))
    for step in range(1, steps + 1):
        current = prandtl ** (step / steps)
        edge = TAIL / layer.decay_rate(family, current)
        layer = _solve(family, current, edge, _held_beyond(layer), 1e-4)
    edge = TAIL / layer.decay_rate(family, prandtl)
    return _solve(family, prandtl, edge, _held_beyond(layer), tolerance)


def isothermal_coefficient(prandtl):
    """Mean Nu_H / Ra_H^(1/4) of the isothermal vertical plate."""
    gradient = solve(ISOTHERMAL_PLATE, prandtl).wall_gradient
    return 4.0 / 3.0 * gradient / (4.0 * prandtl) ** 0.25


def uniform_flux_coefficient(prandtl):
    """Nu_H / Ra_H^(1/4) at uniform flux, both on the height and on dT at mid-height."""
    gradient = solve(UNIFORM_FLUX_PLATE, prandtl).wall_gradient
    return 2.0 * gradient / (32.0 * prandtl) ** 0.25


def uniform_flux_local(prandtl):
    """Nu_x / Ra*_x^(1/5) at uniform flux."""
    gradient = solve(UNIFORM_FLUX_PLATE, prandtl).wall_gradient
    return (gradient / (4.0 * prandtl) ** 0.25) ** 0.8
