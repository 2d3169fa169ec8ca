import type { Background } from '../cosmology/background.ts';
import type { Epoch } from '../cosmology/epochs.ts';
import { curvatureArgument, QUANTITIES, type QuantityId } from '../cosmology/quantities.ts';

/** A column as a reader of its file finds it. */
export interface GridColumn {
  readonly redshifts: readonly number[];
  /** Values on the rows; null where the column does not exist. */
  readonly cells: readonly (number | null)[];
  /** Half a unit of the last digit of each cell. */
  readonly halfUnits: readonly number[];
  /** For each interval the run of rows without blanks that it belongs to; null where it cannot be interpolated. */
  readonly runs: readonly (Run | null)[];
  /** The true value at any epoch. */
  readonly at: (epoch: Epoch | null) => number | null;
}

/** Rows from `start` to before `end`. */
export interface Run {
  readonly start: number;
  readonly end: number;
}

/** Columns made of D_M, which is folded back to positive values where light has passed an antipode. */
const FOLDED: ReadonlySet<QuantityId> = new Set<QuantityId>([
  'D_M_Mpc',
  'D_A_Mpc',
  'D_L_Mpc',
  'mu_mag',
  'kpc_per_arcsec',
  'dV_dz_Mpc3_per_deg2',
  'D_V_Mpc',
]);

/**
 * One column at the epochs of a grid. An interval with a blank end cannot be interpolated; nor can one across an
 * antipode, if the column has a kink there.
 */
export function gridColumn(
  id: QuantityId,
  model: Background,
  redshifts: readonly number[],
  rows: readonly (Epoch | null)[],
  digits: number,
): GridColumn {
  const at = (epoch: Epoch | null) => (epoch === null ? null : QUANTITIES[id](model, epoch));
  const cells = rows.map(at);
  const kinked = (k: number) => FOLDED.has(id) && antipodes(model, rows[k]) !== antipodes(model, rows[k + 1]);
  return {
    redshifts,
    cells,
    halfUnits: cells.map((cell) => halfUnit(cell ?? 0, digits)),
    runs: runsOf(cells).map((run, k) => (kinked(k) ? null : run)),
    at,
  };
}

function halfUnit(cell: number, digits: number): number {
  return cell === 0 ? 0 : Number(`5e${Math.floor(Math.log10(Math.abs(cell))) - digits}`);
}

function runsOf(cells: readonly (number | null)[]): (Run | null)[] {
  const runs: (Run | null)[] = cells.slice(1).map(() => null);
  for (let start = 0; start < cells.length; start++) {
    if (cells[start] === null) continue;
    let end = start + 1;
    while (end < cells.length && cells[end] !== null) end++;
    runs.fill({ start, end }, start, end - 1);
    start = end;
  }
  return runs;
}

/** How many antipodes light from this epoch has passed. */
function antipodes(model: Background, epoch: Epoch | null | undefined): number {
  if (epoch?.comoving == null) return 0;
  return Math.floor(Math.sqrt(Math.max(0, -curvatureArgument(model, epoch.comoving))) / Math.PI);
}
