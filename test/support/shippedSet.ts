import type { ParameterSet } from '../../src/inputs/types.ts';
import { readPressable } from '../../src/tables/readPressable.ts';

/** Every parameter set of the project's own content. */
export function shippedSets(): readonly ParameterSet[] {
  const result = readPressable('content');
  if ('problems' in result) throw new Error('the shipped content has problems');
  return result.content.parameterSets;
}

/** One of them. */
export function shippedSet(id: string): ParameterSet {
  const found = shippedSets().find((set) => set.id === id);
  if (found === undefined) throw new Error(`no parameter set ${id}`);
  return found;
}
