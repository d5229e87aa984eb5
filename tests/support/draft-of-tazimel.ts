import { entryDatesFromDays } from '#shared/calendar/entry-dates.js';
import type { Calendar, Entry, EntryInput } from '#shared/contracts/calendars.js';
import type { MarkerRow } from '#shared/contracts/stars.js';
import type { Markers } from '#src/features/calendars/model/preview-dates.js';
import { entryInput } from './calendar-api.js';
import { starTable, TAZIMEL } from './stars-of-tazimel.js';

/** A calendar of the demo's place for tests of screens: entries as a server would answer them, dates computed. */

export const YEAR = 2027;
const AT = '2027-06-06T09:00:00.000Z';

export const CALENDAR: Calendar = {
  id: '0190a3a0-0000-7000-8000-0000000000c1',
  communityId: TAZIMEL.communityId,
  communityName: 'Upper Tazimel',
  placeId: TAZIMEL.id,
  placeName: TAZIMEL.name,
  year: YEAR,
  locked: false,
  outNumber: null,
  published: null,
  entryCount: 0,
  updatedAt: AT,
};

/** Rows of the real star table for the place, computed once. */
let rows: Promise<readonly MarkerRow[]> | undefined;

export async function tazimelMarkers(): Promise<Markers> {
  rows ??= starTable(YEAR).then(({ items }) => items);
  return new Map((await rows).map((row) => [row.markerKey, row]));
}

export function content(changes: Partial<EntryInput> = {}): EntryInput {
  return entryInput(changes);
}

export function entryOf(markers: Markers, id: number, changes: Partial<EntryInput> = {}): Entry {
  const own = content(changes);
  const row = own.lead.type === 'marker' ? markers.get(own.lead.markerKey) : undefined;
  return {
    id: `0190a3a0-0000-7000-8000-0000000000e${id}`,
    calendarId: CALENDAR.id,
    position: id,
    version: 1,
    content: own,
    dates: entryDatesFromDays(own, YEAR, row ? { ...row, year: YEAR } : null),
    mine: true,
    updatedBy: 'Beyno',
    updatedAt: AT,
  };
}
