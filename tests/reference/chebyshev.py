"""Collocation on Chebyshev points (Trefethen 2000, Spectral Methods in MATLAB)."""

import numpy


def points_and_derivative(intervals):
    """The points from -1 to 1 and the matrix that differentiates a polynomial given there."""
    points = -numpy.cos(numpy.pi * numpy.arange(intervals + 1) / intervals)
    weights = (-1.0) ** numpy.arange(intervals + 1)
    weights[[0, -1]] *= 0.5
    gap = points[:, None] - points[None, :] + numpy.eye(intervals + 1)
    derivative = weights[None, :] / weights[:, None] / gap
    numpy.fill_diagonal(derivative, 0.0)
    numpy.fill_diagonal(derivative, -derivative.sum(axis=1))
    return points, derivative


def quadrature(intervals):
    """Weights of the integral from -1 to 1 (Clenshaw & Curtis), from that of each T_n."""
    order = numpy.arange(intervals + 1)
    even = order % 2 == 0
    moments = numpy.where(even, 2.0, 0.0) / numpy.where(even, 1.0 - order**2, 1.0)
    return numpy.linalg.solve(numpy.cos(numpy.pi * numpy.outer(order, order) / intervals), moments)


def clamped_derivatives(intervals):
    """First to fourth derivative, at the inner points, of a function of the values there.

    The function and its slope are zero at both ends: it is (1 - s^2) q with q zero there.
    """
    points, first = points_and_derivative(intervals)
    q1 = first
    q2 = q1 @ first
    q3 = q2 @ first
    q4 = q3 @ first
    s, slack = points[:, None], 1.0 - points[:, None] ** 2
    products = (
        slack * q1 - 2.0 * s * numpy.eye(intervals + 1),
        slack * q2 - 4.0 * s * q1 - 2.0 * numpy.eye(intervals + 1),
        slack * q3 - 6.0 * s * q2 - 6.0 * q1,
        slack * q4 - 8.0 * s * q3 - 12.0 * q2,
    )
    inner = slice(1, -1)
    return [product[inner, inner] / slack[inner, 0] for product in products]
