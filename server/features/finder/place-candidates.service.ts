import {
  candidatesOf,
  countWithoutDate,
  type MarkerCandidate,
  type MarkerSight,
  type WithoutDate,
} from '#shared/calendar/marker-candidates.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { computeSkyYear, type Figure } from '#shared/sky/index.js';
import { setImmediate } from 'node:timers/promises';
import { figuresOf, settingsOf, siteOf, type WatchedPlace } from '../places/watched-place.service.js';
import { allMarkerKeys, markerNamesOf } from '../stars/marker-names.service.js';

/** All that a place's sky offers a calendar in one civil year. */
export interface PlaceCandidates {
  candidates: MarkerCandidate[];
  without: WithoutDate;
  searched: number;
}

/** Place-years that are kept, about 4 MB each: whoever tries one wanted day tries the next. */
const KEPT_PLACE_YEARS = 6;
/** Markers between which other requests get their turn. */
const MARKERS_AT_A_TIME = 16;

/** Looks through every marker of a place-year once and keeps the last few answers. */
export class PlaceCandidatesService {
  private readonly kept = new Map<string, Promise<PlaceCandidates>>();

  async inYear(place: WatchedPlace, year: number): Promise<PlaceCandidates> {
    const key = canonicalJson([year, siteOf(place), settingsOf(place), figuresOf(place)]);
    const found = this.kept.get(key) ?? lookThrough(place, year);
    // A Map keeps the order in which keys were set: what was used last goes to the end.
    this.kept.delete(key);
    this.kept.set(key, found);
    const [oldest] = this.kept.keys();
    if (this.kept.size > KEPT_PLACE_YEARS && oldest !== undefined) this.kept.delete(oldest);
    found.catch(() => this.kept.delete(key));
    return found;
  }
}

async function lookThrough(place: WatchedPlace, year: number): Promise<PlaceCandidates> {
  const figures = figuresOf(place);
  const markerKeys = allMarkerKeys(figures);
  const site = siteOf(place);
  const settings = settingsOf(place);
  const candidates: MarkerCandidate[] = [];
  const without: WithoutDate = { neverSets: 0, neverClearsSkyline: 0, neverDarkEnough: 0 };
  for (let start = 0; start < markerKeys.length; start += MARKERS_AT_A_TIME) {
    const keys = markerKeys.slice(start, start + MARKERS_AT_A_TIME);
    const years = computeSkyYear(keys, site, settings, year, figures).map((markerYear) => ({
      markerYear,
      sight: sightOf(markerYear.markerKey, figures),
    }));
    for (const { markerYear, sight } of years) candidates.push(...candidatesOf(markerYear, sight));
    const counts = countWithoutDate(years);
    without.neverSets += counts.neverSets;
    without.neverClearsSkyline += counts.neverClearsSkyline;
    without.neverDarkEnough += counts.neverDarkEnough;
    await setImmediate();
  }
  return { candidates, without, searched: markerKeys.length };
}

function sightOf(markerKey: string, figures: readonly Figure[]): MarkerSight {
  const { vMag, kind } = markerNamesOf(markerKey, figures);
  return { vMag, isFigure: kind !== 'star' };
}
