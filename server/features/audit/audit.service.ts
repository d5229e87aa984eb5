import type { AuditAction } from '#shared/contracts/audit.js';
import { randomUUID } from 'node:crypto';
import type { EntityManager, QueryDeepPartialEntity } from 'typeorm';
import { AuditEventEntity } from '../../db/entities/audit-event.entity.js';

export interface AuditRecord {
  at: Date;
  communityId: string | null;
  actorId: string | null;
  /** For whom, where it was not for themself; whoever helps is named by the gate. */
  onBehalfOf?: string | null;
  action: AuditAction;
  subjectType: AuditEventEntity['subjectType'];
  subjectId: string | null;
  /** Codes, ids and numbers only: never words that people gave. */
  details?: Record<string, unknown>;
}

/** Writes down what happened, in the same transaction as the change itself. */
export async function recordAudit(manager: EntityManager, record: AuditRecord): Promise<void> {
  const { details = {}, ...rest } = record;
  await manager
    .createQueryBuilder()
    .insert()
    .into(AuditEventEntity)
    .values({ id: randomUUID(), ...rest, details } as QueryDeepPartialEntity<AuditEventEntity>)
    .updateEntity(false)
    .execute();
}
