import { Decimal } from '../numerics/decimal.ts';
import {
  BOLTZMANN,
  ELEMENTARY_CHARGE,
  GIGAYEAR,
  GRAVITATION,
  MEGAPARSEC,
  PLANCK,
  SPEED_OF_LIGHT,
} from './constants.ts';
import type { Parameters } from './parameters.ts';
import { relicNeutrino } from './relicNeutrinos.ts';

/** A massive neutrino eigenstate. */
export interface MassiveNeutrino {
  /** Density today over critical, if it were massless. */
  readonly relativistic: number;
  /** m c^2 / (k_B T_nu) today. */
  readonly y0: number;
}

/**
 * Bounds on the relative rounding errors of the present densities, in units of the unit roundoff 2^-53. They count one
 * unit for each operation and for each rounded constant on the way; see the functions that compute the densities.
 */
export interface DensityErrors {
  readonly matter: number;
  readonly photons: number;
  readonly masslessNeutrinos: number;
  readonly massiveNeutrinos: number;
  readonly curvature: number;
  readonly darkEnergy: number;
}

/** A homogeneous model ready for evaluation: present densities over the critical density, and the scales. */
export interface Background {
  /** Hubble constant, km/s/Mpc. */
  readonly H0: number;
  /** c/H0, Mpc. */
  readonly hubbleDistance: number;
  /** 1/H0, Gyr. */
  readonly hubbleTime: number;
  /** CMB temperature today, K; 0 neglects radiation. */
  readonly temperature: number;
  /** Baryons and cold dark matter. */
  readonly matter: number;
  readonly photons: number;
  /** All massless neutrinos together. */
  readonly masslessNeutrinos: number;
  readonly massiveNeutrinos: readonly MassiveNeutrino[];
  /** All N_eff as if massless. */
  readonly allMassless: number;
  readonly curvature: number;
  readonly darkEnergy: number;
  /** 1 + w0, from the decimals as written. */
  readonly onePlusW0: number;
  /** 1 + w0 + wa, from the decimals as written. */
  readonly onePlusW: number;
  readonly wa: number;
  readonly errors: DensityErrors;
}

/** a_rad T^4: 5 roundings for k T/h, three times that and the powers of c and pi, and 3 H0^2/(8 pi G) twice over. */
const PHOTON_ERROR = 70;
/** The photons and the powers of 4/11. */
const MASSLESS_ERROR = PHOTON_ERROR + 8;
/** That, 18 for the tables of the relic energy, and 14 for y, on which it depends at most linearly. */
const MASSIVE_ERROR = MASSLESS_ERROR + 32;

const ONE = Decimal.parse('1');
const HUNDRED_SQUARED = 1e4;

/** Photon density over critical: a_rad T^4/c^2 over 3 H0^2/(8 pi G), a_rad = 8 pi^5 k_B^4/(15 h^3 c^3). */
function photonDensity(temperature: number, H0: number): number {
  const thermal = (BOLTZMANN * temperature) / PLANCK;
  const c = SPEED_OF_LIGHT * 1e3;
  const inverseWavelength = thermal / c;
  const energy = BOLTZMANN * temperature * inverseWavelength * inverseWavelength * inverseWavelength;
  const pi2 = Math.PI * Math.PI;
  const density = (8 * pi2 * pi2 * Math.PI * energy) / (15 * c * c);
  const rate = H0 / MEGAPARSEC;
  return density / ((3 * rate * rate) / (8 * Math.PI * GRAVITATION));
}

/** T_nu/T_CMB = (4/11)^(1/3) (N_eff/n)^(1/4) for n eigenstates. */
function neutrinoTemperatureRatio(perState: number): number {
  return Math.cbrt(4 / 11) * Math.sqrt(Math.sqrt(perState));
}

/** Massless density of all N_eff over the photon density: (7/8) (4/11)^(4/3) N_eff. */
function masslessRatio(N: number): number {
  return (7 / 8) * (4 / 11) * Math.cbrt(4 / 11) * N;
}

/** Density today of one massive eigenstate over critical. */
function presentDensity({ relativistic, y0 }: MassiveNeutrino): number {
  return relativistic * relicNeutrino(y0).energy;
}

const sum = (terms: readonly number[]): number => terms.reduce((total, term) => total + term, 0);

