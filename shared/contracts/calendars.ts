import { z } from 'zod';
import { id, instant, isoDate, line, listOf, monthDay, rowVersion, text } from './common.js';
import { defineEndpoint, member, signedIn } from './endpoint.js';
import { actualDays } from './actual-days.js';
import { entryLead } from './entry-lead.js';
import { eventRecord } from './event-record.js';
import { villageWord } from './village-word.js';
import { ROLES } from './people.js';
import { groupFitsLevel, PLAIN_DETAILS, sharingDetails, sharingLevel } from './sharing.js';
import { occurrenceDays } from './stars.js';
import {
  PHENOMENON_OUTCOMES,
  SKY_MARKER_OUTCOMES,
  SKY_MARKER_REASONS,
  STAR_OUTCOMES,
} from '../sky/vocabulary.js';

export { entryLead, type EntryLead } from './entry-lead.js';

/** Calendars are made for these civil Gregorian years. */
export const CALENDAR_FIRST_YEAR = 1900;
export const CALENDAR_LAST_YEAR = 2200;
export const ENTRIES_MAX = 500;
export const OFFSET_MAX_DAYS = 366;

export const ENTRY_KINDS = [
  'farm',
  'herd-fish-gather',
  'household',
  'community',
  'belief',
  'safety',
  'marker-only',
] as const;
export const entryKind = z.enum(ENTRY_KINDS);
export type EntryKind = (typeof ENTRY_KINDS)[number];

/** Pictures that an entry can carry; the drawings have the same keys. */
export const ENTRY_ICONS = [
  'seed',
  'sow',
  'plant',
  'weed',
  'hoe',
  'mend',
  'manure',
  'water',
  'harvest',
  'store',
  'herd',
  'fish',
  'gather',
  'rain',
  'bird',
  'blossom',
  'frost',
  'fire',
  'feast',
  'lamp',
  'caution',
  'community',
  'household',
] as const;
export const entryIcon = z.enum(ENTRY_ICONS);
export type EntryIcon = (typeof ENTRY_ICONS)[number];

const offsetDays = z
  .number('not-a-number')
  .int('whole-days')
  .min(-OFFSET_MAX_DAYS, 'offset-range')
  .max(OFFSET_MAX_DAYS, 'offset-range');

/** Days from the leading day (the marker's expected day, or the fixed date); in order. */
export const entryOffsets = z
  .strictObject({
    earliestDays: offsetDays,
    bestFromDays: offsetDays,
    bestToDays: offsetDays,
    lastAdvisedDays: offsetDays,
  })
  .superRefine((offsets, context) => {
    const order = ['earliestDays', 'bestFromDays', 'bestToDays', 'lastAdvisedDays'] as const;
    order.forEach((name, index) => {
      const before = order[index - 1];
      if (before !== undefined && offsets[name] < offsets[before]) {
        context.addIssue({ code: 'custom', path: [name], message: 'window-order' });
      }
    });
    if (offsets.lastAdvisedDays - offsets.earliestDays > 365) {
      context.addIssue({ code: 'custom', path: ['lastAdvisedDays'], message: 'window-too-long' });
    }
  });
export type EntryOffsets = z.infer<typeof entryOffsets>;

export const fixedLastDate = z.strictObject({ date: monthDay, source: line(200, 1) });
export type FixedLastDate = z.infer<typeof fixedLastDate>;

const entryFields = z.strictObject({
  titleVillage: line(120),
  titleOfficer: line(120, 1),
  kind: entryKind,
  /** What the village calls this kind; left out where it keeps the usual name. Rules go by the kind alone. */
  kindWord: villageWord.optional(),
  icon: entryIcon,
  crop: line(120),
  notes: text(2000),
  caution: text(500),
  lead: entryLead,
  offsets: entryOffsets,
  /** Sowing, grazing, ice, burning: the responsible office's date counts where it is earlier. */
  hasLastDate: z.boolean(),
  lastDate: fixedLastDate.nullable(),
  /** Frost, flood, birds: a watch is never shortened. */
  protectiveWatch: z.boolean(),
  otherSigns: text(500),
  ifLate: text(500),
  giver: line(120),
  /** The giver, where they are one of the village's people here: then it is theirs to tighten and to take back. */
  giverId: id.nullable().optional(),
  agreedToPrint: z.boolean(),
  sharingLevel,
  /** Which timing drives the board where there are variants; the reason is for keepers to read. Left out for the entry's own. */
  board: z
    .strictObject({
      shows: z.enum(['entry', 'variant', 'both']),
      variantId: id.nullable(),
      reason: line(300, 1),
    })
    .optional(),
  /** Beside the level; left out where there is nothing to say, so that older texts and hashes stay as they are. */
  sharing: sharingDetails.optional(),
  /** What else an event needs; left out where nothing of it is said. */
  record: eventRecord.optional(),
});

