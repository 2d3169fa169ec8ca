import {
  ELEMENTARY_CHARGE,
  GIGAYEAR,
  GRAVITATION,
  MEGAPARSEC,
  PLANCK,
  SPEED_OF_LIGHT,
} from '../../cosmology/constants.ts';

/** Light-years in a megaparsec: MEGAPARSEC is in km, the light-year is c times 365.25 d. */
const GIGALIGHTYEARS = MEGAPARSEC / (SPEED_OF_LIGHT * GIGAYEAR);
const METRES = 1e3;
/** c^2 over the electronvolt: a density of 1 kg/m3 in eV/m3. */
const ELECTRONVOLTS = (SPEED_OF_LIGHT * METRES * SPEED_OF_LIGHT * METRES) / ELEMENTARY_CHARGE;
const CUBIC_METRES_PER_CUBIC_CENTIMETRE = 1e-6;

/** How a value of the tables becomes one in the unit a paper prints, by name. */
export const CONVERSIONS = {
  'Gyr in Myr': (time: number) => time * 1e3,
  'Gyr in kyr': (time: number) => time * 1e6,
  'Gyr in yr': (time: number) => time * 1e9,
  'Gyr in s': (time: number) => time * GIGAYEAR,
  'Mpc in Gpc': (length: number) => length / 1e3,
  'Mpc in m': (length: number) => length * MEGAPARSEC * METRES,
  'Mpc in Gly': (length: number) => length * GIGALIGHTYEARS,
  'radius in Mpc, its ball in Gly3': (radius: number) => ballOf(radius * GIGALIGHTYEARS),
  'radius in Mpc, entropy of its horizon in k': (radius: number) => horizonEntropy(radius * MEGAPARSEC * METRES),
  'kg/m3 in GeV/cm3': (density: number) => (density * ELECTRONVOLTS * CUBIC_METRES_PER_CUBIC_CENTIMETRE) / 1e9,
  'kg/m3 in eV/cm3': (density: number) => density * ELECTRONVOLTS * CUBIC_METRES_PER_CUBIC_CENTIMETRE,
  'redshift in scale factor': (z: number) => 1 / (1 + z),
} as const;

export type Conversion = keyof typeof CONVERSIONS;

/** Volume of a ball in flat space. */
function ballOf(radius: number): number {
  return ((4 * Math.PI) / 3) * radius * radius * radius;
}

/** pi R^2 c^3/(hbar G), R in m: Gibbons & Hawking (1977), PRD 15, 2738. */
function horizonEntropy(radius: number): number {
  const c = SPEED_OF_LIGHT * METRES;
  return (2 * Math.PI * Math.PI * radius * radius * c * c * c) / (PLANCK * GRAVITATION);
}
