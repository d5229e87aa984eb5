import { useMutation, useQueryClient } from '@tanstack/react-query';
import { signsEndpoints, type SignInput } from '#shared/contracts/signs.js';
import { callApi } from './api-client.js';
import { signsQuery } from './sign-queries.js';

/** Puts a new sign into the village's list. */
export function useNewSign(communityId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: SignInput) => callApi(signsEndpoints.add, { params: { communityId }, body: input }),
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: signsQuery(communityId).queryKey });
    },
  });
}
