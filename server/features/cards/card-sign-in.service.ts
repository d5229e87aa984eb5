import { CARD_FIRST_USE_DAYS, type OpenedCard } from '#shared/contracts/cards.js';
import { addDays } from 'date-fns';
import type { DataSource, EntityManager } from 'typeorm';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { PersonEntity } from '../../db/entities/person.entity.js';
import type { SessionCard } from '../../db/entities/session.entity.js';
import { SignInCardEntity } from '../../db/entities/sign-in-card.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Person } from '../../http/actor.js';
import { AppError, conflict, invalidField } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import { codeHash } from '../session/one-time-codes.service.js';
import { hashPassword } from '../session/passwords.service.js';
import { mayHaveCard } from './card-ends.service.js';
import { tryPin, type PinTry } from './card-pins.service.js';

export interface CardHolderIn {
  person: Person;
  card: SessionCard;
}

/** What a card opens, and whether it still does. */
export class CardSignInService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async open(code: string): Promise<OpenedCard> {
    const card = await this.liveCard(this.dataSource.manager, code, false);
    if (card === null) throw new AppError('code-not-valid');
    return { next: card.pinHash === null ? 'choose-pin' : 'enter-pin' };
  }

  /** Once: whoever comes second has to know the PIN. */
  async choosePin(code: string, pin: string): Promise<CardHolderIn> {
    const pinHash = await hashPassword(pin);
    return inTransaction(this.dataSource, async (manager) => {
      const card = await this.liveCard(manager, code, true);
      if (card === null) throw new AppError('code-not-valid');
      if (card.pinHash !== null) throw conflict('pin-is-chosen');
      const now = this.clock.now();
      await manager.update(SignInCardEntity, { id: card.id }, { pinHash, lastUsedAt: now });
      await recordAudit(manager, {
        at: now,
        communityId: card.communityId,
        actorId: card.personId,
        action: 'card-first-used',
        subjectType: 'person',
        subjectId: card.personId,
      });
      return holderOf(manager, card);
    });
  }

  async signIn(code: string, pin: string): Promise<CardHolderIn> {
    const outcome = await inTransaction(this.dataSource, async (manager) => {
      const card = await this.liveCard(manager, code, true);
      if (card === null) return 'void';
      if (card.pinHash === null) return 'to-choose';
      const tried = await tryPin(manager, card, pin, this.clock.now());
      if (tried !== 'right') return tried;
      await manager.update(SignInCardEntity, { id: card.id }, { lastUsedAt: this.clock.now() });
      return holderOf(manager, card);
    });
    if (outcome === 'to-choose') throw conflict('pin-not-chosen');
    if (outcome === 'wrong') throw new AppError('wrong-credentials', { reason: 'pin-wrong' });
    return settled(outcome);
  }

  /**
   * A card lies on somebody else's device and its holder types the PIN. Whoever lacks the card has no try at the PIN,
   * and cannot end the card by wrong ones. Answers the card's id.
   */
  async proveCard(
    communityId: string,
    personId: string,
    { code, pin }: { code: string; pin: string },
  ): Promise<string> {
    const card = await this.liveCard(this.dataSource.manager, code, false);
    if (card?.liveFor !== personId || card.communityId !== communityId) {
      throw invalidField('card.code', 'card-of-another');
    }
    await this.provePin(communityId, personId, pin, 'card.pin');
    return card.id;
  }

  /** An elder types their PIN on somebody else's device, as proof of their word. Wrong ones count as at the door. */
  async provePin(communityId: string, personId: string, pin: string, field = 'pin'): Promise<void> {
    const outcome = await inTransaction(this.dataSource, async (manager) => {
      const card = await manager.findOne(SignInCardEntity, {
        where: { liveFor: personId, communityId },
        lock: { mode: 'pessimistic_write' },
      });
      return card?.pinHash ? tryPin(manager, card, pin, this.clock.now()) : 'no-pin';
    });
    if (outcome === 'no-pin') throw invalidField(field, 'no-pin');
    if (outcome === 'wrong') throw invalidField(field, 'pin-wrong');
    settled(outcome);
  }

  /** Asked with every request of a session that a card opened. */
  async holds({ id, communityId }: SessionCard, personId: string): Promise<boolean> {
    const { manager } = this.dataSource;
    if (!(await manager.existsBy(SignInCardEntity, { id, communityId, liveFor: personId }))) return false;
    return maySignInByCard(manager, communityId, personId);
  }

  /** The card that a code belongs to while it opens anything at all. */
  private async liveCard(
    manager: EntityManager,
    code: string,
    locks: boolean,
  ): Promise<SignInCardEntity | null> {
    const card = await manager.findOne(SignInCardEntity, {
      where: { codeHash: codeHash(code) },
      ...(locks ? { lock: { mode: 'pessimistic_write' as const } } : {}),
    });
    if (card?.liveFor === null || card === null) return null;
    const hasRunOut = card.pinHash === null && addDays(card.madeAt, CARD_FIRST_USE_DAYS) <= this.clock.now();
    if (hasRunOut || !(await maySignInByCard(manager, card.communityId, card.personId))) return null;
    return card;
  }
}

async function maySignInByCard(
  manager: EntityManager,
  communityId: string,
  personId: string,
): Promise<boolean> {
  const membership = await manager.findOneBy(MembershipEntity, { communityId, personId });
  return membership !== null && mayHaveCard(membership.roles);
}

async function holderOf(manager: EntityManager, card: SignInCardEntity): Promise<CardHolderIn> {
  const { id, communityId, personId } = card;
  const { email, displayName } = await manager.findOneByOrFail(PersonEntity, { id: personId });
  return {
    person: { id: personId, email, displayName, byCardIn: communityId },
    card: { id, communityId },
  };
}

function settled<T>(outcome: T | Exclude<PinTry, 'right' | 'wrong'>): T {
  if (outcome === 'locked') throw new AppError('too-many-attempts', { reason: 'card-locked' });
  if (outcome === 'void') throw new AppError('code-not-valid');
  return outcome;
}
