import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { exportsEndpoints } from '#shared/contracts/exports.js';
import { callApi } from '#src/lib/api-client.js';

/** What would go along with a version or the draft: how much, and how large it is. */
export function takeAlongQuery(calendarId: string, number: string) {
  return queryOptions({
    queryKey: ['take-along', calendarId, number],
    queryFn: ({ signal }) => callApi(exportsEndpoints.takeAlong, { params: { calendarId, number }, signal }),
    // Levels, seasons and agreements change from one look to the next.
    staleTime: 0,
  });
}

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
