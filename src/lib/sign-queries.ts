import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { signsEndpoints, type OwnSeen, type Sign, type SightingInput } from '#shared/contracts/signs.js';
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

/** When signs in the own words of entries were seen. */
export function ownSeenQuery(communityId: string) {
  return queryOptions({
    queryKey: ['signs', communityId, 'own'],
    queryFn: async ({ signal }) =>
      (await callApi(signsEndpoints.listOwnSeen, { params: { communityId }, signal })).items,
  });
}

/** The entry in whose own words a sign is described. */
export interface SignHome {
  calendarId: string;
  entryId: string;
}

/** Says that a sign in an entry's own words was seen, or takes that back. */
export function useOwnSeeing(communityId: string, { calendarId, entryId }: SignHome) {
  const client = useQueryClient();
  const onSuccess = async (seen: OwnSeen) => {
    client.setQueryData(
      ownSeenQuery(communityId).queryKey,
      (list) => list && [...list.filter((one) => one.entryId !== entryId || one.ownId !== seen.ownId), seen],
    );
    await client.invalidateQueries({ queryKey: ownSeenQuery(communityId).queryKey });
  };
  const mark = useMutation({
    mutationFn: ({ ownId, body }: { ownId: string; body: SightingInput }) =>
      callApi(signsEndpoints.markOwnSeen, { params: { calendarId, entryId, ownId }, body }),
    onSuccess,
  });
  const takeBack = useMutation({
    mutationFn: ({ ownId, seenId }: { ownId: string; seenId: string }) =>
      callApi(signsEndpoints.takeBackOwnSeen, { params: { calendarId, entryId, ownId, seenId } }),
    onSuccess,
  });
  return { mark, takeBack };
}
