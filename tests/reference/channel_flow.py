"""Laminar flow drawn up between two isothermal plates, marched from the inlet.

With y in spacings S, x in S Gr and velocities in nu Gr/S and nu/S:

    U U_X + V U_Y = -P_X + U_YY + theta,    U theta_X + V theta_Y = theta_YY / Pr

the integral of U over the spacing is the draught Q, and the channel ends where the pressure
is the ambient's again (Bodoia & Osterle 1962, J. Heat Transfer 84, 40-44). There E = Pr/X.
Second-order differences across the half channel, closer at the wall; implicit along it, the
steps growing from the inlet.
"""

from dataclasses import dataclass

import numpy
from scipy.linalg import solve_banded


@dataclass(frozen=True)
class Channel:
    """E = Ra S/H of the channel that draws a given flow, and its mean Nu, wall minus inlet."""

    channel: float
    nusselt: float


class HalfChannel:
    """Points from the wall to the middle, and central differences there, banded."""

    def __init__(self, points):
        self.y = 0.5 * (1.0 - numpy.cos(numpy.linspace(0.0, numpy.pi / 2.0, points + 1)))
        below, above = numpy.diff(self.y)[:-1], numpy.diff(self.y)[1:]
        both = below + above
        self.first = (
            -above / (below * both),
            (above - below) / (below * above),
            below / (above * both),
        )
        self.second = 2.0 / (below * both), -2.0 / (below * above), 2.0 / (above * both)
        self.step = self.y[-1] - self.y[-2]
        # The slope at the wall from the parabola through its three points.
        near, far = self.y[1], self.y[2]
        self.wall = far / (near * (far - near)), -near / (far * (far - near))

    def implicit(self, along, across, diffusivity):
        """Bands of `along` f + `across` f_Y - `diffusivity` f_YY; f given at the wall, even."""
        bands = numpy.zeros((3, len(self.y)))
        bands[1, 0] = 1.0
        lower, middle, upper = (
            across[1:-1] * one - diffusivity * two
            for one, two in zip(self.first, self.second, strict=True)
        )
        bands[2, :-2], bands[1, 1:-1], bands[0, 2:] = lower, along[1:-1] + middle, upper
        mirrored = 2.0 * diffusivity / self.step**2
        bands[1, -1], bands[2, -2] = along[-1] + mirrored, -mirrored
        return bands

    def mean(self, values):
        """Over the spacing."""
        return 2.0 * numpy.trapezoid(values, self.y)

    def slope_at_wall(self, values):
        near, far = self.wall
        return near * (values[1] - values[0]) + far * (values[2] - values[0])


def drawn(flow, prandtl, points=80, growth=1.03, inlet_loss=0.0):
    """The channel that draws Q = `flow`; the pressure starts at -`inlet_loss` Q^2."""
    half = HalfChannel(points)
    speed = numpy.full(points + 1, flow)
    speed[0] = 0.0
    speed *= flow / half.mean(speed)
    theta, across = numpy.zeros(points + 1), numpy.zeros(points + 1)
    theta[0] = 1.0
    pressure, reached, heat = -inlet_loss * flow**2, 0.0, 0.0
    step = 1e-7 * flow
    while reached < 1e3:
        new_speed, new_across = speed, across
        for _ in range(3):
            along = new_speed / step
            source = along * theta
            source[0] = 1.0
            bands = half.implicit(along, new_across, 1.0 / prandtl)
            new_theta = solve_banded((1, 1), bands, source)
            source = along * speed + new_theta
            push = numpy.full(points + 1, 1.0 / step)
            source[0] = push[0] = 0.0
            bands = half.implicit(along, new_across, 1.0)
            free, pushed = solve_banded((1, 1), bands, numpy.column_stack([source, push])).T
            change = (half.mean(free) - flow) / half.mean(pushed)
            new_speed = free - change * pushed
            widening = (new_speed - speed) / step
            inner = 0.5 * (widening[1:] + widening[:-1]) * numpy.diff(half.y)
            new_across = -numpy.concatenate([[0.0], numpy.cumsum(inner)])
        before = pressure
        pressure += change
        flux = -half.slope_at_wall(new_theta)
        if before < 0.0 <= pressure:
            part = float(before / (before - pressure))
            end = reached + part * step
            return Channel(prandtl / end, float(heat + flux * part * step) / end)
        reached, heat = reached + step, heat + flux * step
        speed, theta, across = new_speed, new_theta, new_across
        step *= growth
    raise ArithmeticError(f"the pressure does not return to the ambient's at Q {flow}")
