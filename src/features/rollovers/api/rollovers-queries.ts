import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { rolloversEndpoints } from '#shared/contracts/rollovers.js';
import { callApi } from '#src/lib/api-client.js';
import { calendarKeys } from '#src/lib/calendar-queries.js';

/** What the new year changed in a draft that was rolled over. */
export function rolloverQuery(calendarId: string) {
  return queryOptions({
    queryKey: [...calendarKeys.one(calendarId), 'rollover'],
    queryFn: ({ signal }) => callApi(rolloversEndpoints.read, { params: { calendarId }, signal }),
  });
}

export function useRollOver(calendarId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => callApi(rolloversEndpoints.rollOver, { params: { calendarId } }),
    onSettled: () => client.invalidateQueries({ queryKey: [...calendarKeys.all, 'list'] }),
  });
}
