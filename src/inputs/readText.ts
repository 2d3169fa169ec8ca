import type { Checked, Problem } from './types.ts';

const BYTE_ORDER_MARK = '\uFEFF';

/**
 * The text of a file, without a byte order mark, and what is wrong with its bytes. It is null when it is not UTF-8,
 * so that no later message speaks of characters that the file does not hold.
 */
export function readText(file: string, bytes: Uint8Array): Checked<string> {
  const text = new TextDecoder('utf-8', { ignoreBOM: true }).decode(bytes);
  const wrongByte = firstDifference(bytes, new TextEncoder().encode(text));
  if (wrongByte !== -1) return { value: null, problems: [notUtf8(file, bytes, wrongByte)] };
  if (!text.startsWith(BYTE_ORDER_MARK)) return { value: text, problems: [] };
  const problem: Problem = {
    file,
    line: 1,
    column: 1,
    wrong: 'the file starts with a byte order mark',
    expected: 'plain UTF-8: save it "without BOM"',
  };
  return { value: text.slice(1), problems: [problem] };
}

/** Decoding replaces what is not UTF-8, so encoding again differs first at the first wrong byte. */
function firstDifference(bytes: Uint8Array, again: Uint8Array): number {
  const index = bytes.findIndex((byte, i) => byte !== again[i]);
  return index === -1 && again.length > bytes.length ? bytes.length - 1 : index;
}

function notUtf8(file: string, bytes: Uint8Array, at: number): Problem {
  const before = new TextDecoder().decode(bytes.subarray(0, at)).split('\n');
  return {
    file,
    line: before.length,
    column: (before.at(-1) ?? '').length + 1,
    wrong: `byte 0x${(bytes[at] ?? 0).toString(16).padStart(2, '0')} is not UTF-8`,
    expected: 'a text file in UTF-8',
  };
}
