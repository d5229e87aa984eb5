import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { notesEndpoints, type NoteSubjectType } from '#shared/contracts/notes.js';
import type { SharedItemType } from '#shared/contracts/sharing.js';
import { withdrawalsEndpoints, type WithdrawalInput } from '#shared/contracts/withdrawals.js';
import { callApi } from '#src/lib/api-client.js';
import { forgetThings } from '#src/lib/forget-things.js';

export interface Item {
  communityId: string;
  itemType: SharedItemType;
  itemId: string;
}

const ALL = 'withdrawals';

export function itemStateQuery({ communityId, itemType, itemId }: Item) {
  return queryOptions({
    queryKey: [ALL, communityId, 'state', itemType, itemId],
    queryFn: ({ signal }) =>
      callApi(withdrawalsEndpoints.readState, { params: { communityId, itemType, itemId }, signal }),
  });
}

/** What is hidden for now and this person may bring back. */
export function pausedQuery(communityId: string) {
  return queryOptions({
    queryKey: [ALL, communityId, 'paused'],
    queryFn: async ({ signal }) =>
      (await callApi(withdrawalsEndpoints.listPaused, { params: { communityId }, signal })).items,
  });
}

/** Printed sheets that may hang with something that was taken back. */
export function sheetsToReplaceQuery(communityId: string) {
  return queryOptions({
    queryKey: [ALL, communityId, 'sheets'],
    queryFn: async ({ signal }) =>
      (await callApi(withdrawalsEndpoints.listSheets, { params: { communityId }, signal })).items,
  });
}

/** Takes it back for good, here too: whatever this device kept or read of it is forgotten at once. */
export function useWithdraw(item: Item) {
  const client = useQueryClient();
  const lookAgain = useLookAgain();
  return useMutation({
    mutationFn: (body: WithdrawalInput) =>
      callApi(withdrawalsEndpoints.withdraw, { params: { ...item }, body }),
    onSuccess: async () => {
      await forgetThings(client, [item.itemId]);
      await lookAgain();
    },
  });
}

export function usePause(item: Item) {
  const client = useQueryClient();
  const lookAgain = useLookAgain();
  return useMutation({
    mutationFn: (askedById: string | null) =>
      callApi(withdrawalsEndpoints.pause, { params: { ...item }, body: { askedById } }),
    onSuccess: async () => {
      await forgetThings(client, [item.itemId]);
      await lookAgain();
    },
  });
}

export function useResume(item: Item) {
  const lookAgain = useLookAgain();
  return useMutation({
    mutationFn: () => callApi(withdrawalsEndpoints.resume, { params: { ...item } }),
    onSuccess: lookAgain,
  });
}

export function useTakeNameOff(item: Item) {
  const lookAgain = useLookAgain();
  return useMutation({
    mutationFn: () => callApi(withdrawalsEndpoints.takeNameOff, { params: { ...item } }),
    onSuccess: lookAgain,
  });
}

/** The voice goes for good, what was written out from it stays. */
export function useRemoveSound({ communityId, itemId }: Item) {
  const lookAgain = useLookAgain();
  return useMutation({
    mutationFn: (askedById: string | null) =>
      callApi(withdrawalsEndpoints.removeSound, { params: { communityId, itemId }, body: { askedById } }),
    onSuccess: lookAgain,
  });
}

/** Says what it should say instead: a note to whoever writes it, seen by those who see the thing. */
export function useAskCorrection({ communityId, itemId }: Item, subjectType: NoteSubjectType) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (text: string) =>
      callApi(notesEndpoints.add, {
        params: { communityId },
        body: {
          ...{ subjectType, subjectId: itemId, pin: { at: 'whole' }, text },
          ...{ isSpoken: false, level: 'village' },
        },
      }),
    onSuccess: () => client.invalidateQueries({ queryKey: ['notes', communityId] }),
  });
}

export function useSheetReplaced(communityId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (withdrawalId: string) =>
      callApi(withdrawalsEndpoints.sheetReplaced, { params: { communityId, withdrawalId } }),
    onSuccess: () => client.invalidateQueries({ queryKey: [ALL, communityId, 'sheets'] }),
  });
}

/** Such a thing stands in drafts, versions, tables and Today. */
function useLookAgain(): () => Promise<void> {
  const client = useQueryClient();
  return () => client.invalidateQueries();
}
