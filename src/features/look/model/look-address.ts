import { CALENDAR_FIRST_YEAR, CALENDAR_LAST_YEAR } from '#shared/contracts/calendars.js';
import { PHENOMENA, type Phenomenon, type WatchSide } from '#shared/sky/vocabulary.js';
import { endOfNight } from '#src/lib/sky-words.js';

/** What the address asks for; what makes no sense in it counts as not asked. */
export interface LookAddress {
  marker: string | null;
  phenomenon: Phenomenon;
  date: string | null;
}

export const FIRST_DAY = `${CALENDAR_FIRST_YEAR}-01-01`;
export const LAST_DAY = `${CALENDAR_LAST_YEAR}-12-31`;

export function readLookAddress(search: URLSearchParams): LookAddress {
  const date = search.get('date') ?? '';
  return {
    marker: search.get('marker'),
    phenomenon: PHENOMENA.find((one) => one === search.get('phenomenon')) ?? 'heliacal-rising',
    date: /^\d{4}-\d{2}-\d{2}$/u.test(date) && date >= FIRST_DAY && date <= LAST_DAY ? date : null,
  };
}

/** The phenomenon to go by on one side: the one there is, if it belongs there, else the star's coming or going. */
export function phenomenonOn(side: WatchSide, present: Phenomenon): Phenomenon {
  if (endOfNight(present) === side) return present;
  return side === 'dawn' ? 'heliacal-rising' : 'heliacal-setting';
}
