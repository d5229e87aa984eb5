import type { SharedItemType } from '#shared/contracts/sharing.js';
import { In, type EntityManager } from 'typeorm';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { figureIdOf } from '../../policy/entry-sight.js';
import { maySee } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import type { Viewer } from '../../policy/viewer.js';
import { seesWhatItIsAbout } from '../attachments/attachment-access.service.js';
import { markerKeyOfLead } from '../calendars/sky-dates.service.js';

/**
 * Whether what a thing hangs on is there for this person: an entry is no wider than the village's figure that it goes
 * by, a story is nothing without its figure, nor a voice or a picture without its subject. The thing's own level is
 * asked about elsewhere.
 */
export async function isWithinSight(
  manager: EntityManager,
  viewer: Viewer,
  { itemType, itemId }: { itemType: SharedItemType; itemId: string },
): Promise<boolean> {
  return (await withinSight(manager, viewer, itemType, [itemId])).has(itemId);
}

/** The same for many things of one kind: those whose ground is there for this person. */
export async function withinSight(
  manager: EntityManager,
  viewer: Viewer,
  itemType: SharedItemType,
  itemIds: readonly string[],
): Promise<Set<string>> {
  if (itemType === 'entry') return entriesWithinSight(manager, viewer, itemIds);
  const within = new Set<string>();
  for (const id of itemIds) {
    const isThere =
      itemType === 'attachment'
        ? await seesWhatItIsAbout(manager, viewer, id)
        : itemType !== 'story' || (await seesFigure(manager, viewer, id));
    if (isThere) within.add(id);
  }
  return within;
}

async function entriesWithinSight(
  manager: EntityManager,
  viewer: Viewer,
  entryIds: readonly string[],
): Promise<Set<string>> {
  const within = new Set(entryIds);
  if (within.size === 0) return within;
  const entries = await manager.find(EntryEntity, {
    where: { id: In([...within]) },
    select: { id: true, content: true },
  });
  for (const { id, content } of entries) {
    const figureId = figureIdOf(markerKeyOfLead(content.lead));
    if (figureId !== null && !(await seesFigure(manager, viewer, figureId))) within.delete(id);
  }
  return within;
}

async function seesFigure(manager: EntityManager, viewer: Viewer, figureId: string): Promise<boolean> {
  return maySee(viewer, (await sharedById(manager, 'figure', [figureId])).get(figureId));
}
