import { useMutation, useQueryClient } from '@tanstack/react-query';
import { signsEndpoints, type SignUpdate } from '#shared/contracts/signs.js';
import { callApi } from '#src/lib/api-client.js';

/** Changes a sign, takes it out of the list, puts it back. Its words stand in drafts, so these are read anew. */
export function useSignChanges(communityId: string) {
  const client = useQueryClient();
  const onSuccess = async () => {
    await client.invalidateQueries({
      predicate: ({ queryKey: [key] }) => ['signs', 'calendars', 'today'].includes(String(key)),
    });
  };
  const change = useMutation({
    mutationFn: ({ signId, input }: { signId: string; input: SignUpdate }) =>
      callApi(signsEndpoints.update, { params: { communityId, signId }, body: input }),
    onSuccess,
  });
  const takeOut = useMutation({
    mutationFn: (signId: string) => callApi(signsEndpoints.remove, { params: { communityId, signId } }),
    onSuccess,
  });
  const putBack = useMutation({
    mutationFn: (signId: string) => callApi(signsEndpoints.restore, { params: { communityId, signId } }),
    onSuccess,
  });
  return { change, takeOut, putBack };
}
