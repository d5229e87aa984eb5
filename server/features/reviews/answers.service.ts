import { answeredCount, entryOutcome, type ReviewState } from '#shared/calendar/sign-off.js';
import type { AuditAction } from '#shared/contracts/audit.js';
import type { Answer, AnswerInput, ElderProgress, Outcome } from '#shared/contracts/reviews.js';
import type { VersionEntry } from '#shared/contracts/versions.js';
import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { AnswerEntity } from '../../db/entities/answer.entity.js';
import type { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { SignatureEntity } from '../../db/entities/signature.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { hasRole, type Actor } from '../../http/actor.js';
import { AppError, conflict, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { entrySight } from '../../policy/entry-sight.js';
import { viewerOf } from '../../policy/viewer.js';
import type { CardSignInService } from '../cards/card-sign-in.service.js';
import { recordAudit } from '../audit/audit.service.js';
import { lockCalendar } from '../calendars/draft.service.js';
import { personNames } from '../people/person-names.service.js';
import { frozenContent, frozenEntry, visibleVersion } from '../versions/frozen-content.service.js';
import { readReviewState, reviewedVersion } from '../versions/review-state.service.js';
import { seenOfVersion, thingOf } from '../versions/seen-content.service.js';
import { toAnswer } from './reviews.mapper.js';
import { elderIdsOf } from './reviews.repository.js';

export interface AnswerList {
  items: Answer[];
  nextCursor: null;
  progress: ElderProgress[];
  outcomes: Outcome[];
}

/** Where an answer belongs. */
interface Asked {
  manager: EntityManager;
  version: CalendarVersionEntity;
  entry: VersionEntryEntity;
}

/** Elders' words on entries. They belong to entry and content, and never move the state by themselves. */
export class AnswersService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly pins: Pick<CardSignInService, 'provePin'>,
  ) {}

  async list(actor: Actor, calendarId: string, number: number): Promise<AnswerList> {
    const { manager } = this.dataSource;
    const version = await visibleVersion(manager, actor, calendarId, number);
    const review = await readReviewState(manager, version);
    const seen = await this.seenEntries(manager, actor, version);
    const frozen = new Set(seen.map(({ entryId, hash }) => `${entryId} ${hash}`));
    const given = await manager.find(AnswerEntity, {
      where: { calendarId },
      order: { answeredAt: 'ASC', id: 'ASC' },
    });
    const rows = given.filter(({ entryId, entryHash }) => frozen.has(`${entryId} ${entryHash}`));
    const elderIds = await elderIdsOf(manager, actor.communityId);
    const names = await personNames(manager, [
      ...elderIds,
      ...review.signatures.map(({ personId }) => personId),
      ...rows.flatMap(({ elderId, recordedBy }) => [elderId, recordedBy]),
    ]);
    return {
      items: rows.map((row) => toAnswer(row, names, actor.person.id)),
      nextCursor: null,
      outcomes: seen.map(({ entryId, hash, variants = [] }) => ({
        entryId,
        outcome: entryOutcome({ entryId, hash }, review.answers, review.writerIds, variants.length > 0),
      })),
      progress: progressOf(review, elderIds, names).map((elder) =>
        elder.elderId === actor.person.id ? ownProgress(elder, seen, review) : elder,
      ),
    };
  }

  private async seenEntries(
    manager: EntityManager,
    actor: Actor,
    version: CalendarVersionEntity,
  ): Promise<VersionEntry[]> {
    const { header, entries } = await frozenContent(manager, version);
    const viewer = await viewerOf(manager, actor, this.clock.now());
    return (await seenOfVersion(manager, viewer, version, header, entries)).entries;
  }

  /**
   * For oneself as an elder; or for an elder: before a witness as an officer or steward, or with the elder's PIN. A PIN
   * is tried before anything else is done, so that a wrong one is counted.
   */
  async put(
    actor: Actor,
    calendarId: string,
    number: number,
    entryId: string,
    input: AnswerInput,
  ): Promise<Answer> {
    const elderId = input.onBehalfOf ?? actor.person.id;
    const onBehalf = elderId !== actor.person.id;
    const byPin = onBehalf && input.pin !== undefined;
    if (!byPin && !(onBehalf ? hasRole(actor, 'officer', 'steward') : hasRole(actor, 'elder'))) {
      throw new AppError('not-allowed');
    }
    if (byPin) await this.pins.provePin(actor.communityId, elderId, input.pin ?? '');
    return this.inReview(actor, calendarId, number, entryId, async (asked) => {
      const { manager } = asked;
      if (onBehalf && !(await elderIdsOf(manager, actor.communityId)).includes(elderId)) {
        throw conflict('not-an-elder');
      }
      await expectUnsigned(asked, elderId, onBehalf ? 'elder-has-signed' : 'already-signed');
      const before = await findAnswer(asked, elderId);
      // What an elder said with their own hand is not written over by somebody else's.
      if (onBehalf && before?.recordedBy === null) throw conflict('own-answer-stands');
      const row = manager.create(AnswerEntity, {
        id: before?.id ?? randomUUID(),
        calendarId,
        entryId,
        entryHash: asked.entry.hash,
        elderId,
        answer: input.answer,
        note: input.note,
        letStand: false,
        recordedBy: onBehalf ? actor.person.id : null,
        witness: onBehalf && !byPin ? input.witness : null,
        answeredAt: this.clock.now(),
      });
      await manager.save(AnswerEntity, row, { reload: false });
      await this.record(
        asked,
        actor,
        onBehalf ? 'answered-on-behalf' : 'answered',
        onBehalf
          ? { answer: input.answer, elderId, proof: byPin ? 'pin' : 'witness' }
          : { answer: input.answer },
      );
      return this.describe(manager, actor, row);
    });
  }

  async takeBack(actor: Actor, calendarId: string, number: number, entryId: string): Promise<void> {
    await this.inReview(actor, calendarId, number, entryId, async (asked) => {
      const row = await findAnswer(asked, actor.person.id);
      if (row === null) throw notFound();
      await expectUnsigned(asked, actor.person.id, 'already-signed');
      await asked.manager.delete(AnswerEntity, { id: row.id });
      await this.record(asked, actor, 'answer-taken-back', { answer: row.answer });
    });
  }

  /** Also open to an elder who has signed: it takes nothing back, it only stops being in the way. */
  async letStand(actor: Actor, calendarId: string, number: number, entryId: string): Promise<Answer> {
    return this.inReview(actor, calendarId, number, entryId, async (asked) => {
      const row = await findAnswer(asked, actor.person.id);
      if (row?.answer !== 'change-this') throw conflict('no-change-asked');
      if (!row.letStand) {
        row.letStand = true;
        await asked.manager.update(AnswerEntity, { id: row.id }, { letStand: true });
        await this.record(asked, actor, 'difference-let-stand', {});
      }
      return this.describe(asked.manager, actor, row);
    });
  }

  private inReview<T>(
    actor: Actor,
    calendarId: string,
    number: number,
    entryId: string,
    work: (asked: Asked) => Promise<T>,
  ): Promise<T> {
    return inTransaction(this.dataSource, async (manager) => {
      await lockCalendar(manager, calendarId);
      const version = await reviewedVersion(manager, calendarId, number);
      const entry = await manager.findOneBy(VersionEntryEntity, { versionId: version.id, entryId });
      if (entry === null || !(await this.sees(manager, actor, entry))) throw notFound();
      return work({ manager, version, entry });
    });
  }

  /** What somebody does not see is not there to be answered, by themselves or for others. */
  private async sees(manager: EntityManager, actor: Actor, entry: VersionEntryEntity): Promise<boolean> {
    const thing = thingOf(frozenEntry(entry));
    const sight = await entrySight(manager, await viewerOf(manager, actor, this.clock.now()), [thing]);
    return sight.appearance(thing) === 'full';
  }

  private async describe(manager: EntityManager, actor: Actor, row: AnswerEntity): Promise<Answer> {
    return toAnswer(row, await personNames(manager, [row.elderId, row.recordedBy]), actor.person.id);
  }

  private async record(
    { manager, version, entry }: Asked,
    actor: Actor,
    action: AuditAction,
    details: Record<string, unknown>,
  ): Promise<void> {
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType: 'entry',
      subjectId: entry.entryId,
      details: { calendarId: version.calendarId, number: version.number, ...details },
    });
  }
}

