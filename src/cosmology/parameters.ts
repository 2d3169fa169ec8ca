/**
 * The cosmological parameters of one model, as decimals exactly as written ("67.36"), so that no digit is lost
 * between the keeper's file and the evaluation. Symbols and conventions: the `Omega`s are present densities over the
 * critical density; `omega_b` and `omega_c` are Omega h^2 of baryons and of cold dark matter, neutrinos excluded.
 */
export interface Parameters {
  /** Hubble constant, km/s/Mpc. */
  readonly H0: string;
  /** Matter including massive neutrinos. Given instead of `omega_b` and `omega_c`. */
  readonly Omega_m?: string | undefined;
  readonly omega_b?: string | undefined;
  readonly omega_c?: string | undefined;
  /** Curvature, > 0 open. At most one of `Omega_k` and `Omega_DE`; neither means flat. */
  readonly Omega_k?: string | undefined;
  readonly Omega_DE?: string | undefined;
  /** Dark energy equation of state w(a) = w0 + wa (1 - a). */
  readonly w0: string;
  readonly wa: string;
  /** CMB temperature today, K; "0" neglects all radiation. */
  readonly T_CMB: string;
  /** Effective number of neutrino species. */
  readonly N_eff: string;
  /** Neutrino masses, eV, one per eigenstate; empty: all massless. */
  readonly m_nu: readonly string[];
}

/** Parameters that hold a single number. */
export type ScalarParameter = Exclude<keyof Parameters, 'm_nu'>;
