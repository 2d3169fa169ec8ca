import { readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { certificatePath, type FileBytes } from './contentFiles.ts';

const FOLDERS = ['parameter-sets', 'redshift-grids', 'quantities'];

/**
 * The bytes of every file that a content folder may hold, by path below it with slashes; null for a missing site.yaml
 * or edition.yaml. Files with a dot or an
 * underscore in front are the keeper's own affair.
 */
export function readFiles(folder: string): FileBytes {
  const paths = [
    'site.yaml',
    ...FOLDERS.flatMap((name) => filesIn(join(folder, name)).map((file) => `${name}/${file}`)),
    ...foldersIn(join(folder, 'editions')).map((number) => `editions/${number}/edition.yaml`),
    ...foldersIn(join(folder, 'editions'))
      .map(certificatePath)
      .filter((path) => isFile(join(folder, path))),
  ];
  return new Map(paths.map((path) => [path, contents(join(folder, path))]));
}

function filesIn(folder: string): string[] {
  return visible(folder).filter((name) => isFile(join(folder, name)));
}

function foldersIn(folder: string): string[] {
  return visible(folder).filter((name) => isFolder(join(folder, name)));
}

function visible(folder: string): string[] {
  if (!isFolder(folder)) return [];
  // Sorted by character code, so that nothing depends on the file system or the language of the machine.
  return readdirSync(folder)
    .filter((name) => !/^[._]/.test(name))
    .sort();
}

function isFile(path: string): boolean {
  return statSync(path, { throwIfNoEntry: false })?.isFile() ?? false;
}

function isFolder(path: string): boolean {
  return statSync(path, { throwIfNoEntry: false })?.isDirectory() ?? false;
}

function contents(path: string): Uint8Array | null {
  return isFile(path) ? readFileSync(path) : null;
}
