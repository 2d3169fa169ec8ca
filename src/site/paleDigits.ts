const NOUGHT_TO_NINE = /\d/;

/**
 * HTML of a number as pages print it, with the digits after the first `warranted` significant ones in paler ink. With
 * none warranted the whole number is paler, its sign included; a power of ten never is, because it says where the
 * digits stand. `<i>` means nothing here and is read through; the style sheet sets it upright.
 */
export function paleDigits(text: string, warranted: number): string {
  const power = text.indexOf('×');
  const number = power < 0 ? text : text.slice(0, power);
  const end = number.search(/\D*$/);
  const start = warranted === 0 ? 0 : inkEnd(number.slice(0, end), warranted);
  return start < end ? `${text.slice(0, start)}<i>${text.slice(start, end)}</i>${text.slice(end)}` : text;
}

/** Where the ink ends: behind so many significant digits, and behind a point that follows them. */
function inkEnd(number: string, count: number): number {
  let at = number.search(/[1-9]/);
  if (at < 0) return number.length;
  for (let left = count; at < number.length; at++) {
    if (!NOUGHT_TO_NINE.test(number[at] ?? '')) continue;
    if (left === 0) break;
    left--;
  }
  return at;
}
