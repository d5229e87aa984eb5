import type { AttachmentSubject } from '#shared/contracts/attachments.js';
import type { EntityManager, FindOptionsWhere } from 'typeorm';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import { notFound } from '../../http/app-error.js';
import type { Actor } from '../../http/actor.js';
import type { Viewer } from '../../policy/viewer.js';
import { seenAttachments, type SeenAttachment } from './attachment-access.service.js';

const WHOLE = { parts: true, words: { author: true } } as const;

/** Of one thing, oldest first, as far as the viewer may know of them. */
export async function attachmentsOf(
  manager: EntityManager,
  viewer: Viewer,
  { subjectType, subjectId }: AttachmentSubject,
): Promise<SeenAttachment[]> {
  const rows = await manager.find(AttachmentEntity, {
    where: { communityId: viewer.communityId, subjectType, subjectId },
    relations: WHOLE,
    order: { addedAt: 'ASC', id: 'ASC' },
  });
  return seenAttachments(manager, viewer, rows);
}

/** One that the viewer may know of; anything else is not there. */
export async function readable(
  manager: EntityManager,
  viewer: Viewer,
  attachmentId: string,
): Promise<SeenAttachment> {
  const row = await findWhole(manager, { id: attachmentId });
  const [seen] = row === null ? [] : await seenAttachments(manager, viewer, [row]);
  if (seen === undefined) throw notFound();
  return seen;
}

/** What the actor has sent under an id of their own device. */
export async function sentBefore(
  manager: EntityManager,
  { communityId, person }: Actor,
  clientId: string,
): Promise<AttachmentEntity | null> {
  return findWhole(manager, { communityId, addedBy: person.id, clientId });
}

/** What the actor has begun to send, whoever may see it. */
export async function ownAttachment(
  manager: EntityManager,
  { communityId, person }: Actor,
  id: string,
): Promise<AttachmentEntity | null> {
  return findWhole(manager, { id, communityId, addedBy: person.id });
}

async function findWhole(
  manager: EntityManager,
  where: FindOptionsWhere<AttachmentEntity>,
): Promise<AttachmentEntity | null> {
  return manager.findOne(AttachmentEntity, { where, relations: WHOLE });
}

/** Parts and words come and go one after the other; what is gone meanwhile is not there. */
export async function lockAttachment(manager: EntityManager, id: string): Promise<void> {
  const row = await manager.findOne(AttachmentEntity, { where: { id }, lock: { mode: 'pessimistic_write' } });
  if (row === null) throw notFound();
}
