import { roundHalfEven } from '../numerics/roundHalfEven.ts';
import { decimalText } from './csvCell.ts';

/** A bound to `digits` significant digits, rounded away from zero if it is not exact, so that it stays a bound. */
export function roundedUp(bound: number, digits: number): string {
  const rounded = roundHalfEven(bound, digits);
  const nearest = decimalText(rounded);
  if (Math.abs(Number(nearest)) >= Math.abs(bound)) return nearest;
  const next = String(BigInt(rounded.digits) + 1n);
  const carried = next.length - digits;
  return decimalText({ ...rounded, digits: next.slice(0, digits), exponent: rounded.exponent + carried });
}
