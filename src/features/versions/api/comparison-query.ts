import { queryOptions } from '@tanstack/react-query';
import { versionsEndpoints } from '#shared/contracts/versions.js';
import { callApi } from '#src/lib/api-client.js';
import { calendarKeys } from '#src/lib/calendar-queries.js';

/** Two versions entry by entry; either side may be the draft. */
export function comparisonQuery(calendarId: string, from: string, to: string) {
  return queryOptions({
    queryKey: [...calendarKeys.one(calendarId), 'comparison', from, to],
    queryFn: ({ signal }) =>
      callApi(versionsEndpoints.compare, { params: { calendarId }, query: { from, to }, signal }),
  });
}
