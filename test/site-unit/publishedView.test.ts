import { expect, test } from 'vitest';
import { checkLine } from '../../src/site/published/checkLine.ts';
import { inputsText } from '../../src/site/published/inputsText.ts';
import { publishedSources } from '../../src/site/published/publishedSources.ts';
import { publishedView } from '../../src/site/published/publishedView.ts';

const view = publishedView();
const sources = view.kinds.flatMap((kind) => kind.sources);
const lines = sources.flatMap((source) => source.models.flatMap((model) => model.lines));

function line(source: string, id: string) {
  const found = publishedSources().find((one) => one.id === source);
  const check = found?.checks.find((one) => one.id === id);
  if (!check) throw new Error(`no ${source} ${id}`);
  return { check, line: checkLine(source, check) };
}

test('every check of every file is on the page once, with an anchor of its own', () => {
  const checks = publishedSources().flatMap(({ id, checks }) => checks.map((check) => `${id}.${check.id}`));
  expect(lines.map(({ id }) => id).toSorted()).toEqual(checks.toSorted());
  expect(new Set(checks).size).toBe(checks.length);
  expect(view.counts.values).toBe(checks.length);
  expect(view.counts.sources).toBe(sources.length);
});

test('those that differ are listed first, each with its reason', () => {
  const differing = lines.filter(({ agrees }) => !agrees);
  expect(view.differing.flatMap((source) => source.lines.map(({ id }) => id))).toEqual(differing.map(({ id }) => id));
  expect(differing.every(({ why }) => why.length > 20)).toBe(true);
});

test('a value from memory says so', () => {
  const { check, line: shown } = line('pdg', 'hubble-time');
  expect(check.status).toBe('from memory');
  expect(shown.unchecked).toBe(true);
  expect(shown.provenance).toContain('from memory, not yet checked against the source');
  expect(view.counts.unchecked).toBe(lines.filter(({ unchecked }) => unchecked).length);
});

test('a line prints both values alike, the difference with its sign and the tolerance with its grounds', () => {
  expect(line('planck-2018', 'age-best-fit').line).toMatchObject({
    published: '13.7971',
    ours: '13.797\u2009366',
    difference: '+0.000\u200927',
    tolerance: '0.000\u200965',
    grounds: 'ab',
    verdict: 'agrees',
    why: '',
  });
});

test('a value that ceases to agree says that nobody knows why', () => {
  const { check } = line('planck-2018', 'age-best-fit');
  const { verdict, why, difference } = checkLine('planck-2018', { ...check, published: '13.9971' });
  expect([verdict, why, difference]).toEqual(['differs', 'Nobody knows why yet.', '\u22120.20']);
});

test('inputs leave out what says nothing, and say that radiation is neglected', () => {
  const dry = { H0: '70', Omega_m: '0.3', w0: '-1', wa: '0', T_CMB: '0', N_eff: '0', m_nu: [] };
  const plain = (html: string) => html.replace(/<annotation[\s\S]*?<\/annotation>|<[^>]*>/g, '');
  expect(plain(inputsText(dry))).toMatch(/= 70 .*= 0\.3, no radiation$/);
  expect(plain(inputsText({ ...dry, w0: '-0.9', T_CMB: '2.7', N_eff: '3' }))).toMatch(/−0\.9.*massless neutrinos$/);
});
