import { checkYaml } from './checkYaml.ts';
import { expandGrid } from './expandGrid.ts';
import { decimal, list, mapping, text } from './fields.ts';
import type { NumberRule } from './numberRules.ts';
import type { Checked, RedshiftGrid } from './types.ts';
import type { YamlFile } from './yamlFile.ts';

/** The future ends before z = -1; above the upper bound the tables promise no accuracy. */
const REDSHIFT: NumberRule = { what: 'a redshift', above: '-1', most: '1e6' };
const STEP: NumberRule = { what: 'a step in redshift', above: '0' };

const schema = mapping({
  title: text('a title'),
  note: text('free text').optional(),
  segments: list(
    mapping({ from: decimal(REDSHIFT), to: decimal(REDSHIFT), step: decimal(STEP) }),
    'a list such as [{from: 0, to: 3, step: 0.01}]',
  ).optional(),
  values: list(decimal(REDSHIFT), 'a list of redshifts such as [0.5, 1089.80]').optional(),
});

/** Reads one redshift grid; the id is its file's name. */
export function redshiftGrid(id: string, yaml: YamlFile): Checked<RedshiftGrid> {
  const { value, problems } = checkYaml(yaml, schema);
  if (value === null) return { value, problems };
  const { redshifts, problems: gridProblems } = expandGrid(yaml, value.segments ?? [], value.values ?? []);
  if (gridProblems.length > 0) return { value: null, problems: gridProblems };
  return { value: { id, title: value.title, note: value.note, redshifts: redshifts.map(String) }, problems: [] };
}
