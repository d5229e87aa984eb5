import type { EntityManager } from 'typeorm';
import { askedOnce } from '../../db/asked-once.js';
import { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { SignatureEntity } from '../../db/entities/signature.entity.js';
import { VersionVariantEntity } from '../../db/entities/version-variant.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';

export async function findVersion(
  manager: EntityManager,
  calendarId: string,
  number: number,
): Promise<CalendarVersionEntity | null> {
  return askedOnce(manager, `version ${calendarId} ${number}`, () =>
    manager.findOneBy(CalendarVersionEntity, { calendarId, number }),
  );
}

export async function frozenEntries(
  manager: EntityManager,
  versionId: string,
): Promise<VersionEntryEntity[]> {
  return askedOnce(manager, `frozen entries ${versionId}`, () =>
    manager.find(VersionEntryEntity, { where: { versionId }, order: { position: 'ASC' } }),
  );
}

export async function frozenVariants(
  manager: EntityManager,
  versionId: string,
): Promise<VersionVariantEntity[]> {
  return askedOnce(manager, `frozen variants ${versionId}`, () =>
    manager.find(VersionVariantEntity, { where: { versionId }, order: { position: 'ASC' } }),
  );
}

export async function signaturesOf(manager: EntityManager, versionId: string): Promise<SignatureEntity[]> {
  return askedOnce(manager, `signatures ${versionId}`, () =>
    manager.find(SignatureEntity, { where: { versionId }, order: { signedAt: 'ASC', id: 'ASC' } }),
  );
}

export interface EntrySeal {
  salt: string;
  hash: string;
}

/**
 * Every salt and hash under which the calendar's entries were frozen before, by entry; newest first. Of an entry that was set
 * back to an old version only what was frozen since: nobody has agreed to it again yet.
 */
export async function earlierSeals(
  manager: EntityManager,
  calendarId: string,
): Promise<Map<string, EntrySeal[]>> {
  const rows = await manager
    .createQueryBuilder(VersionEntryEntity, 'frozen')
    .innerJoin('frozen.calendarVersion', 'version')
    .leftJoin(EntryEntity, 'entry', 'entry.id = frozen.entryId')
    .select('frozen.entryId', 'entryId')
    .addSelect('frozen.salt', 'salt')
    .addSelect('frozen.hash', 'hash')
    .addSelect('MAX(version.number)', 'newest')
    .where('version.calendarId = :calendarId', { calendarId })
    .andWhere('(entry.restoredAt IS NULL OR version.submittedAt > entry.restoredAt)')
    .groupBy('frozen.entryId')
    .addGroupBy('frozen.salt')
    .addGroupBy('frozen.hash')
    .orderBy('newest', 'DESC')
    .getRawMany<{ entryId: string; salt: string; hash: string }>();
  const seals = new Map<string, EntrySeal[]>();
  for (const { entryId, salt, hash } of rows) {
    const known = seals.get(entryId);
    if (known) known.push({ salt, hash });
    else seals.set(entryId, [{ salt, hash }]);
  }
  return seals;
}
