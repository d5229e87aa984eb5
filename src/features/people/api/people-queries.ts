import { queryOptions } from '@tanstack/react-query';
import { peopleEndpoints } from '#shared/contracts/people.js';
import { callApi } from '#src/lib/api-client.js';

export function peopleQuery(communityId: string) {
  return queryOptions({
    queryKey: ['people', communityId],
    queryFn: async ({ signal }) =>
      (await callApi(peopleEndpoints.listPeople, { params: { communityId }, signal })).items,
  });
}
