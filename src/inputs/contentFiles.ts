/** Bytes of the files of a content folder by their path below it, with slashes; null for one that ought to be there. */
export type FileBytes = ReadonlyMap<string, Uint8Array | null>;

/** A file of one kind: its path below the content folder, and the id that its name gives. */
export interface ContentFile {
  readonly path: string;
  readonly id: string;
}

/** The folders whose files give ids, and the end of such a file's name. */
export const ENDINGS = { 'parameter-sets': '.yaml', 'redshift-grids': '.yaml', quantities: '.md' } as const;
export type IdFolder = keyof typeof ENDINGS;

/** The files of a folder that count, in the order of their ids. Whether the ids are well formed is another check. */
export function filesOf(files: FileBytes, folder: IdFolder): ContentFile[] {
  return namesIn(files, folder)
    .filter((name) => name.endsWith(ENDINGS[folder]) && !isReadme(name))
    .map((name) => ({ path: `${folder}/${name}`, id: name.slice(0, -ENDINGS[folder].length) }));
}

/** Names of all files of a folder. */
export function namesIn(files: FileBytes, folder: IdFolder): string[] {
  const start = `${folder}/`;
  return [...files.keys()]
    .filter((path) => path.startsWith(start))
    .map((path) => path.slice(start.length))
    .sort();
}

/** The editions of the folder, oldest number first. */
export function editionFiles(files: FileBytes): ContentFile[] {
  return [...files.keys()]
    .flatMap((path) => {
      const number = /^editions\/([^/]+)\/edition\.yaml$/.exec(path)?.[1];
      return number === undefined ? [] : [{ path, id: number }];
    })
    .sort((a, b) => a.id.localeCompare(b.id, 'en', { numeric: true }));
}

/** Where the certificate of an edition's audit stands, if it has been audited. */
export function certificatePath(number: string): string {
  return `editions/${number}/audit.json`;
}

export function isReadme(name: string): boolean {
  return name === 'README.md';
}
