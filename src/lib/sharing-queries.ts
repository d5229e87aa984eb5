import { queryOptions } from '@tanstack/react-query';
import { peopleEndpoints } from '#shared/contracts/people.js';
import { sharingEndpoints, type SharedItemType } from '#shared/contracts/sharing.js';
import { callApi } from './api-client.js';

/** One thing that has a level of its own. */
export interface ItemRef {
  communityId: string;
  itemType: SharedItemType;
  itemId: string;
}

export const sharingKeys = {
  all: ['sharing'] as const,
  groups: (communityId: string) => ['sharing', 'groups', communityId] as const,
  item: ({ communityId, itemType, itemId }: ItemRef) =>
    ['sharing', 'item', communityId, itemType, itemId] as const,
  asked: (communityId: string) => ['sharing', 'asked', communityId] as const,
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

/** Who may see one thing, who gave it, and a wider circle that was asked for. */
export function itemSharingQuery(ref: ItemRef) {
  return queryOptions({
    queryKey: sharingKeys.item(ref),
    queryFn: ({ signal }) => callApi(sharingEndpoints.readSharing, { params: { ...ref }, signal }),
  });
}

/** Wider circles that wait for this person's word. */
export function askedSharingQuery(communityId: string) {
  return queryOptions({
    queryKey: sharingKeys.asked(communityId),
    queryFn: async ({ signal }) =>
      (await callApi(sharingEndpoints.listAsked, { params: { communityId }, signal })).items,
  });
}
