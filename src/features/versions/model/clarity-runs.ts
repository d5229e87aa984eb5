import type { Clarity } from '#shared/sky/vocabulary.js';

export interface ClarityRun {
  /** Months counted from 0; both belong to the run. */
  from: number;
  to: number;
  clarity: Clarity;
}

/** Twelve months as runs of the same air. */
export function clarityRuns(byMonth: readonly Clarity[]): ClarityRun[] {
  const runs: ClarityRun[] = [];
  byMonth.forEach((clarity, month) => {
    const last = runs.at(-1);
    if (last?.clarity === clarity) last.to = month;
    else runs.push({ from: month, to: month, clarity });
  });
  return runs;
}
