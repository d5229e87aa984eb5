import { queryOptions, useQueryClient } from '@tanstack/react-query';
import { variantsEndpoints, type VariantInput } from '#shared/contracts/variants.js';
import { callApi } from '#src/lib/api-client.js';
import { calendarKeys } from '#src/lib/calendar-queries.js';
import { useKeyedWrite } from '#src/lib/keyed-write.js';

/** Other keepers' timings of an entry of the draft. */
export function variantsQuery(calendarId: string, entryId: string) {
  return queryOptions({
    queryKey: [...calendarKeys.one(calendarId), 'variants', entryId],
    queryFn: async ({ signal }) =>
      (await callApi(variantsEndpoints.list, { params: { calendarId, entryId }, signal })).items,
  });
}

interface WrittenVariant {
  content: VariantInput;
  saved: { variantId: string; version: number } | null;
}

/** Adds a variant, or saves one over the version that was read. */
export function useSaveVariant(calendarId: string, entryId: string) {
  const readAnew = useReadAnew(calendarId);
  const params = { calendarId, entryId };
  return useKeyedWrite({
    write: ({ content, saved }: WrittenVariant, writeKey) =>
      saved === null
        ? callApi(variantsEndpoints.add, { params, body: content, writeKey })
        : callApi(variantsEndpoints.update, {
            params: { ...params, variantId: saved.variantId },
            body: { content, version: saved.version },
            writeKey,
          }),
    onSuccess: readAnew,
    onError: readAnew,
  });
}

export function useRemoveVariant(calendarId: string, entryId: string) {
  const readAnew = useReadAnew(calendarId);
  return useKeyedWrite({
    write: (variantId: string, writeKey) =>
      callApi(variantsEndpoints.remove, { params: { calendarId, entryId, variantId }, writeKey }),
    onSuccess: readAnew,
    onError: readAnew,
  });
}

function useReadAnew(calendarId: string): () => void {
  const client = useQueryClient();
  return () => void client.invalidateQueries({ queryKey: calendarKeys.one(calendarId) });
}
