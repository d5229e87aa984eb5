import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { privacyEndpoints, type LeavingInput } from '#shared/contracts/privacy.js';
import { apiUrl, callApi } from '#src/lib/api-client.js';
import { SESSION_KEY } from '#src/lib/query-client.js';

export const privacyQuery = queryOptions({
  queryKey: ['privacy'],
  queryFn: ({ signal }) => callApi(privacyEndpoints.read, { signal }),
});

/** Address of a file with everything that is kept about whoever asks. */
export function ownDataUrl(): string {
  return apiUrl(privacyEndpoints.exportOwn, {});
}

/** Afterwards nobody is signed in here. */
export function useLeave() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: LeavingInput) => callApi(privacyEndpoints.leave, { body }),
    onSuccess: () => client.invalidateQueries({ queryKey: SESSION_KEY }),
  });
}
