import { queryOptions } from '@tanstack/react-query';
import { calendarsEndpoints } from '#shared/contracts/calendars.js';
import { callApi } from '#src/lib/api-client.js';
import { calendarKeys } from '#src/lib/calendar-queries.js';

/** The calendars of a village, newest year first. */
export function calendarsQuery(communityId: string) {
  return queryOptions({
    queryKey: [...calendarKeys.all, 'list', communityId],
    queryFn: async ({ signal }) =>
      (await callApi(calendarsEndpoints.list, { query: { communityId }, signal })).items,
  });
}

/** Entries of the draft with their dates, in their order. */
export function entriesQuery(calendarId: string) {
  return queryOptions({
    queryKey: calendarKeys.entries(calendarId),
    queryFn: ({ signal }) => callApi(calendarsEndpoints.listEntries, { params: { calendarId }, signal }),
  });
}
