import type { SeasonTask } from '#shared/contracts/season-reviews.js';
import { In, IsNull, type DataSource, type EntityManager } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { RolledItemEntity } from '../../db/entities/rolled-item.entity.js';
import { SeasonDecisionEntity } from '../../db/entities/season-decision.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { viewerOf, type Viewer } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import { recordKeptReads } from '../audit/kept-reads.service.js';
import { lockCalendar } from '../calendars/draft.service.js';
import { personNames } from '../people/person-names.service.js';
import { toDecision } from './season-reviews.mapper.js';
import { namedBeside, seenRows } from './seen-season.service.js';

/** What the year before decided for a draft. Nothing is copied: a decision is its task, also where the draft came first. */
export class SeasonTasksService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async list(actor: Actor, calendarId: string): Promise<SeasonTask[]> {
    const { manager } = this.dataSource;
    const calendar = await manager.findOneByOrFail(CalendarEntity, { id: calendarId });
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const tasks = await this.tasksOf(manager, viewer, calendar);
    const ids = tasks.flatMap(({ entryId }) => entryId ?? []);
    await recordKeptReads(manager, viewer, this.clock.now(), 'entry', ids);
    return tasks;
  }

  tick(actor: Actor, calendarId: string, taskId: string): Promise<SeasonTask> {
    return this.change(actor, calendarId, taskId, true);
  }

  untick(actor: Actor, calendarId: string, taskId: string): Promise<SeasonTask> {
    return this.change(actor, calendarId, taskId, false);
  }

  private change(actor: Actor, calendarId: string, taskId: string, isDone: boolean): Promise<SeasonTask> {
    return inTransaction(this.dataSource, async (manager) => {
      const calendar = await lockCalendar(manager, calendarId);
      const viewer = await viewerOf(manager, actor, this.clock.now());
      const find = async () => {
        const task = (await this.tasksOf(manager, viewer, calendar)).find(({ id }) => id === taskId);
        if (task === undefined) throw notFound();
        return task;
      };
      const before = await find();
      if ((before.done !== null) === isDone) return before;
      const done = isDone
        ? { doneBy: actor.person.id, doneOn: viewer.today }
        : { doneBy: null, doneOn: null };
      await manager.update(SeasonDecisionEntity, { id: taskId }, done);
      await recordAudit(manager, {
        at: this.clock.now(),
        ...{ communityId: actor.communityId, actorId: actor.person.id },
        action: isDone ? 'task-ticked' : 'task-unticked',
        ...(await this.subjectOf(manager, taskId, calendarId)),
        details: { calendarId },
      });
      return find();
    });
  }

  private async subjectOf(manager: EntityManager, taskId: string, calendarId: string) {
    const { entryId } = await manager.findOneByOrFail(SeasonDecisionEntity, { id: taskId });
    return entryId === null
      ? { subjectType: 'calendar' as const, subjectId: calendarId }
      : { subjectType: 'entry' as const, subjectId: entryId };
  }

  /** As far as the person sees what they are about, in both years. */
  private async tasksOf(
    manager: EntityManager,
    viewer: Viewer,
    { id: calendarId, placeId, year }: CalendarEntity,
  ): Promise<SeasonTask[]> {
    const before = await manager.findOneBy(CalendarEntity, { placeId, year: year - 1 });
    if (before === null) return [];
    const rows = await manager.find(SeasonDecisionEntity, {
      where: { calendarId: before.id },
      order: { decidedAt: 'ASC', id: 'ASC' },
    });
    const fromIds = [...new Set(rows.flatMap(({ entryId }) => entryId ?? []))];
    const rolled = await manager.findBy(RolledItemEntity, {
      ...{ calendarId, itemType: 'entry' },
      fromId: In(fromIds),
    });
    const newIdOf = new Map(rolled.map(({ fromId, itemId }) => [fromId, itemId]));
    const seen = await seenRows(manager, viewer, [...fromIds, ...newIdOf.values()]);
    const live = await liveIds(manager, [...newIdOf.values()]);
    const names = await personNames(
      manager,
      rows.flatMap(({ authorId, doneBy }) => [authorId, doneBy]),
    );
    return rows.flatMap((row): SeasonTask[] => {
      const old = row.entryId === null ? null : seen.row(row.entryId);
      if (old === undefined) return [];
      const newId = row.entryId === null ? undefined : newIdOf.get(row.entryId);
      const standing = newId !== undefined && live.has(newId) ? newId : null;
      if (standing !== null && seen.row(standing) === undefined) return [];
      const shared = row.entryId === null ? undefined : seen.sharedOf(row.entryId);
      return [
        {
          ...toDecision(row, (personId) => namedBeside(viewer, shared, personId, names)),
          entryId: standing,
          title: old?.content.titleOfficer ?? null,
          ...{ fromYear: before.year, fromCalendarId: before.id },
        },
      ];
    });
  }
}

/** Those that still stand in the draft, whoever sees them. */
async function liveIds(manager: EntityManager, ids: readonly string[]): Promise<Set<string>> {
  const rows = await manager.find(EntryEntity, {
    where: { id: In([...ids]), deletedAt: IsNull() },
    select: { id: true },
  });
  return new Set(rows.map(({ id }) => id));
}
