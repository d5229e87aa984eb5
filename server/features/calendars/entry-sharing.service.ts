import { type EntryInput } from '#shared/contracts/calendars.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import type { EntityManager } from 'typeorm';
import { ItemSharingEntity } from '../../db/entities/item-sharing.entity.js';
import { hasRole, type Actor } from '../../http/actor.js';
import { conflict, invalidField, notFound } from '../../http/app-error.js';
import { isKept, maySee, type Shared } from '../../policy/policy.js';
import { insertSharing, lockSharing } from '../../policy/sharing.repository.js';
import { isTighterOrSame, type Sharing } from '#shared/contracts/sharing-tightness.js';
import type { Viewer } from '../../policy/viewer.js';
import { tightenOtherYears } from '../rollovers/tighter-years.service.js';
import { expectKnownPeople } from '../sharing/known-people.service.js';

/** How an entry or a timing is shared, as its content says it. */
export function sharingOf({ sharingLevel, sharing }: Pick<EntryInput, 'sharingLevel' | 'sharing'>): Sharing {
  return { level: sharingLevel, details: sharing ?? PLAIN_DETAILS };
}

/** The village's entries are the officers' to write; what is kept is its giver's, and an officer's who may see it. */
export function mayWrite(viewer: Viewer, shared: Shared | undefined): boolean {
  if (shared === undefined || !maySee(viewer, shared)) return false;
  if (viewer.roles.includes('officer')) return true;
  return isKept(shared) && shared.giverId === viewer.personId;
}

/** Nothing is there for whoever does not see it; what is seen and not theirs to write is refused. */
export function expectMayWrite(viewer: Viewer, shared: Shared | undefined): Shared {
  if (shared === undefined || !maySee(viewer, shared)) throw notFound();
  if (!mayWrite(viewer, shared)) throw conflict(isKept(shared) ? 'not-the-giver' : 'officers-write-this');
  return shared;
}

/** A new entry has the level that it was written with. Elders write what is kept; the village's is the officers'. */
export async function shareNewEntry(
  manager: EntityManager,
  actor: Actor,
  entryId: string,
  content: EntryInput,
): Promise<void> {
  const { level, details } = sharingOf(content);
  if (!hasRole(actor, 'officer') && !isKept({ level, details })) throw conflict('officers-write-this');
  await expectKnownPeople(manager, actor, details, content.giverId ?? null, '');
  const { communityId } = actor;
  const giverId = content.giverId ?? actor.person.id;
  await insertSharing(manager, { itemType: 'entry', itemId: entryId, communityId, level, details, giverId });
}

/** Tighter holds at once; wider than it was is for its giver and the steward together, not for an edit. */
export async function shareChangedEntry(
  manager: EntityManager,
  actor: Actor,
  entryId: string,
  content: EntryInput,
): Promise<void> {
  const row = await lockSharing(manager, 'entry', entryId);
  if (row === null) throw notFound();
  const after = sharingOf(content);
  const giverId = content.giverId ?? row.giverId;
  if (giverId !== row.giverId && isKept(row) && row.giverId !== actor.person.id) {
    throw invalidField('content.giverId', 'only-the-giver');
  }
  if (!isTighterOrSame(row, after)) throw invalidField('content.sharingLevel', 'wider-needs-two');
  await expectKnownPeople(manager, actor, after.details, content.giverId ?? null, 'content.');
  await manager.update(ItemSharingEntity, { itemType: 'entry', itemId: entryId }, { ...after, giverId });
  await tightenOtherYears(manager, { itemType: 'entry', itemId: entryId }, row, after);
}
