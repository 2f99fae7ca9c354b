"""Laminar free-convection boundary layer on an isothermal vertical cylinder.

With x from the lower edge, eta = (Gr_x/4)^(1/4) (r^2 - a^2)/(2 a x) and the curvature
xi = 2 (x/a) (Gr_x/4)^(-1/4), so that r^2/a^2 = 1 + xi eta (Sparrow & Gregg 1956, Trans. ASME
78, 1823-1829, in these variables derived anew):

    ((1 + xi eta) f'')' + 3 f f'' - 2 f'^2 + theta = xi (f' f'_xi - f'' f_xi)
    ((1 + xi eta) theta')' / Pr + 3 f theta'       = xi (f' theta_xi - theta' f_xi)

marched in xi with the collocation of `boundary_layer`. At the upper edge xi is the
32^(1/2) Gr_H^(-1/4) H/D of Popiel, Wojtkowiak & Bober.
"""

import copy

import numpy
from scipy.interpolate import CubicSpline

import boundary_layer
from similarity import ISOTHERMAL_PLATE


def curved(grid, curvature):
    """The grid with the diffusion of a cylinder for its second derivative."""
    bent = copy.copy(grid)
    bent.second = (1.0 + curvature * grid.eta)[:, None] * grid.second + curvature * grid.first
    return bent


def march(prandtl, last, steps, widening, nodes):
    """Curvatures from 0 to `last` and the local -theta'(0) there.

    The layer's tail falls as a power of 1 + xi eta, so it is given far more room than that
    of the plate. Points too few for that room show as a temperature below the ambient's,
    which grows from step to step; it is refused.
    """
    grid, state = boundary_layer.starting_layer(ISOTHERMAL_PLATE, prandtl, widening, nodes)
    curvatures = numpy.linspace(0.0, last, steps + 1)
    gradients, before = [boundary_layer.wall_gradient(grid, state)], None
    for curvature in curvatures[1:]:
        rate, history, guess = boundary_layer.behind(state, before, curvature / curvatures[1])
        state, before = (
            boundary_layer.station(
                curved(grid, curvature),
                ISOTHERMAL_PLATE,
                prandtl,
                guess,
                rate=rate,
                history=history,
            ),
            state,
        )
        if state.theta.min() < -1e-9:
            raise ArithmeticError(f"Pr {prandtl}: too few points at curvature {curvature:.2g}")
        gradients.append(boundary_layer.wall_gradient(grid, state))
    return curvatures, numpy.array(gradients)


def mean_ratios(prandtl, last=10.0, steps=60, widening=6.0, nodes=140):
    """Curvatures and the mean Nu over that of the plate of the same height.

    The coefficient goes as -theta'(0) x^(-1/4), and x as xi^4, so that the mean over the
    height weighs the local ratio with xi^2.
    """
    curvatures, gradients = march(prandtl, last, steps, widening, nodes)
    weighted = CubicSpline(curvatures, gradients / gradients[0] * curvatures**2)
    integral = weighted.antiderivative()(curvatures[1:])
    return curvatures[1:], 3.0 * integral / curvatures[1:] ** 3
