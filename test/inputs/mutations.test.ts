import fc from 'fast-check';
import { expect, test, vi } from 'vitest';
import { parseDocument, stringify } from 'yaml';
import type { Problem } from '../../src/inputs/types.ts';
import { check, encode, GOOD } from './goodContent.ts';

// However a good file is spoilt, it reads or gives problems with places in it; nothing throws.
// Each run reads the whole folder, so on a busy machine these tests take seconds.
vi.setConfig({ testTimeout: 60_000 });

const paths = Object.keys(GOOD);
const yamlPaths = paths.filter((path) => path.endsWith('.yaml'));

function expectSoundReport(path: string, bytes: Uint8Array): void {
  const result = check({ [path]: bytes });
  if ('content' in result) return;
  expect(result.problems.length).toBeGreaterThan(0);
  for (const problem of result.problems) expectPlace(problem, path, new TextDecoder().decode(bytes));
}

function expectPlace({ file, line, column, wrong, expected }: Problem, path: string, text: string): void {
  const source = file === path ? text : (GOOD[file] ?? '');
  const lines = source.split('\n');
  expect(paths).toContain(file);
  expect(line).toBeGreaterThanOrEqual(1);
  expect(line).toBeLessThanOrEqual(lines.length);
  expect(column).toBeGreaterThanOrEqual(1);
  expect(column).toBeLessThanOrEqual((lines[line - 1] ?? '').length + 1);
  for (const words of [wrong, expected]) {
    expect(words).not.toBe('');
    expect(words).not.toMatch(/undefined|NaN|\[object|\n/);
  }
}

test('a line left out', () => {
  for (const path of paths) {
    const lines = (GOOD[path] ?? '').split('\n');
    for (const index of lines.keys()) expectSoundReport(path, encode(lines.toSpliced(index, 1).join('\n')));
  }
});

test('the end cut off', () => {
  for (const path of paths) {
    const bytes = encode(GOOD[path] ?? '');
    for (let length = 0; length < bytes.length; length += 7) expectSoundReport(path, bytes.subarray(0, length));
  }
});

test('bytes changed, put in or left out', () => {
  const mutation = fc.record({
    path: fc.constantFrom(...paths),
    where: fc.double({ min: 0, max: 1, maxExcluded: true, noNaN: true }),
    replaced: fc.integer({ min: 0, max: 3 }),
    by: fc.oneof(
      fc.uint8Array({ maxLength: 3 }),
      fc.constantFrom(...'\t \n:,-[]{}"\'#&*!|>%@?~.0e'.split('').map(encode)),
    ),
  });
  fc.assert(
    fc.property(mutation, ({ path, where, replaced, by }) => {
      const bytes = encode(GOOD[path] ?? '');
      const at = Math.floor(where * bytes.length);
      expectSoundReport(path, Uint8Array.of(...bytes.subarray(0, at), ...by, ...bytes.subarray(at + replaced)));
    }),
    { numRuns: 200 },
  );
});

test('a value of another type, or a key of another name', () => {
  const anything = fc.anything({
    withNullPrototype: false,
    withBigInt: false,
    maxDepth: 2,
    values: [fc.string(), fc.double(), fc.boolean(), fc.constant(null)],
  });
  const mutation = fc.record({
    path: fc.constantFrom(...yamlPaths),
    steps: fc.infiniteStream(fc.nat()),
    value: anything,
    key: fc.string(),
  });
  fc.assert(
    fc.property(mutation, ({ path, steps, value, key }) => {
      const data = parseDocument(GOOD[path] ?? '').toJS();
      spoil(data, steps, value, key);
      expectSoundReport(path, encode(stringify(data)));
    }),
    { numRuns: 200 },
  );
});

/** Walks some way down, then puts the value in place of what is there, or under another key. */
function spoil(data: Record<string, unknown>, steps: Iterator<number>, value: unknown, key: string): void {
  let at = data;
  for (;;) {
    const keys = Object.keys(at);
    const chosen = keys[steps.next().value % Math.max(keys.length, 1)];
    const below = chosen === undefined ? undefined : at[chosen];
    const goesOn = steps.next().value % 2 === 0;
    if (goesOn && typeof below === 'object' && below !== null) at = below as Record<string, unknown>;
    else {
      at[Array.isArray(at) || goesOn ? (chosen ?? '0') : key] = value;
      return;
    }
  }
}
