import type { MarkerRow } from '#shared/contracts/stars.js';

/** Why a star has no dates at all: the key of one sentence. Null where at least one of its days is dated. */
export type NoDates =
  | 'never-sets-north'
  | 'never-sets-south'
  | 'never-rises'
  | 'below-skyline'
  | 'never-dark-enough'
  | 'none-in-this-year';

/** @param latitudeDeg of the place: a star that never sets turns round the pole on its side */
export function noDates(row: MarkerRow, latitudeDeg: number): NoDates | null {
  if (row.outcome === 'never-sets') return latitudeDeg >= 0 ? 'never-sets-north' : 'never-sets-south';
  if (row.outcome === 'never-clears-skyline') {
    return row.outcomeDetail === 'below-skyline' ? 'below-skyline' : 'never-rises';
  }
  const outcomes = Object.values(row.phenomena).map((one) => one.outcome);
  if (outcomes.includes('dated')) return null;
  return outcomes.includes('never-dark-enough') ? 'never-dark-enough' : 'none-in-this-year';
}

/** How bright a star looks, in a word. Bounds are those of the threshold classes where there are any. */
export type BrightnessWord = 'very-bright' | 'bright' | 'middling' | 'faint';

export function brightnessWord(vMag: number): BrightnessWord {
  if (vMag < 0.5) return 'very-bright';
  if (vMag < 1.65) return 'bright';
  return vMag <= 2.5 ? 'middling' : 'faint';
}

const formats = new Map<string, Intl.NumberFormat>();

/** `−1.5`, `0.9`: one decimal, with a real minus sign. */
export function magnitudeText(vMag: number, language: string): string {
  const format =
    formats.get(language) ??
    new Intl.NumberFormat(language, {
      minimumFractionDigits: 1,
      maximumFractionDigits: 1,
      signDisplay: 'negative',
    });
  formats.set(language, format);
  return format.format(vMag).replace('-', '−');
}
