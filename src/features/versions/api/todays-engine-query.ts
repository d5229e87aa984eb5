import { queryOptions } from '@tanstack/react-query';
import { versionsEndpoints } from '#shared/contracts/versions.js';
import { callApi } from '#src/lib/api-client.js';
import { calendarKeys } from '#src/lib/calendar-queries.js';

/** What today's engine would say of a version. */
export function todaysEngineQuery(calendarId: string, number: number) {
  return queryOptions({
    queryKey: [...calendarKeys.version(calendarId, number), 'todays-engine'],
    queryFn: ({ signal }) =>
      callApi(versionsEndpoints.readTodaysEngine, {
        params: { calendarId, number: String(number) },
        signal,
      }),
  });
}
