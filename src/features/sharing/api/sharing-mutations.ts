import { useMutation, useQueryClient } from '@tanstack/react-query';
import {
  sharingEndpoints,
  type GroupInput,
  type GroupUpdate,
  type ItemSharing,
  type SharingChange,
} from '#shared/contracts/sharing.js';
import { callApi } from '#src/lib/api-client.js';
import { sharingKeys, type ItemRef } from '#src/lib/sharing-queries.js';

export function useAddGroup(communityId: string) {
  return useMutation({
    mutationFn: (body: GroupInput) => callApi(sharingEndpoints.addGroup, { params: { communityId }, body }),
    onSettled: useLookAgainEverywhere(),
  });
}

export function useUpdateGroup(communityId: string) {
  return useMutation({
    mutationFn: ({ groupId, ...body }: GroupUpdate & { groupId: string }) =>
      callApi(sharingEndpoints.updateGroup, { params: { communityId, groupId }, body }),
    onSettled: useLookAgainEverywhere(),
  });
}

export function useChangeSharing(ref: ItemRef) {
  const show = useShowSharing(ref);
  return useMutation({
    mutationFn: (body: SharingChange) =>
      callApi(sharingEndpoints.changeSharing, { params: { ...ref }, body }),
    onSuccess: show,
  });
}

export function useAgreeWider(ref: ItemRef) {
  const show = useShowSharing(ref);
  return useMutation({
    mutationFn: () => callApi(sharingEndpoints.agreeWider, { params: { ...ref } }),
    onSuccess: show,
  });
}

export function useDropWider(ref: ItemRef) {
  const show = useShowSharing(ref);
  return useMutation({
    mutationFn: () => callApi(sharingEndpoints.dropWider, { params: { ...ref } }),
    onSuccess: show,
  });
}

function useShowSharing(ref: ItemRef) {
  const client = useQueryClient();
  const lookAgain = useLookAgainEverywhere();
  return (saved: ItemSharing) => {
    client.setQueryData(sharingKeys.item(ref), saved);
    void lookAgain();
  };
}

/** Lists, counts, versions and boards may all show more or less now than they did. */
function useLookAgainEverywhere() {
  const client = useQueryClient();
  return () => client.invalidateQueries();
}
