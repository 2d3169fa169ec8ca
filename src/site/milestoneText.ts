import type { MilestoneName } from '../cosmology/milestones.ts';

/** The words and the formula of one milestone. */
export interface MilestoneText {
  readonly name: string;
  /** LaTeX; the fate has none. */
  readonly symbol?: string;
  /** LaTeX of the defining formula or condition; the fate has none. */
  readonly formula?: string;
  /** One sentence; says when there is no value. */
  readonly definition: string;
  /** Column whose page says more. */
  readonly quantity: string;
}

/** The text of every milestone; a name without one does not compile. */
export const MILESTONE_TEXT: Readonly<Record<MilestoneName, MilestoneText>> = {
  hubble_time: {
    name: 'Hubble time',
    symbol: 't_{H,0}',
    formula: 't_{H,0} = \\frac{1}{H_0}',
    definition: 'The time in which space would grow by its whole size at the rate of today.',
    quantity: 't_H_Gyr',
  },
  hubble_distance: {
    name: 'Hubble distance',
    symbol: 'D_{H,0}',
    formula: 'D_{H,0} = \\frac{c}{H_0}',
    definition: 'The distance at which the recession velocity equals the speed of light today.',
    quantity: 'D_H_Mpc',
  },
  critical_density_SI: {
    name: 'Critical density today (SI)',
    symbol: '\\rho_{\\mathrm{c},0}',
    formula: '\\rho_{\\mathrm{c},0} = \\frac{3 H_0^2}{8 \\pi G}',
    definition: 'The density that makes space flat at the Hubble rate of today, in kilograms per cubic metre.',
    quantity: 'rho_c_kg_m3',
  },
  critical_density_cgs: {
    name: 'Critical density today (cgs)',
    symbol: '\\rho_{\\mathrm{c},0}',
    formula: '\\rho_{\\mathrm{c},0} = \\frac{3 H_0^2}{8 \\pi G}',
    definition: 'The density that makes space flat at the Hubble rate of today, in grams per cubic centimetre.',
    quantity: 'rho_c_g_cm3',
  },
  critical_density_Msun: {
    name: 'Critical density today (solar masses)',
    symbol: '\\rho_{\\mathrm{c},0}',
    formula: '\\rho_{\\mathrm{c},0} = \\frac{3 H_0^2}{8 \\pi \\, (GM)_\\odot}',
    definition: 'The density that makes space flat at the Hubble rate of today, in solar masses per cubic megaparsec.',
    quantity: 'rho_c_Msun_Mpc3',
  },
  age_today: {
    name: 'Age of the universe',
    symbol: 't_0',
    formula: "t_0 = \\frac{1}{H_0} \\int_0^\\infty \\frac{\\mathrm{d}z'}{(1+z') \\, E(z')}",
    definition: 'The time from the Big Bang until today; blank where there was none.',
    quantity: 't_Gyr',
  },
  z_equality: {
    name: 'Redshift of matter-radiation equality',
    symbol: 'z_{\\mathrm{eq}}',
    formula:
      '1 + z_{\\mathrm{eq}} = \\frac{\\Omega_{\\mathrm{bc}}}{\\Omega_\\gamma} \\left[ 1 + \\frac{7}{8} \\left( \\frac{4}{11} \\right)^{4/3} N_{\\mathrm{eff}} \\right]^{-1}',
    definition:
      'The redshift at which baryons and cold dark matter were as dense as photons and all neutrinos, these counted as if massless; blank without radiation.',
    quantity: 'Omega_bc',
  },
  t_equality: {
    name: 'Age at matter-radiation equality',
    symbol: 't_{\\mathrm{eq}}',
    formula: 't_{\\mathrm{eq}} = t(z_{\\mathrm{eq}})',
    definition: 'The age of the universe when matter and radiation were equally dense.',
    quantity: 't_Gyr',
  },
  z_acceleration: {
    name: 'Redshift of the onset of acceleration',
    symbol: 'z_{\\mathrm{acc}}',
    formula: 'q(z_{\\mathrm{acc}}) = 0',
    definition:
      'The redshift at which the expansion first began to accelerate, negative if that is still to come; blank for a model that never accelerates, or always.',
    quantity: 'q',
  },
  t_acceleration: {
    name: 'Age at the onset of acceleration',
    symbol: 't_{\\mathrm{acc}}',
    formula: 't_{\\mathrm{acc}} = t(z_{\\mathrm{acc}})',
    definition: 'The age of the universe when the expansion first began to accelerate.',
    quantity: 't_Gyr',
  },
  z_matter_DE_equality: {
    name: 'Redshift of equality of matter and dark energy',
    symbol: 'z_{\\mathrm{DE}}',
    formula:
      '\\Omega_{\\mathrm{bc}}(z_{\\mathrm{DE}}) + \\Omega_{\\nu,\\mathrm{massive}}(z_{\\mathrm{DE}}) = \\Omega_{\\mathrm{DE}}(z_{\\mathrm{DE}})',
    definition:
      'The redshift at which dark energy first became as dense as matter, massive neutrinos included; blank where it never does.',
    quantity: 'Omega_DE',
  },
  t_matter_DE_equality: {
    name: 'Age at equality of matter and dark energy',
    symbol: 't_{\\mathrm{DE}}',
    formula: 't_{\\mathrm{DE}} = t(z_{\\mathrm{DE}})',
    definition: 'The age of the universe when dark energy first became as dense as matter.',
    quantity: 't_Gyr',
  },
  z_largest_D_A: {
    name: 'Redshift of the largest angular diameter distance',
    symbol: 'z_{A}',
    formula: '\\frac{\\mathrm{d}D_A}{\\mathrm{d}z} (z_{A}) = 0',
    definition:
      'The redshift at which an object of given proper size looks smallest, the first such going back in time; blank where there is none.',
    quantity: 'D_A_Mpc',
  },
  largest_D_A: {
    name: 'Largest angular diameter distance',
    symbol: 'D_A(z_{A})',
    formula: '\\frac{D_M(z_{A})}{1 + z_{A}}',
    definition: 'The angular diameter distance at its maximum.',
    quantity: 'D_A_Mpc',
  },
  z_recession_c: {
    name: 'Redshift of sources that recede at the speed of light today',
    symbol: 'z_{c}',
    formula: 'D_C(z_{c}) = \\frac{c}{H_0}',
    definition:
      'The redshift, as seen now, of sources whose proper distance grows at the speed of light now; blank where no source is far enough.',
    quantity: 'v_rec_now_c',
  },
  particle_horizon_today: {
    name: 'Particle horizon today',
    symbol: 'R_{\\mathrm{p},0}',
    formula: "R_{\\mathrm{p},0} = \\frac{c}{H_0} \\int_0^\\infty \\frac{\\mathrm{d}z'}{E(z')}",
    definition:
      'The proper distance today of the farthest matter that can have been seen; blank where the integral diverges.',
    quantity: 'particle_horizon_Mpc',
  },
  event_horizon_today: {
    name: 'Event horizon today',
    symbol: 'R_{\\mathrm{e},0}',
    formula: "R_{\\mathrm{e},0} = \\int_{t_0}^{t_{\\mathrm{end}}} \\frac{c \\, \\mathrm{d}t'}{a(t')}",
    definition:
      'The proper distance today beyond which what happens now will never be seen; blank where the integral diverges.',
    quantity: 'event_horizon_Mpc',
  },
  fate: {
    name: 'Fate',
    definition:
      'What the parameters, taken literally, say of the future: the model expands forever, recollapses, or ends in a big rip, where dark energy grows without limit.',
    quantity: 'Omega_DE',
  },
  t_maximum: {
    name: 'Age at the largest expansion',
    symbol: 't_{\\mathrm{max}}',
    formula: 'H(t_{\\mathrm{max}}) = 0',
    definition: 'The age at which a recollapsing model stops expanding; blank for all others.',
    quantity: 'a',
  },
  t_crunch: {
    name: 'Age at the crunch',
    symbol: 't_{\\mathrm{crunch}}',
    formula: 't_{\\mathrm{crunch}} = 2 \\, t_{\\mathrm{max}}',
    definition: 'The age at which a recollapsing model ends, as it is symmetric in time; blank for all others.',
    quantity: 'event_horizon_Mpc',
  },
};
