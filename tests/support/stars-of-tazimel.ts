import { AirService } from '#server/features/air/air.service.js';
import { UPPER_TAZIMEL } from '#server/features/demo/demo-villages.data.js';
import { SkyYearsService } from '#server/features/stars/sky-years.service.js';
import { SkylineEffectsService } from '#server/features/stars/skyline-effects.service.js';
import { StarsService, type StarTable } from '#server/features/stars/stars.service.js';
import type { AirAnswer } from '#shared/contracts/air.js';
import type { Place } from '#shared/contracts/places.js';
import type { MarkerDetail, SkylineEffect } from '#shared/contracts/stars.js';
import { OFFICER } from './on-board.js';
import { watchedPlaces } from './watched-places.js';

/** The demo's place with ids of its own, and what the server answers for it: computed, never written down. */
export const TAZIMEL: Place = {
  ...UPPER_TAZIMEL.place,
  id: '0190a3a0-0000-7000-8000-0000000000b1',
  communityId: OFFICER.memberships?.[0]?.communityId ?? '',
  version: 3,
};

const skyYears = new SkyYearsService();

function starsOf(place: Place): StarsService {
  return new StarsService(watchedPlaces(place), skyYears);
}

export function starTable(year: number, place: Place = TAZIMEL): Promise<StarTable> {
  return starsOf(place).list(undefined as never, place.id, year);
}

export function starDetail(markerKey: string, year: number, place: Place = TAZIMEL): Promise<MarkerDetail> {
  return starsOf(place).read(undefined as never, place.id, markerKey, year);
}

export function skylineEffects(year: number, place: Place = TAZIMEL): SkylineEffect[] {
  return new SkylineEffectsService(undefined as never, skyYears).of(place, year);
}

export function starAir(markerKey: string, year: number, place: Place = TAZIMEL): Promise<AirAnswer> {
  const service = new AirService(watchedPlaces(place), skyYears);
  return service.read(undefined as never, place.id, markerKey, year);
}
