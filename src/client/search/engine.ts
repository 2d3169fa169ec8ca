import type { SearchIndex } from '../../site/searchIndexTypes.ts';
import { type Answer, answer } from './answer.ts';
import { openLibrary } from './library.ts';

export { addValues, showAnswer } from './showAnswer.ts';

/** What a search box loads when somebody first turns to it: the index, and what reads it. */
export function openSearch(index: SearchIndex): (query: string) => Answer {
  const library = openLibrary(index);
  return (query) => answer(query, library);
}
