"""First route to the Fermi-Dirac integrals of a neutrino with mass:

    F(y) = integral over x > 0 of x^2 sqrt(x^2 + y^2) / (e^x + 1)      energy density
    G(y) = integral over x > 0 of x^4 / sqrt(x^2 + y^2) / (e^x + 1)    three times the pressure

Trapezoidal rule in u = ln x. All singularities lie at |Im u| >= pi/2, whatever y is, so the error falls almost like
exp(-pi^2 / step): halving the step taken changes the sums by less than 1e-57. All y share the nodes, and the sums are
kept in integers scaled by a power of two a little above the working precision.
"""

import math
from functools import cache

from mpmath import exp, mp, mpf, nint

import agreement  # noqa: F401 - sets the working precision

STEP = mpf(1) / 16
#: x^2 and the weights (with dx = x du) fall below 1e-54 of their sums outside these limits of u.
LOWEST, HIGHEST = -42, mpf(5)


def scaled(value, bits):
    return int(nint(value * mpf(2) ** bits))


def working_bits():
    return mp.prec + 20


@cache
def nodes(bits, step=STEP):
    """[(x^2, x^3 step / (e^x + 1))] in integers scaled by 2^bits."""
    points = [exp(LOWEST + k * step) for k in range(int((HIGHEST - LOWEST) / step) + 1)]
    return [(scaled(x * x, bits), scaled(x**3 * step / (exp(x) + 1), bits)) for x in points]


def energy_integral(y):
    bits = working_bits()
    square = scaled(y * y, bits)
    total = sum(weight * math.isqrt((x2 + square) << bits) for x2, weight in nodes(bits))
    return mpf(total) / mpf(2) ** (2 * bits)


def pressure_integral(y):
    bits = working_bits()
    square = scaled(y * y, bits)
    total = sum((weight * x2 << bits) // math.isqrt((x2 + square) << bits) for x2, weight in nodes(bits) if x2)
    return mpf(total) / mpf(2) ** (2 * bits)


#: F(0) = G(0) = 7 pi^4 / 120, by the same sum.
AT_REST_MASS_ZERO = energy_integral(mpf(0))


def energy_ratio(y):
    """R(y) = F(y) / F(0)."""
    return energy_integral(y) / AT_REST_MASS_ZERO


def pressure_ratio(y):
    """P(y) = G(y) / F(0); the pressure over a third of the massless density."""
    return pressure_integral(y) / AT_REST_MASS_ZERO
