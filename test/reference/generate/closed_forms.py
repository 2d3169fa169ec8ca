"""A third check: stored values against closed forms, where a model has them. Exits with 1 on a difference."""

import json

from mpmath import acos, asinh, log, mp, mpf, pi, sin, sqrt

from agreement import REFERENCE, difference
from background import Background
from constants import GIGAYEAR

#: Stored values have 30 digits.
ALLOWED = mpf(10) ** -29


def einstein_de_sitter(x):
    return {"chi": 2 - 2 / sqrt(x), "t": 2 / (3 * x * sqrt(x)), "eta": 2 / sqrt(x), "V": (2 - 2 / sqrt(x)) ** 3 / 3}


def empty(x):
    """D_M = sinh(ln x); 4 pi times the integral of sinh^2."""
    return {"chi": log(x), "t": 1 / x, "V": (x * x - 1 / (x * x)) / 8 - log(x) / 2}


def de_sitter(x):
    return {"chi": x - 1, "left": x, "V": (x - 1) ** 3 / 3}


def flat_lambda(x):
    return {"t": 2 / (3 * sqrt(mpf(7) / 10)) * asinh(sqrt(mpf(7) / 3) / (x * sqrt(x)))}


def open_matter(x):
    """Mattig (1958): D_M = 2 (2 - m (1 - z) - (2 - m) sqrt(1 + m z)) / (m^2 x), m = 3/10."""
    m, z = mpf(3) / 10, x - 1
    return {"M": 2 * (2 - m * (1 - z) - (2 - m) * sqrt(1 + m * z)) / (m * m * x)}


def closed_matter(x):
    """Cycloid a = 1 - cos(eta), t = eta - sin(eta) for Omega_m = 2; the crunch is at eta = 2 pi."""
    eta = acos(1 - 1 / x)
    chi = pi / 2 - eta
    return {"eta": eta, "t": eta - sin(eta), "left": 2 * pi - eta, "chi": chi, "V": chi / 2 - sin(2 * chi) / 4}


MODELS = {"einsteinDeSitter": einstein_de_sitter, "empty": empty, "deSitter": de_sitter, "flatLambda": flat_lambda,
          "openMatter": open_matter, "closedMatter": closed_matter}


def in_table_units(model, x):
    """{kind: (column, the unit of its closed form)}"""
    time, length = 1 / model.H0_SI / GIGAYEAR, mpf("299792.458") / model.H0
    return {"chi": ("D_C_Mpc", length), "M": ("D_M_Mpc", length), "t": ("t_Gyr", time), "eta": ("eta_Gyr", time),
            "left": ("event_horizon_Mpc", length / x), "V": ("V_C_Gpc3", 4 * pi * (length / 1000) ** 3)}


def worst_difference(name, closed_form):
    file = json.loads((REFERENCE / "values" / f"{name}.json").read_text())
    model = Background(file["parameters"])
    for row in file["rows"]:
        x = 1 + mpf(row["z"])
        if row["E"] is None:
            continue
        units = in_table_units(model, x)
        for kind, value in closed_form(x).items():
            column, unit = units[kind]
            if row[column] is not None:
                yield difference(value * unit, mpf(row[column])), f"{name}, z = {row['z']}, {column}"


def main():
    mp.dps = 100
    found = [case for name, closed_form in MODELS.items() for case in worst_difference(name, closed_form)]
    worst, place = max(found)
    print(f"{len(found)} values; largest difference {mp.nstr(worst, 3)} at {place}")
    raise SystemExit(1 if worst > ALLOWED else 0)


if __name__ == "__main__":
    main()
