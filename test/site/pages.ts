import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { site } from './harness.ts';

/** A page of the built site. */
export interface Page {
  /** Relative to the site's start: `editions/2026.1/`, "" for the home page. */
  readonly path: string;
  readonly html: string;
}

/** All pages, as files of the built folder. */
export function allPages(): readonly Page[] {
  return distFiles('.html').map((file) => ({ path: file.replace(/index\.html$/, ''), html: distText(file) }));
}

/** The pages of tables. */
export function tablePages(): readonly Page[] {
  return allPages().filter(({ path }) => TEMPLATES.table.test(path));
}

/** The files of the built folder with this ending, relative to it, with slashes, in order of their names. */
export function distFiles(ending: string): readonly string[] {
  return readdirSync(site.dist, { recursive: true, encoding: 'utf8' })
    .map((path) => path.replaceAll('\\', '/'))
    .filter((path) => path.endsWith(ending))
    .sort();
}

export function distText(file: string): string {
  return readFileSync(join(site.dist, file), 'utf8');
}

/** The file a table page belongs to. */
export function csvOf(tablePage: string): string {
  return `${tablePage.replace(/\/$/, '')}.csv`;
}

/** The kinds of page, by path. Every page is of exactly one kind. */
export const TEMPLATES = {
  home: /^$/,
  editions: /^editions\/$/,
  edition: /^editions\/[^/]+\/$/,
  set: /^editions\/[^/]+\/sets\/[^/]+\/$/,
  table: /^editions\/[^/]+\/tables\/[^/]+\/$/,
  quantities: /^quantities\/$/,
  quantity: /^quantities\/[^/]+\/$/,
  methods: /^methods\/$/,
  checkedAgainst: /^checked-against\/$/,
  interpolation: /^interpolation\/$/,
  search: /^search\/$/,
  notFound: /^404\.html$/,
} as const;

/** One page of each kind, and of tables one of each topic on the shortest grid. */
export function samplePages(): readonly string[] {
  const paths = allPages().map(({ path }) => path);
  const kinds = Object.entries(TEMPLATES).filter(([kind]) => kind !== 'table');
  const firsts = kinds.flatMap(([, pattern]) => paths.filter((path) => pattern.test(path)).slice(0, 1));
  return [...firsts, ...shortestTables()];
}

function shortestTables(): readonly string[] {
  const byLength = [...tablePages()].sort((a, b) => a.html.length - b.html.length).map(({ path }) => path);
  const topics = [...new Set(byLength.map(topicOf))].sort();
  return topics.flatMap((topic) => byLength.filter((path) => topicOf(path) === topic).slice(0, 1));
}

/** `<set>.<topic>.<grid>` */
function topicOf(tablePage: string): string {
  return tablePage.split('/').at(-2)?.split('.').at(-2) ?? '';
}

/** What a reader sees of a piece of HTML, on one line, with plain minus signs and without thin spaces. */
export function plainText(html: string): string {
  return html
    .replace(/<(script|style|annotation)\b[\s\S]*?<\/\1>/g, '')
    .replace(/<[^>]*>/g, '')
    .replaceAll('&#39;', "'")
    .replaceAll('&amp;', '&')
    .replace(/[\u2009\u202f]/g, '')
    .replaceAll('\u2212', '-')
    .replace(/\s+/g, ' ')
    .trim();
}
