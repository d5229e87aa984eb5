import { occurrenceDaysOf } from '#shared/calendar/entry-dates.js';
import type { LookAlternative, LookSeason } from '#shared/contracts/look.js';
import { civilDateOf } from '#shared/kernel/iso-date.js';
import type { MarkerYear, Occurrence, Phenomenon } from '#shared/sky/index.js';
import type { WatchedPlace } from '../places/watched-place.service.js';
import { markerNamesOf, WELL_KNOWN_KEYS } from '../stars/marker-names.service.js';
import type { SkyYearsService } from '../stars/sky-years.service.js';

/** Days of a phenomenon with the year that they were reckoned in. */
interface Found {
  markerYear: MarkerYear;
  occurrence: Occurrence;
}

/** Where a day stands to a star's days, and which other star has such a day. */
export class LookSeasonService {
  constructor(private readonly skyYears: SkyYearsService) {}

  /** The days that hold the date, else the next ones; the years before and after count, for ranges reach over New Year. */
  of(place: WatchedPlace, markerKey: string, phenomenon: Phenomenon, dayNumber: number): LookSeason {
    const { year } = civilDateOf(dayNumber);
    const markerYears = [year - 1, year, year + 1].flatMap((one) =>
      this.skyYears.markerYears(place, one, [markerKey]),
    );
    const found = foundIn(markerYears, phenomenon);
    const open = found.find(({ occurrence }) => holds(occurrence, dayNumber));
    const next = open ?? found.find(({ occurrence }) => occurrence.expected.dayNumber > dayNumber);
    const inYear = markerYears.find((one) => one.year === year);
    return {
      season: seasonOf(found, open ?? null, dayNumber),
      starOutcome: inYear?.outcome ?? 'rises-and-sets',
      phenomenonOutcome: inYear?.phenomena[phenomenon].outcome ?? 'none-in-this-year',
      days: next ? occurrenceDaysOf(next.occurrence) : null,
      notes: [...new Set([...(inYear?.notes ?? []), ...(next?.occurrence.notes ?? [])])],
    };
  }

  /** The well-known star whose day of the same kind comes next; null where none is worth waiting for. */
  alternative(
    place: WatchedPlace,
    markerKey: string,
    phenomenon: Phenomenon,
    dayNumber: number,
  ): LookAlternative | null {
    const { year } = civilDateOf(dayNumber);
    const keys = WELL_KNOWN_KEYS.filter((key) => key !== markerKey);
    const markerYears = [year, year + 1].flatMap((one) => this.skyYears.markerYears(place, one, keys));
    const [next] = foundIn(markerYears, phenomenon)
      .filter((one) => lastDayOf(one.occurrence) >= dayNumber && servesWell(one))
      .sort((a, b) => a.occurrence.expected.dayNumber - b.occurrence.expected.dayNumber);
    if (!next) return null;
    return { marker: markerNamesOf(next.markerYear.markerKey), days: occurrenceDaysOf(next.occurrence) };
  }
}

function foundIn(markerYears: readonly MarkerYear[], phenomenon: Phenomenon): Found[] {
  return markerYears.flatMap((markerYear) =>
    markerYear.phenomena[phenomenon].occurrences.map((occurrence) => ({ markerYear, occurrence })),
  );
}

function seasonOf(found: readonly Found[], open: Found | null, dayNumber: number): LookSeason['season'] {
  if (open !== null) return 'within';
  if (found.length === 0) return 'never';
  const daysAway = found.map(({ occurrence }) => occurrence.expected.dayNumber - dayNumber);
  const nearest = daysAway.reduce((best, days) => (Math.abs(days) < Math.abs(best) ? days : best));
  return nearest > 0 ? 'before' : 'after';
}

function lastDayOf({ expected, late }: Occurrence): number {
  return (late ?? expected).dayNumber;
}

function holds({ expected, early, late }: Occurrence, dayNumber: number): boolean {
  return (early ?? expected).dayNumber <= dayNumber && dayNumber <= (late ?? expected).dayNumber;
}

function servesWell({ markerYear, occurrence }: Found): boolean {
  const notes = [...markerYear.notes, ...occurrence.notes];
  return !notes.includes('never-disappears') && !notes.includes('weak-marker');
}
