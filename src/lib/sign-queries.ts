import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { signsEndpoints, type Sign, type SightingInput } from '#shared/contracts/signs.js';
import { callApi } from './api-client.js';

/** The village's signs by name, with the days on which they were seen lately. */
export function signsQuery(communityId: string) {
  return queryOptions({
    queryKey: ['signs', communityId],
    queryFn: async ({ signal }) =>
      (await callApi(signsEndpoints.list, { params: { communityId }, signal })).items,
  });
}

/** Puts one sign's new state into the list that is at hand. */
export function useTakeSign(communityId: string): (sign: Sign) => void {
  const client = useQueryClient();
  return (sign) => {
    client.setQueryData(signsQuery(communityId).queryKey, (list) =>
      list?.map((one) => (one.id === sign.id ? sign : one)),
    );
    void client.invalidateQueries({ queryKey: signsQuery(communityId).queryKey });
  };
}

/** Says that a sign was seen, or takes that back. */
export function useSeeing(communityId: string) {
  const onSuccess = useTakeSign(communityId);
  const mark = useMutation({
    mutationFn: ({ signId, body }: { signId: string; body: SightingInput }) =>
      callApi(signsEndpoints.markSeen, { params: { communityId, signId }, body }),
    onSuccess,
  });
  const takeBack = useMutation({
    mutationFn: ({ signId, seenId }: { signId: string; seenId: string }) =>
      callApi(signsEndpoints.takeBackSeen, { params: { communityId, signId, seenId } }),
    onSuccess,
  });
  return { mark, takeBack };
}
