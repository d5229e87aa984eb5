import type { EntityManager } from 'typeorm';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import { maySee, type Shared } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import type { Viewer } from '../../policy/viewer.js';
import { maySeeSubject } from './attachment-subjects.repository.js';

/** An attachment that somebody may know of, with what the policy knows about it. */
export interface SeenAttachment {
  row: AttachmentEntity;
  shared: Shared;
}

/**
 * Those of the rows that somebody may know of at all. An attachment shows no more than what it belongs to, and no more
 * than its own level; a recording of which only the spoken consent has come is its sender's alone.
 */
export async function seenAttachments(
  manager: EntityManager,
  viewer: Viewer,
  rows: readonly AttachmentEntity[],
): Promise<SeenAttachment[]> {
  const shared = await sharedById(
    manager,
    'attachment',
    rows.map(({ id }) => id),
  );
  const seen: SeenAttachment[] = [];
  for (const row of rows) {
    const own = shared.get(row.id);
    if (own === undefined || !maySee(viewer, own)) continue;
    if (!isWhole(row) && row.addedBy !== viewer.personId) continue;
    if (await maySeeSubject(manager, viewer, row)) seen.push({ row, shared: own });
  }
  return seen;
}

/** An attachment is nowhere without what it belongs to, whatever its own level says. */
export async function seesWhatItIsAbout(
  manager: EntityManager,
  viewer: Viewer,
  attachmentId: string,
): Promise<boolean> {
  const row = await manager.findOneBy(AttachmentEntity, { id: attachmentId });
  return row !== null && maySeeSubject(manager, viewer, row);
}

function isWhole(row: AttachmentEntity): boolean {
  return row.kind === 'picture' || row.parts.some(({ part }) => part > 0) || hasWordsAlone(row);
}

/** Its sound was removed; what was written out from it stayed. */
export function hasWordsAlone({ kind, parts }: AttachmentEntity): boolean {
  return kind === 'recording' && parts.length === 0;
}

/** The spoken consent is proof for those who keep the village's word, and for whoever gave or brought it. */
export function mayHearConsent(viewer: Viewer, seen: SeenAttachment): boolean {
  return mayRemove(viewer, seen) || keepsVillagesWord(viewer);
}

/** Those who keep the village’s word, and givers their own: they correct what was written from their voice. */
export function mayWriteWords(viewer: Viewer, { shared }: SeenAttachment): boolean {
  return shared.giverId === viewer.personId || keepsVillagesWord(viewer);
}

function keepsVillagesWord({ roles }: Viewer): boolean {
  return roles.includes('officer') || roles.includes('elder') || roles.includes('steward');
}

/** Whoever brought it, and whose it is: taking back is as easy as giving. */
export function mayRemove({ personId }: Viewer, { row, shared }: SeenAttachment): boolean {
  return row.addedBy === personId || shared.giverId === personId;
}
