import { SkyRangeError } from '../units/sky-range-error.js';
import { JD_J2000 } from './julian-day.js';

/**
 * Offset of an IANA zone from UT, read from the runtime's own zone data through Intl. Asking Intl costs several
 * microseconds, so the changes of one zone in one year are found once and kept: the answer for an instant never
 * changes, which keeps the function pure to its callers.
 */

const SECONDS_PER_DAY = 86_400;
/** 2000-01-01 12:00 UTC, written out because Date.UTC() moves years below 100 into the twentieth century. */
const MS_AT_J2000 = 946_728_000_000;
/** Shorter than any pair of changes on record (a suspension of summer time lasts weeks). */
const PROBE_STEP_DAYS = 6;
const MINUTE_DAYS = 1 / 1440;
/** Changes are looked up in spans of this length. */
const SPAN_DAYS = 366;

interface ZoneYear {
  /** Instants (JD UT) at which a new offset begins, ascending; the first one opens the year. */
  startsJdUt: number[];
  offsetsDays: number[];
}

const formatters = new Map<string, Intl.DateTimeFormat>();

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
  // Whole seconds, because the formatter cuts the rest off.
  const instantMs = Math.round((jdUt - JD_J2000) * SECONDS_PER_DAY) * 1000 + MS_AT_J2000;
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
  return (wallMs - instantMs) / 1000 / SECONDS_PER_DAY;
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
  for (let jd = firstJd; jd < firstJd + SPAN_DAYS; jd += PROBE_STEP_DAYS) {
    const next = probe(timeZone, jd + PROBE_STEP_DAYS);
    if (next === offset) continue;
    startsJdUt.push(changeBetween(timeZone, jd, jd + PROBE_STEP_DAYS, offset));
    offsetsDays.push(next);
    offset = next;
  }
  return { startsJdUt, offsetsDays };
}

/** The offsets of one zone, year after year. */
export class ZoneOffsets {
  private readonly years = new Map<number, ZoneYear>();

  constructor(private readonly timeZone: string) {}

  /**
   * Days to add to UT to get the zone's wall clock at an instant (east positive).
   * @param jdUt Julian Day (UT), 1900 or later
   */
  offsetDays(jdUt: number): number {
    const index = Math.floor((jdUt - JD_J2000) / SPAN_DAYS);
    const known = this.years.get(index);
    const span = known ?? buildZoneYear(this.timeZone, JD_J2000 + index * SPAN_DAYS);
    if (!known) this.years.set(index, span);
    let change = span.startsJdUt.length - 1;
    while (change > 0 && (span.startsJdUt[change] ?? 0) > jdUt) change -= 1;
    return span.offsetsDays[change] ?? 0;
  }
}

const zones = new Map<string, ZoneOffsets>();

/** The offsets of a zone; throws a SkyRangeError when the runtime does not know it. */
export function zoneOffsetsOf(timeZone: string): ZoneOffsets {
  const known = zones.get(timeZone);
  if (known) return known;
  assertTimeZone(timeZone);
  const made = new ZoneOffsets(timeZone);
  zones.set(timeZone, made);
  return made;
}
