"""Which integrals exist, and whether the expansion turns round; design.md section 4, "Existence"."""

from mpmath import exp, findroot, mp, mpf


def early_power(model):
    """n in E^2 ~ a^-n as a -> 0: the age exists for n > 0, the particle horizon for n > 2."""
    return max(power for density, power in (
        (model.bc, 3), (model.gamma, 4), (model.k, 2), (model.DE, 3 * (1 + model.w0 + model.wa))) if density)


def has_event_horizon(model, turning_point):
    """The integral of da / (a^2 E) to infinity exists if E^2 ends up falling more slowly than a^-2."""
    if turning_point is not None:
        return True
    return bool(model.DE) and (model.wa > 0 or (model.wa == 0 and 3 * (1 + model.w0) < 2))


def turning_point(model, digits):
    """The scale factor above 1 at which E^2 = 0, to `digits` digits, or None."""
    with mp.workdps(15):
        scan = [exp(mpf(k) / 50) for k in range(700)]
        beyond = next((k for k, a in enumerate(scan) if model.E2(a) <= 0), None)
    if beyond is None:
        return None
    with mp.workdps(60):
        rough = findroot(model.E2, (scan[beyond - 1], scan[beyond]), solver="anderson", tol=1e-40, verify=False)
    with mp.workdps(digits):
        return findroot(model.E2, (rough * (1 - mpf(10) ** -30), rough), solver="secant", tol=mpf(10) ** (4 - 2 * digits),
                        verify=False, maxsteps=20)


def fate(model, turning_point):
    """Dark energy whose density grows without limit tears everything apart in a finite time (Caldwell 2003, PRL 91, 071301)."""
    if turning_point is not None:
        return "recollapses"
    grows = model.wa > 0 or (model.wa == 0 and model.w0 < -1)
    return "big rip" if model.DE > 0 and grows else "expands forever"
