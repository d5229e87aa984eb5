import { useMemo } from 'react';
import type { Membership, Role } from '#shared/contracts/people.js';
import { useCommunityChoice } from './community.js';

export interface RolesIn {
  /** Writes drafts, submits, publishes. */
  isOfficer: boolean;
  /** Writes entries that their people keep, and reviews all others. */
  isElder: boolean;
  /** Holds the rule, the people and the settings. */
  isSteward: boolean;
  /** Officers, elders and stewards see drafts and answers; everybody else what was published. */
  seesDrafts: boolean;
}

/** What the person may do in the village that a calendar belongs to; it need not be the one on screen. */
export function useRolesIn(communityId: string): RolesIn {
  const { memberships } = useCommunityChoice();
  return useMemo(() => rolesIn(memberships, communityId), [memberships, communityId]);
}

/** The same for somebody with these memberships; nothing where none of them is of that village. */
export function rolesIn(memberships: readonly Membership[], communityId: string): RolesIn {
  const roles = memberships.find((each) => each.communityId === communityId)?.roles ?? [];
  const is = (...any: Role[]) => any.some((role) => roles.includes(role));
  return {
    ...{ isOfficer: is('officer'), isElder: is('elder'), isSteward: is('steward') },
    seesDrafts: is('officer', 'elder', 'steward'),
  };
}
