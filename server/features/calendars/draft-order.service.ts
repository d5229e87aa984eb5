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
