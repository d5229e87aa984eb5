import { DRIFT_EPOCHS_MAX } from '#shared/contracts/drift.js';

/** Steps that people can count along. */
const STEPS = [1, 2, 5, 10, 20, 25, 50, 100] as const;

/** Round years between two years, both included, as close together as the number of epochs allows. */
export function driftYears(from: number, to: number): number[] {
  const step = STEPS.find((each) => (to - from) / each + 2 <= DRIFT_EPOCHS_MAX) ?? 100;
  const years = new Set([from]);
  for (let year = Math.ceil(from / step) * step; year < to; year += step) years.add(year + 0);
  return [...years.add(to)].sort((a, b) => a - b);
}
