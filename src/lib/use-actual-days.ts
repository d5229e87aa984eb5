import { useQueryClient } from '@tanstack/react-query';
import { actualDaysEndpoints, type ActualDaysInput } from '#shared/contracts/actual-days.js';
import { callApi } from '#src/lib/api-client.js';
import { calendarKeys } from '#src/lib/calendar-queries.js';
import { useKeyedWrite } from '#src/lib/keyed-write.js';

/** Writes down when an entry was done, or takes it back; days that are counted from it are read anew. */
export function useActualDays(calendarId: string, entryId: string) {
  const client = useQueryClient();
  const params = { calendarId, entryId };
  const readAnew = () => void client.invalidateQueries({ queryKey: calendarKeys.one(calendarId) });
  const after = { onSuccess: readAnew, onError: readAnew };
  const put = useKeyedWrite({
    write: (body: ActualDaysInput, writeKey) => callApi(actualDaysEndpoints.put, { params, body, writeKey }),
    ...after,
  });
  const remove = useKeyedWrite({
    write: (_nothing: undefined, writeKey) => callApi(actualDaysEndpoints.remove, { params, writeKey }),
    ...after,
  });
  return { put, remove };
}
