import type { Parameters, ScalarParameter } from '../../src/cosmology/parameters.ts';
import type { UncertainParameters } from '../../src/cosmology/uncertain.ts';

/** Flat, matter only. */
export const EINSTEIN_DE_SITTER: Parameters = {
  H0: '70',
  Omega_m: '1',
  Omega_DE: '0',
  w0: '-1',
  wa: '0',
  T_CMB: '0',
  N_eff: '0',
  m_nu: [],
};

/** Flat, matter and a cosmological constant, no radiation. */
export const FLAT_LAMBDA: Parameters = {
  H0: '70',
  Omega_m: '0.3',
  w0: '-1',
  wa: '0',
  T_CMB: '0',
  N_eff: '0',
  m_nu: [],
};

/** Parameters with uncertainties. */
export function uncertain(
  parameters: Parameters,
  uncertainties: Partial<Record<ScalarParameter, string>>,
  correlations: UncertainParameters['correlations'] = [],
): UncertainParameters {
  return { parameters, uncertainties, correlations };
}
