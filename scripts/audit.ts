import { renameSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Certificate } from '../src/inputs/certificate.ts';
import { certificatePath } from '../src/inputs/contentFiles.ts';
import { certificateText } from '../src/tables/certificateText.ts';
import { pressEdition } from '../src/tables/pressEdition.ts';
import { auditEdition } from './command/auditEdition.ts';
import { readAuditOptions } from './command/auditOptions.ts';
import { chosenEditions } from './command/chosen.ts';
import { readFolder } from './command/readFolder.ts';
import { runCommand } from './command/runCommand.ts';
import { shortPath } from './command/shortPath.ts';

await runCommand(async () => {
  const options = readAuditOptions(process.argv.slice(3));
  if (!options) return;
  const content = readFolder(options.content);
  for (const edition of chosenEditions(content, options.edition)) {
    const certificate = await auditEdition(await pressEdition(content, edition), options.fresh);
    const file = join(options.content, certificatePath(edition.number));
    write(file, certificate);
    const { cells, tables, seconds } = certificate;
    const settled = tables.reduce((sum, table) => sum + table.settled, 0);
    console.log(
      `Audited: ${cells.toLocaleString('en-US')} cells of ${tables.length} tables, none is wrong, ${settled} had been ` +
        `settled; ${seconds} s, certificate in ${shortPath(file)}`,
    );
  }
});

/** Beside first, then in place: a kill leaves the old certificate or the new one. */
function write(file: string, certificate: Certificate): void {
  writeFileSync(`${file}.new`, certificateText(certificate));
  renameSync(`${file}.new`, file);
}
