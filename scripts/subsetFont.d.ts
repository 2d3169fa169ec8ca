/** The part of subset-font (harfbuzz) that the fonts are cut with; the package brings no types. */
declare module 'subset-font' {
  interface Options {
    readonly targetFormat: 'woff2';
    readonly noHinting: boolean;
    readonly keepFeatures: readonly string[];
    readonly preserveNameIds: readonly number[];
  }
  export default function subsetFont(font: Buffer, text: string, options: Options): Promise<Buffer>;
}
