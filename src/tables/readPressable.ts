import { readContent } from '../inputs/readContent.ts';
import type { Content, PlaceInEdition, Problem, ReadResult } from '../inputs/types.ts';
import { checkModels } from './checkModels.ts';
import { columnsOf, TOPICS } from './columns.ts';

/**
 * Reads and checks a content folder with all that its tables need: a page for every column, and models that the
 * kernel can evaluate on the grids of their editions.
 */
export function readPressable(folder: string): ReadResult {
  const columnIds = ['z', ...TOPICS.flatMap((topic) => columnsOf(topic).map(({ id }) => id))];
  return readContent(folder, { columnIds, extraChecks: modelProblems });
}

/** A model is refused where the edition lists its set, or the grid that goes too far for it. */
function modelProblems(content: Content, placeOf: PlaceInEdition): readonly Problem[] {
  return checkModels(content).map(({ set, edition, grid, wrong, expected }) => ({
    ...(grid ? placeOf('grid', grid.id, edition.number) : placeOf('set', set.id, edition.number)),
    wrong,
    expected,
  }));
}
