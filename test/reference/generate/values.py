"""Reference values of every column and milestone for the models of ../models.json; see ../README.md for the command."""

import json
import sys

from mpmath import mp

from agreement import REFERENCE, TOLERANCE, decimal, difference, write
from first_route import first_route
from second_route import second_route

COLUMNS = """D_C_Mpc D_M_Mpc D_A_Mpc D_L_Mpc mu_mag kpc_per_arcsec V_C_Gpc3 dV_dz_Mpc3_per_deg2 D_V_Mpc
a t_Gyr t_L_Gyr eta_Gyr H_km_s_Mpc t_H_Gyr T_CMB_K dz_dt_per_Gyr dv_dt_cm_s_yr
E rho_c_kg_m3 rho_c_g_cm3 rho_c_Msun_Mpc3 Omega_bc Omega_nu Omega_gamma Omega_DE Omega_k q w_eff
D_H_Mpc particle_horizon_Mpc event_horizon_Mpc chi_Mpc v_rec_now_c v_rec_then_c""".split()


def disagreement(place, first, second, names):
    """Largest relative difference between the two routes' answers at one place; refuses what is not confirmed."""
    unknown = (set(first) | set(second)) - set(names)
    if unknown:
        raise SystemExit(f"{place}: unexpected {sorted(unknown)}")
    worst = mp.mpf(0)
    for name in names:
        one, other = first.get(name), second.get(name)
        apart = difference(one, other) if name != "fate" else (0 if one == other else mp.inf)
        if apart > TOLERANCE:
            raise SystemExit(f"{place}: {name} differs by {mp.nstr(apart, 3)}: {one} and {other}")
        worst = max(worst, apart)
    return worst


def generate(name, model, redshifts):
    parameters = model["parameters"]
    rows, milestones = first_route(parameters, redshifts)
    second_rows, second_milestones = second_route(parameters, redshifts)
    worst = disagreement(f"{name}, milestones", milestones, second_milestones, list(milestones))
    for z, first, second in zip(redshifts, rows, second_rows, strict=True):
        worst = max(worst, disagreement(f"{name}, z = {z}", first, second, COLUMNS))
    write(REFERENCE / "values" / f"{name}.json", {
        "quantity": f"every column and milestone; the model: {model['about']}",
        "formula": "E(a)^2 = Omega_bc a^-3 + Omega_gamma a^-4 + Omega_nu(a) a^-4 + Omega_k a^-2 "
                   "+ Omega_DE a^(-3(1+w0+wa)) exp(-3 wa (1-a)); columns as defined in test/reference/README.md",
        "source": "Hogg (1999), arXiv:astro-ph/9905116, for the distances; direct quadrature, no published table used",
        "generator": "test/reference/generate/values.py",
        "command": f"/usr/bin/python3 test/reference/generate/values.py {name}",
        "precision": f"{mp.dps} decimal digits, tanh-sinh quadrature in ln a, steps halved until 42 digits stay",
        "secondRoute": "PARI/GP, 57 digits, adaptive 30-point Gauss-Legendre in a; compared to 42 digits",
        "largestDisagreement": mp.nstr(worst, 3),
    }, {
        "parameters": parameters,
        "milestones": {key: decimal(value) for key, value in milestones.items()},
        "rows": [{"z": z, **{column: decimal(row.get(column)) for column in COLUMNS}} for z, row in zip(redshifts, rows)],
    })
    print(f"{name}: {len(rows)} redshifts, the routes differ by {mp.nstr(worst, 3)}", flush=True)


def main(names):
    cases = json.loads((REFERENCE / "models.json").read_text())
    for name in names or cases["models"]:
        model = cases["models"][name]
        generate(name, model, model.get("redshifts", cases["redshifts"]))


if __name__ == "__main__":
    main(sys.argv[1:])
