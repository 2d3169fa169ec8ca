/** One constant as it is printed in every stamp. The text is the authority; the number is parsed from it. */
export interface Constant {
  /** LaTeX. */
  readonly symbol: string;
  readonly name: string;
  /** Decimal as its source prints it, or an exact expression in words. */
  readonly value: string;
  readonly unit: string;
  readonly source: string;
}

/** Speed of light, km/s. Exact. */
export const SPEED_OF_LIGHT = 299_792.458;
/** Planck constant, J s. Exact. */
export const PLANCK = 6.626_070_15e-34;
/** Boltzmann constant, J/K. Exact. */
export const BOLTZMANN = 1.380_649e-23;
/** Elementary charge, C; also one electronvolt in J. Exact. */
export const ELEMENTARY_CHARGE = 1.602_176_634e-19;
/** Newton's constant, m3 kg-1 s-2. */
export const GRAVITATION = 6.674_3e-11;
/** Solar mass parameter (GM)_sun, m3 s-2. Exact by convention. */
export const SOLAR_GM = 1.327_124_4e20;
/** Astronomical unit, km. Exact. */
export const ASTRONOMICAL_UNIT = 149_597_870.7;
/** Megaparsec, km: 10^6 x 648000/pi au. */
export const MEGAPARSEC = ((648_000 * ASTRONOMICAL_UNIT) / Math.PI) * 1e6;
/** 10^9 Julian years of 365.25 d, s. Exact. */
export const GIGAYEAR = 365.25 * 86_400 * 1e9;
/** One arcsecond, rad. */
export const ARCSECOND = Math.PI / 648_000;

const SI = 'SI Brochure, 9th ed. (2019), exact';

/** The constants of the tables, in order of printing. */
export const CONSTANTS: readonly Constant[] = [
  { symbol: 'c', name: 'speed of light', value: '299792.458', unit: 'km/s', source: SI },
  { symbol: 'G', name: 'constant of gravitation', value: '6.67430E-11', unit: 'm3/kg/s2', source: 'CODATA 2022' },
  { symbol: 'h_{\\mathrm{P}}', name: 'Planck constant', value: '6.62607015E-34', unit: 'J s', source: SI },
  { symbol: 'k_{\\mathrm{B}}', name: 'Boltzmann constant', value: '1.380649E-23', unit: 'J/K', source: SI },
  { symbol: 'e', name: 'elementary charge', value: '1.602176634E-19', unit: 'C', source: SI },
  {
    symbol: '(GM)_\\odot',
    name: 'solar mass parameter',
    value: '1.3271244E20',
    unit: 'm3/s2',
    source: 'IAU 2015 Resolution B3',
  },
  {
    symbol: '\\mathrm{au}',
    name: 'astronomical unit',
    value: '149597870700',
    unit: 'm',
    source: 'IAU 2012 Resolution B2',
  },
  { symbol: '\\mathrm{pc}', name: 'parsec', value: '648000/pi', unit: 'au', source: 'IAU 2015 Resolution B2' },
  { symbol: '\\mathrm{yr}', name: 'Julian year', value: '365.25', unit: 'd', source: 'IAU Style Manual (1989)' },
];
