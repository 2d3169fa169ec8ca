import type { z } from 'zod';
import { checkYaml, problemAt } from './checkYaml.ts';
import { date, list, mapping, reference, text, wholeNumber, word } from './fields.ts';
import type { Checked, Edition, Problem } from './types.ts';
import type { YamlFile } from './yamlFile.ts';

/** Year and running number, e.g. 2026.1. */
export const EDITION_NUMBER = /^\d{4}\.[1-9]\d{0,3}$/;
export const EDITION_NUMBER_WORDS = 'year.number, such as 2026.1';
const ANY_ID = /^\S+$/;
/** Fewer digits than 6 serve nobody; doubles do not settle more than 12. */
const [FEWEST_DIGITS, MOST_DIGITS] = [6, 12];

const ids = (example: string) =>
  list(reference(ANY_ID, `an id such as ${example}`), `a list of ids: [${example}, ...]`).min(1, {
    error: `at least one id: [${example}]`,
  });

const schema = mapping({
  title: text('a title'),
  state: word(['draft', 'released', 'withdrawn']),
  released: date.optional(),
  digits: wholeNumber(FEWEST_DIGITS, MOST_DIGITS),
  parameter_sets: ids('planck-2018-lensing'),
  redshift_grids: ids('survey'),
  topics: list(
    word(['distances', 'times', 'densities', 'horizons']),
    'a list: [distances, times, densities, horizons]',
  ).min(1, {
    error: 'at least one of distances, times, densities, horizons',
  }),
  supersedes: reference(EDITION_NUMBER, EDITION_NUMBER_WORDS).optional(),
  errata: list(
    mapping({ date, text: text('what was wrong and what holds instead') }),
    'a list of {date, text}, [] if none',
  ),
});
type Raw = z.output<typeof schema>;

/** Reads one edition; the number is its folder's name. What it refers to is checked in `editionProblems`. */
export function edition(number: string, yaml: YamlFile): Checked<Edition> {
  const { value, problems } = checkYaml(yaml, schema);
  if (value === null) return { value, problems };
  const wrong = [...dateProblems(yaml, value), ...repeatedProblems(yaml, value)];
  if (wrong.length > 0) return { value: null, problems: wrong };
  const { parameter_sets: parameterSets, redshift_grids: redshiftGrids, ...rest } = value;
  return { value: { number, parameterSets, redshiftGrids, ...rest }, problems: [] };
}

function dateProblems(yaml: YamlFile, { state, released }: Raw): Problem[] {
  if (state === 'draft' && released !== undefined) {
    return [problemAt(yaml, ['released'], 'a draft has a date of release', 'state: released, or no date')];
  }
  if (state !== 'draft' && released === undefined) {
    return [problemAt(yaml, ['released'], 'released is missing', `the date of release, as state is ${state}`)];
  }
  return [];
}

function repeatedProblems(yaml: YamlFile, value: Raw): Problem[] {
  return (['parameter_sets', 'redshift_grids', 'topics'] as const).flatMap((key) =>
    value[key].flatMap((id, index) =>
      value[key].indexOf(id as never) < index
        ? [problemAt(yaml, [key, index], `${id} is listed twice`, 'each once')]
        : [],
    ),
  );
}
