import { useMutation } from '@tanstack/react-query';
import {
  sessionEndpoints,
  type ChangePasswordInput,
  type FirstStewardInput,
  type RedeemCodeInput,
  type SignInInput,
} from '#shared/contracts/session.js';
import { callApi } from '#src/lib/api-client.js';
import { forgetAll } from '#src/lib/device-storage.js';
import { draftPrefix } from '#src/lib/kept-draft.js';
import { useSession, useTakeSession } from '#src/lib/session.js';

export function useSignIn() {
  const takeSession = useTakeSession();
  return useMutation({
    mutationFn: (body: SignInInput) => callApi(sessionEndpoints.signIn, { body }),
    onSuccess: takeSession,
  });
}

/** Ends the session here. Unsaved drafts of this person leave the device with them: it may be a shared one. */
export function useSignOut() {
  const takeSession = useTakeSession();
  const { person } = useSession();
  return useMutation({
    mutationFn: () => callApi(sessionEndpoints.signOut, {}),
    onSuccess: (state) => {
      if (person !== null) forgetAll(draftPrefix(person.id));
      takeSession(state);
    },
  });
}

export function useChangePassword() {
  const takeSession = useTakeSession();
  return useMutation({
    mutationFn: (body: ChangePasswordInput) => callApi(sessionEndpoints.changePassword, { body }),
    onSuccess: takeSession,
  });
}

export function useRedeemCode() {
  const takeSession = useTakeSession();
  return useMutation({
    mutationFn: (body: RedeemCodeInput) => callApi(sessionEndpoints.redeemCode, { body }),
    onSuccess: takeSession,
  });
}

export function useFirstSteward() {
  const takeSession = useTakeSession();
  return useMutation({
    mutationFn: (body: FirstStewardInput) => callApi(sessionEndpoints.firstSteward, { body }),
    onSuccess: takeSession,
  });
}
