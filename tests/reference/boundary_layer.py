"""Laminar free-convection boundary layer on a round body, marched from its lowest point.

With x from the lowest point in radii, eta = Gr_a^(1/4) y/a, u proportional to x f':

    f''' + a f f'' - f'^2 + s theta = x (f' f'_x - f'' f_x)
    theta'' / Pr + a f theta'       = x (f' theta_x - theta' f_x)

a = 1 on a cylinder (Merkin 1976, ASME paper 76-HT-16, cited from memory), 1 + x cot x on a
sphere; s = sin x / x. Chebyshev collocation across the layer, second-order backward
differences along it. With the right-hand sides zero the same collocation solves the
families of `similarity`, by a method that shares nothing with the one used there.
"""

from dataclasses import dataclass

import numpy
from scipy.integrate import simpson

import chebyshev
import similarity

NODES = 100


class Grid:
    """Chebyshev points on 0-edge, half of them within `scale`; derivatives and integral."""

    def __init__(self, edge, scale, nodes=NODES):
        points, derivative = chebyshev.points_and_derivative(nodes)
        far = 1.0 + 2.0 * scale / edge
        self.eta = scale * (1.0 + points) / (far - points)
        self.first = derivative * ((far - points) ** 2 / (scale * (1.0 + far)))[:, None]
        self.second = self.first @ self.first
        anchored = self.first.copy()
        anchored[0] = 0.0
        anchored[0, 0] = 1.0
        self.integral = numpy.linalg.inv(anchored)
        self.integral[:, 0] = 0.0


@dataclass(frozen=True)
class State:
    """f, f' and theta at the points of a grid."""

    stream: numpy.ndarray
    speed: numpy.ndarray
    theta: numpy.ndarray

    def combined(self, own, other, others):
        return State(
            own * self.stream + others * other.stream,
            own * self.speed + others * other.speed,
            own * self.theta + others * other.theta,
        )


def station(grid, family, prandtl, start, drive=1.0, rate=0.0, history=None):
    """Newton's method for one station, where x u_x is `rate` u + `history`."""
    size = len(grid.eta)
    zero = numpy.zeros(size)
    history = history or State(zero, zero, zero)
    entrainment, inertia = family.entrainment + rate, family.inertia + rate
    growth = family.wall_growth + rate
    speed, theta = start.speed.copy(), start.theta.copy()
    for _ in range(40):
        stream = grid.integral @ speed
        carried = entrainment * stream + history.stream
        shear, flux = grid.first @ speed, grid.first @ theta
        residual = numpy.concatenate(
            [
                grid.second @ speed
                + carried * shear
                - inertia * speed**2
                - history.speed * speed
                + drive * theta,
                grid.second @ theta
                + prandtl * (carried * flux - growth * speed * theta - speed * history.theta),
            ]
        )
        along = grid.second + carried[:, None] * grid.first
        swept = entrainment * grid.integral
        jacobian = numpy.block(
            [
                [
                    along
                    + shear[:, None] * swept
                    - numpy.diag(2.0 * inertia * speed + history.speed),
                    drive * numpy.eye(size),
                ],
                [
                    prandtl * (flux[:, None] * swept - numpy.diag(growth * theta + history.theta)),
                    grid.second
                    + prandtl * (carried[:, None] * grid.first - numpy.diag(growth * speed)),
                ],
            ]
        )
        for row, value in (
            (0, speed[0]),
            (size - 1, speed[-1]),
            (size, theta[0] - 1.0),
            (2 * size - 1, theta[-1]),
        ):
            jacobian[row] = 0.0
            jacobian[row, row] = 1.0
            residual[row] = value
        change = numpy.linalg.solve(jacobian, -residual)
        speed, theta = speed + change[:size], theta + change[size:]
        if numpy.abs(change).max() < 1e-9:
            return State(grid.integral @ speed, speed, theta)
    raise ArithmeticError(f"no convergence at Pr {prandtl}, drive {drive}")


def starting_layer(family, prandtl, widening=1.0, nodes=NODES):
    """Grid and state of a family, from `similarity` as first guess, solved again here."""
    layer = similarity.solve(family, prandtl)
    edge = widening * layer.edge
    grid = Grid(edge, 0.5 * numpy.sqrt(edge / layer.wall_gradient), nodes)
    profile = layer.profile(numpy.minimum(grid.eta, layer.edge))
    return grid, station(grid, family, prandtl, State(profile[0], profile[1], profile[3]))


def wall_gradient(grid, state):
    return -(grid.first @ state.theta)[0]


def similarity_gradient(family, prandtl):
    """-theta'(0) of a family by collocation on one Chebyshev grid."""
    return wall_gradient(*starting_layer(family, prandtl))


def behind(state, before, per_step):
    """x u_x as `rate` u + `history`, and a first guess, from the one or two stations behind.

    `per_step` is x over the step.
    """
    if before is None:
        return per_step, state.combined(-per_step, state, 0.0), state
    history = state.combined(-2.0 * per_step, before, 0.5 * per_step)
    return 1.5 * per_step, history, state.combined(2.0, before, -1.0)


def march(body, prandtl, last, steps, widening=1.5):
    """Stations x and local -theta'(0) from the lowest point to `last`."""
    sphere = body == "sphere"
    stagnation = similarity.SPHERE_STAGNATION if sphere else similarity.CYLINDER_STAGNATION
    grid, state = starting_layer(stagnation, prandtl, widening)
    stations = numpy.linspace(0.0, last, steps + 1)
    gradients, before = [wall_gradient(grid, state)], None
    for x in stations[1:]:
        entrainment = 1.0 + x / numpy.tan(x) if sphere else 1.0
        family = similarity.Family(entrainment, 1.0, 0.0)
        rate, history, guess = behind(state, before, x / stations[1])
        drive = numpy.sin(x) / x
        state, before = station(grid, family, prandtl, guess, drive, rate, history), state
        gradients.append(wall_gradient(grid, state))
    return stations, numpy.array(gradients)


def cylinder_coefficient(prandtl, steps=120, widening=1.5):
    """Mean Nu_D / Ra_D^(1/4) of the isothermal horizontal cylinder, over its whole girth."""
    stations, gradients = march("cylinder", prandtl, numpy.pi, steps, widening)
    return (2.0 / prandtl) ** 0.25 * simpson(gradients, x=stations) / numpy.pi


def sphere_coefficient(prandtl, steps=120, widening=1.5):
    """Mean Nu_D / Ra_D^(1/4) of the isothermal sphere, and the half-width of its bracket.

    The layer leaves the sphere as a plume at the top, where the equations end. The march
    stops at 170 degrees; the cap left over, 0.8 % of the area, gives something between
    nothing and the last local value, of which the middle is taken.
    """
    last = numpy.radians(170.0)
    stations, gradients = march("sphere", prandtl, last, steps, widening)
    scale = (2.0 / prandtl) ** 0.25
    marched = simpson(gradients * numpy.sin(stations), x=stations) / 2.0
    cap = gradients[-1] * (1.0 + numpy.cos(last)) / 2.0
    return scale * (marched + cap / 2.0), scale * cap / 2.0
