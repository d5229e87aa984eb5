import { z } from 'zod';
import { pin } from './cards.js';
import { id, instant, line, listOf, text } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { signatureRole, submissionNumber, version } from './versions.js';

export const ANSWERS = ['agree', 'change-this', 'not-for-the-board', 'not-mine-to-say'] as const;
export const answerWord = z.enum(ANSWERS);
export type AnswerWord = (typeof ANSWERS)[number];

/** An elder's word on one entry as it was frozen; it follows the content, not the submission. */
export const answer = z.strictObject({
  id,
  entryId: id,
  entryHash: z.string(),
  elderId: id,
  elderName: z.string(),
  answer: answerWord,
  note: z.string(),
  /** The elder lets their "change this" stand as a difference beside the entry. */
  letStand: z.boolean(),
  /** Set when somebody else wrote the answer down. */
  recordedByName: z.string().nullable(),
  /** Null with a recorder: the elder proved it with their PIN. */
  witness: z.string().nullable(),
  answeredAt: instant,
  /** The asking person gave it, or may speak for its elder. */
  mine: z.boolean(),
});
export type Answer = z.infer<typeof answer>;

export const answerInput = z
  .strictObject({
    answer: answerWord,
    note: text(1000),
    /** Set by whoever writes down an elder's spoken word. */
    onBehalfOf: id.nullable(),
    witness: line(120).nullable(),
    /** The elder's own PIN, typed by them on the helper's device: it stands instead of a witness. */
    pin: pin.optional(),
  })
  .superRefine((input, context) => {
    if (input.onBehalfOf !== null && !input.witness && input.pin === undefined) {
      context.addIssue({ code: 'custom', path: ['witness'], message: 'witness-required' });
    }
    if (input.answer === 'change-this' && input.note.length === 0) {
      context.addIssue({ code: 'custom', path: ['note'], message: 'say-what-to-change' });
    }
  });
export type AnswerInput = z.infer<typeof answerInput>;

/** How far each elder of the community is with a submission. */
export const elderProgress = z.strictObject({
  elderId: id,
  elderName: z.string(),
  answered: z.number().int(),
  of: z.number().int(),
  signed: z.boolean(),
  wroteTheDraft: z.boolean(),
});
export type ElderProgress = z.infer<typeof elderProgress>;

export const ENTRY_OUTCOMES = [
  'with-reviewers',
  'changes-asked',
  'held-back',
  'agreed',
  'agreed-with-differences',
] as const;
/** Where each entry stands that the person sees. */
export const outcome = z.strictObject({ entryId: id, outcome: z.enum(ENTRY_OUTCOMES) });
export type Outcome = z.infer<typeof outcome>;

const numberParams = z.strictObject({ calendarId: id, number: submissionNumber });
const answerParams = z.strictObject({ calendarId: id, number: submissionNumber, entryId: id });

export const reviewsEndpoints = {
  listAnswers: defineEndpoint({
    id: 'listAnswers',
    method: 'GET',
    path: '/api/calendars/:calendarId/versions/:number/answers',
    summary: 'Answers to the entries of a submission, and how far each elder is',
    access: member('calendar', 'officer', 'elder', 'steward'),
    params: numberParams,
    response: listOf(answer).extend({ progress: z.array(elderProgress), outcomes: z.array(outcome) }),
  }),
  putAnswer: defineEndpoint({
    id: 'putAnswer',
    method: 'PUT',
    path: '/api/calendars/:calendarId/versions/:number/entries/:entryId/answer',
    summary: 'Answer for an entry, or write down an elder’s answer before a witness',
    access: member('calendar', 'officer', 'elder', 'steward'),
    params: answerParams,
    body: answerInput,
    response: answer,
  }),
  takeBackAnswer: defineEndpoint({
    id: 'takeBackAnswer',
    method: 'DELETE',
    path: '/api/calendars/:calendarId/versions/:number/entries/:entryId/answer',
    summary: 'Take the own answer back while the submission is in review',
    access: member('calendar', 'elder'),
    params: answerParams,
  }),
  letStand: defineEndpoint({
    id: 'letDifferenceStand',
    method: 'POST',
    path: '/api/calendars/:calendarId/versions/:number/entries/:entryId/answer/stand',
    summary: 'The elder who asked for a change lets the difference stand beside the entry',
    access: member('calendar', 'elder'),
    params: answerParams,
    response: answer,
  }),
  sign: defineEndpoint({
    id: 'signVersion',
    method: 'POST',
    path: '/api/calendars/:calendarId/versions/:number/signatures',
    summary: 'Sign a submission as an elder or as the steward',
    access: member('calendar', 'elder', 'steward'),
    params: numberParams,
    body: z.strictObject({ role: signatureRole }),
    response: version,
  }),
} as const;
