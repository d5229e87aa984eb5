import { entryDatesOf } from '#shared/calendar/entry-dates.js';
import type { EntryDates, EntryInput } from '#shared/contracts/calendars.js';
import type { PlaceSnapshot } from '#shared/contracts/stars.js';
import type { FrozenMarker } from '#shared/contracts/versions.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import {
  computeSkyYear,
  resolveMarker,
  yearStrip,
  type MarkerYear,
  type Site,
  type VisibilitySettings,
} from '#shared/sky/index.js';

/** Years of places that are kept: a village office works on a handful at a time. */
const KEPT_PLACE_YEARS = 32;

/** What a place hands to the sky. */
export type Watched = Omit<PlaceSnapshot, 'name'>;

/**
 * Dates of markers at a place in a year, each computed once while the place stays as it is. The key is everything
 * that a date depends on, so a changed skyline never meets an old date.
 */
export class SkyDatesService {
  private readonly placeYears = new Map<string, Map<string, MarkerYear>>();

  /** Dates of entries in their order. Every marker must be in the table; see `knowsMarker`. */
  datesOf(place: Watched, year: number, contents: readonly EntryInput[]): EntryDates[] {
    const markerYears = this.markerYears(place, year, markerKeysOf(contents));
    return contents.map((content) => {
      const { lead } = content;
      const markerYear = lead.type === 'marker' ? (markerYears.get(lead.markerKey) ?? null) : null;
      return entryDatesOf(content, year, markerYear);
    });
  }

  /** The markers that entries go by, each once and in the order of the keys, with names and the year's strip. */
  frozenMarkers(place: Watched, year: number, contents: readonly EntryInput[]): FrozenMarker[] {
    const keys = [...markerKeysOf(contents)].sort();
    const markerYears = this.markerYears(place, year, keys);
    return keys.flatMap((key) => {
      const markerYear = markerYears.get(key);
      return markerYear ? [frozenMarker(place, markerYear)] : [];
    });
  }

  private markerYears(place: Watched, year: number, keys: Iterable<string>): Map<string, MarkerYear> {
    const known = this.placeYear(place, year);
    const missing = [...new Set(keys)].filter((key) => !known.has(key));
    if (missing.length > 0) {
      const computed = computeSkyYear(missing, siteOf(place), settingsOf(place), year);
      for (const markerYear of computed) known.set(markerYear.markerKey, markerYear);
    }
    return known;
  }

  /** Least recently used goes first: a Map keeps the order in which keys were set. */
  private placeYear(place: Watched, year: number): Map<string, MarkerYear> {
    const key = canonicalJson([year, siteOf(place), settingsOf(place)]);
    const known = this.placeYears.get(key) ?? new Map<string, MarkerYear>();
    this.placeYears.delete(key);
    this.placeYears.set(key, known);
    const [oldest] = this.placeYears.keys();
    if (this.placeYears.size > KEPT_PLACE_YEARS && oldest !== undefined) this.placeYears.delete(oldest);
    return known;
  }
}

/** Is it a star of the table or a figure? */
export function knowsMarker(markerKey: string): boolean {
  return resolveMarker(markerKey) !== null;
}

function markerKeysOf(contents: readonly EntryInput[]): Set<string> {
  return new Set(contents.flatMap(({ lead }) => (lead.type === 'marker' ? [lead.markerKey] : [])));
}

function siteOf({ latitudeDeg, longitudeDeg, elevationM, timeZone, skyline }: Watched): Site {
  return { latitudeDeg, longitudeDeg, elevationM, timeZone, skyline };
}

function settingsOf(place: Watched): VisibilitySettings {
  const { thresholdSet, sameSideShiftDeg, oppositeSideShiftDeg, clarityByMonth, skylineRule } = place;
  return { thresholdSet, sameSideShiftDeg, oppositeSideShiftDeg, clarityByMonth, skylineRule };
}

function frozenMarker(place: Watched, markerYear: MarkerYear): FrozenMarker {
  const marker = resolveMarker(markerYear.markerKey);
  if (!marker) throw new RangeError(`${markerYear.markerKey} is no marker.`);
  const { star, figure } = marker;
  const designation = `${star.bayer === '' ? star.flamsteed : star.bayer} ${star.constellation}`;
  return {
    markerKey: markerYear.markerKey,
    kind: figure ? 'figure' : 'star',
    name: figure?.name ?? (star.name === designation ? '' : star.name),
    designation,
    hr: star.hr,
    vMag: star.vMag,
    strip: yearStrip(markerYear, siteOf(place), settingsOf(place)),
  };
}
