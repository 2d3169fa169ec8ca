import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { parse, stringify } from 'yaml';
import { copyContent } from './copyContent.ts';

/**
 * Writes the shipped content to `folder`, with editions that bind one grid and one parameter set, or those that are
 * named, so that a command takes seconds.
 */
export function smallContent(folder: string, sets?: readonly string[]): void {
  copyContent(folder);
  for (const number of readdirSync(join(folder, 'editions'))) {
    const file = join(folder, 'editions', number, 'edition.yaml');
    const edition = parse(readFileSync(file, 'utf8'), { schema: 'failsafe' });
    const [set] = edition.parameter_sets;
    const [grid] = edition.redshift_grids;
    writeFileSync(
      file,
      stringify({ ...edition, parameter_sets: sets ?? [set], redshift_grids: [grid] }, { schema: 'failsafe' }),
    );
  }
}
