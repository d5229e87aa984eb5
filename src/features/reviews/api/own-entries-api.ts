import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { reviewsEndpoints, type OwnAnswerInput } from '#shared/contracts/reviews.js';
import { callApi } from '#src/lib/api-client.js';
import { calendarKeys } from '#src/lib/calendar-queries.js';
import type { VersionRef } from './reviews-api.js';

const paramsOf = ({ calendarId, number }: VersionRef) => ({ calendarId, number: String(number) });

/** What of a submission the person keeps with others, and nothing else of it. */
export function ownEntriesQuery({ calendarId, number }: VersionRef) {
  return queryOptions({
    queryKey: [...calendarKeys.version(calendarId, number), 'own'],
    queryFn: ({ signal }) =>
      callApi(reviewsEndpoints.readOwn, { params: paramsOf({ calendarId, number }), signal }),
  });
}

export function usePutOwnAnswer(ref: VersionRef) {
  return useMutation({
    mutationFn: ({ entryId, ...body }: OwnAnswerInput & { entryId: string }) =>
      callApi(reviewsEndpoints.putOwnAnswer, { params: { ...paramsOf(ref), entryId }, body }),
    onSettled: useLookAgain(ref),
  });
}

export function useLetOwnStand(ref: VersionRef) {
  return useMutation({
    mutationFn: (entryId: string) =>
      callApi(reviewsEndpoints.letOwnStand, { params: { ...paramsOf(ref), entryId } }),
    onSettled: useLookAgain(ref),
  });
}

export function useTakeBackOwnAnswer(ref: VersionRef) {
  return useMutation({
    mutationFn: (entryId: string) =>
      callApi(reviewsEndpoints.takeBackOwnAnswer, { params: { ...paramsOf(ref), entryId } }),
    onSettled: useLookAgain(ref),
  });
}

function useLookAgain({ calendarId }: VersionRef) {
  const client = useQueryClient();
  return () =>
    Promise.all([
      client.invalidateQueries({ queryKey: calendarKeys.one(calendarId) }),
      client.invalidateQueries({ queryKey: ['today'] }),
    ]);
}
