"""Steady flow between a warm and a cold wall, periodic along them: rolls and crescents.

Rolls lie in a level layer warm from below; a pair of crescents fills the gap between lying
concentric cylinders, the inner one warm. With lengths in gaps, temperatures from cold 0 to
warm 1 and velocities in diffusivities over the gap, the equations of `cavity` in coordinates
of a strip, z across it from the warm wall and x along it, are

    lap w     = (psi_x w_z - psi_z w_x) / Pr - Ra (h_z theta_x - h_x theta_z)
    lap psi   = m w
    lap theta = psi_x theta_z - psi_z theta_x

with the height h and the square m of the map's scale. In the layer h = z and m = 1. In the
annulus z = ln r and x is the angle from the top, so that h = r cos x and m = r^2: the
equations in polar coordinates (Kuehn & Goldstein 1976, J. Fluid Mech. 74, 695-719), mapped
anew. psi and its slope are zero on both walls. Newton's method on Chebyshev points across and
on sines of psi and cosines of theta along the strip, from where the fluid rises to where it
sinks; two-dimensional, properties constant but in the buoyancy.
"""

import math
from dataclasses import dataclass

import numpy

import chebyshev


@dataclass(frozen=True)
class Flow:
    """Nu, the k_eff/k, at the warm wall and in the middle, which agree as the points suffice."""

    stream: numpy.ndarray
    warmth: numpy.ndarray
    nusselt: float
    nusselt_middle: float


def midpoints_and_derivatives(count):
    """Points from 0 to pi; first and second derivative there of sums of sines and of cosines."""
    x = numpy.pi * (numpy.arange(count) + 0.5) / count
    sine_orders, cosine_orders = numpy.arange(1, count + 1), numpy.arange(count)
    sine_angles, cosine_angles = numpy.outer(x, sine_orders), numpy.outer(x, cosine_orders)
    sine_sums = numpy.linalg.inv(numpy.sin(sine_angles))
    cosine_sums = numpy.linalg.inv(numpy.cos(cosine_angles))
    of_sines = (
        numpy.cos(sine_angles) * sine_orders @ sine_sums,
        -numpy.sin(sine_angles) * sine_orders**2 @ sine_sums,
    )
    of_cosines = (
        -numpy.sin(cosine_angles) * cosine_orders @ cosine_sums,
        -numpy.cos(cosine_angles) * cosine_orders**2 @ cosine_sums,
    )
    return x, of_sines, of_cosines


