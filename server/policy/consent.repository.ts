import type { ConsentItemType } from '#shared/contracts/consents.js';
import { randomUUID } from 'node:crypto';
import { In, type EntityManager } from 'typeorm';
import { ConsentEntity } from '../db/entities/consent.entity.js';
import { ItemSharingEntity } from '../db/entities/item-sharing.entity.js';
import { shownUntil } from './consents.js';

/** Every consent about things of one kind, by the thing's id; a thing without any has an empty list. */
export async function consentsById(
  manager: EntityManager,
  itemType: ConsentItemType,
  itemIds: readonly string[],
): Promise<(itemId: string) => readonly ConsentEntity[]> {
  const ids = [...new Set(itemIds)];
  const rows = ids.length === 0 ? [] : await manager.findBy(ConsentEntity, { itemType, itemId: In(ids) });
  return (itemId) => rows.filter((row) => row.itemId === itemId);
}

/** In the transaction that changed a consent: from now on the policy shows the thing as long as they all allow it. */
export async function settleShownUntil(
  manager: EntityManager,
  itemType: ConsentItemType,
  itemId: string,
): Promise<void> {
  const consents = await manager.findBy(ConsentEntity, { itemType, itemId });
  await manager.update(ItemSharingEntity, { itemType, itemId }, { shownUntil: shownUntil(consents) });
}

/** A copy of a thing may be used as the thing may: a no is not got round by copying. */
export async function copyConsents(
  manager: EntityManager,
  itemType: ConsentItemType,
  fromId: string,
  itemId: string,
): Promise<void> {
  const rows = await manager.findBy(ConsentEntity, { itemType, itemId: fromId });
  for (const { version: _version, community: _community, ...row } of rows) {
    await manager.insert(ConsentEntity, { ...row, id: randomUUID(), itemId });
  }
  if (rows.length > 0) await settleShownUntil(manager, itemType, itemId);
}
