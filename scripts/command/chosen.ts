import { QUANTITIES, type QuantityId } from '../../src/cosmology/quantities.ts';
import { expectedOneOf } from '../../src/inputs/suggest.ts';
import type { Content, Edition, ParameterSet } from '../../src/inputs/types.ts';
import { UsageError } from './options.ts';

/** Digits of a cell while no edition says otherwise. */
const USUAL_DIGITS = 10;

/** @throws UsageError if the content has no such parameter set */
export function chosenSet({ parameterSets }: Content, id: string): ParameterSet {
  const set = parameterSets.find((one) => one.id === id);
  if (set !== undefined) return set;
  const ids = parameterSets.map((one) => one.id);
  throw new UsageError(`There is no parameter set "${id}": ${expectedOneOf(id, ids)}`);
}

/** @throws UsageError if no table has such a column */
export function chosenColumn(id: string): QuantityId {
  const ids = Object.keys(QUANTITIES) as QuantityId[];
  const column = ids.find((one) => one === id);
  if (column !== undefined) return column;
  throw new UsageError(`There is no column "${id}": ${expectedOneOf(id, ids)}`);
}

/** Significant digits of the cells of a set: the most that any edition gives them. */
export function digitsFor({ editions }: Content, { id }: ParameterSet): number {
  const digits = editions.filter(({ parameterSets }) => parameterSets.includes(id)).map((edition) => edition.digits);
  return digits.length === 0 ? USUAL_DIGITS : Math.max(...digits);
}

/** One edition, or every draft. @throws UsageError if there is none */
export function chosenEditions({ editions }: Content, number: string | undefined): readonly Edition[] {
  const chosen = editions.filter((one) => (number === undefined ? one.state === 'draft' : one.number === number));
  if (chosen.length > 0) return chosen;
  if (number === undefined) throw new UsageError('No edition is a draft; name one with --edition.');
  const numbers = editions.map((one) => one.number);
  throw new UsageError(`There is no edition "${number}": ${expectedOneOf(number, numbers)}`);
}
