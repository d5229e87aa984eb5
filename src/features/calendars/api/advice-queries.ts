import { queryOptions } from '@tanstack/react-query';
import { driftEndpoints } from '#shared/contracts/drift.js';
import { lookEndpoints } from '#shared/contracts/look.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { callApi } from '#src/lib/api-client.js';

/** The sky of a place does not change while somebody writes. */
const staleTime = Infinity;

/** The Moon beside a star on the day on which it is expected. */
export function moonBesideQuery(
  placeId: string,
  { markerKey, phenomenon, date }: { markerKey: string; phenomenon: Phenomenon; date: string },
) {
  return queryOptions({
    queryKey: ['advice', 'moon', placeId, markerKey, phenomenon, date],
    queryFn: async ({ signal }) => {
      const query = { marker: markerKey, phenomenon, date };
      return (await callApi(lookEndpoints.read, { params: { placeId }, query, signal })).moon;
    },
    staleTime,
  });
}

/** The days of a star in the year since which people go by it, and in the calendar's. */
export function sinceThenQuery(placeId: string, markerKey: string, from: number, to: number) {
  return queryOptions({
    queryKey: ['advice', 'drift', placeId, markerKey, from, to],
    queryFn: async ({ signal }) =>
      (await callApi(driftEndpoints.read, { params: { placeId, markerKey }, query: { from, to }, signal }))
        .epochs,
    staleTime,
  });
}
