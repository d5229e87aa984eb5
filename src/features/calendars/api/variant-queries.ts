import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { variantsEndpoints, type VariantInput } from '#shared/contracts/variants.js';
import { callApi } from '#src/lib/api-client.js';
import { calendarKeys } from '#src/lib/calendar-queries.js';

/** Other keepers' timings of an entry of the draft. */
export function variantsQuery(calendarId: string, entryId: string) {
  return queryOptions({
    queryKey: [...calendarKeys.one(calendarId), 'variants', entryId],
    queryFn: async ({ signal }) =>
      (await callApi(variantsEndpoints.list, { params: { calendarId, entryId }, signal })).items,
  });
}

/** Adds a variant, or saves one over the version that was read. */
export function useSaveVariant(calendarId: string, entryId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({
      content,
      saved,
    }: {
      content: VariantInput;
      saved: { variantId: string; version: number } | null;
    }) =>
      saved === null
        ? callApi(variantsEndpoints.add, { params: { calendarId, entryId }, body: content })
        : callApi(variantsEndpoints.update, {
            params: { calendarId, entryId, variantId: saved.variantId },
            body: { content, version: saved.version },
          }),
    onSettled: () => client.invalidateQueries({ queryKey: calendarKeys.one(calendarId) }),
  });
}

export function useRemoveVariant(calendarId: string, entryId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (variantId: string) =>
      callApi(variantsEndpoints.remove, { params: { calendarId, entryId, variantId } }),
    onSettled: () => client.invalidateQueries({ queryKey: calendarKeys.one(calendarId) }),
  });
}
