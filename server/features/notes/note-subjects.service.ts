import type { NoteSubject } from '#shared/contracts/notes.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import { resolveMarker } from '#shared/sky/index.js';
import { IsNull, type EntityManager } from 'typeorm';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { FigureEntity } from '../../db/entities/figure.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import { seesDrafts, type Actor } from '../../http/actor.js';
import { entrySight } from '../../policy/entry-sight.js';
import { isKept, maySee } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import type { Viewer } from '../../policy/viewer.js';
import { markerKeyOfLead } from '../calendars/sky-dates.service.js';
import { figuresSeenBy } from '../figures/village-figures.service.js';

/** Is the thing there, in the actor's village, for the actor to see now? */
export async function seesNoteSubject(
  manager: EntityManager,
  actor: Actor,
  viewer: Viewer,
  { subjectType, subjectId }: NoteSubject,
): Promise<boolean> {
  switch (subjectType) {
    case 'entry':
      return seesEntry(manager, actor, viewer, subjectId);
    case 'figure': {
      const { communityId } = actor;
      const isThere = await manager.existsBy(FigureEntity, {
        id: subjectId,
        communityId,
        takenOutAt: IsNull(),
      });
      return isThere && maySee(viewer, (await sharedById(manager, 'figure', [subjectId])).get(subjectId));
    }
    case 'marker':
      return resolveMarker(subjectId, await figuresSeenBy(manager, viewer)) !== null;
  }
}

/** Drafts and reviews are for those who see them, and what is kept there for its people, too. */
async function seesEntry(
  manager: EntityManager,
  actor: Actor,
  viewer: Viewer,
  entryId: string,
): Promise<boolean> {
  const calendar = { communityId: actor.communityId };
  const drafted = await manager.findOneBy(EntryEntity, { id: entryId, deletedAt: IsNull(), calendar });
  const published = await manager.findOneBy(VersionEntryEntity, {
    entryId,
    stands: true,
    calendarVersion: { state: 'published', calendar },
  });
  const shared = (await sharedById(manager, 'entry', [entryId])).get(entryId);
  const isOpenToThem = seesDrafts(actor) || (shared !== undefined && isKept(shared));
  const leads = [
    ...(drafted !== null && isOpenToThem ? [drafted.content.lead] : []),
    ...(published === null ? [] : [(JSON.parse(published.bodyText) as VersionEntryBody).content.lead]),
  ];
  const things = leads.map((lead) => ({ entryId, markerKey: markerKeyOfLead(lead) }));
  const sight = await entrySight(manager, viewer, things);
  return things.some((thing) => sight.appearance(thing) === 'full');
}
