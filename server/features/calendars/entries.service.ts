import { inOrder } from '#shared/calendar/entry-dates.js';
import { overlappingEntryIds } from '#shared/calendar/overlap.js';
import type { AuditAction } from '#shared/contracts/audit.js';
import { ENTRIES_MAX, type Entry, type EntryInput, type EntryUpdate } from '#shared/contracts/calendars.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, invalidField, notFound, stale } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordAudit } from '../audit/audit.service.js';
import { villageFigures } from '../figures/village-figures.service.js';
import { personNames } from '../people/person-names.service.js';
import { toEntry } from './calendars.mapper.js';
import { liveEntries, writeOrder } from './calendars.repository.js';
import { lockOpenDraft, readDraft, recordContribution } from './draft.service.js';
import { knowsMarker, markerKeyOfLead, type SkyDatesService } from './sky-dates.service.js';

/** The draft's entries. Each change waits for the calendar's lock and is refused while a submission is out. */
export class EntriesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly sky: SkyDatesService,
  ) {}

  async list(calendarId: string): Promise<Entry[]> {
    const { manager } = this.dataSource;
    return this.describe(manager, await manager.findOneByOrFail(CalendarEntity, { id: calendarId }));
  }

  async add(actor: Actor, calendarId: string, content: EntryInput): Promise<Entry> {
    return this.change(calendarId, async (manager, calendar) => {
      await expectKnownMarker(manager, calendar, content, 'lead');
      const entries = await liveEntries(manager, calendarId);
      const id = await this.insert(manager, actor, calendarId, content, entries.length);
      await writeOrder(manager, [...entries.map((entry) => entry.id), id]);
      await this.record(manager, actor, calendarId, 'entry-added', id);
      return this.one(manager, calendar, id);
    });
  }

  /** Saving what is stored already changes nothing: no new version, and nobody becomes a writer by it. */
  async update(actor: Actor, calendarId: string, entryId: string, input: EntryUpdate): Promise<Entry> {
    return this.change(calendarId, async (manager, calendar) => {
      const row = await liveEntry(manager, calendarId, entryId);
      if (row.version !== input.version) throw stale(await this.one(manager, calendar, entryId), input);
      const fields = changedFields(row.content, input.content);
      if (fields.includes('lead')) {
        await expectKnownMarker(manager, calendar, input.content, 'content.lead');
      }
      if (fields.length > 0) {
        await manager.update(
          EntryEntity,
          { id: entryId, version: input.version },
          { content: input.content, updatedBy: actor.person.id, updatedAt: this.clock.now() },
        );
        await this.record(manager, actor, calendarId, 'entry-changed', entryId, { fields });
      }
      return this.one(manager, calendar, entryId);
    });
  }

  async duplicate(actor: Actor, calendarId: string, entryId: string): Promise<Entry> {
    return this.change(calendarId, async (manager, calendar) => {
      const original = await liveEntry(manager, calendarId, entryId);
      const ids = (await liveEntries(manager, calendarId)).map((entry) => entry.id);
      const id = await this.insert(manager, actor, calendarId, original.content, ids.length);
      await writeOrder(manager, insertAt(ids, ids.indexOf(entryId) + 1, id));
      await this.record(manager, actor, calendarId, 'entry-copied', id, { from: entryId });
      return this.one(manager, calendar, id);
    });
  }

  /** The entry keeps its place in the order, so that putting it back puts it where it was. */
  async remove(actor: Actor, calendarId: string, entryId: string): Promise<void> {
    await this.change(calendarId, async (manager) => {
      await liveEntry(manager, calendarId, entryId);
      const at = this.clock.now();
      await manager.update(EntryEntity, { id: entryId }, this.touched(actor, { deletedAt: at }));
      await writeOrder(
        manager,
        (await liveEntries(manager, calendarId)).map((entry) => entry.id),
      );
      await this.record(manager, actor, calendarId, 'entry-deleted', entryId);
    });
  }

  async restore(actor: Actor, calendarId: string, entryId: string): Promise<Entry> {
    return this.change(calendarId, async (manager, calendar) => {
      const row = await manager.findOneBy(EntryEntity, { id: entryId, calendarId });
      if (row === null) throw notFound();
      if (row.deletedAt === null) throw conflict('nothing-to-restore');
      const ids = (await liveEntries(manager, calendarId)).map((entry) => entry.id);
      if (ids.length >= ENTRIES_MAX) throw conflict('too-many-entries');
      await manager.update(EntryEntity, { id: entryId }, this.touched(actor, { deletedAt: null }));
      await writeOrder(manager, insertAt(ids, row.position, entryId));
      await this.record(manager, actor, calendarId, 'entry-restored', entryId);
      return this.one(manager, calendar, entryId);
    });
  }

  async reorder(actor: Actor, calendarId: string, entryIds: readonly string[]): Promise<Entry[]> {
    return this.change(calendarId, async (manager, calendar) => {
      const ids = (await liveEntries(manager, calendarId)).map((entry) => entry.id);
      if (!sameJson([...ids].sort(), [...entryIds].sort())) throw conflict('order-differs');
      if (!sameJson(ids, entryIds)) {
        await writeOrder(manager, entryIds);
        await recordContribution(manager, calendarId, actor.person.id, this.clock.now());
        await this.audit(manager, actor, 'entries-reordered', 'calendar', calendarId, { count: ids.length });
      }
      return this.describe(manager, calendar);
    });
  }

  private change<T>(
    calendarId: string,
    work: (manager: EntityManager, calendar: CalendarEntity) => Promise<T>,
  ): Promise<T> {
    return inTransaction(this.dataSource, async (manager) =>
      work(manager, await lockOpenDraft(manager, calendarId)),
    );
  }

  private async insert(
    manager: EntityManager,
    actor: Actor,
    calendarId: string,
    content: EntryInput,
    position: number,
  ): Promise<string> {
    if (position >= ENTRIES_MAX) throw conflict('too-many-entries');
    const id = randomUUID();
    await manager.insert(EntryEntity, { id, calendarId, position, content, ...this.touched(actor) });
    return id;
  }

  private touched(actor: Actor, change: { deletedAt: Date | null } = { deletedAt: null }) {
    return { ...change, updatedBy: actor.person.id, updatedAt: this.clock.now() };
  }

  private async one(manager: EntityManager, calendar: CalendarEntity, entryId: string): Promise<Entry> {
    const entry = (await this.describe(manager, calendar)).find(({ id }) => id === entryId);
    if (!entry) throw notFound();
    return entry;
  }

  /** The whole draft: whether two windows collide can only be said with all of them at hand. */
  private async describe(manager: EntityManager, calendar: CalendarEntity): Promise<Entry[]> {
    const { entries } = await readDraft(manager, this.sky, calendar);
    const colliding = overlappingEntryIds(
      entries.map(({ row, dates }) => ({ id: row.id, timing: row.content, window: dates.window })),
    );
    const names = await personNames(
      manager,
      entries.map(({ row }) => row.updatedBy),
    );
    return entries.map(({ row, dates }) => {
      const warnings = colliding.has(row.id)
        ? inOrder(new Set([...dates.warnings, 'windows-overlap' as const]))
        : dates.warnings;
      return toEntry(row, { ...dates, warnings }, names.get(row.updatedBy) ?? '');
    });
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    calendarId: string,
    action: AuditAction,
    entryId: string,
    details: Record<string, unknown> = {},
  ): Promise<void> {
    await recordContribution(manager, calendarId, actor.person.id, this.clock.now());
    await this.audit(manager, actor, action, 'entry', entryId, { calendarId, ...details });
  }

  private async audit(
    manager: EntityManager,
    actor: Actor,
    action: AuditAction,
    subjectType: 'entry' | 'calendar',
    subjectId: string,
    details: Record<string, unknown>,
  ): Promise<void> {
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType,
      subjectId,
      details,
    });
  }
}

