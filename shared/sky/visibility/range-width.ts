import type { HorizonSide } from '../phenomena/phenomenon-facts.js';

/** Extra width of acronychal risings and cosmical settings, which are seen less sharply [Schaefer1987]. */
const OPPOSITE_SIDE_EXTRA_DEG = 1;

/**
 * Half the width, in degrees of depth, of the range that holds the date in about eight seasons of ten.
 * Fainter stars depend more on the air and on the eye.
 */
export function rangeHalfWidthDeg(vMag: number, side: HorizonSide): number {
  const byMagnitude = vMag < 0 ? 1.5 : vMag < 1.5 ? 2 : vMag < 2.5 ? 2.5 : 3;
  return side === 'opposite' ? byMagnitude + OPPOSITE_SIDE_EXTRA_DEG : byMagnitude;
}
