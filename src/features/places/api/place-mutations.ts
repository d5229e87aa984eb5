import { useMutation, useQueryClient, type QueryClient } from '@tanstack/react-query';
import { placesEndpoints, type Place, type PlaceInput } from '#shared/contracts/places.js';
import { callApi } from '#src/lib/api-client.js';
import { sessionQuery } from '#src/lib/session.js';
import { placeQuery } from './places-queries.js';

export function useCreatePlace(communityId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: PlaceInput) => callApi(placesEndpoints.create, { params: { communityId }, body }),
    onSuccess: (place) => {
      takeSaved(client, place);
    },
  });
}

export function useUpdatePlace(placeId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ input, version }: { input: PlaceInput; version: number }) =>
      callApi(placesEndpoints.update, { params: { placeId }, body: { ...input, version } }),
    onSuccess: (place) => {
      takeSaved(client, place);
    },
  });
}

/** A place moves dates everywhere: stars, drafts of calendars, today. Only who is signed in stays as it is. */
function takeSaved(client: QueryClient, place: Place): void {
  const kept = [sessionQuery.queryKey[0], placeQuery(place.id).queryKey[0], 'time-zone'];
  client.setQueryData(placeQuery(place.id).queryKey, place);
  void client.invalidateQueries({ predicate: (query) => !kept.includes(String(query.queryKey[0])) });
}
