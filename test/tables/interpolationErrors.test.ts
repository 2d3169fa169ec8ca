import { describe, expect, test } from 'vitest';
import { type Background, background } from '../../src/cosmology/background.ts';
import { epochs } from '../../src/cosmology/epochs.ts';
import { QUANTITIES, type QuantityId } from '../../src/cosmology/quantities.ts';
import { readContent } from '../../src/inputs/readContent.ts';
import { csvCell } from '../../src/tables/csvCell.ts';
import { interpolationErrors } from '../../src/tables/interpolationErrors.ts';
import { EINSTEIN_DE_SITTER, everyInterval, type Interval } from './bruteErrors.ts';

/** With so many digits the rounding of cells plays no part. */
const EXACT = 17;

function errors(model: Background, redshifts: readonly number[], columns: readonly QuantityId[], digits = EXACT) {
  return interpolationErrors({ model, redshifts, epochs: epochs(model, redshifts), columns, digits });
}

function of(model: Background, redshifts: readonly number[], column: QuantityId, digits = EXACT) {
  const [found] = errors(model, redshifts, [column], digits);
  if (!found?.linear || !found.lagrange) throw new Error(`${column} cannot be interpolated`);
  return { linear: found.linear, lagrange: found.lagrange };
}

const grid = (from: number, step: number, count: number) =>
  Array.from({ length: count + 1 }, (_, k) => from + k * step);

/** The bound that is promised: never below the truth, at most 1 % above. */
function expectBound(found: number, truth: number) {
  expect(found / truth).toBeGreaterThanOrEqual(1);
  expect(found / truth).toBeLessThan(1.01);
}

describe('interpolationErrors of the scale factor, 1/(1+z), has a closed form', () => {
  // With nodes u_i the error of interpolating 1/u is, relative to 1/u, exactly the product of (u - u_i)/u_i.
  test('linear: h^2/4 over (1+z) of both rows, in the middle of the first interval', () => {
    const { linear } = of(EINSTEIN_DE_SITTER, grid(0, 0.1, 20), 'a');
    expectBound(linear.relative, 0.1 ** 2 / 4 / 1.1);
    expect(linear.z).toBeCloseTo(0.05, 4);
  });

  test('four points: h^4 over (1+z) of the first four rows, at (3 - sqrt 5)/2 of the first interval', () => {
    const { lagrange } = of(EINSTEIN_DE_SITTER, grid(0, 0.1, 20), 'a');
    expectBound(lagrange.relative, 0.1 ** 4 / (1.1 * 1.2 * 1.3));
    expect(lagrange.z).toBeCloseTo((0.1 * (3 - Math.sqrt(5))) / 2, 3);
  });

  test('four points in the only interval of three rows are a parabola', () => {
    const { lagrange } = of(EINSTEIN_DE_SITTER, [0, 0.1, 0.2], 'a');
    expectBound(lagrange.relative, ((2 / 9) * Math.sqrt(3) * 0.1 ** 3) / (1.1 * 1.2));
  });

  test('two rows can only be joined by a line', () => {
    const { linear, lagrange } = of(EINSTEIN_DE_SITTER, [0, 1], 'a');
    expectBound(lagrange.relative, 1 / 8);
    expect(lagrange).toEqual(linear);
  });

  test('the absolute error is the largest there is, in the unit of the column', () => {
    // 1/u - (line from 1 to 1/2) is largest where u = sqrt 2: 3/2 - sqrt 2.
    expectBound(of(EINSTEIN_DE_SITTER, [0, 1], 'a').linear.absolute, 1.5 - Math.SQRT2);
  });
});

describe('where a column begins or passes at zero', () => {
  test('a distance is compared with itself down to z = 0, where its slope counts', () => {
    // D_C = 2 (1 - 1/sqrt(1+z)) c/H0 has slope 1 at z = 0, its line over the first interval the slope D(h)/h.
    const { linear } = of(EINSTEIN_DE_SITTER, grid(0, 0.1, 30), 'D_C_Mpc');
    expectBound(linear.relative, 1 - (2 * (1 - 1 / Math.sqrt(1.1))) / 0.1);
    expect(linear.z).toBe(0);
  });

  test('a volume, which grows like z cubed, is compared with its largest value in the first interval', () => {
    // V = z^3 to first order: the line exceeds it most at z = h/sqrt 3, by (2/9) sqrt 3 of the value at h.
    const { lagrange, linear } = of(EINSTEIN_DE_SITTER, [0, 1e-9], 'V_C_Gpc3');
    expectBound(linear.relative, (2 / 9) * Math.sqrt(3));
    expect(linear.z * 1e9).toBeCloseTo(1 / Math.sqrt(3), 2);
    expect(lagrange).toEqual(linear);
  });

  test('a column that changes sign is compared with its largest value in that interval', () => {
    const model = background({ H0: '70', Omega_m: '0.3', w0: '-1', wa: '0', T_CMB: '0', N_eff: '0', m_nu: [] });
    const rows = [0.5, 0.9];
    const [interval] = everyInterval(model, rows, 2000)('q');
    if (!interval) throw new Error('no interval');
    const [low, high] = interval.rows;
    expect(low * high).toBeLessThan(0);
    const { linear } = of(model, rows, 'q');
    const largest = Math.max(...interval.linear.map((value, k) => Math.abs(value - (interval.truths[k] ?? 0))));
    expectBound(linear.absolute, largest);
    expectBound(linear.relative, largest / Math.max(Math.abs(low), Math.abs(high)));
  });

  test('a column of zeros has no error', () => {
    const { linear, lagrange } = of(EINSTEIN_DE_SITTER, [0, 1, 2, 3, 4], 'w_eff', 10);
    expect([linear.relative, linear.absolute, lagrange.relative, lagrange.absolute]).toEqual([0, 0, 0, 0]);
  });
});

