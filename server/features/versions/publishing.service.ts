import { signOffNeeds } from '#shared/calendar/sign-off-needs.js';
import { mayBecome, versionLabel, type VersionState } from '#shared/calendar/version-state.js';
import type { AuditAction } from '#shared/contracts/audit.js';
import type { Version, VersionEntryBody } from '#shared/contracts/versions.js';
import { randomUUID } from 'node:crypto';
import { In, type DataSource, type EntityManager } from 'typeorm';
import { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { CommunityEntity } from '../../db/entities/community.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { VersionVariantEntity } from '../../db/entities/version-variant.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, notFound, type ProblemReason } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { entrySight } from '../../policy/entry-sight.js';
import { viewerOf } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import { countOnce } from '../calendars/count-once.service.js';
import { draftWriterIds, forgetContributions, lockCalendar } from '../calendars/draft.service.js';
import { answersCarried } from './answers-across-words.service.js';
import type { FrozenContentService } from './frozen-content.service.js';
import { settleKeptEntries } from './kept-entries.service.js';
import { thingOf } from './seen-content.service.js';
import { seal, type SealedEntry } from './seal.service.js';
import { earlierSeals, findVersion } from './versions.repository.js';
import type { VersionsService } from './versions.service.js';

/** The officer's part of a version's life: submit, take back, publish, recall. */
export class PublishingService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly contents: FrozenContentService,
    private readonly versions: VersionsService,
  ) {}

  /** Freezes the draft: from here on its text never changes, and the draft is locked until this one is decided. */
  async submit(actor: Actor, calendarId: string): Promise<Version> {
    return inTransaction(this.dataSource, async (manager) => {
      const calendar = await lockCalendar(manager, calendarId);
      const write = () => this.freeze(manager, actor, calendar);
      const id = await countOnce(manager, actor, this.clock.now(), write);
      const row = await manager.findOneByOrFail(CalendarVersionEntity, { id });
      return this.versions.describe(manager, actor, row);
    });
  }

  /** @returns the id of the new version */
  private async freeze(manager: EntityManager, actor: Actor, calendar: CalendarEntity): Promise<string> {
    const calendarId = calendar.id;
    if (calendar.outNumber !== null) throw conflict('submission-out');
    const at = this.clock.now();
    const { header, entries } = await this.contents.draftContent(manager, calendar, at);
    if (entries.length === 0) throw conflict('no-entries');
    if (header.weatherContact === '' || header.agricultureContact === '') throw conflict('contacts-missing');
    await this.expectRecordsComplete(manager, actor, entries);
    const community = await manager.findOneByOrFail(CommunityEntity, { id: calendar.communityId });
    const variants = entries.flatMap(({ entryId, variants: beside = [] }) =>
      beside.map((variant) => ({ ...variant, entryId })),
    );
    const answersTo = await answersCarried(manager, calendarId, entries);
    const sealed = seal(header, entries, variants, await earlierSeals(manager, calendarId));
    const row = manager.create(CalendarVersionEntity, {
      id: randomUUID(),
      calendarId,
      number: header.number,
      label: null,
      state: 'in-review',
      stateNote: '',
      headerText: sealed.headerText,
      headerHash: sealed.headerHash,
      hash: sealed.hash,
      scheme: sealed.scheme,
      leaves: sealed.leaves,
      withdrawnTraces: 0,
      headerRedacted: false,
      signOffRule: community.signOffRule,
      writerIds: await draftWriterIds(manager, calendarId),
      submittedBy: actor.person.id,
      submittedAt: at,
      publishedAt: null,
    });
    await manager.insert(CalendarVersionEntity, row);
    await insertEntries(manager, row.id, sealed.entries, answersTo);
    for (const variant of sealed.variants) {
      await manager.insert(VersionVariantEntity, { id: randomUUID(), versionId: row.id, ...variant });
    }
    await manager.update(
      CalendarEntity,
      { id: calendarId },
      { outNumber: header.number, submissionCount: header.number, updatedAt: at },
    );
    await this.record(manager, actor, row, 'submitted', { hash: sealed.hash });
    return row.id;
  }

  /** Final for this submission; the draft opens again. */
  async askChanges(
    actor: Actor,
    calendarId: string,
    number: number,
    { reason, note }: { reason: 'taken-back' | 'elder-asked'; note: string },
  ): Promise<Version> {
    return this.change(actor, calendarId, number, 'changes-asked', 'not-in-review', async (manager, row) => {
      await manager.update(
        CalendarEntity,
        { id: calendarId },
        { outNumber: null, updatedAt: this.clock.now() },
      );
      await this.record(manager, actor, row, 'changes-asked', { reason });
      return { stateNote: note };
    });
  }

  /** Gives the label; the version before it becomes replaced, and whoever wrote so far may sign the next one. */
  async publish(actor: Actor, calendarId: string, number: number): Promise<Version> {
    return this.change(
      actor,
      calendarId,
      number,
      'published',
      'not-signed-off',
      async (manager, row, calendar) => {
        const at = this.clock.now();
        const label = versionLabel(calendar.year, calendar.labelCount + 1);
        const previous = await manager.findOneBy(CalendarVersionEntity, { calendarId, state: 'published' });
        if (previous !== null) {
          await manager.update(CalendarVersionEntity, { id: previous.id }, { state: 'replaced' });
          await this.record(manager, actor, previous, 'replaced', { label: previous.label, by: label });
        }
        await manager.update(
          CalendarEntity,
          { id: calendarId },
          { outNumber: null, publishedNumber: number, labelCount: calendar.labelCount + 1, updatedAt: at },
        );
        await forgetContributions(manager, calendarId);
        await settleKeptEntries(manager, row);
        await this.record(manager, actor, row, 'published', { label });
        return { label, publishedAt: at };
      },
    );
  }

  /** The version stays readable and says that it was recalled; the one before it does not come back by itself. */
  async recall(actor: Actor, calendarId: string, number: number, note: string): Promise<Version> {
    return this.change(actor, calendarId, number, 'recalled', 'not-published', async (manager, row) => {
      await manager.update(
        CalendarEntity,
        { id: calendarId },
        { publishedNumber: null, updatedAt: this.clock.now() },
      );
      await this.record(manager, actor, row, 'recalled', { label: row.label });
      return { stateNote: note };
    });
  }

  /**
   * An entry says what its kind needs before anybody is asked about it; one of the time before there were records may do
   * without, until one is begun. Of entries that the submitting
   * person does not see nothing is asked: their people answer for them, and a refusal would tell of them.
   */
  private async expectRecordsComplete(
    manager: EntityManager,
    actor: Actor,
    entries: readonly VersionEntryBody[],
  ): Promise<void> {
    const sight = await entrySight(
      manager,
      await viewerOf(manager, actor, this.clock.now()),
      entries.map(thingOf),
    );
    const ids = entries.map(({ entryId }) => entryId);
    const older = await manager.find(EntryEntity, {
      select: { id: true },
      where: { id: In(ids), isOlder: true },
    });
    const olderIds = new Set(older.map(({ id }) => id));
    const incomplete = entries.filter(
      (entry) =>
        sight.appearance(thingOf(entry)) === 'full' &&
        signOffNeeds(entry.content, olderIds.has(entry.entryId)).length > 0,
    );
    if (incomplete.length > 0) {
      throw conflict(
        'record-incomplete',
        incomplete.map(({ content }) => content.titleOfficer),
      );
    }
  }

  private async change(
    actor: Actor,
    calendarId: string,
    number: number,
    to: VersionState,
    otherwise: ProblemReason,
    work: (
      manager: EntityManager,
      row: CalendarVersionEntity,
      calendar: CalendarEntity,
    ) => Promise<Partial<Pick<CalendarVersionEntity, 'stateNote' | 'label' | 'publishedAt'>>>,
  ): Promise<Version> {
    return inTransaction(this.dataSource, async (manager) => {
      const calendar = await lockCalendar(manager, calendarId);
      const row = await findVersion(manager, calendarId, number);
      if (row === null) throw notFound();
      if (!mayBecome(row.state, to)) throw conflict(otherwise);
      const changes = { ...(await work(manager, row, calendar)), state: to };
      await manager.update(CalendarVersionEntity, { id: row.id }, changes);
      return this.versions.describe(manager, actor, Object.assign(row, changes));
    });
  }

  private async record(
    manager: EntityManager,
    actor: Actor,
    row: CalendarVersionEntity,
    action: AuditAction,
    details: Record<string, unknown>,
  ): Promise<void> {
    await recordAudit(manager, {
      at: this.clock.now(),
      communityId: actor.communityId,
      actorId: actor.person.id,
      action,
      subjectType: 'version',
      subjectId: row.id,
      details: { calendarId: row.calendarId, number: row.number, ...details },
    });
  }
}

/** A statement must stay well below what the database takes at once (16 MiB by default). */
const ENTRIES_PER_STATEMENT = 100;

async function insertEntries(
  manager: EntityManager,
  versionId: string,
  entries: readonly SealedEntry[],
  answersTo: ReadonlyMap<string, string>,
): Promise<void> {
  const rows = entries.map((entry, position) => {
    const given = answersTo.get(entry.entryId);
    const carried = given === undefined || given === entry.hash ? null : given;
    return { id: randomUUID(), versionId, position, ...entry, answersTo: carried };
  });
  for (let start = 0; start < rows.length; start += ENTRIES_PER_STATEMENT) {
    await manager.insert(VersionEntryEntity, rows.slice(start, start + ENTRIES_PER_STATEMENT));
  }
}
