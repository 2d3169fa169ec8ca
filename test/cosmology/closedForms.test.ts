import { describe, expect, test } from 'vitest';
import { type Background, background } from '../../src/cosmology/background.ts';
import { type Epoch, epochs } from '../../src/cosmology/epochs.ts';
import { milestoneValues } from '../../src/cosmology/milestoneValues.ts';
import type { Parameters } from '../../src/cosmology/parameters.ts';
import { QUANTITIES } from '../../src/cosmology/quantities.ts';
import { expectClose } from '../support/closeness.ts';

/** Eighteen units of the last place: the kernel's rounding and that of the closed form itself. */
const TOLERANCE = 4e-15;

/** From next door to the early universe; powers of two and others. */
const REDSHIFTS = [1e-8, 1e-4, 0.0078125, 0.1, 0.5, 1, 1.5, 3, 7, 30, 1023, 1e5];
const FUTURE = [-0.9, -0.5, -0.1, 0];

const DRY = { H0: '70', w0: '-1', wa: '0', T_CMB: '0', N_eff: '0', m_nu: [] } as const;

const model = (densities: Partial<Parameters>): Background => background({ ...DRY, ...densities });

/** In units of 1/H0, c/H0 and (c/H0)^3; what is not named is not compared. */
interface Values {
  readonly comoving?: number;
  readonly transverse?: number;
  readonly volume?: number;
  readonly age?: number;
  readonly lookback?: number;
  readonly conformalTime?: number;
  readonly conformalFuture?: number;
}

function expectValues(of: Background, redshifts: readonly number[], closedForm: (z: number) => Values): void {
  const found = epochs(of, redshifts);
  for (const [k, z] of redshifts.entries()) {
    const ours = valuesOf(of, found[k] ?? null);
    const exact = closedForm(z);
    for (const name of Object.keys(exact) as (keyof Values)[]) {
      expectClose(ours[name], exact[name] ?? Number.NaN, TOLERANCE, `${name} at z = ${z}`);
    }
  }
}

function valuesOf(of: Background, epoch: Epoch | null): Record<keyof Values, number | null> {
  if (epoch === null) throw new Error('the model never gets there');
  const length = of.hubbleDistance;
  const transverse = QUANTITIES.D_M_Mpc(of, epoch);
  const volume = QUANTITIES.V_C_Gpc3(of, epoch);
  return {
    ...epoch,
    transverse: transverse === null ? null : transverse / length,
    volume: volume === null ? null : volume / (length / 1e3) ** 3,
  };
}

const ln = Math.log1p;
/** 1 - (1+z)^-p without cancellation. */
const lost = (z: number, p: number) => -Math.expm1(-p * ln(z));

/** sinh x - x and x - sin x, the latter for `sign` -1; the series where they would cancel. */
function beyondLinear(x: number, sign: 1 | -1): number {
  if (x > 2) return sign === 1 ? Math.sinh(x) - x : x - Math.sin(x);
  let term = x;
  let sum = 0;
  for (let k = 1; k < 16; k++) {
    term *= (sign * x * x) / (2 * k * (2 * k + 1));
    sum += term;
  }
  return sign * sum;
}

