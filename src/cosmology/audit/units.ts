import type { Arithmetic } from '../../numerics/extended/arithmetic.ts';
import type { Real } from '../../numerics/extended/real.ts';
import { CONSTANTS } from '../constants.ts';

/** The constants of the stamp, from their texts, and the units that follow from them. */
export interface Units {
  /** km/s. */
  readonly lightSpeed: Real;
  /** m3 kg-1 s-2. */
  readonly gravitation: Real;
  /** J s. */
  readonly planck: Real;
  /** J/K. */
  readonly boltzmann: Real;
  /** J. */
  readonly electronvolt: Real;
  /** m3 s-2. */
  readonly solarMassParameter: Real;
  /** km: 10^6 x 648000/pi au (IAU 2015 Resolution B2). */
  readonly megaparsec: Real;
  /** s: 10^9 Julian years. */
  readonly gigayear: Real;
  /** rad. */
  readonly arcsecond: Real;
}

const SECONDS_PER_DAY = 86_400;
const ARCSECONDS_PER_RADIAN_TIMES_PI = 648_000;

/** The value that the stamp prints for a constant, as text. */
function printed(name: string): string {
  const constant = CONSTANTS.find((one) => one.name === name);
  if (constant === undefined) throw new RangeError(`the stamp prints no ${name}`);
  return constant.value;
}

function derive(arithmetic: Arithmetic): readonly Real[] {
  const constant = (name: string) => arithmetic.real(printed(name));
  const arcsecond = arithmetic.pi().over(ARCSECONDS_PER_RADIAN_TIMES_PI);
  const kilometresPerUnit = constant('astronomical unit').over(1000);
  return [
    constant('speed of light'),
    constant('constant of gravitation'),
    constant('Planck constant'),
    constant('Boltzmann constant'),
    constant('elementary charge'),
    constant('solar mass parameter'),
    kilometresPerUnit.over(arcsecond).times(1e6),
    constant('Julian year').times(SECONDS_PER_DAY).times(1e9),
    arcsecond,
  ];
}

/** Constants and units in the given arithmetic. */
export function units(arithmetic: Arithmetic): Units {
  const all = arithmetic.remember('units', () => derive(arithmetic));
  const [
    lightSpeed,
    gravitation,
    planck,
    boltzmann,
    electronvolt,
    solarMassParameter,
    megaparsec,
    gigayear,
    arcsecond,
  ] = all as [Real, Real, Real, Real, Real, Real, Real, Real, Real];
  return {
    lightSpeed,
    gravitation,
    planck,
    boltzmann,
    electronvolt,
    solarMassParameter,
    megaparsec,
    gigayear,
    arcsecond,
  };
}
