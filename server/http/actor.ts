import type { Role } from '#shared/contracts/people.js';

/** Who asks. */
export interface Person {
  id: string;
  email: string;
  displayName: string;
  /** Set where a card signed them in: it opens this one village, and nothing that asks for a password. */
  byCardIn?: string;
}

/** Who asks, within the community that the path belongs to. */
export interface Actor {
  person: Person;
  communityId: string;
  roles: readonly Role[];
  /** Set where somebody else's hand writes for this person. */
  helper?: Helper;
}

/** Whose hand it is, and what shows that the person who is helped is there. */
export interface Helper {
  id: string;
  /** The helped person typed their PIN when the helping began: the helper sees what they see. */
  shownPin: boolean;
  /** The PIN came once more with this very call. */
  provedNow: boolean;
  /** Who looks, where no PIN was shown: the helper themself. */
  eyes: { personId: string; roles: readonly Role[] } | null;
}

/** Whose memberships count in this session. */
export function membershipsHere({ id, byCardIn }: Person): { personId: string; communityId?: string } {
  return byCardIn === undefined ? { personId: id } : { personId: id, communityId: byCardIn };
}

export function hasRole(actor: Pick<Actor, 'roles'>, ...roles: Role[]): boolean {
  return roles.some((role) => actor.roles.includes(role));
}

/** Drafts and reviews are for those who compile, review and sign. */
export function seesDrafts(actor: Pick<Actor, 'roles'>): boolean {
  return hasRole(actor, 'officer', 'elder', 'steward');
}
