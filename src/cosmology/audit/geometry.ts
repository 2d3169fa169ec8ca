import { integrate } from '../../numerics/extended/integrate.ts';
import type { Real } from '../../numerics/extended/real.ts';
import type { Model } from './model.ts';

/**
 * Transverse comoving distance over c/H0 for the line-of-sight one, sinh(sqrt(Omega_k) chi)/sqrt(Omega_k) in open space,
 * with its sign in closed space: negative beyond the antipode. Source: Hogg (1999), astro-ph/9905116, eq. 16.
 */
export function signedTransverse({ curvature }: Model, chi: Real): Real {
  if (curvature.sign() === 0) return chi;
  const root = curvature.magnitude().sqrt();
  const angle = root.times(chi);
  return (curvature.sign() > 0 ? angle.sinh() : angle.sin()).over(root);
}

/** Its derivative by chi. */
export function transverseSlope({ arithmetic, curvature }: Model, chi: Real): Real {
  if (curvature.sign() === 0) return arithmetic.real(1);
  const angle = curvature.magnitude().sqrt().times(chi);
  return curvature.sign() > 0 ? angle.cosh() : angle.cos();
}

/**
 * Comoving volume of the shell between two line-of-sight distances in (c/H0)^3, whole sky: int 4 pi D_M^2 dD_C. Beyond
 * the antipode it goes on counting the space that light has crossed before.
 *
 * Source: Hogg (1999), astro-ph/9905116, eq. 28, with dD_C = dz/E.
 */
export function shellVolume(model: Model, inner: Real, outer: Real): Real {
  const { arithmetic } = model;
  const [volume] = integrate(arithmetic, (chi) => [signedTransverse(model, chi).squared()], inner, outer);
  return (volume as Real).times(arithmetic.pi()).times(4);
}
