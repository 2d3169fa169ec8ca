import { parseArgs } from 'node:util';
import { UsageError } from './command/options.ts';
import { runCommand } from './command/runCommand.ts';
import { runTool } from './command/runTool.ts';

const help = `npm run check

Checks the types of every .ts and .astro file, then lint and format. Changes nothing.`;

await runCommand(async () => {
  if (helpAsked()) {
    console.log(help);
    return;
  }
  const types = await runTool('astro/bin/astro.mjs', ['check', '--minimumFailingSeverity', 'warning']);
  const lint = await runTool('@biomejs/biome/bin/biome', ['ci', '--error-on-warnings']);
  console.log(types === 0 && lint === 0 ? 'Types, lint and format are in order.' : 'The check failed; see above.');
  process.exitCode = types || lint;
});

function helpAsked(): boolean {
  try {
    return parseArgs({ args: process.argv.slice(3), options: { help: { type: 'boolean' } } }).values.help ?? false;
  } catch (error) {
    throw new UsageError((error as Error).message);
  }
}
