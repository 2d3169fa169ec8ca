import { propagation } from '../../cosmology/propagation.ts';
import { cellPlace } from '../../cosmology/sweep.ts';
import type { ParameterSet } from '../../inputs/types.ts';
import { roundHalfEven } from '../../numerics/roundHalfEven.ts';
import { decimalText } from '../../tables/csvCell.ts';
import { type UncertaintyComparison, uncertaintyComparisons } from '../uncertainty/comparisons.ts';
import type { ComparedValue } from '../uncertainty/dependences.ts';
import type { MethodText } from './section.ts';

const VALUE_TEXT: Readonly<Record<ComparedValue, string>> = {
  Omega_m: String.raw`$\Omega_{\mathrm{m}}$`,
  omega_m: String.raw`$\Omega_{\mathrm{m}} h^2$`,
  age_today: '$t_0$ (Gyr)',
  z_equality: String.raw`$z_{\mathrm{eq}}$`,
  D_M: '$D_M(z_*)$ (Mpc)',
};

const three = (x: number): string => decimalText(roundHalfEven(x, 3));

function line({ set, of, published, ours, from, to, agrees }: UncertaintyComparison): string {
  const cells = [
    set.id,
    VALUE_TEXT[of],
    published,
    three(ours),
    `${three(from)} to ${three(to)}`,
    agrees ? 'yes' : 'no',
  ];
  return `| ${cells.join(' | ')} |`;
}

/** The comparisons as a table, with the sentences that explain it; nothing if no set is there to compare. */
function comparisonText(comparisons: readonly UncertaintyComparison[]): string {
  if (comparisons.length === 0) return '';
  return String.raw`
*Check.* What a paper prints of derived values tests the propagation. The correlations of the sets below are implied by
two rows of the paper, as the note of each set shows: $\Omega_{\mathrm{m}}$, which so agrees by construction, and
$\Omega_{\mathrm{m}} h^3$ or $\Omega_{\mathrm{m}} h^2$. All other values are tests. The last two columns say what those
rows allow if each of their uncertainties may be off by half a unit of its last digit, and whether the published
uncertainty, rounded likewise, is among it. No paper prints a row for $D_M(z_*)$: the value is that of $r_*/\theta_*$,
with the two taken as independent for its column, and as correlated in any way for the verdict.${remembered(comparisons)}

| set | value | $u$ published | $u$ here | rows allow | agrees |
| --- | --- | --- | --- | --- | --- |
${comparisons.map(line).join('\n')}`;
}

function remembered(comparisons: readonly UncertaintyComparison[]): string {
  const unread = new Set(comparisons.filter(({ status }) => status === 'remembered').map(({ set }) => set.id));
  if (unread.size === 0) return '';
  return ` Rows for ${[...unread].join(' and ')} are from memory and not yet checked against the papers.`;
}

/** Published sets of several uncertain parameters whose papers print no correlations. */
function withoutCorrelations(sets: readonly ParameterSet[]): readonly ParameterSet[] {
  return sets.filter(
    ({ kind, uncertainties, correlations }) =>
      kind === 'published' && Object.keys(uncertainties).length > 1 && correlations.length === 0,
  );
}

/** Where uncertainties cannot be reproduced, and by how much the curved model of Planck misses. */
function limitText(sets: readonly ParameterSet[]): string {
  const lacking = withoutCorrelations(sets);
  if (lacking.length === 0) return '';
  const curved = lacking.find(({ id }) => id === CURVED);
  return `
*Where this cannot work.* We know no correlations, and no row that implies them, for
${lacking.map(({ id }) => id).join(', ')}. Their parameters are taken as independent, so their uncertainties are guides
to the size, and upper ones for distances to high redshift. ${curved === undefined ? '' : curvedText(curved)}`;
}

const CURVED = 'planck-2018-curved';
/** Redshift of recombination, Planck 2018. */
const RECOMBINATION = 1089.92;

function curvedText(set: ParameterSet): string {
  const u = propagation(set, [RECOMBINATION])?.u[cellPlace(0, 'D_M_Mpc')] ?? Number.NaN;
  return String.raw`In ${CURVED}, $H_0$ and $\Omega_k$ vary together along the line on which the angle of the
sound horizon stays as measured. Taken as independent they make $u(D_M(z_*))$ ${Math.round(u)} Mpc, where the angle,
known to 0.03 per cent, and the sound horizon, to 0.2 per cent, leave some 30 Mpc.`;
}

/** How uncertainties are propagated, with published ones beside them for the sets that are there. */
export function uncertaintyText(sets: readonly ParameterSet[]): readonly MethodText[] {
  return [
    {
      id: 'uncertainties',
      title: 'Uncertainties',
      body: String.raw`
The standard uncertainty of each cell and milestone follows from those of the parameters by the law of propagation
(JCGM 100:2008, 5.2.2):

$$u(y)^2 = \sum_i \sum_j c_i \, u_i \, r_{ij} \, c_j \, u_j, \qquad c_i = \frac{\partial y}{\partial x_i},$$

with the standard uncertainties $u_i$ and correlation coefficients $r_{ij}$ of the set; a pair without a coefficient is
taken as independent. The derivatives are central differences over 1/32, 1/64 and 1/128 of $u_i$, extrapolated; all
else that the set gives stays fixed meanwhile, and what follows from the sum of the densities gives way. They hold six
digits or more. Uncertainties stand in a file of their own beside that of the table. It has the same name but for the
ending .u.csv, and the same columns with u_ before their ids; cells are rounded to two significant digits, half to
even. Those of the milestones stand in the file of the milestones.

- *Exact.* A parameter without uncertainty is exact, as are neutrino masses, constants and redshifts. The 22 parts in a
  million of $G$, which densities in kilograms or grams would have in addition, are not counted.
- *Zero and blank.* 0 means that the value does not depend on the uncertain parameters, as $E$ at $z = 0$. Blank means
  that there is no value, or that it ceases to exist with a change of a parameter by 1/32 of its uncertainty. A set
  without uncertainties has no such file.
- *Lopsided intervals.* Where a paper prints two different sides, the set gives half the width of the interval and the
  note says so; the value stays the printed one. A one-sided limit, as on neutrino masses, gives no standard
  uncertainty: the parameter is taken as exact.

*Error budget.* The part of parameter $i$ in $u^2$ is $c_i u_i \sum_j r_{ij} c_j u_j / u^2$. It is given in two
pieces: $c_i^2 u_i^2 / u^2$, as if the parameter were independent, and the rest, which its correlations add or take
away. All pieces together make 1. With strong correlations single pieces exceed 1 or are negative.

*Digits.* Of a printed value the digits up to the first significant one of $u$ are warranted; those to its right are
printed paler.

*Limits of the linear law.* The law follows $y$ as a straight line over the spread of the parameters. It is compared
with the standard deviation of $y$ itself for normally distributed parameters, by a cubature of the fifth degree, which
holds the terms of the next order of JCGM 100, 5.1.2. Where the two differ by more than a tenth of $u$, the table names
columns and redshifts; so it does where the spread reaches parameters for which the value does not exist. The cubature
itself is tested against 100 000 random draws.
${comparisonText(uncertaintyComparisons(sets))}
${limitText(sets)}`,
    },
  ];
}
