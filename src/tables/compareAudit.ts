import { Decimal } from '../numerics/decimal.ts';
import { roundDecimalText } from '../numerics/roundDecimalText.ts';
import type { AuditedPart, AuditPart } from './auditPart.ts';
import { decimalText } from './csvCell.ts';
import type { MilestoneTable, Table } from './types.ts';

/** A published cell that is not the audited value, correctly rounded. */
export interface Disagreement {
  readonly table: string;
  /** "z = 0.50", or the name of a milestone. */
  readonly row: string;
  readonly column: string;
  readonly published: string;
  readonly audited: string;
}

/** One table beside its audit. */
export interface Comparison {
  readonly cells: number;
  readonly blank: number;
  readonly disagreements: readonly Disagreement[];
  /** Largest relative error of the double values, by column. */
  readonly largestErrors: Readonly<Record<string, number>>;
}

interface Cell {
  readonly row: string;
  readonly column: string;
  readonly published: string;
  /** The double before rounding. */
  readonly value: number | string | null;
  readonly audited: string | null;
}

/** An audited value as the file should print it. Words stay as they are. */
function expectedText({ value, audited }: Cell, digits: number): string {
  if (audited === null || typeof value === 'string') return audited ?? '';
  const rounded = roundDecimalText(audited, '0', digits);
  if (rounded === 'undecided') throw new RangeError(`${audited} does not round to ${digits} digits`);
  return decimalText(rounded);
}

function relativeError({ value, audited }: Cell): number {
  if (typeof value !== 'number' || audited === null) return 0;
  const truth = Decimal.parse(audited);
  if (truth.isZero()) return value === 0 ? 0 : 1;
  const difference = Decimal.parse(value.toExponential(40)).minus(truth).toNumber();
  return Math.abs(difference / truth.toNumber());
}

function compare(table: string, cells: readonly Cell[], digits: number): Comparison {
  const largestErrors: Record<string, number> = {};
  for (const cell of cells) {
    largestErrors[cell.column] = Math.max(largestErrors[cell.column] ?? 0, relativeError(cell));
  }
  return {
    cells: cells.length,
    blank: cells.filter(({ published }) => published === '').length,
    largestErrors,
    disagreements: cells.flatMap((cell) => {
      const { row, column, published } = cell;
      const audited = expectedText(cell, digits);
      return audited === published ? [] : [{ table, row, column, published, audited }];
    }),
  };
}

/** The rows of a CSV without its head. Cells of ours hold no commas and no quotes. */
function published(csv: string): readonly (readonly string[])[] {
  return csv
    .trimEnd()
    .split('\n')
    .slice(1)
    .map((line) => line.split(','));
}

/** Every cell of a published table against the audit of its set, to the edition's number of digits. */
export function compareTable(table: Table, part: AuditPart, audited: AuditedPart, digits: number): Comparison {
  const rowOf = new Map(part.redshifts.map((redshift, row) => [redshift, row]));
  const cells = published(table.csv).flatMap(([redshift = '', ...row], k) =>
    table.columns.map(({ id }, column) => ({
      row: `z = ${redshift}`,
      column: id,
      published: row[column] ?? '',
      value: table.values[k]?.[column] ?? null,
      audited: audited.cells[rowOf.get(redshift) ?? -1]?.[part.columns.indexOf(id)] ?? null,
    })),
  );
  return compare(table.id, cells, digits);
}

/** Every milestone of a published table against the audit of its set. */
export function compareMilestones(table: MilestoneTable, audited: AuditedPart, digits: number): Comparison {
  const lines = published(table.csv);
  const cells = table.milestones.map(({ name, value }, k) => ({
    row: name,
    column: name,
    published: lines[k]?.[1] ?? '',
    value,
    audited: audited.milestones[name],
  }));
  return compare(table.id, cells, digits);
}