async function liveEntry(manager: EntityManager, calendarId: string, entryId: string): Promise<EntryEntity> {
  const row = await manager.findOneBy(EntryEntity, { id: entryId, calendarId });
  if (row === null || row.deletedAt !== null) throw notFound();
  return row;
}

/**
 * A figure that was taken out serves no new entry; one that goes by it already may be written on.
 * @param field where the lead stands in the request
 */
async function expectKnownMarker(
  manager: EntityManager,
  { communityId }: CalendarEntity,
  { lead }: EntryInput,
  field: string,
): Promise<void> {
  const markerKey = markerKeyOfLead(lead);
  if (markerKey === null) return;
  if (knowsMarker(markerKey, await villageFigures(manager, communityId))) return;
  throw invalidField(
    lead.type === 'sky' ? `${field}.spec.markerKey` : `${field}.markerKey`,
    'unknown-marker',
  );
}

/** Names of the fields that differ; what stands in them stays out of the record. */
function changedFields(before: EntryInput, after: EntryInput): string[] {
  return Object.entries(after)
    .filter(([field, value]) => !sameJson(before[field as keyof EntryInput], value))
    .map(([field]) => field)
    .sort();
}

function insertAt(ids: readonly string[], index: number, id: string): string[] {
  return [...ids.slice(0, index), id, ...ids.slice(index)];
}
