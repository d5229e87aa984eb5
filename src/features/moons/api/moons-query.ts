import { queryOptions } from '@tanstack/react-query';
import { moonsEndpoints, type MoonQuestion } from '#shared/contracts/moons.js';
import { callApi } from '#src/lib/api-client.js';

/** The Moons of a year at a place, numbered by the sign that the question names. */
export function moonsQuery(placeId: string, question: MoonQuestion) {
  return queryOptions({
    queryKey: ['moons', placeId, question],
    queryFn: ({ signal }) => callApi(moonsEndpoints.read, { params: { placeId }, query: question, signal }),
  });
}
