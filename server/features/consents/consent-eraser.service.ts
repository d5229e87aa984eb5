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

/** What was agreed stands; who agreed is said no more, where it is that giver. */
export async function takeNamesOffConsents(
  manager: EntityManager,
  itemType: SharedItemType,
  itemId: string,
  giver: { id: string | null; names: ReadonlySet<string> },
): Promise<void> {
  const type = CONSENT_ITEMS.find((one) => one === itemType);
  if (type === undefined) return;
  for (const { id, giverId, details } of await manager.findBy(ConsentEntity, { itemType: type, itemId })) {
    const isTheirs = (giver.id !== null && giverId === giver.id) || giver.names.has(details.giverName);
    if (!isTheirs) continue;
    const nameless = { ...details, giverName: '', naming: 'not-named' as const };
    await manager.update(ConsentEntity, { id }, { details: nameless });
  }
}
