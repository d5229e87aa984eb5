import type { ReviewState } from '#shared/calendar/sign-off.js';
import type { EntityManager } from 'typeorm';
import { askedOnce } from '../../db/asked-once.js';
import { AnswerEntity } from '../../db/entities/answer.entity.js';
import type { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { keptEntryIds } from '../../policy/entry-sight.js';
import { conflict, notFound } from '../../http/app-error.js';
import { answersHashOf } from './answers-across-words.service.js';
import { thingOf } from './seen-content.service.js';
import { toVersionEntry } from './versions.mapper.js';
import { findVersion, frozenEntries, signaturesOf } from './versions.repository.js';

/**
 * Everything that decides whether a submission is signed off, as it stands in the database now. What is kept by its
 * people is not among the entries: they answer for it, and the village's signatures do not wait for it.
 */
export async function readReviewState(
  manager: EntityManager,
  version: CalendarVersionEntity,
): Promise<ReviewState> {
  const things = await frozenThings(manager, version.id);
  const entries = things.filter(({ isKept }) => !isKept);
  const kept = new Set(things.filter(({ isKept }) => isKept).map(({ entryId }) => entryId));
  const answers = await answersOf(manager, version.calendarId);
  return {
    rule: version.signOffRule,
    entries: entries.map(({ entryId, hash }) => ({ entryId, hash })),
    // What was said among an entry's people stays among them, also where the entry has become the village's since.
    answers: answers.filter(({ ofItsPeople, entryId }) => !ofItsPeople || kept.has(entryId)),
    signatures: await signaturesOf(manager, version.id),
    writerIds: new Set(version.writerIds),
  };
}

/** Everybody's words on the calendar's entries, in the order in which they were said. */
export function answersOf(manager: EntityManager, calendarId: string): Promise<AnswerEntity[]> {
  return askedOnce(manager, `answers ${calendarId}`, () =>
    manager.find(AnswerEntity, { where: { calendarId }, order: { answeredAt: 'ASC', id: 'ASC' } }),
  );
}

/** The frozen entries with the hashes of their answers, and which of them are kept by their people. */
async function frozenThings(
  manager: EntityManager,
  versionId: string,
): Promise<{ entryId: string; hash: string; isKept: boolean }[]> {
  const rows = await frozenEntries(manager, versionId);
  const things = rows.map((row) => ({ hash: answersHashOf(row), ...thingOf(toVersionEntry(row)) }));
  const kept = await keptEntryIds(manager, things);
  return things.map(({ entryId, hash }) => ({ entryId, hash, isKept: kept.has(entryId) }));
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
