import { infiniteQueryOptions } from '@tanstack/react-query';
import { auditEndpoints } from '#shared/contracts/audit.js';
import { callApi } from '#src/lib/api-client.js';

/** The records, page after page towards older ones. */
export function auditQuery(communityId: string) {
  return infiniteQueryOptions({
    queryKey: ['audit', communityId],
    queryFn: ({ pageParam, signal }) =>
      callApi(auditEndpoints.list, {
        params: { communityId },
        query: pageParam === null ? {} : { cursor: pageParam },
        signal,
      }),
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.nextCursor,
    // What was done a moment ago must be here when somebody looks.
    staleTime: 0,
  });
}
