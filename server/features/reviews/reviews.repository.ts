import type { EntityManager } from 'typeorm';
import { MembershipEntity } from '../../db/entities/membership.entity.js';

/** Who is an elder of the community now. */
export async function elderIdsOf(manager: EntityManager, communityId: string): Promise<string[]> {
  const memberships = await manager.findBy(MembershipEntity, { communityId });
  return memberships.filter(({ roles }) => roles.includes('elder')).map(({ personId }) => personId);
}
