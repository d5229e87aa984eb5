import type { HorizonSide } from '../phenomena/phenomenon-facts.js';
import type { Clarity, SkylineRule } from '../vocabulary.js';
import { depthOnHillDeg, hillExcessDeg } from './hill-allowance.js';

/** No hill makes a star visible by day: a third of the threshold always remains. */
const LEAST_SHARE = 1 / 3;

/** What a hill means for one star: its brightness, the air, and the depth that flat ground asks for. */
export interface HillView {
  vMag: number;
  clarity: Clarity;
  /** Opposite-side threshold of the star in this air, without the place's shift and the width of a range. */
  flatOppositeDeg: number;
}

/**
 * The depth of the Sun that is needed at the moment a star crosses the skyline.
 *
 * Depth at the crossing: the threshold itself, at any altitude.
 *
 * Altitude difference, on the same side: a star that clears a hill already stands above the thick air and moves together
 * with the Sun, so its altitude counts, less the excess of the model of visibility.
 *
 * Altitude difference, on the opposite side: star and Sun move against each other, and a rising (or setting) counts as
 * seen when the star shows at the skyline and not only higher up. On flat ground the threshold says how high that is:
 * while the star climbs out of the haze the Sun sinks as far. A hill lower than that changes nothing about the evening,
 * so at its crossing the Sun is deeper by the hill's own altitude; a higher hill asks for the depth at which the star
 * shows on the hill. Whichever asks for less is the rule. On a flat horizon all agree.
 * @param thresholdDeg arcus visionis with shifts, clarity and range already in it
 * @param skylineAltitudeDeg altitude of the skyline at the crossing
 * @returns degrees, never negative: a Sun above the horizon is not dark
 */
export function neededDepthDeg(
  rule: SkylineRule,
  side: HorizonSide,
  thresholdDeg: number,
  skylineAltitudeDeg: number,
  hill: HillView,
): number {
  if (rule === 'depth-at-crossing' || skylineAltitudeDeg <= 0) return Math.max(0, thresholdDeg);
  const { vMag, clarity, flatOppositeDeg } = hill;
  const changeDeg =
    side === 'same'
      ? hillExcessDeg(vMag, clarity, skylineAltitudeDeg) - skylineAltitudeDeg
      : Math.min(skylineAltitudeDeg, depthOnHillDeg(vMag, clarity, skylineAltitudeDeg) - flatOppositeDeg);
  return Math.max(0, thresholdDeg * LEAST_SHARE, thresholdDeg + changeDeg);
}
