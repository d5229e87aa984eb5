import { queryOptions } from '@tanstack/react-query';
import { todayEndpoints } from '#shared/contracts/today.js';
import { callApi } from '#src/lib/api-client.js';

/** What to look for at a place now, which work is open, and what waits for this person. */
export function todayQuery(communityId: string, placeId: string | null) {
  return queryOptions({
    queryKey: ['today', communityId, placeId],
    queryFn: ({ signal }) =>
      callApi(todayEndpoints.read, {
        params: { communityId },
        query: placeId === null ? {} : { placeId },
        signal,
      }),
    // Somebody may have answered while this person was elsewhere.
    staleTime: 0,
  });
}
