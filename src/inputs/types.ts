import type { Parameters, ScalarParameter } from '../cosmology/parameters.ts';
import type { Certificate } from './certificate.ts';

/** Where a value stands in a keeper's file. Lines and columns count from 1. */
export interface Place {
  readonly file: string;
  readonly line: number;
  readonly column: number;
}

/** One thing wrong in a keeper's file. */
export interface Problem extends Place {
  /** What is wrong, with the value received. */
  readonly wrong: string;
  /** What was expected, and what was probably meant. */
  readonly expected: string;
}

export type SetKind = 'published' | 'house' | 'textbook';

export interface Source {
  readonly citation: string;
  readonly doi?: string | undefined;
  readonly where?: string | undefined;
}

/** A checked parameter set: `content/parameter-sets/<id>.yaml`. */
export interface ParameterSet {
  readonly id: string;
  readonly title: string;
  readonly kind: SetKind;
  readonly source: Source;
  readonly parameters: Parameters;
  /** Standard uncertainties as written, for those scalar parameters that have one. */
  readonly uncertainties: Readonly<Partial<Record<ScalarParameter, string>>>;
  /** Correlation coefficients between two parameters, as written. */
  readonly correlations: readonly (readonly [ScalarParameter, ScalarParameter, string])[];
  readonly note?: string | undefined;
}

/** A checked redshift grid: `content/redshift-grids/<id>.yaml`. */
export interface RedshiftGrid {
  readonly id: string;
  readonly title: string;
  readonly note?: string | undefined;
  /** Redshifts in ascending order, as decimals; a value keeps the digits of its step or of its own writing. */
  readonly redshifts: readonly string[];
}

export type Topic = 'distances' | 'times' | 'densities' | 'horizons';
export type EditionState = 'draft' | 'released' | 'withdrawn';

/** A checked edition: `content/editions/<number>/edition.yaml`. */
export interface Edition {
  /** As written: 2026.10 is not 2026.1. */
  readonly number: string;
  readonly title: string;
  readonly state: EditionState;
  /** ISO date; present when released. */
  readonly released?: string | undefined;
  /** Significant digits of a CSV cell. */
  readonly digits: number;
  readonly parameterSets: readonly string[];
  readonly redshiftGrids: readonly string[];
  readonly topics: readonly Topic[];
  readonly supersedes?: string | undefined;
  readonly errata: readonly { readonly date: string; readonly text: string }[];
  /** What the last audit of its tables found; undefined before the first one. */
  readonly certificate?: Certificate | undefined;
}

/** What the keeper says about the whole site: `content/site.yaml`. */
export interface SiteSettings {
  /** Name of the collection, e.g. "Lanternfell reference tables". */
  readonly title: string;
  /** The group that publishes it. */
  readonly group: string;
  /** Origin, e.g. https://tables.lanternfell.example */
  readonly site: string;
  /** Path below the origin, with a slash at both ends. */
  readonly base: string;
  /** Licence of the tables. */
  readonly licence: { readonly name: string; readonly url: string };
  /** How to reach the keeper, shown in the footer. */
  readonly contact?: string | undefined;
}

/** The prose and formula of one column: `content/quantities/<column id>.md`. */
export interface QuantityPage {
  /** The column id, e.g. `D_L_Mpc`. */
  readonly id: string;
  /** e.g. "Luminosity distance". */
  readonly name: string;
  /** LaTeX, e.g. `D_L`. */
  readonly symbol: string;
  /** LaTeX of the defining formula. */
  readonly formula: string;
  /** One sentence. */
  readonly definition: string;
  /** Symbols used in the formula: LaTeX, meaning, unit ("" if none). */
  readonly symbols: readonly { readonly symbol: string; readonly meaning: string; readonly unit: string }[];
  /** Where the formula stands: paper and equation. */
  readonly source: string;
  /** Column ids of related quantities. */
  readonly related: readonly string[];
  /** Further names people search by, e.g. "photometric distance". */
  readonly alsoCalled: readonly string[];
  /** Markdown with $inline$ and $$display$$ formulas: limits of validity, cautions, relation to the others. */
  readonly body: string;
}

/** Everything that stands in the content folder, read and checked. */
export interface Content {
  readonly site: SiteSettings;
  readonly parameterSets: readonly ParameterSet[];
  readonly redshiftGrids: readonly RedshiftGrid[];
  readonly editions: readonly Edition[];
  readonly quantities: readonly QuantityPage[];
}

/** Either everything, or every problem of all files. */
export type ReadResult = { readonly content: Content } | { readonly problems: readonly Problem[] };

/** A value read from a keeper's file, or null and at least one problem. A usable value may have problems as well. */
export interface Checked<Value> {
  readonly value: Value | null;
  readonly problems: readonly Problem[];
}

/** Where an edition's file lists a parameter set or a redshift grid; without a number, the first edition that does. */
export type PlaceInEdition = (kind: 'set' | 'grid', id: string, number?: string) => Place;

export interface ReadOptions {
  /** The ids of all columns: each must have its page in `quantities/`, and no other page may be there. */
  readonly columnIds?: readonly string[] | undefined;
  /** Checks that need the physics, made when the folder has no other problem. */
  readonly extraChecks?: ((content: Content, placeOf: PlaceInEdition) => readonly Problem[]) | undefined;
}
