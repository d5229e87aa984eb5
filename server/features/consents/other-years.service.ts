import { randomUUID } from 'node:crypto';
import { IsNull, type EntityManager } from 'typeorm';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import { ConsentEntity } from '../../db/entities/consent.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { settleShownUntil } from '../../policy/consent.repository.js';
import { narrowedConsent } from '../../policy/consents-of-years.js';
import { lockSharing } from '../../policy/sharing.repository.js';
import { sameInOtherYears } from '../rollovers/same-things.service.js';
import { narrowNaming } from './agreed-naming.js';

/** What somebody took back, narrowed or ended about an entry, a voice or a picture holds for the same one in every draft. */
export async function holdInOtherYears(manager: EntityManager, said: ConsentEntity): Promise<void> {
  const { itemType } = said;
  if (itemType !== 'entry' && itemType !== 'attachment') return;
  for (const itemId of (await sameInOtherYears(manager, itemType, said.itemId)).toSorted()) {
    await lockSharing(manager, itemType, itemId);
    const entry = itemType === 'entry' ? await manager.findOneBy(EntryEntity, { id: itemId }) : null;
    if (itemType === 'entry' ? entry === null : !(await isThere(manager, itemId))) continue;
    const known = await theirsAbout(manager, said, itemId);
    const narrowed = narrowedConsent(known, said, entry?.content.kind ?? null);
    if (narrowed !== null) {
      const { recordedBy, recordedAt } = said;
      const changes = { ...narrowed, uses: [...narrowed.uses], recordedBy, recordedAt };
      if (known === null) {
        const { version: _version, community: _community, ...row } = said;
        await manager.insert(ConsentEntity, { ...row, ...factOf(changes), id: randomUUID(), itemId });
      } else {
        await manager.update(ConsentEntity, { id: known.id }, { ...factOf(changes), recordedBy, recordedAt });
      }
      await settleShownUntil(manager, itemType, itemId);
    }
    if (said.uses.length > 0) await narrowNaming(manager, { itemType, itemId }, said.details.naming);
  }
}

async function isThere(manager: EntityManager, attachmentId: string): Promise<boolean> {
  return manager.existsBy(AttachmentEntity, { id: attachmentId });
}

function factOf({
  state,
  uses,
  until,
  reviewBy,
}: Pick<ConsentEntity, 'state' | 'uses' | 'until' | 'reviewBy'>) {
  return { state, uses, until, reviewBy };
}

/** The same person's answer about the entry of another year; of those without a place in the village by their name. */
async function theirsAbout(
  manager: EntityManager,
  { itemType, giverId, details }: ConsentEntity,
  itemId: string,
): Promise<ConsentEntity | null> {
  if (giverId !== null) return manager.findOneBy(ConsentEntity, { itemType, itemId, giverId });
  const rows = await manager.findBy(ConsentEntity, { itemType, itemId, giverId: IsNull() });
  return rows.find((row) => row.details.giverName === details.giverName) ?? null;
}
