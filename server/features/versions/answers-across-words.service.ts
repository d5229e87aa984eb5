import { sameButForVillageWords } from '#shared/calendar/village-words.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { In, type EntityManager } from 'typeorm';
import { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import type { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import { frozenEntries } from './versions.repository.js';

/** The hash under which answers to a frozen entry are kept. */
export function answersHashOf({ answersTo, hash }: Pick<VersionEntryEntity, 'answersTo' | 'hash'>): string {
  return answersTo ?? hash;
}

/** The same for every entry of a version, by entry. */
export async function answersHashes(
  manager: EntityManager,
  versionId: string,
): Promise<ReadonlyMap<string, string>> {
  const rows = await frozenEntries(manager, versionId);
  return new Map(rows.map((row) => [row.entryId, answersHashOf(row)]));
}

/**
 * Where an entry says what it said in the submission before, and only the village calls its kind or its work otherwise: the hash
 * under which the answers of then are kept, by entry. They stand, and nobody is asked again for a name. Not where a
 * name was taken off the text of then, nor where the entry was set back to an old version since.
 */
export async function answersCarried(
  manager: EntityManager,
  calendarId: string,
  bodies: readonly VersionEntryBody[],
): Promise<ReadonlyMap<string, string>> {
  const [before] = await manager.find(CalendarVersionEntity, {
    where: { calendarId },
    order: { number: 'DESC' },
    take: 1,
  });
  if (before === undefined) return new Map();
  const rows = new Map((await frozenEntries(manager, before.id)).map((row) => [row.entryId, row]));
  const restoredAt = await restoredTimes(manager, [...rows.keys()]);
  return new Map(
    bodies.flatMap((body): [string, string][] => {
      const row = rows.get(body.entryId);
      if (row === undefined || row.redacted) return [];
      if ((restoredAt.get(body.entryId) ?? 0) >= before.submittedAt.getTime()) return [];
      return saysTheSame(JSON.parse(row.bodyText) as VersionEntryBody, body)
        ? [[body.entryId, answersHashOf(row)]]
        : [];
    }),
  );
}

function saysTheSame(was: VersionEntryBody, is: VersionEntryBody): boolean {
  return sameJson(was.dates, is.dates) && sameButForVillageWords(was.content, is.content);
}

async function restoredTimes(manager: EntityManager, ids: readonly string[]): Promise<Map<string, number>> {
  const rows = await manager.find(EntryEntity, {
    select: { id: true, restoredAt: true },
    where: { id: In([...ids]) },
  });
  return new Map(rows.flatMap(({ id, restoredAt }) => (restoredAt ? [[id, restoredAt.getTime()]] : [])));
}
