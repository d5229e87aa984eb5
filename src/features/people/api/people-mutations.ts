import { useMutation, useQueryClient } from '@tanstack/react-query';
import { lettersEndpoints } from '#shared/contracts/letters.js';
import {
  peopleEndpoints,
  type CommunityUpdate,
  type PersonInput,
  type PersonUpdate,
} from '#shared/contracts/people.js';
import { callApi } from '#src/lib/api-client.js';
import { communityQuery } from '#src/lib/calendar-queries.js';
import { peopleQuery } from './people-queries.js';

export function useAddPerson(communityId: string) {
  return useMutation({
    mutationFn: (body: PersonInput) => callApi(peopleEndpoints.addPerson, { params: { communityId }, body }),
    onSettled: useRefreshPeople(communityId),
  });
}

export function useSetRoles(communityId: string) {
  return useMutation({
    mutationFn: ({ personId, ...body }: PersonUpdate & { personId: string }) =>
      callApi(peopleEndpoints.updatePerson, { params: { communityId, personId }, body }),
    onSettled: useRefreshPeople(communityId),
  });
}

export function useRenewCode(communityId: string) {
  return useMutation({
    mutationFn: (personId: string) =>
      callApi(peopleEndpoints.renewCode, { params: { communityId, personId } }),
    onSettled: useRefreshPeople(communityId),
  });
}

export function useSendInvitation(communityId: string) {
  return useMutation({
    mutationFn: (personId: string) => callApi(lettersEndpoints.invite, { params: { communityId, personId } }),
    onSettled: useRefreshPeople(communityId),
  });
}

export function useRemovePerson(communityId: string) {
  return useMutation({
    mutationFn: (personId: string) =>
      callApi(peopleEndpoints.removePerson, { params: { communityId, personId } }),
    onSettled: useRefreshPeople(communityId),
  });
}

export function useSaveCommunity(communityId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: CommunityUpdate) =>
      callApi(peopleEndpoints.updateCommunity, { params: { communityId }, body }),
    onSuccess: (saved) => {
      client.setQueryData(communityQuery(communityId).queryKey, saved);
    },
  });
}

function useRefreshPeople(communityId: string) {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: peopleQuery(communityId).queryKey });
}
