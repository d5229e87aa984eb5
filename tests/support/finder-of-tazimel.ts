import { DriftService } from '#server/features/drift/drift.service.js';
import { FinderService } from '#server/features/finder/finder.service.js';
import type { PlacesService } from '#server/features/places/places.service.js';
import {
  finderQuery,
  type ComparisonInput,
  type FinderAnswer,
  type YearsAnswer,
} from '#shared/contracts/finder.js';
import { driftQuery, type DriftAnswer } from '#shared/contracts/drift.js';
import type { Place } from '#shared/contracts/places.js';
import { TAZIMEL } from './stars-of-tazimel.js';

/** What the server answers for the demo's place, or one like it: computed, never written down. */

const placesOf = (place: Place) => ({ read: () => Promise.resolve(place) }) as unknown as PlacesService;
const NOBODY = undefined as never;

export function found(search: URLSearchParams, place: Place = TAZIMEL): Promise<FinderAnswer> {
  const query = finderQuery.parse(Object.fromEntries(search));
  return new FinderService(placesOf(place)).find(NOBODY, place.id, query);
}

export async function markerNames(): Promise<unknown> {
  return { items: await new FinderService(placesOf(TAZIMEL)).names(NOBODY, TAZIMEL.id), nextCursor: null };
}

export function years(body: unknown, place: Place = TAZIMEL): Promise<YearsAnswer> {
  return new FinderService(placesOf(place)).compareYears(NOBODY, place.id, body as ComparisonInput);
}

export function drifted(markerKey: string, search: URLSearchParams): Promise<DriftAnswer> {
  const query = driftQuery.parse(Object.fromEntries(search));
  return new DriftService(placesOf(TAZIMEL)).read(NOBODY, TAZIMEL.id, markerKey, query);
}
