import type { LeavingInput } from '#shared/contracts/privacy.js';
import { en } from '#shared/locales/index.js';
import { In, Not, type DataSource, type EntityManager } from 'typeorm';
import { GroupMemberEntity } from '../../db/entities/group-member.entity.js';
import { CalendarFeedEntity } from '../../db/entities/calendar-feed.entity.js';
import { CommunityEntity } from '../../db/entities/community.entity.js';
import { ItemSharingEntity } from '../../db/entities/item-sharing.entity.js';
import { LetterChoiceEntity } from '../../db/entities/letter-choice.entity.js';
import { LetterEntity } from '../../db/entities/letter.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { OneTimeCodeEntity } from '../../db/entities/one-time-code.entity.js';
import { PersonEntity } from '../../db/entities/person.entity.js';
import { SignInCardEntity } from '../../db/entities/sign-in-card.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Person } from '../../http/actor.js';
import { AppError, conflict, invalidField } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import type { CardSignInService } from '../cards/card-sign-in.service.js';
import { eraseLessonsBy } from '../season-reviews/season-eraser.service.js';
import { endSessionsOf } from '../session/end-sessions.service.js';
import { passwordMatches } from '../session/passwords.service.js';
import type { WithdrawalsService } from '../withdrawals/withdrawals.service.js';

/** Leaving for good. The row stays, because what was signed and recorded names it; the person is in it no more. */
export class LeavingService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly withdrawals: WithdrawalsService,
    private readonly pins: Pick<CardSignInService, 'provePin'>,
  ) {}

  async leave(person: Person, { takeBackGiven, ...proof }: LeavingInput): Promise<void> {
    const { manager } = this.dataSource;
    await this.expectProof(manager, person, proof);
    await this.expectFree(manager, person);
    if (takeBackGiven) await this.takeBackAll(manager, person);
    await inTransaction(this.dataSource, async (transaction) => {
      if (takeBackGiven) await eraseLessonsBy(transaction, person.id);
      await this.erase(transaction, person);
    });
  }

  /** By the password; for whoever has only a card, by its PIN. A card of one village ends no place in another one. */
  private async expectProof(
    manager: EntityManager,
    { id, byCardIn }: Person,
    { password, pin }: Pick<LeavingInput, 'password' | 'pin'>,
  ): Promise<void> {
    if (byCardIn === undefined) {
      if (password === undefined) throw invalidField('password', 'required');
      const { passwordHash } = await manager.findOneByOrFail(PersonEntity, { id });
      if (!(await passwordMatches(passwordHash, password))) {
        throw invalidField('password', 'wrong-current-password');
      }
      return;
    }
    if (await manager.existsBy(MembershipEntity, { personId: id, communityId: Not(byCardIn) })) {
      throw new AppError('not-allowed', { reason: 'needs-password' });
    }
    if (pin === undefined) throw invalidField('pin', 'required');
    await this.pins.provePin(byCardIn, id, pin);
  }

  /** No village is left without a steward, nor its rule without the elder it names. */
  private async expectFree(manager: EntityManager, { id: personId }: Person): Promise<MembershipEntity[]> {
    const memberships = await manager.findBy(MembershipEntity, { personId });
    for (const { communityId, roles } of memberships) {
      // Whoever changes people of a village waits for the others.
      const lock = manager.queryRunner?.isTransactionActive === true;
      const { signOffRule } = await manager.findOneOrFail(CommunityEntity, {
        where: { id: communityId },
        ...(lock ? { lock: { mode: 'pessimistic_write' } } : {}),
      });
      if ([...signOffRule.mustSign, ...signOffRule.oneOf].includes(personId)) throw conflict('named-in-rule');
      if (!roles.includes('steward')) continue;
      const others = await manager.findBy(MembershipEntity, { communityId, personId: Not(personId) });
      if (!others.some((row) => row.roles.includes('steward'))) throw conflict('last-steward');
    }
    return memberships;
  }

  private async takeBackAll(manager: EntityManager, person: Person): Promise<void> {
    const memberships = await manager.findBy(MembershipEntity, { personId: person.id });
    for (const { communityId, roles } of memberships) {
      const given = await manager.findBy(ItemSharingEntity, {
        communityId,
        giverId: person.id,
        state: In(['shared', 'paused']),
      });
      for (const { itemType, itemId } of given) {
        const how = { leavesTrace: false, askedById: null };
        await this.withdrawals.withdraw({ person, communityId, roles }, itemType, itemId, how);
      }
    }
  }

  private async erase(manager: EntityManager, person: Person): Promise<void> {
    const { id: personId } = person;
    for (const { communityId, roles } of await this.expectFree(manager, person)) {
      await recordAudit(manager, {
        at: this.clock.now(),
        ...{ communityId, actorId: personId, subjectId: personId },
        action: 'membership-ended',
        subjectType: 'person',
        details: { roles },
      });
    }
    await manager.delete(MembershipEntity, { personId });
    await manager.delete(GroupMemberEntity, { personId });
    await manager.delete(LetterEntity, { personId });
    await manager.delete(LetterChoiceEntity, { personId });
    await manager.delete(OneTimeCodeEntity, { personId });
    await manager.delete(SignInCardEntity, { personId });
    await manager.delete(CalendarFeedEntity, { personId });
    await endSessionsOf(manager, personId);
    const gone = {
      email: `${personId}@left.invalid`,
      displayName: en.privacy.somebodyWhoLeft,
      passwordHash: null,
    };
    await manager.update(PersonEntity, { id: personId }, gone);
  }
}
