import type { ItemSharing, SharedItemType, SharingChange, SharingInput } from '#shared/contracts/sharing.js';
import type { DataSource, EntityManager } from 'typeorm';
import { GroupMemberEntity } from '../../db/entities/group-member.entity.js';
import { ItemSharingEntity, type AskedSharing } from '../../db/entities/item-sharing.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { VillageGroupEntity } from '../../db/entities/village-group.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { hasRole, type Actor } from '../../http/actor.js';
import { conflict, invalidField, notFound, stale } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { hidesGiver } from '../../policy/giver-naming.js';
import { maySee } from '../../policy/policy.js';
import { lockSharing } from '../../policy/sharing.repository.js';
import { isTighterOrSame, type Sharing } from '#shared/contracts/sharing-tightness.js';
import { viewerOf } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import { personNames } from '../people/person-names.service.js';
import { sayItInTheEntry, tightenOtherYears } from '../rollovers/tighter-years.service.js';
import { isWithinSight } from './within-sight.service.js';
import { toItemSharing } from './sharing.mapper.js';

type Action = 'sharing-tightened' | 'wider-asked' | 'wider-agreed' | 'wider-dropped' | 'sharing-widened';

/**
 * How one thing is shared. Tighter holds at once and for every version of old; wider comes only once giver and
 * steward have both agreed. The steward agrees to what they are told of it, without seeing the thing itself.
 */
