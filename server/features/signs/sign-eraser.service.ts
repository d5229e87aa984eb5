import type { EntityManager } from 'typeorm';
import { SignEntity } from '../../db/entities/sign.entity.js';
import { eraseFromDrafts } from './sign-uses.service.js';

/** Takes a sign with its words and sightings out of the tables and out of every draft. */
export async function eraseSign(manager: EntityManager, signId: string): Promise<void> {
  await eraseFromDrafts(manager, signId);
  await manager.delete(SignEntity, { id: signId });
}
