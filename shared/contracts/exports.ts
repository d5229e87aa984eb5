import { z } from 'zod';
import { id, queryNumber } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';
import { versionNumber } from './versions.js';

export const ALARM_MAX_DAYS = 60;

/** Nobody is rung up unless they ask for it: `alarmDays` is how many days ahead. */
export const icsQuery = z.strictObject({
  alarmDays: queryNumber((number) => number.int('whole-days').min(0).max(ALARM_MAX_DAYS)).optional(),
});
export type IcsQuery = z.infer<typeof icsQuery>;

/** `mark` puts the sign of UTF-8 in front, by which spreadsheets read letters of all scripts. */
export const csvQuery = z.strictObject({ mark: z.enum(['yes', 'no']).default('yes') });
export type CsvQuery = z.infer<typeof csvQuery>;

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
} as const;
