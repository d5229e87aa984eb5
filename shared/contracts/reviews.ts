import { z } from 'zod';
import { pin } from './cards.js';
import { id, instant, isoDate, line, listOf, text } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { language, ROLES } from './people.js';
import { frozenMarker, signatureRole, submissionNumber, version, versionEntryBody } from './versions.js';

export const ANSWERS = ['agree', 'change-this', 'not-for-the-board', 'not-mine-to-say'] as const;
export const answerWord = z.enum(ANSWERS);
export type AnswerWord = (typeof ANSWERS)[number];

/** A few spoken words. */
const PROOF_MAX_BYTES = 4 * 1024 * 1024;

/** Why what another hand wrote counts as the elder's word. */
export const ANSWER_PROOFS = ['witness', 'pin', 'shown-pin', 'voice', 'paper'] as const;
export type AnswerProofKind = (typeof ANSWER_PROOFS)[number];

/** What was spoken to an answer: to be heard, kept by its people, or gone. */
export const SPOKEN_STATES = ['kept', 'kept-apart', 'taken-away'] as const;

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
  witness: z.string().nullable(),
  /** Null where the elder's own hand gave it. The id is of a recording or a picture that the reader may open. */
  proof: z
    .strictObject({
      kind: z.enum(ANSWER_PROOFS),
      attachmentId: id.nullable(),
      /** The day of the meeting. */
      on: isoDate.nullable(),
    })
    .nullable(),
  /** Null where nothing was spoken to it; the id where the reader may hear it. */
  spoken: z.strictObject({ state: z.enum(SPOKEN_STATES), attachmentId: id.nullable() }).nullable(),
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
    /** What the elder said about this entry, recorded and kept: it counts instead of typed words. */
    recordingId: id.nullable().optional(),
  })
  .superRefine((input, context) => {
    if (input.onBehalfOf !== null && !input.witness && input.pin === undefined) {
      context.addIssue({ code: 'custom', path: ['witness'], message: 'witness-required' });
    }
    if (input.answer === 'change-this' && input.note.length === 0 && !input.recordingId) {
      context.addIssue({ code: 'custom', path: ['note'], message: 'say-what-to-change' });
    }
  });
export type AnswerInput = z.infer<typeof answerInput>;

/** Written by another hand; the elder's voice, which comes with it, proves it. */
export const spokenAnswerInput = z
  .strictObject({
    answer: answerWord,
    note: text(1000),
    onBehalfOf: id.nullable(),
    recordingId: id.nullable().optional(),
  })
  .superRefine((input, context) => {
    if (input.answer === 'change-this' && input.note.length === 0 && !input.recordingId) {
      context.addIssue({ code: 'custom', path: ['note'], message: 'say-what-to-change' });
    }
  });
export type SpokenAnswerInput = z.infer<typeof spokenAnswerInput>;

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

/** What somebody who keeps an entry says to it, for themselves. */
export const ownAnswerInput = z
  .strictObject({ answer: answerWord, note: text(1000), recordingId: id.nullable().optional() })
  .superRefine(({ answer, note, recordingId }, context) => {
    if (answer === 'change-this' && note.length === 0 && !recordingId) {
      context.addIssue({ code: 'custom', path: ['note'], message: 'say-what-to-change' });
    }
  });
export type OwnAnswerInput = z.infer<typeof ownAnswerInput>;
export const ownAnswer = answer.pick({ answer: true, note: true, letStand: true, spoken: true });
export type OwnAnswer = z.infer<typeof ownAnswer>;

/** The entries of a submission that the person keeps with others, and nothing else of it. */
export const ownEntries = z.strictObject({
  year: z.number().int(),
  placeName: z.string(),
  villageLanguage: language,
  officerLanguage: language,
  /** What these entries go by. */
  markers: z.array(frozenMarker),
  items: z.array(z.strictObject({ entry: versionEntryBody, answer: ownAnswer.nullable() })),
});
export type OwnEntries = z.infer<typeof ownEntries>;

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
  putSpokenAnswer: defineEndpoint({
    id: 'putSpokenAnswer',
    method: 'POST',
    path: '/api/calendars/:calendarId/versions/:number/entries/:entryId/answer/spoken',
    summary: 'Write down an elder’s answer with a clip of their voice that proves it',
    access: member('calendar', 'officer', 'elder', 'steward'),
    params: answerParams,
    body: spokenAnswerInput,
    upload: { maxBytes: PROOF_MAX_BYTES },
    response: answer,
    status: 201,
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
  readOwn: defineEndpoint({
    id: 'readOwnEntries',
    method: 'GET',
    path: '/api/calendars/:calendarId/versions/:number/own-entries',
    summary: 'The entries in review that the person keeps with others; none where there is nothing to answer',
    access: member('calendar', ...ROLES),
    params: numberParams,
    response: ownEntries,
  }),
  putOwnAnswer: defineEndpoint({
    id: 'putOwnAnswer',
    method: 'PUT',
    path: '/api/calendars/:calendarId/versions/:number/own-entries/:entryId/answer',
    summary: 'Answer for an entry that the person keeps with others, whatever their role',
    access: member('calendar', ...ROLES),
    params: answerParams,
    body: ownAnswerInput,
    response: ownAnswer,
  }),
  letOwnStand: defineEndpoint({
    id: 'letOwnDifferenceStand',
    method: 'POST',
    path: '/api/calendars/:calendarId/versions/:number/own-entries/:entryId/answer/stand',
    summary: 'Whoever keeps an entry and asked for a change lets the difference stand beside it',
    access: member('calendar', ...ROLES),
    params: answerParams,
    response: ownAnswer,
  }),
  takeBackOwnAnswer: defineEndpoint({
    id: 'takeBackOwnAnswer',
    method: 'DELETE',
    path: '/api/calendars/:calendarId/versions/:number/own-entries/:entryId/answer',
    summary: 'Take back what was said to an entry that the person keeps with others',
    access: member('calendar', ...ROLES),
    params: answerParams,
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
