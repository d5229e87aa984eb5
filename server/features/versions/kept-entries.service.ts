import { keptEntryStands, type AnswerFact } from '#shared/calendar/sign-off.js';
import { In, type EntityManager } from 'typeorm';
import { AnswerEntity } from '../../db/entities/answer.entity.js';
import type { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import { keptEntryIds } from '../../policy/entry-sight.js';
import type { Shared } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import { answersHashOf } from './answers-across-words.service.js';
import { thingOf } from './seen-content.service.js';
import { toVersionEntry } from './versions.mapper.js';
import { frozenEntries } from './versions.repository.js';

/**
 * As a version is published, what is kept goes with it only where its own people agreed and none of them objects.
 * Written down then, so that what is said about the next submission takes nothing out of this one.
 */
export async function settleKeptEntries(
  manager: EntityManager,
  { id: versionId, calendarId }: CalendarVersionEntity,
): Promise<void> {
  const rows = await frozenEntries(manager, versionId);
  const kept = await keptEntryIds(
    manager,
    rows.map((row) => thingOf(toVersionEntry(row))),
  );
  if (kept.size === 0) return;
  const answers: AnswerFact[] = await manager.findBy(AnswerEntity, { calendarId, entryId: In([...kept]) });
  const shared = await sharedById(manager, 'entry', [...kept]);
  const drafts = await manager.findBy(EntryEntity, { id: In([...kept]) });
  const writers = new Map(drafts.map(({ id, updatedBy }) => [id, updatedBy]));
  for (const row of rows) {
    const { id, entryId } = row;
    if (!kept.has(entryId)) continue;
    const own = shared.get(entryId);
    const ownPeople = new Set(own === undefined ? [] : lonePeople(own));
    const entry = { entryId, hash: answersHashOf(row), writerId: writers.get(entryId) ?? '', ownPeople };
    if (!keptEntryStands(entry, answers)) await manager.update(VersionEntryEntity, { id }, { stands: false });
  }
}

/** Giver and successor of what is sealed, always or outside its telling season. */
export function lonePeople({ level, details, giverId }: Shared): string[] {
  if (level !== 'sealed' && details.tellingSeason === null) return [];
  return [giverId, details.successorId].filter((id) => id !== null);
}
