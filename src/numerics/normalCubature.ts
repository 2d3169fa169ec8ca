/** A point of a cubature rule in units of the standard deviations, and its weight. */
export interface WeightedPoint {
  readonly point: readonly number[];
  readonly weight: number;
}

/**
 * Points and weights for the mean of a function of n independent standard normal variables, exact for polynomials up
 * to the fifth degree: the centre, sqrt(3) either way along each axis, and along each pair of axes; 2 n^2 + 1 points.
 * The weights sum to 1; for n > 4 those on the axes are negative.
 *
 * Source: McNamee & Stenger (1967), Numer. Math. 10, 327: the fully symmetric rule of degree 5. Its weights follow from
 *         the moments E[x^2] = 1, E[x^4] = 3 and E[x^2 y^2] = 1.
 */
export function normalCubature(n: number): readonly WeightedPoint[] {
  const place = (entries: readonly (readonly [number, number])[]) =>
    Array.from({ length: n }, (_, k) => entries.find(([axis]) => axis === k)?.[1] ?? 0);
  const reach = Math.sqrt(3);
  const ends = [reach, -reach];
  const axes = Array.from({ length: n }, (_, k) => k);
  const pairs = axes.flatMap((j) => axes.slice(j + 1).map((k) => [j, k] as const));
  return [
    { point: place([]), weight: 1 + (n * n - 7 * n) / 18 },
    ...axes.flatMap((k) => ends.map((x) => ({ point: place([[k, x]]), weight: (4 - n) / 18 }))),
    ...pairs.flatMap(([j, k]) =>
      ends.flatMap((x) =>
        ends.map((y) => ({
          point: place([
            [j, x],
            [k, y],
          ]),
          weight: 1 / 36,
        })),
      ),
    ),
  ];
}
