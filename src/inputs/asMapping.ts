/** A mapping of a keeper's file before it is checked: keys may be missing and values may be anything. */
export type Mapping<Key extends string> = { readonly [key in Key]?: unknown };

/** The value as a mapping; an empty one when it is something else. */
export function asMapping<Key extends string>(value: unknown): Mapping<Key> {
  return typeof value === 'object' && value !== null && !Array.isArray(value) ? (value as Mapping<Key>) : {};
}
