import { CALENDAR_FIRST_YEAR, CALENDAR_LAST_YEAR } from '#shared/contracts/calendars.js';
import type { MonthDay } from '#shared/contracts/common.js';
import { markerKey as markerKeySchema } from '#shared/contracts/stars.js';
import { FIRST_YEAR, PHENOMENA, type Phenomenon } from '#shared/sky/vocabulary.js';

/** What a person asks: the day of the work, or what has become of an old sign. */
export interface Question {
  way: 'day' | 'old';
  from: MonthDay;
  /** Last day of a stretch; null for a single day. */
  to: MonthDay | null;
  /** Null until one is chosen. */
  oldMarker: string | null;
  oldPhenomenon: Phenomenon;
  since: number;
  year: number;
  show: 'easy' | 'all';
}

/** Which entry of which calendar the answer is for; null where the finder was opened by itself. */
export interface ForEntry {
  calendarId: string;
  entryId: string | null;
}

/** Old customs are rarely dated; five centuries are a fair beginning. */
const FIRST_SINCE = 1500;
const MONTH_DAY = /^(0[1-9]|1[0-2])-(0[1-9]|[12]\d|3[01])$/u;

export interface Today {
  year: number;
  month: number;
  day: number;
}

/** The question of an address. What cannot be read falls back to today, so that every address opens. */
export function readQuestion(search: URLSearchParams, today: Today): Question {
  const year = wholeNumber(search.get('year'), CALENDAR_FIRST_YEAR, CALENDAR_LAST_YEAR) ?? today.year;
  const oldMarker = markerKeySchema.safeParse(search.get('old'));
  return {
    way: search.get('by') === 'old' ? 'old' : 'day',
    from: readMonthDay(search.get('from')) ?? { month: today.month, day: heldDay(today.month, today.day) },
    to: readMonthDay(search.get('to')),
    oldMarker: oldMarker.success ? oldMarker.data : null,
    oldPhenomenon: PHENOMENA.find((each) => each === search.get('its')) ?? 'heliacal-rising',
    since: wholeNumber(search.get('since'), FIRST_YEAR, year - 1) ?? Math.min(FIRST_SINCE, year - 1),
    year,
    show: search.get('show') === 'all' ? 'all' : 'easy',
  };
}

/** The address of a question; what else stood in it stays. */
export function writeQuestion(search: URLSearchParams, question: Question): URLSearchParams {
  const next = new URLSearchParams(search);
  const values: Record<string, string | null> = {
    by: question.way === 'old' ? 'old' : null,
    from: monthDayText(question.from),
    to: question.to && monthDayText(question.to),
    old: question.oldMarker,
    its: question.oldMarker === null ? null : question.oldPhenomenon,
    since: question.oldMarker === null ? null : String(question.since),
    year: String(question.year),
    show: question.show === 'all' ? 'all' : null,
  };
  for (const [key, value] of Object.entries(values)) {
    if (value === null) next.delete(key);
    else next.set(key, value);
  }
  return next;
}

export function readForEntry(search: URLSearchParams): ForEntry | null {
  const calendarId = search.get('calendar');
  return calendarId === null ? null : { calendarId, entryId: search.get('entry') };
}

/** What is asked of the server; null while the old sign is not chosen. */
export function askedOf(question: Question) {
  const { way, year, show, oldMarker, oldPhenomenon, since } = question;
  if (way === 'old') {
    return oldMarker === null ? null : { year, show, oldMarker, oldPhenomenon, since };
  }
  return {
    year,
    show,
    from: monthDayText(question.from),
    ...(question.to === null ? {} : { to: monthDayText(question.to) }),
  };
}

export function monthDayText({ month, day }: MonthDay): string {
  return `${String(month).padStart(2, '0')}-${String(day).padStart(2, '0')}`;
}

function readMonthDay(text: string | null): MonthDay | null {
  const parts = MONTH_DAY.exec(text ?? '');
  if (parts === null) return null;
  const month = Number(parts[1]);
  return { month, day: heldDay(month, Number(parts[2])) };
}

const MONTH_DAYS = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31] as const;

/** A day that the month has in every year. */
function heldDay(month: number, day: number): number {
  return Math.min(day, MONTH_DAYS[month - 1] ?? 31);
}

function wholeNumber(text: string | null, min: number, max: number): number | null {
  if (text === null || !/^-?\d{1,4}$/u.test(text)) return null;
  const number = Number(text);
  return number >= min && number <= max ? number : null;
}
