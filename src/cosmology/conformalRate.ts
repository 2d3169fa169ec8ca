import type { Background, MassiveNeutrino } from './background.ts';
import { relicEnergyChange } from './relicEnergyChange.ts';
import { relicNeutrino } from './relicNeutrinos.ts';

/**
 * (a E)^2 at s = ln a: the square of the expansion rate in conformal time, in units of H0.
 *
 * Every integral of the tables is one of ds/(aE) (comoving distance, conformal time) or of a ds/(aE) (age); written
 * with a factor a^2 the curvature term is a constant and nothing overflows at either end of time.
 */
export function conformalRateSquared(model: Background, s: number): number {
  const u = Math.exp(-s);
  const u2 = u * u;
  let relativistic = model.photons + model.masslessNeutrinos;
  for (const { relativistic: density, y0 } of model.massiveNeutrinos) {
    relativistic += density * relicNeutrino(y0 / u).energy;
  }
  return model.matter * u + relativistic * u2 + model.curvature + darkEnergyTerm(model, s);
}

/** a^2 times the dark energy density: exp of `exponent(s)`. */
function darkEnergyTerm(model: Background, s: number): number {
  return model.darkEnergy === 0 ? 0 : model.darkEnergy * Math.exp(darkEnergyExponent(model, s));
}

function darkEnergyExponent(model: Background, s: number): number {
  return (2 - 3 * model.onePlusW) * s + (model.wa === 0 ? 0 : 3 * model.wa * Math.expm1(s));
}

/**
 * (aE)^2 at s = turn - shift, where it vanishes at s = turn: each term's difference to its value at the turn, so that
 * no digits cancel close to it.
 */
export function conformalRateSquaredNearTurn(model: Background, turn: number, shift: number): number {
  const u = Math.exp(-turn);
  const radiation = (model.photons + model.masslessNeutrinos) * u * u;
  let total = model.matter * u * Math.expm1(shift) + radiation * Math.expm1(2 * shift);
  for (const neutrino of model.massiveNeutrinos) total += u * u * neutrinoDifference(neutrino, turn, shift);
  if (model.darkEnergy === 0) return total;
  const bend = model.wa === 0 ? 0 : 3 * model.wa * Math.exp(turn) * Math.expm1(-shift);
  return total + darkEnergyTerm(model, turn) * Math.expm1(-(2 - 3 * model.onePlusW) * shift + bend);
}

/** Change of R(y0/u) u^2 from the turn to turn - shift, without the factor u^2 at the turn. */
function neutrinoDifference({ relativistic, y0 }: MassiveNeutrino, turn: number, shift: number): number {
  const y = y0 * Math.exp(turn);
  const change = relicEnergyChange(y, -shift) * Math.exp(2 * shift);
  return relativistic * (change + relicNeutrino(y).energy * Math.expm1(2 * shift));
}
