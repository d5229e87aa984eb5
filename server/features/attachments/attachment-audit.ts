import type { AuditAction } from '#shared/contracts/audit.js';
import type { EntityManager } from 'typeorm';
import type { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import type { Actor } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';

/** Kind and level go into the record: by them the list of records knows whom a row is for. */
export async function recordAttachment(
  manager: EntityManager,
  clock: Clock,
  actor: Actor,
  action: Extract<AuditAction, `attachment-${string}`>,
  { id, kind, sharingLevel }: Pick<AttachmentEntity, 'id' | 'kind' | 'sharingLevel'>,
): Promise<void> {
  await recordAudit(manager, {
    at: clock.now(),
    communityId: actor.communityId,
    actorId: actor.person.id,
    action,
    subjectType: 'attachment',
    subjectId: id,
    details: { kind, level: sharingLevel },
  });
}
