import { KEPT_DAYS } from '#shared/contracts/privacy.js';
import { subDays } from 'date-fns';
import { LessThan, type EntityManager } from 'typeorm';
import { OneTimeCodeEntity } from '../../db/entities/one-time-code.entity.js';

/** Codes and links whose time has long been over; until then they are there for whoever asks why they no longer work. */
export async function removeOldCodes(manager: EntityManager, now: Date): Promise<void> {
  await manager.delete(OneTimeCodeEntity, { expiresAt: LessThan(subDays(now, KEPT_DAYS.endedWayIn)) });
}
