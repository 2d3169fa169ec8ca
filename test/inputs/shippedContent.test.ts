import { describe, expect, test } from 'vitest';
import { formatProblems } from '../../src/inputs/formatProblems.ts';
import { readContent } from '../../src/inputs/readContent.ts';
import type { ParameterSet } from '../../src/inputs/types.ts';
import { columnsOf, TOPICS } from '../../src/tables/columns.ts';

const columnIds = ['z', ...TOPICS.flatMap((topic) => columnsOf(topic).map(({ id }) => id))];
const result = readContent('content', { columnIds });
if ('problems' in result) throw new Error(formatProblems(result.problems));
const { parameterSets, redshiftGrids, editions } = result.content;

function setOf(id: string): ParameterSet {
  const found = parameterSets.find((set) => set.id === id);
  if (found === undefined) throw new Error(`no set ${id}`);
  return found;
}

test('the draft edition binds every set and grid', () => {
  const draft = editions.find(({ number }) => number === '2026.1');
  expect(draft?.parameterSets.toSorted()).toEqual(parameterSets.map(({ id }) => id));
  expect(draft?.redshiftGrids.toSorted()).toEqual(redshiftGrids.map(({ id }) => id));
});

test('values from memory are announced in the note', () => {
  for (const id of ['planck-2015-ext', 'wmap-9-combined', 'desi-2025-w0wa']) {
    expect(setOf(id).note).toMatch(/^Not yet checked against the paper/);
  }
  for (const id of ['act-2025', 'desi-2025-flat'])
    expect(setOf(id).note).toContain('not yet checked against the paper');
});

test('what the survey chose itself is labelled as its own', () => {
  const house = parameterSets.filter(({ kind }) => kind === 'house');
  expect(house.map(({ id }) => id)).toEqual(['lanternfell-2019', 'lanternfell-2026', 'local-h0-2022']);
  for (const { note } of house) expect(note).toMatch(/convention of the survey|Lanternfell Survey's own/);
});

test('the logarithmic grid has twenty steps to a decade and the epochs', () => {
  const redshifts = redshiftGrids.find(({ id }) => id === 'logarithmic')?.redshifts ?? [];
  expect([redshifts[0], redshifts.at(-1), redshifts.length]).toEqual(['0.000100', '10000', 8 * 20 + 1 + 8]);
  expect(redshifts).toEqual(expect.arrayContaining(['7.67', '1059.94', '1089.80', '3387', '3402']));
  for (const [index, z] of redshifts.slice(1).entries()) {
    expect(Number(z) / Number(redshifts[index])).toBeLessThan(1.15);
  }
});

test('the survey grid has a step of 0.01 to 3 and of 0.1 to 10', () => {
  const redshifts = redshiftGrids.find(({ id }) => id === 'survey')?.redshifts ?? [];
  expect(redshifts).toHaveLength(371);
  expect(redshifts.slice(298, 303)).toEqual(['2.98', '2.99', '3.00', '3.1', '3.2']);
});

describe('correlations of sets that give physical densities', () => {
  // u(Omega_m h^2), u(Omega_m) and u(Omega_m h^3) as the papers print them; one of them is the check, two are the source.
  test.each([
    { id: 'planck-2018-lensing', matter: 0.143, printed: { h2: '0.0011', h0: '0.0073', h3: '0.00030' } },
    { id: 'planck-2018-bao', matter: 0.1424, printed: { h2: '0.00087', h0: '0.0056', h3: '0.00030' } },
    { id: 'planck-2015-ext', matter: 0.1417, printed: { h2: '0.00097', h0: '0.0062' } },
    { id: 'wmap-9-combined', matter: 0.1376, printed: { h2: '0.0020', h0: '0.0095' } },
  ])('$id: they give back the printed uncertainties of combinations', ({ id, matter, printed }) => {
    const { parameters, uncertainties, correlations } = setOf(id);
    const u = (name: 'H0' | 'omega_b' | 'omega_c') => Number(uncertainties[name]);
    const r = (a: string, b: string) => Number(correlations.find(([x, y]) => x === a && y === b)?.[2]);
    const h = Number(parameters.H0) / 100;
    // Relative variances and covariance of h and of Omega_m h^2, whose neutrino part is fixed.
    const varH = (u('H0') / 100 / h) * (u('H0') / 100 / h);
    const [b, c] = [u('omega_b') / matter, u('omega_c') / matter];
    const varM = b * b + c * c + 2 * r('omega_b', 'omega_c') * b * c;
    const cov = Math.sqrt(varH) * (r('H0', 'omega_b') * b + r('H0', 'omega_c') * c);
    /** Standard uncertainty of Omega_m h^(2 + power). */
    const combined = (power: number) => Math.sqrt(varM + power * power * varH + 2 * power * cov) * matter * h ** power;
    for (const [key, text] of Object.entries(printed)) {
      const lastDigit = 10 ** -(text.split('.')[1]?.length ?? 0);
      const value = combined({ h0: -2, h2: 0, h3: 1 }[key] ?? Number.NaN);
      expect(Math.abs(value - Number(text)), `u of ${key}`).toBeLessThanOrEqual(0.55 * lastDigit);
    }
  });
});
