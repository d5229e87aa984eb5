import type { EntityManager } from 'typeorm';
import { SessionEntity } from '../../db/entities/session.entity.js';

/** Ends every session of a person, on all devices. */
export async function endSessionsOf(manager: EntityManager, personId: string): Promise<void> {
  await manager.delete(SessionEntity, { personId });
}
