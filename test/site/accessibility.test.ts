import { AxeBuilder } from '@axe-core/playwright';
import { describe, expect, test } from 'vitest';
import { newContext, site } from './harness.ts';
import { samplePages } from './pages.ts';

const WIDTHS = { phone: 390, desk: 1280 } as const;

describe.each(['light', 'dark'] as const)('in %s colours', (colorScheme) => {
  describe.each(Object.entries(WIDTHS))('on a %s', (_, width) => {
    test.each(samplePages())('%j has no accessibility violation', async (path) => {
      const context = await newContext({ colorScheme, viewport: { width, height: 800 }, reducedMotion: 'reduce' });
      const page = await context.newPage();
      await page.goto(site.address + path);
      const { violations } = await new AxeBuilder({ page }).analyze();
      await context.close();
      const found = violations.map(
        ({ id, nodes }) =>
          `${id}: ${nodes
            .slice(0, 3)
            .map((node) => node.html)
            .join('\n')}`,
      );
      expect(found).toEqual([]);
    });
  });
});
