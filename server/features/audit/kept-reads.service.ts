import type { SharedItemType } from '#shared/contracts/sharing.js';
import type { EntityManager } from 'typeorm';
import { z } from 'zod';
import { isKept } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import type { Viewer } from '../../policy/viewer.js';
import { recordAudit } from './audit.service.js';

/** Writes down who read what its people keep; the giver reads their own without a record. */
export async function recordKeptReads(
  manager: EntityManager,
  viewer: Viewer,
  at: Date,
  itemType: Exclude<SharedItemType, 'story' | 'variant'>,
  itemIds: readonly string[],
): Promise<void> {
  for (const [itemId, shared] of await sharedById(manager, itemType, itemIds)) {
    if (!isKept(shared) || shared.giverId === viewer.personId) continue;
    const { affectedRows } = z
      .object({ affectedRows: z.number() })
      .parse(
        await manager.query('INSERT IGNORE INTO kept_read (person_id, item_id, day) VALUES (?, ?, ?)', [
          viewer.personId,
          itemId,
          viewer.today,
        ]),
      );
    if (affectedRows === 0) continue;
    await recordAudit(manager, {
      at,
      communityId: viewer.communityId,
      actorId: viewer.personId,
      action: 'kept-read',
      subjectType: itemType,
      subjectId: itemId,
    });
  }
}
