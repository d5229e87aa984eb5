/** Above this altitude a star no longer gains from thicker air below it. */
const THICK_AIR_TOP_DEG = 5;
const EXCESS_PER_DEG = 0.6;
const LEAST_SHARE = 1 / 3;

/**
 * Depth of the Sun that is needed for a star high in the sky, where no skyline is being crossed: every degree counts
 * fully in the thick air and less above it. A plain rule for all stars; it decides which nights show a star that has no
 * dates, never a date.
 * @param thresholdDeg same-side threshold with shifts and clarity already in it
 * @param altitudeDeg of the star
 * @returns degrees, never negative
 */
export function highUpDepthDeg(thresholdDeg: number, altitudeDeg: number): number {
  const countedDeg = Math.max(0, altitudeDeg);
  const excessDeg = EXCESS_PER_DEG * Math.max(0, countedDeg - THICK_AIR_TOP_DEG);
  return Math.max(0, thresholdDeg * LEAST_SHARE, thresholdDeg - countedDeg + excessDeg);
}
