/** Every length on a page is in millimetres; only type sizes are in points, as printers speak of them. */
export const MM_PER_PT = 25.4 / 72;

/** A tenth of a micrometre: far below any printer, and it keeps pages equal on every machine. */
export function roundMm(lengthMm: number): number {
  const rounded = Math.round(lengthMm * 1e4) / 1e4;
  return rounded === 0 ? 0 : rounded;
}
