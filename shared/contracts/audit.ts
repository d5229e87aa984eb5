import { z } from 'zod';
import { id, instant, listOf, pageQuery } from './common.js';
import { defineEndpoint, member } from './endpoint.js';

/** Everything that is written down when it happens. Rows hold ids and codes; sentences are made on reading. */
export const AUDIT_ACTIONS = [
  'person-added',
  'roles-changed',
  'code-renewed',
  'membership-ended',
  'death-noted',
  'death-undone',
  'password-set',
  'devices-signed-out',
  'helping-began',
  'helping-ended',
  'card-made',
  'card-ended',
  'card-first-used',
  'letters-chosen',
  'invitation-sent',
  'community-founded',
  'settings-changed',
  'place-added',
  'place-changed',
  'figure-added',
  'figure-changed',
  'figure-taken-out',
  'figure-put-back',
  'attachment-added',
  'attachment-words-written',
  'group-founded',
  'group-changed',
  'sharing-tightened',
  'wider-asked',
  'wider-agreed',
  'wider-dropped',
  'sharing-widened',
  'kept-read',
  'note-added',
  'note-answered',
  'note-closed',
  'note-reopened',
  'item-withdrawn',
  'variant-added',
  'variant-changed',
  'variant-removed',
  'item-paused',
  'item-resumed',
  'name-taken-off',
  'sound-removed',
  'consent-written',
  'consent-changed',
  'consent-withdrawn',
  'calendar-begun',
  'entry-added',
  'entry-changed',
  'entry-copied',
  'entry-deleted',
  'entry-restored',
  'entries-reordered',
  'submitted',
  'changes-asked',
  'answered',
  'answered-on-behalf',
  'answer-taken-back',
  'difference-let-stand',
  'signed',
  'signed-off',
  'published',
  'replaced',
  'recalled',
] as const;
export type AuditAction = (typeof AUDIT_ACTIONS)[number];

export const auditEvent = z.strictObject({
  id,
  at: instant,
  actorName: z.string(),
  /** For whom it was done, where somebody wrote for somebody else. */
  onBehalfOfName: z.string().optional(),
  action: z.enum(AUDIT_ACTIONS),
  /** Names looked up now from the ids that the row keeps; null where the thing is gone. */
  subjectName: z.string().nullable(),
  /** True where its people keep it and this person does not read its name. */
  isKept: z.boolean(),
  /** Codes and numbers only, e.g. `{ "number": 2, "fields": ["offsets"] }`. */
  details: z.record(z.string(), z.unknown()),
});
export type AuditEvent = z.infer<typeof auditEvent>;

export const auditEndpoints = {
  list: defineEndpoint({
    id: 'listAuditEvents',
    method: 'GET',
    path: '/api/communities/:communityId/audit',
    summary: 'Who did what, newest first',
    access: member('community', 'steward', 'officer', 'elder'),
    needsPassword: true,
    params: z.strictObject({ communityId: id }),
    query: pageQuery,
    response: listOf(auditEvent),
  }),
} as const;
