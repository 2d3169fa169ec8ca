import { readFileSync } from 'node:fs';
import { beforeAll, describe, expect, test } from 'vitest';
import { certificate as readCertificate } from '../../src/inputs/certificate.ts';
import { auditPart } from '../../src/tables/auditPart.ts';
import { certificateEntry } from '../../src/tables/certificateEntry.ts';
import { certificateText } from '../../src/tables/certificateText.ts';
import { auditParts, certify, type PartResult } from '../../src/tables/certify.ts';
import { pressEdition } from '../../src/tables/pressEdition.ts';
import { readPressable } from '../../src/tables/readPressable.ts';
import type { EditionTables, Table } from '../../src/tables/types.ts';

const DAY = { audited: '2026-12-01', seconds: 3 };

let pressed: EditionTables;
let results: readonly PartResult[];

beforeAll(async () => {
  const read = readPressable('content');
  if ('problems' in read) throw new Error('the shipped content has problems');
  const [edition] = read.content.editions;
  if (edition === undefined) throw new Error('the shipped content has no edition');
  const small = { ...edition, parameterSets: ['closed-matter'], redshiftGrids: ['reading', 'future'] };
  pressed = await pressEdition(read.content, small);
  results = await Promise.all(auditParts(pressed).map(async (part) => ({ part, audited: await auditPart(part) })));
}, 60_000);

function certified() {
  const verdict = certify(pressed, results, DAY);
  if ('disagreements' in verdict) throw new Error(JSON.stringify(verdict.disagreements));
  return verdict.certificate;
}

/** The press with one table changed. */
function tampered(id: string, change: (table: Table) => Table): EditionTables {
  return { ...pressed, tables: pressed.tables.map((table) => (table.id === id ? change(table) : table)) };
}

describe('certify(pressed, results)', () => {
  test('finds every cell of a model that recollapses as audited, blank with blank', () => {
    const { tables, cells } = certified();
    expect(tables).toHaveLength(9);
    expect(cells).toBe(47 * 35 + 20);
    expect(tables.find(({ table }) => table === 'closed-matter.horizons.future')?.blank).toBeGreaterThan(10);
  });

  test('names a cell whose last digit is one off', () => {
    const id = 'closed-matter.times.reading';
    const csv = pressed.tables.find((table) => table.id === id)?.csv ?? '';
    const line = csv.split('\n')[5] ?? '';
    const last = line.split(',')[2] ?? '';
    const wrong = last.slice(0, -1) + ((Number(last.at(-1)) + 1) % 10);
    const verdict = certify(
      tampered(id, (table) => ({ ...table, csv: csv.replace(last, wrong) })),
      results,
      DAY,
    );
    expect(verdict).toEqual({
      disagreements: [
        { table: id, row: `z = ${line.split(',')[0]}`, column: 't_Gyr', published: wrong, audited: last },
      ],
    });
  });

  test('names a cell that is blank and should not be', () => {
    const id = 'closed-matter.distances.reading';
    const verdict = certify(
      tampered(id, (table) => ({ ...table, csv: table.csv.replace(/^0\.5,[^,]+/m, '0.5,') })),
      results,
      DAY,
    );
    expect(verdict).toMatchObject({ disagreements: [{ table: id, row: 'z = 0.5', column: 'D_C_Mpc', published: '' }] });
  });
});

describe('a certificate', () => {
  test('comes back from its file as it was', () => {
    const text = certificateText(certified());
    expect(text.split('\n').filter((line) => line.includes('"table":'))).toHaveLength(9);
    const { value, problems } = readCertificate('audit.json', new TextEncoder().encode(text));
    expect(problems).toEqual([]);
    expect(value).toEqual(certified());
  });

  test('speaks only of the bytes that were audited', () => {
    const table = pressed.tables[0] as Table;
    expect(certificateEntry(certified(), table.id, table.stamp.checksum)?.cells).toBeGreaterThan(0);
    expect(certificateEntry(certified(), table.id, '0'.repeat(64))).toBeUndefined();
    expect(certificateEntry(undefined, table.id, table.stamp.checksum)).toBeUndefined();
  });

  test.each([
    ['{', 'this is no JSON'],
    ['{}', 'edition: Invalid input: expected string, received undefined'],
  ])('%s is refused', (text, wrong) => {
    const { value, problems } = readCertificate('audit.json', new TextEncoder().encode(text));
    expect(value).toBeNull();
    expect(problems).toEqual([
      { file: 'audit.json', line: 1, column: 1, wrong, expected: 'the file as npm run audit writes it; run it again' },
    ]);
  });

  test('the shipped one speaks of every shipped table', async () => {
    const { value } = readCertificate('audit.json', readFileSync('content/editions/2026.1/audit.json'));
    const table = pressed.tables.find(({ id }) => id === 'closed-matter.densities.reading') as Table;
    expect(value?.tables).toHaveLength(255);
    expect(certificateEntry(value ?? undefined, table.id, table.stamp.checksum)).toBeDefined();
  });
});
