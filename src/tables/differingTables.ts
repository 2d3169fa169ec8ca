import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { editionFiles } from './editionFiles.ts';
import type { EditionTables } from './types.ts';
import { tablesFolder } from './writeTables.ts';

/** The CSV files, relative to `folder`, that are missing there, differ from what was pressed, or are not part of it. */
export function differingTables(folder: string, editions: readonly EditionTables[]): readonly string[] {
  return editions.flatMap((pressed) => {
    const place = tablesFolder(pressed.edition.number);
    const wanted = new Map(editionFiles(pressed).map(({ id, csv }) => [`${id}.csv`, csv]));
    const names = new Set([...wanted.keys(), ...csvFiles(join(folder, place))]);
    return [...names]
      .filter((name) => textOf(join(folder, place, name)) !== wanted.get(name))
      .map((n) => join(place, n));
  });
}

function csvFiles(folder: string): readonly string[] {
  return existsSync(folder) ? readdirSync(folder).filter((name) => name.endsWith('.csv')) : [];
}

function textOf(path: string): string | undefined {
  return existsSync(path) ? readFileSync(path, 'utf8') : undefined;
}
