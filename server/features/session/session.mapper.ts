import type { SessionState } from '#shared/contracts/session.js';
import type { MembershipEntity } from '../../db/entities/membership.entity.js';
import type { Person } from '../../http/actor.js';

export function toSessionState(
  person: Person | null,
  memberships: readonly MembershipEntity[],
  csrfToken: string,
  cardMinutes: number,
  helping: SessionState['helping'] | null,
): SessionState {
  return {
    person: person && { id: person.id, email: person.email ?? '', displayName: person.displayName },
    memberships:
      person &&
      memberships.map((membership) => ({
        communityId: membership.communityId,
        communityName: membership.community.name,
        roles: membership.roles,
      })),
    card: person?.byCardIn === undefined ? null : { leaveAfterMinutes: cardMinutes },
    ...(helping ? { helping } : {}),
    csrfToken,
  };
}
