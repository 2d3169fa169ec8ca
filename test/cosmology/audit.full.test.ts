import { beforeAll, describe, expect, test } from 'vitest';
import { auditRows } from '../../src/cosmology/audit/auditRows.ts';
import { startAudit } from '../../src/cosmology/audit/startAudit.ts';
import { QUANTITIES, type QuantityId } from '../../src/cosmology/quantities.ts';
import { disagreements, readReference, referenceFiles } from '../support/auditAgreement.ts';

beforeAll(startAudit);

describe('the audit agrees with mpmath and PARI/GP to 29 digits in every model', () => {
  test.each(referenceFiles)('%s', (file) => {
    expect(disagreements(file, 34)).toEqual([]);
  });
});

test('34 working digits are enough: 50 give the same to within the error that 34 claim', () => {
  const { parameters } = readReference('planckLike.json');
  const columns = Object.keys(QUANTITIES) as QuantityId[];
  const redshifts = ['0.01', '2.33', '1089.80'];
  const [coarse, fine] = [34, 50].map((digits) => auditRows(parameters, redshifts, columns, digits));
  for (const [k, row] of (coarse ?? []).entries()) {
    for (const [c, cell] of row.entries()) {
      const finer = fine?.[k]?.[c];
      if (!cell || !finer) throw new Error(`${columns[c]} is blank`);
      expect(Math.abs(Number(cell.text) - Number(finer.text))).toBeLessThanOrEqual(
        Number(cell.error) + 1e-16 * Math.abs(Number(cell.text)),
      );
      expect(cell.text.replace('.', '').slice(0, 28)).toBe(finer.text.replace('.', '').slice(0, 28));
    }
  }
});
