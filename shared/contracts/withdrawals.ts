import { z } from 'zod';
import { id, instant, listOf } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';
import { SHARED_ITEM_TYPES } from './sharing.js';

/** A pause can be ended by whoever may withdraw for so long; after that by its giver alone. */
export const PAUSE_DAYS = 30;
/** Devices that come back within this time wipe what they still hold of a withdrawn thing. */
export const WITHDRAWN_LISTED_DAYS = 400;

export const withdrawalInput = z.strictObject({
  /** Whether older versions say that one entry was withdrawn. */
  leavesTrace: z.boolean(),
  /** Who asked for it, where somebody else writes it down; null for oneself. */
  askedById: id.nullable(),
});
export type WithdrawalInput = z.infer<typeof withdrawalInput>;

export const pauseInput = z.strictObject({ askedById: id.nullable() });

/** What of one thing is withdrawn or paused; nothing else about it is kept. */
export const withdrawnItem = z.strictObject({
  itemType: z.enum(SHARED_ITEM_TYPES),
  itemId: id,
  at: instant,
});
export type WithdrawnItem = z.infer<typeof withdrawnItem>;

/** A printed sheet that may still hang with what is withdrawn. */
export const sheetToReplace = z.strictObject({
  withdrawalId: id,
  calendarId: id,
  placeName: z.string(),
  year: z.number().int(),
  number: z.number().int(),
  label: z.string(),
  at: instant,
});
export type SheetToReplace = z.infer<typeof sheetToReplace>;

export const itemState = z.strictObject({
  state: z.enum(['shared', 'paused']),
  pausedAt: instant.nullable(),
  /** Null for whoever could not see the thing itself: a steward takes back what they never read. */
  title: z.string().nullable(),
  /** Whether it is this person’s own: nobody else is then asked for. */
  isMine: z.boolean(),
  may: z.strictObject({
    withdraw: z.boolean(),
    pause: z.boolean(),
    resume: z.boolean(),
    takeNameOff: z.boolean(),
    /** A recording whose words were written out: its sound can go and the words stay. */
    removeSound: z.boolean(),
  }),
});
export type ItemState = z.infer<typeof itemState>;

/** Hidden for now; this person may bring it back. */
export const pausedItem = z.strictObject({
  itemType: z.enum(SHARED_ITEM_TYPES),
  itemId: id,
  /** Null where this person could not see it while it was shared. */
  title: z.string().nullable(),
  pausedAt: instant,
  /** Until when others than its giver can bring it back. */
  othersUntil: instant,
});
export type PausedItem = z.infer<typeof pausedItem>;

const communityParams = z.strictObject({ communityId: id });
const itemParams = z.strictObject({ communityId: id, itemType: z.enum(SHARED_ITEM_TYPES), itemId: id });
const item = '/api/communities/:communityId/items/:itemType/:itemId';

export const withdrawalsEndpoints = {
  readState: defineEndpoint({
    id: 'readItemState',
    method: 'GET',
    path: `${item}/state`,
    summary: 'Whether a thing is paused, and what this person may do about it',
    access: member('community', ...ROLES),
    params: itemParams,
    response: itemState,
  }),
  withdraw: defineEndpoint({
    id: 'withdrawItem',
    method: 'POST',
    path: `${item}/withdrawal`,
    summary: 'Take a thing back: it vanishes here, from old versions, files and records, for good',
    access: member('community', ...ROLES),
    params: itemParams,
    body: withdrawalInput,
  }),
  pause: defineEndpoint({
    id: 'pauseItem',
    method: 'POST',
    path: `${item}/pause`,
    summary: 'Hide a thing from everybody for now',
    access: member('community', ...ROLES),
    params: itemParams,
    body: pauseInput,
  }),
  resume: defineEndpoint({
    id: 'resumeItem',
    method: 'DELETE',
    path: `${item}/pause`,
    summary: 'End a pause; after thirty days only its giver can',
    access: member('community', ...ROLES),
    params: itemParams,
  }),
  takeNameOff: defineEndpoint({
    id: 'takeNameOff',
    method: 'POST',
    path: `${item}/name-removal`,
    summary: 'Take the giver’s name off a thing, in the draft and in every version',
    access: member('community', ...ROLES),
    params: itemParams,
  }),
  removeSound: defineEndpoint({
    id: 'removeSound',
    method: 'POST',
    path: '/api/communities/:communityId/items/attachment/:itemId/sound-removal',
    summary: 'Remove the sound of a recording for good and keep the words that were written out from it',
    access: member('community', ...ROLES),
    params: z.strictObject({ communityId: id, itemId: id }),
    body: pauseInput,
  }),
  listPaused: defineEndpoint({
    id: 'listPausedItems',
    method: 'GET',
    path: '/api/communities/:communityId/paused',
    summary: 'What is hidden for now and this person may bring back, newest first',
    access: member('community', ...ROLES),
    params: communityParams,
    response: listOf(pausedItem),
  }),
  listWithdrawn: defineEndpoint({
    id: 'listWithdrawn',
    method: 'GET',
    path: '/api/communities/:communityId/withdrawn',
    summary: 'Ids of things this person could see and that are withdrawn or paused: their devices wipe them',
    access: member('community', ...ROLES),
    params: communityParams,
    response: listOf(withdrawnItem),
  }),
  listSheets: defineEndpoint({
    id: 'listSheetsToReplace',
    method: 'GET',
    path: '/api/communities/:communityId/sheets-to-replace',
    summary: 'Published sheets that may hang with something withdrawn on them',
    access: member('community', 'officer', 'steward', 'staff'),
    params: communityParams,
    response: listOf(sheetToReplace),
  }),
  sheetReplaced: defineEndpoint({
    id: 'markSheetReplaced',
    method: 'POST',
    path: '/api/communities/:communityId/sheets-to-replace/:withdrawalId',
    summary: 'Say that the sheet with something withdrawn on it has been taken down',
    access: member('community', 'officer', 'steward', 'staff'),
    params: z.strictObject({ communityId: id, withdrawalId: id }),
  }),
} as const;
