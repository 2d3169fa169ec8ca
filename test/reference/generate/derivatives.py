"""Partial derivatives of every column and milestone by one parameter, from central differences of 60-digit values.

The difference over 2h leaves h^2 f'''/6: with the steps below the two routes, which take different ones, agree to 15
digits, which is far more than a derivative by differences of doubles can have.
"""

import sys
from concurrent.futures import ProcessPoolExecutor
from fractions import Fraction

from mpmath import mp, mpf

from agreement import REFERENCE, decimal, difference, write
from first_route import first_route
from second_route import second_route
from values import COLUMNS

REDSHIFTS = ["-0.5", "0", "0.0078125", "0.5", "2", "7", "1023"]
STEPS = {first_route: "1e-10", second_route: "3e-11"}
#: The routes must agree to this, relative.
AGREEMENT = mpf(10) ** -15
#: A derivative this small against the value is a zero that the difference has blurred.
BLUR = mpf(10) ** -17
DIGITS = 15

#: Every parameter that can have an uncertainty, in models where it matters.
CASES = {
    "flat": ({"H0": "67.5", "omega_b": "0.0224", "omega_c": "0.12", "Omega_k": "0", "w0": "-1", "wa": "0",
              "T_CMB": "2.7255", "N_eff": "3.046", "m_nu": ["0", "0", "0.06"]},
             ["H0", "omega_b", "omega_c", "Omega_k", "T_CMB", "N_eff"]),
    "curved": ({"H0": "70", "Omega_m": "0.3125", "Omega_k": "-0.03125", "w0": "-0.875", "wa": "-0.25",
                "T_CMB": "2.7255", "N_eff": "3.046", "m_nu": []},
               ["H0", "Omega_m", "Omega_k", "w0", "wa"]),
    "open": ({"H0": "70", "Omega_m": "0.25", "Omega_DE": "0.5", "w0": "-1", "wa": "0", "T_CMB": "0", "N_eff": "0",
              "m_nu": []},
             ["Omega_m", "Omega_DE"]),
}


def flat_list(rows, milestones):
    """All values of one model under one name each."""
    cells = {(z, column): row.get(column) for z, row in zip(REDSHIFTS, rows) for column in COLUMNS}
    return {**cells, **{("milestone", name): value for name, value in milestones.items() if name != "fate"}}


def moved(parameters, name, step):
    exact = Fraction(parameters[name]) + Fraction(step)
    scale = 10**20
    return {**parameters, name: f"{exact * scale}e-20"}


def derivatives(task):
    route, parameters, name = task
    step = STEPS[route]
    ahead, behind = (flat_list(*route(moved(parameters, name, s), REDSHIFTS)) for s in (step, "-" + step))
    return {key: slope(ahead[key], behind.get(key), mpf(step)) for key in ahead}


def slope(ahead, behind, step):
    if ahead is None or behind is None:
        return None
    found = (ahead - behind) / (2 * step)
    return mpf(0) if abs(found) < BLUR * abs(ahead) else found


def generate(label, parameters, name, first, second):
    worst = max((difference(first[key], second.get(key)) for key in first), default=mpf(0))
    if worst > AGREEMENT:
        raise SystemExit(f"{label}, {name}: the routes differ by {mp.nstr(worst, 3)}")
    print(f"{label}, {name}: the routes differ by {mp.nstr(worst, 3)}", flush=True)
    return {"parameter": name, "largestDisagreement": mp.nstr(worst, 3),
            "milestones": {key[1]: decimal(value, DIGITS) for key, value in first.items() if key[0] == "milestone"},
            "rows": [{"z": z, **{c: decimal(first[z, c], DIGITS) for c in COLUMNS}} for z in REDSHIFTS]}


def main(labels):
    chosen = {label: CASES[label] for label in labels or CASES}
    tasks = [(route, parameters, name) for parameters, names in chosen.values() for name in names for route in STEPS]
    with ProcessPoolExecutor(2) as pool:
        found = iter(list(pool.map(derivatives, tasks)))
    for label, (parameters, names) in chosen.items():
        body = [generate(label, parameters, name, next(found), next(found)) for name in names]
        write(REFERENCE / "derivatives" / f"{label}.json", {
            "digits": DIGITS,
            "quantity": f"partial derivatives of every column and milestone by {', '.join(names)}",
            "formula": "columns as defined in test/reference/README.md; what the parameters do not give stays fixed",
            "source": "central differences of directly integrated values, no published table used",
            "generator": "test/reference/generate/derivatives.py",
            "command": f"/usr/bin/python3 test/reference/generate/derivatives.py {label}",
            "precision": f"{mp.dps} decimal digits, step {STEPS[first_route]}",
            "secondRoute": f"PARI/GP, 57 digits, step {STEPS[second_route]}",
        }, {"parameters": parameters, "derivatives": body})


if __name__ == "__main__":
    main(sys.argv[1:])
