import { plainText } from '../plainText.ts';

/** A word or a number of a query or of a name. */
export interface Token {
  /** As typed, in plain ASCII and lower case. */
  readonly text: string;
  /** As typed, in plain ASCII. */
  readonly written: string;
  /** What is compared: a word in the singular without underscores, a number in its shortest form. */
  readonly term: string;
  /** The number, where it is one. */
  readonly value?: number;
}

// A hyphen belongs to a number only after a space, "=", "(" or ":", so that "gamma-2018" keeps its 2018.
const PIECE = /[a-z][a-z0-9]*(?:_[a-z0-9]+)*|(?:(?<![^\s=(:])-)?(?:\d+(?:\.\d+)?|\.\d+)(?:e[+-]?\d+)?/gi;

/** Splits text into words, which keep their underscores ("D_L"), and whole numbers ("0.500", "1e-4"). */
export function tokens(text: string): Token[] {
  const plain = plainText(text).replace(/\bz(?=-?\.?\d)/gi, 'z ');
  return Array.from(plain.matchAll(PIECE), ([written]) => {
    const text = written.toLowerCase();
    if (/^[a-z]/.test(text)) return { text, written, term: singular(text.replaceAll('_', '')) };
    return { text, written, term: String(Number(text)), value: Number(text) };
  });
}

/** "densities" -> "density", "ages" -> "age"; short words and those in -ss, -us, -is stay. */
function singular(word: string): string {
  if (word.length < 4 || /(?:ss|us|is)$/.test(word)) return word;
  if (word.endsWith('ies')) return `${word.slice(0, -3)}y`;
  return word.endsWith('s') ? word.slice(0, -1) : word;
}
