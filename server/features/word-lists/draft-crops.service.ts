import { plainWord, type ListedWord } from '#shared/contracts/word-lists.js';
import type { EntityManager } from 'typeorm';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { lockCalendar } from '../calendars/draft.service.js';

/** New names by the plain words of the crops that were called otherwise before. */
export function renamedCrops(
  before: readonly ListedWord[],
  after: readonly ListedWord[],
): ReadonlyMap<string, string> {
  const words = new Map(after.map(({ key, word }) => [key, word]));
  return new Map(
    before.flatMap(({ key, word }): [string, string][] => {
      const now = words.get(key);
      return now === undefined || now === word ? [] : [[plainWord(word), now]];
    }),
  );
}

/**
 * An entry of a draft whose crop is just a word of the list, in letters of any size, is called as the list calls it now; what says
 * more than that word stays as it was written. Entries that were taken out follow, too, because they may come back. Nobody
 * becomes a writer by it.
 */
export async function renameCropsInDrafts(
  manager: EntityManager,
  communityId: string,
  renamed: ReadonlyMap<string, string>,
): Promise<void> {
  if (renamed.size === 0) return;
  const nameFor = ({ content }: EntryEntity) => renamed.get(plainWord(content.crop));
  const rows = await manager.findBy(EntryEntity, { calendar: { communityId } });
  const called = rows.filter((row) => nameFor(row) !== undefined);
  const calendarIds = [...new Set(called.map(({ calendarId }) => calendarId))].sort();
  for (const calendarId of calendarIds) await lockCalendar(manager, calendarId);
  for (const { id } of called) {
    // Read again behind the lock: somebody may have saved the entry meanwhile.
    const row = await manager.findOneByOrFail(EntryEntity, { id });
    const crop = nameFor(row);
    if (crop === undefined) continue;
    await manager.update(EntryEntity, { id }, { content: { ...row.content, crop } });
  }
}
