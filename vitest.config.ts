import './scripts/requireNode.mjs';
import { defineConfig } from 'vitest/config';

const SLOW = 'test/**/*.full.test.ts';

/** Four projects: three that `npm test` runs, and `full` for the slow, exhaustive checks of `npm run test:full`. */
export default defineConfig({
  test: {
    projects: [
      {
        test: {
          name: 'unit',
          include: ['test/**/*.test.ts'],
          exclude: ['test/site/**', 'test/commands/**', SLOW],
        },
      },
      {
        test: {
          name: 'site',
          include: ['test/site/**/*.test.ts'],
          exclude: [SLOW],
          globalSetup: ['test/site/globalSetup.ts'],
          testTimeout: 120_000,
        },
      },
      {
        test: {
          name: 'commands',
          include: ['test/commands/**/*.test.ts'],
          exclude: [SLOW],
          testTimeout: 120_000,
        },
      },
      { test: { name: 'full', include: [SLOW], testTimeout: 900_000 } },
    ],
  },
});
