import type { Edition, ParameterSet } from '../inputs/types.ts';
import { address } from './addresses.ts';
import type { ShownState } from './currentEdition.ts';
import { setTitle } from './setTitle.ts';

interface Part {
  readonly text: string;
  /** Missing for the page one is on. */
  readonly address?: string | undefined;
}

/** The line at the head of a page, as in a book: edition, parameter set, topic. */
export interface RunningHead {
  readonly edition: Part;
  readonly state: ShownState;
  readonly set: Part | undefined;
  readonly topic: Part | undefined;
}

/** The innermost part given is the page itself. */
export function runningHead(edition: Edition, state: ShownState, set?: ParameterSet, topic?: string): RunningHead {
  return {
    edition: { text: `Edition ${edition.number}`, address: set && address.edition(edition.number) },
    state,
    set: set && { text: setTitle(set), address: topic === undefined ? undefined : address.set(edition.number, set.id) },
    topic: topic === undefined ? undefined : { text: topic },
  };
}
