import { checkContent } from '../../src/inputs/checkContent.ts';
import { formatProblems } from '../../src/inputs/formatProblems.ts';
import type { Content, ReadOptions, ReadResult } from '../../src/inputs/types.ts';

/** A small content folder without any problem; the columns are a and E only. */
export const GOOD: Readonly<Record<string, string>> = {
  'site.yaml': `title: Test tables
group: Lanternfell Survey
site: https://tables.lanternfell.example
base: /
licence: {name: CC BY 4.0, url: https://creativecommons.org/licenses/by/4.0/}
`,
  'parameter-sets/flat.yaml': `title: Flat example
kind: published
source:
  citation: Somebody (2025)
  doi: 10.1234/abc.5
  where: Table 1
parameters:
  H0: {value: 67.360, u: 0.54}
  Omega_m: {value: 0.3153, u: 0.0073}
  Omega_k: 0
  w0: -1
  wa: 0.0
  T_CMB: 2.7255
  N_eff: 3.046
  m_nu: [0, 0, 6e-2]
correlations: [[H0, Omega_m, -0.99]]
note: free text
`,
  'parameter-sets/plain.yaml': `title: Plain
kind: textbook
source: {citation: Convention}
parameters: {H0: 70, omega_b: 0.02, omega_c: 0.12, w0: -1, wa: 0, T_CMB: 0, N_eff: 0, m_nu: []}
`,
  'redshift-grids/short.yaml': `title: Short grid
segments:
  - {from: 0, to: 0.3, step: 0.1}
  - {from: 0.30, to: 1, step: 0.35}
values: [0.0500, 1089.80]
`,
  'editions/2025.2/edition.yaml': `title: Earlier
state: released
released: 2025-12-15
digits: 8
parameter_sets: [plain]
redshift_grids: [short]
topics: [distances]
errata: [{date: 2026-01-10, text: A misprint on the home page.}]
`,
  'editions/2025.10/edition.yaml': `title: First
state: draft
digits: 10
parameter_sets: [flat, plain]
redshift_grids: [short]
topics: [times, distances]
supersedes: 2025.2
errata: []
`,
  'quantities/a.md': page('Scale factor', '[E]'),
  'quantities/E.md': page('Expansion', '[]'),
};

const OPTIONS: ReadOptions = { columnIds: ['a', 'E'] };

function page(name: string, related: string): string {
  return `---
name: ${name}
symbol: 'a'
formula: 'a = 1/(1+z)'
definition: One sentence.
symbols: [{symbol: z, meaning: redshift, unit: ''}]
source: Hogg (1999), sect. 2
related: ${related}
alsoCalled: []
---
Text with $z$.

More text.
`;
}

/** The good folder with some files replaced; null removes a file. */
export function check(
  changes: Record<string, string | Uint8Array | null> = {},
  options: ReadOptions = OPTIONS,
): ReadResult {
  const entries = Object.entries({ ...GOOD, ...changes }).filter(
    ([path, text]) => text !== null || path === 'site.yaml',
  );
  return checkContent(
    new Map(entries.map(([path, text]) => [path, typeof text === 'string' ? encode(text) : text])),
    options,
  );
}

/** The report on the good folder with some files replaced; "no problems" when there are none. */
export function report(changes: Record<string, string | Uint8Array | null>): string {
  const result = check(changes);
  return 'problems' in result ? formatProblems(result.problems) : 'no problems';
}

/** The report after one replacement in one good file. Fails when the file does not hold the text to be replaced. */
export function reportWith(path: string, from: string, to: string): string {
  const text = GOOD[path] ?? '';
  if (!text.includes(from)) throw new Error(`${path} does not hold ${from}`);
  return report({ [path]: text.replace(from, () => to) });
}

/** The content after some replacements; fails when there are problems. */
export function contentOf(changes: Record<string, string> = {}): Content {
  const result = check(changes);
  if ('problems' in result) throw new Error(formatProblems(result.problems));
  return result.content;
}

export function encode(text: string): Uint8Array {
  return new TextEncoder().encode(text);
}
