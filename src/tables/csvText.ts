import { stringify } from 'csv-stringify/sync';

/**
 * Rows of finished cells as CSV: UTF-8, LF, one header row, no comment lines (RFC 4180 apart from the line ends).
 *
 * Errors: RangeError when a row has not one cell for each column, since the writer would cut or pad it silently.
 */
export function csvText(header: readonly string[], rows: readonly (readonly string[])[]): string {
  const wrong = rows.findIndex((row) => row.length !== header.length);
  if (wrong >= 0)
    throw new RangeError(`row ${wrong + 1} has ${rows[wrong]?.length} cells for ${header.length} columns`);
  return stringify([[...header], ...rows.map((row) => [...row])], {
    record_delimiter: '\n',
    delimiter: ',',
    eof: true,
    bom: false,
    quoted: false,
    escape_formulas: false,
    cast: {
      number: (value) => {
        throw new RangeError(`the number ${value} reached the CSV writer unrounded`);
      },
    },
  });
}
