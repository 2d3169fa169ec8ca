"""Nodes and weights of the 16-point Gauss-Legendre rule on [-1, 1]; see ../README.md for the command."""

from mpmath import cos, mp, mpf

from agreement import REFERENCE, TOLERANCE, decimal, difference, pari, write

POINTS = 16


def legendre(x):
    """P_n(x) and P_n'(x) for n = POINTS by the three-term recurrence (Abramowitz & Stegun 22.7.10, 22.8.5)."""
    before, value = mpf(1), x
    for k in range(2, POINTS + 1):
        before, value = value, ((2 * k - 1) * x * value - (k - 1) * before) / k
    return value, POINTS * (x * value - before) / (x * x - 1)


def rule():
    """Newton's iteration from the usual cosine guess; weight 2 / ((1 - x^2) P_n'(x)^2)."""
    for k in range(POINTS, 0, -1):
        x = cos(mp.pi * (4 * k - 1) / (4 * POINTS + 2))
        for _ in range(12):
            value, slope = legendre(x)
            x -= value / slope
        yield x, 2 / ((1 - x * x) * legendre(x)[1] ** 2)


def main():
    first = [number for pair in rule() for number in pair]
    second = [mpf(line) for line in pari("gaussLegendre.gp", f"points = {POINTS};")]
    worst = max(map(difference, first, second))
    if len(first) != len(second) or worst > TOLERANCE:
        raise SystemExit(f"the two routes differ by {mp.nstr(worst, 3)}")
    write(REFERENCE / "gaussLegendre16.json", {
        "quantity": "nodes (ascending) and weights of the 16-point Gauss-Legendre rule on [-1, 1]",
        "formula": "roots x of P_16; weights 2 / ((1 - x^2) P_16'(x)^2)",
        "source": "Abramowitz & Stegun (1964), 25.4.29",
        "generator": "test/reference/generate/gauss_legendre.py",
        "command": "/usr/bin/python3 test/reference/generate/gauss_legendre.py",
        "precision": f"{mp.dps} decimal digits, Newton on the three-term recurrence",
        "secondRoute": "PARI/GP: polroots of the exact polynomial; weights as integrals of the Lagrange polynomials",
        "largestDisagreement": mp.nstr(worst, 3),
    }, {"nodes": [decimal(x) for x in first[::2]], "weights": [decimal(w) for w in first[1::2]]})


if __name__ == "__main__":
    main()
