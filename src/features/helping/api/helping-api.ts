import { queryOptions, useMutation } from '@tanstack/react-query';
import { helpingEndpoints, type HelpingInput } from '#shared/contracts/helping.js';
import { callApi } from '#src/lib/api-client.js';
import { useTakeSession } from '#src/lib/session.js';

/** Whom the person may help. */
export function helpableQuery(communityId: string) {
  return queryOptions({
    queryKey: ['helpable', communityId],
    queryFn: async ({ signal }) =>
      (await callApi(helpingEndpoints.list, { params: { communityId }, signal })).items,
  });
}

export function useStartHelping(communityId: string) {
  const takeSession = useTakeSession();
  return useMutation({
    mutationFn: (body: HelpingInput) => callApi(helpingEndpoints.start, { params: { communityId }, body }),
    onSuccess: takeSession,
  });
}

export function useEndHelping() {
  const takeSession = useTakeSession();
  return useMutation({
    mutationFn: (communityId: string) => callApi(helpingEndpoints.end, { params: { communityId } }),
    onSuccess: takeSession,
  });
}
