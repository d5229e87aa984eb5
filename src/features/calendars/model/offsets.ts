import { OFFSET_MAX_DAYS, type EntryOffsets } from '#shared/contracts/calendars.js';

export const OFFSETS = [
  'earliestDays',
  'bestFromDays',
  'bestToDays',
  'lastAdvisedDays',
] as const satisfies readonly (keyof EntryOffsets)[];

/** All four days moved together, as far as the count goes; the window keeps its shape. */
export function shifted(offsets: EntryOffsets, days: number): EntryOffsets {
  const step =
    days < 0
      ? Math.max(days, -OFFSET_MAX_DAYS - offsets.earliestDays)
      : Math.min(days, OFFSET_MAX_DAYS - offsets.lastAdvisedDays);
  return {
    earliestDays: offsets.earliestDays + step,
    bestFromDays: offsets.bestFromDays + step,
    bestToDays: offsets.bestToDays + step,
    lastAdvisedDays: offsets.lastAdvisedDays + step,
  };
}

/** The earliest day moved; it stops at the best days. */
export function startMoved(offsets: EntryOffsets, days: number): EntryOffsets {
  const earliestDays = Math.min(
    offsets.bestFromDays,
    Math.max(-OFFSET_MAX_DAYS, offsets.earliestDays + days),
  );
  return { ...offsets, earliestDays };
}

/** The last advised day moved; it stops at the best days. */
export function endMoved(offsets: EntryOffsets, days: number): EntryOffsets {
  const lastAdvisedDays = Math.max(
    offsets.bestToDays,
    Math.min(OFFSET_MAX_DAYS, offsets.lastAdvisedDays + days),
  );
  return { ...offsets, lastAdvisedDays };
}
