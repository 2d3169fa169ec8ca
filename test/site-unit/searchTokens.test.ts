import { expect, test } from 'vitest';
import { readNumber } from '../../src/client/readNumber.ts';
import { tokens } from '../../src/client/search/tokens.ts';
import { roundsTo } from '../../src/client/search/typedNumber.ts';

const terms = (text: string): string[] => tokens(text).map((token) => token.term);

test.each([
  ['D_L z=0.5', ['dl', 'z', '0.5']],
  ['z0.500', ['z', '0.5']],
  ['gamma-2018', ['gamma', '2018']],
  ['z=-0.5', ['z', '-0.5']],
  ['age at −0.5', ['age', 'at', '-0.5']],
  ['0.3-0.7', ['0.3', '0.7']],
  ['1e-3 1E4', ['0.001', '10000']],
  ['0,5 and 1,100', ['0.5', 'and', '1100']],
  ['Ω_m H₀ ΛCDM', ['omegam', 'h0', 'lcdm']],
  ['Densities, ages; radius', ['density', 'age', 'radius']],
])('%j is read as %j', (text, expected) => {
  expect(terms(text)).toEqual(expected);
});

test.each([
  ['0.5', 0.5],
  [' z = 0,5 ', 0.5],
  ['−0.5', -0.5],
  ['1e3', 1000],
  ['1,089.80', 1089.8],
  ['.5', 0.5],
])('a redshift field reads %j as %d', (text, value) => {
  expect(readNumber(text)).toBe(value);
});

test.each(['', 'half', '0.5 1', '0.5Mpc', '1e999'])('a redshift field refuses %j', (text) => {
  expect(readNumber(text)).toBeUndefined();
});

test.each([
  [13.787, '13.8', true],
  [13.75, '13.8', true],
  [13.7499, '13.8', false],
  [8.5e-27, '8.5e-27', true],
  [8.56e-27, '8.5e-27', false],
  [1.2, '1', false],
  [-1, '-1', true],
])('whether %d can be written %s: %s', (value, text, expected) => {
  expect(roundsTo(value, { text, value: Number(text) })).toBe(expected);
});
