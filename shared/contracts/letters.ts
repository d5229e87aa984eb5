import { z } from 'zod';
import { id, instant, listOf } from './common.js';
import { anybody, defineEndpoint, member, signedIn } from './endpoint.js';
import { email } from './people.js';

export const LETTER_CHANNELS = ['e-mail', 'none'] as const;
export type LetterChannel = (typeof LETTER_CHANNELS)[number];

/** `each`: a letter whenever something waits. `daily`: one in the morning that gathers what is new. */
export const LETTER_RHYTHMS = ['each', 'daily'] as const;
export type LetterRhythm = (typeof LETTER_RHYTHMS)[number];

const hour = z.number().int().min(0).max(23);

export const letterChoiceInput = z.strictObject({
  channel: z.enum(LETTER_CHANNELS),
  rhythm: z.enum(LETTER_RHYTHMS),
  /** They would rather be visited than written to. */
  visitMe: z.boolean(),
  /** From when to when no letter comes, by the village's clock; the same hour twice means all day but that. */
  quietHours: z.strictObject({ fromHour: hour, toHour: hour }).nullable(),
  /** 0 while the person has chosen nothing yet. */
  version: z.number().int().min(0),
});
export type LetterChoiceInput = z.infer<typeof letterChoiceInput>;

export const letterChoice = letterChoiceInput.extend({ lettersOn: z.boolean() });
export type LetterChoice = z.infer<typeof letterChoice>;

export const resetLetterInput = z.strictObject({ email });
export type ResetLetterInput = z.infer<typeof resetLetterInput>;

export const stillToAsk = z.strictObject({
  calendarId: id,
  placeName: z.string(),
  year: z.number().int(),
  number: z.number().int(),
  personId: id,
  personName: z.string(),
  does: z.enum(['answer', 'sign-as-elder', 'sign-as-steward']),
  visitMe: z.boolean(),
  /** What became of the last letter about it; `none` where none is to go. */
  letter: z.enum(['none', 'coming', 'sent', 'unsure', 'given-up']),
  letterAt: instant.nullable(),
});
export type StillToAsk = z.infer<typeof stillToAsk>;

export const lettersEndpoints = {
  readService: defineEndpoint({
    id: 'readLetterService',
    method: 'GET',
    path: '/api/letters',
    summary: 'Whether letters by e-mail are switched on here',
    access: anybody,
    response: z.strictObject({ on: z.boolean() }),
  }),
  askForReset: defineEndpoint({
    id: 'askForResetLetter',
    method: 'POST',
    path: '/api/letters/reset',
    summary: 'Ask for a link to choose a new password; the answer is the same for every address',
    access: anybody,
    body: resetLetterInput,
  }),
  readChoice: defineEndpoint({
    id: 'readLetterChoice',
    method: 'GET',
    path: '/api/letters/choice',
    summary: 'How the person wants to be asked',
    access: signedIn,
    response: letterChoice,
  }),
  saveChoice: defineEndpoint({
    id: 'saveLetterChoice',
    method: 'PUT',
    path: '/api/letters/choice',
    summary: 'Choose e-mail or none, quiet hours, and whether to be visited',
    access: signedIn,
    needsPassword: true,
    body: letterChoiceInput,
    response: letterChoice,
  }),
  invite: defineEndpoint({
    id: 'sendInvitation',
    method: 'POST',
    path: '/api/communities/:communityId/people/:personId/invitation',
    summary: 'Send the one-time code by e-mail; the code before it is void',
    access: member('community', 'steward'),
    params: z.strictObject({ communityId: id, personId: id }),
  }),
  listStillToAsk: defineEndpoint({
    id: 'listStillToAsk',
    method: 'GET',
    path: '/api/communities/:communityId/still-to-ask',
    summary: 'For whom a submission still waits, and who would rather be visited',
    access: member('community', 'steward', 'officer'),
    params: z.strictObject({ communityId: id }),
    response: listOf(stillToAsk),
  }),
} as const;
