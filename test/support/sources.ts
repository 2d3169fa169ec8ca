import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import ts from 'typescript';
import { projectRoot } from './runScript.ts';

/** An import statement of a source file. */
export interface Import {
  /** As written: `./b.ts`, `node:fs`, `sirv`. */
  readonly from: string;
  /** Whether it vanishes when the types are stripped. */
  readonly typeOnly: boolean;
}

/** The program files below a folder of the project, relative to the project, with slashes. */
export function sourceFiles(folder: string): readonly string[] {
  return readdirSync(join(projectRoot, folder), { recursive: true, encoding: 'utf8' })
    .map((name) => join(folder, name).replaceAll('\\', '/'))
    .filter((path) => /\.(ts|mjs|astro)$/.test(path) && !path.endsWith('.d.ts'))
    .sort();
}

/** The imports of one file; of an .astro file those of its frontmatter and of its scripts. */
export function importsOf(path: string): readonly Import[] {
  return scriptsOf(path).flatMap((text) => {
    const found: Import[] = [];
    visit(parse(path, text), (node) => {
      const one = asImport(node);
      if (one) found.push(one);
    });
    return found;
  });
}

/** Calls `look` for every node of the file's syntax trees. */
export function visitFile(path: string, look: (node: ts.Node) => void): void {
  for (const text of scriptsOf(path)) visit(parse(path, text), look);
}

function asImport(node: ts.Node): Import | undefined {
  if (ts.isImportDeclaration(node)) {
    return { from: textOf(node.moduleSpecifier), typeOnly: isTypeOnly(node.importClause) };
  }
  if (ts.isExportDeclaration(node) && node.moduleSpecifier) {
    return { from: textOf(node.moduleSpecifier), typeOnly: node.isTypeOnly };
  }
  if (ts.isCallExpression(node) && node.expression.kind === ts.SyntaxKind.ImportKeyword && node.arguments[0]) {
    return { from: textOf(node.arguments[0]), typeOnly: false };
  }
  if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument)) {
    return { from: textOf(node.argument.literal), typeOnly: true };
  }
  return undefined;
}

/** `import type ...`, or braces in which every name is marked `type`. */
function isTypeOnly(clause: ts.ImportClause | undefined): boolean {
  if (!clause) return false;
  if (clause.phaseModifier === ts.SyntaxKind.TypeKeyword) return true;
  const names = clause.namedBindings;
  return !clause.name && names !== undefined && ts.isNamedImports(names) && names.elements.every((e) => e.isTypeOnly);
}

function textOf(node: ts.Node): string {
  return ts.isStringLiteralLike(node) ? node.text : '';
}

function scriptsOf(path: string): readonly string[] {
  const text = readFileSync(join(projectRoot, path), 'utf8');
  if (!path.endsWith('.astro')) return [text];
  const frontmatter = /^---\r?\n([\s\S]*?)\r?\n---/.exec(text)?.[1] ?? '';
  return [frontmatter, ...[...text.matchAll(/<script\b[^>]*>([\s\S]*?)<\/script>/g)].map((match) => match[1] ?? '')];
}

function parse(path: string, text: string): ts.SourceFile {
  return ts.createSourceFile(path, text, ts.ScriptTarget.Latest, true, ts.ScriptKind.TS);
}

function visit(node: ts.Node, look: (node: ts.Node) => void): void {
  look(node);
  ts.forEachChild(node, (child) => visit(child, look));
}
