import { inOrder } from '#shared/calendar/entry-dates.js';
import { overlappingEntryIds } from '#shared/calendar/overlap.js';
import type { AuditAction } from '#shared/contracts/audit.js';
import {
  ENTRIES_MAX,
  type Entry,
  type EntryInput,
  type EntryList,
  type EntryUpdate,
} from '#shared/contracts/calendars.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, notFound, stale } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { entrySight, type EntrySight, type SeenThing } from '../../policy/entry-sight.js';
import { withKeptGiver, withNaming } from '../../policy/giver-naming.js';
import { isKept } from '../../policy/policy.js';
import { copySharing, sharedById } from '../../policy/sharing.repository.js';
import { withTellableSigns } from '../../policy/sign-sight.js';
import { viewerOf, type Viewer } from '../../policy/viewer.js';
import { actualDaysOf } from '../actual-days/known-days.service.js';
import { recordAudit } from '../audit/audit.service.js';
import { recordKeptReads } from '../audit/kept-reads.service.js';
import { expectTellableSigns, withListedSigns, withOwnSignIds } from '../signs/entry-signs.service.js';
import { personNames } from '../people/person-names.service.js';
import { expectKnownWords, inVillageWords, knownWords } from '../word-lists/known-words.service.js';
import { expectGoodAnchor, expectNothingHangsOn } from './anchored-draft.service.js';
import { toEntry } from './calendars.mapper.js';
import { liveEntries, writeOrder } from './calendars.repository.js';
import { adviceOf } from './draft-advice.service.js';
import { countOnce } from './count-once.service.js';
import { orderAmongOthers } from './draft-order.service.js';
import { expectOpen, lockCalendar, readDraft, recordContribution } from './draft.service.js';
import { expectMayWrite, mayWrite, shareChangedEntry, shareNewEntry } from './entry-sharing.service.js';
import { changedFields, expectKnownMarker, expectSeenInYear, liveEntry } from './entry-checks.service.js';
import { markerKeyOfLead, type SkyDatesService } from './sky-dates.service.js';

