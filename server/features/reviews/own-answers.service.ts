import type { AuditAction } from '#shared/contracts/audit.js';
import type { OwnAnswer, OwnAnswerInput, OwnEntries } from '#shared/contracts/reviews.js';
import { randomUUID } from 'node:crypto';
import { In, type DataSource, type EntityManager } from 'typeorm';
import { AnswerEntity } from '../../db/entities/answer.entity.js';
import { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { CommunityEntity } from '../../db/entities/community.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { hasRole, type Actor } from '../../http/actor.js';
import { conflict, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { viewerOf, type Viewer } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import { recordKeptReads } from '../audit/kept-reads.service.js';
import { lockCalendar } from '../calendars/draft.service.js';
import { bodyOf } from '../versions/frozen-content.service.js';
import { ownEntriesOf, type OwnEntries as Kept } from '../versions/own-entries.service.js';
import { evidenceOf } from './answer-evidence.js';
import { expectSpoken } from './answer-writing.js';
import { toOwnAnswer } from './reviews.mapper.js';

/** How far somebody is with the entries of a submission that they keep with others. */
export interface OwnProgress {
  calendarId: string;
  number: number;
  answered: number;
  of: number;
}

/**
 * Whoever keeps an entry answers for it, whatever their role. They see those entries alone: for everybody who keeps
 * nothing, for other states and for numbers that do not exist the answer is the same empty list.
 */
export class OwnAnswersService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async read(actor: Actor, calendarId: string, number: number): Promise<OwnEntries> {
    const { manager } = this.dataSource;
    const { year, place } = await manager.findOneOrFail(CalendarEntity, {
      where: { id: calendarId },
      relations: { place: true },
    });
    const village = await manager.findOneByOrFail(CommunityEntity, { id: actor.communityId });
    const version = await manager.findOneBy(CalendarVersionEntity, { calendarId, number });
    const kept = version?.state === 'in-review' ? await this.keptIn(manager, actor, version) : null;
    const entries = kept?.entries ?? [];
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const ids = entries.map(({ entryId }) => entryId);
    await recordKeptReads(manager, viewer, this.clock.now(), 'entry', ids);
    const given = await ownAnswers(manager, actor.person.id, entries);
    const evidence = await evidenceOf(manager, viewer, [...given.values()]);
    return {
      year,
      placeName: place.name,
      villageLanguage: { tag: village.villageLanguageTag, name: village.villageLanguageName },
      officerLanguage: { tag: village.officerLanguageTag, name: village.officerLanguageName },
      markers: kept === null ? [] : kept.header.markers,
      items: entries.map((entry) => {
        const answer = given.get(entry.entryId);
        return {
          entry: bodyOf(entry),
          answer: answer === undefined ? null : toOwnAnswer(answer, evidence(answer)),
        };
      }),
    };
  }

  async put(
    actor: Actor,
    calendarId: string,
    number: number,
    entryId: string,
    { answer, note, recordingId = null }: OwnAnswerInput,
  ): Promise<OwnAnswer> {
    return this.inReview(actor, calendarId, number, entryId, async (manager, entry, before) => {
      if (recordingId !== null) {
        await expectSpoken({ manager, entry: { entryId } }, actor.communityId, actor.person.id, recordingId);
      }
      const row = manager.create(AnswerEntity, {
        id: before?.id ?? randomUUID(),
        ...{ calendarId, entryId, entryHash: entry.answersHash, elderId: actor.person.id },
        ...{
          answer,
          note,
          letStand: false,
          recordedBy: null,
          witness: null,
          recordingId,
          proof: null,
          proofId: null,
        },
        ofItsPeople: !hasRole(actor, 'elder'),
        answeredAt: this.clock.now(),
      });
      await manager.save(AnswerEntity, row, { reload: false });
      await this.record(manager, actor, 'answered', entryId, { calendarId, number, answer });
      return this.describe(manager, actor, row);
    });
  }

  /** As for elders: it takes nothing back, it only stops being in the way. */
  async letStand(actor: Actor, calendarId: string, number: number, entryId: string): Promise<OwnAnswer> {
    return this.inReview(actor, calendarId, number, entryId, async (manager, _entry, row) => {
      if (row?.answer !== 'change-this') throw conflict('no-change-asked');
      if (!row.letStand) {
        row.letStand = true;
        await manager.update(AnswerEntity, { id: row.id }, { letStand: true });
        await this.record(manager, actor, 'difference-let-stand', entryId, { calendarId, number });
      }
      return this.describe(manager, actor, row);
    });
  }

  async takeBack(actor: Actor, calendarId: string, number: number, entryId: string): Promise<void> {
    await this.inReview(actor, calendarId, number, entryId, async (manager, _entry, before) => {
      if (before === undefined) throw notFound();
      await manager.delete(AnswerEntity, { id: before.id });
      await this.record(manager, actor, 'answer-taken-back', entryId, {
        ...{ calendarId, number, answer: before.answer },
      });
    });
  }

  /** For elders the review as a whole waits; for everybody else what they keep. Nothing is written down. */
  async progress(actor: Actor, calendarIds: readonly string[]): Promise<OwnProgress[]> {
    if (hasRole(actor, 'elder') || calendarIds.length === 0) return [];
    const { manager } = this.dataSource;
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const versions = await manager.findBy(CalendarVersionEntity, {
      calendarId: In([...calendarIds]),
      state: 'in-review',
    });
    const found: OwnProgress[] = [];
    for (const version of versions) {
      const { calendarId, number } = version;
      const count = await countOwn(manager, viewer, version);
      if (count.of > 0) found.push({ calendarId, number, ...count });
    }
    return found;
  }

  private inReview<T>(
    actor: Actor,
    calendarId: string,
    number: number,
    entryId: string,
    work: (
      manager: EntityManager,
      entry: { answersHash: string },
      before: AnswerEntity | undefined,
    ) => Promise<T>,
  ): Promise<T> {
    return inTransaction(this.dataSource, async (manager) => {
      await lockCalendar(manager, calendarId);
      const version = await manager.findOneBy(CalendarVersionEntity, { calendarId, number });
      const kept = version === null ? [] : (await this.keptIn(manager, actor, version)).entries;
      const entry = kept.find((one) => one.entryId === entryId);
      if (version === null || entry === undefined) throw notFound();
      if (version.state !== 'in-review') throw conflict('not-in-review');
      return work(manager, entry, (await ownAnswers(manager, actor.person.id, [entry])).get(entryId));
    });
  }

  private async describe(manager: EntityManager, actor: Actor, row: AnswerEntity): Promise<OwnAnswer> {
    const viewer = await viewerOf(manager, actor, this.clock.now());
    return toOwnAnswer(row, (await evidenceOf(manager, viewer, [row]))(row));
  }

  private async keptIn(manager: EntityManager, actor: Actor, version: CalendarVersionEntity): Promise<Kept> {
    return ownEntriesOf(manager, await viewerOf(manager, actor, this.clock.now()), version);
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    action: AuditAction,
    entryId: string,
    details: Record<string, unknown>,
  ): Promise<void> {
    await recordAudit(manager, {
      ...{ at: this.clock.now(), communityId: actor.communityId, actorId: actor.person.id, action },
      ...{ subjectType: 'entry', subjectId: entryId, details },
    });
  }
}

/** How many entries of a submission somebody keeps with others and may answer, and how many they have. */
export async function countOwn(
  manager: EntityManager,
  viewer: Viewer,
  version: CalendarVersionEntity,
): Promise<{ answered: number; of: number }> {
  const { entries } = await ownEntriesOf(manager, viewer, version);
  return { answered: (await ownAnswers(manager, viewer.personId, entries)).size, of: entries.length };
}

/** What the person said to these very texts, by entry. */
async function ownAnswers(
  manager: EntityManager,
  elderId: string,
  entries: readonly { entryId: string; answersHash: string }[],
): Promise<Map<string, AnswerEntity>> {
  if (entries.length === 0) return new Map();
  const rows = await manager.findBy(AnswerEntity, {
    elderId,
    entryHash: In(entries.map(({ answersHash }) => answersHash)),
  });
  return new Map(rows.map((row) => [row.entryId, row]));
}
