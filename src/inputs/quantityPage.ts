import { z } from 'zod';
import { checkYaml, problemAt } from './checkYaml.ts';
import { list, mapping, text } from './fields.ts';
import { expectedOneOf } from './suggest.ts';
import type { Checked, QuantityPage } from './types.ts';
import type { YamlFile } from './yamlFile.ts';

const schema = mapping({
  name: text('a name such as Luminosity distance'),
  symbol: text("a symbol in LaTeX: 'D_L'"),
  formula: text("the defining formula in LaTeX: 'D_L = (1+z) D_M'"),
  definition: text('one sentence'),
  symbols: list(
    mapping({
      symbol: text("a symbol in LaTeX: 'D_M'"),
      meaning: text('what it stands for'),
      unit: z.string({ error: "a unit such as Mpc, '' if it has none" }),
    }),
    'a list of {symbol, meaning, unit}',
  ),
  source: text('paper and equation'),
  related: list(text('a column id'), 'a list of column ids, [] if none'),
  alsoCalled: list(text('a name'), 'a list of names, [] if none'),
});

/**
 * Reads the front matter of one quantity page and joins its body; the id is the file's name. `columnIds` are the ids
 * that `related` may name; without them any will do.
 */
export function quantityPage(
  id: string,
  yaml: YamlFile,
  body: string,
  columnIds: readonly string[] | undefined,
): Checked<QuantityPage> {
  const { value, problems } = checkYaml(yaml, schema);
  if (value === null) return { value, problems };
  const wrong = value.related.flatMap((related, index) => {
    const at = (what: string, expected: string) => [problemAt(yaml, ['related', index], what, expected)];
    if (related === id) return at(`${id} is related to itself`, 'other columns');
    if (value.related.indexOf(related) < index) return at(`${related} is listed twice`, 'each column once');
    if (columnIds === undefined || columnIds.includes(related)) return [];
    return at(`there is no column ${related}`, expectedOneOf(related, columnIds));
  });
  return wrong.length > 0 ? { value: null, problems: wrong } : { value: { id, ...value, body }, problems: [] };
}
