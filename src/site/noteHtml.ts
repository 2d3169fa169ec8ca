import { titleHtml } from './titleHtml.ts';
import { typographic } from './typographic.ts';

/** A keeper's note, written in ASCII, as HTML: real signs, raised powers, symbols with their indices. */
export function noteHtml(note: string): string {
  return titleHtml(typographic(note))
    .replace(/\+-/g, '±')
    .replace(/(?<=\d) x (?=[\d(])/g, ' × ')
    .replace(
      /(?<![A-Za-z])(\d(?:\.\d+)?)e(-?\d+)/g,
      (_, digits: string, power: string) => `${digits === '1' ? '' : `${digits} × `}10<sup>${power}</sup>`,
    )
    .replace(/\^(-?\d+)/g, '<sup>$1</sup>')
    .replace(/\bw0\b/g, '<var>w</var><sub>0</sub>')
    .replace(/\bwa\b/g, '<var>w<sub>a</sub></var>')
    .replace(/\bN_eff\b/g, '<var>N</var><sub>eff</sub>')
    .replace(/\bomega_(\w)/g, 'ω<sub>$1</sub>')
    .replace(/\bz_eq\b/g, '<var>z</var><sub>eq</sub>')
    .replace(/(?<=^|[\s(=>/,])-(?=\d)/g, '−')
    .replaceAll('<sup>-', '<sup>−');
}
