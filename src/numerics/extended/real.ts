import type { Arithmetic } from './arithmetic.ts';

/** A place in the memory of the library, and the number that stands there now. */
export interface Slot {
  readonly address: number;
  owner: Real | null;
}

/** Another operand: an extended number, or a number that a double holds exactly. */
export type Operand = Real | number;

/** To nearest, ties to even, in the library's numbering. */
const NEAREST = 0;

/** Functions of the library with one and with two operands; the second is an address or a double. */
type Mapping =
  | 'mpfr_sqr'
  | 'mpfr_neg'
  | 'mpfr_abs'
  | 'mpfr_sqrt'
  | 'mpfr_cbrt'
  | 'mpfr_exp'
  | 'mpfr_log'
  | 'mpfr_log10'
  | 'mpfr_sin'
  | 'mpfr_cos'
  | 'mpfr_sinh'
  | 'mpfr_cosh';
type Combination = `mpfr_${'add' | 'sub' | 'mul' | 'div'}` | `mpfr_${'add' | 'sub' | 'mul' | 'div'}_d` | 'mpfr_pow_si';

/** An extended-precision number, never changed once made. Every operation is correctly rounded (MPFR). */
export class Real {
  private readonly arithmetic: Arithmetic;
  private readonly slot: Slot;

  constructor(arithmetic: Arithmetic, slot: Slot) {
    this.arithmetic = arithmetic;
    this.slot = slot;
    slot.owner = this;
  }

  /** Where the library finds the number. Errors: Error when the scope it was made in has ended. */
  get address(): number {
    if (this.slot.owner !== this) throw new Error('an extended number is used after its scope has ended');
    return this.slot.address;
  }

  plus(other: Operand): Real {
    return typeof other === 'number' ? this.with('mpfr_add_d', other) : this.with('mpfr_add', other.address);
  }

  minus(other: Operand): Real {
    return typeof other === 'number' ? this.with('mpfr_sub_d', other) : this.with('mpfr_sub', other.address);
  }

  times(other: Operand): Real {
    return typeof other === 'number' ? this.with('mpfr_mul_d', other) : this.with('mpfr_mul', other.address);
  }

  over(other: Operand): Real {
    return typeof other === 'number' ? this.with('mpfr_div_d', other) : this.with('mpfr_div', other.address);
  }

  /** To a whole power. */
  power(exponent: number): Real {
    return this.with('mpfr_pow_si', exponent);
  }

  reciprocal(): Real {
    const result = this.arithmetic.blank();
    this.arithmetic.library.mpfr_ui_div(result.address, 1, this.address, NEAREST);
    return result;
  }

  squared(): Real {
    return this.map('mpfr_sqr');
  }

  negated(): Real {
    return this.map('mpfr_neg');
  }

  magnitude(): Real {
    return this.map('mpfr_abs');
  }

  sqrt(): Real {
    return this.map('mpfr_sqrt');
  }

  cbrt(): Real {
    return this.map('mpfr_cbrt');
  }

  exp(): Real {
    return this.map('mpfr_exp');
  }

  ln(): Real {
    return this.map('mpfr_log');
  }

  log10(): Real {
    return this.map('mpfr_log10');
  }

  sin(): Real {
    return this.map('mpfr_sin');
  }

  cos(): Real {
    return this.map('mpfr_cos');
  }

  sinh(): Real {
    return this.map('mpfr_sinh');
  }

  cosh(): Real {
    return this.map('mpfr_cosh');
  }

  sign(): -1 | 0 | 1 {
    return Math.sign(this.arithmetic.library.mpfr_sgn(this.address)) as -1 | 0 | 1;
  }

  /** Whether this is smaller than the other. */
  below(other: Operand): boolean {
    const { library } = this.arithmetic;
    return (
      (typeof other === 'number'
        ? library.mpfr_cmp_d(this.address, other)
        : library.mpfr_cmp(this.address, other.address)) < 0
    );
  }

  /** The nearest double. */
  toNumber(): number {
    return this.arithmetic.library.mpfr_get_d(this.address, NEAREST);
  }

  /** All its digits as a plain decimal. Errors: RangeError for what is no finite number. */
  toText(): string {
    const text = this.arithmetic.library.mpfr_to_string(this.address, 10, NEAREST);
    if (!/^-?[\d.]+$/.test(text)) throw new RangeError(`an extended computation has ended with ${text}`);
    return text;
  }

  copy(): Real {
    return this.movedTo(this.arithmetic.blank());
  }

  /** The same value at the place of `target`, which is then this number's. */
  movedTo(target: Real): Real {
    this.arithmetic.library.mpfr_set(target.address, this.address, NEAREST);
    return target;
  }

  private map(operation: Mapping): Real {
    const result = this.arithmetic.blank();
    this.arithmetic.library[operation](result.address, this.address, NEAREST);
    return result;
  }

  private with(operation: Combination, operand: number): Real {
    const result = this.arithmetic.blank();
    this.arithmetic.library[operation](result.address, this.address, operand, NEAREST);
    return result;
  }
}