describe('intervals that cannot be interpolated', () => {
  test('have a blank end: the distance modulus does not exist at z = 0', () => {
    const rows = [0, 0.5, 1, 1.5, 2, 2.5];
    expect(of(EINSTEIN_DE_SITTER, rows, 'mu_mag')).toEqual(of(EINSTEIN_DE_SITTER, rows.slice(1), 'mu_mag'));
  });

  test('are all of a column without two neighbouring rows', () => {
    const found = errors(EINSTEIN_DE_SITTER, [-0.5, -0.25, 0], ['D_C_Mpc', 'mu_mag']);
    expect(found).toEqual([
      { column: 'D_C_Mpc', linear: null, lagrange: null },
      { column: 'mu_mag', linear: null, lagrange: null },
    ]);
  });

  test('cross an antipode, where D_M is folded back and has a kink but D_C has none', () => {
    const model = background({
      H0: '70',
      Omega_m: '0.3',
      Omega_DE: '1.5',
      w0: '-1',
      wa: '0',
      T_CMB: '0',
      N_eff: '0',
      m_nu: [],
    });
    // The antipode is just beyond z = 10.
    const [, crossing] = everyInterval(model, [9, 10, 12], 500)('D_M_Mpc');
    if (!crossing) throw new Error('no interval');
    expect(Math.min(...crossing.truths)).toBeLessThan(0.02 * Math.min(...crossing.rows));
    const alone = errors(model, [10, 12], ['D_M_Mpc', 'D_C_Mpc']);
    expect(alone[0]?.linear).toBeNull();
    expect(alone[1]?.linear?.relative).toBeGreaterThan(0);
  });
});

const result = readContent('content');
if ('problems' in result) throw new Error('the shipped content has problems');
const { parameterSets, redshiftGrids } = result.content;
const shipped = (id: string) => {
  const set = parameterSets.find((one) => one.id === id);
  if (!set) throw new Error(`no parameter set ${id}`);
  return background(set.parameters);
};
const rowsOf = (id: string) => redshiftGrids.find((one) => one.id === id)?.redshifts.map(Number) ?? [];
const ALL = Object.keys(QUANTITIES) as QuantityId[];

/** Largest relative errors from many places; by the interval's largest value where the column has a zero in it. */
function dense(intervals: readonly Interval[]) {
  let [linear, lagrange] = [0, 0];
  for (const { rows, truths, ...by } of intervals) {
    const values = [...rows, ...truths];
    const zero =
      Math.min(...values) * Math.max(...values) < 0 ||
      (rows[0] === 0 && Math.abs(truths[0] ?? 0) < Math.abs(1e-9 * rows[1]));
    const scale = Math.max(...values.map(Math.abs));
    const relative = (value: number, k: number) => {
      const truth = truths[k] ?? 0;
      return value === truth ? 0 : Math.abs(value - truth) / (zero ? scale : Math.abs(truth));
    };
    linear = Math.max(linear, ...by.linear.map(relative));
    lagrange = Math.max(lagrange, ...by.lagrange.map(relative));
  }
  return { linear, lagrange };
}

/** Below this the errors of four points are the rounding of doubles. */
const ROUNDING = 1e-13;

describe.each(['planck-2018-lensing', 'desi-2025-w0wa', 'closed-matter'])('of the set %s', (set) => {
  const model = shipped(set);

  test.each(['reading', 'logarithmic', 'future', 'survey'])(
    'on the %s grid, errors of every column are those of ten times as many places, and at most a hundredth more',
    (gridId) => {
      const redshifts = rowsOf(gridId);
      const intervalsOf = everyInterval(model, redshifts, 100);
      const wrong = errors(model, redshifts, ALL).flatMap(({ column, linear, lagrange }) => {
        const truth = dense(intervalsOf(column));
        const pairs = [
          [linear?.relative ?? 0, truth.linear],
          [lagrange?.relative ?? 0, truth.lagrange],
        ] as const;
        return pairs
          .filter(([found, true_]) => found < true_ - ROUNDING || found > 1.011 * true_ + ROUNDING)
          .map(([found, true_]) => `${column}: ${found}, not ${true_}`);
      });
      expect(wrong).toEqual([]);
    },
  );
});

test('what comes out of the rounded cells of a file is never farther off than stated', () => {
  const model = shipped('planck-2018-lensing');
  const redshifts = rowsOf('reading');
  const digits = 4;
  const intervalsOf = everyInterval(model, redshifts, 20);
  const rounded = (value: number) => Number(csvCell(value, digits));
  for (const { column, linear } of errors(model, redshifts, ALL, digits)) {
    for (const { rows, z, truths } of intervalsOf(column)) {
      const [from, to] = rows.map(rounded) as [number, number];
      const lo = redshifts.findLast((x) => x < (z[0] ?? 0)) ?? 0;
      const hi = redshifts.find((x) => x > (z[0] ?? 0)) ?? 0;
      const off = z.map((x, k) => Math.abs(from + ((x - lo) / (hi - lo)) * (to - from) - (truths[k] ?? 0)));
      expect(Math.max(...off), column).toBeLessThanOrEqual(linear?.absolute ?? 0);
    }
  }
});
