import type { Parameters } from '../cosmology/parameters.ts';

/** How a parameter is printed. */
export interface ParameterText {
  /** LaTeX. */
  readonly symbol: string;
  readonly name: string;
  /** Plain text, "" if dimensionless. */
  readonly unit: string;
}

/** All parameters, in order of printing. */
export const PARAMETER_TEXT: Readonly<Record<keyof Parameters, ParameterText>> = {
  H0: { symbol: 'H_0', name: 'Hubble constant', unit: 'km/s/Mpc' },
  Omega_m: { symbol: '\\Omega_{\\mathrm{m}}', name: 'Matter, massive neutrinos included', unit: '' },
  omega_b: { symbol: '\\omega_{\\mathrm{b}}', name: 'Baryons, physical density', unit: '' },
  omega_c: { symbol: '\\omega_{\\mathrm{c}}', name: 'Cold dark matter, physical density', unit: '' },
  Omega_k: { symbol: '\\Omega_k', name: 'Curvature', unit: '' },
  Omega_DE: { symbol: '\\Omega_{\\mathrm{DE}}', name: 'Dark energy', unit: '' },
  w0: { symbol: 'w_0', name: 'Dark energy equation of state today', unit: '' },
  wa: { symbol: 'w_a', name: 'Slope of w against 1 − a', unit: '' },
  T_CMB: { symbol: 'T_{\\mathrm{CMB}}', name: 'Temperature of the microwave background', unit: 'K' },
  N_eff: { symbol: 'N_{\\mathrm{eff}}', name: 'Effective number of neutrino species', unit: '' },
  m_nu: { symbol: 'm_\\nu', name: 'Neutrino masses', unit: 'eV' },
};
