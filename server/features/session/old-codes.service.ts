import { subDays } from 'date-fns';
import { LessThan, type EntityManager } from 'typeorm';
import { OneTimeCodeEntity } from '../../db/entities/one-time-code.entity.js';

/** A code that is over is kept so long, for whoever asks why it no longer works. */
export const OLD_CODES_KEPT_DAYS = 30;

/** Codes and links whose time has long been over. */
export async function removeOldCodes(manager: EntityManager, now: Date): Promise<void> {
  await manager.delete(OneTimeCodeEntity, { expiresAt: LessThan(subDays(now, OLD_CODES_KEPT_DAYS)) });
}
