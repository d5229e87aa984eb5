import type { NeededSine } from '../phenomena/dark-arc.js';
import type { HorizonSide } from '../phenomena/phenomenon-facts.js';
import type { PreparedYear } from '../phenomena/prepared-year.js';
import { type Ground, type SkylineCrossing, sunAtCrossing } from '../phenomena/skyline-crossing.js';
import { DEG_PER_RAD, RAD_PER_DEG } from '../units/angle.js';
import type { SkylineRule } from '../vocabulary.js';
import { neededDepthDeg } from './needed-depth.js';
import type { Threshold } from './threshold-sets.js';

/**
 * The needed depth at one crossing as the closed form wants it: the sine, as a function of the Sun's longitude.
 * Only the azimuth-difference rule makes use of the longitude.
 * @param shiftDeg degrees to add to the threshold (place, clarity, end of a range)
 */
export function neededSineAt(
  year: PreparedYear,
  ground: Ground,
  crossing: SkylineCrossing,
  rule: SkylineRule,
  side: HorizonSide,
  threshold: Threshold,
  shiftDeg: number,
): NeededSine {
  const altitudeDeg = crossing.starAltitudeRad * DEG_PER_RAD;
  const sineOf = (thresholdDeg: number): number =>
    Math.sin(Math.min(90, neededDepthDeg(rule, side, thresholdDeg + shiftDeg, altitudeDeg)) * RAD_PER_DEG);
  if (!threshold.followsAzimuth) {
    const sine = sineOf(side === 'same' ? threshold.sameSideDeg : threshold.oppositeSideDeg);
    return () => sine;
  }
  const middleDeg = (threshold.sameSideDeg + threshold.oppositeSideDeg) / 2;
  const swingDeg = (threshold.sameSideDeg - threshold.oppositeSideDeg) / 2;
  return (sunLongitudeRad) => {
    const sun = sunAtCrossing(year, ground.latitude, crossing, sunLongitudeRad);
    return sineOf(middleDeg + swingDeg * Math.cos(crossing.starAzimuthRad - sun.azimuthRad));
  };
}
