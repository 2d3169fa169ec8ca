import { background } from '../src/cosmology/background.ts';
import { gridAdvice } from '../src/tables/gridAdvice.ts';
import { gridAdviceText } from '../src/tables/gridAdviceText.ts';
import { chosenColumn, chosenSet, digitsFor } from './command/chosen.ts';
import { readGridOptions } from './command/gridOptions.ts';
import { readFolder } from './command/readFolder.ts';
import { runCommand } from './command/runCommand.ts';

await runCommand(async () => {
  const options = readGridOptions(process.argv.slice(3));
  if (!options) return;
  const { error: wanted, method, from, to } = options;
  const column = chosenColumn(options.column);
  const content = readFolder(options.content);
  const set = chosenSet(content, options.set);
  const model = background(set.parameters);
  const wish = { model, column, method, wanted, from, to, digits: digitsFor(content, set) };
  console.log(gridAdviceText(set.id, wish, gridAdvice(wish)));
});
