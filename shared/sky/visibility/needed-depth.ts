import type { HorizonSide } from '../phenomena/phenomenon-facts.js';
import type { SkylineRule } from '../vocabulary.js';

/** Above this altitude a star no longer gains from thicker air below it. */
const THICK_AIR_TOP_DEG = 5;
const EXCESS_PER_DEG = 0.6;
/** No hill makes a star visible by day: a third of the threshold always remains. */
const LEAST_SHARE = 1 / 3;

/**
 * The depth of the Sun that is needed at the moment a star crosses the skyline.
 *
 * Depth at the crossing: the threshold itself, at any altitude. Altitude difference, for the same side only: a star
 * that clears a hill already stands above the thick air and moves together with the Sun, so the altitude counts; on
 * the opposite side the Sun moves against the star and the threshold stays. On a flat horizon both rules agree.
 * @param thresholdDeg arcus visionis with shifts, clarity and range already in it
 * @param skylineAltitudeDeg altitude of the skyline at the crossing
 * @returns degrees, never negative: a Sun above the horizon is not dark
 */
export function neededDepthDeg(
  rule: SkylineRule,
  side: HorizonSide,
  thresholdDeg: number,
  skylineAltitudeDeg: number,
): number {
  if (rule === 'depth-at-crossing' || side === 'opposite') return Math.max(0, thresholdDeg);
  const altitudeDeg = Math.max(0, skylineAltitudeDeg);
  const excessDeg = EXCESS_PER_DEG * Math.max(0, altitudeDeg - THICK_AIR_TOP_DEG);
  return Math.max(0, thresholdDeg * LEAST_SHARE, thresholdDeg - altitudeDeg + excessDeg);
}
