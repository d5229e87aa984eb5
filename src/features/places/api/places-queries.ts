import { queryOptions } from '@tanstack/react-query';
import { placesEndpoints, type PlaceInput } from '#shared/contracts/places.js';
import { starsEndpoints } from '#shared/contracts/stars.js';
import { callApi } from '#src/lib/api-client.js';

export function placeQuery(placeId: string) {
  return queryOptions({
    queryKey: ['place', placeId],
    queryFn: ({ signal }) => callApi(placesEndpoints.read, { params: { placeId }, signal }),
  });
}

/** The time zone at coordinates. It does not change while a form is open. */
export function timeZoneQuery(latitudeDeg: number, longitudeDeg: number) {
  return queryOptions({
    queryKey: ['time-zone', latitudeDeg, longitudeDeg],
    queryFn: async ({ signal }) =>
      (await callApi(placesEndpoints.findTimeZone, { query: { latitudeDeg, longitudeDeg }, signal }))
        .timeZone,
    staleTime: Infinity,
  });
}

/** What the skyline does to the dates of a saved place. */
export function skylineEffectsQuery(placeId: string, year: number) {
  return queryOptions({
    queryKey: ['skyline-effects', placeId, year],
    queryFn: async ({ signal }) =>
      (await callApi(starsEndpoints.skylineEffects, { params: { placeId }, query: { year }, signal })).items,
  });
}

/** The same for a place as it stands on the screen. */
export function skylinePreviewQuery(communityId: string, place: PlaceInput, year: number) {
  return queryOptions({
    queryKey: ['skyline-effects', communityId, 'preview', year, place],
    queryFn: async ({ signal }) =>
      (
        await callApi(starsEndpoints.previewSkylineEffects, {
          params: { communityId },
          body: { place, year },
          signal,
        })
      ).items,
    gcTime: 60_000,
  });
}
