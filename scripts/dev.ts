import { devSite } from '../src/site/devSite.ts';
import type { Press } from '../src/site/press.ts';
import { checkOutput } from '../src/tables/outputFolder.ts';
import { readOptions } from './command/options.ts';
import { pressAll } from './command/pressAll.ts';
import { projectRoot } from './command/projectRoot.ts';
import { ContentError, readFolder } from './command/readFolder.ts';
import { renewTables } from './command/renewTables.ts';
import { runCommand } from './command/runCommand.ts';
import { shortPath } from './command/shortPath.ts';
import { untilStopped } from './command/untilStopped.ts';

const help = {
  name: 'dev',
  does: 'Serves the site while you edit: pages follow every change of a content file, and problems are reported.',
  out: 'write the CSV files there too, anew after each change (default: they are only served)',
};
const FIRST_PORT = 4321;

await runCommand(async () => {
  const folders = readOptions(help, process.argv.slice(3));
  if (!folders) return;
  const { content, out } = folders;
  const press = await renew(content, out);
  const site = await devSite(press, projectRoot, FIRST_PORT);
  await site.watch(content, async () => {
    try {
      const next = await renew(content, out);
      site.show(next);
      console.log(`The pages show the change. ${addressNote(press, next)}`.trimEnd());
    } catch (error) {
      console.error(error instanceof ContentError ? `\n${error.message}` : error);
      console.error('The pages stay as they were until this is mended.');
      site.complain((error as Error).message);
    }
  });
  console.log(`
${press.content.site.title}: ${site.address}
The pages follow the files in ${shortPath(content)}. Ctrl-C stops.`);
  await untilStopped();
  await site.close();
});

/** Reads, computes and, when `out` is given, writes the tables. */
async function renew(content: string, out: string | undefined): Promise<Press> {
  if (out) checkOutput(out, content);
  const press = await pressAll(readFolder(content));
  if (out) await renewTables(out, press.editions);
  return press;
}

/** The server keeps the address it started with. */
function addressNote(started: Press, now: Press): string {
  const [a, b] = [started.content.site, now.content.site];
  return a.site === b.site && a.base === b.base ? '' : 'Start again to use the new site or base of site.yaml.';
}
