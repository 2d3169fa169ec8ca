import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { editionFiles } from './editionFiles.ts';
import type { EditionTables } from './types.ts';

/** Where the files of an edition stand below the output folder. */
export function tablesFolder(number: string): string {
  return join('editions', number, 'tables');
}

/** Writes the CSV files of an edition below `folder`; returns how many. */
export function writeTables(folder: string, pressed: EditionTables): number {
  const target = join(folder, tablesFolder(pressed.edition.number));
  mkdirSync(target, { recursive: true });
  const files = editionFiles(pressed);
  for (const { id, csv } of files) writeFileSync(join(target, `${id}.csv`), csv);
  return files.length;
}
