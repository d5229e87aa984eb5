import { NAMINGS } from '#shared/contracts/sharing.js';
import type { EntityManager } from 'typeorm';
import type { ConsentDetails } from '../../db/entities/consent.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { ItemSharingEntity } from '../../db/entities/item-sharing.entity.js';
import type { ThingRef } from './consent-things.service.js';

/**
 * A giver who agreed to be named by role, or not at all, is no longer named from now on. To be named more openly than
 * the thing says is a wider circle, and that is for giver and steward to ask for.
 */
export async function narrowNaming(
  manager: EntityManager,
  { itemType, itemId }: ThingRef,
  agreed: ConsentDetails['naming'],
): Promise<void> {
  const naming = agreed ?? 'not-named';
  const row = await manager.findOneByOrFail(ItemSharingEntity, { itemType, itemId });
  if (NAMINGS.indexOf(naming) <= NAMINGS.indexOf(row.details.naming)) return;
  const details = { ...row.details, naming };
  await manager.update(ItemSharingEntity, { itemType, itemId }, { details });
  if (itemType !== 'entry') return;
  const entry = await manager.findOneByOrFail(EntryEntity, { id: itemId });
  // The entry's own words about how it is shared follow, so that the next edit does not ask for a wider circle.
  await manager.update(EntryEntity, { id: itemId }, { content: { ...entry.content, sharing: details } });
}
