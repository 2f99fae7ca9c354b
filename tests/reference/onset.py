"""Onset of convection in a horizontal layer between two rigid, isothermal plates.

(D^2 - a^2)^2 W = Ra a^2 T, (D^2 - a^2) T = -W, with W, W' and T zero on both plates
(Pellew & Southwell 1940, Proc. R. Soc. A 176, 312-343). Critical Ra 1707.762 at a = 3.117
(Chandrasekhar 1961, Hydrodynamic and Hydromagnetic Stability, ch. 2).
"""

import numpy
from scipy.linalg import eigvals
from scipy.optimize import minimize_scalar

import chebyshev


def marginal_rayleigh(wavenumber, intervals):
    """The lowest Ra at which a pattern of this wavenumber neither grows nor dies."""
    # Points run from -1 to 1 across a gap of one.
    _, second, _, fourth = (
        2.0 ** (order + 1) * matrix
        for order, matrix in enumerate(chebyshev.clamped_derivatives(intervals))
    )
    _, first = chebyshev.points_and_derivative(intervals)
    free_second = 4.0 * (first @ first)[1:-1, 1:-1]
    one = numpy.eye(intervals - 1)
    square = wavenumber**2
    motion = fourth - 2.0 * square * second + square**2 * one
    conduction = free_second - square * one
    # W = Ra a^2 motion^-1 T and conduction T = -W: an eigenvalue 1/Ra for every mode.
    inverse = eigvals(-square * numpy.linalg.solve(conduction, numpy.linalg.inv(motion)))
    return 1.0 / float(inverse.real.max())


def critical(intervals=24):
    """Critical Ra and its wavenumber."""
    found = minimize_scalar(
        lambda wavenumber: marginal_rayleigh(wavenumber, intervals),
        bounds=(2.5, 3.7),
        method="bounded",
        options={"xatol": 1e-7},
    )
    return float(found.fun), float(found.x)
