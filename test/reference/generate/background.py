"""The Friedmann background of design.md section 4: densities and pressures in units of today's critical density."""

from mpmath import exp, mpf, pi

from constants import (BOLTZMANN, ELECTRONVOLT, GRAVITATION, MEGAPARSEC, RADIATION_CONSTANT, SPEED_OF_LIGHT)
from fermi_dirac import energy_ratio, pressure_ratio


class Background:
    def __init__(self, parameters):
        number = {key: mpf(text) for key, text in parameters.items() if key != "m_nu"}
        self.H0 = number["H0"]  # km/s/Mpc
        self.H0_SI = self.H0 * 1000 / MEGAPARSEC
        self.critical_density = 3 * self.H0_SI**2 / (8 * pi * GRAVITATION)  # kg/m3
        self.w0, self.wa = number["w0"], number["wa"]
        self.T_CMB, self.N_eff = number["T_CMB"], number["N_eff"]
        self.gamma = RADIATION_CONSTANT * self.T_CMB**4 / (self.critical_density * SPEED_OF_LIGHT**2)
        self.set_neutrinos([mpf(m) for m in parameters["m_nu"]] or [mpf(0)])
        massive = self.neutrinos(mpf(1), massive_only=True)
        if "Omega_m" in number:
            self.bc = number["Omega_m"] - massive
        else:
            self.bc = (number["omega_b"] + number["omega_c"]) / (self.H0 / 100) ** 2
        rest = 1 - self.bc - self.gamma - self.neutrinos(mpf(1))
        if "Omega_DE" in number:
            self.DE = number["Omega_DE"]
            self.k = rest - self.DE
        else:
            self.k = number.get("Omega_k", mpf(0))
            self.DE = rest - self.k
        # Where the rest is zero on paper, its rounding is not a component.
        self.DE, self.k = (mpf(0) if abs(x) < mpf(10) ** -50 else x for x in (self.DE, self.k))

    def set_neutrinos(self, masses):
        """`eigenstates`: {y today: relativistic density today}, equal masses together."""
        share = self.N_eff / len(masses)
        density = mpf(7) / 8 * (mpf(4) / 11) ** (mpf(4) / 3) * share * self.gamma
        temperature = (mpf(4) / 11) ** (mpf(1) / 3) * share ** (mpf(1) / 4) * self.T_CMB
        self.eigenstates = {}
        for mass in masses if density else []:
            y = mass * ELECTRONVOLT / (BOLTZMANN * temperature)
            self.eigenstates[y] = self.eigenstates.get(y, 0) + density

    def neutrinos(self, a, massive_only=False):
        return sum((d * (energy_ratio(y * a) if y else 1) for y, d in self.eigenstates.items() if y or not massive_only),
                   mpf(0)) / a**4

    def neutrino_pressure(self, a):
        return sum((d * (pressure_ratio(y * a) if y else 1) for y, d in self.eigenstates.items()), mpf(0)) / a**4 / 3

    def dark_energy(self, a):
        if not self.DE:
            return mpf(0)
        return self.DE * a ** (-3 * (1 + self.w0 + self.wa)) * exp(-3 * self.wa * (1 - a))

    def w(self, a):
        return self.w0 + self.wa * (1 - a)

    def matter(self, a):
        """Baryons, cold dark matter and massive neutrinos."""
        return self.bc / a**3 + self.neutrinos(a, massive_only=True)

    def densities(self, a):
        return {"bc": self.bc / a**3, "nu": self.neutrinos(a), "gamma": self.gamma / a**4,
                "DE": self.dark_energy(a), "k": self.k / a**2}

    def pressure(self, a):
        return self.gamma / a**4 / 3 + self.neutrino_pressure(a) + self.w(a) * self.dark_energy(a)

    def E2(self, a):
        return sum(self.densities(a).values())

    def q(self, a):
        """-a (d2a/dt2) / (da/dt)^2 = (rho + 3 p) / (2 rho_critical)."""
        density = self.densities(a)
        return (sum(density.values()) - density["k"] + 3 * self.pressure(a)) / (2 * sum(density.values()))
