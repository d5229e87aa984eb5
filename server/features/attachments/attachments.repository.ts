import type { AttachmentSubject } from '#shared/contracts/attachments.js';
import type { EntityManager, FindOptionsWhere } from 'typeorm';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import { notFound } from '../../http/app-error.js';
import type { Actor } from '../../http/actor.js';
import { mayReadAttachment } from './attachment-access.service.js';

const WHOLE = { parts: true, words: { author: true } } as const;

/** Oldest first. */
export async function attachmentsOf(
  manager: EntityManager,
  communityId: string,
  { subjectType, subjectId }: AttachmentSubject,
): Promise<AttachmentEntity[]> {
  return manager.find(AttachmentEntity, {
    where: { communityId, subjectType, subjectId },
    relations: WHOLE,
    order: { addedAt: 'ASC', id: 'ASC' },
  });
}

/** One that the actor may know of; anything else is not there. */
export async function readable(
  manager: EntityManager,
  actor: Actor,
  attachmentId: string,
): Promise<AttachmentEntity> {
  const row = await findWhole(manager, { id: attachmentId });
  if (row === null || !(await mayReadAttachment(manager, actor, row))) throw notFound();
  return row;
}

/** What the actor has sent under an id of their own device. */
export async function sentBefore(
  manager: EntityManager,
  { communityId, person }: Actor,
  clientId: string,
): Promise<AttachmentEntity | null> {
  return findWhole(manager, { communityId, addedBy: person.id, clientId });
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
