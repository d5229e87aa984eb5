import { z } from 'zod';
import { entryDates, entryKind } from './calendars.js';
import { id, instant } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { whyMoved } from './moves.js';

export const ROLLED_OUTCOMES = ['moved', 'stays', 'lost-days', 'found-days', 'without-days'] as const;

/** One entry of the new draft beside what it said the year before. */
export const rolledEntry = z.strictObject({
  entryId: id,
  titleVillage: z.string(),
  titleOfficer: z.string(),
  kind: entryKind,
  protectiveWatch: z.boolean(),
  /** As it stood when the year was rolled over. */
  before: entryDates,
  after: entryDates,
  outcome: z.enum(ROLLED_OUTCOMES),
  /** The largest move of its four days against the same days a year before; null where a year has none. */
  movedDays: z.number().int().nullable(),
  /** Somebody is to be asked again, or for the first time, before this is shown or printed in the new year. */
  needsConsent: z.boolean(),
  /** Why its days are others than the year before; left out where they are the same. */
  why: whyMoved.optional(),
});
export type RolledEntry = z.infer<typeof rolledEntry>;

export const rolloverReport = z.strictObject({
  calendarId: id,
  fromCalendarId: id,
  fromYear: z.number().int(),
  year: z.number().int(),
  placeName: z.string(),
  rolledAt: instant,
  rolledBy: z.string(),
  /** Those that this person sees, in their order. */
  entries: z.array(rolledEntry),
});
export type RolloverReport = z.infer<typeof rolloverReport>;

export const rolledCalendar = z.strictObject({
  calendarId: id,
  /** False once the new draft was submitted: from then on versions are compared. */
  hasReport: z.boolean(),
});
export type RolledCalendar = z.infer<typeof rolledCalendar>;

const params = z.strictObject({ calendarId: id });

export const rolloversEndpoints = {
  rollOver: defineEndpoint({
    id: 'rollOver',
    method: 'POST',
    path: '/api/calendars/:calendarId/next-year',
    summary: 'Begin next year’s draft from this one; sent again it is the same draft',
    access: member('calendar', 'officer'),
    params,
    response: rolledCalendar,
  }),
  read: defineEndpoint({
    id: 'readRollover',
    method: 'GET',
    path: '/api/calendars/:calendarId/rollover',
    summary: 'What the new year changed in a draft that was rolled over, until its first submission',
    access: member('calendar', 'officer', 'elder', 'steward'),
    params,
    response: rolloverReport,
  }),
} as const;
