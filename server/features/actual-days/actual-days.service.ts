import type { ActualDays, ActualDaysInput } from '#shared/contracts/actual-days.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import type { DataSource, EntityManager } from 'typeorm';
import { ActualDateEntity } from '../../db/entities/actual-date.entity.js';
import type { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { invalidField, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { entrySight } from '../../policy/entry-sight.js';
import { viewerOf } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import { countOnce } from '../calendars/count-once.service.js';
import { lockCalendar } from '../calendars/draft.service.js';
import { markerKeyOfLead } from '../calendars/sky-dates.service.js';
import { actualDaysOf } from './known-days.service.js';
import { withDaysSince } from './live-days.service.js';

/** Work that belongs to a year's calendar may begin before it and reach over its end. */
const YEARS_AROUND = 1;

/**
 * When work was really done. Typed during the season by whoever sees the entry among those who write, also while a
 * submission is out: it is no change of the draft's text.
 */
export class ActualDaysService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async put(
    actor: Actor,
    { calendarId, entryId }: { calendarId: string; entryId: string },
    { from, to, saidBy, plots }: ActualDaysInput,
  ): Promise<ActualDays> {
    return inTransaction(this.dataSource, async (manager) => {
      const calendar = await this.seen(manager, actor, calendarId, entryId);
      await countOnce(manager, actor, this.clock.now(), async () => {
        expectNearYear(calendar, 'from', from);
        if (to !== null) expectNearYear(calendar, 'to', to);
        await manager.upsert(
          ActualDateEntity,
          {
            ...{ entryId, firstDay: from, lastDay: to, saidBy, plots },
            ...{ typedBy: actor.person.id, typedAt: this.clock.now() },
          },
          ['entryId'],
        );
        await this.record(manager, actor, calendarId, entryId, 'actual-days-written');
        return entryId;
      });
      const written = (await actualDaysOf(manager, [entryId])).get(entryId);
      if (!written) throw notFound();
      return written;
    });
  }

  async remove(actor: Actor, calendarId: string, entryId: string): Promise<void> {
    await inTransaction(this.dataSource, async (manager) => {
      await this.seen(manager, actor, calendarId, entryId);
      await countOnce(manager, actor, this.clock.now(), async () => {
        const { affected } = await manager.delete(ActualDateEntity, { entryId });
        if ((affected ?? 0) > 0)
          await this.record(manager, actor, calendarId, entryId, 'actual-days-removed');
        return entryId;
      });
    });
  }

  /** Of a version's entries as somebody sees them: what is counted from work that is done since has its days. */
  daysSince<B extends VersionEntryBody>(year: number, entries: readonly B[]): Promise<B[]> {
    return withDaysSince(this.dataSource.manager, year, entries);
  }

  /** The calendar of an entry that is there for this person. */
  private async seen(
    manager: EntityManager,
    actor: Actor,
    calendarId: string,
    entryId: string,
  ): Promise<CalendarEntity> {
    const calendar = await lockCalendar(manager, calendarId);
    const row = await manager.findOneBy(EntryEntity, { id: entryId, calendarId });
    if (row === null || row.deletedAt !== null) throw notFound();
    const thing = { entryId, markerKey: markerKeyOfLead(row.content.lead) };
    const sight = await entrySight(manager, await viewerOf(manager, actor, this.clock.now()), [thing]);
    if (sight.appearance(thing) !== 'full') throw notFound();
    return calendar;
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    calendarId: string,
    entryId: string,
    action: 'actual-days-written' | 'actual-days-removed',
  ): Promise<void> {
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType: 'entry',
      subjectId: entryId,
      details: { calendarId },
    });
  }
}

function expectNearYear({ year }: CalendarEntity, field: 'from' | 'to', day: string): void {
  if (Math.abs(Number(day.slice(0, 4)) - year) > YEARS_AROUND) throw invalidField(field, 'not-of-this-year');
}
