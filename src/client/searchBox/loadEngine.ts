import { getText } from '../getText.ts';
import type { Answer } from '../search/answer.ts';

/** What answers queries and writes the answers. */
export type Engine = typeof import('../search/engine.ts') & { ask: (query: string) => Answer };

let engine: Promise<Engine> | undefined;

/** Loads the index and the code that reads it, once for all boxes; a failure is not kept, so the next key tries again. */
export function loadEngine(indexAddress: string): Promise<Engine> {
  engine ??= Promise.all([import('../search/engine.ts'), getText(indexAddress)])
    .then(([module, text]) => ({ ...module, ask: module.openSearch(JSON.parse(text)) }))
    .catch((error: unknown) => {
      engine = undefined;
      throw error;
    });
  return engine;
}
