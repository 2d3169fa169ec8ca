import { execFileSync } from 'node:child_process';
import { readFileSync, statSync } from 'node:fs';
import { dirname, join, normalize } from 'node:path';
import ts from 'typescript';
import { describe, expect, test } from 'vitest';
import { projectRoot } from './support/runScript.ts';
import { importsOf, sourceFiles, visitFile } from './support/sources.ts';

/** Each folder of src/ may import from itself and from those before it. */
const LAYERS = ['numerics', 'cosmology', 'inputs', 'tables', 'editions', 'site', 'components', 'layouts', 'pages'];

/** What each folder of src/ may import from. Pages, layouts and components also bring in browser code and styles. */
const ALLOWED: ReadonlyMap<string, readonly string[]> = new Map([
  ...LAYERS.map((layer, index): [string, string[]] => {
    const left = LAYERS.slice(0, index + 1);
    return [layer, index > LAYERS.indexOf('site') ? [...left, 'client', 'styles'] : left];
  }),
  ['client', ['client', 'numerics', 'cosmology', 'tables', 'site']],
]);

const KERNEL = ['numerics', 'cosmology'];
const sources = sourceFiles('src');

describe('the import arrows', () => {
  test('every folder of src has its place', () => {
    const folders = new Set(sources.map(folderOf));
    expect([...folders].filter((folder) => !ALLOWED.has(folder))).toEqual([]);
  });

  test.each([...ALLOWED])('%s imports only from %j', (folder, allowed) => {
    const wrong = sources
      .filter((path) => folderOf(path) === folder)
      .flatMap((path) => relativeImports(path).map((target) => ({ path, target })))
      .filter(({ target }) => !target.startsWith('src/') || !allowed.includes(folderOf(target)))
      .map(({ path, target }) => `${path} imports ${target}`);
    expect(wrong).toEqual([]);
  });

  test('src does not import from scripts or test, and every relative import names an existing file', () => {
    const targets = sources.flatMap((path) => relativeImports(path));
    expect(targets.length).toBeGreaterThan(0);
    expect(targets.filter((target) => !statSync(join(projectRoot, target), { throwIfNoEntry: false }))).toEqual([]);
  });
});

describe('the kernel', () => {
  const kernel = sources.filter((path) => KERNEL.includes(folderOf(path)));

  test('imports nothing from Node.js, Astro or a package, but for the arithmetic of the audit', () => {
    const outside = kernel.flatMap((path) =>
      importsOf(path)
        .filter(({ from }) => !from.startsWith('.'))
        .map(({ from }) => `${path}: ${from}`),
    );
    const arithmetic = outside.filter((line) => /^src\/numerics\/extended\/\w+\.ts: gmp-wasm$/.test(line));
    expect(outside.filter((line) => !arithmetic.includes(line))).toEqual([]);
  });

  test('lets the audit share no code with the fast evaluation but decimals, constants and names', () => {
    const shared = ['src/numerics/decimal.ts', 'src/cosmology/constants.ts', 'src/cosmology/parameters.ts'];
    const names = ['src/cosmology/milestones.ts', 'src/cosmology/quantities.ts'];
    const audit = (path: string) =>
      path.startsWith('src/cosmology/audit/') || path.startsWith('src/numerics/extended/');
    const wrong = kernel
      .filter(audit)
      .flatMap((path) => relativeImports(path).map((target) => ({ path, target })))
      .filter(({ target }) => !audit(target) && ![...shared, ...names].includes(target))
      .map(({ path, target }) => `${path} imports ${target}`);
    expect(wrong).toEqual([]);
  });

  test('does not use ** or Math.pow, whose last bit depends on the version of Node.js', () => {
    const found: string[] = [];
    for (const path of kernel) {
      visitFile(path, (node) => {
        if (isPower(node)) found.push(`${path}: ${node.getText()}`);
      });
    }
    expect(kernel.length).toBeGreaterThan(0);
    expect(found).toEqual([]);
  });
});

test('nothing that the browser loads needs Node.js', () => {
  const client = sources.filter((path) => folderOf(path) === 'client');
  const loaded = reachable(client);
  const needing = [...loaded].filter((path) => importsOf(path).some((i) => !i.typeOnly && i.from.startsWith('node:')));
  expect(needing).toEqual([]);
});

describe('the files of the project', () => {
  const files = execFileSync('git', ['ls-files', '--cached', '--others', '--exclude-standard', '-z'], {
    cwd: projectRoot,
  })
    .toString()
    .split('\0')
    .filter((path) => path !== '' && statSync(join(projectRoot, path), { throwIfNoEntry: false })?.isFile());

  test.each([
    ['a package registry', /\bregistry\.[a-z]+\.[a-z]+|^ *"resolved": /m],
    ['a path of one machine', /(?<![\w.])\/(?:home|root|Users|work|builds)\/\w/],
  ])('do not name %s', (_, pattern) => {
    const naming = files.filter((path) => pattern.test(readFileSync(join(projectRoot, path), 'latin1')));
    expect(naming).toEqual([]);
  });
});

/** The folder of src/ a path stands in; '' for a file of src/ itself. */
function folderOf(path: string): string {
  const parts = path.split('/');
  return parts[0] === 'src' && parts.length > 2 ? (parts[1] ?? '') : '';
}

function relativeImports(path: string): readonly string[] {
  return importsOf(path)
    .filter(({ from }) => from.startsWith('.'))
    .map(({ from }) => target(path, from));
}

function target(path: string, from: string): string {
  return normalize(join(dirname(path), from.replace(/\?.*$/, ''))).replaceAll('\\', '/');
}

/** The files that run when `entries` do: type imports are gone by then. */
function reachable(entries: readonly string[]): ReadonlySet<string> {
  const seen = new Set<string>();
  const waiting = [...entries];
  for (let path = waiting.pop(); path !== undefined; path = waiting.pop()) {
    if (seen.has(path) || !/\.(ts|mjs|astro)$/.test(path)) continue;
    seen.add(path);
    for (const { from, typeOnly } of importsOf(path)) {
      if (!typeOnly && from.startsWith('.')) waiting.push(target(path, from));
    }
  }
  return seen;
}

function isPower(node: ts.Node): boolean {
  const { AsteriskAsteriskToken, AsteriskAsteriskEqualsToken } = ts.SyntaxKind;
  if (ts.isBinaryExpression(node)) {
    return [AsteriskAsteriskToken, AsteriskAsteriskEqualsToken].some((kind) => node.operatorToken.kind === kind);
  }
  return ts.isPropertyAccessExpression(node) && node.expression.getText() === 'Math' && node.name.text === 'pow';
}
