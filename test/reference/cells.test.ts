import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { background } from '../../src/cosmology/background.ts';
import type { Parameters } from '../../src/cosmology/parameters.ts';
import type { QuantityId } from '../../src/cosmology/quantities.ts';
import { csvCell } from '../../src/tables/csvCell.ts';
import { evaluateRows } from '../../src/tables/evaluateRows.ts';
import { settle } from '../../src/tables/settle.ts';

interface Cells {
  readonly parameters: Parameters;
  /** "z", then column ids. */
  readonly columns: readonly ['z', ...QuantityId[]];
  readonly rows: readonly (readonly [string, ...(string | null)[]])[];
}

/** Significant digits of a CSV cell. */
const DIGITS = 10;
const FOLDER = 'test/reference/cells';

const read = (file: string) => JSON.parse(readFileSync(`${FOLDER}/${file}`, 'utf8')) as Cells;

/** Rounds a decimal text exactly, by the code of the engine and not ours. */
const rounding = new Intl.NumberFormat('en', {
  notation: 'scientific',
  minimumSignificantDigits: DIGITS,
  maximumSignificantDigits: DIGITS,
  roundingMode: 'halfEven',
});

/** One notation for cells and references; "" where the quantity does not exist. */
function rounded(text: string | null): string {
  return text ? rounding.format(text as Intl.StringNumericLiteral) : '';
}

/** Every cell that is not the rounded reference, as "z column: ours, not reference". */
async function wrongCells({ parameters, columns, rows }: Cells): Promise<string[]> {
  const redshifts = rows.map(([z]) => z);
  const evaluated = evaluateRows(background(parameters), redshifts.map(Number)).rows;
  const settled = await settle(parameters, [{ redshifts, rows: evaluated }], DIGITS);
  const [, ...ids] = columns;
  return rows.flatMap(([z, ...references], k) =>
    ids.flatMap((id, column) => {
      const ours = csvCell(evaluated[k]?.[id]?.value ?? null, DIGITS, settled.of(z, id));
      const reference = references[column] ?? null;
      return rounded(ours) === rounded(reference) ? [] : [`${z} ${id}: ${ours}, not ${reference}`];
    }),
  );
}

const files = readdirSync(FOLDER).filter((name) => name.endsWith('.json'));

describe('cells of the shipped sets are the 24-digit references, correctly rounded to ten digits', () => {
  test.each(files)('%s', async (file) => {
    expect(await wrongCells(read(file))).toEqual([]);
  });

  test('there are at least 20000 of them', () => {
    const cells = files.flatMap((file) => read(file).rows.flatMap(([, ...row]) => row.filter((cell) => cell !== null)));
    expect(cells.length).toBeGreaterThanOrEqual(20_000);
  });
});
