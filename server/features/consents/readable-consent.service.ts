import type { EntityManager } from 'typeorm';
import { ConsentEntity } from '../../db/entities/consent.entity.js';
import type { Viewer } from '../../policy/viewer.js';
import { mayOf } from './consent-rules.js';
import { consentThings } from './consent-things.service.js';

/** Whether a consent is there for this person to read, its proof included. */
export async function readableConsent(
  manager: EntityManager,
  viewer: Viewer,
  consentId: string,
): Promise<boolean> {
  const { communityId } = viewer;
  const row = await manager.findOneBy(ConsentEntity, { id: consentId, communityId });
  if (row === null) return false;
  const thing = (await consentThings(manager, viewer, [row]))(row);
  return thing !== undefined && mayOf(viewer, row, thing).read;
}
