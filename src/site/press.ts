import type { Content } from '../inputs/types.ts';
import type { EditionTables } from '../tables/types.ts';

/** Everything a page can show: what the keeper wrote, and the tables computed from it. */
export interface Press {
  readonly content: Content;
  /** In the order of `content.editions`. */
  readonly editions: readonly EditionTables[];
}

/** Under this key a command that has already computed the tables leaves them for the pages of the same process. */
export const PRESS_KEY = Symbol.for('redbound.press');

let pressed: Promise<Press> | undefined;

/** The content and its tables: as a command has left them, otherwise read and computed once. */
export function press(): Promise<Press> {
  const left = (globalThis as { [PRESS_KEY]?: Press })[PRESS_KEY];
  if (left) return Promise.resolve(left);
  pressed ??= runPress(process.env.REDBOUND_CONTENT ?? 'content');
  return pressed;
}

async function runPress(folder: string): Promise<Press> {
  // Loaded on demand: a build that finds the tables ready needs neither the reader nor the kernel.
  const { readPressable } = await import('../tables/readPressable.ts');
  const { formatProblems } = await import('../inputs/formatProblems.ts');
  const { pressEdition } = await import('../tables/pressEdition.ts');
  const result = readPressable(folder);
  if ('problems' in result) throw new Error(formatProblems(result.problems));
  const { content } = result;
  return { content, editions: await Promise.all(content.editions.map((edition) => pressEdition(content, edition))) };
}
