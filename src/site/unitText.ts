/**
 * A unit as HTML. One division keeps its stroke (kg/m3); more become negative powers (km s^-1 Mpc^-1), because a row of
 * strokes is read in two ways.
 */
export function unitHtml(unit: string): string {
  const [over = '', ...under] = unit.split('/');
  if (under.length === 1 && over !== '1') return `${factors(over, 1)}/${factors(under[0] ?? '', 1)}`;
  const parts = [over === '1' ? '' : factors(over, 1), ...under.map((part) => factors(part, -1))];
  return parts.filter(Boolean).join('\u2009');
}

/** "Mpc3" and "m3" with their powers raised; `sign` -1 puts them below the line of division. */
function factors(text: string, sign: 1 | -1): string {
  return text
    .split(' ')
    .map((factor) => {
      const [, name = factor, power = '1'] = /^([A-Za-z]+)(\d+)?$/.exec(factor) ?? [];
      return (DRAWN[name] ?? name) + raised(sign * Number(power));
    })
    .join('\u2009');
}

const DRAWN: Readonly<Record<string, string>> = { Msun: '<i>M</i><sub>⊙</sub>', c: '<i>c</i>' };

function raised(power: number): string {
  return power === 1 ? '' : `<sup>${String(power).replace('-', '\u2212')}</sup>`;
}
