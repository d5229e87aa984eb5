import { entryDatesOf } from '#shared/calendar/entry-dates.js';
import type { EntryDates, EntryInput } from '#shared/contracts/calendars.js';
import type { FrozenMarker } from '#shared/contracts/versions.js';
import { resolveMarker } from '#shared/sky/index.js';
import type { WatchedPlace } from '../places/watched-place.service.js';
import { markerNamesOf } from '../stars/marker-names.service.js';
import { SkyYearsService } from '../stars/sky-years.service.js';

/** What the sky gives the entries of a calendar. Each marker's year is computed once, however many go by it. */
export class SkyDatesService {
  constructor(private readonly years = new SkyYearsService()) {}

  /** Dates of entries in their order. Every marker must be in the table; see `knowsMarker`. */
  datesOf(place: WatchedPlace, year: number, contents: readonly EntryInput[]): EntryDates[] {
    const markerYears = new Map(
      this.years
        .markerYears(place, year, markerKeysOf(contents))
        .map((markerYear) => [markerYear.markerKey, markerYear]),
    );
    return contents.map((content) => {
      const { lead } = content;
      const markerYear = lead.type === 'marker' ? (markerYears.get(lead.markerKey) ?? null) : null;
      return entryDatesOf(content, year, markerYear);
    });
  }

  /** The markers that entries go by, each once and in the order of the keys, with names and the year's strip. */
  frozenMarkers(place: WatchedPlace, year: number, contents: readonly EntryInput[]): FrozenMarker[] {
    return markerKeysOf(contents).map((key) => ({
      ...markerNamesOf(key),
      strip: this.years.nights(place, year, key).strip,
    }));
  }
}

/** Is it a star of the table or a figure? */
export function knowsMarker(markerKey: string): boolean {
  return resolveMarker(markerKey) !== null;
}

function markerKeysOf(contents: readonly EntryInput[]): string[] {
  const keys = contents.flatMap(({ lead }) => (lead.type === 'marker' ? [lead.markerKey] : []));
  return [...new Set(keys)].sort();
}
