import { problemAt } from './checkYaml.ts';
import { expectedOneOf } from './suggest.ts';
import type { Edition, Problem } from './types.ts';
import type { YamlFile } from './yamlFile.ts';

/** An edition with the file it stands in. */
export interface EditionFile {
  readonly value: Edition;
  readonly yaml: YamlFile;
}

/** Every id and number that the folder holds, whether or not its file is right. */
export interface KnownIds {
  readonly sets: readonly string[];
  readonly grids: readonly string[];
  readonly editions: readonly string[];
}

/** What editions refer to and the folder does not hold, and editions that supersede each other in a circle. */
export function editionProblems(files: readonly EditionFile[], known: KnownIds): Problem[] {
  return files.flatMap(({ value: edition, yaml }) => [
    ...unknownIds(yaml, 'parameter_sets', 'parameter set', edition.parameterSets, known.sets),
    ...unknownIds(yaml, 'redshift_grids', 'redshift grid', edition.redshiftGrids, known.grids),
    ...supersedesProblems(files, known, edition, yaml),
  ]);
}

function unknownIds(
  yaml: YamlFile,
  key: string,
  what: string,
  ids: readonly string[],
  known: readonly string[],
): Problem[] {
  return ids.flatMap((id, index) =>
    known.includes(id) ? [] : [problemAt(yaml, [key, index], `there is no ${what} ${id}`, expectedOneOf(id, known))],
  );
}

function supersedesProblems(
  files: readonly EditionFile[],
  known: KnownIds,
  { number, supersedes }: Edition,
  yaml: YamlFile,
): Problem[] {
  if (supersedes === undefined) return [];
  if (!known.editions.includes(supersedes)) {
    const others = known.editions.filter((other) => other !== number);
    return [problemAt(yaml, ['supersedes'], `there is no edition ${supersedes}`, expectedOneOf(supersedes, others))];
  }
  const chain = [number];
  for (let next: string | undefined = supersedes; next !== undefined; next = supersededBy(files, next)) {
    chain.push(next);
    if (next === number) {
      const expected = 'an edition that came before this one';
      return [problemAt(yaml, ['supersedes'], `editions supersede each other: ${chain.join(', ')}`, expected)];
    }
    // A circle further on is reported where it stands.
    if (chain.indexOf(next) < chain.length - 1) return [];
  }
  return [];
}

function supersededBy(files: readonly EditionFile[], number: string): string | undefined {
  return files.find(({ value }) => value.number === number)?.value.supersedes;
}
