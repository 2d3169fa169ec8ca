import { type ChebyshevSeries, chebyshevSeries, chebyshevValue } from '../numerics/chebyshev.ts';
import { CompensatedSum } from '../numerics/compensatedSum.ts';

/** Energy and pressure of a relic neutrino eigenstate over those of a massless one of the same temperature. */
export interface RelicNeutrino {
  /** F(y)/F(0), F(y) = int x^2 sqrt(x^2+y^2)/(e^x+1) dx. */
  readonly energy: number;
  /** G(y)/G(0), G(y) = int x^4/sqrt(x^2+y^2)/(e^x+1) dx; the pressure over a third of the massless energy density. */
  readonly pressure: number;
}

/** F(0) = G(0) = 7 pi^4/120. */
const MASSLESS = (7 * Math.PI * Math.PI * Math.PI * Math.PI) / 120;

/**
 * Nodes of the trapezoidal rule after x = exp(t - exp(-t)), with the weight x^2 dx/dt / (e^x+1). The map makes the
 * integrand fall doubly exponentially at both ends (Takahasi & Mori 1974, Publ. RIMS 9, 721), where a step of 1/32 is
 * exact to rounding; from t = -4 to t = 5.2 the terms left out are below 1e-40.
 */
const NODES = Array.from({ length: 295 }, (_, j) => {
  const t = -4 + j / 32;
  const x = Math.exp(t - Math.exp(-t));
  return { x, weight: (x * x * x * (1 + Math.exp(-t))) / ((Math.exp(x) + 1) * 32) };
});

/** Both integrals by direct quadrature, for any y >= 0; the tables below are made from it. */
export function relicNeutrinoIntegral(y: number): RelicNeutrino {
  const [energy, pressure] = [new CompensatedSum(), new CompensatedSum()];
  for (const { x, weight } of NODES) {
    const root = Math.sqrt(x * x + y * y);
    energy.add(weight * root);
    pressure.add(weight * ((x * x) / root));
  }
  return { energy: energy.value / MASSLESS, pressure: pressure.value / MASSLESS };
}

/** Below, the series 1 +- 5 y^2/(7 pi^2) is exact to rounding: the next term is of order 0.01 y^4 |ln y|. */
const SMALL = 1e-4;
/** Above, the expansion in 1/y^2 is exact to rounding before it starts to diverge (near its y/2-th term). */
const LARGE = 100;
/**
 * In ln y the integrals are analytic within pi/2 of the real axis. Ten panels then have a convergence ratio of 4.7 per
 * order: 28 orders leave 1e-19.
 */
const PANELS = 10;
const ORDERS = 28;

/** Tables hold the ratio to a hyperbola with the right ends: it stays near 1, so that no digits cancel in the sum. */
interface Panel {
  readonly energy: ChebyshevSeries;
  readonly pressure: ChebyshevSeries;
}

/** Slopes of F/F(0) and of G(0)/G at large y, to the digits that a scale needs. */
const ENERGY_SLOPE = 0.3173;
const PRESSURE_SLOPE = 0.2436;

function hyperbola(slope: number, y: number): number {
  return Math.sqrt(1 + slope * y * (slope * y));
}

const FIRST = Math.log(SMALL);
const WIDTH = (Math.log(LARGE) - FIRST) / PANELS;

function tabulate(): readonly Panel[] {
  return Array.from({ length: PANELS }, (_, k) => {
    const [lo, hi] = [FIRST + k * WIDTH, FIRST + (k + 1) * WIDTH];
    const series = (ratio: (y: number) => number) => chebyshevSeries((s) => ratio(Math.exp(s)), lo, hi, ORDERS);
    return {
      energy: series((y) => relicNeutrinoIntegral(y).energy / hyperbola(ENERGY_SLOPE, y)),
      pressure: series((y) => relicNeutrinoIntegral(y).pressure * hyperbola(PRESSURE_SLOPE, y)),
    };
  });
}

let tables: readonly Panel[] | undefined;

/** Coefficients of the expansion of F/F(0) and G/F(0) in 1/y^2 after their factors y and 1/y. */
const EXPANSION = expansion(16);

/**
 * sqrt(x^2+y^2) = y sum binom(1/2,k) (x/y)^2k and its reciprocal likewise, with int x^n/(e^x+1) dx = n! eta(n+1),
 * eta(s) = (1 - 2^(1-s)) zeta(s) the alternating zeta function.
 */
function expansion(terms: number): { readonly energy: readonly number[]; readonly pressure: readonly number[] } {
  const [energy, pressure]: [number[], number[]] = [[], []];
  let [half, minusHalf] = [1, 1];
  for (let k = 0; k < terms; k++) {
    energy.push((half * fermiMoment(2 + 2 * k)) / MASSLESS);
    pressure.push((minusHalf * fermiMoment(4 + 2 * k)) / MASSLESS);
    half *= (0.5 - k) / (k + 1);
    minusHalf *= (-0.5 - k) / (k + 1);
  }
  return { energy, pressure };
}

/** int_0^inf x^n/(e^x+1) dx = n! eta(n+1) for n >= 2. */
function fermiMoment(n: number): number {
  let factorial = 1;
  for (let k = 2; k <= n; k++) factorial *= k;
  return factorial * alternatingZeta(n + 1);
}

/** eta(s) = sum (-1)^(k-1) k^-s for integer s >= 3, accelerated (Cohen, Rodriguez Villegas & Zagier 2000, alg. 1). */
function alternatingZeta(s: number): number {
  const n = 24;
  const root = 3 + Math.sqrt(8);
  let power = 1;
  for (let k = 0; k < n; k++) power *= root;
  const d = (power + 1 / power) / 2;
  let [b, c, sum] = [-1, -d, 0];
  for (let k = 0; k < n; k++) {
    c = b - c;
    let term = 1;
    for (let j = 0; j < s; j++) term /= k + 1;
    sum += c * term;
    b *= ((k + n) * (k - n)) / ((k + 0.5) * (k + 1));
  }
  return sum / d;
}

function polynomial(coefficients: readonly number[], x: number): number {
  return coefficients.reduceRight((value, coefficient) => value * x + coefficient, 0);
}

/**
 * Energy and pressure of a relic neutrino at y = m c^2 a/(k_B T_nu), dimensionless, y >= 0.
 *
 * Method:   series for y < 1e-4 (Lesgourgues & Pastor 2006, Phys. Rep. 429, 307), Chebyshev tables of the Fermi-Dirac
 *           integrals in ln y up to 100, expansion in 1/y^2 beyond. The tables do not depend on the parameter set.
 * Accuracy: 2e-15 relative, against test/reference/fermiDirac.json.
 */
export function relicNeutrino(y: number): RelicNeutrino {
  if (y < SMALL) {
    const square = (5 * y * y) / (7 * Math.PI * Math.PI);
    return { energy: 1 + square, pressure: 1 - square };
  }
  if (y >= LARGE) {
    const inverse = 1 / (y * y);
    return { energy: y * polynomial(EXPANSION.energy, inverse), pressure: polynomial(EXPANSION.pressure, inverse) / y };
  }
  tables ??= tabulate();
  const s = Math.log(y);
  const panel = tables[Math.min(PANELS - 1, Math.max(0, Math.floor((s - FIRST) / WIDTH)))] as Panel;
  return {
    energy: chebyshevValue(panel.energy, s) * hyperbola(ENERGY_SLOPE, y),
    pressure: chebyshevValue(panel.pressure, s) / hyperbola(PRESSURE_SLOPE, y),
  };
}
