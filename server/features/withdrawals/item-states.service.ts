import type { SharedItemType } from '#shared/contracts/sharing.js';
import type { ItemState, PausedItem } from '#shared/contracts/withdrawals.js';
import type { DataSource } from 'typeorm';
import { ItemSharingEntity } from '../../db/entities/item-sharing.entity.js';
import type { Actor } from '../../http/actor.js';
import { notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { maySee } from '../../policy/policy.js';
import { viewerOf, type Viewer } from '../../policy/viewer.js';
import { isWithinSight } from '../sharing/within-sight.service.js';
import { hasSound, keepsWords } from '../attachments/attachment-eraser.service.js';
import { titlesOf } from './item-titles.service.js';
import { appearanceUnhidden, couldSee, mayResume, mayTakeBack, othersUntil } from './taking-back.service.js';

/** What a person may do about a thing, and what is hidden for now. */
export class ItemStatesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async read(actor: Actor, itemType: SharedItemType, itemId: string): Promise<ItemState> {
    const { manager } = this.dataSource;
    const row = await manager.findOneBy(ItemSharingEntity, { itemType, itemId });
    if (row?.communityId !== actor.communityId || row.state === 'withdrawn') throw notFound();
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const mine = mayTakeBack(actor, viewer, row);
    const sees = maySee(viewer, row) && (await isWithinSight(manager, viewer, row));
    if (!mine && !sees) throw notFound();
    const shared = row.state === 'shared';
    return {
      state: shared ? 'shared' : 'paused',
      pausedAt: shared ? null : (row.stateAt?.toISOString() ?? null),
      title: (await this.seenTitles(viewer, [row])).get(row.itemId) ?? null,
      isMine: row.giverId === actor.person.id,
      may: {
        withdraw: mine,
        pause: mine && shared,
        resume: mine && !shared && mayResume(actor, row, this.clock.now()),
        takeNameOff: mine && row.details.naming !== 'not-named',
        removeSound:
          mine &&
          itemType === 'attachment' &&
          (await hasSound(manager, itemId)) &&
          (await keepsWords(manager, itemId)),
      },
    };
  }

  /** Newest first. */
  async listPaused(actor: Actor): Promise<PausedItem[]> {
    const { manager } = this.dataSource;
    const now = this.clock.now();
    const viewer = await viewerOf(manager, actor, now);
    const rows = await manager.find(ItemSharingEntity, {
      where: { communityId: actor.communityId, state: 'paused' },
      order: { stateAt: 'DESC', itemId: 'ASC' },
    });
    // What leaves no trace for a person leaves none here either.
    const own = rows.filter(
      (row) =>
        appearanceUnhidden(viewer, row) !== 'none' &&
        mayTakeBack(actor, viewer, row) &&
        mayResume(actor, row, now),
    );
    const titles = await this.seenTitles(viewer, own);
    return own.flatMap(({ itemType, itemId, stateAt }) =>
      stateAt === null
        ? []
        : [
            {
              ...{ itemType, itemId, title: titles.get(itemId) ?? null },
              pausedAt: stateAt.toISOString(),
              othersUntil: othersUntil(stateAt).toISOString(),
            },
          ],
    );
  }

  /** Of what the person sees whenever it is not hidden. */
  private async seenTitles(viewer: Viewer, rows: readonly ItemSharingEntity[]): Promise<Map<string, string>> {
    const { manager } = this.dataSource;
    const seen: ItemSharingEntity[] = [];
    for (const row of rows) {
      if (couldSee(viewer, row) && (await isWithinSight(manager, viewer, row))) seen.push(row);
    }
    return titlesOf(manager, seen);
  }
}
