import type { Table } from '../../tables/types.ts';
import { address } from '../addresses.ts';
import { errorText } from '../interpolation/errorText.ts';
import type { ColumnView } from './columnViews.ts';

/** How far interpolation between the rows of a table can be off. Symbols and errors are HTML. */
export interface BetweenRows {
  /** Columns that can be interpolated: largest relative errors of the linear method and of that with four rows. */
  readonly lines: readonly { readonly symbol: string; readonly linear: string; readonly lagrange: string }[];
  readonly file: { readonly name: string; readonly address: string };
  /** Address of the page that explains it. */
  readonly about: string;
}

export function betweenRows(edition: string, table: Table, columns: readonly ColumnView[]): BetweenRows {
  const name = `${table.id}.interpolation`;
  return {
    lines: table.interpolation.flatMap(({ column, linear, lagrange }) => {
      const symbol = columns.find(({ id }) => id === column)?.symbol;
      if (!symbol || !linear || !lagrange) return [];
      return [{ symbol, linear: errorText(linear.relative), lagrange: errorText(lagrange.relative) }];
    }),
    file: { name: `${name}.csv`, address: address.csv(edition, name) },
    about: address.interpolation(),
  };
}
