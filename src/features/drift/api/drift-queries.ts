import { queryOptions } from '@tanstack/react-query';
import { driftEndpoints } from '#shared/contracts/drift.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { callApi } from '#src/lib/api-client.js';

/** A marker's four days across the years. A key that names none belongs to the page for missing things. */
export function driftQuery(placeId: string, markerKey: string, from: number, to: number, year: number) {
  return queryOptions({
    queryKey: ['drift', placeId, markerKey, from, to, year],
    queryFn: ({ signal }) =>
      callApi(driftEndpoints.read, { params: { placeId, markerKey }, query: { from, to, year }, signal }),
    throwOnError: (cause: Error) => cause instanceof ApiProblem && cause.slug === 'not-found',
  });
}
