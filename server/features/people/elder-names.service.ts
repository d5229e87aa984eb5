import type { EntityManager } from 'typeorm';
import { MembershipEntity } from '../../db/entities/membership.entity.js';

/** Who are elders of the community now, by name. */
export async function elderNamesOf(manager: EntityManager, communityId: string): Promise<string[]> {
  const memberships = await manager.find(MembershipEntity, {
    where: { communityId },
    relations: { person: true },
  });
  return memberships
    .filter(({ roles }) => roles.includes('elder'))
    .map(({ person }) => person.displayName)
    .sort();
}
