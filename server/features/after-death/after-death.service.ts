import type { AfterDeath, DeathInput, HeirInput } from '#shared/contracts/after-death.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { In, type DataSource, type EntityManager } from 'typeorm';
import { ConsentEntity } from '../../db/entities/consent.entity.js';
import { DeathEntity, type DoneAfterDeath, type SharedAs } from '../../db/entities/death.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { ItemSharingEntity } from '../../db/entities/item-sharing.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { hasRole, type Actor } from '../../http/actor.js';
import { conflict, invalidField, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { lockSharing } from '../../policy/sharing.repository.js';
import { villageDay } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import type { WithdrawalsService } from '../withdrawals/withdrawals.service.js';
import { heirOf, passedTo, tightened } from './after-death-rules.js';

/**
 * What somebody chose for after their death, in each consent that they gave by themselves: keep, tell to fewer, pass on,
 * remove. The steward notes the day, quietly; what is removed goes the way of everything that is taken back.
 */
export class AfterDeathService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly withdrawals: Pick<WithdrawalsService, 'withdraw'>,
  ) {}

  async read(actor: Actor, personId: string): Promise<AfterDeath> {
    const { manager } = this.dataSource;
    await expectOfVillage(manager, actor, personId);
    return this.describe(manager, actor, personId);
  }

  async note(actor: Actor, personId: string, { diedOn, removesForGood }: DeathInput): Promise<AfterDeath> {
    const { communityId } = actor;
    const removed = await inTransaction(this.dataSource, async (manager) => {
      await expectOfVillage(manager, actor, personId, { mode: 'pessimistic_write' });
      if (await manager.existsBy(DeathEntity, { personId, communityId })) throw conflict('death-noted');
      if (diedOn > (await villageDay(manager, communityId, this.clock.now()))) {
        throw invalidField('diedOn', 'in-the-future');
      }
      const consents = await consentsOf(manager, actor, personId);
      const toRemove = consents.filter(({ details }) => details.afterDeath === 'remove');
      if (toRemove.length > 0 && !removesForGood) throw conflict('removes-for-good');
      const done: DoneAfterDeath[] = [];
      for (const consent of consents) {
        const change = await this.apply(manager, actor, consent);
        if (change !== null) done.push(change);
      }
      await manager.insert(DeathEntity, {
        ...{ personId, communityId, diedOn, done },
        removed: toRemove.length,
        notedBy: actor.person.id,
        notedAt: this.clock.now(),
      });
      await this.record(manager, actor, personId, 'death-noted');
      return toRemove.map(({ itemType, itemId }) => ({ itemType, itemId }));
    });
    for (const { itemType, itemId } of removed) {
      await this.withdrawals.withdraw(actor, itemType, itemId, { leavesTrace: false, askedById: null });
    }
    return this.describe(this.dataSource.manager, actor, personId);
  }

  /** What waits for this name passes to whom the steward says; its giver is no more there to be asked. */
  async nameHeir(actor: Actor, personId: string, { name, personId: heirId }: HeirInput): Promise<AfterDeath> {
    const { communityId } = actor;
    return inTransaction(this.dataSource, async (manager) => {
      await expectOfVillage(manager, actor, personId, { mode: 'pessimistic_write' });
      const death = await manager.findOneBy(DeathEntity, { personId, communityId });
      const waiting = (await waitingHeirs(manager, actor, personId)).filter(({ passTo }) => passTo === name);
      if (death === null || waiting.length === 0) throw conflict('nothing-to-pass');
      const isMember = await manager.existsBy(MembershipEntity, { communityId, personId: heirId });
      if (!isMember || heirId === personId) throw invalidField('personId', 'not-of-this-village');
      for (const { row } of waiting) {
        const before = sharedAs(row);
        const after = passedTo(before, heirId);
        await share(manager, row, after);
        death.done = [...death.done, { itemType: row.itemType, itemId: row.itemId, before, after }];
      }
      await manager.update(DeathEntity, { personId, communityId }, { done: death.done });
      await this.record(manager, actor, personId, 'heir-named');
      return this.describe(manager, actor, personId);
    });
  }

  /** Of how many people something waits to be passed on. */
  async countOpen(actor: Actor): Promise<number> {
    if (!hasRole(actor, 'steward')) return 0;
    const { manager } = this.dataSource;
    const deaths = await manager.findBy(DeathEntity, { communityId: actor.communityId });
    let open = 0;
    for (const { personId } of deaths) {
      if ((await waitingHeirs(manager, actor, personId)).length > 0) open += 1;
    }
    return open;
  }

  /** A note made by mistake. What somebody changed since stays as they changed it. */
  async undo(actor: Actor, personId: string): Promise<AfterDeath> {
    const { communityId } = actor;
    return inTransaction(this.dataSource, async (manager) => {
      await expectOfVillage(manager, actor, personId, { mode: 'pessimistic_write' });
      const death = await manager.findOneBy(DeathEntity, { personId, communityId });
      if (death === null) throw notFound();
      if (death.removed > 0) throw conflict('removed-for-good');
      for (const { itemType, itemId, before, after } of death.done) {
        const row = await lockSharing(manager, itemType, itemId);
        if (row === null || !sameJson(sharedAs(row), after)) continue;
        await share(manager, row, before);
      }
      await manager.delete(DeathEntity, { personId, communityId });
      await this.record(manager, actor, personId, 'death-undone');
      return this.describe(manager, actor, personId);
    });
  }

  /** Null where the thing stays as it is. */
  private async apply(
    manager: EntityManager,
    { communityId }: Actor,
    { itemType, itemId, details: { afterDeath: chosen, passTo } }: ConsentEntity,
  ): Promise<DoneAfterDeath | null> {
    if (chosen !== 'tighten' && chosen !== 'pass-to') return null;
    const row = await lockSharing(manager, itemType, itemId);
    if (row === null || row.state === 'withdrawn') return null;
    const before = sharedAs(row);
    const members =
      chosen === 'pass-to'
        ? await manager.find(MembershipEntity, { where: { communityId }, relations: { person: true } })
        : [];
    const heirId = heirOf(passTo, members);
    if (chosen === 'pass-to' && heirId === null) return null;
    const after = heirId === null ? tightened(before) : passedTo(before, heirId);
    if (sameJson(before, after)) return null;
    await share(manager, row, after);
    return { itemType, itemId, before, after };
  }

  private async describe(manager: EntityManager, actor: Actor, personId: string): Promise<AfterDeath> {
    const { communityId } = actor;
    const death = await manager.findOneBy(DeathEntity, { personId, communityId });
    const consents = await consentsOf(manager, actor, personId);
    const many = (...chosen: (string | null)[]) =>
      consents.filter(({ details }) => chosen.includes(details.afterDeath)).length;
    return {
      diedOn: death?.diedOn ?? null,
      chosen: {
        keep: many('keep', null),
        tighten: many('tighten'),
        passTo: many('pass-to'),
        remove: death?.removed ?? many('remove'),
      },
      openHeirs: [
        ...new Set((await waitingHeirs(manager, actor, personId)).map(({ passTo }) => passTo)),
      ].toSorted(),
      mayUndo: death !== null && death.removed === 0,
    };
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    personId: string,
    action: 'death-noted' | 'death-undone' | 'heir-named',
  ): Promise<void> {
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType: 'person',
      subjectId: personId,
      details: {},
    });
  }
}