/** A signature says that its elder's answers are given; they stay as they were when it was given. */
async function expectUnsigned(
  { manager, version }: Asked,
  elderId: string,
  reason: 'already-signed' | 'elder-has-signed',
): Promise<void> {
  const signature = { versionId: version.id, personId: elderId, role: 'elder' as const };
  if (await manager.existsBy(SignatureEntity, signature)) throw conflict(reason);
}

async function findAnswer({ manager, entry }: Asked, elderId: string): Promise<AnswerEntity | null> {
  return manager.findOneBy(AnswerEntity, { entryId: entry.entryId, entryHash: entry.hash, elderId });
}

/** One's own count goes over everything that one sees, also what its people keep. */
function ownProgress(
  elder: ElderProgress,
  seen: readonly VersionEntry[],
  { answers }: ReviewState,
): ElderProgress {
  return { ...elder, answered: answeredCount(elder.elderId, seen, answers), of: seen.length };
}

/** Elders of today, and whoever signed as one and is none any more. */
function progressOf(
  review: ReviewState,
  elderIds: readonly string[],
  names: ReadonlyMap<string, string>,
): ElderProgress[] {
  const signed = new Set(
    review.signatures.filter(({ role }) => role === 'elder').map(({ personId }) => personId),
  );
  return [...new Set([...elderIds, ...signed])]
    .map((elderId) => ({
      elderId,
      elderName: names.get(elderId) ?? '',
      answered: answeredCount(elderId, review.entries, review.answers),
      of: review.entries.length,
      signed: signed.has(elderId),
      wroteTheDraft: review.writerIds.has(elderId),
    }))
    .sort((a, b) => (a.elderName === b.elderName ? 0 : a.elderName < b.elderName ? -1 : 1));
}
