import { expect, test } from 'vitest';
import { alignPoints } from '../../src/site/alignPoints.ts';
import { noteHtml } from '../../src/site/noteHtml.ts';
import { symbolOfName } from '../../src/site/symbolOfName.ts';
import { titleHtml } from '../../src/site/titleHtml.ts';
import { unitHtml } from '../../src/site/unitText.ts';
import { writtenNumber } from '../../src/site/writtenNumber.ts';

/** Thin spaces as underscores. */
const visible = (html: string) => html.replaceAll('\u2009', '_');

test.each([
  ['Mpc', 'Mpc'],
  ['', ''],
  ['kg/m3', 'kg/m<sup>3</sup>'],
  ['km/s/Mpc', 'km_s<sup>−1</sup>_Mpc<sup>−1</sup>'],
  ['1/Gyr', 'Gyr<sup>−1</sup>'],
  ['J s', 'J_s'],
  ['Msun/Mpc3', '<i>M</i><sub>⊙</sub>/Mpc<sup>3</sup>'],
])('the unit %j prints as %j', (unit, html) => {
  expect(visible(unitHtml(unit))).toBe(html);
});

test.each([
  ['67.36', '67.36'],
  ['-0.838', '−0.838'],
  ['299792.458', '299_792.458'],
  ['6.67430E-11', '6.674_30_×_10<sup>−11</sup>'],
  ['648000/pi', '648_000/π'],
  ['all massless', 'all massless'],
])('the number %j prints as %j', (text, html) => {
  expect(visible(writtenNumber(text))).toBe(html);
});

test('decimals are padded to one place of the point', () => {
  const padded = alignPoints(['0.05', '1.5', '10', '']).map((text) =>
    text.replaceAll('\u2007', '_').replaceAll('\u2008', ':'),
  );
  expect(padded).toEqual(['0.05', '1.5_', '10:__', '']);
});

test('symbols in titles and notes are set as symbols, and markup in them is text', () => {
  expect(titleHtml('Open, Omega_m < 1 & H0 = 70')).toBe(
    'Open, Ω<sub>m</sub> &lt; 1 &amp; <var>H</var><sub>0</sub> = 70',
  );
  expect(noteHtml('wa = -0.62 +- 0.2, Var = 9.7e-6, h^2')).toBe(
    '<var>w<sub>a</sub></var> = −0.62 ± 0.2, Var = 9.7 × 10<sup>−6</sup>, h<sup>2</sup>',
  );
});

test('names of densities become LaTeX', () => {
  expect(['Omega_m', 'Omega_gamma', 'Omega_k', 'H0'].map(symbolOfName)).toEqual([
    '\\Omega_{\\mathrm{m}}',
    '\\Omega_{\\gamma}',
    '\\Omega_{k}',
    'H_{0}',
  ]);
});
