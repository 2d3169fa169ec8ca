"""Age and conformal distance along the expansion, as sums of positive integrals between the epochs asked for.

With u = ln a:  dt = du / (H0 E),  and  dD = c du / (H0 a E)  for both comoving distance and conformal time.
All results are in units of 1/H0 and c/H0.
"""

from mpmath import exp, log, mp, mpf, sqrt

from fate import early_power, has_event_horizon, turning_point
from tanh_sinh import integrate

#: Near the turning point E^2 is a difference of nearly equal terms; the nodes next to it need digits to spare.
TURNING_DIGITS = 250


class Timeline:
    def __init__(self, model, redshifts):
        self.model = model
        self.turn = turning_point(model, TURNING_DIGITS)
        self.has_age, self.has_particle_horizon = early_power(model) > 0, early_power(model) > 2
        self.has_event_horizon = has_event_horizon(model, self.turn)
        existing = {mpf(0), *(z for z in redshifts if self.exists(z))}
        self.knots = sorted(existing, reverse=True)  # in order of time
        self.steps = [self.between(early, late) for early, late in zip(self.knots, self.knots[1:])]
        self.first_age, self.first_conformal = self.beginning()
        self.last_age, self.last_conformal = self.ending()

    def exists(self, z):
        """False at and after the turning point."""
        return self.turn is None or 1 / (1 + z) < self.turn

    def between(self, early, late):
        """(age, conformal time) that pass from redshift `early` to `late`."""
        def rates(u):
            a = exp(u)
            E = sqrt(self.model.E2(a))
            return [1 / E, 1 / (a * E)]
        return integrate(rates, -log(1 + early), -log(1 + late))

    def beginning(self):
        """(age, conformal time) from a = 0 to the first knot, None where the integral diverges."""
        def rates(a):
            E = sqrt(self.model.E2(a))
            return [1 / (a * E), 1 / (a * a * E)][:kinds]
        kinds = self.has_age + self.has_particle_horizon
        found = integrate(rates, mpf(0), 1 / (1 + self.knots[0])) if kinds else []
        return (found + [None, None])[:2]

    def ending(self):
        """(age, conformal time) left from the last knot to the turning point; without one, (None, conformal time to
        infinity), the latter as the integral of dx / E over x = 1/a."""
        x_last = 1 + self.knots[-1]
        if self.turn is not None:
            return self.to_turning_point(1 / x_last)
        if not self.has_event_horizon:
            return None, None
        return None, integrate(lambda x: [1 / sqrt(self.model.E2(1 / x))], mpf(0), x_last)[0]

    def to_turning_point(self, start):
        """With a = turn - s^2 the integrand 2s / (a E) is smooth at s = 0, where E ~ s."""
        def rates(s):
            a = self.turn - s * s
            E = sqrt(self.model.E2(a))
            return [2 * s / (a * E), 2 * s / (a * a * E)]
        with mp.workdps(TURNING_DIGITS):
            return integrate(rates, mpf(0), sqrt(self.turn - start))

    def since_beginning(self, z, kind):
        """kind 0: age; kind 1: conformal time, at a knot."""
        first = (self.first_age, self.first_conformal)[kind]
        return None if first is None else first + sum(step[kind] for step in self.steps[:self.knots.index(z)])

    def until_today(self, z, kind):
        """kind 0: lookback time; kind 1: comoving distance, at a knot with z >= 0."""
        here, today = self.knots.index(z), self.knots.index(0)
        return sum((step[kind] for step in reversed(self.steps[here:today])), mpf(0))

    def until_end(self, z, kind):
        """Age or conformal time left, to the turning point or (kind 1) to infinity."""
        last = (self.last_age, self.last_conformal)[kind]
        return None if last is None else last + sum(step[kind] for step in reversed(self.steps[self.knots.index(z):]))

    def distance(self, z):
        """Comoving distance at any z >= 0, from the nearest knot."""
        nearest = min((knot for knot in self.knots if knot >= 0), key=lambda knot: abs(log((1 + z) / (1 + knot))))
        beyond = self.between(z, nearest)[1] if z > nearest else -self.between(nearest, z)[1]
        return self.until_today(nearest, 1) + beyond
