import type { SharedItemType } from '#shared/contracts/sharing.js';
import {
  WITHDRAWN_LISTED_DAYS,
  type SheetToReplace,
  type WithdrawalInput,
  type WithdrawnItem,
} from '#shared/contracts/withdrawals.js';
import { subDays } from 'date-fns';
import { randomUUID } from 'node:crypto';
import { In, IsNull, MoreThan, Not, type DataSource, type EntityManager } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { ItemSharingEntity } from '../../db/entities/item-sharing.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { WithdrawalEntity } from '../../db/entities/withdrawal.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, invalidField, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { isKept } from '../../policy/policy.js';
import { viewerOf } from '../../policy/viewer.js';
import type { WithdrawalList } from '../../storage/withdrawal-list.js';
import { recordAudit } from '../audit/audit.service.js';
import { hasSound, keepsWords } from '../attachments/attachment-eraser.service.js';
import { sameInOtherYears } from '../rollovers/same-things.service.js';
import type { Eraser } from './eraser.service.js';
import { takeNamesOff } from './name-removal.service.js';
import { couldSee, lockOwn, mayResume } from './taking-back.service.js';
import { vanish } from './vanishing.service.js';

type Action = 'item-withdrawn' | 'sound-removed' | 'item-paused' | 'item-resumed' | 'name-taken-off';

