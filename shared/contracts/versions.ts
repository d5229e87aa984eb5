import { z } from 'zod';
import { id, instant, isoDate, line, listOf } from './common.js';
import { entryDates, entryInput, entryWindow } from './calendars.js';
import { frozenVariant } from './variants.js';
import { defineEndpoint, member } from './endpoint.js';
import { whyMoved } from './moves.js';
import { language, ROLES, signOffRule } from './people.js';
import { restoredDraft } from './restored-draft.js';
import { todaysEngine } from './todays-engine.js';
import { markerNames, nightSegment, placeSnapshot } from './stars.js';

export const VERSION_STATES = [
  'in-review',
  'changes-asked',
  'signed-off',
  'published',
  'replaced',
  'recalled',
] as const;
export const versionState = z.enum(VERSION_STATES);
export type VersionState = (typeof VERSION_STATES)[number];

/** A submission number, counted from 1 within the calendar, or the draft. */
export const versionNumber = z.string().regex(/^(draft|[1-9]\d{0,5})$/u, 'version-number');
export const submissionNumber = z.string().regex(/^[1-9]\d{0,5}$/u, 'version-number');

/** A marker that some entry goes by, frozen with its names and its year. */
export const frozenMarker = markerNames.extend({ strip: z.array(nightSegment) });
export type FrozenMarker = z.infer<typeof frozenMarker>;

/** Everything that a version's dates and print rest on, besides its entries. Hashed. */
export const versionHeader = z.strictObject({
  schema: z.literal(1),
  calendarId: id,
  number: z.number().int(),
  year: z.number().int(),
  engineVersion: z.string(),
  submittedAt: instant,
  communityName: z.string(),
  villageLanguage: language,
  officerLanguage: language,
  weatherContact: z.string(),
  agricultureContact: z.string(),
  place: placeSnapshot,
  markers: z.array(frozenMarker),
  /** Keeps what a header hides from somebody from being guessed by its hash; only a whole header shows it. */
  salt: z.string().optional(),
});
export type VersionHeader = z.infer<typeof versionHeader>;

/** A variant beside its entry; `forBoard` where the village's board may go by it. */
export const seenVariant = frozenVariant.extend({ forBoard: z.boolean() });
export type SeenVariant = z.infer<typeof seenVariant>;

export const versionEntryBody = z.strictObject({
  entryId: id,
  content: entryInput,
  dates: entryDates,
  /** Each frozen and hashed apart from the entry; left out where there are none to see. */
  variants: z.array(seenVariant).optional(),
});
export type VersionEntryBody = z.infer<typeof versionEntryBody>;

export const versionVariant = seenVariant.extend({
  salt: z.string(),
  hash: z.string(),
  rank: z.number().int(),
  redacted: z.boolean(),
});

export type VersionVariant = z.infer<typeof versionVariant>;

export const versionEntry = versionEntryBody.extend({
  variants: z.array(versionVariant).optional(),
  position: z.number().int(),
  /** Hex; with the canonical JSON it gives `hash`. */
  salt: z.string(),
  hash: z.string(),
  /** Its place in the order, with gaps of random width; null in versions of the first scheme. */
  rank: z.number().int().nullable(),
  /** True where its giver's name was taken off since: its hash cannot be made again. */
  redacted: z.boolean(),
});
export type VersionEntry = z.infer<typeof versionEntry>;

export const signatureRole = z.enum(['elder', 'steward']);
export const signature = z.strictObject({
  personId: id,
  displayName: z.string(),
  role: signatureRole,
  signedAt: instant,
});
export type Signature = z.infer<typeof signature>;

export const SIGN_OFF_GAPS = [
  'needs-elders',
  'needs-person',
  'needs-one-of',
  'needs-steward',
  'entry-without-agree',
  'change-stands',
  'not-for-board-stands',
] as const;

/** What still stands between a submission and "signed off". */
export const signOffGap = z.strictObject({
  code: z.enum(SIGN_OFF_GAPS),
  /** People the gap is about, or entries, by name. */
  names: z.array(z.string()),
  count: z.number().int(),
});
export type SignOffGap = z.infer<typeof signOffGap>;

export const versionSummary = z.strictObject({
  id,
  calendarId: id,
  number: z.number().int(),
  label: z.string().nullable(),
  state: versionState,
  submittedBy: z.string(),
  submittedAt: instant,
  publishedAt: instant.nullable(),
  entryCount: z.number().int(),
  hash: z.string(),
});
export type VersionSummary = z.infer<typeof versionSummary>;

/** Days that were typed after the version was frozen, of work from which one of its entries is counted. */
export const doneSince = z.strictObject({
  entryId: id,
  anchorId: id,
  from: isoDate,
  to: isoDate.nullable(),
  /** The entry's own days, counted from there. */
  window: entryWindow.nullable(),
});
export type DoneSince = z.infer<typeof doneSince>;

