import { SkyRangeError } from '../units/sky-range-error.js';
import { JD_J2000 } from './julian-day.js';

/**
 * Offset of an IANA zone from UT, read from the runtime's own zone data through Intl. Asking Intl costs several
 * microseconds, so the changes of one zone in one year are found once and kept: the answer for an instant never
 * changes, which keeps the function pure to its callers.
 */

const MS_PER_DAY = 86_400_000;
/** 2000-01-01 12:00 UTC, written out because Date.UTC() moves years below 100 into the twentieth century. */
const MS_AT_J2000 = 946_728_000_000;
/** Shorter than any pair of changes on record (a suspension of summer time lasts weeks). */
const PROBE_STEP_DAYS = 6;
const MINUTE_DAYS = 1 / 1440;

interface ZoneYear {
  /** Instants (JD UT) at which a new offset begins, ascending; the first one opens the year. */
  startsJdUt: number[];
  offsetsDays: number[];
}

const formatters = new Map<string, Intl.DateTimeFormat>();
const zoneYears = new Map<string, ZoneYear>();
/** Bounds the memory of a process that answers for many zones and years. */
const MAX_ZONE_YEARS = 2000;

function formatterOf(timeZone: string): Intl.DateTimeFormat {
  const known = formatters.get(timeZone);
  if (known) return known;
  try {
    const made = new Intl.DateTimeFormat('en-US', {
      timeZone,
      calendar: 'gregory',
      numberingSystem: 'latn',
      hourCycle: 'h23',
      year: 'numeric',
      month: 'numeric',
      day: 'numeric',
      hour: 'numeric',
      minute: 'numeric',
      second: 'numeric',
    });
    formatters.set(timeZone, made);
    return made;
  } catch {
    throw new SkyRangeError(
      'timeZone',
      `"${timeZone}" is not a time zone of the IANA list; give one like Asia/Kathmandu, or null.`,
    );
  }
}

/** Throws a SkyRangeError when the runtime does not know the zone. */
export function assertTimeZone(timeZone: string): void {
  formatterOf(timeZone);
}

function probe(timeZone: string, jdUt: number): number {
  const instantMs = Math.round((jdUt - JD_J2000) * MS_PER_DAY + MS_AT_J2000);
  const parts: Record<string, number> = {};
  for (const part of formatterOf(timeZone).formatToParts(instantMs)) parts[part.type] = Number(part.value);
  const part = (name: string): number => parts[name] ?? 0;
  const wallMs = Date.UTC(
    part('year'),
    part('month') - 1,
    part('day'),
    part('hour'),
    part('minute'),
    part('second'),
  );
  return Math.round((wallMs - instantMs) / 1000) / 86_400;
}

/** The last minute before a change inside (fromJd, toJd], by halving. */
function changeBetween(timeZone: string, fromJd: number, toJd: number, offsetBefore: number): number {
  let before = fromJd;
  let after = toJd;
  while (after - before > MINUTE_DAYS) {
    const middle = (before + after) / 2;
    if (probe(timeZone, middle) === offsetBefore) before = middle;
    else after = middle;
  }
  return after;
}

function buildZoneYear(timeZone: string, firstJd: number): ZoneYear {
  const startsJdUt = [firstJd];
  let offset = probe(timeZone, firstJd);
  const offsetsDays = [offset];
  for (let jd = firstJd; jd < firstJd + 366; jd += PROBE_STEP_DAYS) {
    const next = probe(timeZone, jd + PROBE_STEP_DAYS);
    if (next === offset) continue;
    startsJdUt.push(changeBetween(timeZone, jd, jd + PROBE_STEP_DAYS, offset));
    offsetsDays.push(next);
    offset = next;
  }
  return { startsJdUt, offsetsDays };
}

/**
 * Days to add to UT to get the zone's wall clock at an instant (east positive).
 * @param jdUt Julian Day (UT), 1900 or later
 */
export function zoneOffsetDays(timeZone: string, jdUt: number): number {
  const yearIndex = Math.floor((jdUt - JD_J2000) / 365);
  const key = `${timeZone} ${yearIndex}`;
  let zoneYear = zoneYears.get(key);
  if (!zoneYear) {
    if (zoneYears.size >= MAX_ZONE_YEARS) zoneYears.clear();
    zoneYear = buildZoneYear(timeZone, JD_J2000 + yearIndex * 365);
    zoneYears.set(key, zoneYear);
  }
  let index = zoneYear.startsJdUt.length - 1;
  while (index > 0 && (zoneYear.startsJdUt[index] ?? 0) > jdUt) index -= 1;
  return zoneYear.offsetsDays[index] ?? 0;
}
