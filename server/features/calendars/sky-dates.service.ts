import { anchorOf } from '#shared/calendar/anchors.js';
import { entryDatesFromDays, entryDatesOf, type AnchorDays } from '#shared/calendar/entry-dates.js';
import { isStarLead, type EntryTiming } from '#shared/calendar/entry-model.js';
import type { EntryDates, EntryInput, EntryLead } from '#shared/contracts/calendars.js';
import type { SkyFigure } from '#shared/contracts/stars.js';
import type { FrozenMarker } from '#shared/contracts/versions.js';
import { resolveMarker, type MarkerYear } from '#shared/sky/index.js';
import { figuresOf, type WatchedPlace } from '../places/watched-place.service.js';
import { markerNamesOf } from '../stars/marker-names.service.js';
import { SkyMarkerYearsService } from '../sky-markers/sky-marker-years.service.js';
import { SkyYearsService } from '../stars/sky-years.service.js';
import { SkyAdvice } from './sky-advice.js';

/** Of entries that are counted from others the sky says nothing; whoever has all of them at hand does. */
const UNTOLD: AnchorDays = { basis: 'gone', spell: null, planned: null };

/** What the sky gives the entries of a calendar. Each marker's year is computed once, however many go by it. */
export class SkyDatesService {
  constructor(
    private readonly years = new SkyYearsService(),
    private readonly skyMarkers = new SkyMarkerYearsService(),
  ) {}

  /** What of the sky is told beside the dates. */
  readonly advice = new SkyAdvice(this.years);

  /** Dates of entries in their order. Every marker must be in the table; see `knowsMarker`. */
  datesOf(place: WatchedPlace, year: number, contents: readonly EntryInput[]): EntryDates[] {
    const markerYears = new Map(
      this.years
        .markerYears(place, year, firstAndLastKeysOf(contents))
        .map((markerYear) => [markerYear.markerKey, markerYear]),
    );
    return contents.map((content) => this.dated(place, year, content, markerYears));
  }

  /** Dates of one timing, as `datesOf` gives them. */
  timingDates(place: WatchedPlace, year: number, timing: EntryTiming): EntryDates {
    const keys = isStarLead(timing.lead) ? [timing.lead.markerKey] : [];
    const markerYears = this.years.markerYears(place, year, keys);
    return this.dated(place, year, timing, new Map(markerYears.map((each) => [each.markerKey, each])));
  }

  private dated(
    place: WatchedPlace,
    year: number,
    timing: EntryTiming,
    markerYears: ReadonlyMap<string, MarkerYear>,
  ): EntryDates {
    const { lead } = timing;
    if (lead.type === 'sky') {
      return entryDatesOf(timing, year, this.skyMarkers.year(place, year, lead.spec));
    }
    if (anchorOf(lead) !== null) return entryDatesFromDays(timing, year, null, UNTOLD);
    const markerYear = isStarLead(lead) ? (markerYears.get(lead.markerKey) ?? null) : null;
    return entryDatesOf(timing, year, markerYear);
  }

  /** The stars and figures that entries go by, each once and in the order of the keys, with names and the year's strip. */
  frozenMarkers(place: WatchedPlace, year: number, contents: readonly EntryInput[]): FrozenMarker[] {
    return markerKeysOf(contents).map((key) => ({
      ...markerNamesOf(key, figuresOf(place)),
      strip: this.years.nights(place, year, key).strip,
    }));
  }
}

/** The place with only those figures of the village that entries go by; without any, it stands as it always stood. */
export function withUsedFigures<P extends WatchedPlace>(place: P, contents: readonly EntryInput[]): P {
  const keys = new Set(markerKeysOf(contents));
  const { figures = [], ...rest } = place;
  const used = figures.filter(({ key }) => keys.has(key));
  return (used.length === 0 ? rest : { ...rest, figures: used }) as P;
}

/** Is it a star of the table, a built-in figure or one of the village's own? */
export function knowsMarker(markerKey: string, figures: readonly SkyFigure[]): boolean {
  return resolveMarker(markerKey, figures) !== null;
}

/** The star or figure that a lead names, for whatever it goes by it; null where none is named. */
export function markerKeyOfLead(lead: EntryLead): string | null {
  if (isStarLead(lead)) return lead.markerKey;
  return lead.type === 'sky' && 'markerKey' in lead.spec ? lead.spec.markerKey : null;
}

/** The stars and figures that entries go by, each once and sorted. */
export function markerKeysOf(contents: readonly EntryInput[]): string[] {
  return [...new Set(contents.flatMap(({ lead }) => markerKeyOfLead(lead) ?? []))].sort();
}

/** Only those whose first or last days are asked for. */
function firstAndLastKeysOf(contents: readonly EntryInput[]): string[] {
  return markerKeysOf(contents.filter(({ lead }) => isStarLead(lead)));
}
