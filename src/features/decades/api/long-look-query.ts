import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { decadesEndpoints } from '#shared/contracts/decades.js';
import { callApi } from '#src/lib/api-client.js';
import { calendarKeys } from '#src/lib/calendar-queries.js';

/** A calendar's entries in ten years; without a number by what the village goes by. */
export function longLookQuery(calendarId: string, from: number, number: string | undefined) {
  return queryOptions({
    queryKey: [...calendarKeys.one(calendarId), 'long-look', from, number ?? ''],
    queryFn: ({ signal }) =>
      callApi(decadesEndpoints.read, {
        params: { calendarId },
        query: { from, ...(number !== undefined && { number }) },
        signal,
      }),
    placeholderData: keepPreviousData,
  });
}
