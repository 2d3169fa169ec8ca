import { Decimal } from '../numerics/decimal.ts';

const MANTISSAS = ['5', '2', '1'] as const;

/** The steps 1, 2 and 5 times a power of ten that divide `width`, from the largest down to `smallest`. */
export function* roundSteps(width: Decimal, smallest: Decimal): Generator<Decimal> {
  for (let power = Math.floor(Math.log10(width.toNumber())) + 1; ; power--) {
    for (const mantissa of MANTISSAS) {
      const step = Decimal.parse(`${mantissa}e${power}`);
      if (step.compare(smallest) < 0) return;
      if (divides(step, width)) yield step;
    }
  }
}

function divides(step: Decimal, width: Decimal): boolean {
  const exponent = Math.min(step.exponent, width.exponent);
  const whole = ({ digits, exponent: own }: Decimal) => digits * 10n ** BigInt(own - exponent);
  return width.compare(step) >= 0 && whole(width) % whole(step) === 0n;
}

/** How often `step` goes into `width`. */
export function stepCount(width: Decimal, step: Decimal): number {
  return Math.round(width.toNumber() / step.toNumber());
}

/**
 * Round redshifts between which one step may serve, ends included: 0, and 1, 2 and 5 times powers of ten, not below
 * `lowest`; for the future scale factors of that kind.
 */
export function roundBorders(from: Decimal, to: Decimal, lowest: Decimal): readonly Decimal[] {
  const one = Decimal.parse('1');
  const future = ladder(from.plus(one), one).map((scale) => scale.minus(one));
  const borders = [from, ...future.filter((z) => z.sign() < 0), Decimal.parse('0'), ...ladder(lowest, to)];
  const inside = borders.filter((z) => z.compare(from) > 0 && z.compare(to) < 0);
  return [from, ...inside, to];
}

/** 1, 2 and 5 times powers of ten from `lowest` to `highest`, in ascending order; none unless both are above zero. */
function ladder(lowest: Decimal, highest: Decimal): Decimal[] {
  if (lowest.sign() <= 0 || highest.sign() <= 0) return [];
  const powers = [lowest, highest].map((z) => Math.floor(Math.log10(z.toNumber())));
  const rungs: Decimal[] = [];
  for (let power = (powers[0] ?? 0) - 1; power <= (powers[1] ?? 0) + 1; power++) {
    rungs.push(...MANTISSAS.toReversed().map((mantissa) => Decimal.parse(`${mantissa}e${power}`)));
  }
  return rungs.filter((rung) => rung.compare(lowest) >= 0 && rung.compare(highest) <= 0);
}
