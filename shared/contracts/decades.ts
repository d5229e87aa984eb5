import { z } from 'zod';
import {
  CALENDAR_FIRST_YEAR,
  CALENDAR_LAST_YEAR,
  entryIcon,
  entryKind,
  entryWarning,
  entryWindow,
} from './calendars.js';
import { id } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';
import { versionNumber } from './versions.js';

export const LONG_LOOK_YEARS = { usual: 10, max: 20 } as const;

/** One entry's days in one of the years. */
export const lookedYear = z.strictObject({
  year: z.number().int(),
  /** Null where it has none; `warnings` say why. */
  window: entryWindow.nullable(),
  /** True where the days are the planned ones of something that is really counted from what is done. */
  isPlanned: z.boolean(),
  warnings: z.array(entryWarning),
});
export type LookedYear = z.infer<typeof lookedYear>;

export const lookedEntry = z.strictObject({
  entryId: id,
  titleVillage: z.string(),
  titleOfficer: z.string(),
  icon: entryIcon,
  kind: entryKind,
  protectiveWatch: z.boolean(),
  years: z.array(lookedYear),
});
export type LookedEntry = z.infer<typeof lookedEntry>;

export const longLook = z.strictObject({
  calendarId: id,
  /** What it goes by: a submission's number, or the draft. */
  number: z.string(),
  label: z.string().nullable(),
  placeName: z.string(),
  villageLanguageTag: z.string(),
  from: z.number().int(),
  years: z.number().int(),
  /** Those that this person sees, in their order. */
  entries: z.array(lookedEntry),
});
export type LongLook = z.infer<typeof longLook>;

const calendarYear = z.coerce
  .number('not-a-number')
  .int('calendar-year')
  .min(CALENDAR_FIRST_YEAR, 'calendar-year')
  .max(CALENDAR_LAST_YEAR, 'calendar-year');

export const decadesEndpoints = {
  read: defineEndpoint({
    id: 'readLongLook',
    method: 'GET',
    path: '/api/calendars/:calendarId/long-look',
    summary: 'The days of a version’s or a draft’s entries in many years, reckoned by today’s engine',
    access: member('calendar', ...ROLES),
    params: z.strictObject({ calendarId: id }),
    query: z.strictObject({
      from: calendarYear,
      years: z.coerce
        .number('not-a-number')
        .int('not-a-number')
        .min(1, 'years-range')
        .max(LONG_LOOK_YEARS.max, 'years-range')
        .default(LONG_LOOK_YEARS.usual),
      /** Left out: what the village goes by; where nothing is published, the draft. */
      number: versionNumber.optional(),
    }),
    response: longLook,
  }),
} as const;
