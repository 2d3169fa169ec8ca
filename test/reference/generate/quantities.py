"""All columns of design.md section 4 at one redshift: {column id: value or None}."""

from mpmath import cbrt, log10, mp, mpf, pi, sin, sinh, sqrt

from constants import GIGAYEAR, MEGAPARSEC, SOLAR_MASS, SPEED_OF_LIGHT, YEAR

KM = 1000
#: A closed form that cancels is evaluated with this many digits; its arguments are taken as exact.
CANCELLING_DIGITS = 250
#: A difference smaller than this, relative to its terms, is a zero that rounding has blurred.
BLUR = mpf(10) ** -50


def transverse(k, distance):
    """D_M in c/H0 from D_C in c/H0; in a closed space |sin|."""
    if k > 0:
        return sinh(sqrt(k) * distance) / sqrt(k)
    if k < 0:
        return abs(sin(sqrt(-k) * distance)) / sqrt(-k)
    return distance


def volume(k, d):
    """Integral of 4 pi D_M(D)^2 dD from 0 to d, in (c/H0)^3."""
    with mp.workdps(CANCELLING_DIGITS):
        if k > 0:
            return 4 * pi * (sinh(2 * sqrt(k) * d) / (4 * sqrt(k)) - d / 2) / k
        if k < 0:
            return 4 * pi * (d / 2 - sin(2 * sqrt(-k) * d) / (4 * sqrt(-k))) / -k
        return 4 * pi * d**3 / 3


def minus(x, y):
    return mpf(0) if abs(x - y) < BLUR * abs(x) else x - y


def distances(model, line, z, E):
    hubble = SPEED_OF_LIGHT / KM / model.H0  # Mpc
    chi = line.until_today(z, 1)
    D_M = hubble * transverse(model.k, chi)
    D_L = D_M * (1 + z)
    return {
        "D_C_Mpc": hubble * chi,
        "D_M_Mpc": D_M,
        "D_A_Mpc": D_M / (1 + z),
        "D_L_Mpc": D_L,
        "mu_mag": 5 * log10(D_L) + 25 if z else None,
        "kpc_per_arcsec": 1000 * D_M / (1 + z) * pi / 648000,
        "V_C_Gpc3": volume(model.k, chi) * (hubble / 1000) ** 3,
        "dV_dz_Mpc3_per_deg2": D_M**2 * hubble / E * (pi / 180) ** 2,
        "D_V_Mpc": cbrt(z * D_M**2 * hubble / E),
        "t_L_Gyr": line.until_today(z, 0) / model.H0_SI / GIGAYEAR,
        "dz_dt_per_Gyr": minus(1 + z, E) * model.H0_SI * GIGAYEAR,
        "dv_dt_cm_s_yr": 100 * SPEED_OF_LIGHT * minus(1 + z, E) / (1 + z) * model.H0_SI * YEAR,
        "chi_Mpc": hubble * chi,
        "v_rec_now_c": chi,
        "v_rec_then_c": E * chi / (1 + z),
    }


def times(model, line, z, E):
    gigayears = 1 / model.H0_SI / GIGAYEAR
    age, conformal = line.since_beginning(z, 0), line.since_beginning(z, 1)
    return {
        "a": 1 / (1 + z),
        "t_Gyr": None if age is None else age * gigayears,
        "eta_Gyr": None if conformal is None else conformal * gigayears,
        "H_km_s_Mpc": model.H0 * E,
        "t_H_Gyr": gigayears / E,
        "T_CMB_K": model.T_CMB * (1 + z) or None,
    }


def densities(model, z, E):
    a = 1 / (1 + z)
    part = model.densities(a)
    cosmic = model.critical_density * E**2
    content = sum(part.values()) - part["k"]
    return {
        "E": E,
        "rho_c_kg_m3": cosmic,
        "rho_c_g_cm3": cosmic / 1000,
        "rho_c_Msun_Mpc3": cosmic * MEGAPARSEC**3 / SOLAR_MASS,
        **{f"Omega_{name}": value / E**2 for name, value in part.items()},
        "q": model.q(a),
        "w_eff": model.pressure(a) / content if any(part[name] for name in ("bc", "nu", "gamma", "DE")) else None,
    }


def horizons(model, line, z, E):
    hubble = SPEED_OF_LIGHT / KM / model.H0
    conformal, left = line.since_beginning(z, 1), line.until_end(z, 1)
    if left is not None and line.turn is not None:  # to the crunch: the way to the turning point, and all the way back
        left = left + line.until_end(line.knots[0], 1) + line.first_conformal
    return {
        "D_H_Mpc": hubble / E,
        "particle_horizon_Mpc": None if conformal is None else hubble * conformal / (1 + z),
        "event_horizon_Mpc": None if left is None else hubble * left / (1 + z),
    }


def row(model, line, z):
    if not line.exists(z):
        return {}
    E = sqrt(model.E2(1 / (1 + z)))
    return {**(distances(model, line, z, E) if z >= 0 else {}), **times(model, line, z, E), **densities(model, z, E),
            **horizons(model, line, z, E)}
