import { CARD_FIRST_USE_DAYS, type Card, type CardHolder } from '#shared/contracts/cards.js';
import { addDays } from 'date-fns';
import type { MembershipEntity } from '../../db/entities/membership.entity.js';
import type { SignInCardEntity } from '../../db/entities/sign-in-card.entity.js';
import { mayHaveCard } from './card-ends.service.js';

export function toCardHolder(
  { personId, person, roles }: MembershipEntity,
  row: SignInCardEntity | null,
  names: ReadonlyMap<string, string>,
  now: Date,
): CardHolder {
  return {
    personId,
    displayName: person.displayName,
    roles,
    mayHaveCard: mayHaveCard(roles),
    card: row && toCard(row, names, now),
  };
}

function toCard(row: SignInCardEntity, names: ReadonlyMap<string, string>, now: Date): Card {
  const firstUseUntil = addDays(row.madeAt, CARD_FIRST_USE_DAYS);
  const isUsed = row.pinHash !== null;
  return {
    madeAt: row.madeAt.toISOString(),
    madeByName: names.get(row.madeBy) ?? '',
    state: row.liveFor === null ? 'ended' : isUsed ? 'in-use' : firstUseUntil <= now ? 'run-out' : 'waiting',
    firstUseUntil: isUsed ? null : firstUseUntil.toISOString(),
    lastUsedAt: row.lastUsedAt?.toISOString() ?? null,
    lockedUntil: row.lockedUntil !== null && row.lockedUntil > now ? row.lockedUntil.toISOString() : null,
    endedWhy: row.endedWhy,
  };
}
