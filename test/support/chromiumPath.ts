import { findChromium } from '../../scripts/command/programs.ts';

/** @throws with one clear line on a machine without Chromium. */
export function chromiumPath(): string {
  const path = findChromium();
  if (path === undefined) {
    throw new Error(
      'The browser tests need Chromium: install it, or name one with CHROMIUM=/path (npm test does, on Debian).',
    );
  }
  return path;
}
