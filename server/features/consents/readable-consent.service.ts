import type { EntityManager } from 'typeorm';
import { ConsentEntity } from '../../db/entities/consent.entity.js';
import type { Actor } from '../../http/actor.js';
import { viewerOf } from '../../policy/viewer.js';
import { mayOf } from './consent-rules.js';
import { consentThings } from './consent-things.service.js';

/** Whether a consent is there for this person to read, its proof included. */
export async function readableConsent(
  manager: EntityManager,
  actor: Actor,
  consentId: string,
  now: Date,
): Promise<boolean> {
  const row = await manager.findOneBy(ConsentEntity, { id: consentId, communityId: actor.communityId });
  if (row === null) return false;
  const thing = (await consentThings(manager, await viewerOf(manager, actor, now), [row]))(row);
  return thing !== undefined && mayOf(actor, row, thing).read;
}
