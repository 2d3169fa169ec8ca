/** Relative standard uncertainties of three values that two unknowns determine. */
export interface RelativeUncertainties {
  readonly h: number;
  readonly Omega_m: number;
  /** Of Omega_m h^power; any power but 0. */
  readonly tight: number;
  readonly power: number;
}

/** Variances and covariance of x = ln h and y = ln(Omega_m h^2). */
export interface ImpliedCovariance {
  readonly xx: number;
  readonly xy: number;
  readonly yy: number;
}

/**
 * The covariance of ln h and ln(Omega_m h^2) that the uncertainties of h, Omega_m and Omega_m h^p imply:
 * Var(y - 2x) and Var(y + (p-2)x), each a sum of the three unknown terms, are solved for xy and yy.
 */
export function impliedCovariance({ h, Omega_m, tight, power }: RelativeUncertainties): ImpliedCovariance {
  const xx = h * h;
  const [a, b, q] = [Omega_m * Omega_m, tight * tight, power - 2];
  const xy = (b - a + (4 - q * q) * xx) / (2 * q + 4);
  return { xx, xy, yy: b - 2 * q * xy - q * q * xx };
}

/** What a set's parameters add to that: H0, omega_b, omega_c with their uncertainties, and omega_m = Omega_m h^2. */
export interface PhysicalDensities {
  readonly omega_b: number;
  readonly omega_c: number;
  readonly omega_m: number;
}

/** Correlation coefficients of H0, omega_b and omega_c. */
export interface ImpliedCorrelations {
  readonly H0_omega_b: number;
  readonly H0_omega_c: number;
  readonly omega_b_omega_c: number;
}

/**
 * The correlations that such a covariance implies, given the uncertainties of omega_b and omega_c and the value of
 * omega_m: with the neutrinos fixed, omega_m varies as s = omega_b + omega_c. H0 is taken to follow s alone.
 */
export function impliedCorrelations({ xx, xy, yy }: ImpliedCovariance, u: PhysicalDensities): ImpliedCorrelations {
  const s2 = u.omega_m * u.omega_m * yy;
  const between = (s2 - u.omega_b * u.omega_b - u.omega_c * u.omega_c) / (2 * u.omega_b * u.omega_c);
  const s = Math.sqrt(s2);
  const withSum = xy / Math.sqrt(xx * yy);
  return {
    H0_omega_b: withSum * ((u.omega_b + between * u.omega_c) / s),
    H0_omega_c: withSum * ((u.omega_c + between * u.omega_b) / s),
    omega_b_omega_c: between,
  };
}
