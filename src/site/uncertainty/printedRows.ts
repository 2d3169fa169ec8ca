/** A value and its standard uncertainty, as printed. */
export interface PrintedValue {
  readonly value: string;
  readonly u: string;
}

/** What a paper prints beside the parameters of a set, for the correlations and for the check of what follows. */
export interface PrintedRows {
  /** Id of the parameter set. */
  readonly set: string;
  /** How the rows came here. */
  readonly status: 'read' | 'remembered';
  /** Total matter with massive neutrinos. */
  readonly Omega_m: PrintedValue;
  /** Omega_m h^power, known better than its factors. */
  readonly tight: PrintedValue & { readonly power: 2 | 3 };
  /** Standard uncertainties of derived values; Gyr for the age. */
  readonly derived: readonly { readonly of: 'omega_m' | 'age_today' | 'z_equality'; readonly u: string }[];
  /** Redshift of recombination, sound horizon in Mpc and 100 times its angle there: their ratio is D_M. */
  readonly recombination?: { readonly z: string; readonly sound: PrintedValue; readonly angle: PrintedValue };
}

/**
 * Planck 2018: Planck Collaboration VI (2020), table 2. Planck 2015: Planck Collaboration XIII (2016), table 4. WMAP:
 * Hinshaw et al. (2013), tables 2 to 4, with half the width of the interval +0.0096 -0.0095 for Omega_m; the age is from
 * the abstract of Bennett et al. (2013).
 */
export const PRINTED_ROWS: readonly PrintedRows[] = [
  {
    set: 'planck-2018-lensing',
    status: 'read',
    Omega_m: { value: '0.3153', u: '0.0073' },
    tight: { power: 3, value: '0.09633', u: '0.00030' },
    derived: [
      { of: 'omega_m', u: '0.0011' },
      { of: 'age_today', u: '0.023' },
      { of: 'z_equality', u: '26' },
    ],
    recombination: {
      z: '1089.92',
      sound: { value: '144.43', u: '0.26' },
      angle: { value: '1.04110', u: '0.00031' },
    },
  },
  {
    set: 'planck-2018-bao',
    status: 'read',
    Omega_m: { value: '0.3111', u: '0.0056' },
    tight: { power: 3, value: '0.09635', u: '0.00030' },
    derived: [
      { of: 'omega_m', u: '0.00087' },
      { of: 'age_today', u: '0.020' },
      { of: 'z_equality', u: '21' },
    ],
    recombination: {
      z: '1089.80',
      sound: { value: '144.57', u: '0.22' },
      angle: { value: '1.04119', u: '0.00029' },
    },
  },
  {
    set: 'planck-2015-ext',
    status: 'remembered',
    Omega_m: { value: '0.3089', u: '0.0062' },
    tight: { power: 2, value: '0.14170', u: '0.00097' },
    derived: [
      { of: 'age_today', u: '0.021' },
      { of: 'z_equality', u: '23' },
    ],
    recombination: {
      z: '1089.90',
      sound: { value: '144.81', u: '0.24' },
      angle: { value: '1.04112', u: '0.00029' },
    },
  },
  {
    set: 'wmap-9-combined',
    status: 'remembered',
    Omega_m: { value: '0.2865', u: '0.00955' },
    tight: { power: 2, value: '0.1376', u: '0.0020' },
    derived: [
      { of: 'age_today', u: '0.059' },
      { of: 'z_equality', u: '47' },
    ],
  },
];
