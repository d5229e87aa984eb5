import type { NeededDepth } from '../phenomena/dark-arc.js';
import type { HorizonSide } from '../phenomena/phenomenon-facts.js';
import type { PreparedYear } from '../phenomena/prepared-year.js';
import { type Ground, type SkylineCrossing, sunAtCrossing } from '../phenomena/skyline-crossing.js';
import { DEG_PER_RAD, RAD_PER_DEG } from '../units/angle.js';
import type { SkylineRule } from '../vocabulary.js';
import { type HillView, neededDepthDeg } from './needed-depth.js';
import type { Threshold } from './threshold-sets.js';

/** A depth that does not depend on where the Sun stands. */
class FixedDepth implements NeededDepth {
  constructor(private readonly sine: number) {}

  sineAt(): number {
    return this.sine;
  }
}

/** What a star asks for at its crossings, whatever the crossing. */
export interface Need {
  rule: SkylineRule;
  side: HorizonSide;
  threshold: Threshold;
  /** Degrees to add to the threshold: place, clarity and end of a range together. */
  shiftDeg: number;
  hill: HillView;
}

/** A depth that follows the difference in azimuth between star and Sun, by a cosine [Vogt1920 p. 37]. */
class AzimuthDepth implements NeededDepth {
  constructor(
    private readonly year: PreparedYear,
    private readonly ground: Ground,
    private readonly crossing: SkylineCrossing,
    private readonly need: Need,
  ) {}

  sineAt(sunLongitudeRad: number): number {
    const { sameSideDeg, oppositeSideDeg } = this.need.threshold;
    const sun = sunAtCrossing(this.year, this.ground.latitude, this.crossing, sunLongitudeRad);
    const cosine = Math.cos(this.crossing.starAzimuthRad - sun.azimuthRad);
    const middleDeg = (sameSideDeg + oppositeSideDeg) / 2;
    const swingDeg = (sameSideDeg - oppositeSideDeg) / 2;
    return sineOfNeeded(this.need, middleDeg + swingDeg * cosine, this.crossing);
  }
}

function sineOfNeeded(need: Need, thresholdDeg: number, crossing: SkylineCrossing): number {
  const altitudeDeg = crossing.starAltitudeRad * DEG_PER_RAD;
  const depthDeg = neededDepthDeg(need.rule, need.side, thresholdDeg + need.shiftDeg, altitudeDeg, need.hill);
  return Math.sin(Math.min(90, depthDeg) * RAD_PER_DEG);
}

/** The needed depth at one crossing in the form that the closed form wants. */
export function neededAtCrossing(
  year: PreparedYear,
  ground: Ground,
  crossing: SkylineCrossing,
  need: Need,
): NeededDepth {
  if (need.threshold.followsAzimuth) return new AzimuthDepth(year, ground, crossing, need);
  const { sameSideDeg, oppositeSideDeg } = need.threshold;
  return new FixedDepth(sineOfNeeded(need, need.side === 'same' ? sameSideDeg : oppositeSideDeg, crossing));
}
