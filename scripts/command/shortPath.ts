import { relative } from 'node:path';

/** A path as one would type it in the project folder: relative inside it, absolute elsewhere. */
export function shortPath(path: string): string {
  const near = relative(process.cwd(), path);
  return near.startsWith('..') || near === '' ? path : near;
}