function sharedAs({ level, details, giverId }: ItemSharingEntity): SharedAs {
  return { level, details, giverId };
}

/** An entry's own words about how it is shared follow, so that editor and policy say the same. */
async function share(
  manager: EntityManager,
  { itemType, itemId }: ItemSharingEntity,
  after: SharedAs,
): Promise<void> {
  await manager.update(ItemSharingEntity, { itemType, itemId }, after);
  if (itemType !== 'entry') return;
  const entry = await manager.findOneBy(EntryEntity, { id: itemId });
  if (entry === null) return;
  const content = { ...entry.content, sharingLevel: after.level, sharing: after.details };
  await manager.update(EntryEntity, { id: itemId }, { content });
}

/** Their yes to what they gave; what was taken back has been decided. */
async function consentsOf(
  manager: EntityManager,
  { communityId }: Actor,
  giverId: string,
): Promise<ConsentEntity[]> {
  return manager.find(ConsentEntity, {
    where: { communityId, giverId, state: In(['given', 'given-with-conditions']) },
    order: { id: 'ASC' },
  });
}

/** Things still given by the person, to be passed to a name that fits nobody, or several. */
async function waitingHeirs(
  manager: EntityManager,
  actor: Actor,
  personId: string,
): Promise<{ passTo: string; row: ItemSharingEntity }[]> {
  const { communityId } = actor;
  const consents = (await consentsOf(manager, actor, personId)).filter(
    ({ details }) => details.afterDeath === 'pass-to',
  );
  if (consents.length === 0) return [];
  const members = await manager.find(MembershipEntity, {
    where: { communityId },
    relations: { person: true },
  });
  const waiting: { passTo: string; row: ItemSharingEntity }[] = [];
  for (const { itemType, itemId, details } of consents) {
    if (heirOf(details.passTo, members) !== null) continue;
    const row = await manager.findOneBy(ItemSharingEntity, { itemType, itemId });
    if (row?.giverId !== personId || row.state === 'withdrawn') continue;
    waiting.push({ passTo: details.passTo.trim(), row });
  }
  return waiting;
}

async function expectOfVillage(
  manager: EntityManager,
  { communityId }: Actor,
  personId: string,
  lock?: { mode: 'pessimistic_write' },
): Promise<void> {
  const row = await manager.findOne(MembershipEntity, {
    where: { communityId, personId },
    ...(lock ? { lock } : {}),
  });
  if (row === null) throw notFound();
}
