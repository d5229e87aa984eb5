import { useQueries, useQueryClient } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import { withdrawalsEndpoints } from '#shared/contracts/withdrawals.js';
import { dropRecordingsOf } from '#src/features/attachments/model/kept-recordings.js';
import { callApi } from '#src/lib/api-client.js';
import { alsoForget, forgetThings, WITHDRAWN_KEY } from '#src/lib/forget-things.js';
import { useSession } from '#src/lib/session.js';

alsoForget(dropRecordingsOf);

/**
 * At every start, every sign-in and whenever the network is back: what was taken back or is hidden in the person's
 * villages is forgotten by this device.
 */
export function useForgetWithdrawn(): void {
  const client = useQueryClient();
  const { person, memberships } = useSession();
  const forgotten = useRef(new Set<string>());
  const ids = useQueries({
    queries: (person === null ? [] : (memberships ?? [])).map(({ communityId }) => ({
      queryKey: [WITHDRAWN_KEY, person?.id, communityId],
      queryFn: async ({ signal }: { signal: AbortSignal }) =>
        (await callApi(withdrawalsEndpoints.listWithdrawn, { params: { communityId }, signal })).items,
    })),
    combine: (lists) => lists.flatMap(({ data }) => data ?? []).map(({ itemId }) => itemId),
  });
  useEffect(() => {
    const more = ids.filter((id) => !forgotten.current.has(id));
    if (more.length === 0) return;
    forgotten.current = new Set(ids);
    void forgetThings(client, more);
  }, [client, ids]);
}
