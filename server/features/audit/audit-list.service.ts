import type { AuditEvent } from '#shared/contracts/audit.js';
import type { PageQuery } from '#shared/contracts/common.js';
import type { DataSource } from 'typeorm';
import type { Actor } from '../../http/actor.js';
import { invalidField } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { viewerOf } from '../../policy/viewer.js';
import { personNames } from '../people/person-names.service.js';
import { toAuditEvent } from './audit.mapper.js';
import { auditPage, subjectAppearances, subjectNames } from './audit.repository.js';

const PAGE_LENGTH = 50;

export interface AuditPage {
  items: AuditEvent[];
  nextCursor: string | null;
}

export class AuditListService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  /** Names are looked up now: the rows hold ids and codes only. The cursor is the last row's place in the order. */
  async list(actor: Actor, { cursor, limit = PAGE_LENGTH }: PageQuery): Promise<AuditPage> {
    if (cursor !== undefined && !/^\d{1,19}$/u.test(cursor)) throw invalidField('cursor', 'unknown');
    const { manager } = this.dataSource;
    const rows = await auditPage(manager, actor.communityId, cursor ?? null, limit + 1);
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const appears = await subjectAppearances(manager, viewer, rows);
    const page = rows.slice(0, limit).filter((row) => appears(row) !== 'none');
    const actors = await personNames(
      manager,
      page.flatMap(({ actorId, onBehalfOf }) => [actorId, onBehalfOf]),
    );
    const subjects = await subjectNames(manager, page);
    return {
      items: page.map((row) =>
        toAuditEvent(
          row,
          row.actorId === null ? '' : (actors.get(row.actorId) ?? ''),
          row.onBehalfOf === null ? null : (actors.get(row.onBehalfOf) ?? ''),
          row.subjectId === null || appears(row) !== 'full' ? null : (subjects.get(row.subjectId) ?? null),
          appears(row) === 'blank',
        ),
      ),
      nextCursor: rows.length > limit ? (rows[limit - 1]?.sequence ?? null) : null,
    };
  }
}
