import type { AttachmentSubject, AttachmentSubjectType } from '#shared/contracts/attachments.js';
import { resolveMarker } from '#shared/sky/index.js';
import { IsNull, type EntityManager } from 'typeorm';
import { AnswerEntity } from '../../db/entities/answer.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { FigureEntity } from '../../db/entities/figure.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import { seesDrafts, type Actor } from '../../http/actor.js';
import { readableConsent } from '../consents/readable-consent.service.js';
import { everyVillageFigure } from '../figures/village-figures.service.js';

type Look = (manager: EntityManager, actor: Actor, id: string) => Promise<boolean>;

/** Whether each kind of thing is there, in the actor's village, for the actor to see. */
const LOOKS: Readonly<Record<AttachmentSubjectType, Look>> = {
  /** Drafts are for those who see drafts; what stands in a published version is for everybody. */
  entry: async (manager, actor, id) => {
    const ofVillage = { communityId: actor.communityId };
    const inDraft =
      seesDrafts(actor) &&
      (await manager.existsBy(EntryEntity, { id, deletedAt: IsNull(), calendar: ofVillage }));
    return (
      inDraft ||
      (await manager.existsBy(VersionEntryEntity, {
        entryId: id,
        calendarVersion: { state: 'published', calendar: ofVillage },
      }))
    );
  },
  figure: (manager, { communityId }, id) =>
    manager.existsBy(FigureEntity, { id, communityId, takenOutAt: IsNull() }),
  answer: async (manager, actor, id) =>
    seesDrafts(actor) &&
    (await manager.existsBy(AnswerEntity, { id, calendar: { communityId: actor.communityId } })),
  marker: async (manager, { communityId }, key) =>
    resolveMarker(key, await everyVillageFigure(manager, communityId)) !== null,
  /** Proof of a consent is for those who read the consent. */
  consent: async (manager, actor, id) => readableConsent(manager, actor, id, new Date()),
};

export async function maySeeSubject(
  manager: EntityManager,
  actor: Actor,
  { subjectType, subjectId }: AttachmentSubject,
): Promise<boolean> {
  return LOOKS[subjectType](manager, actor, subjectId);
}
