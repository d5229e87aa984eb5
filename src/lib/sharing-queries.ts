import { queryOptions } from '@tanstack/react-query';
import { peopleEndpoints } from '#shared/contracts/people.js';
import { sharingEndpoints } from '#shared/contracts/sharing.js';
import { callApi } from './api-client.js';

export const sharingKeys = {
  all: ['sharing'] as const,
  groups: (communityId: string) => ['sharing', 'groups', communityId] as const,
};

/** The village's groups by name. */
export function groupsQuery(communityId: string) {
  return queryOptions({
    queryKey: sharingKeys.groups(communityId),
    queryFn: async ({ signal }) =>
      (await callApi(sharingEndpoints.listGroups, { params: { communityId }, signal })).items,
  });
}

/** People of the village by name, for those who may read who belongs to it. */
export function villagePeopleQuery(communityId: string) {
  return queryOptions({
    queryKey: ['people', communityId, 'names'],
    queryFn: async ({ signal }) =>
      (await callApi(peopleEndpoints.listPeople, { params: { communityId }, signal })).items,
  });
}