describe('one component', () => {
  test('Einstein-de Sitter: D_C = 2 (1 - 1/sqrt(1+z)), t = (2/3) (1+z)^(-3/2), eta = 2/sqrt(1+z)', () => {
    expectValues(model({ Omega_m: '1' }), REDSHIFTS, (z) => ({
      comoving: 2 * lost(z, 0.5),
      transverse: 2 * lost(z, 0.5),
      volume: ((4 * Math.PI) / 3) * (2 * lost(z, 0.5)) ** 3,
      age: 2 / (3 * (1 + z) * Math.sqrt(1 + z)),
      lookback: (2 / 3) * lost(z, 1.5),
      conformalTime: 2 / Math.sqrt(1 + z),
    }));
  });

  test('Einstein-de Sitter: the particle horizon is 3 c t', () => {
    const flat = model({ Omega_m: '1' });
    for (const epoch of epochs(flat, [...FUTURE, ...REDSHIFTS])) {
      const horizon = epoch && QUANTITIES.particle_horizon_Mpc(flat, epoch);
      expectClose(horizon, 3 * (epoch?.age ?? Number.NaN) * flat.hubbleDistance, TOLERANCE, `at z = ${epoch?.z}`);
    }
  });

  // Milne: H = 1/t, and D_M = sinh ln(1+z) = z (2+z)/(2 (1+z)).
  test('an empty universe: D_C = ln(1+z), D_M = z (1 + z/2)/(1+z), t = 1/(1+z)', () => {
    expectValues(model({ Omega_m: '0', Omega_k: '1' }), REDSHIFTS, (z) => ({
      comoving: ln(z),
      transverse: (z * (1 + z / 2)) / (1 + z),
      age: 1 / (1 + z),
      lookback: z / (1 + z),
    }));
  });

  test('de Sitter: D_C = z, the lookback time is ln(1+z), and the event horizon is always c/H0', () => {
    const deSitter = model({ Omega_m: '0', Omega_DE: '1' });
    expectValues(deSitter, REDSHIFTS, (z) => ({
      comoving: z,
      lookback: ln(z),
      volume: ((4 * Math.PI) / 3) * z * z * z,
    }));
    for (const epoch of epochs(deSitter, [...FUTURE, ...REDSHIFTS])) {
      expectClose(epoch && QUANTITIES.event_horizon_Mpc(deSitter, epoch), deSitter.hubbleDistance, TOLERANCE);
      expect(epoch?.age).toBeNull();
    }
  });

  // E = (1+z)^b with b = 3 (1+w)/2; here b = 3/4.
  test('a fluid of w = -1/2 alone: t = (1+z)^-b/b, D_C = ((1+z)^(1-b) - 1)/(1-b)', () => {
    expectValues(model({ Omega_m: '0', w0: '-0.5' }), REDSHIFTS, (z) => ({
      age: (4 / 3) * Math.exp(-0.75 * ln(z)),
      comoving: 4 * Math.expm1(0.25 * ln(z)),
    }));
  });
});

describe('matter and curvature', () => {
  // Mattig (1958), Astron. Nachr. 284, 109, in the form of Terrell (1977), Am. J. Phys. 45, 869, which does not cancel.
  test.each(['0.3', '1', '2'])('Omega_m = %s: D_M is that of Mattig', (Omega_m) => {
    const q = Number(Omega_m) / 2;
    expectValues(model({ Omega_m, Omega_DE: '0' }), REDSHIFTS, (z) => ({
      transverse: (z * (1 + (z * (1 - q)) / (1 + q * z + Math.sqrt(1 + 2 * q * z)))) / (1 + z),
    }));
  });

  // a = A (cosh psi - 1), H0 t = A (sinh psi - psi)/sqrt(1 - m), A = m/(2 (1 - m)); H0 eta = psi/sqrt(1 - m).
  // Weinberg (2008), Cosmology, sect. 1.5; the lookback time is that of Carroll, Press & Turner (1992), ARA&A 30, 499.
  test.each(['0.05', '0.3', '0.9'])('Omega_m = %s, open: the hyperbolic cycloid', (Omega_m) => {
    const m = Number(Omega_m);
    const root = Math.sqrt(1 - m);
    const psi = (z: number) => 2 * Math.asinh(root / Math.sqrt(m * (1 + z)));
    const age = (z: number) => (m * beyondLinear(psi(z), 1)) / (2 * root * root * root);
    const open = model({ Omega_m, Omega_DE: '0' });
    expectValues(open, [...FUTURE, ...REDSHIFTS], (z) => ({ age: age(z), conformalTime: psi(z) / root }));
    const far = REDSHIFTS.filter((z) => z >= 0.5);
    expectValues(open, far, (z) => ({ lookback: age(0) - age(z), comoving: (psi(0) - psi(z)) / root }));
  });

  // The same with a = A (1 - cos theta), from 0 to 2 pi.
  test.each(['1.1', '2', '5'])('Omega_m = %s, closed: the cycloid, to its crunch', (Omega_m) => {
    const m = Number(Omega_m);
    const root = Math.sqrt(m - 1);
    const theta = (z: number) => 2 * Math.asin(root / Math.sqrt(m * (1 + z)));
    const half = m / (2 * root * root * root);
    const closed = model({ Omega_m, Omega_DE: '0' });
    expectValues(closed, [0, ...REDSHIFTS], (z) => ({
      age: half * beyondLinear(theta(z), -1),
      conformalTime: theta(z) / root,
      conformalFuture: (2 * Math.PI - theta(z)) / root,
    }));
    const { t_maximum, t_crunch, fate } = milestoneValues(closed);
    expectClose(t_maximum as number, half * Math.PI * closed.hubbleTime, TOLERANCE, 't_maximum');
    expectClose(t_crunch as number, 2 * half * Math.PI * closed.hubbleTime, TOLERANCE, 't_crunch');
    expect(fate).toBe('recollapses');
  });
});

