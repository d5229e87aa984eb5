import { In, type EntityManager } from 'typeorm';
import { AttachmentPartEntity } from '../../db/entities/attachment-part.entity.js';
import { AttachmentWordsEntity } from '../../db/entities/attachment-words.entity.js';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import type { AttachmentSubjectType } from '#shared/contracts/attachments.js';

/** Where the bytes of a removed attachment are kept, for whoever takes them away afterwards. */
export interface ErasedFiles {
  attachmentIds: string[];
  files: AttachmentPartEntity[];
}

/** Takes recordings and pictures of things out of the tables, with their written-out words. */
export async function eraseAttachmentsOf(
  manager: EntityManager,
  subjectType: AttachmentSubjectType,
  subjectIds: readonly string[],
): Promise<ErasedFiles> {
  if (subjectIds.length === 0) return { attachmentIds: [], files: [] };
  const rows = await manager.findBy(AttachmentEntity, { subjectType, subjectId: In([...subjectIds]) });
  return eraseAttachments(
    manager,
    rows.map(({ id }) => id),
  );
}

export async function hasSound(manager: EntityManager, attachmentId: string): Promise<boolean> {
  return manager.existsBy(AttachmentPartEntity, { attachmentId });
}

/** A recording from which something was written out. */
export async function keepsWords(manager: EntityManager, attachmentId: string): Promise<boolean> {
  return (
    (await manager.existsBy(AttachmentEntity, { id: attachmentId, kind: 'recording' })) &&
    (await manager.existsBy(AttachmentWordsEntity, { attachmentId }))
  );
}

/** Who speaks is said no more; what was said stays. */
export async function takeNameOffSpeaker(manager: EntityManager, attachmentId: string): Promise<void> {
  await manager.update(AttachmentEntity, { id: attachmentId }, { speaker: '' });
}

/** Takes the sound of a recording away, its spoken consent too; what was written out from it stays. */
export async function eraseSound(manager: EntityManager, attachmentId: string): Promise<ErasedFiles> {
  const files = await manager.findBy(AttachmentPartEntity, { attachmentId });
  await manager.delete(AttachmentPartEntity, { attachmentId });
  return { attachmentIds: [], files };
}

export async function eraseAttachments(
  manager: EntityManager,
  attachmentIds: string[],
): Promise<ErasedFiles> {
  if (attachmentIds.length === 0) return { attachmentIds, files: [] };
  const files = await manager.findBy(AttachmentPartEntity, { attachmentId: In(attachmentIds) });
  await manager.delete(AttachmentEntity, { id: In(attachmentIds) });
  return { attachmentIds, files };
}
