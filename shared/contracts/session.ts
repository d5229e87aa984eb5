import { z } from 'zod';
import { id, instant, line, listOf } from './common.js';
import { anybody, defineEndpoint, signedIn } from './endpoint.js';
import { membership, oneTimeCode, role, PASSWORD_MAX, PASSWORD_MIN, email } from './people.js';

export const sessionPerson = z.strictObject({ id, email: z.string(), displayName: z.string() });
export type SessionPerson = z.infer<typeof sessionPerson>;

/** Answer of every session call; `person` and `memberships` are null for a visitor. */
export const sessionState = z.strictObject({
  person: sessionPerson.nullable(),
  memberships: z.array(membership).nullable(),
  /** Set where a card opened the session: it ends by itself after so long without use. */
  card: z.strictObject({ leaveAfterMinutes: z.number().int() }).nullable(),
  /** Set while this device writes for somebody else. */
  helping: z
    .strictObject({
      communityId: id,
      personId: id,
      displayName: z.string(),
      /** What the helped person is there, as far as a helper may be it for them. */
      roles: z.array(role),
      /** They typed their PIN: one sees what they see. */
      shownPin: z.boolean(),
      until: instant,
    })
    .optional(),
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

/** The token of a letter: the letter’s id and its secret. */
export const resetPasswordInput = z.strictObject({
  token: z.string().regex(/^[0-9a-f-]{36}\.[0-9A-F]{64}$/u, 'link-broken'),
  newPassword,
});
export type ResetPasswordInput = z.infer<typeof resetPasswordInput>;

export const firstStewardInput = z.strictObject({
  token: z.string().min(20, 'required').max(200, 'too-long'),
  email,
  displayName: line(80, 1),
  newPassword,
  communityName: line(120, 1),
});
export type FirstStewardInput = z.infer<typeof firstStewardInput>;

/** One browser in which the person is signed in. */
export const device = z.strictObject({
  id: z.string().regex(/^[0-9a-f]{64}$/u),
  /** Null for a sign-in from before this was written down. */
  beganAt: instant.nullable(),
  lastUsedAt: instant,
  /** What the browser calls itself, roughly, e.g. `Firefox` and `Android`; null where it does not say. */
  browser: z.string().nullable(),
  system: z.string().nullable(),
  /** True for the one that asks. */
  here: z.boolean(),
});
export type Device = z.infer<typeof device>;

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
    needsPassword: true,
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
  resetPassword: defineEndpoint({
    id: 'resetPassword',
    method: 'POST',
    path: '/api/session/reset',
    summary: 'Set a new password with the link of a letter, and sign in',
    access: anybody,
    body: resetPasswordInput,
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
  listDevices: defineEndpoint({
    id: 'listDevices',
    method: 'GET',
    path: '/api/session/devices',
    summary: 'Where the person is signed in, last used first',
    access: signedIn,
    needsPassword: true,
    response: listOf(device),
  }),
  endDevice: defineEndpoint({
    id: 'endDevice',
    method: 'DELETE',
    path: '/api/session/devices/:deviceId',
    summary: 'Sign out on one of the own devices; one that is signed out already stays so',
    access: signedIn,
    needsPassword: true,
    params: z.strictObject({ deviceId: device.shape.id }),
  }),
  endOtherDevices: defineEndpoint({
    id: 'endOtherDevices',
    method: 'DELETE',
    path: '/api/session/devices',
    summary: 'Sign out everywhere but here',
    access: signedIn,
    needsPassword: true,
  }),
} as const;
