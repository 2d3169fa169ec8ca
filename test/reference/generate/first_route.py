"""The first route: mpmath, tanh-sinh quadrature in ln a. (rows, milestones) of one model, nothing rounded."""

from mpmath import mpf

from background import Background
from fate import turning_point
from milestones import epochs, milestones
from quantities import row
from timeline import Timeline


def first_route(parameters, redshifts):
    model = Background(parameters)
    turn = turning_point(model, 60)
    at = epochs(model, lambda z: turn is None or 1 / (1 + z) < turn)
    line = Timeline(model, [mpf(z) for z in redshifts] + [z for z in at.values() if z is not None])
    return [row(model, line, mpf(z)) for z in redshifts], milestones(model, line, at)
