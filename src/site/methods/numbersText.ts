import { WORKING_DIGITS } from '../../tables/decidingText.ts';
import { PAGE_DIGITS } from '../pageDigits.ts';
import type { MethodText } from './section.ts';

/** How numbers are computed and printed. */
export const NUMBERS_TEXT: readonly MethodText[] = [
  {
    id: 'blanks',
    title: 'Where a cell is blank',
    body: String.raw`
Blank means that the quantity does not exist there. It never stands for zero, for a number too small, or for one not
computed.

- *At* $z = 0$ the [distance modulus](mu_mag) is blank; distances, volumes, lookback time, drift and recession
  velocities are 0.
- *For* $z < 0$, the future, distances, volumes, lookback time, drift and recession velocities are blank: no light
  from there has arrived. Age, conformal time, densities, expansion rate and horizons stand.
- *Recollapsing models* follow the expansion. All cells of a row are blank if the model never grows to that scale, and
  in the row of the largest scale itself those that divide by the expansion rate.
- *No Big Bang*: if $E^2$ falls to zero in the past, space once bounced. Grids that reach beyond the bounce are
  refused, with the redshift named; age, conformal time and particle horizon are blank everywhere.
- *Age* exists where its integral converges at $a = 0$, that is, unless a component of constant or growing density
  rules there.
- *Particle horizon and conformal time* exist where in the beginning something rules that thins out faster than
  $a^{-2}$, matter or radiation: not in an empty universe.
- *Event horizon* exists where its integral converges in the end: with accelerated expansion, or with a crunch.
- *Temperature* is blank where the set neglects radiation, and [$w_{\mathrm{eff}}$](w_eff) where there is no density
  at all.

In closed space the light of a source can come from beyond the antipode, the point farthest away. $D_M$ is then
printed as the absolute value, and the page says which rows are concerned.`,
  },
  {
    id: 'integration',
    title: 'How numbers are computed',
    body: String.raw`
Everything is integrated once, from row to row, in $\ln a$, where the integrands are smooth from the radiation era to
the far future. Each gap between neighbouring redshifts is covered by panels with the 16-point rule of Gauss and
Legendre. A panel estimates its own error from the last terms of the integrand's Legendre series and is halved until
that estimate is below the rounding of a double-precision number.

Gaps are added in the direction in which the total grows from zero: distances and lookback time from today outwards,
age and conformal time from the Big Bang, the event horizon from the end of time backwards. Every total is a sum of
positive terms, added with compensation, and keeps its relative accuracy however small it is. Beyond the first and
last row, panels are added until the closed form of the leading power law can take over. Close to a turning point the
variable is the root of the distance to it, which makes the integrand smooth there.

Differences that would cancel are avoided: nearly flat space and small redshifts use series for [$D_M$](D_M_Mpc) and
[$V_C$](V_C_Gpc3), and the [redshift drift](dz_dt_per_Gyr) is a sum of small terms, not a difference of large ones.
Where a column crosses zero, its accuracy is that of the terms which cancel.

The neutrino integral $F(y)/F(0)$ is tabulated once, as Chebyshev series in $\ln y$ between $y = 10^{-4}$ and 100,
with its expansions for small and for large $y$ outside. The series are made from the integral itself, and both have
been compared with values of 30 digits.

The aim is a relative error below $2 \times 10^{-14}$ for $-0.9 \le z \le 10^6$. It is tested against closed forms,
where they exist, and against evaluations of more than 25 digits in two other languages that share no code with this
program. Ages, distances and densities that others have published stand [beside ours](checked-against), with every
difference.`,
  },
  {
    id: 'rounding',
    title: 'Rounding',
    body: `
A cell of a file is its value rounded to the significant digits of the edition, ten as a rule, half to even. Trailing
zeros stay, for they are digits. Numbers from $10^{-4}$ to below $10^{12}$ are plain decimals, all others have an
exponent, as in 1.234567890E-27. A blank cell is empty. Exact zeros are a single 0. Redshifts are printed as the grid
writes them and are never rounded.

Parameters and redshifts are taken as the decimals that are written, and each value is the one for those decimals,
correctly rounded. Double precision alone cannot promise that: where a value lies close to the middle between two
neighbouring decimals, its error decides. So every double value carries a bound on its own error, counted in roundings
along its formula. A cell whose bound reaches such a middle, about two in a thousand, is *settled*: evaluated again with
${WORKING_DIGITS} digits. A value that is exactly a middle, such as 2.7255 K times 1.000125, goes to the even digit.
The same holds for the cells of pages, at their own number of digits.`,
  },
  {
    id: 'audit',
    title: 'The audit',
    body: `
Before an edition is released, every cell of it is evaluated a second time by the *audit*: the defining integrals with
${WORKING_DIGITS} working digits and again with ${WORKING_DIGITS + 16}, in arithmetic whose every operation is correctly
rounded (MPFR), by code that shares nothing with the fast evaluation but the decimals of parameters, redshifts and
constants. It is compared with the printed cell, and a certificate says how many cells were compared and settled and how
large the largest error before rounding was. The colophon of a table quotes the certificate as long as it speaks of
exactly the bytes of its file.`,
  },
  {
    id: 'pages-and-files',
    title: 'Digits of pages and of files',
    body: `
Pages print ${PAGE_DIGITS} digits, files those of the edition. A page cell is rounded from the value itself, not from
the cell of the file, so the two never disagree by rounding twice. Where the numbers of a column are very large or
very small, the page takes one power of ten out of the whole column and prints it in the head.

Pages use the minus sign and thin spaces of print; files are plain ASCII, with a point as decimal sign, commas between
cells, one header row of column ids, and a line feed after each row. They hold no other lines, so that any program can
read them. For further computation take the file, not the page.`,
  },
  {
    id: 'interpolation',
    title: 'Between the rows',
    body: `
Each table says how far its columns can be interpolated: the largest error of a straight line between two rows, and of
Lagrange's polynomial through four. What is stated, and which steps a wanted accuracy needs, is told
[on a page of its own](interpolation).`,
  },
];
