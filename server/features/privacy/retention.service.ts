import type { EntityManager } from 'typeorm';
import { removeOldWriteKeys } from '../calendars/count-once.service.js';
import { removeOldCards } from '../cards/card-ends.service.js';
import { removeOldLetters } from '../letters/letter-rounds.service.js';
import { removeExpiredSessions } from '../session/end-sessions.service.js';
import { removeOldCodes } from '../session/old-codes.service.js';

/** Takes away whatever has been kept as long as the page on data protection says. Done at every start and every day. */
export async function removeWhatIsOver(manager: EntityManager, now: Date): Promise<void> {
  await Promise.all([
    removeExpiredSessions(manager, now),
    removeOldLetters(manager, now),
    removeOldCodes(manager, now),
    removeOldCards(manager, now),
    removeOldWriteKeys(manager, now),
  ]);
}
