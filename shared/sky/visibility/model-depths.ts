import type { HorizonSide } from '../phenomena/phenomenon-facts.js';
import type { Air } from './air.js';
import { faintestStarMag } from './faintest-star.js';

/**
 * How deep the model wants the Sun for a star at each altitude, for many magnitudes at once: the faintest star is
 * computed on a grid of altitude and depth, and each magnitude reads its depth off that.
 */

/** Azimuth between star and Sun that stands for each side, as in the published comparisons of the model. */
export const AZIMUTH_DIFFERENCE_DEG: Readonly<Record<HorizonSide, number>> = { same: 20, opposite: 165 };

export const ALTITUDE_STEP_DEG = 0.25;
export const HIGHEST_ALTITUDE_DEG = 60;
export const ALTITUDE_COUNT = HIGHEST_ALTITUDE_DEG / ALTITUDE_STEP_DEG + 1;

const DEPTH_STEP_DEG = 0.25;
/** At this depth nothing is left of twilight; a star that does not show then does not show at that altitude. */
const DARKEST_DEG = 20;
const DEPTH_COUNT = DARKEST_DEG / DEPTH_STEP_DEG + 1;
/** Deeper than any night: stands for "not at this altitude" and still lets a table be interpolated. */
export const NOT_SEEN_DEG = 30;

/** Depth at which the faintest star first reaches a magnitude; the row ascends with depth. */
function depthInRow(row: Float64Array, vMag: number): number {
  if ((row[0] ?? 0) >= vMag) return 0;
  for (let index = 1; index < DEPTH_COUNT; index += 1) {
    const here = row[index] ?? 0;
    if (here < vMag) continue;
    const before = row[index - 1] ?? 0;
    return DEPTH_STEP_DEG * (index - 1 + (vMag - before) / (here - before));
  }
  return NOT_SEEN_DEG;
}

/**
 * Depth of the Sun at which a star shows, by magnitude and altitude.
 * @param magnitudes ascending or not, any V
 * @returns for each magnitude one row of ALTITUDE_COUNT degrees from altitude 0 up; 0 where even a Sun on the horizon
 *   does not hide the star, NOT_SEEN_DEG where no night shows it
 */
export function depthsByAltitude(air: Air, side: HorizonSide, magnitudes: readonly number[]): Float64Array[] {
  const rows = magnitudes.map(() => new Float64Array(ALTITUDE_COUNT));
  const faintest = new Float64Array(DEPTH_COUNT);
  for (let column = 0; column < ALTITUDE_COUNT; column += 1) {
    const altitudeDeg = column * ALTITUDE_STEP_DEG;
    for (let index = 0; index < DEPTH_COUNT; index += 1) {
      faintest[index] = faintestStarMag(air, {
        altitudeDeg,
        sunAltitudeDeg: -index * DEPTH_STEP_DEG,
        azimuthDifferenceDeg: AZIMUTH_DIFFERENCE_DEG[side],
        moonNl: 0,
      });
    }
    magnitudes.forEach((vMag, row) => {
      const cells = rows[row];
      if (cells) cells[column] = depthInRow(faintest, vMag);
    });
  }
  return rows;
}

/**
 * Smallest difference in altitude between star and Sun at which the star shows while it stands at least so high and
 * moves along with the Sun: the model's own arcus visionis over a hill of that altitude.
 * @param depths one row of depthsByAltitude
 */
export function leastDifferences(depths: Float64Array): Float64Array {
  const least = new Float64Array(ALTITUDE_COUNT);
  let smallest = Number.POSITIVE_INFINITY;
  for (let column = ALTITUDE_COUNT - 1; column >= 0; column -= 1) {
    smallest = Math.min(smallest, column * ALTITUDE_STEP_DEG + (depths[column] ?? NOT_SEEN_DEG));
    least[column] = smallest;
  }
  return least;
}
