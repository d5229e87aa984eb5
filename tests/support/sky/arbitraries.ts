import fc from 'fast-check';

import { type SkylinePoint, STARS } from '#shared/sky/index.js';

/** Random questions for the sky. Numbers come in steps, so that a failing case is short to read and to repeat. */

const steps = (min: number, max: number, step: number): fc.Arbitrary<number> =>
  fc.integer({ min: Math.round(min / step), max: Math.round(max / step) }).map((count) => count * step);

export const anyHr = fc.constantFrom(...STARS.map((star) => star.hr));
export const anyYear = fc.integer({ min: -3000, max: 3000 });
/** Nearer the poles than 75° a star's rising can last for hours and a hair decides whether it rises. */
export const anyLatitudeDeg = steps(-75, 75, 0.25);
export const anyLongitudeDeg = steps(-180, 180, 0.5);
export const anyThresholdDeg = steps(0, 18, 0.25);

/** A hill country: up to 24 points, some of them below the horizontal. */
export const anySkyline: fc.Arbitrary<SkylinePoint[]> = fc.uniqueArray(
  fc.record({ azimuthDeg: fc.integer({ min: 0, max: 359 }), altitudeDeg: steps(-2, 14, 0.5) }),
  { selector: (point) => point.azimuthDeg, maxLength: 24 },
);

/** Fixed, so that a run can be repeated; the cases differ from property to property all the same. */
export const SEED = 20_270_101;

/** A property takes a second or two; a machine that is busy with other work may need many times that. */
export const PROPERTY_TIMEOUT_MS = 60_000;
