import type { CardEnd } from '#shared/contracts/cards.js';
import { isCardRole, type Role } from '#shared/contracts/people.js';
import { KEPT_DAYS } from '#shared/contracts/privacy.js';
import { subDays } from 'date-fns';
import { LessThan, type EntityManager } from 'typeorm';
import { SessionEntity } from '../../db/entities/session.entity.js';
import { SignInCardEntity } from '../../db/entities/sign-in-card.entity.js';
import { recordAudit } from '../audit/audit.service.js';

/** A card is weaker than a password: whoever compiles, prints or administers has none. */
export function mayHaveCard(roles: readonly Role[]): boolean {
  return roles.every(isCardRole);
}

export interface Ending {
  at: Date;
  /** Null where it ended by itself. */
  actorId: string | null;
  why: CardEnd;
}

/** Ends the card that a person has in a village, if there is one, and every session it opened. */
export async function endCardOf(
  manager: EntityManager,
  whose: { communityId: string; personId: string },
  ending: Ending,
): Promise<boolean> {
  const live = await manager.findOne(SignInCardEntity, {
    where: { liveFor: whose.personId, communityId: whose.communityId },
    lock: { mode: 'pessimistic_write' },
  });
  if (live === null) return false;
  await endCard(manager, live, ending);
  return true;
}

/** The caller holds the row. */
export async function endCard(
  manager: EntityManager,
  { id, communityId, personId }: SignInCardEntity,
  { at, actorId, why }: Ending,
): Promise<void> {
  await manager.update(SignInCardEntity, { id }, { liveFor: null, endedAt: at, endedWhy: why });
  await manager.delete(SessionEntity, { cardId: id });
  await recordAudit(manager, {
    at,
    communityId,
    actorId,
    action: 'card-ended',
    subjectType: 'person',
    subjectId: personId,
    details: { why },
  });
}

/** Cards that ended long ago; that they ended stands in the records. */
export async function removeOldCards(manager: EntityManager, now: Date): Promise<void> {
  await manager.delete(SignInCardEntity, { endedAt: LessThan(subDays(now, KEPT_DAYS.endedWayIn)) });
}
