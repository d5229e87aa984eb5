import type { SharedItemType } from '#shared/contracts/sharing.js';
import { In, type EntityManager } from 'typeorm';
import { RolledItemEntity } from '../../db/entities/rolled-item.entity.js';

const DOUBLED: ReadonlySet<SharedItemType> = new Set(['entry', 'variant', 'attachment']);

/** Ids of the same thing in other drafts, earlier and later ones; none for what never stands in two. */
export async function sameInOtherYears(
  manager: EntityManager,
  itemType: SharedItemType,
  itemId: string,
): Promise<string[]> {
  if (!DOUBLED.has(itemType)) return [];
  const known = new Set([itemId]);
  let newest = [itemId];
  while (newest.length > 0) {
    const rows = await manager.find(RolledItemEntity, {
      where: [{ itemId: In(newest) }, { fromId: In(newest) }],
      select: { itemId: true, fromId: true },
    });
    newest = [...new Set(rows.flatMap((row) => [row.itemId, row.fromId]))].filter((id) => !known.has(id));
    for (const id of newest) known.add(id);
  }
  return [...known].filter((id) => id !== itemId);
}

/** Its days in the year before go with it; that it was the same thing stays, so that taking back finds every year. */
export async function forgetRolledDays(manager: EntityManager, itemId: string): Promise<void> {
  await manager.update(RolledItemEntity, { itemId }, { before: null, timing: null });
}
