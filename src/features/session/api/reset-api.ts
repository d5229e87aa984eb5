import { queryOptions, useMutation } from '@tanstack/react-query';
import { lettersEndpoints, type ResetLetterInput } from '#shared/contracts/letters.js';
import { sessionEndpoints, type ResetPasswordInput } from '#shared/contracts/session.js';
import { callApi } from '#src/lib/api-client.js';
import { useTakeSession } from '#src/lib/session.js';

/** Whether letters are switched on at all. */
export const letterServiceQuery = queryOptions({
  queryKey: ['letter-service'],
  queryFn: ({ signal }) => callApi(lettersEndpoints.readService, { signal }),
});

export function useAskForReset() {
  return useMutation({
    mutationFn: (body: ResetLetterInput) => callApi(lettersEndpoints.askForReset, { body }),
  });
}

export function useResetPassword() {
  return useMutation({
    mutationFn: (body: ResetPasswordInput) => callApi(sessionEndpoints.resetPassword, { body }),
    onSuccess: useTakeSession(),
  });
}
