import { z } from 'zod';
import { id, instant, isoDate, line, listOf, rowVersion, text } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { languageTag, ROLES } from './people.js';
import { NAMINGS, sharingLevel } from './sharing.js';

/** What somebody may agree to, each by its own yes; what is not among them is a no. */
export const CONSENT_USES = [
  'keep',
  'show',
  'print',
  'recording',
  'feed',
  'open-page',
  'message',
  'radio',
  'training',
  'research',
  'translation',
  'machine',
  'commercial',
] as const;
export type ConsentUse = (typeof CONSENT_USES)[number];

/** What a person says when they are asked. */
export const CONSENT_ANSWERS = ['asked', 'given', 'given-with-conditions', 'not-now', 'refused'] as const;
export type ConsentAnswer = (typeof CONSENT_ANSWERS)[number];

/** What stands today; `lapsed` comes by itself with the day. */
export const CONSENT_STATES = [...CONSENT_ANSWERS, 'withdrawn', 'lapsed'] as const;
export type ConsentState = (typeof CONSENT_STATES)[number];

/** What a consent can be about. */
export const CONSENT_ITEMS = ['entry', 'figure', 'story', 'attachment'] as const;
export type ConsentItemType = (typeof CONSENT_ITEMS)[number];

export const CONSENT_GIVERS = ['person', 'group'] as const;
export const ASKING_WAYS = ['spoken', 'pictures', 'written'] as const;
/** `own-word`: the giver signed in and said it here themself. */
export const CONSENT_PROOFS = ['own-word', 'voice', 'mark', 'signature', 'witness'] as const;
export const AFTER_DEATH = ['keep', 'tighten', 'pass-to', 'remove'] as const;
export const CONSENT_WITHDRAWERS = ['family', 'group', 'elders'] as const;

/** A spoken yes of some minutes. */
const CLIP_MAX_BYTES = 8 * 1024 * 1024;
/** Asked again from this many days before the review date on. */
export const DUE_AHEAD_DAYS = 30;
/** Months until a consent is asked for again, where nobody says otherwise. */
export const REVIEW_MONTHS = 12;

export const consentProof = z.strictObject({
  kind: z.enum(CONSENT_PROOFS),
  witness: line(120),
  /** A recording or a picture that belongs to this consent; a mark on paper may be kept by the village instead. */
  attachmentId: id.nullable(),
});
export type ConsentProof = z.infer<typeof consentProof>;

const set = <T extends readonly [string, ...string[]]>(values: T) =>
  z.array(z.enum(values)).refine((list) => new Set(list).size === list.length, 'no-duplicates');

const consentFields = z.strictObject({
  answer: z.enum(CONSENT_ANSWERS),
  givenAs: z.enum(CONSENT_GIVERS),
  /** The giver, where they are one of the village's people here. */
  giverId: id.nullable(),
  /** As they wish to be called. Empty, or a code for their role, where they are not named to whoever reads it. */
  giverName: line(120),
  /** Who spoke for a group, and by what right. */
  spokeFor: line(200),
  askedOn: isoDate,
  /** Roughly: a village or a ward, no house. */
  askedWhere: line(120),
  language: languageTag.nullable(),
  askedHow: set(ASKING_WAYS),
  explainedBy: line(120),
  /** Which wording was explained, such as the number on the printed card. */
  explanation: line(40),
  proof: consentProof.nullable(),
  uses: set(CONSENT_USES),
  /** Null where nothing was said: then the giver is not named. */
  naming: z.enum(NAMINGS).nullable(),
  conditions: text(1000),
  benefits: text(1000),
  /** The last day on which it holds; null where it holds until somebody says otherwise. */
  until: isoDate.nullable(),
  reviewBy: isoDate,
  /** Null where nothing was said. */
  afterDeath: z.enum(AFTER_DEATH).nullable(),
  passTo: line(120),
  /** Who may take it back besides the giver. */
  mayWithdraw: set(CONSENT_WITHDRAWERS),
  /** The group of the village that is meant by family or group; left out where none is named. */
  withdrawGroupId: id.nullable().optional(),
});
type ConsentFields = z.infer<typeof consentFields>;

