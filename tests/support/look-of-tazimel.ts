import { LookSeasonService } from '#server/features/look/look-season.service.js';
import { LookService } from '#server/features/look/look.service.js';
import { SkyYearsService } from '#server/features/stars/sky-years.service.js';
import { lookQuery, type Look } from '#shared/contracts/look.js';
import type { Place } from '#shared/contracts/places.js';
import { watchedPlaces } from './watched-places.js';

/** Where to look at a place as the server answers it, without a database. */
export async function lookAtPlace(place: Place, search: URLSearchParams, now = new Date()): Promise<Look> {
  const looks = new LookService(watchedPlaces(place), new LookSeasonService(new SkyYearsService()), {
    now: () => now,
  });
  return looks.read(undefined as never, place.id, lookQuery.parse(Object.fromEntries(search)));
}
