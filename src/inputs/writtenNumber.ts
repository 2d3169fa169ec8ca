import { Decimal } from '../numerics/decimal.ts';

/** A number in a keeper's file, as its characters stand there: 2026.10 is not 2026.1, and 0.30 keeps its zero. */
export class WrittenNumber {
  readonly source: string;

  constructor(source: string) {
    this.source = source;
  }

  /** The exact value; null for what YAML counts as a number but is no finite decimal (.inf, .nan, 0x10). */
  decimal(): Decimal | null {
    try {
      return Decimal.parse(this.source);
    } catch {
      return null;
    }
  }
}
