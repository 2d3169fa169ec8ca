/**
 * Standard normal numbers from a seed: Marsaglia's xorshift with 128 bits of state (J. Stat. Softw. 8(14), 2003) through
 * the transform of Box & Muller (Ann. Math. Stat. 29, 610, 1958). The same seed gives the same numbers everywhere but for
 * the last bits of log and cos.
 */
export function standardNormals(seed: number): () => number {
  const state = Uint32Array.of(seed, 362436069, 521288629, 88675123);
  const next = (): number => {
    const [x = 0, y = 0, z = 0, w = 0] = state;
    const t = x ^ (x << 11);
    state.set([y, z, w, w ^ (w >>> 19) ^ t ^ (t >>> 8)]);
    return ((state[3] ?? 0) + 0.5) / 4294967296;
  };
  for (let k = 0; k < 20; k++) next();
  return () => Math.sqrt(-2 * Math.log(next())) * Math.cos(2 * Math.PI * next());
}
