import { CONSENT_ITEMS } from '#shared/contracts/consents.js';
import type { SharedItemType } from '#shared/contracts/sharing.js';
import { In, type EntityManager } from 'typeorm';
import { ConsentEntity } from '../../db/entities/consent.entity.js';

/** Takes out what was agreed about a thing that is withdrawn: conditions and names are words of its people, too. */
export async function eraseConsents(
  manager: EntityManager,
  itemType: SharedItemType,
  itemId: string,
): Promise<string[]> {
  const type = CONSENT_ITEMS.find((one) => one === itemType);
  if (type === undefined) return [];
  const rows = await manager.find(ConsentEntity, {
    where: { itemType: type, itemId },
    select: { id: true },
  });
  const ids = rows.map(({ id }) => id);
  await manager.delete(ConsentEntity, { id: In(ids) });
  return ids;
}
