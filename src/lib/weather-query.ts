import { queryOptions } from '@tanstack/react-query';
import { weatherEndpoints } from '#shared/contracts/weather.js';
import { callApi } from './api-client.js';

/** Notices that hold today, and the rain of the last days. */
export function weatherQuery(communityId: string) {
  return queryOptions({
    queryKey: ['weather', communityId],
    queryFn: ({ signal }) => callApi(weatherEndpoints.read, { params: { communityId }, signal }),
  });
}
