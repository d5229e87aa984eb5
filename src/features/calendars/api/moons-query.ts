import { queryOptions } from '@tanstack/react-query';
import { moonsEndpoints } from '#shared/contracts/moons.js';
import { callApi } from '#src/lib/api-client.js';

/** The Moons of a year at a place, from first crescent to first crescent; the new Moon where none is seen. */
export function moonStartsQuery(placeId: string, year: number) {
  return queryOptions({
    queryKey: ['moon-starts', placeId, year],
    queryFn: async ({ signal }) => {
      const { moons } = await callApi(moonsEndpoints.read, { params: { placeId }, query: { year }, signal });
      return moons.map(({ firstCrescent, newMoon }) => (firstCrescent.expected ?? newMoon).dayNumber);
    },
  });
}
