import { useMutation, useQueryClient } from '@tanstack/react-query';
import { actualDaysEndpoints, type ActualDaysInput } from '#shared/contracts/actual-days.js';
import { callApi } from '#src/lib/api-client.js';
import { calendarKeys } from '#src/lib/calendar-queries.js';

/** Writes down when an entry was done, or takes it back; days that are counted from it are read anew. */
export function useActualDays(calendarId: string, entryId: string) {
  const client = useQueryClient();
  const params = { calendarId, entryId };
  const onSettled = () => client.invalidateQueries({ queryKey: calendarKeys.one(calendarId) });
  const put = useMutation({
    mutationFn: (body: ActualDaysInput) => callApi(actualDaysEndpoints.put, { params, body }),
    onSettled,
  });
  const remove = useMutation({
    mutationFn: () => callApi(actualDaysEndpoints.remove, { params }),
    onSettled,
  });
  return { put, remove };
}
