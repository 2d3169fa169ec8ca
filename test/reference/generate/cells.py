"""Reference values of table cells: rows spread evenly over every shipped parameter set and redshift grid.

They show whether a cell is correctly rounded, so they are taken from the files the keeper publishes, not from models.json.
"""

import sys
from decimal import Decimal

from mpmath import mp

from agreement import REFERENCE, TOLERANCE, decimal, write
from content import parameter_sets, redshift_grids
from first_route import first_route
from second_route import second_route
from values import COLUMNS, disagreement

#: Rows taken from one grid for one set. Rounding does not care which; the ends are always among them.
ROWS = 32
DIGITS = 24


def spread(redshifts):
    last = len(redshifts) - 1
    return redshifts if last < ROWS else [redshifts[round(k * last / (ROWS - 1))] for k in range(ROWS)]


def generate(name, parameters, grids):
    """One file for a set: the rows of all grids, since both routes integrate from row to row."""
    redshifts = [str(z) for z in sorted({Decimal(z) for grid in grids.values() for z in spread(grid)})]
    rows, milestones = first_route(parameters, redshifts)
    second_rows, second_milestones = second_route(parameters, redshifts)
    worst = disagreement(f"{name}, milestones", milestones, second_milestones, list(milestones))
    for z, first, second in zip(redshifts, rows, second_rows, strict=True):
        worst = max(worst, disagreement(f"{name}, z = {z}", first, second, COLUMNS))
    write(REFERENCE / "cells" / f"{name}.json", {
        "digits": DIGITS,
        "quantity": f"cells of the tables of parameter set {name}, up to {ROWS} rows from each of {', '.join(grids)}",
        "formula": "columns as defined in test/reference/README.md",
        "source": "direct quadrature, no published table used",
        "generator": "test/reference/generate/cells.py",
        "command": f"/usr/bin/python3 test/reference/generate/cells.py {name}",
        "precision": f"{mp.dps} decimal digits, tanh-sinh quadrature in ln a, steps halved until 42 digits stay",
        "secondRoute": f"PARI/GP, 57 digits, adaptive 30-point Gauss-Legendre in a; all values agree to {mp.nstr(TOLERANCE, 1)}",
        "largestDisagreement": mp.nstr(worst, 3),
    }, {
        "parameters": parameters,
        "milestones": {key: decimal(value, DIGITS) for key, value in milestones.items()},
        "columns": ["z", *COLUMNS],
        "rows": [[z, *(decimal(row.get(column), DIGITS) for column in COLUMNS)] for z, row in zip(redshifts, rows)],
    })
    cells = sum(row.get(column) is not None for row in rows for column in COLUMNS)
    print(f"{name}: {len(rows)} rows, {cells} cells, the routes differ by {mp.nstr(worst, 3)}", flush=True)
    return cells


def main(names):
    sets, grids = parameter_sets(), redshift_grids()
    print(sum(generate(name, sets[name], grids) for name in names or sets), "cells in all")


if __name__ == "__main__":
    main(sys.argv[1:])
