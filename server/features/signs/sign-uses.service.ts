import { Raw, type EntityManager } from 'typeorm';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import type { SignWords } from '../../db/entities/sign.entity.js';
import { keepingShared, sharedSignIds } from '../../policy/sign-sight.js';
import { isKept } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import { lockCalendar, recordContribution } from '../calendars/draft.service.js';

/** Entries of drafts, also those that were taken out, that wait for a sign of the list. */
export async function entriesThatWaitFor(manager: EntityManager, signId: string): Promise<EntryEntity[]> {
  const rows = await manager.findBy(EntryEntity, {
    content: Raw((column) => `${column} LIKE :pattern`, { pattern: `%${signId}%` }),
  });
  return rows.filter(({ content }) => sharedSignIds([content]).includes(signId));
}

/** A sign that is described anew is described so in every draft; versions keep the words that they were frozen with. */
export async function writeWordsIntoDrafts(
  manager: EntityManager,
  signId: string,
  words: SignWords,
  by: { personId: string; at: Date },
): Promise<void> {
  const rows = await entriesThatWaitFor(manager, signId);
  const shared = await sharedById(
    manager,
    'entry',
    rows.map(({ id }) => id),
  );
  for (const { id, calendarId } of rows) {
    await lockCalendar(manager, calendarId);
    // Read again behind the lock: somebody may have saved the entry meanwhile.
    const { content } = await manager.findOneByOrFail(EntryEntity, { id });
    const { record } = content;
    if (record === undefined) continue;
    const list = record.signs.list.map((sign) =>
      sign.sharedId === signId ? { ...words, sharedId: signId } : sign,
    );
    const changed = { ...content, record: { ...record, signs: { ...record.signs, list } } };
    await manager.update(EntryEntity, { id }, { content: changed });
    const entry = shared.get(id);
    if (entry !== undefined && !isKept(entry)) {
      await recordContribution(manager, calendarId, by.personId, by.at);
    }
  }
}

/** Takes a sign out of the drafts for good. */
export async function eraseFromDrafts(manager: EntityManager, signId: string): Promise<void> {
  for (const { id, calendarId } of await entriesThatWaitFor(manager, signId)) {
    await lockCalendar(manager, calendarId);
    const { content } = await manager.findOneByOrFail(EntryEntity, { id });
    await manager.update(EntryEntity, { id }, { content: keepingShared(content, (one) => one !== signId) });
  }
}
