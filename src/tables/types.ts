import type { MilestoneName } from '../cosmology/milestones.ts';
import type { QuantityId } from '../cosmology/quantities.ts';
import type { Edition, ParameterSet, RedshiftGrid, Topic } from '../inputs/types.ts';
import type { TableInterpolation } from './interpolationTypes.ts';
import type { TableUncertainty } from './uncertaintyTypes.ts';

/** One column of a topic. */
export interface Column {
  /** Column id, e.g. `D_L_Mpc`; also the CSV header. */
  readonly id: QuantityId;
  readonly topic: Topic;
  /** Unit for people, plain text, e.g. "km/s/Mpc"; "" if dimensionless. */
  readonly unit: string;
}

/** What an edition says of a table in every format. */
export interface Stamp {
  readonly edition: string;
  readonly state: Edition['state'];
  readonly method: string;
  readonly set: ParameterSet;
  /** Derived present densities, already text, in order of printing. */
  readonly derived: readonly { readonly name: string; readonly value: string }[];
  readonly constants: readonly {
    readonly symbol: string;
    readonly value: string;
    readonly unit: string;
    readonly source: string;
  }[];
  /** SHA-256 of the CSV bytes, hex. */
  readonly checksum: string;
  /** What the audit of exactly these bytes found; null when they have not been audited. */
  readonly audit: StampAudit | null;
}

/** The audit of one table; no cell differed, or there would be no certificate. */
export interface StampAudit {
  /** ISO date. */
  readonly date: string;
  readonly workingDigits: number;
  /** Cells compared, blank ones included, redshifts not. */
  readonly cells: number;
  /** Cells that had been settled by the audit when the table was made. */
  readonly settled: number;
  /** Largest relative error of a double value before rounding, as text. */
  readonly largestError: string;
}

/** One table: a parameter set x a topic x a redshift grid. */
export interface Table extends TableUncertainty, TableInterpolation {
  /** `<set>.<topic>.<grid>`, the file name without `.csv`. */
  readonly id: string;
  readonly set: ParameterSet;
  readonly topic: Topic;
  readonly grid: RedshiftGrid;
  readonly columns: readonly Column[];
  /** Redshifts as the grid writes them. */
  readonly redshifts: readonly string[];
  /** `values[row][column]` without the z column; null where the quantity does not exist. */
  readonly values: readonly (readonly (number | null)[])[];
  /**
   * Cells whose doubles lie too near a rounding boundary, by column: the audit's decimal text by row. Rounding, in
   * files and on pages, starts from this text where there is one.
   */
  readonly audited: readonly ReadonlyMap<number, string>[];
  /** The CSV, as published. */
  readonly csv: string;
  readonly stamp: Stamp;
  /** Rows of closed models that lie beyond the antipode, by index. */
  readonly beyondAntipode: readonly number[];
}

/** One line of `<set>.milestones.csv`. */
export interface Milestone {
  readonly name: MilestoneName;
  readonly unit: string;
  /** A number, words (the fate), or null where it does not exist. */
  readonly value: number | string | null;
  /** Standard uncertainty; null for words, for what does not exist, and for a set that gives none. */
  readonly u: number | null;
  /** Decimal text of the audit where the double does not decide the digits. */
  readonly audited?: string | undefined;
}

export interface MilestoneTable {
  /** `<set>.milestones` */
  readonly id: string;
  readonly set: ParameterSet;
  readonly milestones: readonly Milestone[];
  /** Milestones whose u is off by more than a tenth of it. */
  readonly nonlinear: readonly MilestoneName[];
  readonly csv: string;
  readonly checksum: string;
}

/** All tables of one edition. */
export interface EditionTables {
  readonly edition: Edition;
  readonly tables: readonly Table[];
  readonly milestones: readonly MilestoneTable[];
}
