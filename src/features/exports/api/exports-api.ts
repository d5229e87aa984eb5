import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { exportsEndpoints } from '#shared/contracts/exports.js';
import { callApi } from '#src/lib/api-client.js';

export function feedsQuery(communityId: string) {
  return queryOptions({
    queryKey: ['feeds', communityId],
    queryFn: async ({ signal }) =>
      (await callApi(exportsEndpoints.listFeeds, { params: { communityId }, signal })).items,
  });
}

export function useMakeFeed(communityId: string) {
  return useMutation({
    mutationFn: () => callApi(exportsEndpoints.makeFeed, { params: { communityId } }),
    onSettled: useRefresh(communityId),
  });
}

export function useEndFeed(communityId: string) {
  return useMutation({
    mutationFn: (feedId: string) => callApi(exportsEndpoints.endFeed, { params: { communityId, feedId } }),
    onSettled: useRefresh(communityId),
  });
}

function useRefresh(communityId: string) {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: feedsQuery(communityId).queryKey });
}

/** The whole address that a calendar on a telephone is given. */
export function feedAddress(key: string): string {
  const address = new URL(exportsEndpoints.readFeed.path, window.location.origin);
  address.searchParams.set('key', key);
  return address.href;
}
