import type { AuditAction } from '#shared/contracts/audit.js';
import type { EntityManager } from 'typeorm';
import type { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import type { Actor } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';

/** The kind goes into the record: the sentence says "a recording" or "a picture" and never what it is called. */
export async function recordAttachment(
  manager: EntityManager,
  clock: Clock,
  actor: Actor,
  action: Extract<AuditAction, `attachment-${string}`>,
  { id, kind }: Pick<AttachmentEntity, 'id' | 'kind'>,
): Promise<void> {
  await recordAudit(manager, {
    at: clock.now(),
    communityId: actor.communityId,
    actorId: actor.person.id,
    action,
    subjectType: 'attachment',
    subjectId: id,
    details: { kind },
  });
}
