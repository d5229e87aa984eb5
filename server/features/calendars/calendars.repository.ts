import { In, IsNull, type EntityManager } from 'typeorm';
import { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';

/** Entries of the draft in their order, without those that were taken out. */
export async function liveEntries(manager: EntityManager, calendarId: string): Promise<EntryEntity[]> {
  return manager.find(EntryEntity, {
    where: { calendarId, deletedAt: IsNull() },
    order: { position: 'ASC', id: 'ASC' },
  });
}

/**
 * Numbers the draft's entries 0, 1, 2… in the given order. Written past TypeORM, which would count up each row's
 * version: a colleague who only moved an entry must not make somebody else's open form stale.
 */
export async function writeOrder(manager: EntityManager, entryIds: readonly string[]): Promise<void> {
  if (entryIds.length === 0) return;
  const marks = entryIds.map(() => '?').join(', ');
  await manager.query(`UPDATE entry SET position = FIELD(id, ${marks}) - 1 WHERE id IN (${marks})`, [
    ...entryIds,
    ...entryIds,
  ]);
}

export async function liveEntryCounts(
  manager: EntityManager,
  calendarIds: readonly string[],
): Promise<Map<string, number>> {
  const rows = await manager
    .createQueryBuilder(EntryEntity, 'entry')
    .select('entry.calendarId', 'calendarId')
    .addSelect('COUNT(*)', 'count')
    .where('entry.calendarId IN (:...calendarIds) AND entry.deletedAt IS NULL', { calendarIds })
    .groupBy('entry.calendarId')
    .getRawMany<{ calendarId: string; count: string }>();
  return new Map(rows.map((row) => [row.calendarId, Number(row.count)]));
}

export interface PublishedFacts {
  number: number;
  label: string;
  publishedAt: Date | null;
  entryCount: number;
}

/** The version that is published now, by calendar. */
export async function publishedFacts(
  manager: EntityManager,
  calendarIds: readonly string[],
): Promise<Map<string, PublishedFacts>> {
  const versions = await manager.find(CalendarVersionEntity, {
    where: { calendarId: In([...calendarIds]), state: 'published' },
    select: { id: true, calendarId: true, number: true, label: true, publishedAt: true },
  });
  const facts = new Map<string, PublishedFacts>();
  for (const { id, calendarId, number, label, publishedAt } of versions) {
    const entryCount = await manager.countBy(VersionEntryEntity, { versionId: id });
    facts.set(calendarId, { number, label: label ?? '', publishedAt, entryCount });
  }
  return facts;
}
