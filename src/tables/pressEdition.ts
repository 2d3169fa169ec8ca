import { createHash } from 'node:crypto';
import { type Background, background } from '../cosmology/background.ts';
import { type Epoch, epochs } from '../cosmology/epochs.ts';
import { curvatureArgument, QUANTITIES, type QuantityId } from '../cosmology/quantities.ts';
import type { Content, Edition, ParameterSet, RedshiftGrid, Topic } from '../inputs/types.ts';
import { columnsOf } from './columns.ts';
import { csvCell } from './csvCell.ts';
import { csvText } from './csvText.ts';
import { milestoneTable } from './milestoneTable.ts';
import { stamp } from './stamp.ts';
import type { EditionTables, MilestoneTable, Table } from './types.ts';

/** Told after each parameter set: how many are done, of how many. */
export type Progress = (done: number, all: number, set: ParameterSet) => void;

const sha256 = (text: string): string => createHash('sha256').update(text, 'utf8').digest('hex');

function isQuantity(id: string): id is QuantityId {
  return id in QUANTITIES;
}

function columnValue(id: string, model: Background, epoch: Epoch | null): number | null {
  if (!isQuantity(id)) throw new RangeError(`no quantity computes the column ${id}`);
  return epoch === null ? null : QUANTITIES[id](model, epoch);
}

/** Indexes of the rows whose line of sight has passed the antipode of a closed space. */
function beyondAntipode(model: Background, rows: readonly (Epoch | null)[]): readonly number[] {
  const halfway = -Math.PI * Math.PI;
  return rows.flatMap((epoch, k) =>
    epoch?.comoving != null && curvatureArgument(model, epoch.comoving) < halfway ? [k] : [],
  );
}

interface Sheet {
  readonly edition: Edition;
  readonly set: ParameterSet;
  readonly model: Background;
  readonly grid: RedshiftGrid;
  readonly rows: readonly (Epoch | null)[];
}

function pressTable({ edition, set, model, grid, rows }: Sheet, topic: Topic): Table {
  const columns = columnsOf(topic);
  const values = rows.map((epoch) => columns.map(({ id }) => columnValue(id, model, epoch)));
  const csv = csvText(
    ['z', ...columns.map(({ id }) => id)],
    values.map((row, k) => [grid.redshifts[k] ?? '', ...row.map((value) => csvCell(value, edition.digits))]),
  );
  return {
    id: `${set.id}.${topic}.${grid.id}`,
    set,
    topic,
    grid,
    columns,
    redshifts: grid.redshifts,
    values,
    csv,
    stamp: stamp(edition, set, model, sha256(csv)),
    beyondAntipode: beyondAntipode(model, rows),
  };
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
export function pressEdition(content: Content, edition: Edition, onProgress?: Progress): EditionTables {
  const sets = named(content.parameterSets, edition.parameterSets);
  const grids = named(content.redshiftGrids, edition.redshiftGrids);
  const tables: Table[] = [];
  const milestones: MilestoneTable[] = [];
  for (const [k, set] of sets.entries()) {
    const model = background(set.parameters);
    for (const grid of grids) {
      const rows = epochs(model, grid.redshifts.map(Number));
      tables.push(...edition.topics.map((topic) => pressTable({ edition, set, model, grid, rows }, topic)));
    }
    const table = milestoneTable(set, model, edition.digits);
    milestones.push({ ...table, checksum: sha256(table.csv) });
    onProgress?.(k + 1, sets.length, set);
  }
  return { edition, tables, milestones };
}
