import { KEPT_DAYS } from '#shared/contracts/privacy.js';
import { LessThan, type EntityManager } from 'typeorm';
import { WriteKeyEntity, type WriteCounts } from '../../db/entities/write-key.entity.js';
import { writeKeyNow, type Actor } from '../../http/actor.js';
import { conflict } from '../../http/app-error.js';

const DAY_MS = 24 * 60 * 60 * 1000;

/** What was written, and how much of it where the answer says so. */
export interface Written<C extends WriteCounts | null> {
  resultId: string;
  counts: C;
}

/**
 * Does a write, and remembers its key in the same transaction; one that was done with this key already is not done again.
 * Whoever calls it holds the calendar's lock, so that the same write coming twice at once waits for itself.
 * @returns the id of what was written, by which its present state is read
 */
export async function countOnce(
  manager: EntityManager,
  actor: Actor,
  at: Date,
  write: () => Promise<string>,
): Promise<string> {
  const { resultId } = await countedOnce(manager, actor, at, async () => ({
    ...{ resultId: await write(), counts: null },
  }));
  return resultId;
}

/** The same for what answers with counts: those of the first time. */
export async function countedOnce<C extends WriteCounts | null>(
  manager: EntityManager,
  { person }: Actor,
  at: Date,
  write: () => Promise<Written<C>>,
): Promise<Written<C> & { isNew: boolean }> {
  const key = writeKeyNow();
  if (key === undefined) return { ...(await write()), isNew: true };
  const done = await manager.findOneBy(WriteKeyEntity, { keyHash: key.keyHash });
  if (done !== null) {
    const isOfBefore = done.callHash === '';
    if (!isOfBefore && done.callHash !== key.callHash) throw conflict('write-key-used');
    return { resultId: done.resultId, counts: done.counts as C, isNew: false };
  }
  const written = await write();
  await manager.insert(WriteKeyEntity, { ...key, ...written, personId: person.id, doneAt: at });
  return { ...written, isNew: true };
}

export async function removeOldWriteKeys(manager: EntityManager, now: Date): Promise<void> {
  const before = new Date(now.getTime() - KEPT_DAYS.writeKey * DAY_MS);
  await manager.delete(WriteKeyEntity, { doneAt: LessThan(before) });
}
