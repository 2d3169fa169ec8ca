import { isMap, isScalar, isSeq, type Node, type Pair } from 'yaml';

/** Keys and list positions that lead from the top of a file to a value. */
export type Path = readonly (string | number)[];

/**
 * Offset in the text of the value at a path, or of its key; when the path leads further than the file, the offset of
 * the last part that is there. A key without a value stands for it, as there is nothing else to point at.
 */
export function offsetInYaml(root: Node, path: Path, want: 'key' | 'value'): number {
  let node: unknown = root;
  let found = offsetOf(root) ?? 0;
  for (const [depth, step] of path.entries()) {
    const pair = isMap(node) ? node.items.find(({ key }) => keyText(key) === String(step)) : undefined;
    const next = isSeq(node) && typeof step === 'number' ? node.items[step] : pair?.value;
    const isLast = depth === path.length - 1;
    const shown = pair !== undefined && ((isLast && want === 'key') || isBlank(next)) ? pair.key : next;
    found = offsetOf(shown) ?? found;
    node = next;
  }
  return found;
}

/** The text of a key; empty for a key that is no word. */
export function keyText(key: Pair['key']): string {
  return isScalar(key) && key.value !== null ? (key.source ?? String(key.value)) : '';
}

/** Where a node starts in the text. */
export function offsetOf(node: unknown): number | undefined {
  return (node as Node | null | undefined)?.range?.[0];
}

function isBlank(node: unknown): boolean {
  return node === null || (isScalar(node) && node.value === null && (node.source ?? '') === '');
}
