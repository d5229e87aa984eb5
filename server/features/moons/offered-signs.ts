import { FIGURES, markerKeyOf, STARS } from '#shared/sky/index.js';

/** Faint stars make poor signs for months: only what everybody finds is offered, figures first, then by brightness. */
const BRIGHTER_THAN_V = 1.7;

export const OFFERED_SIGNS: readonly string[] = [
  ...FIGURES.map((figure) => figure.key),
  ...STARS.filter((star) => star.vMag < BRIGHTER_THAN_V)
    .toSorted((left, right) => left.vMag - right.vMag)
    .map((star) => markerKeyOf(star.hr)),
];
