import { queryOptions } from '@tanstack/react-query';
import { airEndpoints } from '#shared/contracts/air.js';
import { callApi } from '#src/lib/api-client.js';
import { ApiProblem } from '#src/lib/api-problem.js';

/** The days of a star or figure in clear, ordinary and hazy air. A key that names none belongs to the page for missing things. */
export function airQuery(placeId: string, markerKey: string, year: number) {
  return queryOptions({
    queryKey: ['air', placeId, markerKey, year],
    queryFn: ({ signal }) =>
      callApi(airEndpoints.read, { params: { placeId, markerKey }, query: { year }, signal }),
    throwOnError: (cause: Error) =>
      cause instanceof ApiProblem && (cause.slug === 'not-found' || cause.slug === 'invalid-input'),
  });
}
