import { tightest, type Sharing } from '#shared/contracts/sharing-tightness.js';
import type { SharedItemType } from '#shared/contracts/sharing.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import type { EntityManager } from 'typeorm';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { ItemSharingEntity } from '../../db/entities/item-sharing.entity.js';
import { lockSharing } from '../../policy/sharing.repository.js';
import { sameInOtherYears } from './same-things.service.js';

/**
 * A tighter level holds for the same thing in every year, earlier and later: whoever gave it does not think of drafts. A wider
 * one, which giver and steward agreed to, stays with the year for which they did.
 */
export async function tightenOtherYears(
  manager: EntityManager,
  { itemType, itemId }: { itemType: SharedItemType; itemId: string },
  before: Sharing,
  after: Sharing,
): Promise<void> {
  // Saying the same again is no new word about other years, where it may have become wider since.
  if (sameJson(plain(before), plain(after))) return;
  for (const id of (await sameInOtherYears(manager, itemType, itemId)).toSorted()) {
    const row = await lockSharing(manager, itemType, id);
    if (row === null) continue;
    const { level, details } = row;
    const tighter = tightest({ level, details }, after);
    if (sameJson(tighter, { level, details })) continue;
    await manager.update(ItemSharingEntity, { itemType, itemId: id }, { ...tighter, asked: null });
    if (itemType === 'entry') await sayItInTheEntry(manager, id, tighter);
  }
}

function plain({ level, details }: Sharing): Sharing {
  return { level, details };
}

/** The entry's own words about how it is shared follow, so that the next edit does not ask for a wider circle. */
export async function sayItInTheEntry(
  manager: EntityManager,
  entryId: string,
  { level, details }: Sharing,
): Promise<void> {
  const entry = await manager.findOneBy(EntryEntity, { id: entryId });
  if (entry === null) return;
  const content = { ...entry.content, sharingLevel: level, sharing: details };
  await manager.update(EntryEntity, { id: entryId }, { content });
}
