import type { EntryLead } from '#shared/contracts/calendars.js';
import { In, IsNull, type EntityManager } from 'typeorm';
import { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { RolloverEntity } from '../../db/entities/rollover.entity.js';
import type { SeenThing } from '../../policy/entry-sight.js';
import { frozenThings } from '../versions/frozen-things.service.js';
import { markerKeyOfLead } from './sky-dates.service.js';

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

/** The draft's entries of several calendars, as the policy asks about them. */
export async function draftThings(
  manager: EntityManager,
  calendarIds: readonly string[],
): Promise<Map<string, SeenThing[]>> {
  if (calendarIds.length === 0) return new Map();
  const rows = await manager
    .createQueryBuilder(EntryEntity, 'entry')
    .select('entry.id', 'id')
    .addSelect('entry.calendarId', 'calendarId')
    // A whole entry is some thousands of letters long, and here hundreds of them are only counted.
    .addSelect("JSON_EXTRACT(entry.content, '$.lead')", 'lead')
    .where('entry.calendarId IN (:...calendarIds)', { calendarIds })
    .andWhere('entry.deletedAt IS NULL')
    .getRawMany<{ id: string; calendarId: string; lead: string }>();
  return grouped(
    rows.map(({ id, calendarId, lead }) => [
      calendarId,
      { entryId: id, markerKey: markerKeyOfLead(JSON.parse(lead) as EntryLead) },
    ]),
  );
}

export interface PublishedFacts {
  number: number;
  label: string;
  publishedAt: Date | null;
  things: readonly SeenThing[];
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
  const things = await frozenThings(
    manager,
    versions.map(({ id }) => id),
  );
  const facts = versions.map(({ id, calendarId, number, label, publishedAt }) => {
    const published = { number, label: label ?? '', publishedAt, things: things.get(id) ?? [] };
    return [calendarId, published] as const;
  });
  return new Map(facts);
}

/** The year of the draft that each began from; those that began empty are missing. */
export async function rolledFromYears(
  manager: EntityManager,
  calendarIds: readonly string[],
): Promise<Map<string, number>> {
  const rows = await manager
    .createQueryBuilder(RolloverEntity, 'rollover')
    .innerJoin(CalendarEntity, 'earlier', 'earlier.id = rollover.fromCalendarId')
    .select('rollover.calendarId', 'calendarId')
    .addSelect('earlier.year', 'year')
    .where('rollover.calendarId IN (:...calendarIds)', { calendarIds })
    .getRawMany<{ calendarId: string; year: number }>();
  return new Map(rows.map(({ calendarId, year }) => [calendarId, year]));
}

function grouped(pairs: readonly (readonly [string, SeenThing])[]): Map<string, SeenThing[]> {
  const groups = new Map<string, SeenThing[]>();
  for (const [key, thing] of pairs) {
    const known = groups.get(key);
    if (known) known.push(thing);
    else groups.set(key, [thing]);
  }
  return groups;
}
