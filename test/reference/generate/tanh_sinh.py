"""Tanh-sinh quadrature (Takahasi & Mori 1974) of several integrands at once, the step halved until nothing changes."""

from functools import cache

from mpmath import cosh, exp, mp, mpf, pi, sinh

#: Nodes beyond |t| = LIMIT lie closer than 1e-115 to an end.
LIMIT = mpf(51) / 10
#: Halving the step must change every integral by less than this. The error falls like its square with each halving.
CONVERGED = mpf(10) ** -42
FIRST_LEVEL, LAST_LEVEL = 3, 11


@cache
def new_nodes(level, digits):
    """[(distance from the nearer end, weight)] of step 2^-level on [0, 2], those of coarser levels left out; t > 0."""
    with mp.workdps(digits):
        step = mpf(1) / 2**level
        count = int(LIMIT / step)
        wanted = range(1, count + 1) if level == FIRST_LEVEL else range(1, count + 1, 2)
        return [(2 / (1 + exp(pi * sinh(k * step))), pi / 2 * cosh(k * step) / cosh(pi / 2 * sinh(k * step)) ** 2)
                for k in wanted]


def integrate(integrands, start, end):
    """The integrals of the list integrands(x) from `start` to `end`. Distances from `start` keep their relative
    precision, so a singular end belongs there and at 0."""
    half = (end - start) / 2
    sums = [pi / 2 * value for value in integrands(start + half)]
    previous = None
    for level in range(FIRST_LEVEL, LAST_LEVEL):
        for distance, weight in new_nodes(level, mp.dps):
            low, high = integrands(start + half * distance), integrands(end - half * distance)
            sums = [s + weight * (l + h) for s, l, h in zip(sums, low, high)]
        values = [half * s / 2**level for s in sums]
        if previous and all(abs(v - p) <= CONVERGED * abs(v) for v, p in zip(values, previous)):
            return values
        previous = values
    raise ArithmeticError(f"no convergence on [{mp.nstr(start, 8)}, {mp.nstr(end, 8)}]")
