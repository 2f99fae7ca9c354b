"""Steady flow in a cavity with one hot and one cold upright side, level sides insulated.

With lengths in gaps, temperatures from cold 0 to hot 1 and velocities in diffusivities over
the gap, u = psi_y and v = -psi_x:

    lap lap psi = Ra theta_x + (u lap psi_x + v lap psi_y) / Pr
    lap theta   = u theta_x + v theta_y

psi and its slope are zero on every wall. Newton's method on Chebyshev points in both
directions; two-dimensional, properties constant but in the buoyancy.
"""

from dataclasses import dataclass

import numpy

import chebyshev


@dataclass(frozen=True)
class Flow:
    """Nu across the hot side and across the middle, which agree as the points suffice."""

    stream: numpy.ndarray
    warmth: numpy.ndarray
    nusselt: float
    nusselt_middle: float


class Cavity:
    """The operators for one aspect; `across` is even. `warmth` is theta less conduction's."""

    def __init__(self, aspect, across, upward):
        self.across, self.upward = across, upward
        # Points run from -1 to 1 across the gap and up the height.
        rates = 2.0, 2.0 / aspect
        x1, x2, x3, x4 = (
            rates[0] ** (order + 1) * matrix
            for order, matrix in enumerate(chebyshev.clamped_derivatives(across))
        )
        y1, y2, y3, y4 = (
            rates[1] ** (order + 1) * matrix
            for order, matrix in enumerate(chebyshev.clamped_derivatives(upward))
        )
        one_x, one_y = numpy.eye(across - 1), numpy.eye(upward - 1)
        self.up, self.right = numpy.kron(one_x, y1), numpy.kron(x1, one_y)
        self.lap_x = numpy.kron(x3, one_y) + numpy.kron(x1, y2)
        self.lap_y = numpy.kron(x2, y1) + numpy.kron(one_x, y3)
        self.lap_lap = numpy.kron(x4, one_y) + 2.0 * numpy.kron(x2, y2) + numpy.kron(one_x, y4)

        self.points, free_x = chebyshev.points_and_derivative(across)
        _, free_y = chebyshev.points_and_derivative(upward)
        free_x, free_y = rates[0] * free_x, rates[1] * free_y
        inner = slice(1, -1)
        self.free_x = free_x[:, inner]
        between_ends = numpy.eye(upward + 1)[inner]
        second_x, second_y = (free_x @ free_x)[inner, inner], (free_y @ free_y)[inner]
        self.warm_x = numpy.kron(free_x[inner, inner], between_ends)
        self.warm_y = numpy.kron(one_x, free_y[inner])
        self.warm_lap = numpy.kron(second_x, between_ends) + numpy.kron(one_x, second_y)
        self.insulated = numpy.kron(one_x, free_y[[0, -1]])
        self.mean = chebyshev.quadrature(upward) / 2.0

    def solve(self, rayleigh, prandtl, start=None):
        inner_points = (self.across - 1) * (self.upward - 1)
        stream = start.stream if start else numpy.zeros(inner_points)
        warmth = start.warmth if start else numpy.zeros((self.across - 1) * (self.upward + 1))
        for _ in range(20):
            u, minus_v = self.up @ stream, self.right @ stream
            swirl_x, swirl_y = self.lap_x @ stream, self.lap_y @ stream
            slope_x, slope_y = self.warm_x @ warmth - 1.0, self.warm_y @ warmth
            residual = numpy.concatenate(
                [
                    self.lap_lap @ stream
                    - rayleigh * slope_x
                    - (u * swirl_x - minus_v * swirl_y) / prandtl,
                    self.warm_lap @ warmth - u * slope_x + minus_v * slope_y,
                    self.insulated @ warmth,
                ]
            )
            inertia = (
                u[:, None] * self.lap_x
                + swirl_x[:, None] * self.up
                - minus_v[:, None] * self.lap_y
                - swirl_y[:, None] * self.right
            )
            swept = slope_y[:, None] * self.right - slope_x[:, None] * self.up
            carried = self.warm_lap - u[:, None] * self.warm_x + minus_v[:, None] * self.warm_y
            jacobian = numpy.block(
                [
                    [self.lap_lap - inertia / prandtl, -rayleigh * self.warm_x],
                    [swept, carried],
                    [numpy.zeros((len(self.insulated), inner_points)), self.insulated],
                ]
            )
            change = numpy.linalg.solve(jacobian, -residual)
            stream, warmth = stream + change[:inner_points], warmth + change[inner_points:]
            if numpy.abs(change[inner_points:]).max() < 1e-9:
                return self._flow(stream, warmth)
        raise ArithmeticError(f"no convergence at Ra {rayleigh:g}, Pr {prandtl:g}")

    def _flow(self, stream, warmth):
        columns = warmth.reshape(self.across - 1, self.upward + 1)
        wall = 1.0 - self.mean @ (self.free_x[0] @ columns)
        middle = self.across // 2
        u = (self.up @ stream).reshape(self.across - 1, self.upward - 1)[middle - 1]
        theta = columns[middle - 1] + (1.0 - self.points[middle]) / 2.0
        carried = self.mean[1:-1] @ (u * theta[1:-1])
        through = 1.0 - self.mean @ (self.free_x[middle] @ columns)
        return Flow(stream, warmth, float(wall), float(carried + through))


def ladder(aspect, prandtl, rayleighs, across, upward):
    """The flow at each Ra, reached from the one before by steps of at most half a decade."""
    cavity = Cavity(aspect, across, upward)
    flows, flow, reached = [], None, 1e3
    for rayleigh in rayleighs:
        steps = max(1, round(2.0 * numpy.log10(rayleigh / reached)))
        for step in range(1, steps + 1):
            flow = cavity.solve(reached * (rayleigh / reached) ** (step / steps), prandtl, flow)
        reached = rayleigh
        flows.append(flow)
    return flows
