import type { Figure } from '../types.js';

/** Groups of stars that people watch as one. Dates are those of the indicator star. */
export const FIGURES: readonly Figure[] = Object.freeze([
  {
    key: 'pleiades',
    name: 'Pleiades',
    indicatorHr: 1165,
    memberHrs: [1142, 1145, 1149, 1156, 1165, 1178],
    // Near the horizon the cluster behaves like a third-magnitude star, not like its combined light [Vogt1920 p. 17].
    thresholdOverride: { sameSideDeg: 16, oppositeSideDeg: 10 },
  },
  {
    key: 'orion-belt',
    name: 'Belt of Orion',
    // Alnilam: the brightest of the three and the middle one, so the other two are never more than minutes away.
    indicatorHr: 1903,
    memberHrs: [1852, 1903, 1948],
    thresholdOverride: null,
  },
]);

export function findFigure(key: string): Figure | null {
  return FIGURES.find((figure) => figure.key === key) ?? null;
}
