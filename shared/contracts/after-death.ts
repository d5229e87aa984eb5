import { z } from 'zod';
import { id, isoDate, line } from './common.js';
import { defineEndpoint, member } from './endpoint.js';

const count = z.number().int().min(0);

/** What a person chose for after their death in the consents that they gave, and whether it was done. No words of it. */
export const afterDeath = z.strictObject({
  /** Civil day; null while nothing is noted. */
  diedOn: isoDate.nullable(),
  /** How many things are to stay, be told to fewer, pass to somebody, or be removed. */
  chosen: z.strictObject({ keep: count, tighten: count, passTo: count, remove: count }),
  /** As they were written down: to whom something is to pass, where nobody of the village is called so, or several are. */
  openHeirs: z.array(z.string()),
  /** Noted and nothing was removed: it can be undone. */
  mayUndo: z.boolean(),
});
export type AfterDeath = z.infer<typeof afterDeath>;

export const deathInput = z.strictObject({
  diedOn: isoDate,
  /** Said a second time where something is removed for good. */
  removesForGood: z.boolean(),
});
export type DeathInput = z.infer<typeof deathInput>;

/** Who is meant by a name that fits nobody. */
export const heirInput = z.strictObject({ name: line(120, 1), personId: id });
export type HeirInput = z.infer<typeof heirInput>;

const params = z.strictObject({ communityId: id, personId: id });
const path = '/api/communities/:communityId/people/:personId/death';

export const afterDeathEndpoints = {
  read: defineEndpoint({
    id: 'readAfterDeath',
    method: 'GET',
    path,
    summary: 'What somebody chose for after their death, as numbers',
    access: member('community', 'steward'),
    params,
    response: afterDeath,
  }),
  note: defineEndpoint({
    id: 'noteDeath',
    method: 'PUT',
    path,
    summary: 'Note that somebody died, and do what they chose for what they gave',
    access: member('community', 'steward'),
    params,
    body: deathInput,
    response: afterDeath,
  }),
  nameHeir: defineEndpoint({
    id: 'nameHeir',
    method: 'POST',
    path: `${path}/heirs`,
    summary: 'Say who is meant by the name to whom something is to pass, and pass it on',
    access: member('community', 'steward'),
    params,
    body: heirInput,
    response: afterDeath,
  }),
  undo: defineEndpoint({
    id: 'undoDeath',
    method: 'DELETE',
    path,
    summary: 'Undo a note made by mistake; not where something was removed',
    access: member('community', 'steward'),
    params,
    response: afterDeath,
  }),
} as const;
