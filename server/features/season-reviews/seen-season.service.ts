import { In, type EntityManager } from 'typeorm';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { entrySight } from '../../policy/entry-sight.js';
import { givenName } from '../../policy/giver-naming.js';
import type { Shared } from '../../policy/policy.js';
import type { Viewer } from '../../policy/viewer.js';
import { markerKeyOfLead } from '../calendars/sky-dates.service.js';

/** Entries of drafts, taken out or not, as far as one person sees them now. */
export interface SeenRows {
  row(entryId: string): EntryEntity | undefined;
  sharedOf(entryId: string): Shared | undefined;
}

export async function seenRows(
  manager: EntityManager,
  viewer: Viewer,
  entryIds: readonly string[],
): Promise<SeenRows> {
  if (entryIds.length === 0) return { row: () => undefined, sharedOf: () => undefined };
  const { communityId } = viewer;
  const rows = await manager.findBy(EntryEntity, { id: In([...entryIds]), calendar: { communityId } });
  const thingOf = ({ id, content }: EntryEntity) => ({
    entryId: id,
    markerKey: markerKeyOfLead(content.lead),
  });
  const sight = await entrySight(manager, viewer, rows.map(thingOf));
  const seen = new Map(
    rows.filter((row) => sight.appearance(thingOf(row)) === 'full').map((row) => [row.id, row]),
  );
  return { row: (id) => seen.get(id), sharedOf: (id) => sight.sharedOf(id) };
}

/** Whoever gave an entry is named beside what they say about it as they wish to be named beside the entry. */
export function namedBeside(
  viewer: Viewer,
  shared: Shared | undefined,
  personId: string,
  names: ReadonlyMap<string, string>,
): string {
  const name = names.get(personId) ?? '';
  return shared?.giverId === personId ? givenName(viewer, shared, name) : name;
}