/** What an officer writes; everything that elders answer to. */
export const entryInput = entryFields.superRefine((entry, context) => {
  if (entry.hasLastDate && entry.lastDate === null) {
    context.addIssue({ code: 'custom', path: ['lastDate'], message: 'last-date-required' });
  }
  if (!entry.hasLastDate && entry.lastDate !== null) {
    context.addIssue({ code: 'custom', path: ['hasLastDate'], message: 'last-date-not-marked' });
  }
  if (entry.hasLastDate && entry.protectiveWatch) {
    context.addIssue({ code: 'custom', path: ['protectiveWatch'], message: 'watch-or-last-date' });
  }
  const { groupId } = entry.sharing ?? PLAIN_DETAILS;
  groupFitsLevel({ level: entry.sharingLevel, groupId }, (message) => {
    context.addIssue({ code: 'custom', path: ['sharing', 'groupId'], message });
  });
});
export type EntryInput = z.infer<typeof entryInput>;

export const entryUpdate = z.strictObject({ content: entryInput, version: rowVersion });
export type EntryUpdate = z.infer<typeof entryUpdate>;

export const ENTRY_WARNINGS = [
  'no-lead-yet',
  'no-date-this-year',
  'star-does-not-serve',
  'sign-not-here',
  'one-occurrence-only',
  'weak-marker',
  'never-disappears',
  'lost-in-light-nights',
  'window-closed-by-last-date',
  'window-shortened-by-last-date',
  'belief-not-agreed-to-print',
  'windows-overlap',
  'waits-for-actual-day',
  'anchor-without-days',
  'anchor-gone',
] as const;
export const entryWarning = z.enum(ENTRY_WARNINGS);
export type EntryWarning = (typeof ENTRY_WARNINGS)[number];

/** What is told beside an entry's own warnings: it rests on the rest of the draft, on the place and on the sky. */
export const ENTRY_ADVICE = [
  'same-people',
  'crop-not-ripe',
  'crop-long-ripe',
  'cloudy-season',
  'moonlit',
  'drifted',
  'no-safety-line',
] as const;
const entryAdvice = z.enum(ENTRY_ADVICE);

export const entryWindow = z.strictObject({
  earliest: isoDate,
  bestFrom: isoDate,
  bestTo: isoDate,
  lastAdvised: isoDate,
  /** Which of the two gave `lastAdvised`. */
  lastAdvisedBy: z.enum(['offset', 'fixed']),
});
export type EntryWindow = z.infer<typeof entryWindow>;

/** From what the window is counted, where it is not a computed day or a fixed date. */
const countedDays = z.strictObject({
  basis: z.enum(['seen', 'usual', 'planned', 'actual', 'waiting', 'gone']),
  from: isoDate.nullable(),
  to: isoDate.nullable(),
  /** The other counting: as computed beside as seen, as planned beside as done or while it waits. */
  beside: entryWindow.nullable(),
});

/** What the engine and the calendar rules make of an entry; kept unchanged in a version. */
export const entryDates = z.strictObject({
  starOutcome: z.enum(STAR_OUTCOMES).nullable(),
  phenomenonOutcome: z.enum(PHENOMENON_OUTCOMES).nullable(),
  /** Only where a sign beyond a star's first and last days leads, so that what was frozen before it stays as it is. */
  sky: z
    .strictObject({ outcome: z.enum(SKY_MARKER_OUTCOMES), reason: z.enum(SKY_MARKER_REASONS).nullable() })
    .optional(),
  /** The occurrence that leads; null for a fixed date or where there is none. */
  marker: occurrenceDays.nullable(),
  /** Only where it is counted from something else, so that what was frozen before stays as it is. */
  counted: countedDays.optional(),
  /** Null where the leading marker has no date, or the last date closes the window. */
  window: entryWindow.nullable(),
  warnings: z.array(entryWarning),
});
export type EntryDates = z.infer<typeof entryDates>;

export const entry = z.strictObject({
  id,
  calendarId: id,
  position: z.number().int().min(0),
  version: rowVersion,
  content: entryInput,
  dates: entryDates,
  updatedBy: z.string(),
  updatedAt: instant,
  /** The asking person's own, to write on: of a kept thing its giver's, else the officers'. */
  mine: z.boolean(),
  /** Of the time before there were records: it goes to the elders without one. Left out of every other. */
  isOlder: z.literal(true).optional(),
  /** When it was really done, where that is known. */
  actual: actualDays.optional(),
  /** What else to look at; left out where there is nothing. */
  advice: z.array(entryAdvice).optional(),
});
export type Entry = z.infer<typeof entry>;

/** Entries that their people keep to themselves stand in the count, where their givers chose an empty slot. */
export const entryList = listOf(entry).extend({ keptCount: z.number().int().min(0) });
export type EntryList = z.infer<typeof entryList>;

