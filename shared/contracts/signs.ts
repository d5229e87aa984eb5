import { z } from 'zod';
import { id, instant, isoDate, line, listOf, rowVersion } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { signWords } from './event-record.js';
import { ROLES } from './people.js';
import { groupFitsLevel, PLAIN_DETAILS, sharingDetails, sharingLevel } from './sharing.js';

/** How many signs a village keeps in its list. */
export const SIGNS_MAX = 200;
/** How often one sign can be marked as seen in the time that is kept in the list. */
export const SIGHTINGS_MAX = 60;
/** How long ago it may have been seen; what is older is not told any more. */
export const SEEN_DAYS_BACK = 400;

const signFields = signWords.extend({ sharingLevel, sharing: sharingDetails.optional() });

type Levelled = Pick<z.infer<typeof signFields>, 'sharingLevel' | 'sharing'>;

function expectFittingGroup(
  { sharingLevel: level, sharing = PLAIN_DETAILS }: Levelled,
  context: z.RefinementCtx,
) {
  groupFitsLevel({ level, groupId: sharing.groupId }, (message) => {
    context.addIssue({ code: 'custom', path: ['sharing', 'groupId'], message });
  });
}

/** A sign of nature that the village knows; entries refer to it, so that it is described once. */
export const signInput = signFields.superRefine(expectFittingGroup);
export type SignInput = z.infer<typeof signInput>;

export const signUpdate = signFields.extend({ version: rowVersion }).superRefine(expectFittingGroup);
export type SignUpdate = z.infer<typeof signUpdate>;

/** On which day it was seen, and by whom, in words. */
export const sightingInput = z.strictObject({ day: z.iso.date('date-form'), who: line(120, 1) });
export type SightingInput = z.infer<typeof sightingInput>;

export const sighting = z.strictObject({
  id,
  day: isoDate,
  who: z.string(),
  markedBy: z.string(),
  markedAt: instant,
  /** Marked by the person who asks: theirs to take back. */
  mine: z.boolean(),
});
export type Sighting = z.infer<typeof sighting>;

export const sign = signFields.extend({
  id,
  communityId: id,
  /** Newest day first. */
  seen: z.array(sighting),
  updatedBy: z.string(),
  updatedAt: instant,
  version: rowVersion,
  /** The asking person's to change: of an elder who gave it, else the officers'. */
  mine: z.boolean(),
});
export type Sign = z.infer<typeof sign>;

/** A sign in an entry's own words, and the days on which it was seen: newest first. */
export const ownSeen = z.strictObject({ entryId: id, ownId: id, seen: z.array(sighting) });
export type OwnSeen = z.infer<typeof ownSeen>;

const communityParams = z.strictObject({ communityId: id });
const signParams = z.strictObject({ communityId: id, signId: id });
const seenParams = z.strictObject({ communityId: id, signId: id, seenId: id });
const ownParams = z.strictObject({ calendarId: id, entryId: id, ownId: id });

export const signsEndpoints = {
  list: defineEndpoint({
    id: 'listSigns',
    method: 'GET',
    path: '/api/communities/:communityId/signs',
    summary: 'The village’s signs of nature by name, with the days on which they were seen lately',
    access: member('community', ...ROLES),
    params: communityParams,
    response: listOf(sign),
  }),
  add: defineEndpoint({
    id: 'addSign',
    method: 'POST',
    path: '/api/communities/:communityId/signs',
    summary: 'Add a sign to the village’s list',
    access: member('community', 'officer', 'elder'),
    params: communityParams,
    body: signInput,
    response: sign,
    status: 201,
  }),
  update: defineEndpoint({
    id: 'updateSign',
    method: 'PUT',
    path: '/api/communities/:communityId/signs/:signId',
    summary:
      'Change a sign and its words in every draft; versions keep theirs; 409 with both states when stale',
    access: member('community', 'officer', 'elder'),
    params: signParams,
    body: signUpdate,
    response: sign,
  }),
  remove: defineEndpoint({
    id: 'removeSign',
    method: 'DELETE',
    path: '/api/communities/:communityId/signs/:signId',
    summary:
      'Take a sign out of the list; refused while an entry of a draft waits for it; it can be put back',
    access: member('community', 'officer', 'elder'),
    params: signParams,
  }),
  restore: defineEndpoint({
    id: 'restoreSign',
    method: 'POST',
    path: '/api/communities/:communityId/signs/:signId/restore',
    summary: 'Put a sign back that was taken out of the list',
    access: member('community', 'officer', 'elder'),
    params: signParams,
    response: sign,
  }),
  markSeen: defineEndpoint({
    id: 'markSignSeen',
    method: 'POST',
    path: '/api/communities/:communityId/signs/:signId/seen',
    summary: 'Say that a sign was seen: on which day and by whom',
    access: member('community', ...ROLES),
    params: signParams,
    body: sightingInput,
    response: sign,
    status: 201,
  }),
  takeBackSeen: defineEndpoint({
    id: 'takeBackSignSeen',
    method: 'DELETE',
    path: '/api/communities/:communityId/signs/:signId/seen/:seenId',
    summary: 'Take back that a sign was seen, by whoever marked it',
    access: member('community', ...ROLES),
    params: seenParams,
    response: sign,
  }),
  listOwnSeen: defineEndpoint({
    id: 'listOwnSignsSeen',
    method: 'GET',
    path: '/api/communities/:communityId/own-signs-seen',
    summary: 'When signs in the own words of entries were seen, of the entries that the person sees',
    access: member('community', ...ROLES),
    params: communityParams,
    response: listOf(ownSeen),
  }),
  markOwnSeen: defineEndpoint({
    id: 'markOwnSignSeen',
    method: 'POST',
    path: '/api/calendars/:calendarId/entries/:entryId/signs/:ownId/seen',
    summary: 'Say that a sign in an entry’s own words was seen: on which day and by whom',
    access: member('calendar', ...ROLES),
    params: ownParams,
    body: sightingInput,
    response: ownSeen,
    status: 201,
  }),
  takeBackOwnSeen: defineEndpoint({
    id: 'takeBackOwnSignSeen',
    method: 'DELETE',
    path: '/api/calendars/:calendarId/entries/:entryId/signs/:ownId/seen/:seenId',
    summary: 'Take back that a sign in an entry’s own words was seen, by whoever marked it',
    access: member('calendar', ...ROLES),
    params: ownParams.extend({ seenId: id }),
    response: ownSeen,
  }),
} as const;
