import type { EntityManager } from 'typeorm';
import type { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import { hasRole, type Actor } from '../../http/actor.js';
import { maySeeSubject } from './attachment-subjects.repository.js';

type Row = Pick<
  AttachmentEntity,
  'communityId' | 'subjectType' | 'subjectId' | 'sharingLevel' | 'addedBy' | 'kind' | 'parts'
>;

/**
 * Whether somebody may know of an attachment at all. It shows no more than what it belongs to, and no more than its
 * own level; a recording of which only the spoken consent has come is its sender's alone.
 */
export async function mayReadAttachment(manager: EntityManager, actor: Actor, row: Row): Promise<boolean> {
  if (row.communityId !== actor.communityId) return false;
  const isOwn = row.addedBy === actor.person.id;
  const isWhole = row.kind === 'picture' || row.parts.some(({ part }) => part > 0);
  const fitsLevel = row.sharingLevel === 'village' || hasRole(actor, 'elder');
  return (isOwn || (isWhole && fitsLevel)) && (await maySeeSubject(manager, actor, row));
}

/** The spoken consent is proof for those who keep the village's word, and for whoever brought it. */
export function mayHearConsent(actor: Actor, { addedBy }: Pick<Row, 'addedBy'>): boolean {
  return addedBy === actor.person.id || hasRole(actor, 'elder', 'steward', 'officer');
}

export function mayWriteWords(actor: Actor): boolean {
  return hasRole(actor, 'officer', 'elder', 'steward');
}

export function mayChange(actor: Actor, { addedBy }: Pick<Row, 'addedBy'>): boolean {
  return addedBy === actor.person.id;
}
