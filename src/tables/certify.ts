import type { Certificate, CertificateEntry } from '../inputs/certificate.ts';
import type { AuditedPart, AuditPart } from './auditPart.ts';
import { type Comparison, compareMilestones, compareTable, type Disagreement } from './compareAudit.ts';
import { WORKING_DIGITS } from './decidingText.ts';
import { METHOD_VERSION } from './method.ts';
import { roundedUp } from './roundedUp.ts';
import type { EditionTables, MilestoneTable, Table } from './types.ts';

/** Digits of the second working precision; see `twice` in src/cosmology/audit. */
const FINER_DIGITS = WORKING_DIGITS + 16;

/** Digits of a largest error. */
const ERROR_DIGITS = 2;

/** One part of an edition's audit with its result. */
export interface PartResult {
  readonly part: AuditPart;
  readonly audited: AuditedPart;
}

/** Either a certificate, or every cell that is wrong. */
export type Verdict = { readonly certificate: Certificate } | { readonly disagreements: readonly Disagreement[] };

/** The parts of an edition: one for each parameter set. */
export function auditParts(pressed: EditionTables): readonly AuditPart[] {
  const sets = new Map(pressed.tables.map(({ set }) => [set.id, set]));
  return [...sets.values()].map((set) => {
    const tables = pressed.tables.filter((table) => table.set.id === set.id);
    return {
      set: set.id,
      parameters: set.parameters,
      redshifts: [...new Set(tables.flatMap(({ redshifts }) => redshifts))],
      columns: [...new Set(tables.flatMap(({ columns }) => columns.map(({ id }) => id)))],
    };
  });
}

function entry(table: Table | MilestoneTable, checksum: string, settled: number, found: Comparison): CertificateEntry {
  return {
    table: table.id,
    sha256: checksum,
    cells: found.cells,
    blank: found.blank,
    settled,
    largestError: roundedUp(Math.max(0, ...Object.values(found.largestErrors)), ERROR_DIGITS),
  };
}

function settledCells(table: Table): number {
  return table.audited.reduce((sum, rows) => sum + rows.size, 0);
}

/** Compares all tables of an edition with their audit. `audited` is the day, `seconds` what the audit took. */
export function certify(
  pressed: EditionTables,
  results: readonly PartResult[],
  { audited, seconds }: { readonly audited: string; readonly seconds: number },
): Verdict {
  const { number, digits } = pressed.edition;
  const resultOf = new Map(results.map((result) => [result.part.set, result]));
  const of = (set: string): PartResult => {
    const result = resultOf.get(set);
    if (result === undefined) throw new RangeError(`${set} has not been audited`);
    return result;
  };
  const tables = pressed.tables.map((table) => {
    const { part, audited: found } = of(table.set.id);
    const comparison = compareTable(table, part, found, digits);
    return { comparison, entry: entry(table, table.stamp.checksum, settledCells(table), comparison) };
  });
  const milestones = pressed.milestones.map((table) => {
    const comparison = compareMilestones(table, of(table.set.id).audited, digits);
    const settled = table.milestones.filter((one) => one.audited !== undefined).length;
    return { comparison, entry: entry(table, table.checksum, settled, comparison) };
  });
  const all = [...tables, ...milestones];
  const disagreements = all.flatMap(({ comparison }) => comparison.disagreements);
  if (disagreements.length > 0) return { disagreements };
  return {
    certificate: {
      edition: number,
      method: METHOD_VERSION,
      workingDigits: [WORKING_DIGITS, FINER_DIGITS],
      precisionError: roundedUp(Math.max(...results.map((result) => result.audited.precisionError)), ERROR_DIGITS),
      audited,
      seconds,
      cells: all.reduce((sum, one) => sum + one.comparison.cells, 0),
      disagreements: 0,
      largestErrors: largestErrors(all.map(({ comparison }) => comparison)),
      tables: all.map((one) => one.entry),
    },
  };
}

function largestErrors(comparisons: readonly Comparison[]): Readonly<Record<string, string>> {
  const largest = new Map<string, number>();
  for (const [column, error] of comparisons.flatMap((one) => Object.entries(one.largestErrors))) {
    largest.set(column, Math.max(largest.get(column) ?? 0, error));
  }
  return Object.fromEntries([...largest].map(([column, error]) => [column, roundedUp(error, ERROR_DIGITS)]));
}
