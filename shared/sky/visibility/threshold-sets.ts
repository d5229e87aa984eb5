import type { ThresholdSetId } from '../vocabulary.js';

/**
 * How deep the Sun must be for a star of a given brightness (arcus visionis), by published rules.
 * Convention of all sets: star and Sun both without refraction, the Sun's centre, the star on the mathematical
 * horizon. Thresholds of another convention must never be mixed in; "apparent horizon" values differ by half a degree.
 */

export const THRESHOLD_CONVENTION = 'both unrefracted, Sun’s centre, star on the mathematical horizon';

export interface ThresholdSetFacts {
  id: ThresholdSetId;
  version: number;
  /** Keys of SOURCES.md. */
  source: string;
}

export const THRESHOLD_SET_FACTS: Readonly<Record<ThresholdSetId, ThresholdSetFacts>> = {
  'three-class': { id: 'three-class', version: 1, source: 'Ideler 1819 after Ptolemy, in Vogt 1920 p. 17' },
  'linear-magnitude': {
    id: 'linear-magnitude',
    version: 1,
    source:
      '10.5 + 1.4 V, usually credited to Purrington 1988; 4° less on the opposite side after Vogt 1920 p. 37–39',
  },
  'azimuth-difference': {
    id: 'azimuth-difference',
    version: 1,
    source: 'Vogt 1920 p. 37 for the first class; fainter classes fitted to Ideler’s values at 0° and 180°',
  },
};

/** A star's needed depths before the place's shifts, the month's clarity and the width of ranges. */
export interface Threshold {
  sameSideDeg: number;
  oppositeSideDeg: number;
  /**
   * True where the depth follows the difference in azimuth between star and Sun: the two values then hold at 0° and
   * 180°, with a cosine between them.
   */
  followsAzimuth: boolean;
  /** True beyond the magnitudes that the source covers. */
  extrapolated: boolean;
}

export interface DepthPair {
  sameSideDeg: number;
  oppositeSideDeg: number;
}

const FIRST_CLASS_BELOW_MAG = 1.65;
const SECOND_CLASS_TO_MAG = 2.5;
const THIRD_CLASS_TO_MAG = 3.5;
/** The slope of the linear rule continues the classes beyond the third. */
const DEG_PER_MAG = 1.4;

const FIRST_CLASS: DepthPair = { sameSideDeg: 11, oppositeSideDeg: 7 };
const FIRST_CLASS_BY_AZIMUTH: DepthPair = { sameSideDeg: 11.5, oppositeSideDeg: 6.5 };

function classDepths(vMag: number, first: DepthPair): DepthPair {
  if (vMag < FIRST_CLASS_BELOW_MAG) return first;
  if (vMag <= SECOND_CLASS_TO_MAG) return { sameSideDeg: 14, oppositeSideDeg: 8.5 };
  const fainterDeg = DEG_PER_MAG * Math.max(0, vMag - THIRD_CLASS_TO_MAG);
  return { sameSideDeg: 16 + fainterDeg, oppositeSideDeg: 10 + fainterDeg };
}

function linearDepths(vMag: number): DepthPair {
  const sameSideDeg = 10.5 + DEG_PER_MAG * vMag;
  return { sameSideDeg, oppositeSideDeg: sameSideDeg - 4 };
}

/**
 * The threshold of a star, or of a figure whose class is overridden.
 * @param vMag visual magnitude
 * @param override depths that replace those of the magnitude; they count as within the source
 */
export function thresholdOf(set: ThresholdSetId, vMag: number, override: DepthPair | null): Threshold {
  const followsAzimuth = set === 'azimuth-difference';
  if (override) {
    const { sameSideDeg, oppositeSideDeg } = override;
    return { sameSideDeg, oppositeSideDeg, followsAzimuth, extrapolated: false };
  }
  const depths =
    set === 'linear-magnitude'
      ? linearDepths(vMag)
      : classDepths(vMag, followsAzimuth ? FIRST_CLASS_BY_AZIMUTH : FIRST_CLASS);
  const { sameSideDeg, oppositeSideDeg } = depths;
  return {
    sameSideDeg,
    oppositeSideDeg,
    followsAzimuth,
    extrapolated: set !== 'linear-magnitude' && vMag > THIRD_CLASS_TO_MAG,
  };
}
