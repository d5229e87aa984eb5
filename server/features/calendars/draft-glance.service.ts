import type { DraftGlance } from '#shared/contracts/draft-changes.js';
import { In, type DataSource } from 'typeorm';
import { ActualDateEntity } from '../../db/entities/actual-date.entity.js';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import type { Actor } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { entrySight } from '../../policy/entry-sight.js';
import { viewerOf } from '../../policy/viewer.js';
import { liveEntries } from './calendars.repository.js';
import { markerKeyOfLead } from './sky-dates.service.js';

/** What somebody sees of a draft right now, as ids and numbers. Nothing is read of it, so nothing is written down. */
export class DraftGlanceService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async look(actor: Actor, calendarId: string): Promise<DraftGlance> {
    const { manager } = this.dataSource;
    const calendar = await manager.findOneByOrFail(CalendarEntity, { id: calendarId });
    const rows = await liveEntries(manager, calendarId);
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const things = rows.map(({ id, content }) => ({
      entryId: id,
      markerKey: markerKeyOfLead(content.lead),
    }));
    const sight = await entrySight(manager, viewer, things);
    const seen = rows.filter((_, index) => {
      const thing = things[index];
      return thing !== undefined && sight.appearance(thing) === 'full';
    });
    const done = await manager.findBy(ActualDateEntity, { entryId: In(seen.map(({ id }) => id)) });
    const typedAt = new Map(done.map((row) => [row.entryId, row.typedAt.toISOString()]));
    return {
      entries: seen.map(({ id, version, updatedBy }) => ({
        entryId: id,
        version,
        byMe: updatedBy === viewer.personId,
        doneTypedAt: typedAt.get(id) ?? null,
      })),
      locked: calendar.outNumber !== null,
      publishedNumber: calendar.publishedNumber,
    };
  }
}
