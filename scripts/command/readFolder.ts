import { readContent } from '../../src/inputs/readContent.ts';
import type { Content, Problem } from '../../src/inputs/types.ts';

/** The content has problems; the message lists them all. */
export class ContentError extends Error {
  override name = 'ContentError';
}

/** @throws ContentError listing every problem of every file. */
export async function readFolder(folder: string): Promise<Content> {
  const result = await readContent(folder);
  if ('problems' in result) throw new ContentError(problemsText(result.problems));
  return result.content;
}

function problemsText(problems: readonly Problem[]): string {
  const lines = problems.map(
    ({ file, line, column, wrong, expected }) => `${file}:${line}:${column}  ${wrong}  ${expected}`,
  );
  const count = problems.length === 1 ? '1 problem' : `${problems.length} problems`;
  return [...lines, '', `${count} in the content. Nothing was written.`].join('\n');
}
