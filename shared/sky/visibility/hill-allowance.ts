import type { Clarity } from '../vocabulary.js';
import { EXTINCTION_OF_CLARITY } from './air.js';
import { modelValueDeg } from './model-table.js';

/** What a hill changes about the needed depth, from the model of visibility. */

/**
 * Same side: the excess e(a) by which the difference in altitude between star and Sun must grow because the star is not
 * seen below the hill [C]. Zero while the star is seen best above the hill anyway.
 * @param altitudeDeg of the hill, 0…60
 * @returns degrees, 0 or more
 */
export function hillExcessDeg(vMag: number, clarity: Clarity, altitudeDeg: number): number {
  const mag = EXTINCTION_OF_CLARITY[clarity];
  return modelValueDeg('same', mag, vMag, altitudeDeg) - modelValueDeg('same', mag, vMag, 0);
}

/**
 * Opposite side: how deep the Sun must be for the star to show just as it clears (or just before it meets) the hill.
 * @param altitudeDeg of the hill, 0…60
 * @returns degrees; NOT_SEEN_DEG and near it where the air hides the star at that altitude all night
 */
export function depthOnHillDeg(vMag: number, clarity: Clarity, altitudeDeg: number): number {
  return modelValueDeg('opposite', EXTINCTION_OF_CLARITY[clarity], vMag, altitudeDeg);
}

const HIGHEST_DEG = 20;
const HALVINGS = 12;

/**
 * Where a star that rises against the Sun first shows on flat ground, by a threshold: the Sun sinks as fast as the star
 * climbs, so it is the altitude at which the model's depth in ordinary air is the threshold's and that altitude together.
 * @param oppositeSideDeg the star's opposite-side threshold
 * @returns degrees, 0…20, to a hundredth
 */
export function showsAtDeg(vMag: number, oppositeSideDeg: number): number {
  let [low, high] = [0, HIGHEST_DEG];
  for (let step = 0; step < HALVINGS; step += 1) {
    const middle = (low + high) / 2;
    if (depthOnHillDeg(vMag, 'ordinary', middle) - middle > oppositeSideDeg) low = middle;
    else high = middle;
  }
  return high;
}
