import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type Background, background } from '../../src/cosmology/background.ts';
import { densities } from '../../src/cosmology/densities.ts';
import { type Epoch, epochs } from '../../src/cosmology/epochs.ts';
import { QUANTITIES, type QuantityId } from '../../src/cosmology/quantities.ts';
import { turningPoints } from '../../src/cosmology/turningPoints.ts';
import { expectClose } from '../support/closeness.ts';

const SEEDED = { seed: 20260203, numRuns: 60 } as const;

/** Decimals from `least` to `most` in steps of 0.01, as a keeper writes them. */
const decimal = (least: number, most: number) =>
  fc.integer({ min: Math.round(least * 100), max: Math.round(most * 100) }).map((n) => (n / 100).toFixed(2));

/** Models that expand from a Big Bang until today at least: all components, curved, with evolving dark energy. */
const models: fc.Arbitrary<Background> = fc
  .record({
    H0: decimal(50, 90),
    Omega_m: decimal(0.05, 1),
    Omega_k: decimal(-0.3, 0.3),
    w0: decimal(-1.5, -0.5),
    wa: decimal(-0.5, 0.3),
    T_CMB: fc.constantFrom('0', '2.7255', '10'),
    N_eff: fc.constantFrom('0', '3.044', '4'),
    m_nu: fc.constantFrom([], ['0', '0', '0.06'], ['0.3', '0.3', '0.3']),
  })
  .map(background)
  .filter((model) => turningPoints(model).bounce === undefined && model.matter > 0);

/** Log-uniform from 0.01 to 10 000. */
const redshifts = fc.double({ min: -2, max: 4, noNaN: true }).map((x) => 10 ** x);

function epochAt(model: Background, z: number): Epoch {
  const [epoch] = epochs(model, [z]);
  if (!epoch) throw new Error(`no epoch at z = ${z}`);
  return epoch;
}

function read(model: Background, z: number, id: QuantityId): number {
  return QUANTITIES[id](model, epochAt(model, z)) ?? Number.NaN;
}

function holds(claim: (model: Background, z: number) => void): void {
  fc.assert(fc.property(models, redshifts, claim), SEEDED);
}

describe('in every model, at every redshift', () => {
  // Etherington (1933), Phil. Mag. 15, 761.
  test('D_L = (1+z) D_M = (1+z)^2 D_A', () => {
    holds((model, z) => {
      const [luminosity, transverse, angular] = (['D_L_Mpc', 'D_M_Mpc', 'D_A_Mpc'] as const).map((id) =>
        read(model, z, id),
      );
      expectClose(luminosity, (1 + z) * (transverse ?? 0), 4e-16, 'D_L');
      expectClose(luminosity, (1 + z) * (1 + z) * (angular ?? 0), 1e-15, 'D_L');
    });
  });

  test('the fractions add up to 1, and with their signs to the deceleration', () => {
    holds((model, z) => {
      const parts = (['Omega_bc', 'Omega_nu', 'Omega_gamma', 'Omega_DE', 'Omega_k'] as const).map((id) =>
        read(model, z, id),
      );
      expectClose(
        parts.reduce((sum, part) => sum + part, 0),
        1,
        1e-15,
        'the sum',
      );
      // q = (1 + 3 w_eff) (1 - Omega_k)/2
      const q = ((1 + 3 * read(model, z, 'w_eff')) * (1 - (parts[4] ?? 0))) / 2;
      expect(Math.abs(read(model, z, 'q') - q)).toBeLessThan(2e-15);
    });
  });

  test('age and lookback time add up to the age today', () => {
    holds((model, z) => {
      const sum = read(model, z, 't_Gyr') + read(model, z, 't_L_Gyr');
      expectClose(sum, read(model, 0, 't_Gyr'), 1e-14, `at z = ${z}`);
    });
  });

  test('conformal time and comoving distance add up to the particle horizon today', () => {
    holds((model, z) => {
      const { conformalTime, comoving } = epochAt(model, z);
      const today = read(model, 0, 'particle_horizon_Mpc') / model.hubbleDistance;
      expectClose((conformalTime ?? Number.NaN) + (comoving ?? Number.NaN), today, 1e-14, `at z = ${z}`);
    });
  });

  test('dV/dz is the derivative of V_C', () => {
    const squareDegrees = 4 * Math.PI * (180 / Math.PI) ** 2;
    holds((model, z) => {
      const volume = (at: number) => (read(model, at, 'V_C_Gpc3') * 1e9) / squareDegrees;
      const slope = (h: number) => (volume(z + h) - volume(z - h)) / (2 * h);
      const h = 0.02 * z;
      // Richardson: the h^2 and h^4 terms of the central difference cancel.
      const [wide, middle, narrow] = [slope(2 * h), slope(h), slope(h / 2)];
      const derivative = (64 * narrow - 20 * middle + wide) / 45;
      expectClose(derivative, read(model, z, 'dV_dz_Mpc3_per_deg2'), 1e-8, `at z = ${z}`);
    });
  });

  test('H is the derivative of the age: dt/dz = -1/((1+z) H)', () => {
    holds((model, z) => {
      const slope = (h: number) => (read(model, z - h, 't_Gyr') - read(model, z + h, 't_Gyr')) / (2 * h);
      const h = 0.02 * z;
      const derivative = (64 * slope(h / 2) - 20 * slope(h) + slope(2 * h)) / 45;
      expectClose(derivative, read(model, z, 't_H_Gyr') / (1 + z), 1e-8, `at z = ${z}`);
    });
  });
});

