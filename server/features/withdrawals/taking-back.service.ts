import { PAUSE_DAYS } from '#shared/contracts/withdrawals.js';
import type { SharedItemType } from '#shared/contracts/sharing.js';
import { addDays } from 'date-fns';
import type { EntityManager } from 'typeorm';
import type { ItemSharingEntity } from '../../db/entities/item-sharing.entity.js';
import { hasRole, type Actor } from '../../http/actor.js';
import { conflict, notFound } from '../../http/app-error.js';
import { appearance, maySee, type Appearance, type Shared } from '../../policy/policy.js';
import { lockSharing } from '../../policy/sharing.repository.js';
import { viewerOf, type Viewer } from '../../policy/viewer.js';

/** Giver and successor; elders of what they see; steward and officer for whoever asks them, whatever the level. */
export function mayTakeBack(actor: Actor, viewer: Viewer, row: ItemSharingEntity): boolean {
  const { giverId, details } = row;
  if (giverId === actor.person.id || details.successorId === actor.person.id) return true;
  if (hasRole(actor, 'steward', 'officer')) return true;
  return hasRole(actor, 'elder') && couldSee(viewer, row);
}

/** Whether a person sees the thing whenever it is not hidden. */
export function couldSee(viewer: Viewer, shared: Shared): boolean {
  return appearanceUnhidden(viewer, shared) === 'full';
}

/** How a thing appears to a person whenever it is not hidden. */
export function appearanceUnhidden(viewer: Viewer, shared: Shared): Appearance {
  return appearance(viewer, { ...shared, state: 'shared' });
}

export function mayResume(actor: Actor, { giverId, stateAt }: ItemSharingEntity, now: Date): boolean {
  return giverId === actor.person.id || (stateAt !== null && now <= othersUntil(stateAt));
}

/** After that only its giver ends a pause. */
export function othersUntil(pausedAt: Date): Date {
  return addDays(pausedAt, PAUSE_DAYS);
}

/** Holds a thing that this person may take back; anything else is not there, or not theirs. */
export async function lockOwn(
  manager: EntityManager,
  actor: Actor,
  now: Date,
  { itemType, itemId }: { itemType: SharedItemType; itemId: string },
): Promise<ItemSharingEntity> {
  const row = await lockSharing(manager, itemType, itemId);
  if (row?.communityId !== actor.communityId) throw notFound();
  const viewer = await viewerOf(manager, actor, now);
  if (mayTakeBack(actor, viewer, row)) return row;
  throw maySee(viewer, row) ? conflict('not-the-giver') : notFound();
}
