import { readdirSync, readFileSync } from 'node:fs';
import type { Audited } from '../../src/cosmology/audit/audited.ts';
import { auditMilestones } from '../../src/cosmology/audit/auditMilestones.ts';
import { auditRows } from '../../src/cosmology/audit/auditRows.ts';
import type { Parameters } from '../../src/cosmology/parameters.ts';
import { QUANTITIES, type QuantityId } from '../../src/cosmology/quantities.ts';
import { Decimal } from '../../src/numerics/decimal.ts';

interface Reference {
  readonly parameters: Parameters;
  readonly milestones: Readonly<Record<string, string | null>>;
  readonly rows: readonly Readonly<Record<QuantityId | 'z', string | null>>[];
}

const FOLDER = 'test/reference/values';
const COLUMNS = Object.keys(QUANTITIES) as QuantityId[];
/** The reference prints 30 significant digits. */
const REFERENCE_ERROR = 6e-30;

export const referenceFiles = readdirSync(FOLDER).filter((name) => name.endsWith('.json'));

export function readReference(file: string): Reference {
  return JSON.parse(readFileSync(`${FOLDER}/${file}`, 'utf8')) as Reference;
}

/** A sentence when an audited value differs from the reference by more than their errors together. */
function difference(place: string, audited: Audited | string | null, expected: string | null): readonly string[] {
  if (audited === null || expected === null || typeof audited === 'string') {
    return audited === expected ? [] : [`${place} is ${JSON.stringify(audited)}, expected ${expected}`];
  }
  const apart = Math.abs(Decimal.parse(audited.text).minus(Decimal.parse(expected)).toNumber());
  const allowed = Number(audited.error) + REFERENCE_ERROR * Math.abs(Number(expected));
  return apart <= allowed ? [] : [`${place} is ${audited.text}, expected ${expected}: off by ${apart} > ${allowed}`];
}

/** Every disagreement of the audit with a reference file, in all columns and milestones. */
export function disagreements(file: string, digits: number): readonly string[] {
  const { parameters, milestones, rows } = readReference(file);
  const audited = auditRows(
    parameters,
    rows.map(({ z }) => z ?? ''),
    COLUMNS,
    digits,
  );
  const cells = rows.flatMap((row, k) =>
    COLUMNS.flatMap((id, c) => difference(`${id} at z = ${row.z}`, audited[k]?.[c] ?? null, row[id])),
  );
  const epochs = Object.entries(auditMilestones(parameters, digits));
  return [...cells, ...epochs.flatMap(([name, value]) => difference(name, value, milestones[name] ?? null))];
}
