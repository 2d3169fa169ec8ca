import { beforeAll, describe, expect, test } from 'vitest';
import { auditRows } from '../../src/cosmology/audit/auditRows.ts';
import { startAudit } from '../../src/cosmology/audit/startAudit.ts';
import { disagreements, readReference, referenceFiles } from '../support/auditAgreement.ts';

beforeAll(startAudit);

/** Massive neutrinos cost the audit seconds a model; those models are in the full tests. */
const quick = referenceFiles.filter((file) => readReference(file).parameters.m_nu.every((mass) => Number(mass) === 0));

describe('the audit agrees with mpmath and PARI/GP to 29 digits, within its own error', () => {
  test('there are models enough', () => expect(quick.length).toBeGreaterThanOrEqual(12));

  test.each(quick)('%s', (file) => {
    expect(disagreements(file, 34)).toEqual([]);
  });
});

test('an exact decimal stays exact: 2.7255 K x 1.000125 has a tie in its eleventh digit', () => {
  const { parameters } = readReference('barelyOpen.json');
  const [[cell] = []] = auditRows(parameters, ['0.000125'], ['T_CMB_K'], 34);
  expect(Number(cell?.error)).toBeLessThan(1e-30);
  expect(cell?.text).toMatch(/^2\.725840687(50{10}|49{10})/);
});
