import { ORDER } from '../../tables/neededStep.ts';
import type { MethodText } from '../methods/section.ts';

/** How to interpolate, and what the stated errors mean. */
export const INTERPOLATION_TEXT: readonly MethodText[] = [
  {
    id: 'linear',
    title: 'With two rows: linear',
    body: String.raw`
Between the rows $z_i$ and $z_{i+1}$, the value $f$ of a column is taken from the straight line through both cells:

$$f(z) \approx f_i + \frac{z - z_i}{z_{i+1} - z_i} \left( f_{i+1} - f_i \right).$$

The error is about $h^2 f''/8$ in the middle of an interval of width $h$: half the step makes it ${2 ** ORDER.linear}
times smaller.`,
  },
  {
    id: 'lagrange',
    title: 'With four rows: Lagrange',
    body: String.raw`
The polynomial of third degree through the four rows nearest around the interval, two on either side, in the form of
Lagrange:

$$f(z) \approx \sum_{j=i-1}^{i+2} f_j \prod_{k \neq j} \frac{z - z_k}{z_j - z_k},$$

where $k$ runs over the same four rows. The steps need not be equal. In the first and last interval of a table take the
first or last four rows. The error is about $3 h^4 f''''/128$ where the steps are equal, and up to twice that in the
first and last interval: half the step makes it ${2 ** ORDER.lagrange} times smaller.`,
  },
  {
    id: 'stated',
    title: 'What is stated',
    body: `
For every column of every table we state the largest relative error of either method between any two of its rows. It
is found by comparing the interpolated values with the model itself at many redshifts in each interval, not from the
laws above, and what the rounding of the cells can add is counted in. The figures have two digits, rounded up: the
largest error is never above them, and at most about a tenth below. They stand in the colophon of each table and in a
file beside that of the table, with the ending .interpolation.csv, which has a line for each column: its id, the
largest relative error of the linear method and the redshift where it is, the same for four rows, and the largest
absolute errors of both in the unit of the column.

- *Relative* means over the true value. Distances and other columns that start from zero in proportion to $z$ are
  compared with themselves all the way down to $z = 0$.
- *Zeros.* In an interval where a column changes sign, as [$q$](q) does, or grows from zero faster than in proportion,
  as [$V_C$](V_C_Gpc3) does, the error over the value has no bound. There it is compared with the largest value in the
  interval.
- *Left out* are intervals with a blank at one end, and in closed space those across the antipode, for columns made of
  [$D_M$](D_M_Mpc), which have a kink there. Four rows are never taken across a blank.`,
  },
  {
    id: 'advice',
    title: 'Better than interpolating a steep column',
    body: `
A column that is a formula of another is best computed from it: the [distance modulus](mu_mag) from $D_L$, volumes and
angular scales from $D_M$, critical densities from $E$. Near $z = 0$ interpolate $V_C/z^3$ instead of $V_C$, and for
the modulus $D_L/z$.`,
  },
];
