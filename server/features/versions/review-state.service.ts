import type { ReviewState } from '#shared/calendar/sign-off.js';
import type { EntityManager } from 'typeorm';
import { AnswerEntity } from '../../db/entities/answer.entity.js';
import type { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import { conflict, notFound } from '../../http/app-error.js';
import { findVersion, signaturesOf } from './versions.repository.js';

/** Everything that decides whether a submission is signed off, as it stands in the database now. */
export async function readReviewState(
  manager: EntityManager,
  version: CalendarVersionEntity,
): Promise<ReviewState> {
  const entries = await manager.find(VersionEntryEntity, {
    where: { versionId: version.id },
    select: { id: true, entryId: true, hash: true },
    order: { position: 'ASC' },
  });
  return {
    rule: version.signOffRule,
    entries: entries.map(({ entryId, hash }) => ({ entryId, hash })),
    answers: await manager.findBy(AnswerEntity, { calendarId: version.calendarId }),
    signatures: await signaturesOf(manager, version.id),
    writerIds: new Set(version.writerIds),
  };
}

/** The submission, if it can be answered and signed now. */
export async function reviewedVersion(
  manager: EntityManager,
  calendarId: string,
  number: number,
): Promise<CalendarVersionEntity> {
  const version = await findVersion(manager, calendarId, number);
  if (version === null) throw notFound();
  if (version.state !== 'in-review') throw conflict('not-in-review');
  return version;
}
