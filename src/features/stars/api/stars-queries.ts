import { queryOptions } from '@tanstack/react-query';
import { starsEndpoints } from '#shared/contracts/stars.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { callApi } from '#src/lib/api-client.js';

/** Every star and figure with its four days at a place in a year. */
export function starTableQuery(placeId: string, year: number) {
  return queryOptions({
    queryKey: ['stars', placeId, year],
    queryFn: ({ signal }) => callApi(starsEndpoints.list, { params: { placeId }, query: { year }, signal }),
    // A table is about a megabyte: only the last few years that were looked at are kept.
    gcTime: 5 * 60_000,
  });
}

/** One star or figure. A key that names none belongs to the page for missing things. */
export function starQuery(placeId: string, markerKey: string, year: number) {
  return queryOptions({
    queryKey: ['star', placeId, markerKey, year],
    queryFn: ({ signal }) =>
      callApi(starsEndpoints.read, { params: { placeId, markerKey }, query: { year }, signal }),
    throwOnError: (cause: Error) =>
      cause instanceof ApiProblem && (cause.slug === 'not-found' || cause.slug === 'invalid-input'),
  });
}
