import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import {
  importsEndpoints,
  type FileImport,
  type TableImport,
  type TableInput,
  type VillageCopy,
} from '#shared/contracts/imports.js';
import { calendarsEndpoints } from '#shared/contracts/calendars.js';
import { callApi } from '#src/lib/api-client.js';
import { uploadToApi } from '#src/lib/api-upload.js';
import { calendarKeys } from '#src/lib/calendar-queries.js';

export interface FileSending {
  file: File;
  /** The same for everything that is sent of one chosen file: what came twice is brought in once. */
  key: string;
  dryRun: boolean;
  signal: AbortSignal;
  onProgress: (sentBytes: number, ofBytes: number) => void;
}

export function useFileImport(calendarId: string) {
  const refresh = useRefresh(calendarId);
  return useMutation({
    mutationFn: ({ file, key, dryRun, signal, onProgress }: FileSending): Promise<FileImport> =>
      uploadToApi(importsEndpoints.file, {
        ...{ params: { calendarId }, body: { dryRun }, file, signal, onProgress },
        writeKey: dryRun ? undefined : key,
      }),
    onSettled: refresh,
  });
}

export function useTableImport(calendarId: string) {
  const refresh = useRefresh(calendarId);
  return useMutation({
    mutationFn: ({ signal, key, ...body }: TableSending): Promise<TableImport> =>
      callApi(importsEndpoints.table, {
        ...{ params: { calendarId }, body, signal },
        writeKey: body.dryRun ? undefined : key,
      }),
    onSettled: refresh,
  });
}

/** Under a key of its own, too. */
type TableSending = TableInput & { key: string; signal: AbortSignal };

export interface CopySending {
  toCalendarId: string;
  key: string;
  dryRun: boolean;
  signal: AbortSignal;
}

export function useCopy(calendarId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ signal, key, ...body }: CopySending): Promise<VillageCopy> =>
      callApi(importsEndpoints.copy, {
        ...{ params: { calendarId }, body, signal },
        writeKey: body.dryRun ? undefined : key,
      }),
    onSettled: (_answer, _problem, { toCalendarId, dryRun }) =>
      dryRun ? undefined : client.invalidateQueries({ queryKey: calendarKeys.one(toCalendarId) }),
  });
}

/** Of all villages of the person. */
export function everyCalendarQuery() {
  return queryOptions({
    queryKey: [...calendarKeys.all, 'of-every-village'],
    queryFn: async ({ signal }) => (await callApi(calendarsEndpoints.list, { query: {}, signal })).items,
  });
}

/** Also after a refusal: it may be one because something changed meanwhile. */
function useRefresh(calendarId: string) {
  const client = useQueryClient();
  return (_answer: unknown, _problem: unknown, { dryRun }: { dryRun: boolean }) =>
    dryRun ? undefined : client.invalidateQueries({ queryKey: calendarKeys.one(calendarId) });
}