export const version = versionSummary.extend({
  header: versionHeader,
  headerHash: z.string(),
  /** False where markers or figures are left out that only kept entries go by; its hash cannot be made again then. */
  headerComplete: z.boolean(),
  scheme: z.union([z.literal(1), z.literal(2)]),
  /** Today's engine, where an older one reckoned the version; left out where it is the same. */
  todaysEngine: z.string().optional(),
  /** What the version's hash goes over: of entries seen, kept and withdrawn, and of nothing at all, told apart by nobody. */
  leaves: z.array(z.string()),
  /** Entries that their people keep, where the giver chose an empty slot; and those that were withdrawn with a trace. */
  keptCount: z.number().int(),
  withdrawnCount: z.number().int(),
  entries: z.array(versionEntry),
  /** Beside the frozen text, which stays; left out where there is nothing of the kind. */
  doneSince: z.array(doneSince).optional(),
  /** What the officer wrote when changes were asked or the version was recalled; empty otherwise. */
  stateNote: z.string(),
  signatures: z.array(signature),
  /** As it stood when the draft was submitted. */
  signOffRule,
  gaps: z.array(signOffGap),
  /** What the asking person may do now. */
  may: z.strictObject({
    answer: z.boolean(),
    signAsElder: z.boolean(),
    signAsSteward: z.boolean(),
    /** Why signing is closed to an elder or a steward; null where it is open or not theirs. */
    signClosedBy: z
      .enum(['wrote-the-draft', 'answers-missing', 'something-stands', 'already-signed', 'not-in-review'])
      .nullable(),
    askChanges: z.boolean(),
    publish: z.boolean(),
    recall: z.boolean(),
  }),
});
export type Version = z.infer<typeof version>;

/** One field of an entry or of the header that differs. Values are plain JSON for the sentence maker. */
export const fieldChange = z.strictObject({ field: z.string(), before: z.unknown(), after: z.unknown() });
export type FieldChange = z.infer<typeof fieldChange>;

export const entryComparison = z.strictObject({
  entryId: id,
  change: z.enum(['added', 'removed', 'changed', 'same']),
  titleOfficer: z.string(),
  titleVillage: z.string(),
  before: versionEntryBody.nullable(),
  after: versionEntryBody.nullable(),
  fields: z.array(fieldChange),
  /** Why its days moved; left out where they did not. */
  why: whyMoved.optional(),
});
export type EntryComparison = z.infer<typeof entryComparison>;

export const comparison = z.strictObject({
  from: z.string(),
  to: z.string(),
  year: z.number().int(),
  counts: z.strictObject({
    added: z.number().int(),
    removed: z.number().int(),
    changed: z.number().int(),
    same: z.number().int(),
  }),
  header: z.array(fieldChange),
  entries: z.array(entryComparison),
});
export type Comparison = z.infer<typeof comparison>;

const calendarParams = z.strictObject({ calendarId: id });
const numberParams = z.strictObject({ calendarId: id, number: submissionNumber });

export const versionsEndpoints = {
  list: defineEndpoint({
    id: 'listVersions',
    method: 'GET',
    path: '/api/calendars/:calendarId/versions',
    summary: 'Submissions and published versions, newest first; villagers and staff see what was published',
    access: member('calendar', ...ROLES),
    params: calendarParams,
    response: listOf(versionSummary),
  }),
  submit: defineEndpoint({
    id: 'submitDraft',
    method: 'POST',
    path: '/api/calendars/:calendarId/versions',
    summary: 'Freeze the draft and send it to review',
    access: member('calendar', 'officer'),
    countsOnce: true,
    params: calendarParams,
    response: version,
    status: 201,
  }),
  read: defineEndpoint({
    id: 'readVersion',
    method: 'GET',
    path: '/api/calendars/:calendarId/versions/:number',
    summary: 'A version as it was frozen, with its state and signatures',
    access: member('calendar', ...ROLES),
    params: numberParams,
    response: version,
  }),
  compare: defineEndpoint({
    id: 'compareVersions',
    method: 'GET',
    path: '/api/calendars/:calendarId/comparison',
    summary: 'Two versions entry by entry; either side may be the draft',
    access: member('calendar', ...ROLES),
    params: calendarParams,
    query: z.strictObject({ from: versionNumber, to: versionNumber }),
    response: comparison,
  }),
  readTodaysEngine: defineEndpoint({
    id: 'readTodaysEngine',
    method: 'GET',
    path: '/api/calendars/:calendarId/versions/:number/todays-engine',
    summary:
      'What today’s engine would say of a version that an older one reckoned; the version stays as it is',
    access: member('calendar', ...ROLES),
    params: numberParams,
    response: todaysEngine,
  }),
  restore: defineEndpoint({
    id: 'restoreVersion',
    method: 'POST',
    path: '/api/calendars/:calendarId/versions/:number/restore',
    summary: 'Set the draft back to what a version says; nothing of it is agreed by that',
    access: member('calendar', 'officer'),
    params: numberParams,
    response: restoredDraft,
  }),
  askChanges: defineEndpoint({
    id: 'askChanges',
    method: 'POST',
    path: '/api/calendars/:calendarId/versions/:number/changes-asked',
    summary: 'End a submission so that the draft opens again',
    access: member('calendar', 'officer'),
    params: numberParams,
    body: z.strictObject({ reason: z.enum(['taken-back', 'elder-asked']), note: line(300) }),
    response: version,
  }),
  publish: defineEndpoint({
    id: 'publishVersion',
    method: 'POST',
    path: '/api/calendars/:calendarId/versions/:number/publish',
    summary: 'Publish a signed-off submission; the version before it becomes replaced',
    access: member('calendar', 'officer'),
    params: numberParams,
    response: version,
  }),
  recall: defineEndpoint({
    id: 'recallVersion',
    method: 'POST',
    path: '/api/calendars/:calendarId/versions/:number/recall',
    summary: 'Recall a published version',
    access: member('calendar', 'officer'),
    params: numberParams,
    body: z.strictObject({ note: line(300, 1) }),
    response: version,
  }),
} as const;
