import { relicNeutrino } from './relicNeutrinos.ts';

/** Below, Simpson's error, shift^5/2880 against a change of order shift, stays under a unit of roundoff. */
const SIMPSON_LIMIT = 7e-4;

/**
 * R(y e^shift) - R(y) for the energy R = F(y)/F(0) of a relic neutrino: the integral of dR/d ln y = R - G over ln y,
 * so that no digits cancel when the shift is small.
 */
export function relicEnergyChange(y: number, shift: number): number {
  const rise = (s: number): number => {
    const { energy, pressure } = relicNeutrino(y * Math.exp(s));
    return energy - pressure;
  };
  if (Math.abs(shift) >= SIMPSON_LIMIT) return relicNeutrino(y * Math.exp(shift)).energy - relicNeutrino(y).energy;
  return (shift / 6) * (rise(0) + 4 * rise(shift / 2) + rise(shift));
}
