import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { lettersEndpoints, type LetterChoiceInput } from '#shared/contracts/letters.js';
import { callApi } from '#src/lib/api-client.js';

export const letterChoiceQuery = queryOptions({
  queryKey: ['letter-choice'],
  queryFn: ({ signal }) => callApi(lettersEndpoints.readChoice, { signal }),
});

export function useSaveLetterChoice() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: LetterChoiceInput) => callApi(lettersEndpoints.saveChoice, { body }),
    onSuccess: (saved) => {
      client.setQueryData(letterChoiceQuery.queryKey, saved);
    },
  });
}

export function stillToAskQuery(communityId: string) {
  return queryOptions({
    queryKey: ['still-to-ask', communityId],
    queryFn: async ({ signal }) =>
      (await callApi(lettersEndpoints.listStillToAsk, { params: { communityId }, signal })).items,
  });
}
