import type { DataSource } from 'typeorm';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { PlaceEntity } from '../../db/entities/place.entity.js';
import type { Actor } from '../../http/actor.js';
import { DEMO_DOMAIN, UPPER_TAZIMEL } from './demo-villages.data.js';

export interface Cast {
  placeId: string;
  officer: Actor;
  steward: Actor;
  elder: Actor;
  elder2: Actor;
  elder3: Actor;
}

/** The people of the first demo village; null where they are not all there (a database without the demo). */
export async function findCast(dataSource: DataSource): Promise<Cast | null> {
  const members = await dataSource.getRepository(MembershipEntity).find({
    where: { person: { isDemo: true }, community: { name: UPPER_TAZIMEL.settings.name } },
    relations: { person: true },
  });
  const actor = (mailbox: string): Actor | null => {
    const found = members.find(({ person }) => person.email === `${mailbox}@${DEMO_DOMAIN}`);
    return found ? { person: found.person, communityId: found.communityId, roles: found.roles } : null;
  };
  const [officer, steward, elder, elder2, elder3] = ['officer', 'steward', 'elder', 'elder2', 'elder3'].map(
    actor,
  );
  if (!officer || !steward || !elder || !elder2 || !elder3) return null;
  const place = await dataSource
    .getRepository(PlaceEntity)
    .findOneBy({ communityId: officer.communityId, name: UPPER_TAZIMEL.place.name });
  return place && { placeId: place.id, officer, steward, elder, elder2, elder3 };
}
