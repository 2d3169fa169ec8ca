import { Decimal } from '../../numerics/decimal.ts';
import type { Arithmetic } from '../../numerics/extended/arithmetic.ts';
import type { Real } from '../../numerics/extended/real.ts';
import type { Parameters } from '../parameters.ts';
import { relicEnergy } from './relic.ts';
import { units } from './units.ts';

/** A neutrino eigenstate with mass. */
export interface Eigenstate {
  /** Its density today over critical, if it had no mass. */
  readonly relativistic: Real;
  /** m c^2/(k_B T_nu) today. */
  readonly y0: Real;
}

/** Present densities over the critical density, and the scales of a parameter set. */
export interface Model {
  readonly arithmetic: Arithmetic;
  /** km/s/Mpc. */
  readonly H0: Real;
  /** c/H0, Mpc. */
  readonly hubbleDistance: Real;
  /** 1/H0, Gyr. */
  readonly hubbleTime: Real;
  /** Critical density today, kg/m3. */
  readonly criticalDensity: Real;
  /** The same in solar masses per Mpc3, with (GM)_sun in the place of G times a mass. */
  readonly criticalDensityInSuns: Real;
  /** K. */
  readonly temperature: Real;
  /** Baryons and cold dark matter. */
  readonly matter: Real;
  readonly photons: Real;
  /** Neutrinos without mass. */
  readonly massless: Real;
  readonly eigenstates: readonly Eigenstate[];
  /** All N_eff as if without mass. */
  readonly allMassless: Real;
  readonly curvature: Real;
  readonly darkEnergy: Real;
  readonly w0: Real;
  readonly wa: Real;
  /** 3 (1 + w0 + wa): the power of 1 + z that dark energy follows early on. */
  readonly darkPower: Real;
}

const ONE = Decimal.parse('1');
const THREE = Decimal.parse('3');

/** rho_crit = 3 H0^2/(8 pi G), kg/m3. */
function criticalDensity(arithmetic: Arithmetic, H0: Real): Real {
  const { megaparsec, gravitation } = units(arithmetic);
  return H0.over(megaparsec).squared().times(3).over(gravitation.times(arithmetic.pi()).times(8));
}

/** 3 H0^2/(8 pi (GM)_sun), Mpc^-3; one of the megaparsecs of H0^2 is left when both become metres. */
function criticalDensityInSuns(arithmetic: Arithmetic, H0: Real): Real {
  const { megaparsec, solarMassParameter } = units(arithmetic);
  const perSquareMegaparsec = H0.times(1000)
    .squared()
    .times(3)
    .over(solarMassParameter.times(arithmetic.pi()).times(8));
  return perSquareMegaparsec.times(megaparsec).times(1000);
}

/** rho_gamma = a_rad T^4/c^2 with a_rad = 8 pi^5 k_B^4/(15 h^3 c^3), kg/m3. */
function photonDensity(arithmetic: Arithmetic, temperature: Real): Real {
  const { boltzmann, planck, lightSpeed } = units(arithmetic);
  const c = lightSpeed.times(1000);
  const radiationConstant = arithmetic
    .pi()
    .power(5)
    .times(boltzmann.power(4))
    .times(8)
    .over(planck.times(c).power(3).times(15));
  return radiationConstant.times(temperature.power(4)).over(c.squared());
}

/**
 * Neutrinos: each of n eigenstates holds N_eff/n of the effective number. Relativistic density (7/8)(4/11)^(4/3) N_eff
 * times that of the photons; T_nu = (4/11)^(1/3) (N_eff/n)^(1/4) T_CMB.
 */
