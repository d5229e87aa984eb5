import { DEG_PER_RAD, wrapPi } from '../units/angle.js';
import { CLARITY_SHIFT_DEG } from '../visibility/clarity.js';
import { neededDepthDeg } from '../visibility/needed-depth.js';
import type { Threshold } from '../visibility/threshold-sets.js';
import type { Clarity } from '../vocabulary.js';
import { extinctionAngleDeg } from './extinction-angle.js';

/** What a place asks of the sky before a star of some brightness can be seen. */
export interface SightRule {
  threshold: Threshold;
  sameSideShiftDeg: number;
  oppositeSideShiftDeg: number;
  clarity: Clarity;
}

/** A star this high has left the thick air behind: the far half of the sky is then never the lighter one. */
const HIGH_DEG = 10;

/**
 * The depth of the Sun that is needed at one moment: the rule of the dates, applied to the star's own altitude in place
 * of the skyline's, because a star that stands higher is seen in a lighter sky.
 * @param vMag of the star; it decides what a degree of altitude is worth
 * @param altitudeDeg true altitude of the star
 * @param sunwardRad difference in azimuth between star and Sun
 */
export function neededForSightDeg(
  rule: SightRule,
  vMag: number,
  altitudeDeg: number,
  sunwardRad: number,
): number {
  const { sameSideDeg, oppositeSideDeg, followsAzimuth } = rule.threshold;
  const airDeg = CLARITY_SHIFT_DEG[rule.clarity];
  const toward = Math.cos(wrapPi(sunwardRad));
  const view = { vMag, clarity: rule.clarity, flatOppositeDeg: oppositeSideDeg + airDeg };
  const near = (thresholdDeg: number): number => {
    const inAirDeg = thresholdDeg + rule.sameSideShiftDeg + airDeg;
    return neededDepthDeg('altitude-difference', 'same', inAirDeg, altitudeDeg, view);
  };
  if (followsAzimuth)
    return near((sameSideDeg + oppositeSideDeg) / 2 + ((sameSideDeg - oppositeSideDeg) / 2) * toward);
  if (toward >= 0) return near(sameSideDeg);
  const far = Math.max(0, oppositeSideDeg + rule.oppositeSideShiftDeg + airDeg);
  return altitudeDeg > HIGH_DEG ? Math.min(far, near(sameSideDeg)) : far;
}

/** Is a star that stands over the skyline seen? Above the thick air, in a sky that is dark enough for it. */
export function isSeen(
  rule: SightRule,
  vMag: number,
  altitudeRad: number,
  sunwardRad: number,
  sunDepressionDeg: number,
): boolean {
  const altitudeDeg = altitudeRad * DEG_PER_RAD;
  if (altitudeDeg < extinctionAngleDeg(vMag, rule.clarity)) return false;
  return sunDepressionDeg >= neededForSightDeg(rule, vMag, altitudeDeg, sunwardRad);
}
