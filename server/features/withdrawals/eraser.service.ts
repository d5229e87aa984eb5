import type { SharedItemType } from '#shared/contracts/sharing.js';
import type { WithdrawnPart } from '../../storage/withdrawal-list.js';
import type { EntityManager } from 'typeorm';
import type { PublishedTrace } from '../../db/entities/withdrawal.entity.js';

/** What a part of the product still has to do, and to tell, once its rows are gone. */
export interface Erased {
  /** Published versions that held it. */
  published?: PublishedTrace[];
  /** After the transaction is certain: files, for instance. */
  afterwards?: () => Promise<void>;
  /** Things that hung on it and go with it, each with a level of its own. */
  withIt?: { itemType: SharedItemType; itemId: string }[];
}

export interface Erasing {
  itemType: SharedItemType;
  itemId: string;
  communityId: string;
  leavesTrace: boolean;
  /** All of it, or the sound of a recording alone: its words stay. */
  part: WithdrawnPart;
}

/**
 * Takes everything that one part of the product holds of a thing out of its tables. Every part that keeps words,
 * sounds or pictures of people has one; createApp hands all of them to the withdrawals.
 */
export type Eraser = (manager: EntityManager, erasing: Erasing) => Promise<Erased>;
