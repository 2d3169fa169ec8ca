import { buildAll } from './command/buildAll.ts';
import { defaultOut, readOptions } from './command/options.ts';
import { runCommand } from './command/runCommand.ts';

const help = {
  name: 'build',
  does: 'Checks the content, computes every table and builds the site.',
  out: 'where the site goes; replaced as a whole when the build succeeds (default: dist)',
};

await runCommand(async () => {
  const folders = readOptions(help, process.argv.slice(3));
  if (folders) await buildAll(folders.content, folders.out ?? defaultOut);
});
