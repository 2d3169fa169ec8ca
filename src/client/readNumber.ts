import { plainText } from './plainText.ts';

const REDSHIFT = /^(?:z\s*=?\s*)?(-?(?:\d+(?:\.\d*)?|\.\d+)(?:e[+-]?\d+)?)$/i;

/** The number in a field that asks for a redshift: "0.5", "0,5", "z = 0.5", "1e3". Undefined if it is none. */
export function readNumber(text: string): number | undefined {
  const written = REDSHIFT.exec(plainText(text).trim())?.[1];
  if (written === undefined) return undefined;
  const value = Number(written);
  return Number.isFinite(value) ? value : undefined;
}
