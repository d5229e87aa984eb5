import type { NeededDepth } from '../phenomena/dark-arc.js';
import type { HorizonSide } from '../phenomena/phenomenon-facts.js';
import type { PreparedYear } from '../phenomena/prepared-year.js';
import { type Ground, type SkylineCrossing, sunAtCrossing } from '../phenomena/skyline-crossing.js';
import { DEG_PER_RAD, RAD_PER_DEG } from '../units/angle.js';
import type { SkylineRule } from '../vocabulary.js';
import { neededDepthDeg } from './needed-depth.js';
import type { Threshold } from './threshold-sets.js';

/** A depth that does not depend on where the Sun stands. */
class FixedDepth implements NeededDepth {
  constructor(private readonly sine: number) {}

  sineAt(): number {
    return this.sine;
  }
}

/** A depth that follows the difference in azimuth between star and Sun, by a cosine [Vogt1920 p. 37]. */
class AzimuthDepth implements NeededDepth {
  constructor(
    private readonly year: PreparedYear,
    private readonly ground: Ground,
    private readonly crossing: SkylineCrossing,
    private readonly rule: SkylineRule,
    private readonly side: HorizonSide,
    /** Threshold at a difference of 90°, shifts included. */
    private readonly middleDeg: number,
    private readonly swingDeg: number,
  ) {}

  sineAt(sunLongitudeRad: number): number {
    const sun = sunAtCrossing(this.year, this.ground.latitude, this.crossing, sunLongitudeRad);
    const thresholdDeg =
      this.middleDeg + this.swingDeg * Math.cos(this.crossing.starAzimuthRad - sun.azimuthRad);
    return sineOfNeeded(this.rule, this.side, thresholdDeg, this.crossing);
  }
}

function sineOfNeeded(
  rule: SkylineRule,
  side: HorizonSide,
  thresholdDeg: number,
  crossing: SkylineCrossing,
): number {
  const depthDeg = neededDepthDeg(rule, side, thresholdDeg, crossing.starAltitudeRad * DEG_PER_RAD);
  return Math.sin(Math.min(90, depthDeg) * RAD_PER_DEG);
}

/**
 * The needed depth at one crossing in the form that the closed form wants.
 * @param shiftDeg degrees to add to the threshold (place, clarity, end of a range)
 */
export function neededAtCrossing(
  year: PreparedYear,
  ground: Ground,
  crossing: SkylineCrossing,
  rule: SkylineRule,
  side: HorizonSide,
  threshold: Threshold,
  shiftDeg: number,
): NeededDepth {
  const { sameSideDeg, oppositeSideDeg } = threshold;
  if (threshold.followsAzimuth) {
    const middleDeg = (sameSideDeg + oppositeSideDeg) / 2 + shiftDeg;
    return new AzimuthDepth(
      year,
      ground,
      crossing,
      rule,
      side,
      middleDeg,
      (sameSideDeg - oppositeSideDeg) / 2,
    );
  }
  const thresholdDeg = (side === 'same' ? sameSideDeg : oppositeSideDeg) + shiftDeg;
  return new FixedDepth(sineOfNeeded(rule, side, thresholdDeg, crossing));
}
