import { isAlias, isMap, isScalar, isSeq, type Node, type Pair, type Scalar } from 'yaml';
import { WrittenNumber } from './writtenNumber.ts';
import { keyText, offsetOf } from './yamlPlaces.ts';

/** Something that YAML allows and a keeper's file does not use, by its offset in the text. */
export interface Refused {
  readonly offset: number;
  readonly wrong: string;
  readonly expected: string;
}

/**
 * Turns parsed YAML into text, `WrittenNumber`, booleans, null, lists and mappings, so that no number passes through
 * a double. References to other places of the file and keys that are no words are refused.
 */
export function plainValue(root: Node): { data: unknown; refused: Refused[] } {
  const refused: Refused[] = [];
  return { data: convert(root, refused), refused };
}

function convert(node: unknown, refused: Refused[]): unknown {
  if (isMap(node)) return convertMap(node.items, refused);
  if (isSeq(node)) return node.items.map((item) => convert(item, refused));
  if (isAlias(node)) {
    refused.push({
      offset: offsetOf(node) ?? 0,
      wrong: `"*${node.source}" refers to another place`,
      expected: 'the value itself',
    });
    return null;
  }
  return isScalar(node) ? convertScalar(node) : null;
}

function convertMap(pairs: readonly Pair[], refused: Refused[]): Record<string, unknown> {
  // No prototype, so that a key named "constructor" is a key like any other.
  const mapping: Record<string, unknown> = Object.create(null);
  for (const { key, value } of pairs) {
    const name = keyText(key);
    if (name === '')
      refused.push({ offset: offsetOf(key) ?? 0, wrong: 'a key is no word', expected: 'a key such as "title"' });
    mapping[name] = convert(value, refused);
  }
  return mapping;
}

function convertScalar({ value, source }: Scalar): unknown {
  if (typeof value === 'number' || typeof value === 'bigint') return new WrittenNumber(source ?? String(value));
  if (typeof value === 'string' || typeof value === 'boolean' || value === null) return value;
  return source ?? String(value);
}