export const calendarInput = z.strictObject({
  placeId: id,
  year: z
    .number('not-a-number')
    .int()
    .min(CALENDAR_FIRST_YEAR, 'calendar-year')
    .max(CALENDAR_LAST_YEAR, 'calendar-year'),
});
export type CalendarInput = z.infer<typeof calendarInput>;

export const calendar = z.strictObject({
  id,
  communityId: id,
  communityName: z.string(),
  placeId: id,
  placeName: z.string(),
  year: z.number().int(),
  /** True while a submission is in review or signed off: the draft cannot be edited. */
  locked: z.boolean(),
  /** Number of the submission that is out, for those who may see it. */
  outNumber: z.number().int().nullable(),
  published: z.strictObject({ number: z.number().int(), label: z.string() }).nullable(),
  entryCount: z.number().int(),
  updatedAt: instant,
  /** Of a draft that began as this year’s and was never submitted, for those who see it: what changed can be read. */
  rolledFromYear: z.number().int().optional(),
});
export type Calendar = z.infer<typeof calendar>;

const calendarParams = z.strictObject({ calendarId: id });
const entryParams = z.strictObject({ calendarId: id, entryId: id });
const draftReaders = ['officer', 'elder', 'steward'] as const;

export const calendarsEndpoints = {
  list: defineEndpoint({
    id: 'listCalendars',
    method: 'GET',
    path: '/api/calendars',
    summary: 'Calendars of all communities of the person',
    access: signedIn,
    readAsHelped: true,
    query: z.strictObject({ communityId: id.optional() }),
    response: listOf(calendar),
  }),
  create: defineEndpoint({
    id: 'createCalendar',
    method: 'POST',
    path: '/api/communities/:communityId/calendars',
    summary: 'Begin the calendar of a place and a civil year',
    access: member('community', 'officer'),
    params: z.strictObject({ communityId: id }),
    body: calendarInput,
    response: calendar,
    status: 201,
  }),
  read: defineEndpoint({
    id: 'readCalendar',
    method: 'GET',
    path: '/api/calendars/:calendarId',
    summary: 'One calendar and what is out or published of it',
    access: member('calendar', ...ROLES),
    params: calendarParams,
    response: calendar,
  }),
  listEntries: defineEndpoint({
    id: 'listEntries',
    method: 'GET',
    path: '/api/calendars/:calendarId/entries',
    summary: 'Entries of the draft with their dates, as far as the person may see them',
    access: member('calendar', ...draftReaders),
    params: calendarParams,
    response: entryList,
  }),
  addEntry: defineEndpoint({
    id: 'addEntry',
    method: 'POST',
    path: '/api/calendars/:calendarId/entries',
    summary: 'Add an entry to the draft',
    access: member('calendar', 'officer', 'elder'),
    countsOnce: true,
    params: calendarParams,
    body: entryInput,
    response: entry,
    status: 201,
  }),
  updateEntry: defineEndpoint({
    id: 'updateEntry',
    method: 'PUT',
    path: '/api/calendars/:calendarId/entries/:entryId',
    summary: 'Save an entry; 409 with both states when somebody saved a newer one',
    access: member('calendar', 'officer', 'elder'),
    countsOnce: true,
    params: entryParams,
    body: entryUpdate,
    response: entry,
  }),
  duplicateEntry: defineEndpoint({
    id: 'duplicateEntry',
    method: 'POST',
    path: '/api/calendars/:calendarId/entries/:entryId/copy',
    summary: 'Put a copy behind the entry',
    access: member('calendar', 'officer', 'elder'),
    countsOnce: true,
    params: entryParams,
    response: entry,
    status: 201,
  }),
  deleteEntry: defineEndpoint({
    id: 'deleteEntry',
    method: 'DELETE',
    path: '/api/calendars/:calendarId/entries/:entryId',
    summary: 'Take an entry out of the draft; it can be put back',
    access: member('calendar', 'officer', 'elder'),
    countsOnce: true,
    params: entryParams,
  }),
  restoreEntry: defineEndpoint({
    id: 'restoreEntry',
    method: 'POST',
    path: '/api/calendars/:calendarId/entries/:entryId/restore',
    summary: 'Put an entry back that was taken out',
    access: member('calendar', 'officer', 'elder'),
    countsOnce: true,
    params: entryParams,
    response: entry,
  }),
  reorderEntries: defineEndpoint({
    id: 'reorderEntries',
    method: 'PUT',
    path: '/api/calendars/:calendarId/order',
    summary: 'Set the order of the entries; the list must name each entry that the person sees once',
    access: member('calendar', 'officer'),
    countsOnce: true,
    params: calendarParams,
    body: z.strictObject({ entryIds: z.array(id).max(ENTRIES_MAX) }),
    response: entryList,
  }),
} as const;
