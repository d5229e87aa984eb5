import { In, type EntityManager } from 'typeorm';
import { PersonEntity } from '../../db/entities/person.entity.js';

/** Names by id, looked up now; an id that nobody has any more is missing. */
export async function personNames(
  manager: EntityManager,
  personIds: Iterable<string | null>,
): Promise<Map<string, string>> {
  const ids = [...new Set(personIds)].filter((id) => id !== null);
  if (ids.length === 0) return new Map();
  const people = await manager.find(PersonEntity, {
    where: { id: In(ids) },
    select: { id: true, displayName: true },
  });
  return new Map(people.map((person) => [person.id, person.displayName]));
}
