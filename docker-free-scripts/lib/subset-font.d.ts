/** The part of subset-font that make-web-font.mjs uses; the package ships no types. */
declare module 'subset-font' {
  interface SubsetOptions {
    targetFormat: 'sfnt' | 'woff' | 'woff2';
    keepFeatures?: readonly string[];
    preserveNameIds?: readonly number[];
    noHinting?: boolean;
  }
  export default function subsetFont(font: Buffer, text: string, options: SubsetOptions): Promise<Buffer>;
}
