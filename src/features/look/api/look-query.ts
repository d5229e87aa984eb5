import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { lookEndpoints, type LookQuery } from '#shared/contracts/look.js';
import { apiUrl, callApi } from '#src/lib/api-client.js';

/** What is looked for, and on which day; without a date the next one that serves. */
export type LookQuestion = Pick<LookQuery, 'marker' | 'phenomenon' | 'date'>;

export function lookQuery(placeId: string, question: LookQuestion) {
  return queryOptions({
    queryKey: ['look', placeId, question],
    queryFn: ({ signal }) => callApi(lookEndpoints.read, { params: { placeId }, query: question, signal }),
    // While days are stepped through, the picture stays.
    placeholderData: keepPreviousData,
  });
}

/** The watch card of the same day. */
export function lookCardUrl(placeId: string, question: LookQuestion): string {
  return apiUrl(lookEndpoints.pdf, { params: { placeId }, query: question });
}
