import type { Real } from '../../numerics/extended/real.ts';
import { type Contents, contents, pressures } from './contents.ts';
import { signedTransverse } from './geometry.ts';
import type { Moment } from './history.ts';
import type { Model } from './model.ts';

/** A model at one epoch, and what several columns are made of. */
export interface Row {
  readonly model: Model;
  readonly z: Real;
  /** 1 + z. */
  readonly u: Real;
  readonly moment: Moment;
  readonly contents: Contents;
  /** H/H0; null where it is zero, at the maximum of a recollapsing model. */
  readonly E: Real | null;
  /** Transverse comoving distance, c/H0; null in the future. */
  readonly transverse: Real | null;
  /** All densities but that of curvature, and all pressures. */
  readonly fluids: { readonly density: Real; readonly pressure: Real };
}

/** The row at 1 + z = u; what is costly is computed when a column asks for it. */
export function row(model: Model, z: Real, u: Real, moment: Moment): Row {
  const here = contents(model, u);
  return {
    model,
    z,
    u,
    moment,
    contents: here,
    // Today E is 1: that is what densities over the critical one add up to. The sum as computed may round off it.
    E: z.sign() === 0 ? model.arithmetic.real(1) : expansionRate(model, here),
    transverse: moment.comoving === null ? null : signedTransverse(model, moment.comoving).magnitude(),
    get fluids() {
      const p = pressures(model, u, here);
      return {
        density: here.matter.plus(here.photons).plus(here.neutrinos).plus(here.darkEnergy),
        pressure: p.photons.plus(p.neutrinos).plus(p.darkEnergy),
      };
    },
  };
}

/** The root of the sum of all densities. A sum without a working digit left is an exact zero. */
function expansionRate({ arithmetic }: Model, parts: Contents): Real | null {
  const terms = [parts.matter, parts.photons, parts.neutrinos, parts.curvature, parts.darkEnergy];
  const sum = (values: readonly Real[]) => values.reduce((total, value) => total.plus(value), arithmetic.real(0));
  const square = sum(terms);
  const size = sum(terms.map((term) => term.magnitude()));
  return square.below(size.times(arithmetic.powerOfTen(-arithmetic.digits))) ? null : square.sqrt();
}
