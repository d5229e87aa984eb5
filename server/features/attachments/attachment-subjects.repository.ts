import type { AttachmentSubject, AttachmentSubjectType } from '#shared/contracts/attachments.js';
import { resolveMarker } from '#shared/sky/index.js';
import { In, IsNull, type EntityManager } from 'typeorm';
import { AnswerEntity } from '../../db/entities/answer.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { FigureEntity } from '../../db/entities/figure.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import { seesDrafts } from '../../http/actor.js';
import { entrySight } from '../../policy/entry-sight.js';
import { maySee } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import type { Viewer } from '../../policy/viewer.js';
import { markerKeyOfLead } from '../calendars/sky-dates.service.js';
import { readableConsent } from '../consents/readable-consent.service.js';
import { figuresSeenBy } from '../figures/village-figures.service.js';
import { readsNote } from '../notes/note-access.service.js';

type Look = (manager: EntityManager, viewer: Viewer, id: string) => Promise<boolean>;

/**
 * Drafts are for those who see drafts, what is in review for those who keep it, too; what stands in a published version
 * is for everybody, as far as its level goes.
 */
const looksAtEntry: Look = async (manager, viewer, id) => {
  const calendar = { communityId: viewer.communityId };
  const entry = await manager.findOneBy(EntryEntity, { id, calendar });
  if (entry === null) return false;
  const thing = { entryId: id, markerKey: markerKeyOfLead(entry.content.lead) };
  const sight = await entrySight(manager, viewer, [thing]);
  if (sight.appearance(thing) !== 'full') return false;
  if (seesDrafts(viewer) && entry.deletedAt === null) return true;
  const states = sight.isOfItsPeople(thing) ? (['published', 'in-review'] as const) : ['published' as const];
  const calendarVersion = { state: In(states), calendar };
  return manager.existsBy(VersionEntryEntity, { entryId: id, calendarVersion });
};

/** Whether the viewer is of the people who keep an entry that they may see; nothing else is kept by some. */
export async function keepsSubject(
  manager: EntityManager,
  viewer: Viewer,
  { subjectType, subjectId }: AttachmentSubject,
): Promise<boolean> {
  const calendar = { communityId: viewer.communityId };
  const entry =
    subjectType === 'entry' ? await manager.findOneBy(EntryEntity, { id: subjectId, calendar }) : null;
  if (entry === null) return false;
  const thing = { entryId: entry.id, markerKey: markerKeyOfLead(entry.content.lead) };
  return (await entrySight(manager, viewer, [thing])).isOfItsPeople(thing);
}

/** Whether each kind of thing is there, in the viewer's village, for the viewer to see. */
const LOOKS: Readonly<Record<AttachmentSubjectType, Look>> = {
  entry: looksAtEntry,
  figure: async (manager, viewer, id) => {
    const { communityId } = viewer;
    const isThere = await manager.existsBy(FigureEntity, { id, communityId, takenOutAt: IsNull() });
    return isThere && maySee(viewer, (await sharedById(manager, 'figure', [id])).get(id));
  },
  /** An elder's word is for whoever reviews, and never wider than its entry. */
  answer: async (manager, viewer, id) => {
    if (!seesDrafts(viewer)) return false;
    const calendar = { communityId: viewer.communityId };
    const answer = await manager.findOneBy(AnswerEntity, { id, calendar });
    return answer !== null && looksAtEntry(manager, viewer, answer.entryId);
  },
  /** The paper of a meeting shows what was said to each of its entries. */
  meeting: async (manager, viewer, id) => {
    if (!seesDrafts(viewer)) return false;
    const calendar = { communityId: viewer.communityId };
    const answers = await manager.findBy(AnswerEntity, { proof: 'paper', proofId: id, calendar });
    for (const { entryId } of answers) if (!(await looksAtEntry(manager, viewer, entryId))) return false;
    return answers.length > 0;
  },
  marker: async (manager, viewer, key) => resolveMarker(key, await figuresSeenBy(manager, viewer)) !== null,
  /** Proof of a consent is for those who read the consent. */
  consent: readableConsent,
  note: readsNote,
};

export async function maySeeSubject(
  manager: EntityManager,
  viewer: Viewer,
  { subjectType, subjectId }: AttachmentSubject,
): Promise<boolean> {
  return LOOKS[subjectType](manager, viewer, subjectId);
}
