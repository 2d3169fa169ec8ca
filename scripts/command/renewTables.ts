import { differingTables } from '../../src/tables/differingTables.ts';
import { OutputError, outputKind } from '../../src/tables/outputFolder.ts';
import type { EditionTables } from '../../src/tables/types.ts';
import { writeTables } from '../../src/tables/writeTables.ts';
import { stagedRun } from './stagedRun.ts';

/**
 * Writes the CSV files of all editions to `out`, in the place of what it held. A folder that holds a site is left as
 * it is, because its pages and its files must not disagree.
 * @returns whether anything was written: false for a site that holds these very bytes.
 * @throws OutputError for a site with other values.
 */
export async function renewTables(out: string, editions: readonly EditionTables[]): Promise<boolean> {
  if (outputKind(out) === 'site') {
    refuseOtherValues(out, editions);
    return false;
  }
  await stagedRun(out, 'tables', async (folder) => {
    for (const pressed of editions) writeTables(folder, pressed);
  });
  return true;
}

function refuseOtherValues(out: string, editions: readonly EditionTables[]): void {
  const differing = differingTables(out, editions);
  if (differing.length === 0) return;
  throw new OutputError(
    `${out} holds a site whose pages show other values: ${differing.length} CSV files differ, the first is ${differing[0]}.
Renew both with "npm run build", or choose another folder with --out. Nothing was written.`,
  );
}
