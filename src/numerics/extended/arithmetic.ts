import type { GMPFunctions } from 'gmp-wasm';
import { mpfr } from './library.ts';
import { Real, type Slot } from './real.ts';

/**
 * Digits carried beyond the working digits. They take up the rounding errors of a few hundred operations and the
 * digits lost by a difference, such as that of 1 + z and E for z = 1e-8.
 */
const GUARD_DIGITS = 12;
const BITS_PER_DIGIT = Math.log2(10);

/**
 * Arithmetic with a fixed number of decimal digits. It owns the memory of its numbers, which stand on a stack: what is
 * made inside `scope` or `forget` is given back when that ends, and using it later is an error.
 */
export class Arithmetic {
  /** Working digits; numbers carry twelve more. */
  readonly digits: number;
  readonly bits: number;
  /** Read by `Real`. */
  readonly library: GMPFunctions;
  private readonly slots: Slot[] = [];
  private used = 0;
  private readonly remembered = new Map<string, readonly Real[]>();

  constructor(digits: number) {
    this.digits = digits;
    this.bits = Math.ceil((digits + GUARD_DIGITS) * BITS_PER_DIGIT);
    this.library = mpfr();
  }

  /** A decimal as written, or a number that a double holds exactly. */
  real(value: string | number): Real {
    const result = this.blank();
    if (typeof value === 'number') this.library.mpfr_set_d(result.address, value, 0);
    else if (this.library.mpfr_set_string(result.address, value, 10, 0) !== 0)
      throw new RangeError(`"${value}" is no decimal number`);
    return result;
  }

  /** 10^power. */
  powerOfTen(power: number): Real {
    const [result] = this.remember(`10^${power}`, () => [this.real(`1e${power}`)]);
    return result as Real;
  }

  pi(): Real {
    const result = this.blank();
    this.library.mpfr_const_pi(result.address, 0);
    return result;
  }

  /** A number whose value is still to be set; for `Real`. */
  blank(): Real {
    this.slots[this.used] ??= this.newSlot();
    const slot = this.slots[this.used++] as Slot;
    return new Real(this, slot);
  }

  /** Does some work and keeps only the numbers that it returns. */
  scope<T extends readonly Real[]>(work: () => readonly [...T]): T {
    const mark = this.used;
    try {
      const results = work();
      const top = this.used;
      // Copied above everything first: a result may stand where another one is to go.
      const copies = results.map((result) => result.copy());
      if (top === mark) return copies as readonly Real[] as T;
      this.used = mark;
      return copies.map((copy) => copy.movedTo(this.blank())) as readonly Real[] as T;
    } catch (error) {
      this.used = mark;
      throw error;
    }
  }

  /** Does some work whose result holds no extended numbers, and gives back all memory. */
  forget<T>(work: () => T): T {
    const mark = this.used;
    try {
      return work();
    } finally {
      this.used = mark;
    }
  }

  /** Numbers that are computed when first asked for by this name, and stay. */
  remember(name: string, work: () => readonly Real[]): readonly Real[] {
    const known = this.remembered.get(name);
    if (known) return known;
    const lasting = this.forget(() => work().map((result) => result.movedTo(new Real(this, this.newSlot()))));
    this.remembered.set(name, lasting);
    return lasting;
  }

  private newSlot(): Slot {
    const address = this.library.mpfr_t();
    this.library.mpfr_init2(address, this.bits);
    return { address, owner: null };
  }
}
