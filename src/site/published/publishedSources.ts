import { z } from 'zod';
import type { Parameters } from '../../cosmology/parameters.ts';
import { type PublishedFile, sourceSchema } from './sourceSchema.ts';
import { SOURCE_KINDS } from './words.ts';

/** A value from the literature and how it is compared with ours. */
export type PublishedCheck = PublishedFile['checks'][number] & { readonly inputs: Parameters };

/** One source with its checks. */
export interface PublishedSource extends PublishedFile {
  /** Name of its file, without ending. */
  readonly id: string;
  readonly checks: PublishedCheck[];
}

/** The files, as the bundler found them; the tests and the pages read the same ones. */
const FILES = import.meta.glob<unknown>('/test/reference/published/*.json', { eager: true, import: 'default' });

/** All sources, by kind and then by title. */
export function publishedSources(): PublishedSource[] {
  const sources = Object.entries(FILES).map(([path, content]) => readSource(path, content));
  const kind = ({ source }: PublishedSource) => SOURCE_KINDS.indexOf(source.kind);
  return sources.sort((a, b) => kind(a) - kind(b) || (a.source.title < b.source.title ? -1 : 1));
}

/**
 * The content of one file, checked; each check gets the parameters of its model.
 *
 * @throws Error naming the file and everything wrong in it
 */
export function readSource(path: string, content: unknown): PublishedSource {
  const result = sourceSchema.safeParse(content);
  if (!result.success) throw new Error(`${path.replace(/^\//, '')}\n${z.prettifyError(result.error)}`);
  const { source, models, checks } = result.data;
  const id = path.replace(/^.*\/|\.json$/g, '');
  return { id, source, models, checks: checks.map((check) => ({ ...check, inputs: inputsOf(models, check.model) })) };
}

function inputsOf(models: PublishedFile['models'], name: string): Parameters {
  const model = models[name];
  if (!model) throw new RangeError(`no model ${name}`);
  return model.parameters;
}
