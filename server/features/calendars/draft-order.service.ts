import type { EntityManager } from 'typeorm';
import { liveEntries, writeOrder } from './calendars.repository.js';

/** Puts these entries into this order; all others stay where they stand between them. */
export async function orderAmongOthers(
  manager: EntityManager,
  calendarId: string,
  entryIds: readonly string[],
): Promise<void> {
  const movable = new Set(entryIds);
  const next = [...entryIds];
  const ids = (await liveEntries(manager, calendarId)).map(({ id }) => id);
  await writeOrder(
    manager,
    ids.map((id) => (movable.has(id) ? (next.shift() ?? id) : id)),
  );
}

/** Where new entries stand behind those that are there; `takeIt` writes that down once they are in. */
export async function roomAtTheEnd(
  manager: EntityManager,
  calendarId: string,
  newIds: readonly string[],
): Promise<{ first: number; takeIt: () => Promise<void> }> {
  const before = (await liveEntries(manager, calendarId)).map(({ id }) => id);
  return { first: before.length, takeIt: () => writeOrder(manager, [...before, ...newIds]) };
}
