import type { Role } from '#shared/contracts/people.js';
import { AsyncLocalStorage } from 'node:async_hooks';

/** Who asks. */
export interface Person {
  id: string;
  /** Null where they have none. */
  email: string | null;
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

/** Somebody is being helped in this session, and still may be. */
export interface Helped {
  person: Person;
  communityId: string;
  /** What they are there and a helper may be for them; never steward, officer or staff. */
  roles: readonly Role[];
  shownPin: boolean;
}

/** Whose hand does what is being done now, for whom; the records ask it, so that no write can forget to say. */
export interface HandNow {
  helperId: string;
  personId: string;
}

/** What tells that a write is the same one again. */
export interface WriteKey {
  keyHash: string;
  callHash: string;
}

const writeKeys = new AsyncLocalStorage<WriteKey | undefined>();

export function withWriteKey<T>(key: WriteKey | undefined, work: () => T): T {
  return writeKeys.run(key, work);
}

export function writeKeyNow(): WriteKey | undefined {
  return writeKeys.getStore();
}

const hands = new AsyncLocalStorage<HandNow | undefined>();

export function withHandOf<T>({ person, helper }: Actor, work: () => T): T {
  return hands.run(helper === undefined ? undefined : { helperId: helper.id, personId: person.id }, work);
}

export function handNow(): HandNow | undefined {
  return hands.getStore();
}
