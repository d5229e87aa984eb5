import { LessThan, type EntityManager } from 'typeorm';
import { SessionEntity } from '../../db/entities/session.entity.js';

/** Ends every session of a person, on all devices. */
export async function endSessionsOf(manager: EntityManager, personId: string): Promise<void> {
  await manager.delete(SessionEntity, { personId });
}

/** Takes away the rows whose time is over. They open nothing any more; this only keeps the table small. */
export async function removeExpiredSessions(manager: EntityManager, now: Date): Promise<void> {
  await manager.delete(SessionEntity, { expiresAt: LessThan(now) });
}
