"""The second route: PARI/GP, Gauss-Legendre in the scale factor. Parameters and redshifts go over as exact fractions."""

from fractions import Fraction

from mpmath import mpf

from agreement import pari


def definitions(parameters, redshifts):
    pairs = "; ".join(f'"{key}", {Fraction(text)}' for key, text in parameters.items() if key != "m_nu")
    masses = ", ".join(str(Fraction(m)) for m in parameters["m_nu"])
    asked = ", ".join(str(Fraction(z)) for z in redshifts)
    return f"given = Map([{pairs}]);\nmasses = [{masses}];\nasked = [{asked}];"


def second_route(parameters, redshifts):
    """(rows, milestones) like the first route; what does not exist is missing."""
    rows, milestones = [{} for _ in redshifts], {}
    for line in pari("model.gp", definitions(parameters, redshifts)):
        place, name, value = line.split("\t")
        into = milestones if place == "milestone" else rows[int(place)]
        into[name] = value if name == "fate" else mpf(value)
    return rows, milestones
