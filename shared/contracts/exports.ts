import { z } from 'zod';
import { id, instant, isoDate, listOf, queryNumber } from './common.js';
import { anybody, defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';
import { versionNumber } from './versions.js';

export const ALARM_MAX_DAYS = 60;

/** Nobody is rung up unless they ask for it: `alarmDays` is how many days ahead. */
export const icsQuery = z.strictObject({
  alarmDays: queryNumber((number) => number.int('whole-days').min(0).max(ALARM_MAX_DAYS)).optional(),
});
export type IcsQuery = z.infer<typeof icsQuery>;

/** Languages in which tables are written. */
export const CSV_LANGUAGES = ['en', 'es', 'fr', 'pt', 'sw'] as const;

/** `mark` puts the sign of UTF-8 in front, by which spreadsheets read letters of all scripts. */
export const csvQuery = z.strictObject({
  mark: z.enum(['yes', 'no']).default('yes'),
  /** Of the titles of its columns and of what it says about the file; codes are the same in all. */
  language: z.enum(CSV_LANGUAGES).default('en'),
});
export type CsvQuery = z.infer<typeof csvQuery>;

/** Addresses that one person has in one village, for as many devices. */
export const FEEDS_MAX = 5;

export const feed = z.strictObject({
  id,
  madeAt: instant,
  /** The village's day on which something last fetched it; null where nothing has. */
  fetchedOn: isoDate.nullable(),
});
export type Feed = z.infer<typeof feed>;
/** With the key, which is shown once. */
export const madeFeed = feed.extend({ key: z.string() });
export type MadeFeed = z.infer<typeof madeFeed>;

/** What would go along beside the calendar itself, and what of its voices and pictures stays. */
export const takeAlong = z.strictObject({
  voices: z.number().int(),
  pictures: z.number().int(),
  /** Of these voices and pictures together. */
  bytes: z.number().int(),
  /** Voices and pictures of its entries that the person knows of, and that may not be handed on today. */
  stays: z.number().int(),
});
export type TakeAlong = z.infer<typeof takeAlong>;

const communityParams = z.strictObject({ communityId: id });
const params = z.strictObject({ calendarId: id, number: versionNumber });

/** What leaves the calendar as a file: open and the village's entries that were agreed to be handed on. */
export const exportsEndpoints = {
  ics: defineEndpoint({
    id: 'exportCalendarIcs',
    method: 'GET',
    path: '/api/calendars/:calendarId/versions/:number/calendar.ics',
    summary: 'A version or the draft as iCalendar: whole days, for calendars on telephones',
    access: member('calendar', ...ROLES),
    params,
    query: icsQuery,
    fileType: 'text/calendar',
  }),
  csv: defineEndpoint({
    id: 'exportCalendarCsv',
    method: 'GET',
    path: '/api/calendars/:calendarId/versions/:number/calendar.csv',
    summary: 'A version or the draft as CSV, in columns that can be read back',
    access: member('calendar', ...ROLES),
    params,
    query: csvQuery,
    fileType: 'text/csv',
  }),
  json: defineEndpoint({
    id: 'exportCalendarJson',
    method: 'GET',
    path: '/api/calendars/:calendarId/versions/:number/calendar.json',
    summary: 'A version or the draft as JSON with checksums, to be read back without loss',
    access: member('calendar', ...ROLES),
    params,
    fileType: 'application/json',
  }),
  takeAlong: defineEndpoint({
    id: 'readTakeAlong',
    method: 'GET',
    path: '/api/calendars/:calendarId/versions/:number/files',
    summary: 'How many voices and pictures may go along with a version or the draft, and how large they are',
    access: member('calendar', ...ROLES),
    params,
    response: takeAlong,
  }),
  archive: defineEndpoint({
    id: 'exportCalendarArchive',
    method: 'GET',
    path: '/api/calendars/:calendarId/versions/:number/calendar.zip',
    summary: 'The same JSON in a ZIP with the voices and pictures that it lists, named by their checksums',
    access: member('calendar', ...ROLES),
    params,
    fileType: 'application/zip',
  }),
  listFeeds: defineEndpoint({
    id: 'listFeeds',
    method: 'GET',
    path: '/api/communities/:communityId/feeds',
    summary: 'The own addresses under which a telephone fetches the calendar, without their keys',
    access: member('community', ...ROLES),
    params: communityParams,
    response: listOf(feed),
  }),
  makeFeed: defineEndpoint({
    id: 'makeFeed',
    method: 'POST',
    path: '/api/communities/:communityId/feeds',
    summary: 'Make an address for a telephone; its key is shown once',
    access: member('community', ...ROLES),
    params: communityParams,
    response: madeFeed,
    status: 201,
    // It goes on when the card that signed somebody in has ended.
    needsPassword: true,
  }),
  endFeed: defineEndpoint({
    id: 'endFeed',
    method: 'DELETE',
    path: '/api/communities/:communityId/feeds/:feedId',
    summary: 'End an own address; one that is ended already stays so',
    access: member('community', ...ROLES),
    params: communityParams.extend({ feedId: id }),
  }),
  readFeed: defineEndpoint({
    id: 'readFeed',
    method: 'GET',
    // The key stands in the query, because paths are written into logs.
    path: '/api/feed.ics',
    summary: 'What is published, as its person may have it today; for whoever has the key',
    access: anybody,
    query: z.strictObject({ key: z.string().max(200) }),
    fileType: 'text/calendar',
  }),
} as const;
