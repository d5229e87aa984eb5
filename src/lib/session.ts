import { queryOptions, useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { useCallback } from 'react';
import { sessionEndpoints, type SessionState } from '#shared/contracts/session.js';
import { callApi } from './api-client.js';
import { keepCsrfToken } from './csrf.js';
import { SESSION_KEY } from './query-client.js';

/** Who is here, to which communities they belong, and the token for writes. */
export const sessionQuery = queryOptions({
  queryKey: SESSION_KEY,
  queryFn: async ({ signal }) => {
    const state = await callApi(sessionEndpoints.read, { signal });
    keepCsrfToken(state.csrfToken);
    return state;
  },
  staleTime: 5 * 60_000,
});

/** Suspends until the session is known; `person` is null for a visitor. */
export function useSession(): SessionState {
  return useSuspenseQuery(sessionQuery).data;
}

/** Whose word is given on this device: the helped person's while somebody is helped, else one's own. */
export function useActing(): { id: string; displayName: string } {
  const { person, helping } = useSession();
  if (helping !== undefined) return { id: helping.personId, displayName: helping.displayName };
  return { id: person?.id ?? '', displayName: person?.displayName ?? '' };
}

/** What was read for one is not shown to another, nor for one who is helped to whoever helps. */
function reader({ person, helping }: SessionState): string {
  return [person?.id, helping?.personId, helping?.shownPin].join(' ');
}

/**
 * Takes over the answer of a session call. Whatever was read for another person is forgotten, except on a
 * change of password, where the person stays the same.
 */
export function useTakeSession(): (state: SessionState) => void {
  const client = useQueryClient();
  return useCallback(
    (state: SessionState) => {
      keepCsrfToken(state.csrfToken);
      const before = client.getQueryData(sessionQuery.queryKey);
      if (before === undefined || reader(before) !== reader(state)) {
        client.removeQueries({ predicate: (query) => query.queryKey[0] !== SESSION_KEY[0] });
      }
      client.setQueryData(sessionQuery.queryKey, state);
    },
    [client],
  );
}