describe('two components', () => {
  // Peebles (1993), Principles of Physical Cosmology; Weinberg (2008), Cosmology, chapter 1.
  test.each(['0.05', '0.3', '0.9'])('flat, Omega_m = %s and a cosmological constant: t = 2 arsinh(...)', (Omega_m) => {
    const lambda = 1 - Number(Omega_m);
    const ratio = Math.sqrt(lambda / Number(Omega_m));
    expectValues(model({ Omega_m }), [...FUTURE, ...REDSHIFTS], (z) => ({
      age: (2 / (3 * Math.sqrt(lambda))) * Math.asinh(ratio / ((1 + z) * Math.sqrt(1 + z))),
    }));
  });

  // a = sqrt(Omega_k/Omega_DE) sinh(sqrt(Omega_DE) H0 t).
  test('open, a cosmological constant without matter: t = arsinh(...)', () => {
    expectValues(model({ Omega_m: '0', Omega_DE: '0.75' }), [...FUTURE, ...REDSHIFTS], (z) => ({
      age: Math.asinh(Math.sqrt(3) / (1 + z)) / Math.sqrt(0.75),
    }));
  });

  // H0 t = (4 a_eq^2/(3 sqrt r)) (1 - (1 - y/2) sqrt(1+y)), y = a/a_eq; Peebles (1993), Ryden (2017). Where the bracket
  // cancels it is multiplied by its conjugate. H0 eta = (2/sqrt m) (sqrt(a + a_eq) - sqrt a_eq).
  test('flat, matter and radiation: t and eta from the radiation era on', () => {
    const wet = background({ ...DRY, Omega_m: '0.3', T_CMB: '20', N_eff: '3.044' });
    const r = wet.photons + wet.masslessNeutrinos;
    const m = 1 - r;
    expect(r).toBeGreaterThan(0.1);
    const equal = r / m;
    const bracket = (y: number) => {
      const turned = (1 - y / 2) * Math.sqrt(1 + y);
      return y < 1 ? (y * y * (3 - y)) / (4 * (1 + turned)) : 1 - turned;
    };
    const flat = { ...wet, matter: m, curvature: 0, darkEnergy: 0 };
    expectValues(flat, [...FUTURE, ...REDSHIFTS], (z) => {
      const a = 1 / (1 + z);
      return {
        age: ((4 * equal * equal) / (3 * Math.sqrt(r))) * bracket(a / equal),
        conformalTime: (2 * a) / Math.sqrt(m) / (Math.sqrt(a + equal) + Math.sqrt(equal)),
      };
    });
  });
});
