import { z } from 'zod';
import { entryWindow } from './calendars.js';
import { id } from './common.js';

/** An entry of a version that today's engine would date otherwise. */
export const engineDifference = z.strictObject({
  entryId: id,
  titleOfficer: z.string(),
  protectiveWatch: z.boolean(),
  /** As it was frozen; this is what the village goes by. */
  frozen: entryWindow.nullable(),
  today: entryWindow.nullable(),
  /** Of the day that differs most, later positive; null where one of the two has no days. */
  days: z.number().int().nullable(),
});
export type EngineDifference = z.infer<typeof engineDifference>;

/** What today's engine says of a version that an older one reckoned, as far as the person sees it. */
export const todaysEngine = z.strictObject({
  frozenBy: z.string(),
  today: z.string(),
  entryCount: z.number().int(),
  /** The largest first. */
  differences: z.array(engineDifference),
});
export type TodaysEngine = z.infer<typeof todaysEngine>;
