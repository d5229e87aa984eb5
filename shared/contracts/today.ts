import { z } from 'zod';
import { id, isoDate } from './common.js';
import { awaitedRecord } from './event-record.js';
import { entryIcon, entryWindow } from './calendars.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';
import { skyMarkerSpec } from './sky-markers.js';
import { markerNames, occurrenceDays, occurrenceDetail, phenomenon } from './stars.js';
import { CLARITIES } from '../sky/vocabulary.js';

export const comingMarker = z.strictObject({
  marker: markerNames,
  phenomenon,
  occurrence: occurrenceDetail,
  /** Days from today to the expected day; negative once it has passed. */
  daysAway: z.number().int(),
  /** Titles of published entries that go by it. */
  leads: z.array(z.string()),
});
export type ComingMarker = z.infer<typeof comingMarker>;

/** A sign beyond a star's first and last days that a published entry goes by. */
export const comingSign = z.strictObject({
  spec: skyMarkerSpec,
  /** The star or figure of the sign, if it has one. */
  marker: markerNames.nullable(),
  occurrence: occurrenceDays,
  daysAway: z.number().int(),
  leads: z.array(z.string()),
});
export type ComingSign = z.infer<typeof comingSign>;

export const openWindow = z.strictObject({
  calendarId: id,
  entryId: id,
  titleOfficer: z.string(),
  titleVillage: z.string(),
  icon: entryIcon,
  window: entryWindow,
  ifLate: z.string(),
  otherSigns: z.string(),
  hasLastDate: z.boolean(),
  /** Year of the calendar. */
  year: z.number().int(),
  /** What counting its signs takes; left out where none is named. */
  awaits: awaitedRecord.optional(),
});
export type OpenWindow = z.infer<typeof openWindow>;

export const WAITING_KINDS = [
  'answer-entries',
  'answer-own-entries',
  'sign-as-elder',
  'sign-as-steward',
  'elder-asked-change',
  'elder-said-not-for-board',
  'review-progress',
  'ready-to-publish',
  'go-on-with-draft',
  'print-published',
] as const;

/** Something that waits for the asking person. */
export const waitingItem = z.strictObject({
  kind: z.enum(WAITING_KINDS),
  calendarId: id,
  placeName: z.string(),
  year: z.number().int(),
  number: z.number().int().nullable(),
  label: z.string().nullable(),
  entryId: id.nullable(),
  entryTitle: z.string().nullable(),
  personName: z.string().nullable(),
  note: z.string().nullable(),
  done: z.number().int(),
  of: z.number().int(),
});
export type WaitingItem = z.infer<typeof waitingItem>;

export const today = z.strictObject({
  /** The civil day at the place. */
  date: isoDate,
  /** Number of the day's hole in its year, and the row of a twelve-row board. */
  hole: z.number().int(),
  row: z.number().int(),
  placeId: id.nullable(),
  placeName: z.string().nullable(),
  clarity: z.enum(CLARITIES).nullable(),
  /** Markers to look for in the next days: range open now, or expected within `days`; else the next ones. */
  coming: z.array(comingMarker),
  comingIsLater: z.boolean(),
  comingSigns: z.array(comingSign),
  openWindows: z.array(openWindow),
  waiting: z.array(waitingItem),
  /** Consents that this person is to ask for again, or is asked about again; without what they are about. */
  consentsDue: z.number().int(),
  /** For stewards: of how many people who died something waits to be passed on. */
  heirsOpen: z.number().int(),
});
export type Today = z.infer<typeof today>;

export const todayEndpoints = {
  read: defineEndpoint({
    id: 'readToday',
    method: 'GET',
    path: '/api/communities/:communityId/today',
    summary: 'What to look for now at a place, which work is open, and what waits for this person',
    access: member('community', ...ROLES),
    params: z.strictObject({ communityId: id }),
    query: z.strictObject({ placeId: id.optional() }),
    response: today,
  }),
} as const;
