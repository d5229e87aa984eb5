import { useMutation, useQueryClient } from '@tanstack/react-query';
import { versionsEndpoints, type Version } from '#shared/contracts/versions.js';
import { callApi } from '#src/lib/api-client.js';
import { calendarKeys, versionQuery } from '#src/lib/calendar-queries.js';

/** A version's state changed: shows the answer at once, and lets the calendar, its draft and the lists look again. */
function useVersionChanged(calendarId: string) {
  const client = useQueryClient();
  return (version: Version) => {
    client.setQueryData(versionQuery(calendarId, version.number).queryKey, version);
    void client.invalidateQueries({ queryKey: [...calendarKeys.all, 'list'] });
    void client.invalidateQueries({ queryKey: ['today'] });
    return client.invalidateQueries({ queryKey: calendarKeys.one(calendarId) });
  };
}

export function useAskChanges(calendarId: string, number: number) {
  const onSuccess = useVersionChanged(calendarId);
  return useMutation({
    mutationFn: (body: { reason: 'taken-back' | 'elder-asked'; note: string }) =>
      callApi(versionsEndpoints.askChanges, { params: { calendarId, number: String(number) }, body }),
    onSuccess,
  });
}

export function usePublish(calendarId: string, number: number) {
  const onSuccess = useVersionChanged(calendarId);
  return useMutation({
    mutationFn: () => callApi(versionsEndpoints.publish, { params: { calendarId, number: String(number) } }),
    onSuccess,
  });
}

export function useRecall(calendarId: string, number: number) {
  const onSuccess = useVersionChanged(calendarId);
  return useMutation({
    mutationFn: (note: string) =>
      callApi(versionsEndpoints.recall, { params: { calendarId, number: String(number) }, body: { note } }),
    onSuccess,
  });
}

/** Sets the draft back to what a version says; answers what became of each entry. */
export function useRestore(calendarId: string, number: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => callApi(versionsEndpoints.restore, { params: { calendarId, number: String(number) } }),
    onSettled: () => client.invalidateQueries({ queryKey: calendarKeys.all }),
  });
}
