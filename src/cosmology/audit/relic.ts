import type { Arithmetic } from '../../numerics/extended/arithmetic.ts';
import type { Real } from '../../numerics/extended/real.ts';

/**
 * Steps per unit of t. The integrand branches at x = iy; the smaller y, the nearer to the real axis this lies in t, and
 * the weaker is the branch (y^4). For the worst y the error is exp(-4 pi sqrt(steps)), and three times less than the
 * working digits with 0.04 digits^2 steps; for larger y steps in proportion to the digits do. Measured with 34 to 76
 * digits in test/cosmology/audit.
 */
function stepsPerUnit({ digits }: Arithmetic, y: Real): number {
  if (!y.below(1)) return Math.ceil(0.5 * digits);
  return Math.ceil(y.below(0.03) ? 0.04 * digits * digits : 0.8 * digits);
}

/** Nodes x of the rule squared, and weights with the factor x^2/(e^x + 1)/F(0). */
interface ThermalRule {
  readonly squares: readonly Real[];
  readonly weights: readonly Real[];
}

/**
 * The rule for integrals over the Fermi-Dirac distribution: trapezoidal in t, where x = exp(t - exp(-t)).
 *
 * Source: Takahasi & Mori (1974), Publ. RIMS 9, 721. F(0) is the integral of x^3/(e^x + 1), 7 pi^4/120.
 */
function thermalRule(arithmetic: Arithmetic, y: Real): ThermalRule {
  const perUnit = stepsPerUnit(arithmetic, y);
  const all = arithmetic.remember(`Fermi-Dirac ${perUnit}`, () => {
    const norm = arithmetic.pi().power(4).times(7).over(120);
    const squares: Real[] = [];
    const weights: Real[] = [];
    for (let k = firstNode(arithmetic, perUnit); ; k++) {
      const decay = arithmetic.real(-k).over(perUnit).exp();
      const x = arithmetic.real(k).over(perUnit).minus(decay).exp();
      const square = x.squared();
      const occupation = square.over(x.exp().plus(1)).over(norm);
      const weight = occupation.times(x).times(decay.plus(1)).over(perUnit);
      if (k > 0 && weight.times(square).below(arithmetic.powerOfTen(-arithmetic.digits - 2))) break;
      squares.push(square);
      weights.push(weight);
    }
    return [...squares, ...weights];
  });
  const count = all.length / 2;
  return { squares: all.slice(0, count), weights: all.slice(count) };
}

/** The node below which x^3, to which a weight is proportional, is negligible. */
function firstNode({ digits }: Arithmetic, perUnit: number): number {
  const smallest = (-(digits + 2) * Math.LN10) / 3;
  let k = 0;
  while (k / perUnit - Math.exp(-k / perUnit) > smallest) k--;
  return k;
}

/**
 * Energy density of a relic neutrino over that of a massless one, F(y)/F(0), where F is the integral from 0 to infinity
 * of x^2 sqrt(x^2 + y^2)/(e^x + 1) and y = m c^2 a/(k_B T_nu).
 *
 * Source: Lesgourgues & Pastor (2006), Phys. Rep. 429, 307, sect. 2.
 */
export function relicEnergy(arithmetic: Arithmetic, y: Real): Real {
  const { squares, weights } = thermalRule(arithmetic, y);
  const [energy] = arithmetic.scope<[Real]>(() => {
    const mass = y.squared();
    let sum = arithmetic.real(0);
    for (const [k, square] of squares.entries())
      sum = sum.plus(
        square
          .plus(mass)
          .sqrt()
          .times(weights[k] as Real),
      );
    return [sum];
  });
  return energy;
}

/** Three times its pressure over the same density: the integral of x^4/sqrt(x^2 + y^2)/(e^x + 1) over F(0). */
export function relicPressure(arithmetic: Arithmetic, y: Real): Real {
  const { squares, weights } = thermalRule(arithmetic, y);
  const [pressure] = arithmetic.scope<[Real]>(() => {
    const mass = y.squared();
    let sum = arithmetic.real(0);
    for (const [k, square] of squares.entries())
      sum = sum.plus(square.times(weights[k] as Real).over(square.plus(mass).sqrt()));
    return [sum];
  });
  return pressure;
}
