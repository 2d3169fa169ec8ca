import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { relicNeutrino, relicNeutrinoIntegral } from '../../src/cosmology/relicNeutrinos.ts';
import { expectClose } from '../support/closeness.ts';

const { rows } = JSON.parse(readFileSync('test/reference/fermiDirac.json', 'utf8')) as {
  rows: readonly [string, string, string][];
};

test('relicNeutrino(y) agrees with 30-digit Fermi-Dirac integrals from y = 0 to 1e6', () => {
  expect(rows.length).toBeGreaterThan(40);
  for (const [y, energy, pressure] of rows) {
    const relic = relicNeutrino(Number(y));
    expectClose(relic.energy, Number(energy), 2e-15, `energy at y = ${y}`);
    expectClose(relic.pressure, Number(pressure), 2e-15, `pressure at y = ${y}`);
  }
});

test('the tables agree with the integral everywhere, across the seams of the panels', () => {
  for (let k = 0; k <= 3000; k++) {
    const y = Math.exp(-9.4 + 0.005 * k);
    const [table, integral] = [relicNeutrino(y), relicNeutrinoIntegral(y)];
    expectClose(table.energy, integral.energy, 3e-15, `energy at y = ${y}`);
    expectClose(table.pressure, integral.pressure, 3e-15, `pressure at y = ${y}`);
  }
});

test('the known limits hold: 1 + 5 y^2/(7 pi^2) and 180 zeta(3)/(7 pi^4) y', () => {
  // Lesgourgues & Pastor (2006), Phys. Rep. 429, 307; zeta(3) = 1.2020569031595942.
  expectClose(relicNeutrino(1e-3).energy, 1 + 5e-6 / (7 * Math.PI * Math.PI), 1e-12);
  const pi4 = Math.PI * Math.PI * Math.PI * Math.PI;
  expectClose(relicNeutrino(1e9).energy / 1e9, (180 * 1.2020569031595942) / (7 * pi4), 1e-15);
});
