import type { Role } from '#shared/contracts/people.js';
import { civilDayOf } from '#shared/sky/index.js';
import type { EntityManager } from 'typeorm';
import { GroupMemberEntity } from '../db/entities/group-member.entity.js';
import { PlaceEntity } from '../db/entities/place.entity.js';

/** Who looks, in one village, on one day: everything that the policy asks about a person. */
export interface Viewer {
  personId: string;
  communityId: string;
  roles: readonly Role[];
  groupIds: ReadonlySet<string>;
  /** Civil day in the village, `YYYY-MM-DD`: telling seasons begin and end by it. */
  today: string;
}

/** The part of an actor that a viewer is made from. */
export interface Member {
  person: { id: string };
  communityId: string;
  roles: readonly Role[];
  /** Who writes for somebody else without having been let in by them sees no more than what is theirs to see. */
  helper?: { eyes: { personId: string; roles: readonly Role[] } | null };
}

const JD_UNIX_EPOCH = 2440587.5;
const MS_PER_DAY = 86_400_000;

/** Who looks in calls that change nothing, made out once. */
const looking = new WeakMap<Member, Promise<Viewer> | null>();

/** From here to the end of this call nothing changes: whoever looks stays who they are. */
export function looksOnly(member: Member): void {
  looking.set(member, null);
}

export function viewerOf(manager: EntityManager, member: Member, now: Date): Promise<Viewer> {
  const known = looking.get(member);
  const viewer = known ?? makeOut(manager, member, now);
  if (known === null) looking.set(member, viewer);
  return viewer;
}

async function makeOut(manager: EntityManager, member: Member, now: Date): Promise<Viewer> {
  const { communityId } = member;
  const { personId, roles } = member.helper?.eyes ?? { personId: member.person.id, roles: member.roles };
  const groups = await manager.findBy(GroupMemberEntity, { personId, group: { communityId } });
  return {
    personId,
    communityId,
    roles,
    groupIds: new Set(groups.map(({ groupId }) => groupId)),
    today: await villageDay(manager, communityId, now),
  };
}

/** By the clock of the village's first place by name; a village without a place goes by universal time. */
export async function villageDay(manager: EntityManager, communityId: string, now: Date): Promise<string> {
  const place = await manager.findOne(PlaceEntity, {
    where: { communityId },
    order: { name: 'ASC', id: 'ASC' },
    select: { id: true, timeZone: true, longitudeDeg: true },
  });
  if (place === null) return now.toISOString().slice(0, 10);
  const jdUt = JD_UNIX_EPOCH + now.getTime() / MS_PER_DAY;
  const { year, month, day } = civilDayOf(jdUt, place.timeZone, place.longitudeDeg).gregorian;
  const parts = [month, day].map((part) => String(part).padStart(2, '0'));
  return [String(year).padStart(4, '0'), ...parts].join('-');
}
