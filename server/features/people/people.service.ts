import {
  isCardRole,
  type AddedPerson,
  type CommunityPerson,
  type PersonInput,
  type PersonUpdate,
  type Role,
} from '#shared/contracts/people.js';
import { addDays } from 'date-fns';
import { randomUUID } from 'node:crypto';
import { In, IsNull, MoreThan, type DataSource, type EntityManager } from 'typeorm';
import { AuditEventEntity } from '../../db/entities/audit-event.entity.js';
import { CalendarFeedEntity } from '../../db/entities/calendar-feed.entity.js';
import { CommunityEntity } from '../../db/entities/community.entity.js';
import { GroupMemberEntity } from '../../db/entities/group-member.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { OneTimeCodeEntity } from '../../db/entities/one-time-code.entity.js';
import { PersonEntity } from '../../db/entities/person.entity.js';
import { VillageGroupEntity } from '../../db/entities/village-group.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { hasRole, type Actor } from '../../http/actor.js';
import { conflict, invalidField, notFound, stale } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import { endCardOf, mayHaveCard } from '../cards/card-ends.service.js';
import { CODE_LIFETIME_DAYS, codeHash, newCode } from '../session/one-time-codes.service.js';
import { toCommunityPerson } from './people.mapper.js';

export class PeopleService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  /** By name. Only a steward sees addresses and codes. */
  async list(actor: Actor): Promise<CommunityPerson[]> {
    const { manager } = this.dataSource;
    const memberships = await manager.find(MembershipEntity, {
      where: { communityId: actor.communityId },
      relations: { person: true },
      order: { person: { displayName: 'ASC' } },
    });
    const codes = await this.openCodes(
      manager,
      memberships.map((membership) => membership.personId),
    );
    const showsEmail = hasRole(actor, 'steward');
    return memberships.map((membership) =>
      toCommunityPerson(membership, codes.get(membership.personId) ?? null, showsEmail),
    );
  }

  /**
   * A known address joins with the account it has; a new one gets a one-time code, shown only now. Without an address
   * somebody is new, unless they are said to be who left this very village.
   */
  async add(actor: Actor, input: PersonInput): Promise<AddedPerson> {
    return inTransaction(this.dataSource, async (manager) => {
      await lockCommunity(manager, actor.communityId);
      const person = await this.known(manager, actor, input);
      const personId = person?.id ?? randomUUID();
      if (person === null) {
        await manager.insert(PersonEntity, {
          id: personId,
          email: input.email === '' ? null : input.email,
          displayName: input.displayName,
          passwordHash: null,
          isDemo: false,
          createdAt: this.clock.now(),
        });
      } else if (await manager.existsBy(MembershipEntity, { personId, communityId: actor.communityId })) {
        throw conflict('email-known');
      }
      await manager.insert(MembershipEntity, {
        id: randomUUID(),
        personId,
        communityId: actor.communityId,
        roles: input.roles,
      });
      await this.record(manager, actor, 'person-added', personId, { roles: input.roles });
      const needsCode = input.email !== '' && !person?.passwordHash;
      const oneTimeCode = needsCode ? await this.issueCode(manager, personId) : null;
      return { person: await this.read(manager, actor, personId), oneTimeCode };
    });
  }

  async setRoles(actor: Actor, personId: string, input: PersonUpdate): Promise<CommunityPerson> {
    return inTransaction(this.dataSource, async (manager) => {
      const { signOffRule } = await lockCommunity(manager, actor.communityId);
      const membership = await this.membership(manager, actor, personId);
      const becomesElder = input.roles.includes('elder') && !membership.roles.includes('elder');
      if (becomesElder && personId === actor.person.id) throw conflict('not-yourself');
      const losesElder = membership.roles.includes('elder') && !input.roles.includes('elder');
      if (losesElder && [...signOffRule.mustSign, ...signOffRule.oneOf].includes(personId)) {
        throw conflict('named-in-rule');
      }
      if (!input.roles.includes('steward')) await this.expectAnotherSteward(manager, membership);
      await this.expectAddress(manager, membership.person, input);
      const where = { id: membership.id, version: input.version };
      const { affected } = await manager.update(MembershipEntity, where, { roles: input.roles });
      if (affected === 0) throw stale(await this.read(manager, actor, personId), input);
      if (!mayHaveCard(input.roles)) await this.endCard(manager, actor, personId, 'roles');
      await this.record(manager, actor, 'roles-changed', personId, {
        before: membership.roles,
        after: input.roles,
      });
      return this.read(manager, actor, personId);
    });
  }

  async renewCode(actor: Actor, personId: string): Promise<AddedPerson> {
    return inTransaction(this.dataSource, async (manager) => {
      const membership = await this.membership(manager, actor, personId);
      if (membership.person.passwordHash !== null) throw conflict('already-active');
      if (membership.person.email === null) throw conflict('no-address');
      const code = await this.issueCode(manager, personId);
      await this.record(manager, actor, 'code-renewed', personId, {});
      return { person: await this.read(manager, actor, personId), oneTimeCode: code };
    });
  }

  async remove(actor: Actor, personId: string): Promise<void> {
    await inTransaction(this.dataSource, async (manager) => {
      const { signOffRule } = await lockCommunity(manager, actor.communityId);
      const membership = await this.membership(manager, actor, personId);
      await this.expectAnotherSteward(manager, membership);
      if ([...signOffRule.mustSign, ...signOffRule.oneOf].includes(personId)) throw conflict('named-in-rule');
      await manager.delete(MembershipEntity, { id: membership.id });
      const groups = await manager.findBy(VillageGroupEntity, { communityId: actor.communityId });
      await manager.delete(GroupMemberEntity, { personId, groupId: In(groups.map(({ id }) => id)) });
      await manager.delete(CalendarFeedEntity, { personId, communityId: actor.communityId });
      await this.endCard(manager, actor, personId, 'left');
      await this.record(manager, actor, 'membership-ended', personId, { roles: membership.roles });
    });
  }

  private async expectAnotherSteward(manager: EntityManager, leaving: MembershipEntity): Promise<void> {
    if (!leaving.roles.includes('steward')) return;
    const all = await manager.find(MembershipEntity, { where: { communityId: leaving.communityId } });
    const others = all.filter((row) => row.id !== leaving.id && row.roles.includes('steward'));
    if (others.length === 0) throw conflict('last-steward');
  }

  private async known(
    manager: EntityManager,
    { communityId }: Actor,
    { email, personId }: PersonInput,
  ): Promise<PersonEntity | null> {
    if (email !== '') return manager.findOneBy(PersonEntity, { email });
    if (personId === undefined) return null;
    const left = { communityId, action: 'membership-ended', subjectId: personId } as const;
    const person = await manager.findOneBy(PersonEntity, { id: personId, email: IsNull() });
    if (person === null || !(await manager.existsBy(AuditEventEntity, left))) throw notFound();
    return person;
  }

  /** Whoever gets a role that signs in with a password needs an address; who has none can be given one. */
  private async expectAddress(
    manager: EntityManager,
    person: PersonEntity,
    { email, roles }: PersonUpdate,
  ): Promise<void> {
    if (person.email !== null) return;
    if (email === undefined || email === '') {
      if (!roles.every(isCardRole)) throw invalidField('email', 'address-needed');
      return;
    }
    if (await manager.existsBy(PersonEntity, { email })) throw invalidField('email', 'address-taken');
    await manager.update(PersonEntity, { id: person.id }, { email });
  }

  private async membership(
    manager: EntityManager,
    actor: Actor,
    personId: string,
  ): Promise<MembershipEntity> {
    const row = await manager.findOne(MembershipEntity, {
      where: { communityId: actor.communityId, personId },
      relations: { person: true },
    });
    if (row === null) throw notFound();
    return row;
  }

  private async read(manager: EntityManager, actor: Actor, personId: string): Promise<CommunityPerson> {
    const membership = await this.membership(manager, actor, personId);
    const codes = await this.openCodes(manager, [personId]);
    return toCommunityPerson(membership, codes.get(personId) ?? null, true);
  }

  /** One open code a person: a new one ends the one before. */
  private async issueCode(manager: EntityManager, personId: string): Promise<string> {
    const code = newCode();
    const now = this.clock.now();
    await manager.update(OneTimeCodeEntity, { personId, usedAt: IsNull() }, { usedAt: now });
    await manager.insert(OneTimeCodeEntity, {
      id: randomUUID(),
      purpose: 'join',
      personId,
      codeHash: codeHash(code),
      failedTries: 0,
      expiresAt: addDays(now, CODE_LIFETIME_DAYS),
      usedAt: null,
    });
    return code;
  }

  private async openCodes(
    manager: EntityManager,
    personIds: readonly string[],
  ): Promise<Map<string, OneTimeCodeEntity>> {
    const codes = await manager.find(OneTimeCodeEntity, {
      where: {
        purpose: 'join',
        personId: In([...personIds]),
        usedAt: IsNull(),
        expiresAt: MoreThan(this.clock.now()),
      },
    });
    return new Map(codes.map((code) => [code.personId ?? '', code]));
  }

  private async endCard(
    manager: EntityManager,
    { communityId, person }: Actor,
    personId: string,
    why: 'roles' | 'left',
  ): Promise<void> {
    await endCardOf(manager, { communityId, personId }, { at: this.clock.now(), actorId: person.id, why });
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    action: 'person-added' | 'roles-changed' | 'code-renewed' | 'membership-ended',
    personId: string,
    details: { roles?: Role[]; before?: Role[]; after?: Role[] },
  ): Promise<void> {
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType: 'person',
      subjectId: personId,
      details,
    });
  }
}

/** Changes of people wait for each other, so that two stewards cannot remove one another at once. */
export async function lockCommunity(manager: EntityManager, communityId: string): Promise<CommunityEntity> {
  return manager.findOneOrFail(CommunityEntity, {
    where: { id: communityId },
    lock: { mode: 'pessimistic_write' },
  });
}
