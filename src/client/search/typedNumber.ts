/** A number of a query. */
export interface TypedNumber {
  /** As typed, in plain ASCII. */
  readonly text: string;
  readonly value: number;
  /** The unit typed behind it, as a key (see `keyOf`); absent if none. */
  readonly unit?: string;
}

const PARTS = /^-?(\d*)(?:\.(\d+))?(?:e([+-]?\d+))?$/;

/**
 * Whether a value, rounded to the digits of the typed number, is that number: 13.787 is "13.8". With a single significant
 * digit typed the two must be equal, because nearly everything rounds to "1".
 */
export function roundsTo(value: number, typed: TypedNumber): boolean {
  if (significantDigits(typed) < 2) return value === typed.value;
  const [, , decimals = '', exponent = '0'] = PARTS.exec(typed.text) ?? [];
  const half = 0.5 * Number(`1e${Number(exponent) - decimals.length}`);
  // The last factor forgives the rounding of 13.75 - 13.8 in binary.
  return Math.abs(value - typed.value) <= half * (1 + 1e-9);
}

export function significantDigits(typed: TypedNumber): number {
  const [, whole = '', decimals = ''] = PARTS.exec(typed.text) ?? [];
  return (whole + decimals).replace(/^0+/, '').length;
}
