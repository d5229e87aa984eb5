import { KEPT_DAYS } from '#shared/contracts/privacy.js';
import { LessThan, type EntityManager } from 'typeorm';
import { WriteKeyEntity } from '../../db/entities/write-key.entity.js';
import { writeKeyNow, type Actor } from '../../http/actor.js';
import { conflict } from '../../http/app-error.js';

const DAY_MS = 24 * 60 * 60 * 1000;

/**
 * Does a write, and remembers its key in the same transaction; one that was done with this key already is not done again.
 * Whoever calls it holds the calendar's lock, so that the same write coming twice at once waits for itself.
 * @returns the id of what was written, by which its present state is read
 */
export async function countOnce(
  manager: EntityManager,
  { person }: Actor,
  at: Date,
  write: () => Promise<string>,
): Promise<string> {
  const key = writeKeyNow();
  if (key === undefined) return write();
  const done = await manager.findOneBy(WriteKeyEntity, { keyHash: key.keyHash });
  if (done !== null) {
    if (done.callHash !== key.callHash) throw conflict('write-key-used');
    return done.resultId;
  }
  const resultId = await write();
  await manager.insert(WriteKeyEntity, { ...key, personId: person.id, resultId, doneAt: at });
  return resultId;
}

export async function removeOldWriteKeys(manager: EntityManager, now: Date): Promise<void> {
  const before = new Date(now.getTime() - KEPT_DAYS.writeKey * DAY_MS);
  await manager.delete(WriteKeyEntity, { doneAt: LessThan(before) });
}