export class ItemSharingService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async read(actor: Actor, itemType: SharedItemType, itemId: string): Promise<ItemSharing> {
    const { manager } = this.dataSource;
    const row = await manager.findOneBy(ItemSharingEntity, { itemType, itemId });
    return this.describe(manager, actor, await this.expectKnown(manager, actor, row));
  }

  /** Things of the village for which a wider level was asked, for its giver and the steward. */
  async listAsked(actor: Actor): Promise<ItemSharing[]> {
    const { manager } = this.dataSource;
    const rows = await manager.find(ItemSharingEntity, {
      where: { communityId: actor.communityId, state: 'shared' },
      order: { itemType: 'ASC', itemId: 'ASC' },
    });
    const asked = rows.filter((row) => row.asked !== null);
    const described = await Promise.all(asked.map((row) => this.describe(manager, actor, row)));
    return described.filter(({ may, asked: wider }) => may.agreeWider && wider !== null);
  }

  async change(
    actor: Actor,
    itemType: SharedItemType,
    itemId: string,
    { sharing, version }: SharingChange,
  ): Promise<ItemSharing> {
    return this.write(actor, itemType, itemId, async (manager, row) => {
      const viewer = await viewerOf(manager, actor, this.clock.now());
      if (!maySee(viewer, row)) throw notFound();
      if (row.version !== version) throw stale(await this.describe(manager, actor, row), sharing);
      if (!mayTighten(actor, row)) throw conflict('not-the-giver');
      await expectKnownPeople(manager, actor, row, sharing);
      const after = asSharing(sharing);
      if (isTighterOrSame(row, after)) {
        const before = { level: row.level, details: row.details };
        await this.apply(manager, row, after);
        await tightenOtherYears(manager, row, before, after);
        await this.record(manager, actor, row, 'sharing-tightened', { to: after.level });
        return;
      }
      const asked: AskedSharing = {
        ...after,
        askedBy: actor.person.id,
        giverAgreed: await this.standsForGiver(manager, actor, row),
        stewardAgreed: false,
      };
      await this.settle(manager, actor, row, asked, 'wider-asked');
    });
  }

  async agree(actor: Actor, itemType: SharedItemType, itemId: string): Promise<ItemSharing> {
    return this.write(actor, itemType, itemId, async (manager, row) => {
      const { asked } = row;
      if (asked === null) throw conflict('nothing-asked');
      const asGiver = !asked.giverAgreed && (await this.standsForGiver(manager, actor, row));
      const asSteward = !asked.stewardAgreed && hasRole(actor, 'steward');
      if (!asGiver && !asSteward) throw conflict('giver-and-steward');
      await this.settle(
        manager,
        actor,
        row,
        // One act is one voice, also where the giver is the steward.
        asGiver ? { ...asked, giverAgreed: true } : { ...asked, stewardAgreed: true },
        'wider-agreed',
      );
    });
  }

  async drop(actor: Actor, itemType: SharedItemType, itemId: string): Promise<ItemSharing> {
    return this.write(actor, itemType, itemId, async (manager, row) => {
      if (row.asked === null) throw conflict('nothing-asked');
      const mine = row.asked.askedBy === actor.person.id || hasRole(actor, 'steward');
      if (!mine && !(await this.standsForGiver(manager, actor, row))) throw conflict('giver-and-steward');
      await this.update(manager, row, { asked: null });
      await this.record(manager, actor, row, 'wider-dropped', {});
    });
  }

  private async settle(
    manager: EntityManager,
    actor: Actor,
    row: ItemSharingEntity,
    asked: AskedSharing,
    action: Action,
  ): Promise<void> {
    await this.record(manager, actor, row, action, { to: asked.level });
    if (!asked.giverAgreed || !asked.stewardAgreed) {
      await this.update(manager, row, { asked });
      return;
    }
    await this.apply(manager, row, { level: asked.level, details: asked.details });
    await this.record(manager, actor, row, 'sharing-widened', { to: asked.level });
  }

  /** An entry's own words about its level follow, so that editor and policy say the same. */
  private async apply(manager: EntityManager, row: ItemSharingEntity, after: Sharing): Promise<void> {
    await this.update(manager, row, { ...after, asked: null });
    if (row.itemType === 'entry') await sayItInTheEntry(manager, row.itemId, after);
  }

  private async update(
    manager: EntityManager,
    row: ItemSharingEntity,
    changes: Partial<Pick<ItemSharingEntity, 'level' | 'details' | 'asked'>>,
  ): Promise<void> {
    await manager.update(ItemSharingEntity, { itemType: row.itemType, itemId: row.itemId }, changes);
    Object.assign(row, changes, { version: row.version + 1 });
  }

  private write(
    actor: Actor,
    itemType: SharedItemType,
    itemId: string,
    work: (manager: EntityManager, row: ItemSharingEntity) => Promise<void>,
  ): Promise<ItemSharing> {
    return inTransaction(this.dataSource, async (manager) => {
      const row = await this.expectKnown(manager, actor, await lockSharing(manager, itemType, itemId));
      await work(manager, row);
      return this.describe(manager, actor, row);
    });
  }

  /** There for whoever sees the thing; a wider level that is asked for is there for the steward, too. */
  private async expectKnown(
    manager: EntityManager,
    actor: Actor,
    row: ItemSharingEntity | null,
  ): Promise<ItemSharingEntity> {
    const viewer = await viewerOf(manager, actor, this.clock.now());
    if (row === null) throw notFound();
    const asked = row.asked !== null && row.communityId === actor.communityId && hasRole(actor, 'steward');
    const sees = maySee(viewer, row) && (await isWithinSight(manager, viewer, row));
    if (!sees && !asked) throw notFound();
    return row;
  }

  /** The giver; where nobody of the village is one any more, any elder speaks for them. */
  private async standsForGiver(
    manager: EntityManager,
    actor: Actor,
    { giverId, communityId }: ItemSharingEntity,
  ): Promise<boolean> {
    if (giverId === actor.person.id) return true;
    const isHere =
      giverId !== null && (await manager.existsBy(MembershipEntity, { communityId, personId: giverId }));
    return !isHere && hasRole(actor, 'elder');
  }

  private async describe(manager: EntityManager, actor: Actor, row: ItemSharingEntity): Promise<ItemSharing> {
    const { asked, details, giverId } = row;
    const names = await personNames(manager, [giverId, details.successorId, asked?.askedBy ?? null]);
    const groupId = details.groupId ?? asked?.details.groupId ?? null;
    const group = groupId === null ? null : await manager.findOneBy(VillageGroupEntity, { id: groupId });
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const sees = maySee(viewer, row);
    const agreeWider =
      asked !== null &&
      ((!asked.giverAgreed && (await this.standsForGiver(manager, actor, row))) ||
        (!asked.stewardAgreed && hasRole(actor, 'steward')));
    const tighten = sees && mayTighten(actor, row);
    return toItemSharing({
      row,
      names,
      groupName: group?.name ?? null,
      may: { tighten, askWider: tighten, agreeWider },
      namesGiver: !hidesGiver(viewer, row),
    });
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    { itemType, itemId }: ItemSharingEntity,
    action: Action,
    details: { to?: string },
  ): Promise<void> {
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType: itemType === 'story' ? 'figure' : itemType === 'variant' ? 'entry' : itemType,
      subjectId: itemId,
      details,
    });
  }
}

/** Any keeper, the giver, the steward and the officers, of what they see. */
function mayTighten(actor: Actor, { giverId }: ItemSharingEntity): boolean {
  return giverId === actor.person.id || hasRole(actor, 'elder', 'steward', 'officer');
}

function asSharing({ level, ...details }: SharingInput): Sharing {
  return { level, details };
}

async function expectKnownPeople(
  manager: EntityManager,
  { communityId, person }: Actor,
  { giverId, details }: ItemSharingEntity,
  { groupId, successorId }: SharingInput,
): Promise<void> {
  if (groupId !== null && groupId !== details.groupId) {
    const people = (await manager.findBy(GroupMemberEntity, { groupId, group: { communityId } })).map(
      ({ personId }) => personId,
    );
    if (!people.includes(person.id) && !people.includes(giverId ?? '')) {
      throw invalidField('sharing.groupId', 'group-of-giver');
    }
  }
  if (successorId !== null && successorId !== details.successorId) {
    // Who comes after the giver is for the giver alone to say.
    if (giverId !== person.id) throw invalidField('sharing.successorId', 'only-the-giver');
    if (!(await manager.existsBy(MembershipEntity, { communityId, personId: successorId }))) {
      throw invalidField('sharing.successorId', 'not-of-this-village');
    }
  }
}
