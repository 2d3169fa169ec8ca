import { formatProblems } from '../../src/inputs/formatProblems.ts';
import type { Content } from '../../src/inputs/types.ts';
import { readPressable } from '../../src/tables/readPressable.ts';
import { shortPath } from './shortPath.ts';

/** The content has problems; the message lists them all. */
export class ContentError extends Error {
  override name = 'ContentError';
}

/** @throws ContentError listing every problem of every file. */
export function readFolder(folder: string): Content {
  const result = readPressable(shortPath(folder));
  if ('problems' in result) throw new ContentError(`${formatProblems(result.problems)}. Nothing was written.`);
  return result.content;
}
