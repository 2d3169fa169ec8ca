import type { ParameterSet, SetKind } from '../inputs/types.ts';

/** The kinds of parameter sets in order of printing, as headings. */
const KIND_TEXT: Readonly<Record<SetKind, string>> = {
  published: 'Published',
  house: 'House conventions',
  textbook: 'Textbook models',
};

/** Parameter sets of one kind, in the order given. */
export interface KindGroup<T> {
  readonly kind: string;
  readonly members: readonly T[];
}

/** Parts things by the kind of their parameter set; kinds without members are left out. */
export function byKind<T>(things: readonly T[], setOf: (thing: T) => ParameterSet): KindGroup<T>[] {
  return (Object.keys(KIND_TEXT) as SetKind[])
    .map((kind) => ({ kind: KIND_TEXT[kind], members: things.filter((thing) => setOf(thing).kind === kind) }))
    .filter(({ members }) => members.length > 0);
}
