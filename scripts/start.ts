import { serveSite } from '../src/site/serveSite.ts';
import { buildAll } from './command/buildAll.ts';
import { defaultOut, readOptions } from './command/options.ts';
import { runCommand } from './command/runCommand.ts';
import { untilStopped } from './command/untilStopped.ts';

const help = {
  name: 'start',
  does: 'Builds the site as "npm run build" does, then serves it to this machine until Ctrl-C.',
  out: 'where the site goes; replaced as a whole when the build succeeds (default: dist)',
};
const FIRST_PORT = 4321;

await runCommand(async () => {
  const folders = readOptions(help, process.argv.slice(3));
  if (!folders) return;
  const out = folders.out ?? defaultOut;
  const { content } = await buildAll(folders.content, out);
  const site = await serveSite(out, content.site.base, FIRST_PORT);
  console.log(`
${content.site.title}: ${site.address}
Look up a value, open a table, download its CSV. Ctrl-C stops serving.
To change the tables, edit the files in the content folder and start again, or use "npm run dev".`);
  await untilStopped();
  await site.close();
});