function consentHolds(consent: ConsentFields, context: z.RefinementCtx): void {
  const refuse = (path: string[], message: string) => {
    context.addIssue({ code: 'custom', path, message });
  };
  const { answer, uses, proof } = consent;
  const isYes = answer === 'given' || answer === 'given-with-conditions';
  if (isYes && uses.length === 0) refuse(['uses'], 'choose-one');
  if (!isYes && uses.length > 0) refuse(['uses'], 'uses-need-yes');
  if (answer === 'given-with-conditions' && consent.conditions === '') refuse(['conditions'], 'required');
  if (consent.givenAs === 'group' && consent.spokeFor === '') refuse(['spokeFor'], 'required');
  if (consent.afterDeath === 'pass-to' && consent.passTo === '') refuse(['passTo'], 'required');
  const byGroup = consent.mayWithdraw.includes('family') || consent.mayWithdraw.includes('group');
  if ((consent.withdrawGroupId ?? null) !== null && !byGroup) refuse(['withdrawGroupId'], 'no-group-here');
  if (proof?.kind === 'witness' && proof.witness === '') refuse(['proof', 'witness'], 'required');
  if (proof?.kind === 'voice' && proof.attachmentId === null) refuse(['proof', 'attachmentId'], 'required');
  if (consent.until !== null && consent.until < consent.askedOn) refuse(['until'], 'before-asked');
  if (consent.reviewBy < consent.askedOn) refuse(['reviewBy'], 'before-asked');
}

export const consentContent = consentFields.superRefine(consentHolds);
export type ConsentContent = z.infer<typeof consentContent>;

export const consentInput = consentFields
  .extend({ itemType: z.enum(CONSENT_ITEMS), itemId: id })
  .superRefine(consentHolds)
  .superRefine(({ giverName }, context) => {
    if (giverName === '') context.addIssue({ code: 'custom', path: ['giverName'], message: 'required' });
  });
export type ConsentInput = z.infer<typeof consentInput>;

export const consentUpdate = z.strictObject({ content: consentContent, version: rowVersion });
export type ConsentUpdate = z.infer<typeof consentUpdate>;

/** The same with a clip of the giver's voice in the same sending: the clip is the proof. */
const spokenFields = consentFields.omit({ proof: true });
function spokenHolds(consent: z.infer<typeof spokenFields>, context: z.RefinementCtx): void {
  consentHolds({ ...consent, proof: null }, context);
}
export const spokenConsentInput = spokenFields
  .extend({ itemType: z.enum(CONSENT_ITEMS), itemId: id })
  .superRefine(spokenHolds)
  .superRefine(({ giverName }, context) => {
    if (giverName === '') context.addIssue({ code: 'custom', path: ['giverName'], message: 'required' });
  });
export type SpokenConsentInput = z.infer<typeof spokenConsentInput>;
export const spokenConsentUpdate = z.strictObject({
  content: spokenFields.superRefine(spokenHolds),
  version: rowVersion,
});
export type SpokenConsentUpdate = z.infer<typeof spokenConsentUpdate>;
export const consentWithdrawal = z.strictObject({ version: rowVersion });

/** A line of the register. What it is about, who gave it and for what are for those who may see the thing itself. */
export const consentLine = z.strictObject({
  id,
  itemType: z.enum(CONSENT_ITEMS),
  itemId: id,
  level: sharingLevel,
  title: z.string().nullable(),
  giverName: z.string().nullable(),
  uses: z.array(z.enum(CONSENT_USES)).nullable(),
  isMine: z.boolean(),
  state: z.enum(CONSENT_STATES),
  /** To be asked again: its review date or its end is near or past. */
  isDue: z.boolean(),
  until: isoDate.nullable(),
  reviewBy: isoDate,
  may: z.strictObject({ read: z.boolean(), change: z.boolean(), withdraw: z.boolean() }),
  version: rowVersion,
});
export type ConsentLine = z.infer<typeof consentLine>;

export const consent = consentLine.extend({
  content: consentFields,
  recordedByName: z.string(),
  recordedAt: instant,
});
export type Consent = z.infer<typeof consent>;

