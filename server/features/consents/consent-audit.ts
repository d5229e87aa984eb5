import type { AuditAction } from '#shared/contracts/audit.js';
import type { SharingLevel } from '#shared/contracts/sharing.js';
import type { EntityManager } from 'typeorm';
import type { ConsentEntity } from '../../db/entities/consent.entity.js';
import type { Actor } from '../../http/actor.js';
import { recordAudit } from '../audit/audit.service.js';

export type ConsentAction = Extract<AuditAction, `consent-${string}`>;

/** Ids and codes only. The row is about the thing, so the records show it to those who may see that. */
export async function recordConsent(
  manager: EntityManager,
  at: Date,
  { communityId, person }: Actor,
  action: ConsentAction,
  { id, itemType, itemId, state }: ConsentEntity,
  level: SharingLevel,
): Promise<void> {
  await recordAudit(manager, {
    at,
    communityId,
    actorId: person.id,
    action,
    subjectType: itemType === 'story' ? 'figure' : itemType,
    subjectId: itemId,
    // Of a file the level says whom a row is for; everything else is looked up.
    details: { consentId: id, state, ...(itemType === 'attachment' ? { level } : {}) },
  });
}
