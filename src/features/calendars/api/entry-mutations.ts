import { useQueryClient, type QueryClient } from '@tanstack/react-query';
import { calendarsEndpoints, type Entry, type EntryInput } from '#shared/contracts/calendars.js';
import { versionsEndpoints } from '#shared/contracts/versions.js';
import { callApi } from '#src/lib/api-client.js';
import { useKeyedWrite } from '#src/lib/keyed-write.js';
import { calendarKeys, versionQuery } from '#src/lib/calendar-queries.js';
import { entriesQuery } from './calendars-queries.js';

/** Shows an answer at once; then everything of the calendar looks again, because other entries may be told more. */
function useEntriesChanged(calendarId: string) {
  const client = useQueryClient();
  return {
    client,
    show: (change: (entries: readonly Entry[]) => Entry[], goneId?: string) => {
      client.setQueryData(
        entriesQuery(calendarId).queryKey,
        (list) => list && { ...list, items: change(list.items) },
      );
      void lookAgain(client, calendarId, goneId);
    },
  };
}

/** What belongs to an entry that is gone is asked for no more, though it may still be on the screen. */
function lookAgain(client: QueryClient, calendarId: string, goneId?: string): Promise<void> {
  void client.invalidateQueries({ queryKey: [...calendarKeys.all, 'list'] });
  return client.invalidateQueries({
    queryKey: calendarKeys.one(calendarId),
    predicate: ({ queryKey }) => goneId === undefined || !queryKey.includes(goneId),
  });
}

/** Takes over an entry that somebody else saved meanwhile. */
export function useTakeEntry(calendarId: string): (entry: Entry) => void {
  const { show } = useEntriesChanged(calendarId);
  return (entry) => {
    show((entries) => entries.map((each) => (each.id === entry.id ? entry : each)));
  };
}

export function useAddEntry(calendarId: string) {
  const { show } = useEntriesChanged(calendarId);
  return useKeyedWrite({
    write: (content: EntryInput, writeKey) =>
      callApi(calendarsEndpoints.addEntry, { params: { calendarId }, body: content, writeKey }),
    onSuccess: (added) => {
      show((entries) => [...entries, added]);
    },
  });
}

export function useUpdateEntry(calendarId: string) {
  const { show } = useEntriesChanged(calendarId);
  return useKeyedWrite({
    write: ({ entryId, ...body }: { entryId: string; content: EntryInput; version: number }, writeKey) =>
      callApi(calendarsEndpoints.updateEntry, { params: { calendarId, entryId }, body, writeKey }),
    onSuccess: (saved) => {
      show((entries) => entries.map((each) => (each.id === saved.id ? saved : each)));
    },
  });
}

export function useDuplicateEntry(calendarId: string) {
  const { show } = useEntriesChanged(calendarId);
  return useKeyedWrite({
    write: (entryId: string, writeKey) =>
      callApi(calendarsEndpoints.duplicateEntry, { params: { calendarId, entryId }, writeKey }),
    onSuccess: (copy) => {
      show((entries) => [...entries.slice(0, copy.position), copy, ...entries.slice(copy.position)]);
    },
  });
}

export function useDeleteEntry(calendarId: string) {
  const { show } = useEntriesChanged(calendarId);
  return useKeyedWrite({
    write: (entryId: string, writeKey) =>
      callApi(calendarsEndpoints.deleteEntry, { params: { calendarId, entryId }, writeKey }),
    onSuccess: (_, entryId) => {
      show((entries) => entries.filter((each) => each.id !== entryId), entryId);
    },
  });
}

export function useRestoreEntry(calendarId: string) {
  const { show } = useEntriesChanged(calendarId);
  return useKeyedWrite({
    write: (entryId: string, writeKey) =>
      callApi(calendarsEndpoints.restoreEntry, { params: { calendarId, entryId }, writeKey }),
    onSuccess: (back) => {
      show((entries) => [...entries.slice(0, back.position), back, ...entries.slice(back.position)]);
    },
  });
}

/** The new order stands on screen at once and goes back if the server refuses it. */
export function useReorderEntries(calendarId: string) {
  const { client } = useEntriesChanged(calendarId);
  const { queryKey } = entriesQuery(calendarId);
  return useKeyedWrite({
    write: (entryIds: readonly string[], writeKey) =>
      callApi(calendarsEndpoints.reorderEntries, {
        params: { calendarId },
        body: { entryIds: [...entryIds] },
        writeKey,
      }),
    onMutate: async (entryIds) => {
      await client.cancelQueries({ queryKey });
      const before = client.getQueryData(queryKey);
      const place = new Map(entryIds.map((id, index) => [id, index]));
      client.setQueryData(
        queryKey,
        (list) =>
          list && {
            ...list,
            items: [...list.items].sort((a, b) => (place.get(a.id) ?? 0) - (place.get(b.id) ?? 0)),
          },
      );
      return before;
    },
    onError: (before) => {
      client.setQueryData(queryKey, before);
      void lookAgain(client, calendarId);
    },
    onSuccess: (list) => {
      client.setQueryData(queryKey, list);
    },
  });
}

/** Freezes the draft and sends it to the elders. */
export function useSubmitDraft(calendarId: string) {
  const client = useQueryClient();
  return useKeyedWrite({
    write: (_nothing: undefined, writeKey) =>
      callApi(versionsEndpoints.submit, { params: { calendarId }, writeKey }),
    onSuccess: (version) => {
      client.setQueryData(versionQuery(calendarId, version.number).queryKey, version);
      void lookAgain(client, calendarId);
    },
  });
}
