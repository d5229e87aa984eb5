import { GROUPS_MAX, type Group, type GroupInput, type GroupUpdate } from '#shared/contracts/sharing.js';
import { randomUUID } from 'node:crypto';
import { In, type DataSource, type EntityManager } from 'typeorm';
import { GroupMemberEntity } from '../../db/entities/group-member.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { VillageGroupEntity } from '../../db/entities/village-group.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, invalidField, notFound, stale } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import { toGroup } from './sharing.mapper.js';

/** Groups that keep things to themselves. Once founded, only a group's own people say who belongs to it. */
export class GroupsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async list(actor: Actor): Promise<Group[]> {
    const { manager } = this.dataSource;
    const groups = await manager.find(VillageGroupEntity, {
      where: { communityId: actor.communityId },
      order: { name: 'ASC', id: 'ASC' },
    });
    return this.describe(manager, actor, groups);
  }

  async add(actor: Actor, { name, memberIds }: GroupInput): Promise<Group> {
    const { communityId } = actor;
    const id = randomUUID();
    return inTransaction(this.dataSource, async (manager) => {
      await expectOfVillage(manager, communityId, memberIds);
      if ((await manager.countBy(VillageGroupEntity, { communityId })) >= GROUPS_MAX) {
        throw conflict('too-many-groups');
      }
      if (await manager.existsBy(VillageGroupEntity, { communityId, name }))
        throw invalidField('name', 'name-taken');
      await manager.insert(VillageGroupEntity, { id, communityId, name });
      await insertMembers(manager, id, memberIds);
      await this.record(manager, actor, 'group-founded', id, { count: memberIds.length });
      return this.one(manager, actor, id);
    });
  }

  async update(actor: Actor, groupId: string, input: GroupUpdate): Promise<Group> {
    const { communityId, person } = actor;
    return inTransaction(this.dataSource, async (manager) => {
      const row = await manager.findOne(VillageGroupEntity, {
        where: { id: groupId, communityId },
        lock: { mode: 'pessimistic_write' },
      });
      if (row === null) throw notFound();
      if (!(await manager.existsBy(GroupMemberEntity, { groupId, personId: person.id }))) {
        throw conflict('not-of-the-group');
      }
      if (row.version !== input.version) throw stale(await this.one(manager, actor, groupId), input);
      await expectOfVillage(manager, communityId, input.memberIds);
      await manager.update(VillageGroupEntity, { id: groupId, version: input.version }, { name: input.name });
      await manager.delete(GroupMemberEntity, { groupId });
      await insertMembers(manager, groupId, input.memberIds);
      await this.record(manager, actor, 'group-changed', groupId, { count: input.memberIds.length });
      return this.one(manager, actor, groupId);
    });
  }

  private async one(manager: EntityManager, actor: Actor, id: string): Promise<Group> {
    const [group] = await this.describe(manager, actor, [
      await manager.findOneByOrFail(VillageGroupEntity, { id }),
    ]);
    if (!group) throw notFound();
    return group;
  }

  private async describe(
    manager: EntityManager,
    actor: Actor,
    groups: readonly VillageGroupEntity[],
  ): Promise<Group[]> {
    const members = await manager.find(GroupMemberEntity, {
      where: { groupId: In(groups.map(({ id }) => id)) },
      relations: { person: true },
      order: { person: { displayName: 'ASC' } },
    });
    return groups.map((group) =>
      toGroup(
        group,
        members.filter(({ groupId }) => groupId === group.id),
        actor.person.id,
      ),
    );
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    action: 'group-founded' | 'group-changed',
    subjectId: string,
    details: { count: number },
  ): Promise<void> {
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType: 'group',
      subjectId,
      details,
    });
  }
}

async function expectOfVillage(
  manager: EntityManager,
  communityId: string,
  personIds: readonly string[],
): Promise<void> {
  const known = await manager.countBy(MembershipEntity, { communityId, personId: In([...personIds]) });
  if (known !== personIds.length) throw invalidField('memberIds', 'not-of-this-village');
}

async function insertMembers(
  manager: EntityManager,
  groupId: string,
  personIds: readonly string[],
): Promise<void> {
  await manager.insert(
    GroupMemberEntity,
    personIds.map((personId) => ({ groupId, personId })),
  );
}
