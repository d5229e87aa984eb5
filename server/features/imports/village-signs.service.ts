import { plainWords } from '#shared/calendar/import-dates.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import type { RecordSign } from '#shared/contracts/event-record.js';
import { In, IsNull, type EntityManager } from 'typeorm';
import { SignEntity } from '../../db/entities/sign.entity.js';
import { isForVillage } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import { keepingShared, sharedSignIds } from '../../policy/sign-sight.js';
import type { Viewer } from '../../policy/viewer.js';
import { withListedSigns } from '../signs/entry-signs.service.js';

/** Signs of the village's list that everybody sees, by their names as tables are compared. */
export async function villageSignsOf(
  manager: EntityManager,
  { communityId, today }: Viewer,
): Promise<Map<string, RecordSign>> {
  const rows = await manager.findBy(SignEntity, { communityId, takenOutAt: IsNull() });
  const shared = await sharedById(
    manager,
    'sign',
    rows.map(({ id }) => id),
  );
  return new Map(
    rows
      .filter(({ id }) => isForVillage(shared.get(id), today))
      .map(({ id, words }) => [plainWords(words.name), { ...words, sharedId: id }] as const),
  );
}

/** Contents with those signs of the village's list alone that stand there today for everybody, in the list's words. */
export async function withSignsOfToday<E extends { content: EntryInput }>(
  manager: EntityManager,
  viewer: Viewer,
  entries: readonly E[],
): Promise<E[]> {
  const ids = sharedSignIds(entries.map(({ content }) => content));
  if (ids.length === 0) return [...entries];
  const { communityId } = viewer;
  const rows = await manager.findBy(SignEntity, { id: In(ids), communityId });
  const shared = await sharedById(manager, 'sign', ids);
  const listed = new Set(
    rows
      .filter(({ id, takenOutAt }) => takenOutAt === null && isForVillage(shared.get(id), viewer.today))
      .map(({ id }) => id),
  );
  return Promise.all(
    entries.map(async (entry) => {
      const written = keepingShared(entry.content, (id) => listed.has(id));
      const writing = { entryId: null, stored: null, written, prefix: '' };
      return { ...entry, content: await withListedSigns(manager, viewer, writing) };
    }),
  );
}
