import type { AuditEvent } from '#shared/contracts/audit.js';
import type { AuditEventEntity } from '../../db/entities/audit-event.entity.js';

export function toAuditEvent(
  row: AuditEventEntity,
  actorName: string,
  subjectName: string | null,
  isKept: boolean,
): AuditEvent {
  return {
    id: row.id,
    at: row.at.toISOString(),
    actorName,
    action: row.action,
    subjectName,
    isKept,
    details: row.details,
  };
}