class Strip:
    """The operators for one map, whose m grows as exp(`growth` z); `across` is even.

    `warmth` is theta less conduction's, which is linear in z. `swirl_x`, `swirl_z` and
    `swirl_lap` make m w_x, m w_z and m lap w of psi. A kind of strip adds m h_x and m h_z as
    `height_x` and `height_z`, and the guess that `ladder` starts from.
    """

    def __init__(self, width, wavenumber, growth, along, across):
        self.width, self.along, self.across = width, along, across
        # Points run from -1 to 1 across the strip and from 0 to pi along half a wave.
        rate = 2.0 / width
        z1, z2, z3, z4 = (
            rate ** (order + 1) * matrix
            for order, matrix in enumerate(chebyshev.clamped_derivatives(across))
        )
        x, (x1, x2), (warm_x1, warm_x2) = midpoints_and_derivatives(along)
        x1, x2 = wavenumber * x1, wavenumber**2 * x2
        warm_x1, warm_x2 = wavenumber * warm_x1, wavenumber**2 * warm_x2
        one_x, one_z = numpy.eye(along), numpy.eye(across - 1)
        self.stream_x, self.stream_z = numpy.kron(one_z, x1), numpy.kron(z1, one_x)
        lap = numpy.kron(z2, one_x) + numpy.kron(one_z, x2)
        lap_z = numpy.kron(z3, one_x) + numpy.kron(z1, x2)
        lap_lap = numpy.kron(z4, one_x) + 2.0 * numpy.kron(z2, x2) + numpy.kron(one_z, x2 @ x2)
        self.swirl_x = numpy.kron(z2, x1) + numpy.kron(one_z, x1 @ x2)
        self.swirl_z = lap_z - growth * lap
        self.swirl_lap = lap_lap - 2.0 * growth * lap_z + growth**2 * lap

        points, free = chebyshev.points_and_derivative(across)
        inner = slice(1, -1)
        self.free_z = rate * free[:, inner]
        second_z = (rate**2 * free @ free)[inner, inner]
        self.warm_x = numpy.kron(one_z, warm_x1)
        self.warm_z = numpy.kron(self.free_z[inner], one_x)
        self.warm_lap = numpy.kron(second_z, one_x) + numpy.kron(one_z, warm_x2)
        self.z = numpy.repeat((points[inner] + 1.0) / rate, along)
        self.x = numpy.tile(x, across - 1)

    def solve(self, rayleigh, prandtl, stream, warmth):
        """The flow that Newton's method reaches from a stream and a warmth."""
        unknowns = len(stream)
        for _ in range(20):
            rise, minus_drift = self.stream_x @ stream, self.stream_z @ stream
            swirl_x, swirl_z = self.swirl_x @ stream, self.swirl_z @ stream
            slope_x, slope_z = self.warm_x @ warmth, self.warm_z @ warmth - 1.0 / self.width
            residual = numpy.concatenate(
                [
                    self.swirl_lap @ stream
                    - (rise * swirl_z - minus_drift * swirl_x) / prandtl
                    + rayleigh * (self.height_z * slope_x - self.height_x * slope_z),
                    self.warm_lap @ warmth - rise * slope_z + minus_drift * slope_x,
                ]
            )
            inertia = (
                rise[:, None] * self.swirl_z
                + swirl_z[:, None] * self.stream_x
                - minus_drift[:, None] * self.swirl_x
                - swirl_x[:, None] * self.stream_z
            )
            buoyancy = self.height_z[:, None] * self.warm_x - self.height_x[:, None] * self.warm_z
            swept = slope_x[:, None] * self.stream_z - slope_z[:, None] * self.stream_x
            carried = (
                self.warm_lap - rise[:, None] * self.warm_z + minus_drift[:, None] * self.warm_x
            )
            jacobian = numpy.block(
                [[self.swirl_lap - inertia / prandtl, rayleigh * buoyancy], [swept, carried]]
            )
            change = numpy.linalg.solve(jacobian, -residual)
            stream, warmth = stream + change[:unknowns], warmth + change[unknowns:]
            if numpy.abs(change[unknowns:]).max() < 1e-9:
                return self._flow(stream, warmth)
        raise ArithmeticError(f"no convergence at Ra {rayleigh:g}, Pr {prandtl:g}")

    def ladder(self, prandtl, rayleighs):
        """The flow at each Ra, reached from the one before by factors of at most two."""
        flows, reached, (stream, warmth) = [], rayleighs[0], self.guess()
        for rayleigh in rayleighs:
            steps = max(1, math.ceil(abs(math.log2(rayleigh / reached))))
            for step in numpy.geomspace(reached, rayleigh, steps + 1)[1:]:
                flow = self.solve(step, prandtl, stream, warmth)
                stream, warmth = flow.stream, flow.warmth
            reached = rayleigh
            flows.append(flow)
        return flows

    def _flow(self, stream, warmth):
        rows = warmth.reshape(self.across - 1, self.along)
        means = rows.mean(axis=1)
        middle = self.across // 2
        rise = (self.stream_x @ stream).reshape(rows.shape)[middle - 1]
        carried = (rise * rows[middle - 1]).mean()
        wall, through = 1.0 - self.width * (self.free_z[[0, middle]] @ means)
        return Flow(stream, warmth, float(wall), float(through + self.width * carried))


class Layer(Strip):
    """A level layer of rolls; a wave is two of them."""

    def __init__(self, wavenumber, along, across):
        super().__init__(1.0, wavenumber, 0.0, along, across)
        self.height_x, self.height_z = numpy.zeros(self.x.shape), numpy.ones(self.x.shape)

    def guess(self):
        """A roll of about the strength that it has at one and a half times the onset's Ra."""
        arch = numpy.sin(numpy.pi * self.z)
        return 8.0 * arch**2 * numpy.sin(self.x), 0.15 * arch * numpy.cos(self.x)


class Annulus(Strip):
    """The gap between lying concentric cylinders of a given ratio of diameters."""

    def __init__(self, diameter_ratio, along, across):
        super().__init__(numpy.log(diameter_ratio), 1.0, 2.0, along, across)
        radius = numpy.exp(self.z) / (diameter_ratio - 1.0)
        self.height_x = -(radius**3) * numpy.sin(self.x)
        self.height_z = radius**3 * numpy.cos(self.x)

    def guess(self):
        """Still."""
        return numpy.zeros(self.x.shape), numpy.zeros(self.x.shape)
