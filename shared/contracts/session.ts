import { z } from 'zod';
import { id, line } from './common.js';
import { anybody, defineEndpoint, signedIn } from './endpoint.js';
import { membership, oneTimeCode, PASSWORD_MAX, PASSWORD_MIN, email } from './people.js';

export const sessionPerson = z.strictObject({ id, email: z.string(), displayName: z.string() });
export type SessionPerson = z.infer<typeof sessionPerson>;

/** Answer of every session call; `person` and `memberships` are null for a visitor. */
export const sessionState = z.strictObject({
  person: sessionPerson.nullable(),
  memberships: z.array(membership).nullable(),
  csrfToken: z.string(),
});
export type SessionState = z.infer<typeof sessionState>;

/** Length only is checked here: what was accepted once must stay typeable. */
export const signInInput = z.strictObject({
  email,
  password: z.string().min(1, 'required').max(PASSWORD_MAX, 'too-long'),
});
export type SignInInput = z.infer<typeof signInInput>;

export const newPassword = z.string().min(PASSWORD_MIN, 'password-too-short').max(PASSWORD_MAX, 'too-long');

export const changePasswordInput = z.strictObject({
  currentPassword: z.string().min(1, 'required').max(PASSWORD_MAX, 'too-long'),
  newPassword,
});
export type ChangePasswordInput = z.infer<typeof changePasswordInput>;

export const redeemCodeInput = z.strictObject({ email, code: oneTimeCode, newPassword });
export type RedeemCodeInput = z.infer<typeof redeemCodeInput>;

export const firstStewardInput = z.strictObject({
  token: z.string().min(20, 'required').max(200, 'too-long'),
  email,
  displayName: line(80, 1),
  newPassword,
  communityName: line(120, 1),
});
export type FirstStewardInput = z.infer<typeof firstStewardInput>;

export const sessionEndpoints = {
  read: defineEndpoint({
    id: 'readSession',
    method: 'GET',
    path: '/api/session',
    summary: 'The person, their memberships and the token that writes must carry',
    access: anybody,
    response: sessionState,
  }),
  signIn: defineEndpoint({
    id: 'signIn',
    method: 'POST',
    path: '/api/session',
    summary: 'Sign in with e-mail and password',
    access: anybody,
    body: signInInput,
    response: sessionState,
  }),
  signOut: defineEndpoint({
    id: 'signOut',
    method: 'DELETE',
    path: '/api/session',
    summary: 'Sign out on this device',
    access: anybody,
    response: sessionState,
  }),
  changePassword: defineEndpoint({
    id: 'changePassword',
    method: 'PUT',
    path: '/api/session/password',
    summary: 'Change the own password; other devices are signed out',
    access: signedIn,
    body: changePasswordInput,
    response: sessionState,
  }),
  redeemCode: defineEndpoint({
    id: 'redeemCode',
    method: 'POST',
    path: '/api/session/code',
    summary: 'Set a password with a one-time code from the steward, and sign in',
    access: anybody,
    body: redeemCodeInput,
    response: sessionState,
  }),
  firstSteward: defineEndpoint({
    id: 'setUpFirstSteward',
    method: 'POST',
    path: '/api/session/first-steward',
    summary: 'Found the first community with the one-time link of the first start',
    access: anybody,
    body: firstStewardInput,
    response: sessionState,
  }),
} as const;
