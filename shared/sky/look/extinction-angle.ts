import type { Clarity } from '../vocabulary.js';

/**
 * The lowest altitude at which a star shows on a dark night: below it the thick air takes its light [Schaefer1993,
 * through the note on methods; Thom's rule of about one degree a magnitude is its rough form]. Degrees for V −1.46, 0,
 * 1, 2, 3 and 4 at an extinction of 0.20, 0.25 and 0.30 magnitudes per airmass.
 */
const MAGNITUDES = [-1.46, 0, 1, 2, 3, 4] as const;
const ANGLES_DEG: Readonly<Record<Clarity, readonly number[]>> = {
  clear: [0.1, 0.1, 0.3, 0.7, 1.3, 2.6],
  ordinary: [0.4, 0.8, 1.1, 1.6, 2.4, 4.0],
  hazy: [1.0, 1.4, 1.8, 2.4, 3.3, 5.1],
};

/**
 * @param vMag visual magnitude; beyond the table the last slope goes on for fainter stars
 * @returns degrees of true altitude
 */
export function extinctionAngleDeg(vMag: number, clarity: Clarity): number {
  const angles = ANGLES_DEG[clarity];
  let right = 1;
  while (right < MAGNITUDES.length - 1 && (MAGNITUDES[right] ?? 0) < vMag) right += 1;
  const [leftMag, rightMag] = [MAGNITUDES[right - 1] ?? 0, MAGNITUDES[right] ?? 1];
  const [leftDeg, rightDeg] = [angles[right - 1] ?? 0, angles[right] ?? 0];
  const share = Math.max(0, (vMag - leftMag) / (rightMag - leftMag));
  return leftDeg + share * (rightDeg - leftDeg);
}
