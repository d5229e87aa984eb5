import { z } from 'zod';

/** What can move a day; the rules say the same in `shared/calendar/day-grounds.ts`. */
export const MOVE_CAUSES = [
  'year',
  'place',
  'skyline',
  'threshold',
  'figure',
  'engine',
  'lead',
  'seen',
  'anchor',
  'offsets',
  'last-date',
] as const;
export type MoveCause = (typeof MOVE_CAUSES)[number];

const days = z.number().int();

/** Why an entry's days are not those of the other side. */
export const whyMoved = z.strictObject({
  /** The day that moved most, later positive; null where the days were gained or lost altogether. */
  moved: z
    .strictObject({ point: z.enum(['earliest', 'bestFrom', 'bestTo', 'lastAdvised']), days })
    .nullable(),
  /** Each with what it does alone, the strongest first; null days where it alone gives or takes them altogether. */
  causes: z.array(z.strictObject({ cause: z.enum(MOVE_CAUSES), days: days.nullable() })),
  /** What several do together beyond that. */
  togetherDays: days,
});
export type WhyMoved = z.infer<typeof whyMoved>;
