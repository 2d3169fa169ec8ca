"""The single epochs and present-day values of one model, in the order and units of src/cosmology/milestones.ts."""

from mpmath import cos, cosh, exp, expm1, findroot, mp, mpf, sqrt

from constants import GIGAYEAR, MEGAPARSEC, SOLAR_MASS, SPEED_OF_LIGHT
from fate import fate
from quantities import horizons, transverse

#: The scans run from 1 + z = e^LIMIT to e^-LIMIT in steps of 1/SCAN of ln(1 + z).
LIMIT, SCAN = 14, 50


def polished(function, low, high):
    """The root between two redshifts at which `function` differs in sign."""
    rough = findroot(function, (low, high), solver="anderson", tol=1e-25, verify=False)
    return findroot(function, (rough, rough * (1 + mpf(10) ** -12)), solver="secant", tol=mpf(10) ** -106, verify=False)


def first_crossing(function, exists, falling_only):
    """The first redshift in order of time at which `function` changes sign (from + to -, if `falling_only`)."""
    earlier = None
    for k in range(LIMIT * SCAN, -LIMIT * SCAN, -1):
        z = expm1(mpf(2 * k + 1) / (2 * SCAN))
        if not exists(z):
            return None
        with mp.workdps(15):
            value = function(z)
        if earlier and earlier[1] * value < 0 and (value < 0 or not falling_only):
            return polished(function, earlier[0], z)
        earlier = (z, value)
    return None


def epochs(model, exists):
    """The redshifts of equality, of the onset of acceleration and of matter-dark energy equality."""
    massless = model.gamma * (1 + mpf(7) / 8 * (mpf(4) / 11) ** (mpf(4) / 3) * model.N_eff)
    found = {"equality": model.bc / massless - 1 if massless and model.bc else None}
    found["acceleration"] = first_crossing(lambda z: model.q(1 / (1 + z)), exists, True)
    found["matter_DE_equality"] = None
    if model.DE > 0:
        found["matter_DE_equality"] = first_crossing(
            lambda z: model.matter(1 / (1 + z)) - model.dark_energy(1 / (1 + z)), exists, False)
    return found


def rough_distances(model):
    """[(z, D_C in c/H0 to about 1e-5)], by the midpoint rule in ln(1 + z)."""
    distance, found = mpf(0), []
    with mp.workdps(15):
        for k in range(LIMIT * SCAN):
            x = exp(mpf(2 * k + 1) / (2 * SCAN))
            distance += x / sqrt(model.E2(1 / x)) / SCAN
            found.append((expm1(mpf(k + 1) / SCAN), distance))
    return found


def recession_of_light(model, line, rough):
    """The redshift at which D_C = c/H0, by Newton's iteration dz = (1 - D) E."""
    z = next((z for z, distance in rough if distance >= 1), None)
    if z is None:
        return None
    for _ in range(9):
        z += (1 - line.distance(z)) * sqrt(model.E2(1 / (1 + z)))
    return z


def slope_of_D_A(model, z, distance):
    """(1+z)^2 dD_A/dz = (1+z) D_M' - D_M, up to the sign of sin in a closed space."""
    root = sqrt(abs(model.k))
    bend = cosh(root * distance) if model.k > 0 else cos(root * distance)
    sine = mp.sin(root * distance) / root if model.k < 0 else transverse(model.k, distance)
    return (1 + z) * bend / sqrt(model.E2(1 / (1 + z))) - sine


def largest_D_A(model, line, rough):
    """(redshift, D_A in c/H0) of the highest maximum at z > 0, or (None, None)."""
    peaks = [k for k in range(1, len(rough) - 1) if D_A(model, *rough[k]) > max(
        D_A(model, *rough[k - 1]), D_A(model, *rough[k + 1]))]
    if not peaks:
        return None, None
    z, _ = rough[max(peaks, key=lambda k: D_A(model, *rough[k]))]
    z = findroot(lambda x: slope_of_D_A(model, x, line.distance(x)), (z, z * mpf("1.001")), solver="secant",
                 tol=mpf(10) ** -100, verify=False, maxsteps=15)
    return z, D_A(model, z, line.distance(z))


def D_A(model, z, distance):
    return transverse(model.k, distance) / (1 + z)


def milestones(model, line, at):
    """`at`: the redshifts found by `epochs`, all knots of `line`."""
    gigayears, hubble = 1 / model.H0_SI / GIGAYEAR, SPEED_OF_LIGHT / 1000 / model.H0
    rough = rough_distances(model)
    z_peak, peak = largest_D_A(model, line, rough)
    today = horizons(model, line, mpf(0), mpf(1))

    def age(z):
        return None if z is None or not line.exists(z) or not line.has_age else line.since_beginning(z, 0) * gigayears

    t_maximum = None if line.turn is None else age(mpf(0)) + line.until_end(mpf(0), 0) * gigayears
    return {
        "hubble_time": gigayears,
        "hubble_distance": hubble,
        "critical_density_SI": model.critical_density,
        "critical_density_cgs": model.critical_density / 1000,
        "critical_density_Msun": model.critical_density * MEGAPARSEC**3 / SOLAR_MASS,
        "age_today": age(mpf(0)),
        **{f"{kind}_{name}": value if kind == "z" else age(value)
           for name, value in at.items() for kind in ("z", "t")},
        "z_largest_D_A": z_peak,
        "largest_D_A": None if peak is None else hubble * peak,
        "z_recession_c": recession_of_light(model, line, rough),
        "particle_horizon_today": today["particle_horizon_Mpc"],
        "event_horizon_today": today["event_horizon_Mpc"],
        "fate": fate(model, line.turn),
        "t_maximum": t_maximum,
        "t_crunch": None if t_maximum is None else 2 * t_maximum,
    }
