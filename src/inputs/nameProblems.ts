import {
  type ContentFile,
  ENDINGS,
  editionFiles,
  type FileBytes,
  filesOf,
  type IdFolder,
  isReadme,
  namesIn,
} from './contentFiles.ts';
import { EDITION_NUMBER, EDITION_NUMBER_WORDS } from './edition.ts';
import { expectedOneOf } from './suggest.ts';
import type { Problem } from './types.ts';

const ID = /^[a-z0-9]+(-[a-z0-9]+)*$/;
const ID_WORDS = 'lower-case letters, digits and single hyphens, such as planck-2018';

type Report = (path: string, wrong: string, expected: string) => Problem;

/**
 * What is wrong with the names of files and folders, as they become ids and part of addresses. `columnIds` are the
 * names that pages of quantities must have.
 */
export function nameProblems(files: FileBytes, report: Report, columnIds: readonly string[] | undefined): Problem[] {
  return [
    ...idProblems(files, 'parameter-sets', report),
    ...idProblems(files, 'redshift-grids', report),
    ...(columnIds === undefined ? [] : pageProblems(files, report, columnIds)),
    ...editionFiles(files)
      .filter(({ id }) => !EDITION_NUMBER.test(id))
      .map(({ id, path }) => report(path, `the folder ${id} is no edition number`, EDITION_NUMBER_WORDS)),
  ];
}

function idProblems(files: FileBytes, folder: IdFolder, report: Report): Problem[] {
  const counted = filesOf(files, folder);
  const others = namesIn(files, folder).filter((name) => !name.endsWith(ENDINGS[folder]) && !isReadme(name));
  return [
    ...others.map((name) => report(`${folder}/${name}`, `${name} is not read`, `names that end in ${ENDINGS[folder]}`)),
    ...counted.flatMap((file) => idProblem(file, counted, report)),
  ];
}

function idProblem({ id, path }: ContentFile, all: readonly ContentFile[], report: Report): Problem[] {
  const twin = all.find((other) => other.path < path && other.id.toLowerCase() === id.toLowerCase());
  if (twin !== undefined) return [report(path, `${id} and ${twin.id} differ only in case`, 'ids that differ')];
  return ID.test(id) ? [] : [report(path, `"${id}" is no id`, ID_WORDS)];
}

function pageProblems(files: FileBytes, report: Report, columnIds: readonly string[]): Problem[] {
  const pages = filesOf(files, 'quantities');
  const missing = columnIds.filter((column) => !pages.some(({ id }) => id === column));
  return [
    ...missing.map((column) =>
      report(`quantities/${column}.md`, `column ${column} has no page`, 'a page for each column'),
    ),
    ...pages
      .filter(({ id }) => !columnIds.includes(id))
      .map(({ id, path }) => report(path, `there is no column ${id}`, expectedOneOf(id, columnIds))),
  ];
}
