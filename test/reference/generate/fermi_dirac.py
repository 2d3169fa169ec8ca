"""First route to the Fermi-Dirac integrals of a neutrino with mass:

    F(y) = integral over x > 0 of x^2 sqrt(x^2 + y^2) / (e^x + 1)      energy density
    G(y) = integral over x > 0 of x^4 / sqrt(x^2 + y^2) / (e^x + 1)    three times the pressure

Trapezoidal rule in u = ln x. All singularities lie at |Im u| >= pi/2, whatever y is, so the error falls almost like
exp(-pi^2 / step): halving the step taken changes the sums by less than 1e-57. All y share the nodes, and the sums are
kept in integers scaled by 2^BITS.
"""

import math

from mpmath import exp, mpf, nint

import agreement  # noqa: F401 - sets the working precision before the nodes are computed

STEP = mpf(1) / 16
#: x^2 and the weights (with dx = x du) fall below 1e-54 of their sums outside these limits of u.
LOWEST, HIGHEST = -42, mpf(5)
BITS = 220


def scaled(value):
    return int(nint(value * mpf(2) ** BITS))


def nodes(step):
    """[(x^2, x^3 step / (e^x + 1))] in scaled integers."""
    points = [exp(LOWEST + k * step) for k in range(int((HIGHEST - LOWEST) / step) + 1)]
    return [(scaled(x * x), scaled(x**3 * step / (exp(x) + 1))) for x in points]


NODES = nodes(STEP)


def energy_integral(y, over=NODES):
    square = scaled(y * y)
    total = sum(weight * math.isqrt((x2 + square) << BITS) for x2, weight in over)
    return mpf(total) / mpf(2) ** (2 * BITS)


def pressure_integral(y, over=NODES):
    square = scaled(y * y)
    total = sum(weight * x2 * (1 << BITS) // math.isqrt((x2 + square) << BITS) for x2, weight in over)
    return mpf(total) / mpf(2) ** (2 * BITS)


#: F(0) = G(0) = 7 pi^4 / 120, by the same sum.
AT_REST_MASS_ZERO = energy_integral(mpf(0))


def energy_ratio(y):
    """R(y) = F(y) / F(0)."""
    return energy_integral(y) / AT_REST_MASS_ZERO


def pressure_ratio(y):
    """P(y) = G(y) / F(0); the pressure over a third of the massless density."""
    return pressure_integral(y) / AT_REST_MASS_ZERO
