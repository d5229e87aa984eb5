import type { AuditAction } from '#shared/contracts/audit.js';
import {
  DECISIONS_MAX,
  LESSONS_MAX,
  type Decision,
  type DecisionInput,
  type Lesson,
  type LessonInput,
} from '#shared/contracts/season-reviews.js';
import { randomUUID } from 'node:crypto';
import { IsNull, type DataSource, type EntityManager } from 'typeorm';
import { SeasonDecisionEntity } from '../../db/entities/season-decision.entity.js';
import { SeasonLessonEntity } from '../../db/entities/season-lesson.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, invalidField } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { viewerOf, type Viewer } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import { lockCalendar } from '../calendars/draft.service.js';
import { personNames } from '../people/person-names.service.js';
import { toDecision, toLesson } from './season-reviews.mapper.js';
import { namedBeside, seenRows } from './seen-season.service.js';

type Action = Extract<
  AuditAction,
  'lesson-written' | 'lesson-removed' | 'decision-written' | 'decision-removed'
>;

/**
 * What people say that a year taught, and what they decide for the next. Typed at any time, also while a submission is out:
 * it is no part of the draft's text. The same words by the same person about the same thing count once.
 */
export class SeasonWordsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  addLesson(actor: Actor, calendarId: string, { entryId, text }: LessonInput): Promise<Lesson> {
    return this.write(actor, calendarId, async (manager, viewer) => {
      await this.expectEntry(manager, viewer, calendarId, entryId);
      const about = { calendarId, entryId: entryId ?? IsNull() };
      const authorId = actor.person.id;
      const rows = await manager.findBy(SeasonLessonEntity, about);
      const said = rows.find((row) => row.authorId === authorId && row.text === text);
      if (said === undefined && rows.length >= LESSONS_MAX) throw conflict('too-many-lessons');
      const typedBy = actor.helper?.id ?? null;
      const written = { id: randomUUID(), calendarId, entryId, text, authorId, typedBy };
      const row = said ?? manager.create(SeasonLessonEntity, { ...written, writtenAt: this.clock.now() });
      if (said === undefined) {
        await manager.insert(SeasonLessonEntity, row);
        await this.record(manager, actor, 'lesson-written', row);
      }
      const nameOf = await this.namer(manager, viewer, row);
      return toLesson(row, viewer.personId, nameOf);
    });
  }

  removeLesson(actor: Actor, calendarId: string, lessonId: string): Promise<void> {
    return this.write(actor, calendarId, async (manager, viewer) => {
      const row = await manager.findOneBy(SeasonLessonEntity, { id: lessonId, calendarId });
      // One that is out already, or was never there for this person, stays so.
      if (row === null || !(await this.isSeen(manager, viewer, row.entryId))) return;
      if (row.authorId !== actor.person.id) throw conflict('not-the-lessons-writer');
      await manager.delete(SeasonLessonEntity, { id: lessonId });
      await this.record(manager, actor, 'lesson-removed', row);
    });
  }

  decide(actor: Actor, calendarId: string, { entryId, kind, text }: DecisionInput): Promise<Decision> {
    return this.write(actor, calendarId, async (manager, viewer) => {
      await this.expectEntry(manager, viewer, calendarId, entryId);
      const about = { calendarId, entryId: entryId ?? IsNull() };
      const authorId = actor.person.id;
      const rows = await manager.findBy(SeasonDecisionEntity, about);
      const said = rows.find((row) => row.authorId === authorId && row.kind === kind && row.text === text);
      if (said === undefined && rows.length >= DECISIONS_MAX) throw conflict('too-many-decisions');
      const written = { id: randomUUID(), calendarId, entryId, kind, text, authorId };
      const waiting = { decidedAt: this.clock.now(), doneBy: null, doneOn: null };
      const row = said ?? manager.create(SeasonDecisionEntity, { ...written, ...waiting });
      if (said === undefined) {
        await manager.insert(SeasonDecisionEntity, row);
        await this.record(manager, actor, 'decision-written', row);
      }
      return toDecision(row, await this.namer(manager, viewer, row));
    });
  }

  removeDecision(actor: Actor, calendarId: string, decisionId: string): Promise<void> {
    return this.write(actor, calendarId, async (manager, viewer) => {
      const row = await manager.findOneBy(SeasonDecisionEntity, { id: decisionId, calendarId });
      if (row === null || !(await this.isSeen(manager, viewer, row.entryId))) return;
      await manager.delete(SeasonDecisionEntity, { id: decisionId });
      await this.record(manager, actor, 'decision-removed', row);
    });
  }

  private write<T>(
    actor: Actor,
    calendarId: string,
    work: (manager: EntityManager, viewer: Viewer) => Promise<T>,
  ): Promise<T> {
    return inTransaction(this.dataSource, async (manager) => {
      await lockCalendar(manager, calendarId);
      return work(manager, await viewerOf(manager, actor, this.clock.now()));
    });
  }

  private async isSeen(manager: EntityManager, viewer: Viewer, entryId: string | null): Promise<boolean> {
    return entryId === null || (await seenRows(manager, viewer, [entryId])).row(entryId) !== undefined;
  }

  /** An entry of this calendar that is there for this person. */
  private async expectEntry(
    manager: EntityManager,
    viewer: Viewer,
    calendarId: string,
    entryId: string | null,
  ): Promise<void> {
    if (entryId === null) return;
    const row = (await seenRows(manager, viewer, [entryId])).row(entryId);
    if (row?.calendarId !== calendarId) throw invalidField('entryId', 'unknown');
  }

  private async namer(
    manager: EntityManager,
    viewer: Viewer,
    row: SeasonLessonEntity | SeasonDecisionEntity,
  ): Promise<(personId: string) => string> {
    const { entryId } = row;
    const shared =
      entryId === null ? undefined : (await seenRows(manager, viewer, [entryId])).sharedOf(entryId);
    const others = 'typedBy' in row ? row.typedBy : row.doneBy;
    const names = await personNames(manager, [row.authorId, others]);
    return (personId) => namedBeside(viewer, shared, personId, names);
  }

  /** In the records it belongs to what it is about, so that it shows there to the same people. */
  private async record(
    manager: EntityManager,
    actor: Actor,
    action: Action,
    { calendarId, entryId }: { calendarId: string; entryId: string | null },
  ): Promise<void> {
    await recordAudit(manager, {
      at: this.clock.now(),
      ...{ communityId: actor.communityId, actorId: actor.person.id, action },
      subjectType: entryId === null ? 'calendar' : 'entry',
      subjectId: entryId ?? calendarId,
      details: { calendarId },
    });
  }
}
