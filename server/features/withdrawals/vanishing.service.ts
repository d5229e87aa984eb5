import type { SharedItemType } from '#shared/contracts/sharing.js';
import type { EntityManager } from 'typeorm';
import { ItemSharingEntity } from '../../db/entities/item-sharing.entity.js';
import type { PublishedTrace } from '../../db/entities/withdrawal.entity.js';
import type { WithdrawnPart } from '../../storage/withdrawal-list.js';
import type { Eraser } from './eraser.service.js';

export interface Vanished {
  published: PublishedTrace[];
  afterwards: (() => Promise<void>)[];
}

export interface Vanishing {
  itemType: SharedItemType;
  itemId: string;
  communityId: string;
  leavesTrace: boolean;
  part: WithdrawnPart;
  at: Date;
}

/**
 * Takes a thing, and whatever hangs on it, out of everything there is, within one transaction. What stays is a row that
 * says it was withdrawn; where only its sound goes, the thing itself stays as it is. Can be run again on a thing that is half gone or came back with an older copy of the tables.
 */
export async function vanish(
  manager: EntityManager,
  erasers: readonly Eraser[],
  { itemType, itemId, communityId, leavesTrace, part, at }: Vanishing,
): Promise<Vanished> {
  const vanished: Vanished = { published: [], afterwards: [] };
  const waiting: { itemType: SharedItemType; itemId: string }[] = [{ itemType, itemId }];
  const done = new Set<string>();
  for (let next = waiting.shift(); next !== undefined; next = waiting.shift()) {
    const key = `${next.itemType} ${next.itemId}`;
    if (done.has(key)) continue;
    done.add(key);
    for (const erase of erasers) {
      const erased = await erase(manager, { ...next, communityId, leavesTrace, part });
      vanished.published.push(...(erased.published ?? []));
      if (erased.afterwards) vanished.afterwards.push(erased.afterwards);
      waiting.push(...(erased.withIt ?? []));
    }
    if (part !== 'all') continue;
    await manager.update(
      ItemSharingEntity,
      { itemType: next.itemType, itemId: next.itemId },
      { state: 'withdrawn', stateAt: at, leavesTrace, asked: null },
    );
  }
  return vanished;
}
