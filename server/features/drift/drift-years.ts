import { DRIFT_EPOCHS_MAX } from '#shared/contracts/drift.js';

/** Steps that people can count along. */
const STEPS = [1, 2, 5, 10, 20, 25, 50, 100] as const;

/**
 * Round years between two years, both included, as close together as the number of epochs allows.
 * @param one a year that is wanted too, where it lies between them
 */
export function driftYears(from: number, to: number, one: number | null = null): number[] {
  const room = one === null ? DRIFT_EPOCHS_MAX : DRIFT_EPOCHS_MAX - 1;
  const step = STEPS.find((each) => (to - from) / each + 2 <= room) ?? 100;
  const years = new Set([from]);
  for (let year = Math.ceil(from / step) * step; year < to; year += step) years.add(year + 0);
  if (one !== null && one > from && one < to) years.add(one);
  return [...years.add(to)].sort((a, b) => a - b);
}
