import { createHash } from 'node:crypto';
import { type Background, background } from '../cosmology/background.ts';
import type { Epoch } from '../cosmology/epochs.ts';
import type { Propagation } from '../cosmology/propagation.ts';
import { curvatureArgument, type QuantityId } from '../cosmology/quantities.ts';
import type { Content, Edition, ParameterSet, RedshiftGrid, Topic } from '../inputs/types.ts';
import { columnsOf } from './columns.ts';
import { csvCell } from './csvCell.ts';
import { csvText } from './csvText.ts';
import { type EvaluatedGrid, evaluateRows } from './evaluateRows.ts';
import { interpolationErrors } from './interpolationErrors.ts';
import { interpolationTable } from './interpolationTable.ts';
import type { ColumnInterpolation } from './interpolationTypes.ts';
import { milestoneTable } from './milestoneTable.ts';
import { type Settled, settle } from './settle.ts';
import { stamp } from './stamp.ts';
import type { EditionTables, MilestoneTable, Table } from './types.ts';
import { uncertaintiesOf, uncertaintyTable } from './uncertaintyTable.ts';

/** Told after each parameter set: how many are done, of how many. */
export type Progress = (done: number, all: number, set: ParameterSet) => void;

const sha256 = (text: string): string => createHash('sha256').update(text, 'utf8').digest('hex');

/** Indexes of the rows whose line of sight has passed the antipode of a closed space. */
function beyondAntipode(model: Background, rows: readonly (Epoch | null)[]): readonly number[] {
  const halfway = -Math.PI * Math.PI;
  return rows.flatMap((epoch, k) =>
    epoch?.comoving != null && curvatureArgument(model, epoch.comoving) < halfway ? [k] : [],
  );
}

/** One set on one grid, evaluated, with the cells that its doubles left open settled. */
interface Sheet extends EvaluatedGrid {
  readonly edition: Edition;
  readonly set: ParameterSet;
  readonly model: Background;
  readonly grid: RedshiftGrid;
  readonly settled: Settled;
  readonly uncertain: Propagation | null;
  readonly between: readonly ColumnInterpolation[];
}

/** The audit's texts of one column, by row. */
function auditedRows({ grid, settled }: Sheet, id: QuantityId): ReadonlyMap<number, string> {
  return new Map(
    grid.redshifts.flatMap((redshift, row) => {
      const text = settled.of(redshift, id);
      return text === undefined ? [] : [[row, text] as const];
    }),
  );
}

function pressTable(sheet: Sheet, topic: Topic): Table {
  const { edition, set, model, grid, rows } = sheet;
  const columns = columnsOf(topic);
  const values = rows.map((row) => columns.map(({ id }) => row[id]?.value ?? null));
  const audited = columns.map(({ id }) => auditedRows(sheet, id));
  const csv = csvText(
    ['z', ...columns.map(({ id }) => id)],
    values.map((row, k) => [
      grid.redshifts[k] ?? '',
      ...row.map((value, column) => csvCell(value, edition.digits, audited[column]?.get(k))),
    ]),
  );
  const id = `${set.id}.${topic}.${grid.id}`;
  return {
    id,
    set,
    topic,
    grid,
    columns,
    redshifts: grid.redshifts,
    values,
    audited,
    csv,
    stamp: stamp(edition, set, model, id, sha256(csv)),
    beyondAntipode: beyondAntipode(model, sheet.epochs),
    ...uncertaintyTable(sheet.uncertain, grid, columns, values),
    ...interpolationTable(sheet.between, columns),
  };
}

/** All tables of one set: its grids are evaluated first, so that all open cells go to the audit at once. */
async function pressSet(
  edition: Edition,
  set: ParameterSet,
  grids: readonly RedshiftGrid[],
  uncertain: Propagation | null,
): Promise<readonly Table[]> {
  const model = background(set.parameters);
  const columns = edition.topics.flatMap((topic) => columnsOf(topic).map(({ id }) => id));
  const evaluated = grids.map((grid) => {
    const redshifts = grid.redshifts.map(Number);
    const sheet = evaluateRows(model, redshifts);
    const between = interpolationErrors({ model, redshifts, epochs: sheet.epochs, columns, digits: edition.digits });
    return { grid, ...sheet, between };
  });
  const settled = await settle(
    set.parameters,
    evaluated.map(({ grid, rows }) => ({ redshifts: grid.redshifts, rows })),
    edition.digits,
  );
  return evaluated.flatMap((one) =>
    edition.topics.map((topic) => pressTable({ ...one, edition, set, model, settled, uncertain }, topic)),
  );
}

function named<T extends { readonly id: string }>(all: readonly T[], ids: readonly string[]): readonly T[] {
  return ids.map((id) => {
    const found = all.find((one) => one.id === id);
    if (found === undefined) throw new RangeError(`${id} is not among the content files`);
    return found;
  });
}

/**
 * All tables of one edition: every parameter set x topic x redshift grid, and the milestones of every set.
 *
 * Errors: DomainError or ConvergenceError of the kernel for a model that passed the checks but cannot be evaluated.
 */
export async function pressEdition(content: Content, edition: Edition, onProgress?: Progress): Promise<EditionTables> {
  const sets = named(content.parameterSets, edition.parameterSets);
  const grids = named(content.redshiftGrids, edition.redshiftGrids);
  const tables: Table[] = [];
  const milestones: MilestoneTable[] = [];
  for (const [k, set] of sets.entries()) {
    const uncertain = uncertaintiesOf(set, grids);
    tables.push(...(await pressSet(edition, set, grids, uncertain)));
    const table = await milestoneTable(set, background(set.parameters), edition.digits, uncertain);
    milestones.push({ ...table, checksum: sha256(table.csv) });
    onProgress?.(k + 1, sets.length, set);
  }
  return { edition, tables, milestones };
}