/** The same universe as an observer at redshift z would describe it: densities and H of then, w(a) in their own a. */
function seenFrom(model: Background, z: number): Background {
  const u = 1 + z;
  const then = densities(model, u);
  const E2 = then.E2;
  const earlier = 1 - 1 / u;
  return {
    ...model,
    H0: model.H0 * Math.sqrt(E2),
    hubbleDistance: model.hubbleDistance / Math.sqrt(E2),
    hubbleTime: model.hubbleTime / Math.sqrt(E2),
    temperature: model.temperature * u,
    matter: then.matter / E2,
    photons: then.photons / E2,
    masslessNeutrinos: (model.masslessNeutrinos * u ** 4) / E2,
    massiveNeutrinos: model.massiveNeutrinos.map(({ relativistic, y0 }) => ({
      relativistic: (relativistic * u ** 4) / E2,
      y0: y0 / u,
    })),
    allMassless: (model.allMassless * u ** 4) / E2,
    curvature: then.curvature / E2,
    darkEnergy: then.darkEnergy / E2,
    onePlusW0: model.onePlusW0 + model.wa * earlier,
    wa: model.wa / u,
  };
}

describe('an observer of an earlier time describes the same universe', () => {
  const pairs = fc.tuple(redshifts, redshifts).map(([a, b]) => [Math.min(a, b), Math.max(a, b)] as const);

  function sharedEpoch(model: Background, near: number, far: number): { own: Epoch; theirs: Epoch; other: Background } {
    const other = seenFrom(model, near);
    return { own: epochAt(model, far), theirs: epochAt(other, (far - near) / (1 + near)), other };
  }

  test('distances add along the line of sight: D_C(0, far) = D_C(0, near) + (1+near) x theirs', () => {
    fc.assert(
      fc.property(models, pairs, (model, [near, far]) => {
        const { own, theirs, other } = sharedEpoch(model, near, far);
        const rest = ((1 + near) * (theirs.comoving ?? Number.NaN) * other.hubbleDistance) / model.hubbleDistance;
        const sum = (epochAt(model, near).comoving ?? Number.NaN) + rest;
        expectClose(sum, own.comoving ?? Number.NaN, 1e-14, `from ${near} to ${far}`);
      }),
      SEEDED,
    );
  });

  test('the age of an epoch, its rate, density, matter and deceleration are the same for both', () => {
    fc.assert(
      fc.property(models, pairs, (model, [near, far]) => {
        const { own, theirs, other } = sharedEpoch(model, near, far);
        for (const id of ['t_Gyr', 'H_km_s_Mpc', 'Omega_bc', 'rho_c_Msun_Mpc3'] as const) {
          const [ours, seen] = [QUANTITIES[id](model, own), QUANTITIES[id](other, theirs)];
          expectClose(seen, ours ?? Number.NaN, 2e-14, `${id} at ${far}, seen from ${near},`);
        }
        // It passes through zero, so its error is that of the sum of its terms.
        const [ours, seen] = [QUANTITIES.q(model, own), QUANTITIES.q(other, theirs)];
        expect(Math.abs((seen ?? Number.NaN) - (ours ?? Number.NaN))).toBeLessThan(2e-14);
      }),
      SEEDED,
    );
  });
});
