import type { EntityManager } from 'typeorm';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import type { SeenThing } from '../../policy/entry-sight.js';

/** Which entries stand in which version, with the star or figure that each goes by. */
export async function frozenThings(
  manager: EntityManager,
  versionIds: readonly string[],
): Promise<Map<string, SeenThing[]>> {
  if (versionIds.length === 0) return new Map();
  const rows = await manager
    .createQueryBuilder(VersionEntryEntity, 'frozen')
    .select('frozen.versionId', 'versionId')
    .addSelect('frozen.entryId', 'entryId')
    .addSelect("JSON_VALUE(frozen.bodyText, '$.content.lead.markerKey')", 'markerKey')
    .addSelect("JSON_VALUE(frozen.bodyText, '$.content.lead.spec.markerKey')", 'specKey')
    .where('frozen.versionId IN (:...versionIds)', { versionIds })
    .getRawMany<{ versionId: string; entryId: string; markerKey: string | null; specKey: string | null }>();
  const things = new Map<string, SeenThing[]>(versionIds.map((id) => [id, []]));
  for (const { versionId, entryId, markerKey, specKey } of rows) {
    things.get(versionId)?.push({ entryId, markerKey: markerKey ?? specKey });
  }
  return things;
}
