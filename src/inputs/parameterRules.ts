import type { Parameters, ScalarParameter } from '../cosmology/parameters.ts';
import type { NumberRule } from './numberRules.ts';

const PER_CENT = { looksLike: 'per cent', factor: '0.01' };

/**
 * What each parameter must be. Lower bounds are physical, or keep a slip of unit out; upper bounds lie far beyond any
 * universe and catch percentages, wrong units and lost decimal points.
 */
export const PARAMETER_RULES: Readonly<Record<keyof Parameters, NumberRule>> = {
  H0: {
    what: 'a number in km/s/Mpc',
    least: '1',
    most: '1000',
    slip: { looksLike: 'h = H0/100', factor: '1e2' },
  },
  Omega_m: { what: 'the matter density over the critical density', least: '0', most: '10', slip: PER_CENT },
  omega_b: { what: 'the baryon density Omega_b h^2', least: '0', most: '1', slip: PER_CENT },
  omega_c: { what: 'the cold dark matter density Omega_c h^2', least: '0', most: '1', slip: PER_CENT },
  Omega_k: { what: 'the curvature, positive if open', least: '-10', most: '10', slip: PER_CENT },
  Omega_DE: { what: 'the dark energy density over the critical density', least: '-10', most: '10', slip: PER_CENT },
  w0: { what: 'the equation of state today, -1 for a cosmological constant', least: '-10', most: '10' },
  wa: { what: 'the change of the equation of state, 0 for none', least: '-20', most: '20' },
  T_CMB: {
    what: 'a temperature in K, 0 to neglect radiation',
    least: '0',
    most: '100',
    slip: { looksLike: 'mK', factor: '0.001' },
  },
  N_eff: { what: 'the effective number of neutrino species', least: '0', most: '100' },
  m_nu: {
    what: 'a neutrino mass in eV',
    least: '0',
    most: '10',
    slip: { looksLike: 'meV', factor: '0.001' },
  },
};

/** The parameters that hold a single number, in order of printing. */
export const SCALAR_PARAMETERS = [
  'H0',
  'Omega_m',
  'omega_b',
  'omega_c',
  'Omega_k',
  'Omega_DE',
  'w0',
  'wa',
  'T_CMB',
  'N_eff',
] as const satisfies readonly ScalarParameter[];

/** Does the mapping have keys that are no parameters? Then one of them may be a parameter misspelt. */
export function hasUnknownKeys(parameters: object): boolean {
  return Object.keys(parameters).some((key) => !Object.hasOwn(PARAMETER_RULES, key));
}
