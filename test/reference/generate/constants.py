"""The constants of design.md section 4, in SI units."""

from mpmath import mpf, pi

import agreement  # noqa: F401 - sets the working precision

SPEED_OF_LIGHT = mpf(299792458)
PLANCK = mpf("6.62607015e-34")
BOLTZMANN = mpf("1.380649e-23")
ELECTRONVOLT = mpf("1.602176634e-19")
GRAVITATION = mpf("6.67430e-11")
SOLAR_MASS = mpf("1.3271244e20") / GRAVITATION
MEGAPARSEC = mpf(10) ** 6 * 648000 / pi * 149597870700
YEAR = mpf(365.25) * 86400
GIGAYEAR = YEAR * 10**9
RADIATION_CONSTANT = 8 * pi**5 * BOLTZMANN**4 / (15 * PLANCK**3 * SPEED_OF_LIGHT**3)
