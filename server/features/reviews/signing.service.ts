import { signingObstacle, signOffGaps } from '#shared/calendar/sign-off.js';
import type { AuditAction } from '#shared/contracts/audit.js';
import type { SignatureRole } from '#shared/calendar/sign-off.js';
import type { Version } from '#shared/contracts/versions.js';
import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { SignatureEntity } from '../../db/entities/signature.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { hasRole, type Actor } from '../../http/actor.js';
import { AppError, conflict } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import { lockCalendar } from '../calendars/draft.service.js';
import { reviewedVersion, readReviewState } from '../versions/review-state.service.js';
import type { VersionsService } from '../versions/versions.service.js';

/** The only act by which a submission becomes signed off. */
export class SigningService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly versions: VersionsService,
  ) {}

  async sign(actor: Actor, calendarId: string, number: number, role: SignatureRole): Promise<Version> {
    if (!hasRole(actor, role)) throw new AppError('not-allowed');
    return inTransaction(this.dataSource, async (manager) => {
      await lockCalendar(manager, calendarId);
      const version = await reviewedVersion(manager, calendarId, number);
      const signer = { personId: actor.person.id, role };
      const obstacle = signingObstacle(signer, await readReviewState(manager, version), true);
      if (obstacle !== null) throw conflict(obstacle);
      await manager.insert(SignatureEntity, {
        id: randomUUID(),
        versionId: version.id,
        ...signer,
        signedAt: this.clock.now(),
      });
      await this.record(manager, actor, version, 'signed', { role });
      if (signOffGaps(await readReviewState(manager, version)).length === 0) {
        version.state = 'signed-off';
        await manager.update(CalendarVersionEntity, { id: version.id }, { state: version.state });
        await this.record(manager, actor, version, 'signed-off', {});
      }
      return this.versions.describe(manager, actor, version);
    });
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    version: CalendarVersionEntity,
    action: AuditAction,
    details: Record<string, unknown>,
  ): Promise<void> {
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType: 'version',
      subjectId: version.id,
      details: { calendarId: version.calendarId, number: version.number, ...details },
    });
  }
}
