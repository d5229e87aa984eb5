import { DriftService } from '#server/features/drift/drift.service.js';
import { SkyMarkerYearsService } from '#server/features/sky-markers/sky-marker-years.service.js';
import { SkyMarkersService } from '#server/features/sky-markers/sky-markers.service.js';
import { FinderService } from '#server/features/finder/finder.service.js';
import {
  finderQuery,
  type ComparisonInput,
  type FinderAnswer,
  type YearsAnswer,
} from '#shared/contracts/finder.js';
import { driftQuery, type DriftAnswer } from '#shared/contracts/drift.js';
import { skyMarkerQuestion } from '#shared/contracts/sky-markers.js';
import type { Place } from '#shared/contracts/places.js';
import { TAZIMEL } from './stars-of-tazimel.js';
import { watchedPlaces } from './watched-places.js';

/** What the server answers for the demo's place, or one like it: computed, never written down. */

const NOBODY = undefined as never;

export function found(search: URLSearchParams, place: Place = TAZIMEL): Promise<FinderAnswer> {
  const query = finderQuery.parse(Object.fromEntries(search));
  return new FinderService(watchedPlaces(place)).find(NOBODY, place.id, query);
}

export async function markerNames(): Promise<unknown> {
  return {
    items: await new FinderService(watchedPlaces(TAZIMEL)).names(NOBODY, TAZIMEL.id),
    nextCursor: null,
  };
}

export function years(body: unknown, place: Place = TAZIMEL): Promise<YearsAnswer> {
  return new FinderService(watchedPlaces(place)).compareYears(NOBODY, place.id, body as ComparisonInput);
}

/** The dates of one sign of the sky. */
export function skySign(body: unknown): Promise<unknown> {
  const signs = new SkyMarkersService(watchedPlaces(TAZIMEL), new SkyMarkerYearsService());
  return signs.compute(NOBODY, TAZIMEL.id, skyMarkerQuestion.parse(body));
}

export async function skySigns(search: URLSearchParams, place: Place = TAZIMEL): Promise<unknown> {
  const signs = new SkyMarkersService(watchedPlaces(place), new SkyMarkerYearsService());
  return { items: await signs.list(NOBODY, place.id, Number(search.get('year'))), nextCursor: null };
}

export function drifted(markerKey: string, search: URLSearchParams): Promise<DriftAnswer> {
  const query = driftQuery.parse(Object.fromEntries(search));
  return new DriftService(watchedPlaces(TAZIMEL)).read(NOBODY, TAZIMEL.id, markerKey, query);
}
