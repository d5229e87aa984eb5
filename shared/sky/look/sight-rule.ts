import type { Air } from '../visibility/air.js';
import { CLARITY_SHIFT_DEG } from '../visibility/clarity.js';
import { faintestStarMag } from '../visibility/faintest-star.js';
import { AZIMUTH_DIFFERENCE_DEG } from '../visibility/model-depths.js';
import { type DepthPair, thresholdOf } from '../visibility/threshold-sets.js';
import type { Clarity, ThresholdSetId } from '../vocabulary.js';

/** What a place and its air ask before a star shows. */
export interface Seeing {
  air: Air;
  clarity: Clarity;
  thresholdSet: ThresholdSetId;
  sameSideShiftDeg: number;
}

/** A star's chances at one moment. Angles in degrees, without refraction. */
export interface SightMoment {
  altitudeDeg: number;
  sunAltitudeDeg: number;
  /** Between star and Sun. */
  azimuthDifferenceDeg: number;
  /** Light of the Moon there, nanolamberts. */
  moonNl: number;
}

/** Tells of one star whether it shows. */
export interface Sight {
  /** Magnitudes to spare; the star shows from 0 up. −Infinity below the mathematical horizon. */
  spareMag(moment: SightMoment): number;
}

/** Stars are seen best below this altitude when they move along with the Sun. */
const BEST_BELOW_DEG = 20;
const STEP_DEG = 0.25;

/**
 * The model of visibility says how light, air and altitude play together; the place's own rule says how much the eyes there
 * need. Both are joined by one offset in magnitudes: over flat ground a star that moves along with the Sun just shows, at its
 * best altitude, when the two stand apart by the rule's arcus visionis. So a watch agrees with the dates.
 * @param override depths that replace those of the magnitude, for figures
 */
export function sightOf(seeing: Seeing, vMag: number, override: DepthPair | null): Sight {
  const { air, clarity, thresholdSet, sameSideShiftDeg } = seeing;
  const { sameSideDeg } = thresholdOf(thresholdSet, vMag, override);
  const apartDeg = Math.max(0, sameSideDeg + sameSideShiftDeg + CLARITY_SHIFT_DEG[clarity]);
  const neededMag = faintestMovingAlong(air, apartDeg);
  return { spareMag: (moment) => faintestStarMag(air, moment) - neededMag };
}

/** Faintest star that the model lets show on flat ground, at any altitude, so many degrees above the Sun. */
function faintestMovingAlong(air: Air, apartDeg: number): number {
  let faintest = Number.NEGATIVE_INFINITY;
  for (let altitudeDeg = 0; altitudeDeg <= BEST_BELOW_DEG; altitudeDeg += STEP_DEG) {
    const here = faintestStarMag(air, {
      altitudeDeg,
      sunAltitudeDeg: altitudeDeg - apartDeg,
      azimuthDifferenceDeg: AZIMUTH_DIFFERENCE_DEG.same,
      moonNl: 0,
    });
    faintest = Math.max(faintest, here);
  }
  return faintest;
}
