import type { MarkerRow } from '#shared/contracts/stars.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { computeSkyYear, yearStrip, type MarkerYear, type StripSegment } from '#shared/sky/index.js';
import { setImmediate } from 'node:timers/promises';
import { figuresOf, settingsOf, siteOf, type WatchedPlace } from '../places/watched-place.service.js';
import { allMarkerKeys } from './marker-names.service.js';
import { toMarkerRow } from './stars.mapper.js';

/** A marker's year and what it does night by night. */
export interface MarkerNights {
  markerYear: MarkerYear;
  strip: StripSegment[];
}

/** Whole tables that are kept, about 3 MB each: a village office looks at one place and a few years. */
const KEPT_TABLES = 8;
/** Places and years of which single markers are kept. */
const KEPT_PLACE_YEARS = 32;
/** Markers between which other requests get their turn: some ten milliseconds of work. */
const MARKERS_AT_A_TIME = 16;

/**
 * Years of markers at places, each computed once while the place stays as it is. Kept under everything that a
 * date rests on, so a changed skyline never meets an old date and an unsaved place needs no rule of its own.
 */
export class SkyYearsService {
  private readonly tables = new Map<string, Promise<MarkerRow[]>>();
  private readonly placeYears = new Map<string, Map<string, MarkerYear>>();

  /** Every marker of the table; who asks meanwhile waits for the same computation. */
  async table(place: WatchedPlace, year: number): Promise<MarkerRow[]> {
    const key = keyOf(place, year);
    const table = this.tables.get(key) ?? computeTable(place, year);
    keep(this.tables, key, table, KEPT_TABLES);
    // A failed one must not stay.
    table.catch(() => this.tables.delete(key));
    return table;
  }

  /** Some markers, in the order of their keys. */
  markerYears(place: WatchedPlace, year: number, markerKeys: readonly string[]): MarkerYear[] {
    const key = keyOf(place, year);
    const known = this.placeYears.get(key) ?? new Map<string, MarkerYear>();
    keep(this.placeYears, key, known, KEPT_PLACE_YEARS);
    const missing = [...new Set(markerKeys)].filter((markerKey) => !known.has(markerKey));
    if (missing.length > 0) {
      const figures = figuresOf(place);
      for (const markerYear of computeSkyYear(missing, siteOf(place), settingsOf(place), year, figures)) {
        known.set(markerYear.markerKey, markerYear);
      }
    }
    return markerKeys.flatMap((markerKey) => known.get(markerKey) ?? []);
  }

  /** One marker with its strip. */
  nights(place: WatchedPlace, year: number, markerKey: string): MarkerNights {
    const [markerYear] = this.markerYears(place, year, [markerKey]);
    if (!markerYear) throw new RangeError(`${markerKey} is no marker.`);
    return { markerYear, strip: yearStrip(markerYear, siteOf(place), settingsOf(place), figuresOf(place)) };
  }
}

async function computeTable(place: WatchedPlace, year: number): Promise<MarkerRow[]> {
  const site = siteOf(place);
  const settings = settingsOf(place);
  const figures = figuresOf(place);
  const allKeys = allMarkerKeys(figures);
  const rows: MarkerRow[] = [];
  for (let start = 0; start < allKeys.length; start += MARKERS_AT_A_TIME) {
    const keys = allKeys.slice(start, start + MARKERS_AT_A_TIME);
    for (const markerYear of computeSkyYear(keys, site, settings, year, figures)) {
      rows.push(toMarkerRow({ markerYear, strip: yearStrip(markerYear, site, settings, figures) }, figures));
    }
    await setImmediate();
  }
  return rows;
}

function keyOf(place: WatchedPlace, year: number): string {
  return canonicalJson([year, siteOf(place), settingsOf(place), figuresOf(place)]);
}

/** A Map keeps the order in which keys were set: what was used last goes to the end, the first one goes. */
function keep<T>(map: Map<string, T>, key: string, value: T, limit: number): void {
  map.delete(key);
  map.set(key, value);
  const [oldest] = map.keys();
  if (map.size > limit && oldest !== undefined) map.delete(oldest);
}
