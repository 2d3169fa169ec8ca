import { describe, expect, test } from 'vitest';
import { evaluateCheck } from '../../src/site/published/evaluateCheck.ts';
import { type PublishedSource, publishedSources, readSource } from '../../src/site/published/publishedSources.ts';
import { halfUnit, inputBudget, meanBudget, printedBudget } from './roundingBudget.ts';

const sources = publishedSources();
const named = sources.map((source) => [source.id, source] as const);

describe('published values agree or disagree with ours as their file says', () => {
  test.each(named)('%s', (_, { checks }) => {
    const surprises = checks.flatMap((check) => {
      const { ours, difference, verdict } = evaluateCheck(check);
      if (verdict === check.expectation) return [];
      return [
        `${check.id}: published ${check.published}, ours ${ours}, off by ${difference}, allowed ${check.tolerance}`,
      ];
    });
    expect(surprises).toEqual([]);
  });
});

/** The limit that the grounds of a check add up to; undefined where one of them cannot be computed. */
function budget({ models }: PublishedSource, check: PublishedSource['checks'][number]): number | undefined {
  const { rounded = [], uncertainties = {} } = models[check.model] ?? {};
  const limits = check.toleranceFrom.map((ground) => {
    if (ground === 'printed digits') return printedBudget(check);
    if (ground === 'input digits') return inputBudget(check, rounded);
    return ground === 'mean of chains' ? meanBudget(check, uncertainties) : undefined;
  });
  return limits.reduce((sum, limit) => (sum === undefined || limit === undefined ? undefined : sum + limit), 0);
}

describe('no tolerance is wider than the digits and uncertainties of its source make it', () => {
  test.each(named)('%s', (_, source) => {
    const wrong = source.checks.flatMap((check) => {
      const limit = budget(source, check);
      const ratio = limit === undefined ? 1 : Number(check.tolerance) / limit;
      // Written to two digits, rounded up.
      return ratio > 1.1 || ratio < 0.999 ? [`${check.id}: ${check.tolerance}, expected ${limit}`] : [];
    });
    expect(wrong).toEqual([]);
  });
});

test('a value worked out from two printed rows is their ratio', () => {
  const ratios = sources.flatMap(({ checks }) => checks.filter(({ ratioOf }) => ratioOf));
  expect(ratios.length).toBeGreaterThan(0);
  for (const { id, published, ratioOf = ['', ''] } of ratios) {
    const off = Math.abs(Number(ratioOf[0]) / Number(ratioOf[1]) - Number(published));
    expect(off, id).toBeLessThanOrEqual(halfUnit(published) * 1.001);
  }
});

test('the values cover ages, equality, distances, horizons and densities, from a good number of sources', () => {
  const checks = sources.flatMap((source) => source.checks);
  const read = new Set(checks.map(({ what: { of } }) => ('milestone' in of ? of.milestone : of.column)));
  expect(sources.length).toBeGreaterThanOrEqual(15);
  expect(checks.length).toBeGreaterThanOrEqual(120);
  for (const name of [
    'age_today',
    'z_equality',
    't_equality',
    'z_matter_DE_equality',
    'z_recession_c',
    'particle_horizon_today',
    'event_horizon_today',
    'hubble_time',
    'hubble_distance',
    'critical_density_cgs',
    'critical_density_Msun',
    'D_M_Mpc',
    't_Gyr',
    'v_rec_then_c',
    'Omega_gamma',
    'Omega_DE',
  ] as const) {
    expect(read, name).toContain(name);
  }
});

describe('a file that is not as it should be is refused', () => {
  const [good] = sources;
  const plain = {
    source: good?.source,
    models: good?.models,
    checks: good?.checks.map(({ inputs: _, ...rest }) => rest),
  };
  const spoilt = (changes: object) => ({ ...plain, checks: [{ ...plain.checks?.[0], ...changes }] });

  test('while the good one is read', () => {
    expect(readSource('/test/reference/published/good.json', plain).id).toBe('good');
  });

  test.each([
    ['a number without quotes', { published: 13.797 }, 'expected string, received number'],
    ['a word for a number', { published: 'about 14' }, 'a decimal number in quotes, as printed: "13.797"'],
    ['a milestone that does not exist', { what: { of: { milestone: 'age' } } }, 'Invalid'],
    ['a disagreement without its reason', { expectation: 'disagrees' }, 'why, for a value that disagrees and no other'],
    ['a round statement without its reason', { toleranceFrom: ['round statement'] }, 'a toleranceReason'],
    ['a model that the file does not have', { model: 'other' }, 'a model of this file in every check'],
    ['a key nobody knows', { tolerence: '1' }, 'Unrecognized key: "tolerence"'],
  ])('%s', (_, changes, message) => {
    expect(() => readSource('/test/reference/published/spoilt.json', spoilt(changes))).toThrow(
      new RegExp(
        `^test/reference/published/spoilt\\.json\\n[\\s\\S]*${message.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')}`,
      ),
    );
  });
});
