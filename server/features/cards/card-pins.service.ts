import type { EntityManager } from 'typeorm';
import { addMinutes } from 'date-fns';
import { SignInCardEntity } from '../../db/entities/sign-in-card.entity.js';
import { passwordMatches } from '../session/passwords.service.js';
import { endCard } from './card-ends.service.js';

const TRIES_UNTIL_LOCK = 5;
const TRIES_UNTIL_VOID = 10;
const LOCK_MINUTES = 15;

export type PinTry = 'right' | 'wrong' | 'locked' | 'void';

/**
 * One try at the PIN of a card whose row the caller holds, so that tries come one after the other. Wrong ones are
 * counted in the row: the caller must not take the transaction back.
 */
export async function tryPin(
  manager: EntityManager,
  card: SignInCardEntity,
  pin: string,
  now: Date,
): Promise<PinTry> {
  if (card.lockedUntil !== null && card.lockedUntil > now) return 'locked';
  if (await passwordMatches(card.pinHash, pin)) {
    await manager.update(SignInCardEntity, { id: card.id }, { failedTries: 0, lockedUntil: null });
    return 'right';
  }
  const failedTries = card.failedTries + 1;
  const lockedUntil = failedTries === TRIES_UNTIL_LOCK ? addMinutes(now, LOCK_MINUTES) : null;
  await manager.update(SignInCardEntity, { id: card.id }, { failedTries, lockedUntil });
  if (failedTries < TRIES_UNTIL_VOID) return 'wrong';
  await endCard(manager, card, { at: now, actorId: null, why: 'guessed' });
  return 'void';
}
