/**
 * The cells of a `.u.csv` by row and column of a table, as the file writes them; "" where there is no uncertainty.
 *
 * Errors: RangeError if the file lacks a row or a column of the table, or is none.
 */
export function readUncertainties(csv: string, redshifts: readonly string[], columns: readonly string[]): string[][] {
  const [head = [], ...lines] = csv.split('\n').map((line) => line.split(','));
  const rows = new Map(lines.map((cells) => [cells[0], cells]));
  return redshifts.map((redshift) =>
    columns.map((column) => {
      const cell = rows.get(redshift)?.[head.indexOf(`u_${column}`)];
      if (cell === undefined) throw new RangeError(`no uncertainty of ${column} at z = ${redshift}`);
      return cell;
    }),
  );
}
