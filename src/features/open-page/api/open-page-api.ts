import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { openPageEndpoints, type NoNameInput, type PlaceShown } from '#shared/contracts/open-page.js';
import { apiUrl, callApi } from '#src/lib/api-client.js';
import { paths } from '#src/lib/paths.js';

export function openPageQuery(key: string) {
  return queryOptions({
    queryKey: ['open-page', key],
    queryFn: ({ signal }) => callApi(openPageEndpoints.read, { query: { key }, signal }),
  });
}

export function openPageStateQuery(communityId: string) {
  return queryOptions({
    queryKey: ['open-page-state', communityId],
    queryFn: ({ signal }) => callApi(openPageEndpoints.state, { params: { communityId }, signal }),
  });
}

/** What is open and does not stand there, with the reasons. */
export function leftOutQuery(communityId: string) {
  return queryOptions({
    queryKey: ['open-page-left-out', communityId],
    queryFn: async ({ signal }) =>
      (await callApi(openPageEndpoints.leftOut, { params: { communityId }, signal })).items,
  });
}

export function useSwitchOn(communityId: string) {
  return useMutation({
    mutationFn: (placeShown: PlaceShown) =>
      callApi(openPageEndpoints.switchOn, { params: { communityId }, body: { placeShown } }),
    onSettled: useRefresh(communityId),
  });
}

export function useSwitchOff(communityId: string) {
  return useMutation({
    mutationFn: () => callApi(openPageEndpoints.switchOff, { params: { communityId } }),
    onSettled: useRefresh(communityId),
  });
}

/** That a name which was found is none; refused where words or people are others by now. */
export function useSayNoName(communityId: string) {
  return useMutation({
    mutationFn: async (body: NoNameInput) => {
      await callApi(openPageEndpoints.sayNoName, { params: { communityId }, body });
    },
    onSettled: useRefreshLeftOut(communityId),
  });
}

export function useTakeBackNoName(communityId: string) {
  return useMutation({
    mutationFn: (noNameId: string) =>
      callApi(openPageEndpoints.takeBackNoName, { params: { communityId, noNameId } }),
    onSettled: useRefreshLeftOut(communityId),
  });
}

function useRefreshLeftOut(communityId: string) {
  const client = useQueryClient();
  return async () => {
    await client.invalidateQueries({ queryKey: leftOutQuery(communityId).queryKey });
    await client.invalidateQueries({ queryKey: ['open-page'] });
  };
}

function useRefresh(communityId: string) {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: openPageStateQuery(communityId).queryKey });
}

/** The whole address, for people and for paper. */
export function openPageAddress(key: string): string {
  return new URL(paths.openPage(key), window.location.origin).href;
}

/** The picture of it; another one for another address. */
export function openPageCodeUrl(communityId: string, key: string): string {
  return `${apiUrl(openPageEndpoints.code, { params: { communityId } })}?of=${encodeURIComponent(key.slice(0, 8))}`;
}

/** A card to hang up, with the address to scan and to type. */
export function openPageCardUrl(communityId: string): string {
  return apiUrl(openPageEndpoints.card, { params: { communityId } });
}
