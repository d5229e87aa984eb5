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
} as const;
