import { typographic } from '../typographic.ts';
import { type CheckLine, checkLine } from './checkLine.ts';
import { inputsText } from './inputsText.ts';
import { type PublishedSource, publishedSources } from './publishedSources.ts';
import { GROUND_TEXT, KIND_TITLE, SOURCE_KINDS } from './words.ts';

/** One model of a source with the values that belong to it. */
export interface ModelView {
  readonly about: string;
  /** HTML. */
  readonly inputs: string;
  readonly lines: readonly CheckLine[];
}

export interface SourceView {
  readonly id: string;
  readonly title: string;
  readonly citation: string;
  readonly links: readonly { readonly text: string; readonly address: string }[];
  readonly models: readonly ModelView[];
}

/** The page of published values. */
export interface PublishedView {
  readonly counts: {
    readonly values: number;
    readonly sources: number;
    readonly differing: number;
    readonly unchecked: number;
  };
  /** The letters beside the tolerances. */
  readonly grounds: readonly { readonly letter: string; readonly text: string }[];
  /** Those that differ, by the title of their source. */
  readonly differing: readonly { readonly title: string; readonly lines: readonly CheckLine[] }[];
  readonly kinds: readonly { readonly title: string; readonly sources: readonly SourceView[] }[];
}

/** All published values beside ours. */
export function publishedView(): PublishedView {
  const sources = publishedSources().map((source) => ({ kind: source.source.kind, view: sourceView(source) }));
  const bySource = sources.map(({ view }) => ({
    title: view.title,
    lines: view.models.flatMap((model) => model.lines),
  }));
  const lines = bySource.flatMap((source) => source.lines);
  const differing = bySource
    .map((source) => ({ ...source, lines: source.lines.filter(({ agrees }) => !agrees) }))
    .filter((source) => source.lines.length > 0);
  return {
    counts: {
      values: lines.length,
      sources: sources.length,
      differing: lines.filter(({ agrees }) => !agrees).length,
      unchecked: lines.filter(({ unchecked }) => unchecked).length,
    },
    grounds: Object.values(GROUND_TEXT),
    differing,
    kinds: SOURCE_KINDS.map((kind) => ({
      title: KIND_TITLE[kind],
      sources: sources.filter((source) => source.kind === kind).map(({ view }) => view),
    })).filter((group) => group.sources.length > 0),
  };
}

function sourceView({ id, source, models, checks }: PublishedSource): SourceView {
  const { doi, arXiv, address } = source;
  return {
    id,
    title: typographic(source.title),
    citation: typographic(source.citation),
    links: [
      ...(doi ? [{ text: `doi:${doi}`, address: `https://doi.org/${doi}` }] : []),
      ...(arXiv ? [{ text: `arXiv:${arXiv}`, address: `https://arxiv.org/abs/${arXiv}` }] : []),
      ...(address ? [{ text: new URL(address).hostname, address }] : []),
    ],
    models: Object.entries(models).map(([name, { about, parameters }]) => ({
      about: typographic(about),
      inputs: inputsText(parameters),
      lines: checks.filter(({ model }) => model === name).map((check) => checkLine(id, check)),
    })),
  };
}
