import type { Community, CommunityUpdate } from '#shared/contracts/people.js';
import type { DataSource } from 'typeorm';
import { CommunityEntity } from '../../db/entities/community.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { membershipsHere, type Actor, type Person } from '../../http/actor.js';
import { conflict, stale } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import { fromCommunityInput, toCommunity } from './people.mapper.js';

export class CommunitiesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async listOf(person: Person): Promise<Community[]> {
    const memberships = await this.dataSource.getRepository(MembershipEntity).find({
      where: membershipsHere(person),
      relations: { community: true },
      order: { community: { name: 'ASC' } },
    });
    return memberships.map((membership) => toCommunity(membership.community));
  }

  async read(actor: Actor): Promise<Community> {
    return toCommunity(
      await this.dataSource.getRepository(CommunityEntity).findOneByOrFail({ id: actor.communityId }),
    );
  }

  async update(actor: Actor, input: CommunityUpdate): Promise<Community> {
    const { version, ...settings } = input;
    return inTransaction(this.dataSource, async (manager) => {
      const before = await manager.findOneOrFail(CommunityEntity, {
        where: { id: actor.communityId },
        lock: { mode: 'pessimistic_write' },
      });
      if (before.version !== version) throw stale(toCommunity(before), input);
      const members = await manager.find(MembershipEntity, { where: { communityId: actor.communityId } });
      const elders = new Set(members.filter((row) => row.roles.includes('elder')).map((row) => row.personId));
      const { mustSign, oneOf, minElders } = settings.signOffRule;
      if ([...mustSign, ...oneOf].some((id) => !elders.has(id))) throw conflict('members-missing');
      // A new village writes its rule before its elders have joined; later the rule must be possible.
      if (elders.size > 0 && minElders > elders.size) throw conflict('rule-impossible');
      await manager.update(CommunityEntity, { id: before.id, version }, fromCommunityInput(settings));
      await recordAudit(manager, {
        at: this.clock.now(),
        communityId: actor.communityId,
        actorId: actor.person.id,
        action: 'settings-changed',
        subjectType: 'community',
        subjectId: actor.communityId,
        details: { fields: changedFields(toCommunity(before), settings) },
      });
      return toCommunity(await manager.findOneByOrFail(CommunityEntity, { id: before.id }));
    });
  }
}

/** Names of the settings that differ; their contents stay out of the record. */
function changedFields(before: Community, after: Record<string, unknown>): string[] {
  return Object.keys(after).filter(
    (field) => JSON.stringify(before[field as keyof Community]) !== JSON.stringify(after[field]),
  );
}
