import type { AuditEvent } from '#shared/contracts/audit.js';
import type { AuditEventEntity } from '../../db/entities/audit-event.entity.js';

export function toAuditEvent(
  row: AuditEventEntity,
  actorName: string,
  onBehalfOfName: string | null,
  subjectName: string | null,
  isKept: boolean,
): AuditEvent {
  return {
    id: row.id,
    at: row.at.toISOString(),
    actorName,
    ...(onBehalfOfName === null ? {} : { onBehalfOfName }),
    action: row.action,
    subjectName,
    isKept,
    details: row.details,
  };
}
