"""Conduction from an isothermal box into an unbounded medium, by a boundary-element method.

Nu = q sqrt(A)/(A k dT) is 4 pi C/sqrt(A) with the capacitance C of the box. The flux is taken
constant on rectangles that crowd towards the edges, where it is singular, and the potential
of each is the closed integral; it is one at the middle of every rectangle.
The three planes of symmetry leave an eighth of the surface to solve for.
"""

import itertools
import math

import numpy


def primitive(x, y, z):
    """Its difference over the corners of a rectangle is the integral of 1/r over it."""
    r = numpy.sqrt(x**2 + y**2 + z**2)
    height = numpy.abs(z)
    # The logarithms' arguments are positive: r exceeds -x and -y, or the corner is on an axis.
    near_x = numpy.where(x < 0.0, (y**2 + z**2) / numpy.maximum(r - x, 1e-300), x + r)
    near_y = numpy.where(y < 0.0, (x**2 + z**2) / numpy.maximum(r - y, 1e-300), y + r)
    parts = x * numpy.log(numpy.maximum(near_y, 1e-300))
    parts += y * numpy.log(numpy.maximum(near_x, 1e-300))
    return parts - height * numpy.arctan2(x * y, height * r)


def rectangle_potential(points, low, high, level, axis):
    """Integral of 1/r at `points` over the rectangles at `level` along `axis`.

    `low` and `high` are the corners in the two other axes; one row a point, one column a
    rectangle.
    """
    across = [other for other in range(3) if other != axis]
    z = (points[:, axis] - level)[:, None]
    total = 0.0
    for first, second in itertools.product((low, high), repeat=2):
        x = first[None, :, 0] - points[:, None, across[0]]
        y = second[None, :, 1] - points[:, None, across[1]]
        sign = 1.0 if first is second else -1.0
        total = total + sign * primitive(x, y, z)
    return total


def nusselt(length, width, height, panels):
    """Nu on the root of the area, with `panels` along each half side."""
    half = numpy.array([length, width, height]) / 2.0
    # From the middle, where the slope of the sine is one, to the edge, where it is zero.
    fractions = numpy.sin(numpy.linspace(0.0, math.pi / 2.0, panels + 1))
    faces = []
    for axis in range(3):
        across = [other for other in range(3) if other != axis]
        u, v = (fractions * half[other] for other in across)
        low = numpy.array(list(itertools.product(u[:-1], v[:-1])))
        high = numpy.array(list(itertools.product(u[1:], v[1:])))
        middles = numpy.zeros((len(low), 3))
        middles[:, across] = (low + high) / 2.0
        middles[:, axis] = half[axis]
        faces.append((axis, low, high, middles))
    points = numpy.concatenate([middles for *_, middles in faces])
    columns = []
    for axis, low, high, _ in faces:
        column = 0.0
        for first, second, third in itertools.product((1.0, -1.0), repeat=3):
            mirror = numpy.array([first, second])
            corners = low * mirror, high * mirror
            lower, upper = numpy.minimum(*corners), numpy.maximum(*corners)
            column = column + rectangle_potential(points, lower, upper, third * half[axis], axis)
        columns.append(column)
    density = numpy.linalg.solve(numpy.concatenate(columns, axis=1), numpy.ones(len(points)))
    areas = numpy.concatenate([numpy.prod(high - low, axis=1) for _, low, high, _ in faces])
    total_area = 8.0 * areas.sum()
    return 4.0 * math.pi * 8.0 * (density @ areas) / math.sqrt(total_area)
