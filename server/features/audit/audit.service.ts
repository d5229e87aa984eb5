import type { AuditAction } from '#shared/contracts/audit.js';
import { randomUUID } from 'node:crypto';
import type { EntityManager, QueryDeepPartialEntity } from 'typeorm';
import { AuditEventEntity } from '../../db/entities/audit-event.entity.js';
import { handNow } from '../../http/actor.js';

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
  const { details = {}, actorId, ...rest } = record;
  const hand = handNow();
  const isHelper = hand !== undefined && (actorId === hand.personId || actorId === hand.helperId);
  const who = isHelper
    ? { actorId: hand.helperId, onBehalfOf: rest.onBehalfOf ?? hand.personId }
    : { actorId, onBehalfOf: rest.onBehalfOf ?? null };
  await manager
    .createQueryBuilder()
    .insert()
    .into(AuditEventEntity)
    .values({ id: randomUUID(), ...rest, ...who, details } as QueryDeepPartialEntity<AuditEventEntity>)
    .updateEntity(false)
    .execute();
}
