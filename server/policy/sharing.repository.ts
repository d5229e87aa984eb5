import type { SharedItemType, SharingDetails, SharingLevel } from '#shared/contracts/sharing.js';
import { In, type EntityManager } from 'typeorm';
import { askedOnceEach } from '../db/asked-once.js';
import { ItemSharingEntity } from '../db/entities/item-sharing.entity.js';
import { copyConsents } from './consent.repository.js';
import type { Shared } from './policy.js';

/** What the policy knows about things of one kind, by id. */
export async function sharedById(
  manager: EntityManager,
  itemType: SharedItemType,
  itemIds: readonly string[],
): Promise<Map<string, Shared>> {
  return askedOnceEach<Shared>(manager, `sharing of ${itemType}`, itemIds, async (unknown) => {
    const rows = await manager.findBy(ItemSharingEntity, { itemType, itemId: In([...unknown]) });
    return new Map(rows.map((row) => [row.itemId, row]));
  });
}

export interface NewSharing {
  itemType: SharedItemType;
  itemId: string;
  communityId: string;
  level: SharingLevel;
  details: SharingDetails;
  giverId: string | null;
}

/** In the transaction that makes the thing itself: without this row nobody sees it. */
export async function insertSharing(manager: EntityManager, sharing: NewSharing): Promise<void> {
  await manager.insert(ItemSharingEntity, { ...sharing, asked: null });
}

/** Waits for whoever else is changing how the thing is shared. */
export async function lockSharing(
  manager: EntityManager,
  itemType: SharedItemType,
  itemId: string,
): Promise<ItemSharingEntity | null> {
  return manager.findOne(ItemSharingEntity, {
    where: { itemType, itemId },
    lock: { mode: 'pessimistic_write' },
  });
}

/** A copy of a thing is shared as the thing is, and hidden where it is paused. */
export async function copySharing(
  manager: EntityManager,
  itemType: SharedItemType,
  fromId: string,
  itemId: string,
): Promise<void> {
  const { communityId, level, details, giverId, state, stateAt } = await manager.findOneByOrFail(
    ItemSharingEntity,
    {
      itemType,
      itemId: fromId,
    },
  );
  const copy = { itemType, itemId, communityId, level, details, giverId, state, stateAt };
  await manager.insert(ItemSharingEntity, { ...copy, asked: null });
  if (itemType === 'entry' || itemType === 'attachment')
    await copyConsents(manager, itemType, fromId, itemId);
}