function neutrinos(parameters: Parameters, temperature: number, photons: number) {
  const N = Number(parameters.N_eff);
  const states = parameters.m_nu.length;
  const allMassless = photons * masslessRatio(N);
  const thermal = BOLTZMANN * temperature * neutrinoTemperatureRatio(N / Math.max(1, states));
  const massiveNeutrinos = parameters.m_nu
    .map(Number)
    .filter((mass) => mass > 0)
    .map((mass) => ({ relativistic: allMassless / states, y0: (mass * ELEMENTARY_CHARGE) / thermal }));
  const masslessNeutrinos = states === 0 ? allMassless : (allMassless * (states - massiveNeutrinos.length)) / states;
  return { allMassless, massiveNeutrinos, masslessNeutrinos };
}

/**
 * The model that a parameter set describes.
 *
 * What of Omega_k and Omega_DE is not given follows from the sum of all densities being 1. The decimals are added
 * exactly before they become doubles, so that 0.3 and 0.7 close to a curvature of exactly 0.
 *
 * Source: Hogg (1999), astro-ph/9905116, eqs. 5-7; neutrinos: Lesgourgues & Pastor (2006), Phys. Rep. 429, 307.
 * Domain: checked parameters (src/inputs); nothing is checked again here.
 */
export function background(parameters: Parameters): Background {
  const H0 = Number(parameters.H0);
  const temperature = Number(parameters.T_CMB);
  const photons = photonDensity(temperature, H0);
  const { allMassless, massiveNeutrinos, masslessNeutrinos } = neutrinos(parameters, temperature, photons);
  const massive = sum(massiveNeutrinos.map(presentDensity));
  const { matter, rest, matterError, restError } = matterAndRest(parameters, H0, massive);
  const closing = rest - (photons + masslessNeutrinos);
  const closingError =
    restError + PHOTON_ERROR * photons + MASSLESS_ERROR * masslessNeutrinos + (photons > 0 ? 2 * Math.abs(rest) : 0);
  const givesDarkEnergy = parameters.Omega_DE !== undefined;
  const relative = (error: number, value: number) => (error === 0 ? 0 : error / Math.abs(value));
  const w0 = Decimal.parse(parameters.w0);
  return {
    H0,
    hubbleDistance: SPEED_OF_LIGHT / H0,
    hubbleTime: MEGAPARSEC / H0 / GIGAYEAR,
    temperature,
    matter,
    photons,
    masslessNeutrinos,
    massiveNeutrinos,
    allMassless,
    curvature: givesDarkEnergy ? closing : Number(parameters.Omega_k ?? 0),
    darkEnergy: givesDarkEnergy ? Number(parameters.Omega_DE) : closing,
    onePlusW0: ONE.plus(w0).toNumber(),
    onePlusW: ONE.plus(w0).plus(Decimal.parse(parameters.wa)).toNumber(),
    wa: Number(parameters.wa),
    errors: {
      matter: relative(matterError, matter),
      photons: PHOTON_ERROR,
      masslessNeutrinos: MASSLESS_ERROR,
      massiveNeutrinos: MASSIVE_ERROR,
      curvature: givesDarkEnergy ? relative(closingError, closing) : 1,
      darkEnergy: givesDarkEnergy ? 1 : relative(closingError, closing),
    },
  };
}

interface MatterAndRest {
  readonly matter: number;
  readonly rest: number;
  /** Bounds on the absolute rounding errors, in units of 2^-53. */
  readonly matterError: number;
  readonly restError: number;
}

/** Omega_bc, and what is left of 1 after all matter and after the given one of Omega_k and Omega_DE. */
function matterAndRest(parameters: Parameters, H0: number, massive: number): MatterAndRest {
  const given = ONE.minus(Decimal.parse(parameters.Omega_DE ?? parameters.Omega_k ?? '0'));
  const massiveError = MASSIVE_ERROR * massive;
  if (parameters.Omega_m !== undefined) {
    const total = Decimal.parse(parameters.Omega_m);
    const rest = given.minus(total).toNumber();
    return {
      matter: total.toNumber() - massive,
      rest,
      matterError: massiveError + 2 * total.toNumber(),
      restError: Math.abs(rest),
    };
  }
  const physical = Decimal.parse(parameters.omega_b ?? '0').plus(Decimal.parse(parameters.omega_c ?? '0'));
  const matter = (physical.toNumber() * HUNDRED_SQUARED) / (H0 * H0);
  const matterError = 6 * matter;
  return {
    matter,
    rest: given.toNumber() - matter - massive,
    matterError,
    restError: matterError + massiveError + 3 * Math.abs(given.toNumber()),
  };
}
