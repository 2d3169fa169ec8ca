"""R(y) and the pressure ratio at binary-exact y from 0 to 1e6; see ../README.md for the command."""

from fractions import Fraction

from mpmath import mp, mpf, pi

from agreement import REFERENCE, TOLERANCE, decimal, difference, pari, write
from fermi_dirac import AT_REST_MASS_ZERO, energy_ratio, pressure_ratio

#: Powers of two from 2^-20 to 2^19, and values between them where neutrinos turn from fast to slow.
ARGUMENTS = sorted({
    Fraction(0), *(Fraction(2) ** k for k in range(-20, 20)),
    *(Fraction(n, 8) for n in (3, 5, 7, 9, 11, 13, 20, 25, 28, 37)),
    *map(Fraction, (3, 5, 6, 7, 10, 12, 20, 24, 48, 100, 357, 1000, 5957, 10**5, 10**6)),
})


def written(y):
    """The exact decimal of a dyadic fraction."""
    places = y.denominator.bit_length() - 1
    digits = str(y.numerator * 5**places).rjust(places + 1, "0")
    return digits if places == 0 else f"{digits[:-places]}.{digits[-places:]}"


def main():
    first = [ratio(mpf(written(y))) for y in ARGUMENTS for ratio in (energy_ratio, pressure_ratio)]
    wanted = ", ".join(map(str, ARGUMENTS))
    second = [mpf(line) for line in pari("fermiDiracTable.gp", f"arguments = [{wanted}];")]
    worst = max(map(difference, first, second))
    closed_form = difference(AT_REST_MASS_ZERO, 7 * pi**4 / 120)
    if len(first) != len(second) or max(worst, closed_form) > TOLERANCE:
        raise SystemExit(f"the routes differ by {mp.nstr(worst, 3)}, F(0) by {mp.nstr(closed_form, 3)}")
    write(REFERENCE / "fermiDirac.json", {
        "quantity": "R(y) = F(y)/F(0), energy density, and P(y) = G(y)/F(0), pressure over a third of the massless "
                    "density, of an ideal Fermi-Dirac neutrino with y = m c^2 / (k_B T)",
        "formula": "F(y) = int_0^inf x^2 sqrt(x^2+y^2)/(e^x+1) dx; G(y) = int_0^inf x^4/sqrt(x^2+y^2)/(e^x+1) dx; "
                   "F(0) = 7 pi^4/120",
        "source": "direct quadrature; no published table used",
        "generator": "test/reference/generate/fermi_dirac_table.py",
        "command": "/usr/bin/python3 test/reference/generate/fermi_dirac_table.py",
        "precision": f"{mp.dps} decimal digits, trapezoidal rule in ln x",
        "secondRoute": "PARI/GP, 57 digits: 36-point Gauss-Legendre in x on panels halved towards 0",
        "largestDisagreement": mp.nstr(worst, 3),
    }, {"columns": ["y", "R", "P"], "rows": [
        [written(y), decimal(first[2 * i]), decimal(first[2 * i + 1])] for i, y in enumerate(ARGUMENTS)
    ]})


if __name__ == "__main__":
    main()
