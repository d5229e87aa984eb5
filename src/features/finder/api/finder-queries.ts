import { queryOptions } from '@tanstack/react-query';
import { finderEndpoints } from '#shared/contracts/finder.js';
import { callApi, type CallInput } from '#src/lib/api-client.js';

type FindInput = CallInput<typeof finderEndpoints.find>['query'];

/** Markers near the wanted days, best first. */
export function finderQuery(placeId: string, query: FindInput) {
  return queryOptions({
    queryKey: ['finder', placeId, query],
    queryFn: ({ signal }) => callApi(finderEndpoints.find, { params: { placeId }, query, signal }),
    gcTime: 5 * 60_000,
  });
}

/** Every star and figure by its names, to choose an old sign from. */
export function markerNamesQuery(placeId: string) {
  return queryOptions({
    queryKey: ['finder-names', placeId],
    queryFn: async ({ signal }) =>
      (await callApi(finderEndpoints.names, { params: { placeId }, signal })).items,
    staleTime: Number.POSITIVE_INFINITY,
  });
}
