import type { SharedItemType } from '#shared/contracts/sharing.js';
import type { EntityManager } from 'typeorm';
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
  if (itemType === 'attachment') return seesWhatItIsAbout(manager, viewer, itemId);
  if (itemType === 'story') return seesFigure(manager, viewer, itemId);
  if (itemType !== 'entry') return true;
  const entry = await manager.findOneBy(EntryEntity, { id: itemId });
  const figureId = entry === null ? null : figureIdOf(markerKeyOfLead(entry.content.lead));
  return figureId === null || seesFigure(manager, viewer, figureId);
}

async function seesFigure(manager: EntityManager, viewer: Viewer, figureId: string): Promise<boolean> {
  return maySee(viewer, (await sharedById(manager, 'figure', [figureId])).get(figureId));
}