/** The consents of one thing, and what of it is known to whoever asks for them. */
export const itemConsents = z.strictObject({
  itemType: z.enum(CONSENT_ITEMS),
  itemId: id,
  level: sharingLevel,
  title: z.string().nullable(),
  giverId: id.nullable(),
  giverName: z.string(),
  /** The giver, somebody who is named without an account, or nobody that is known here. */
  whomToAsk: z.enum(['giver', 'named', 'nobody']),
  items: z.array(consent),
  mayAsk: z.boolean(),
});
export type ItemConsents = z.infer<typeof itemConsents>;

const communityParams = z.strictObject({ communityId: id });
const consentParams = z.strictObject({ communityId: id, consentId: id });

export const consentsEndpoints = {
  list: defineEndpoint({
    id: 'listConsents',
    method: 'GET',
    path: '/api/communities/:communityId/consents',
    summary:
      'The register, next to be asked again first: whole for the steward, without what is not theirs to see',
    access: member('community', ...ROLES),
    params: communityParams,
    response: listOf(consentLine),
  }),
  ofItem: defineEndpoint({
    id: 'readItemConsents',
    method: 'GET',
    path: '/api/communities/:communityId/items/:itemType/:itemId/consents',
    summary: 'What was agreed about one thing, for its givers and for those who compile, review and sign',
    access: member('community', ...ROLES),
    params: communityParams.extend({ itemType: z.enum(CONSENT_ITEMS), itemId: id }),
    response: itemConsents,
  }),
  read: defineEndpoint({
    id: 'readConsent',
    method: 'GET',
    path: '/api/communities/:communityId/consents/:consentId',
    summary: 'One consent with its conditions and its proof',
    access: member('community', ...ROLES),
    params: consentParams,
    response: consent,
  }),
  card: defineEndpoint({
    id: 'printConsentCard',
    method: 'GET',
    path: '/api/communities/:communityId/consents/:consentId/card.pdf',
    summary: 'A copy on paper for the person who was asked',
    access: member('community', ...ROLES),
    params: consentParams,
    fileType: 'application/pdf',
  }),
  add: defineEndpoint({
    id: 'addConsent',
    method: 'POST',
    path: '/api/communities/:communityId/consents',
    summary: 'Write down that somebody was asked, or what the giver themself says',
    access: member('community', ...ROLES),
    params: communityParams,
    body: consentInput,
    response: consent,
    status: 201,
  }),
  change: defineEndpoint({
    id: 'changeConsent',
    method: 'PUT',
    path: '/api/communities/:communityId/consents/:consentId',
    summary:
      'Write down the answer, or what was said when it was asked for again; 409 with both when it was changed',
    access: member('community', ...ROLES),
    params: consentParams,
    body: consentUpdate,
    response: consent,
  }),
  addSpoken: defineEndpoint({
    id: 'addSpokenConsent',
    method: 'POST',
    path: '/api/communities/:communityId/consents/spoken',
    summary: 'Write down what somebody says together with a clip of their voice, or neither of the two',
    access: member('community', ...ROLES),
    params: communityParams,
    body: spokenConsentInput,
    upload: { maxBytes: CLIP_MAX_BYTES },
    response: consent,
    status: 201,
  }),
  changeSpoken: defineEndpoint({
    id: 'changeSpokenConsent',
    method: 'POST',
    path: '/api/communities/:communityId/consents/:consentId/spoken',
    summary: 'Write down a new answer together with a clip of their voice; 409 with both when it was changed',
    access: member('community', ...ROLES),
    params: consentParams,
    body: spokenConsentUpdate,
    upload: { maxBytes: CLIP_MAX_BYTES },
    response: consent,
  }),
  withdraw: defineEndpoint({
    id: 'withdrawConsent',
    method: 'POST',
    path: '/api/communities/:communityId/consents/:consentId/withdrawal',
    summary:
      'Take a consent back, by the giver or any helper: the thing is hidden and printed no more from now on',
    access: member('community', ...ROLES),
    params: consentParams,
    body: consentWithdrawal,
    response: consentLine,
  }),
} as const;
