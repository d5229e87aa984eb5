import type { AuditEvent } from '#shared/contracts/audit.js';
import type { PageQuery } from '#shared/contracts/common.js';
import type { DataSource } from 'typeorm';
import { hasRole, type Actor } from '../../http/actor.js';
import { invalidField } from '../../http/app-error.js';
import { personNames } from '../people/person-names.service.js';
import { toAuditEvent } from './audit.mapper.js';
import { auditPage, subjectNames } from './audit.repository.js';

const PAGE_LENGTH = 50;

export interface AuditPage {
  items: AuditEvent[];
  nextCursor: string | null;
}

export class AuditListService {
  constructor(private readonly dataSource: DataSource) {}

  /** Names are looked up now: the rows hold ids and codes only. The cursor is the last row's place in the order. */
  async list(actor: Actor, { cursor, limit = PAGE_LENGTH }: PageQuery): Promise<AuditPage> {
    if (cursor !== undefined && !/^\d{1,19}$/u.test(cursor)) throw invalidField('cursor', 'unknown');
    const { manager } = this.dataSource;
    const reader = {
      communityId: actor.communityId,
      personId: actor.person.id,
      isElder: hasRole(actor, 'elder'),
    };
    const rows = await auditPage(manager, reader, cursor ?? null, limit + 1);
    const page = rows.slice(0, limit);
    const actors = await personNames(
      manager,
      page.map(({ actorId }) => actorId),
    );
    const subjects = await subjectNames(manager, page);
    return {
      items: page.map((row) =>
        toAuditEvent(
          row,
          row.actorId === null ? '' : (actors.get(row.actorId) ?? ''),
          row.subjectId === null ? null : (subjects.get(row.subjectId) ?? null),
        ),
      ),
      nextCursor: rows.length > limit ? (page.at(-1)?.sequence ?? null) : null,
    };
  }
}
