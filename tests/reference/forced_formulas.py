"""Forced convection from the same bodies, and the two flows together.

Re, Pr and Nu are on the length along the flow of a plate and on the diameter of a cylinder
or sphere. Constants are from memory of the publications.
"""

import math

PLATE_TRANSITION = 5e5


def plate_along(reynolds, prandtl):
    """Pohlhausen 1921; beyond 5e5 with the turbulent part of Colburn 1933 behind it.

    The 871 is what makes the two meet at 5e5: 0.037 Re^0.8 - 0.664 Re^(1/2) is 871.3 there.
    """
    third = prandtl ** (1.0 / 3.0)
    if reynolds <= PLATE_TRANSITION:
        return 0.664 * math.sqrt(reynolds) * third
    return (0.037 * reynolds**0.8 - 871.0) * third


def cylinder_across(reynolds, prandtl):
    """Churchill & Bernstein 1977, J. Heat Transfer 99, 300-306; Re Pr above 0.2."""
    divisor = (1.0 + (0.4 / prandtl) ** (2.0 / 3.0)) ** 0.25
    late = (1.0 + (reynolds / 282000.0) ** (5.0 / 8.0)) ** (4.0 / 5.0)
    return 0.3 + 0.62 * math.sqrt(reynolds) * prandtl ** (1.0 / 3.0) / divisor * late


def sphere_in_stream(reynolds, prandtl, viscosity_ratio=1.0):
    """Whitaker 1972, AIChE J. 18, 361-371; properties of the stream.

    `viscosity_ratio` is that of the stream over that at the surface; 3.5 < Re < 7.6e4.
    """
    sweep = 0.4 * math.sqrt(reynolds) + 0.06 * reynolds ** (2.0 / 3.0)
    return 2.0 + sweep * prandtl**0.4 * viscosity_ratio**0.25


# Exponents of the combination (Churchill 1977 and handbook practice), three elsewhere; of a
# sphere what is raised is the coefficient less that of conduction, Nu - 2.
EXPONENTS = {"horizontal-plate": 3.5, "horizontal-cylinder": 4.0, "sphere": 4.0}


def combined(forced, free, exponent=3.0, opposing=False):
    """(|forced^m +/- free^m|)^(1/m), of coefficients; minus where the flows are opposed."""
    sign = -1.0 if opposing else 1.0
    return abs(forced**exponent + sign * free**exponent) ** (1.0 / exponent)
