import type { Content } from '../../inputs/types.ts';
import type { EditionTables, Table } from '../../tables/types.ts';
import { address } from '../addresses.ts';
import { setsOf } from '../lookUp.ts';
import { columnValues, plotTable } from '../plotTables.ts';
import { quantityText, symbolHtml } from '../quantityText.ts';
import { setTitle } from '../setTitle.ts';
import { realMinus } from '../writtenNumber.ts';
import { graduate } from './graduate.ts';

/** One graduated scale. Positions run from 0 at z = 0 to 1 at the far end. */
export interface Ruler {
  /** MathML. */
  readonly symbol: string;
  readonly unit: string;
  readonly name: string;
  /** Page of the quantity. */
  readonly address: string;
  readonly strokes: readonly number[];
  readonly labels: readonly { readonly at: number; readonly text: string }[];
}

/** Scales side by side: what stands on one line belongs together. */
export interface Rulers {
  readonly set: { readonly title: string; readonly address: string };
  readonly farthest: string;
  readonly rulers: readonly Ruler[];
}

/** Columns with the unit of the scale, and how many units of the column make one of it. */
const SCALES = [
  { column: 'z', unit: '', per: 1 },
  { column: 'D_C_Mpc', unit: 'Gpc', per: 1000 },
  { column: 't_L_Gyr', unit: 'Gyr', per: 1 },
  { column: 't_Gyr', unit: 'Gyr', per: 1 },
  { column: 'mu_mag', unit: 'mag', per: 1 },
  { column: 'kpc_per_arcsec', unit: 'kpc/″', per: 1 },
] as const;

/** Smallest distance of strokes and of labels, in parts of the length of the scale. */
const APART = { strokes: 0.0046, labels: 0.034 } as const;
/** The distance modulus falls without end towards z = 0; its scale begins here. */
const NEAREST = 0.01;

/** The scales of the first parameter set, along its comoving distance; undefined if no grid suits them. */
export function rulers(content: Content, pressed: EditionTables): Rulers | undefined {
  const set = setsOf(pressed)[0];
  if (!set) return undefined;
  const distances = plotTable(pressed, set.id, 'distances');
  const times = plotTable(pressed, set.id, 'times');
  if (!distances || !times) return undefined;
  const far = column(distances, 'D_C_Mpc').at(-1) ?? 1;
  const positions = column(distances, 'D_C_Mpc').map((distance) => distance / far);
  return {
    set: { title: setTitle(set), address: address.set(pressed.edition.number, set.id) },
    farthest: String(Number(distances.redshifts.at(-1))),
    rulers: SCALES.map(({ column: id, unit, per }) => {
      const quantity = quantityText(content, id);
      const table = id === 't_Gyr' || id === 't_L_Gyr' ? times : distances;
      const from = id === 'mu_mag' ? table.redshifts.findIndex((z) => Number(z) >= NEAREST) : 0;
      const values = column(table, id).map((value) => value / per);
      return {
        symbol: symbolHtml(quantity),
        unit,
        name: quantity.name,
        address: address.quantity(id),
        ...ruled(positions.slice(from), values.slice(from)),
      };
    }),
  };
}

function ruled(positions: readonly number[], values: readonly number[]): Pick<Ruler, 'strokes' | 'labels'> {
  return {
    strokes: graduate(positions, values, APART.strokes).map(({ at }) => at),
    labels: graduate(positions, values, APART.labels).map(({ at, value }) => ({ at, text: realMinus(String(value)) })),
  };
}

function column(table: Table, id: string): number[] {
  return id === 'z' ? table.redshifts.map(Number) : columnValues(table, id).map((value) => value ?? 0);
}