/** Taking back what was given: at once, everywhere, by whatever way and through whoever is asked. */
export class WithdrawalsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly erasers: readonly Eraser[],
    private readonly list: WithdrawalList,
  ) {}

  async withdraw(
    actor: Actor,
    itemType: SharedItemType,
    itemId: string,
    { leavesTrace, askedById }: WithdrawalInput,
  ): Promise<void> {
    const at = this.clock.now();
    const { communityId } = actor;
    const vanished = await inTransaction(this.dataSource, async (manager) => {
      const row = await lockOwn(manager, actor, this.clock.now(), { itemType, itemId });
      if (row.state === 'withdrawn') return null;
      await expectOfVillage(manager, actor, askedById);
      await this.record(manager, actor, row, 'item-withdrawn', askedById);
      const gone = await vanish(manager, this.erasers, {
        itemType,
        itemId,
        communityId,
        leavesTrace,
        part: 'all',
        at,
      });
      // What its people keep was on no sheet.
      const published = isKept(row) ? [] : gone.published;
      await manager.insert(WithdrawalEntity, {
        id: randomUUID(),
        ...{ communityId, itemType, itemId, at, published },
        askedBy: askedById ?? actor.person.id,
        doneBy: actor.person.id,
        sheetsReplacedAt: published.length === 0 ? at : null,
      });
      return gone;
    });
    if (vanished === null) return;
    await this.list.add({ itemType, itemId, communityId, leavesTrace, part: 'all', at: at.toISOString() });
    for (const finish of vanished.afterwards) await finish();
  }

  /**
   * The voice goes for good, every part of it and the spoken consent; what was written out from it stays, with its
   * authors, for whom it was.
   */
  async removeSound(actor: Actor, itemId: string, askedById: string | null): Promise<void> {
    const at = this.clock.now();
    const itemType = 'attachment';
    const { communityId } = actor;
    const vanishing = { itemType, itemId, communityId, leavesTrace: false, part: 'sound' } as const;
    const vanished = await inTransaction(this.dataSource, async (manager) => {
      const row = await lockOwn(manager, actor, at, { itemType, itemId });
      if (row.state === 'withdrawn') throw notFound();
      if (!(await hasSound(manager, itemId))) return null;
      if (!(await keepsWords(manager, itemId))) throw conflict('nothing-written-out');
      await expectOfVillage(manager, actor, askedById);
      await this.record(manager, actor, row, 'sound-removed', askedById);
      // Before anything is certain: a broken end then does what was asked at the next start.
      await this.list.add({ ...vanishing, at: at.toISOString() });
      return vanish(manager, this.erasers, { ...vanishing, at });
    });
    if (vanished === null) return;
    for (const finish of vanished.afterwards) await finish();
  }

  async pause(
    actor: Actor,
    itemType: SharedItemType,
    itemId: string,
    askedById: string | null,
  ): Promise<void> {
    await inTransaction(this.dataSource, async (manager) => {
      const row = await lockOwn(manager, actor, this.clock.now(), { itemType, itemId });
      if (row.state !== 'shared') return;
      await expectOfVillage(manager, actor, askedById);
      await this.setState(manager, row, 'paused');
      await this.record(manager, actor, row, 'item-paused', askedById);
    });
  }

  async resume(actor: Actor, itemType: SharedItemType, itemId: string): Promise<void> {
    await inTransaction(this.dataSource, async (manager) => {
      const row = await lockOwn(manager, actor, this.clock.now(), { itemType, itemId });
      if (row.state !== 'paused') throw conflict('not-paused');
      if (!mayResume(actor, row, this.clock.now())) throw conflict('pause-over');
      await this.setState(manager, row, 'shared');
      await this.record(manager, actor, row, 'item-resumed', null);
    });
  }

  /** In the draft, in every version and beside every telling; who may see the thing and to whom it belongs stays. */
  async takeNameOff(actor: Actor, itemType: SharedItemType, itemId: string): Promise<void> {
    await inTransaction(this.dataSource, async (manager) => {
      const row = await lockOwn(manager, actor, this.clock.now(), { itemType, itemId });
      if (row.state === 'withdrawn') throw notFound();
      await takeNamesOff(manager, { itemType, itemId }, row.giverId);
      await this.record(manager, actor, row, 'name-taken-off', null);
    });
  }

  /** What this person could see while it was shared, or what is theirs; newest first. */
  async listGone(actor: Actor): Promise<WithdrawnItem[]> {
    const { manager } = this.dataSource;
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const rows = await manager.find(ItemSharingEntity, {
      where: {
        communityId: actor.communityId,
        state: In(['withdrawn', 'paused']),
        stateAt: MoreThan(subDays(this.clock.now(), WITHDRAWN_LISTED_DAYS)),
      },
      order: { stateAt: 'DESC', itemId: 'ASC' },
    });
    return rows
      .filter((row) => couldSee(viewer, row))
      .map(({ itemType, itemId, stateAt }) => ({ itemType, itemId, at: stateAt?.toISOString() ?? '' }));
  }

  /** A sheet is named only by its version, so whoever prints learns that something changed and not what. */
  async listSheets(actor: Actor): Promise<SheetToReplace[]> {
    const { manager } = this.dataSource;
    const rows = await manager.find(WithdrawalEntity, {
      where: { communityId: actor.communityId, sheetsReplacedAt: IsNull() },
      order: { at: 'ASC', id: 'ASC' },
    });
    const calendars = await manager.find(CalendarEntity, {
      where: { id: In(rows.flatMap(({ published }) => published.map(({ calendarId }) => calendarId))) },
      relations: { place: true },
    });
    const byId = new Map(calendars.map((calendar) => [calendar.id, calendar]));
    return rows.flatMap(({ id, at, published }) =>
      published.flatMap(({ calendarId, number, label }) => {
        const calendar = byId.get(calendarId);
        if (calendar?.publishedNumber !== number) return [];
        const { year, place } = calendar;
        return [
          { withdrawalId: id, calendarId, placeName: place.name, year, number, label, at: at.toISOString() },
        ];
      }),
    );
  }

  async markReplaced(actor: Actor, id: string): Promise<void> {
    const { affected } = await this.dataSource.manager.update(
      WithdrawalEntity,
      { id, communityId: actor.communityId },
      { sheetsReplacedAt: this.clock.now() },
    );
    if (affected === 0) throw notFound();
  }

  /** In every year's draft in which the thing stands. */
  private async setState(
    manager: EntityManager,
    { itemType, itemId }: ItemSharingEntity,
    state: 'shared' | 'paused',
  ): Promise<void> {
    const ids = [itemId, ...(await sameInOtherYears(manager, itemType, itemId))];
    await manager.update(
      ItemSharingEntity,
      { itemType, itemId: In(ids), state: Not('withdrawn') },
      { state, stateAt: this.clock.now() },
    );
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    { itemType, itemId }: ItemSharingEntity,
    action: Action,
    askedBy: string | null,
  ): Promise<void> {
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType: itemType === 'story' ? 'figure' : itemType === 'variant' ? 'entry' : itemType,
      subjectId: itemId,
      details: askedBy === null ? {} : { askedBy },
    });
  }
}

async function expectOfVillage(
  manager: EntityManager,
  { communityId }: Actor,
  personId: string | null,
): Promise<void> {
  if (personId !== null && !(await manager.existsBy(MembershipEntity, { communityId, personId }))) {
    throw invalidField('askedById', 'not-of-this-village');
  }
}
