import type { Clarity } from '../vocabulary.js';

/** Degrees that the air of a month adds to every needed depth. */
export const CLARITY_SHIFT_DEG: Readonly<Record<Clarity, number>> = { clear: -1, ordinary: 0, hazy: 1 };

/** @param month 1…12 */
export function clarityOfMonth(clarityByMonth: readonly Clarity[], month: number): Clarity {
  return clarityByMonth[month - 1] ?? 'ordinary';
}
