import { describe, expect, test } from 'vitest';
import { CONSTANTS } from '../../src/cosmology/constants.ts';
import { MILESTONE_NAMES } from '../../src/cosmology/milestones.ts';
import { renderFormula } from '../../src/site/formula.ts';
import { methodSections } from '../../src/site/methodSections.ts';
import { MILESTONE_TEXT } from '../../src/site/milestoneText.ts';
import { quantityLink } from '../../src/site/quantityLink.ts';
import { shippedSets } from '../support/shippedSet.ts';

describe('the milestones', () => {
  test.each(MILESTONE_NAMES)('%s has words, and formulas that can be printed', (name) => {
    const { symbol, formula, definition, quantity, name: title } = MILESTONE_TEXT[name];
    for (const latex of [symbol, formula]) {
      if (latex !== undefined) expect(renderFormula(latex, 'inline', 'milestoneText.ts')).toContain('<math');
    }
    expect(`${title} ${definition}`).toMatch(/^[A-Z][\x20-\x7e]*\.$/);
    expect(quantityLink(quantity)).toMatch(/\/quantities\//);
  });

  test('have names of their own', () => {
    expect(new Set(Object.values(MILESTONE_TEXT).map(({ name }) => name)).size).toBe(MILESTONE_NAMES.length);
  });
});

describe('the sections of the methods page', () => {
  const sections = methodSections(shippedSets());
  const ids = sections.map(({ id }) => id);

  test('have anchors of their own, which their links find', () => {
    expect(new Set(ids).size).toBe(ids.length);
    const targets = sections.flatMap(({ html }) => [...html.matchAll(/href="#([^"]*)"/g)].map(([, id]) => id));
    expect(targets.length).toBeGreaterThan(0);
    expect(targets.filter((target) => !ids.includes(target as string))).toEqual([]);
  });

  test('list the constants of the kernel, each with its source', () => {
    const lists = sections.filter(({ constants }) => constants);
    expect(lists.map(({ id }) => id)).toEqual(['constants']);
    expect(lists[0]?.constants?.map(({ source }) => source)).toEqual(CONSTANTS.map(({ source }) => source));
  });

  test('say what a blank cell means', () => {
    expect(sections.find(({ id }) => id === 'blanks')?.html).toContain('does not exist there');
  });
});
