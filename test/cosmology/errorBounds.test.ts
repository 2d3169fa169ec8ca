import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { background } from '../../src/cosmology/background.ts';
import { milestoneBounds } from '../../src/cosmology/milestoneBounds.ts';
import { MILESTONE_NAMES } from '../../src/cosmology/milestones.ts';
import { milestoneValues } from '../../src/cosmology/milestoneValues.ts';
import type { QuantityId } from '../../src/cosmology/quantities.ts';
import { excess, median, trueError } from '../support/boundExcess.ts';

const FOLDER = 'test/reference/values';
const files = readdirSync(FOLDER).filter((name) => name.endsWith('.json'));
const references = files.map((file) => JSON.parse(readFileSync(`${FOLDER}/${file}`, 'utf8')));

describe('the error bound of a cell', () => {
  test('is never smaller than the true error in the reference models, and not much larger in the median', () => {
    const columns = Object.keys(references[0].rows[0]).filter((id) => id !== 'z') as QuantityId[];
    const models = references.map(({ parameters, rows }) => ({
      parameters,
      redshifts: rows.map(({ z }: { z: string }) => z),
      values: rows.map((row: Record<string, string | null>) => columns.map((id) => row[id] ?? null)),
    }));
    const { triples, ratios, violations } = excess(columns, models);
    expect(violations).toEqual([]);
    expect(triples).toBeGreaterThan(14_000);
    expect(median(ratios)).toBeLessThan(100);
  });
});

test('the error bound of a milestone is never smaller than its true error', () => {
  for (const { parameters, milestones } of references) {
    const model = background(parameters);
    const values = milestoneValues(model);
    const bounds = milestoneBounds(model, values);
    for (const name of MILESTONE_NAMES) {
      const value = values[name];
      if (typeof value !== 'number') continue;
      expect(bounds[name], `${name} of ${JSON.stringify(parameters)}`).toBeGreaterThanOrEqual(
        trueError(value, milestones[name]),
      );
      expect(bounds[name] / Math.abs(value)).toBeLessThan(1e-12);
    }
  }
});
