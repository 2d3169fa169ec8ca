import { certificate } from './certificate.ts';
import { certificatePath, editionFiles, type FileBytes, filesOf } from './contentFiles.ts';
import { edition } from './edition.ts';
import { editionProblems } from './editionProblems.ts';
import { nameProblems } from './nameProblems.ts';
import { openYaml } from './openYaml.ts';
import { parameterSet } from './parameterSet.ts';
import { placeInEdition } from './placeInEdition.ts';
import { quantityFile } from './quantityFile.ts';
import { redshiftGrid } from './redshiftGrid.ts';
import { siteSettings } from './siteSettings.ts';
import type { Checked, Content, Edition, Problem, ReadOptions, ReadResult } from './types.ts';
import type { YamlFile } from './yamlFile.ts';

/**
 * Checks the files of a content folder: either everything in them, or every problem, sorted by file and line. Knows no
 * file system; `nameOf` turns a path below the folder into the file's name in problems.
 */
export function checkContent(
  files: FileBytes,
  { columnIds, extraChecks }: ReadOptions = {},
  nameOf: (path: string) => string = (path) => path,
): ReadResult {
  const problems: Problem[] = [];
  const keep = <Value>(checked: Checked<Value>): Value | null => {
    problems.push(...checked.problems);
    return checked.value;
  };
  const bytesOf = (path: string) => files.get(path) ?? null;
  const read = <Value>(path: string, parse: (yaml: YamlFile) => Checked<Value>) => {
    const yaml = keep(openYaml(nameOf(path), bytesOf(path)));
    const value = yaml && keep(parse(yaml));
    return value === null ? [] : [{ value, yaml: yaml as YamlFile }];
  };

  const report = (path: string, wrong: string, expected: string) => ({
    file: nameOf(path),
    line: 1,
    column: 1,
    wrong,
    expected,
  });
  const found = {
    sets: filesOf(files, 'parameter-sets'),
    grids: filesOf(files, 'redshift-grids'),
    editions: editionFiles(files),
  };
  problems.push(...nameProblems(files, report, columnIds));
  const site = read('site.yaml', siteSettings);
  const sets = found.sets.flatMap(({ id, path }) => read(path, (yaml) => parameterSet(id, yaml)));
  const grids = found.grids.flatMap(({ id, path }) => read(path, (yaml) => redshiftGrid(id, yaml)));
  const editions = found.editions.flatMap(({ id, path }) => read(path, (yaml) => edition(id, yaml)));
  const certificates = new Map(
    found.editions.flatMap(({ id }) => {
      const bytes = bytesOf(certificatePath(id));
      const value = bytes && keep(certificate(nameOf(certificatePath(id)), bytes));
      return value === null ? [] : [[id, value] as const];
    }),
  );
  const withCertificate = (one: Edition): Edition => {
    const its = certificates.get(one.number);
    return its === undefined ? one : { ...one, certificate: its };
  };
  const pages = filesOf(files, 'quantities').map(({ id, path }) =>
    keep(quantityFile(id, nameOf(path), bytesOf(path), columnIds)),
  );
  const known = { sets: idsOf(found.sets), grids: idsOf(found.grids), editions: idsOf(found.editions) };
  problems.push(...editionProblems(editions, known));
  if (found.editions.length === 0)
    problems.push(report('editions', 'there is no edition', 'editions/<number>/edition.yaml'));

  const settings = site[0]?.value;
  if (problems.length > 0 || settings === undefined) return { problems: problems.sort(byPlace) };
  const content: Content = {
    site: settings,
    parameterSets: sets.map(({ value }) => value),
    redshiftGrids: grids.map(({ value }) => value),
    editions: editions.map(({ value }) => withCertificate(value)),
    quantities: pages.filter((page) => page !== null),
  };
  const extra = extraChecks?.(content, placeInEdition(editions)) ?? [];
  return extra.length > 0 ? { problems: [...extra].sort(byPlace) } : { content };
}

function idsOf(found: readonly { readonly id: string }[]): string[] {
  return found.map(({ id }) => id);
}

function byPlace(a: Problem, b: Problem): number {
  if (a.file !== b.file) return a.file < b.file ? -1 : 1;
  return a.line - b.line || a.column - b.column;
}
