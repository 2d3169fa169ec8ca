import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { buildForTests } from '../support/buildForTests.ts';
import { temporaryFolder } from '../support/temporaryFolder.ts';

test('two builds of the same content in different places give the same files, byte for byte', () => {
  const [first, second] = [fingerprints(), fingerprints()];
  expect(first.length).toBeGreaterThan(100);
  expect(second).toEqual(first);
});

/** Name and SHA-256 of every file of a fresh build. */
function fingerprints(): readonly string[] {
  const { dist } = buildForTests(temporaryFolder(), '/reference/');
  return readdirSync(dist, { recursive: true, encoding: 'utf8' })
    .filter((name) => statSync(join(dist, name)).isFile())
    .sort()
    .map(
      (name) =>
        `${name} ${createHash('sha256')
          .update(readFileSync(join(dist, name)))
          .digest('hex')}`,
    );
}
