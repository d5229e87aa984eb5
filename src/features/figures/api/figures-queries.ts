import { queryOptions } from '@tanstack/react-query';
import { figuresEndpoints } from '#shared/contracts/figures.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { callApi } from '#src/lib/api-client.js';

export function figuresQuery(communityId: string) {
  return queryOptions({
    queryKey: ['figures', communityId],
    queryFn: async ({ signal }) =>
      (await callApi(figuresEndpoints.list, { params: { communityId }, signal })).items,
  });
}

/** One figure. One that is not there belongs to the page for missing things. */
export function figureQuery(communityId: string, figureId: string) {
  return queryOptions({
    queryKey: ['figures', communityId, figureId],
    queryFn: ({ signal }) => callApi(figuresEndpoints.read, { params: { communityId, figureId }, signal }),
    throwOnError: (cause: Error) => cause instanceof ApiProblem && cause.slug === 'not-found',
  });
}

/** Where the stars stand. It never changes while the application is open. */
export function chartQuery() {
  return queryOptions({
    queryKey: ['chart'],
    queryFn: ({ signal }) => callApi(figuresEndpoints.chart, { signal }),
    staleTime: Infinity,
  });
}