/** The draft's entries. Each change waits for the calendar's lock and is refused while a submission is out. */
export class EntriesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly sky: SkyDatesService,
  ) {}

  async list(actor: Actor, calendarId: string): Promise<EntryList> {
    const { manager } = this.dataSource;
    const calendar = await manager.findOneByOrFail(CalendarEntity, { id: calendarId });
    const list = await this.describe(manager, actor, calendar);
    const ids = list.items.map(({ id }) => id);
    await recordKeptReads(manager, await this.viewer(manager, actor), this.clock.now(), 'entry', ids);
    return list;
  }

  async add(actor: Actor, calendarId: string, input: EntryInput): Promise<Entry> {
    return this.changeOne(actor, calendarId, async (manager, calendar) => {
      const viewer = await this.viewer(manager, actor);
      await expectKnownMarker(manager, viewer, input, 'lead');
      const writing = { entryId: null, stored: null, written: input, prefix: '' };
      const words = await knownWords(manager, actor.communityId);
      expectKnownWords(input, words, '');
      const listed = await withListedSigns(manager, viewer, writing);
      const content = withOwnSignIds(inVillageWords(listed, words));
      const entries = await liveEntries(manager, calendarId);
      const id = await this.insert(manager, actor, calendarId, content, entries.length);
      await shareNewEntry(manager, actor, id, content);
      await expectTellableSigns(manager, id, { ...writing, written: content });
      await this.expectAnchored(manager, actor, calendar, id, 'lead');
      await writeOrder(manager, [...entries.map((entry) => entry.id), id]);
      await this.record(manager, actor, calendarId, 'entry-added', id);
      return id;
    });
  }

  /** Saving what is stored already changes nothing: no new version, and nobody becomes a writer by it. */
  async update(actor: Actor, calendarId: string, entryId: string, input: EntryUpdate): Promise<Entry> {
    return this.changeOne(actor, calendarId, async (manager, calendar) => {
      const row = await this.writable(manager, actor, calendarId, entryId);
      if (row.version !== input.version)
        throw stale(await this.one(manager, actor, calendar, entryId), input);
      const viewer = await this.viewer(manager, actor);
      const shared = (await sharedById(manager, 'entry', [entryId])).get(entryId);
      const words = await knownWords(manager, actor.communityId);
      expectKnownWords(input.content, words, 'content.');
      const stored = inVillageWords(row.content, words);
      const written = withKeptGiver(viewer, shared, stored, input.content);
      const writing = { entryId, stored, written, prefix: 'content.' };
      const said = inVillageWords(await withListedSigns(manager, viewer, writing), words);
      const fields = changedFields(stored, said);
      const content = withOwnSignIds(said);
      if (fields.includes('lead')) {
        await expectKnownMarker(manager, viewer, content, 'content.lead');
      }
      if (fields.length > 0) {
        // Recorded first: who may see it afterwards is decided by what it says afterwards.
        await this.record(manager, actor, calendarId, 'entry-changed', entryId, { fields });
        await shareChangedEntry(manager, actor, entryId, content);
        await manager.update(
          EntryEntity,
          { id: entryId, version: input.version },
          { content, updatedBy: actor.person.id, updatedAt: this.clock.now() },
        );
        await this.expectAnchored(manager, actor, calendar, entryId, 'content.lead');
        await expectTellableSigns(manager, entryId, { ...writing, written: content });
      }
      return entryId;
    });
  }

  /** The copy is shared as the original is, and with the same giver. */
  async duplicate(actor: Actor, calendarId: string, entryId: string): Promise<Entry> {
    return this.changeOne(actor, calendarId, async (manager) => {
      const original = await this.writable(manager, actor, calendarId, entryId);
      const ids = (await liveEntries(manager, calendarId)).map((entry) => entry.id);
      const id = await this.insert(manager, actor, calendarId, original.content, ids.length);
      await copySharing(manager, 'entry', entryId, id);
      await writeOrder(manager, insertAt(ids, ids.indexOf(entryId) + 1, id));
      await this.record(manager, actor, calendarId, 'entry-copied', id, { from: entryId });
      return id;
    });
  }

  /** The entry keeps its place in the order, so that putting it back puts it where it was. */
  async remove(actor: Actor, calendarId: string, entryId: string): Promise<void> {
    const write = async (manager: EntityManager) => {
      await this.writable(manager, actor, calendarId, entryId);
      await expectNothingHangsOn(manager, await this.viewer(manager, actor), calendarId, entryId);
      const at = this.clock.now();
      await manager.update(EntryEntity, { id: entryId }, this.touched(actor, { deletedAt: at }));
      await writeOrder(
        manager,
        (await liveEntries(manager, calendarId)).map((entry) => entry.id),
      );
      await this.record(manager, actor, calendarId, 'entry-deleted', entryId);
      return entryId;
    };
    await this.change(actor, calendarId, write, () => Promise.resolve());
  }

  async restore(actor: Actor, calendarId: string, entryId: string): Promise<Entry> {
    return this.changeOne(actor, calendarId, async (manager) => {
      const row = await manager.findOneBy(EntryEntity, { id: entryId, calendarId });
      if (row === null) throw notFound();
      await this.expectWritable(manager, actor, entryId);
      if (row.deletedAt === null) throw conflict('nothing-to-restore');
      const ids = (await liveEntries(manager, calendarId)).map((entry) => entry.id);
      if (ids.length >= ENTRIES_MAX) throw conflict('too-many-entries');
      await manager.update(EntryEntity, { id: entryId }, this.touched(actor, { deletedAt: null }));
      await writeOrder(manager, insertAt(ids, row.position, entryId));
      await this.record(manager, actor, calendarId, 'entry-restored', entryId);
      return entryId;
    });
  }

  /** Of the entries that the person sees; all others stay where they stand between them. */
  async reorder(actor: Actor, calendarId: string, entryIds: readonly string[]): Promise<EntryList> {
    const write = async (manager: EntityManager) => {
      const rows = await liveEntries(manager, calendarId);
      const sight = await this.sight(manager, actor, rows);
      const seen = rows.filter((row) => sight.appearance(thingOf(row)) === 'full').map(({ id }) => id);
      if (!sameJson([...seen].sort(), [...entryIds].sort())) throw conflict('order-differs');
      if (!sameJson(seen, entryIds)) {
        await orderAmongOthers(manager, calendarId, entryIds);
        await recordContribution(manager, calendarId, actor.person.id, this.clock.now());
        await this.audit(manager, actor, 'entries-reordered', 'calendar', calendarId, { count: seen.length });
      }
      return calendarId;
    };
    return this.change(actor, calendarId, write, (manager, calendar) =>
      this.describe(manager, actor, calendar),
    );
  }

  /** A write that came before with the same key is not done again, also where the draft is locked by now. */
  private change<T>(
    actor: Actor,
    calendarId: string,
    write: (manager: EntityManager, calendar: CalendarEntity) => Promise<string>,
    answer: (manager: EntityManager, calendar: CalendarEntity, id: string) => Promise<T>,
  ): Promise<T> {
    return inTransaction(this.dataSource, async (manager) => {
      const calendar = await lockCalendar(manager, calendarId);
      const id = await countOnce(manager, actor, this.clock.now(), () => {
        expectOpen(calendar);
        return write(manager, calendar);
      });
      return answer(manager, calendar, id);
    });
  }

  private changeOne(
    actor: Actor,
    calendarId: string,
    write: (manager: EntityManager, calendar: CalendarEntity) => Promise<string>,
  ): Promise<Entry> {
    return this.change(actor, calendarId, write, (manager, calendar, id) =>
      this.one(manager, actor, calendar, id),
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

  private async expectAnchored(
    manager: EntityManager,
    actor: Actor,
    { id: calendarId, year }: CalendarEntity,
    entryId: string,
    field: string,
  ): Promise<void> {
    const { content } = await liveEntry(manager, calendarId, entryId);
    const viewer = await this.viewer(manager, actor);
    expectSeenInYear(content, { year, today: viewer.today }, field);
    await expectGoodAnchor(manager, viewer, calendarId, { id: entryId, content }, field);
  }

  private touched(actor: Actor, change: { deletedAt: Date | null } = { deletedAt: null }) {
    return { ...change, updatedBy: actor.person.id, updatedAt: this.clock.now() };
  }

  /** As its writer sees it, also where the level that they just gave it hides it from them. */
  private async one(
    manager: EntityManager,
    actor: Actor,
    calendar: CalendarEntity,
    entryId: string,
  ): Promise<Entry> {
    const { items } = await this.describe(manager, actor, calendar, entryId);
    const entry = items.find(({ id }) => id === entryId);
    if (!entry) throw notFound();
    return entry;
  }

  private viewer(manager: EntityManager, actor: Actor): Promise<Viewer> {
    return viewerOf(manager, actor, this.clock.now());
  }

  private async sight(
    manager: EntityManager,
    actor: Actor,
    rows: readonly EntryEntity[],
  ): Promise<EntrySight> {
    return entrySight(manager, await this.viewer(manager, actor), rows.map(thingOf));
  }

  /** The whole draft: whether two windows collide can only be said with all that are seen at hand. */
  private async describe(
    manager: EntityManager,
    actor: Actor,
    calendar: CalendarEntity,
    writtenId?: string,
  ): Promise<EntryList> {
    const { place, entries } = await readDraft(manager, this.sky, calendar);
    const viewer = await this.viewer(manager, actor);
    const sight = await entrySight(
      manager,
      viewer,
      entries.map(({ row }) => thingOf(row)),
    );
    const seen = entries.filter(
      ({ row }) => row.id === writtenId || sight.appearance(thingOf(row)) === 'full',
    );
    const colliding = overlappingEntryIds(
      seen.map(({ row, dates }) => ({ id: row.id, timing: row.content, window: dates.window })),
    );
    const names = await personNames(
      manager,
      seen.map(({ row }) => row.updatedBy),
    );
    const actual = await actualDaysOf(
      manager,
      seen.map(({ row }) => row.id),
    );
    const told = await withTellableSigns(
      manager,
      seen.map(({ row }) => ({ entryId: row.id, content: row.content })),
    );
    const advice = await adviceOf(manager, this.sky, { calendar, place }, seen);
    const items = seen.map(({ row, dates }, position) => {
      const warnings = colliding.has(row.id)
        ? inOrder(new Set([...dates.warnings, 'windows-overlap' as const]))
        : dates.warnings;
      const updatedByName = names.get(row.updatedBy) ?? '';
      const shared = sight.sharedOf(row.id);
      const mine = mayWrite(viewer, shared);
      const content = withNaming(viewer, shared, told[position]?.content ?? row.content);
      const facts = { row, content, dates: { ...dates, warnings }, updatedByName, position, mine };
      return toEntry({ ...facts, actual: actual.get(row.id) ?? null, advice: advice.get(row.id) ?? [] });
    });
    const keptCount = entries.filter(({ row }) => sight.appearance(thingOf(row)) === 'blank').length;
    return { items, nextCursor: null, keptCount };
  }

  /** An entry that is there for this person and theirs to write. */
  private async writable(
    manager: EntityManager,
    actor: Actor,
    calendarId: string,
    entryId: string,
  ): Promise<EntryEntity> {
    const row = await liveEntry(manager, calendarId, entryId);
    await this.expectWritable(manager, actor, entryId);
    return row;
  }

  private async expectWritable(manager: EntityManager, actor: Actor, entryId: string): Promise<void> {
    const viewer = await this.viewer(manager, actor);
    expectMayWrite(viewer, (await sharedById(manager, 'entry', [entryId])).get(entryId));
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    calendarId: string,
    action: AuditAction,
    entryId: string,
    details: Record<string, unknown> = {},
  ): Promise<void> {
    // Whoever writes what its people keep compiles nothing for the village, and leaves no trace in its draft.
    const shared = (await sharedById(manager, 'entry', [entryId])).get(entryId);
    if (shared !== undefined && !isKept(shared)) {
      await recordContribution(manager, calendarId, actor.person.id, this.clock.now());
    }
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

function thingOf({ id, content }: EntryEntity): SeenThing {
  return { entryId: id, markerKey: markerKeyOfLead(content.lead) };
}

function insertAt(ids: readonly string[], index: number, id: string): string[] {
  return [...ids.slice(0, index), id, ...ids.slice(index)];
}
