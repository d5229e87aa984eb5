import type { DraftGlance } from '#shared/contracts/draft-changes.js';
import { In, type DataSource } from 'typeorm';
import { ActualDateEntity } from '../../db/entities/actual-date.entity.js';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { EntryVariantEntity } from '../../db/entities/entry-variant.entity.js';
import type { EntryEntity } from '../../db/entities/entry.entity.js';
import type { Actor } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { entrySight } from '../../policy/entry-sight.js';
import { viewerOf, type Viewer } from '../../policy/viewer.js';
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
    const variants = await this.seenVariants(viewer, seen);
    const typedAt = new Map(done.map((row) => [row.entryId, row.typedAt.toISOString()]));
    return {
      entries: seen.map(({ id, version, updatedBy }) => ({
        entryId: id,
        version,
        byMe: updatedBy === viewer.personId,
        doneTypedAt: typedAt.get(id) ?? null,
        variants: variants
          .filter(({ entryId }) => entryId === id)
          .map((row) => ({ variantId: row.id, version: row.version })),
      })),
      locked: calendar.outNumber !== null,
      publishedNumber: calendar.publishedNumber,
    };
  }

  /** Other timings of these entries, with their own levels. */
  private async seenVariants(viewer: Viewer, entries: readonly EntryEntity[]): Promise<EntryVariantEntity[]> {
    if (entries.length === 0) return [];
    const { manager } = this.dataSource;
    const rows = await manager.find(EntryVariantEntity, {
      where: { entryId: In(entries.map(({ id }) => id)) },
      order: { addedAt: 'ASC', id: 'ASC' },
    });
    const thingOf = ({ id, content }: EntryVariantEntity) => ({
      entryId: id,
      markerKey: markerKeyOfLead(content.lead),
    });
    const sight = await entrySight(manager, viewer, rows.map(thingOf), 'variant');
    return rows.filter((row) => sight.appearance(thingOf(row)) === 'full');
  }
}
