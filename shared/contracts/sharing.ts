import { z } from 'zod';
import { id, line, listOf, monthDay, rowVersion } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';

/** Who may see a thing, from the widest circle to the narrowest. */
export const SHARING_LEVELS = ['open', 'village', 'group', 'elders', 'sealed'] as const;
export const sharingLevel = z.enum(SHARING_LEVELS);
export type SharingLevel = (typeof SHARING_LEVELS)[number];

/** What others see of a thing that is not theirs to see: an empty slot, or nothing at all. */
export const TRACES = ['blank', 'none'] as const;
/** How the giver is named beside it. */
export const NAMINGS = ['named', 'role', 'not-named'] as const;

/** Stands in place of a giver who wishes to be named by their role. */
export const GIVER_BY_ROLE = '@role';

/** Everything that has a level of its own. */
export const SHARED_ITEM_TYPES = [
  'entry',
  'figure',
  'story',
  'note',
  'attachment',
  'variant',
  'sign',
] as const;
export type SharedItemType = (typeof SHARED_ITEM_TYPES)[number];

/** From–to within the year, both days included; it may reach over New Year. Outside it a thing is as sealed. */
export const tellingSeason = z.strictObject({ from: monthDay, to: monthDay });
export type TellingSeason = z.infer<typeof tellingSeason>;

/** Beside the level: which group, what others see, when it may be told, who comes after the giver. */
export const sharingDetails = z.strictObject({
  groupId: id.nullable(),
  trace: z.enum(TRACES),
  tellingSeason: tellingSeason.nullable(),
  successorId: id.nullable(),
  naming: z.enum(NAMINGS),
});
export type SharingDetails = z.infer<typeof sharingDetails>;

export const PLAIN_DETAILS: SharingDetails = {
  groupId: null,
  trace: 'blank',
  tellingSeason: null,
  successorId: null,
  naming: 'named',
};

const sharingFields = sharingDetails.extend({ level: sharingLevel });

/** A group level names its group, and only that one does. */
export function groupFitsLevel(
  { level, groupId }: { level: SharingLevel; groupId: string | null },
  refuse: (code: 'choose-group' | 'no-group-here') => void,
): void {
  if (level === 'group' && groupId === null) refuse('choose-group');
  if (level !== 'group' && groupId !== null) refuse('no-group-here');
}

export const sharingInput = sharingFields.superRefine((sharing, context) => {
  groupFitsLevel(sharing, (message) => {
    context.addIssue({ code: 'custom', path: ['groupId'], message });
  });
});
export type SharingInput = z.infer<typeof sharingInput>;

/** A wider level that was asked for: it comes once the giver and the steward have both agreed. */
export const askedSharing = z.strictObject({
  sharing: sharingFields,
  askedByName: z.string(),
  giverAgreed: z.boolean(),
  stewardAgreed: z.boolean(),
});

export const itemSharing = z.strictObject({
  itemType: z.enum(SHARED_ITEM_TYPES),
  itemId: id,
  sharing: sharingFields,
  groupName: z.string().nullable(),
  /** Who gave it; null where nobody of the village is named as its giver. */
  giverId: id.nullable(),
  giverName: z.string(),
  successorName: z.string(),
  asked: askedSharing.nullable(),
  may: z.strictObject({ tighten: z.boolean(), askWider: z.boolean(), agreeWider: z.boolean() }),
  version: rowVersion,
});
export type ItemSharing = z.infer<typeof itemSharing>;

export const sharingChange = z.strictObject({ sharing: sharingInput, version: rowVersion });
export type SharingChange = z.infer<typeof sharingChange>;

export const GROUP_MEMBERS_MAX = 200;
export const GROUPS_MAX = 50;
const memberIds = z
  .array(id)
  .min(1, 'choose-one')
  .max(GROUP_MEMBERS_MAX)
  .refine((list) => new Set(list).size === list.length, 'no-duplicates');

export const groupInput = z.strictObject({ name: line(60, 1), memberIds });
export type GroupInput = z.infer<typeof groupInput>;
export const groupUpdate = groupInput.extend({ version: rowVersion });
export type GroupUpdate = z.infer<typeof groupUpdate>;

export const group = z.strictObject({
  id,
  name: z.string(),
  memberCount: z.number().int(),
  /** Only the group's own people read who else belongs to it. */
  members: z.array(z.strictObject({ id, displayName: z.string() })).nullable(),
  isMember: z.boolean(),
  version: rowVersion,
});
export type Group = z.infer<typeof group>;

const communityParams = z.strictObject({ communityId: id });
const groupParams = z.strictObject({ communityId: id, groupId: id });
const itemParams = z.strictObject({
  communityId: id,
  itemType: z.enum(SHARED_ITEM_TYPES),
  itemId: id,
});

export const sharingEndpoints = {
  listGroups: defineEndpoint({
    id: 'listGroups',
    method: 'GET',
    path: '/api/communities/:communityId/groups',
    summary: 'The village’s groups by name; who belongs to one is for its own people',
    access: member('community', ...ROLES),
    params: communityParams,
    response: listOf(group),
  }),
  addGroup: defineEndpoint({
    id: 'addGroup',
    method: 'POST',
    path: '/api/communities/:communityId/groups',
    summary: 'Found a group with its first people',
    access: member('community', 'steward', 'elder'),
    params: communityParams,
    body: groupInput,
    response: group,
    status: 201,
  }),
  updateGroup: defineEndpoint({
    id: 'updateGroup',
    method: 'PUT',
    path: '/api/communities/:communityId/groups/:groupId',
    summary: 'Change a group’s name and people; for its own people only',
    access: member('community', ...ROLES),
    params: groupParams,
    body: groupUpdate,
    response: group,
  }),
  listAsked: defineEndpoint({
    id: 'listAskedSharing',
    method: 'GET',
    path: '/api/communities/:communityId/wider-asked',
    summary: 'Wider levels that wait for this person’s word, without what they are about',
    access: member('community', ...ROLES),
    params: communityParams,
    response: listOf(itemSharing),
  }),
  readSharing: defineEndpoint({
    id: 'readSharing',
    method: 'GET',
    path: '/api/communities/:communityId/items/:itemType/:itemId/sharing',
    summary: 'Who may see a thing, who gave it, and a wider level that was asked for',
    access: member('community', ...ROLES),
    params: itemParams,
    response: itemSharing,
  }),
  changeSharing: defineEndpoint({
    id: 'changeSharing',
    method: 'PUT',
    path: '/api/communities/:communityId/items/:itemType/:itemId/sharing',
    summary: 'A tighter level holds at once; a wider one waits for its giver and the steward together',
    access: member('community', ...ROLES),
    params: itemParams,
    body: sharingChange,
    response: itemSharing,
  }),
  agreeWider: defineEndpoint({
    id: 'agreeWiderSharing',
    method: 'POST',
    path: '/api/communities/:communityId/items/:itemType/:itemId/sharing/agreement',
    summary: 'Agree, as the giver or as the steward, to the wider level that was asked for',
    access: member('community', ...ROLES),
    params: itemParams,
    response: itemSharing,
  }),
  dropWider: defineEndpoint({
    id: 'dropWiderSharing',
    method: 'DELETE',
    path: '/api/communities/:communityId/items/:itemType/:itemId/sharing/agreement',
    summary: 'End the asking for a wider level; the thing stays as it is shared',
    access: member('community', ...ROLES),
    params: itemParams,
    response: itemSharing,
  }),
} as const;
