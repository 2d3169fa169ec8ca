import { checkOutput } from '../src/tables/outputFolder.ts';
import { defaultOut, readOptions } from './command/options.ts';
import { pressAll } from './command/pressAll.ts';
import { readFolder } from './command/readFolder.ts';
import { renewTables } from './command/renewTables.ts';
import { runCommand } from './command/runCommand.ts';
import { summary } from './command/summary.ts';

const help = {
  name: 'tables',
  does: 'Checks the content, computes every table and writes the CSV files to DIR/editions/NUMBER/tables/.',
  out: 'where the tables go; a folder of tables is replaced as a whole, a site is left as it is (default: dist)',
};

await runCommand(async () => {
  const folders = readOptions(help, process.argv.slice(3));
  if (!folders) return;
  const { content, out = defaultOut } = folders;
  const started = performance.now();
  checkOutput(out, content);
  const { editions } = await pressAll(readFolder(content));
  const written = await renewTables(out, editions);
  console.log(summary(written ? 'Written' : 'The site holds these tables already', editions, started, out));
});