function neutrinos(arithmetic: Arithmetic, parameters: Parameters, photons: Real, temperature: Real) {
  const { boltzmann, electronvolt } = units(arithmetic);
  const count = Math.max(1, parameters.m_nu.length);
  const number = arithmetic.real(parameters.N_eff);
  const cooling = arithmetic.real(4).over(11).cbrt();
  const allMassless = cooling.power(4).times(7).over(8).times(number).times(photons);
  const neutrinoTemperature = cooling.times(number.over(count).sqrt().sqrt()).times(temperature);
  const relativistic = allMassless.over(count);
  const masses = parameters.m_nu.filter((mass) => !Decimal.parse(mass).isZero());
  const eigenstates = masses.map((mass) => ({
    relativistic,
    y0: arithmetic.real(mass).times(electronvolt).over(boltzmann.times(neutrinoTemperature)),
  }));
  return { allMassless, eigenstates, massless: relativistic.times(count - masses.length) };
}

/** Densities today of matter, and of all that is not radiation, curvature or dark energy. */
function matterToday(arithmetic: Arithmetic, parameters: Parameters, H0: Real, massive: Real) {
  if (parameters.Omega_m !== undefined) {
    const total = arithmetic.real(parameters.Omega_m);
    return { matter: total.minus(massive), total };
  }
  const physical = Decimal.parse(parameters.omega_b ?? '0').plus(Decimal.parse(parameters.omega_c ?? '0'));
  const matter = arithmetic.real(physical.toString()).over(H0.over(100).squared());
  return { matter, total: matter.plus(massive) };
}

/** 1 - Omega_m - the given one of Omega_k and Omega_DE; decimals are subtracted exactly, so that 0.3 + 0.7 closes to 0. */
function rest(arithmetic: Arithmetic, parameters: Parameters, total: Real): Real {
  const given = ONE.minus(Decimal.parse(parameters.Omega_DE ?? parameters.Omega_k ?? '0'));
  if (parameters.Omega_m === undefined) return arithmetic.real(given.toString()).minus(total);
  return arithmetic.real(given.minus(Decimal.parse(parameters.Omega_m)).toString());
}

/**
 * The model that a parameter set describes; what of Omega_k and Omega_DE is not given follows from the sum being 1.
 *
 * Source: Hogg (1999), astro-ph/9905116, eqs. 2 to 7; neutrinos: Lesgourgues & Pastor (2006), Phys. Rep. 429, 307.
 * The numbers live in the scope that calls.
 */
export function auditModel(arithmetic: Arithmetic, parameters: Parameters): Model {
  const { lightSpeed, megaparsec, gigayear } = units(arithmetic);
  const H0 = arithmetic.real(parameters.H0);
  const temperature = arithmetic.real(parameters.T_CMB);
  const critical = criticalDensity(arithmetic, H0);
  const photons = photonDensity(arithmetic, temperature).over(critical);
  const { allMassless, eigenstates, massless } = neutrinos(arithmetic, parameters, photons, temperature);
  const massive = eigenstates.reduce(
    (sum, { relativistic, y0 }) => sum.plus(relativistic.times(relicEnergy(arithmetic, y0))),
    arithmetic.real(0),
  );
  const { matter, total } = matterToday(arithmetic, parameters, H0, massive);
  const closing = rest(arithmetic, parameters, total).minus(photons).minus(massless);
  const givesDarkEnergy = parameters.Omega_DE !== undefined;
  const power = THREE.times(ONE.plus(Decimal.parse(parameters.w0)).plus(Decimal.parse(parameters.wa)));
  return {
    arithmetic,
    H0,
    hubbleDistance: lightSpeed.over(H0),
    hubbleTime: megaparsec.over(H0).over(gigayear),
    criticalDensity: critical,
    criticalDensityInSuns: criticalDensityInSuns(arithmetic, H0),
    temperature,
    matter,
    photons,
    massless,
    eigenstates,
    allMassless,
    curvature: givesDarkEnergy ? closing : arithmetic.real(parameters.Omega_k ?? '0'),
    darkEnergy: givesDarkEnergy ? arithmetic.real(parameters.Omega_DE ?? '0') : closing,
    w0: arithmetic.real(parameters.w0),
    wa: arithmetic.real(parameters.wa),
    darkPower: arithmetic.real(power.toString()),
  };
}
