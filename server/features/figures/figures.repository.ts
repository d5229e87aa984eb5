import { IsNull, Raw, type EntityManager } from 'typeorm';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { FigureEntity } from '../../db/entities/figure.entity.js';

/** In the order in which they were named: the village's own word, as people sort it. */
export async function figureRows(
  manager: EntityManager,
  communityId: string,
  takenOutToo: boolean,
): Promise<FigureEntity[]> {
  const rows = await manager.find(FigureEntity, {
    where: takenOutToo ? { communityId } : { communityId, takenOutAt: IsNull() },
  });
  const nameOf = ({ names }: FigureEntity) => names[0]?.name ?? '';
  return rows.sort((a, b) => nameOf(a).localeCompare(nameOf(b)) || a.id.localeCompare(b.id));
}

/**
 * Entries of the community's drafts that go by a marker, by its first and last days or by another sign of it; by year and
 * place; without those that were taken out.
 */
export async function entriesThatGoBy(
  manager: EntityManager,
  communityId: string,
  markerKey: string,
): Promise<EntryEntity[]> {
  const entries = await draftEntriesThatGoBy(manager, communityId, markerKey);
  return entries.filter(({ deletedAt }) => deletedAt === null);
}

/** The same with those that were taken out. */
export async function draftEntriesThatGoBy(
  manager: EntityManager,
  communityId: string,
  markerKey: string,
): Promise<EntryEntity[]> {
  return manager.find(EntryEntity, {
    where: {
      calendar: { communityId },
      content: Raw(
        (column) =>
          `:markerKey IN (JSON_VALUE(${column}, '$.lead.markerKey'), JSON_VALUE(${column}, '$.lead.spec.markerKey'))`,
        { markerKey },
      ),
    },
    relations: { calendar: { place: true } },
    order: { calendar: { year: 'DESC' }, position: 'ASC' },
  });
}
