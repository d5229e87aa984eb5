import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import {
  cardsEndpoints,
  type CardPrint,
  type cardFirstUse,
  type cardSignIn,
} from '#shared/contracts/cards.js';
import { callApi, callApiForFile } from '#src/lib/api-client.js';
import { useTakeSession } from '#src/lib/session.js';

export function cardsQuery(communityId: string) {
  return queryOptions({
    queryKey: ['cards', communityId],
    queryFn: async ({ signal }) =>
      (await callApi(cardsEndpoints.list, { params: { communityId }, signal })).items,
  });
}

export function useMakeCard(communityId: string) {
  return useMutation({
    mutationFn: (personId: string) => callApi(cardsEndpoints.make, { params: { communityId, personId } }),
    onSettled: useRefreshCards(communityId),
  });
}

export function useEndCard(communityId: string) {
  return useMutation({
    mutationFn: (personId: string) => callApi(cardsEndpoints.end, { params: { communityId, personId } }),
    onSettled: useRefreshCards(communityId),
  });
}

export function usePrintCard(communityId: string) {
  return useMutation({
    mutationFn: ({ personId, ...body }: CardPrint & { personId: string }) =>
      callApiForFile(cardsEndpoints.print, { params: { communityId, personId }, body }),
  });
}

export function useOpenCard() {
  return useMutation({ mutationFn: (code: string) => callApi(cardsEndpoints.open, { body: { code } }) });
}

export function useCardSignIn() {
  const takeSession = useTakeSession();
  return useMutation({
    mutationFn: ({ isNew, ...body }: z.input<typeof cardSignIn> & { isNew: boolean }) =>
      isNew
        ? callApi(cardsEndpoints.choosePin, { body: body satisfies z.input<typeof cardFirstUse> })
        : callApi(cardsEndpoints.signIn, { body }),
    onSuccess: takeSession,
  });
}

function useRefreshCards(communityId: string) {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: cardsQuery(communityId).queryKey });
}
