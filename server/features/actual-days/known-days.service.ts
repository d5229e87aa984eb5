import type { ActualDays } from '#shared/contracts/actual-days.js';
import { In, type EntityManager } from 'typeorm';
import { ActualDateEntity } from '../../db/entities/actual-date.entity.js';
import { personNames } from '../people/person-names.service.js';

/** What was really done, by entry. */
export async function actualRows(
  manager: EntityManager,
  entryIds: readonly string[],
): Promise<Map<string, ActualDateEntity>> {
  if (entryIds.length === 0) return new Map();
  const rows = await manager.findBy(ActualDateEntity, { entryId: In([...entryIds]) });
  return new Map(rows.map((row) => [row.entryId, row]));
}

/** The same for people to read. */
export async function actualDaysOf(
  manager: EntityManager,
  entryIds: readonly string[],
): Promise<Map<string, ActualDays>> {
  const rows = [...(await actualRows(manager, entryIds)).values()];
  const names = await personNames(
    manager,
    rows.map(({ typedBy }) => typedBy),
  );
  return new Map(
    rows.map(({ entryId, firstDay, lastDay, saidBy, plots, typedBy, typedAt }) => [
      entryId,
      {
        ...{ from: firstDay, to: lastDay, saidBy, plots },
        ...{ typedBy: names.get(typedBy) ?? '', typedAt: typedAt.toISOString() },
      },
    ]),
  );
}
