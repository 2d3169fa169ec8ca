import { expect, test } from 'vitest';
import { buildForTests } from '../support/buildForTests.ts';
import { temporaryFolder } from '../support/temporaryFolder.ts';
import { treeHashes } from '../support/treeHashes.ts';

test('two builds of the same content in different places give the same files, byte for byte', () => {
  const [first, second] = [build(), build()];
  expect(first.length).toBeGreaterThan(100);
  expect(second).toEqual(first);
});

function build(): readonly string[] {
  return treeHashes(buildForTests(temporaryFolder(), '/reference/').dist);
}
