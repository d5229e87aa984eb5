import { queryOptions } from '@tanstack/react-query';
import { skyMarkersEndpoints, type SkyMarkerSpec } from '#shared/contracts/sky-markers.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { callApi } from './api-client.js';

/** The dates of one sign of the sky at a place in a year. */
export function skyMarkerQuery(placeId: string, year: number, spec: SkyMarkerSpec) {
  return queryOptions({
    queryKey: ['sky-markers', placeId, year, canonicalJson(spec)],
    queryFn: ({ signal }) =>
      callApi(skyMarkersEndpoints.compute, { params: { placeId }, body: { year, spec }, signal }),
  });
}

/** Signs that make sense at a place, with their dates in a year. */
export function skyMarkersQuery(placeId: string, year: number) {
  return queryOptions({
    queryKey: ['sky-markers', placeId, year, 'offered'],
    queryFn: async ({ signal }) =>
      (await callApi(skyMarkersEndpoints.list, { params: { placeId }, query: { year }, signal })).items,
  });
}
