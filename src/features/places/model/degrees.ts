/** `3.5`, `−2`: at most two decimals, with a real minus sign. */
export function degreesText(valueDeg: number, language: string): string {
  return new Intl.NumberFormat(language, { maximumFractionDigits: 2, signDisplay: 'negative' })
    .format(valueDeg)
    .replace('-', '−');
}

/** The same with a plus sign before what is added: `+0.5`, `−1`, `0`. */
export function signedDegreesText(valueDeg: number, language: string): string {
  const text = degreesText(valueDeg, language);
  return valueDeg > 0 ? `+${text}` : text;
}
