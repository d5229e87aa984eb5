import type { SharingDetails } from '#shared/contracts/sharing.js';
import type { EntityManager } from 'typeorm';
import { GroupMemberEntity } from '../../db/entities/group-member.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import type { Actor } from '../../http/actor.js';
import { invalidField } from '../../http/app-error.js';

/** Groups, givers and successors are of this village; nobody hands a thing to a group that they are not in. */
export async function expectKnownPeople(
  manager: EntityManager,
  { communityId, person }: Actor,
  { groupId, successorId }: Pick<SharingDetails, 'groupId' | 'successorId'>,
  giverId: string | null,
  prefix: string,
): Promise<void> {
  if (groupId !== null) {
    const groups = await manager.findBy(GroupMemberEntity, { groupId, group: { communityId } });
    const people = groups.map(({ personId }) => personId);
    if (![person.id, giverId].some((id) => id !== null && people.includes(id))) {
      throw invalidField(`${prefix}sharing.groupId`, 'group-of-giver');
    }
  }
  for (const [field, personId] of [
    ['giverId', giverId],
    ['sharing.successorId', successorId],
  ] as const) {
    if (personId === null) continue;
    if (!(await manager.existsBy(MembershipEntity, { communityId, personId }))) {
      throw invalidField(`${prefix}${field}`, 'not-of-this-village');
    }
  }
}
