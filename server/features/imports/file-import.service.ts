import { seenOf, withSeen } from '#shared/calendar/as-seen.js';
import {
  CALENDAR_FILE_MAX_BYTES,
  type CalendarFileSeason,
  type ReadableCalendarFile,
} from '#shared/contracts/calendar-file.js';
import type { EntryInput, EntryLead } from '#shared/contracts/calendars.js';
import type { FileImport } from '#shared/contracts/imports.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import type { Sharing } from '#shared/contracts/sharing-tightness.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { readFile } from 'node:fs/promises';
import { In, type DataSource, type EntityManager } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { EntryVariantEntity } from '../../db/entities/entry-variant.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { WithdrawalEntity } from '../../db/entities/withdrawal.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { AppError, conflict } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { anybody, withKeptGiver } from '../../policy/giver-naming.js';
import { isForVillage } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import { viewerOf } from '../../policy/viewer.js';
import type { WithdrawalList } from '../../storage/withdrawal-list.js';
import type { IncomingFile } from '../attachments/attachment-files.service.js';
import { knowsMarker, markerKeyOfLead } from '../calendars/sky-dates.service.js';
import { figuresSeenBy } from '../figures/village-figures.service.js';
import { seasonToLand, type SeasonPlan } from '../season-reviews/carried-season.service.js';
import { isArchive, withCalendarArchive, type CalendarArchive } from './calendar-archive.js';
import { readCalendarFile } from './calendar-file-reader.js';
import { countsOf, type CarriedMediaService, type Looked } from './carried-media.service.js';
import { filePlan, type FilePlan, type KnownToday } from './file-plan.js';
import { withSignsOfToday } from './village-signs.service.js';
import { landOnce, seasonCounts, type LandingEntry } from './landing.service.js';

/** A calendar's own file, back in a draft of its village. */
export class FileImportService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly withdrawals: WithdrawalList,
    private readonly carried: CarriedMediaService,
  ) {}

  async bringIn(
    actor: Actor,
    calendarId: string,
    { dryRun }: { dryRun: boolean },
    uploaded: IncomingFile,
  ): Promise<FileImport> {
    if (await isArchive(uploaded.path)) {
      return withCalendarArchive(uploaded.path, (archive) => {
        const brought = { file: readCalendarFile(archive.json), archive, path: uploaded.path };
        return this.bring(actor, calendarId, dryRun, brought);
      });
    }
    if (uploaded.bytes > CALENDAR_FILE_MAX_BYTES) {
      throw new AppError('too-large', { reason: 'file-too-large' });
    }
    const file = readCalendarFile(await readFile(uploaded.path, 'utf8'));
    return this.bring(actor, calendarId, dryRun, { file, archive: null, path: uploaded.path });
  }

  private async bring(
    actor: Actor,
    calendarId: string,
    dryRun: boolean,
    brought: Brought,
  ): Promise<FileImport> {
    const { file } = brought;
    await this.expectOfVillage(actor, file);
    const { manager } = this.dataSource;
    const listed = new Set((await this.withdrawals.all()).map(({ itemId }) => itemId));
    const calendar = await manager.findOneByOrFail(CalendarEntity, { id: calendarId });
    if (dryRun && calendar.outNumber !== null) throw new AppError('draft-locked');
    const { entries, refused, season } = await this.plan(manager, actor, calendar, file, listed);
    const { coming, tried, unfit } = await this.look(actor, brought, entries, !dryRun);
    if (dryRun) {
      const counts = { added: entries.length, refused, ...seasonCounts(season), ...countsOf(coming) };
      return toFileImport(file, counts, unfit);
    }
    let stood: ReadonlySet<string> = new Set();
    try {
      if (unfit.length > 0) throw conflict('files-do-not-fit');
      const at = this.clock.now();
      let standing = stood;
      const { isNew: _again, ...counts } = await inTransaction(this.dataSource, (within) =>
        landOnce(within, actor, calendarId, at, async (locked) => ({
          ...(await this.plan(within, actor, locked, file, listed)),
          way: 'file',
          media: this.carried.landing(actor, calendarId, coming, (ids) => {
            standing = ids;
          }),
        })),
      );
      stood = standing;
      return toFileImport(file, counts, []);
    } finally {
      await this.carried.remove(tried.filter(({ attachmentId }) => !stood.has(attachmentId)));
    }
  }

  /** A list alone is no voice: what did not come along stays where it was given. */
  private async look(
    actor: Actor,
    { file, archive, path }: Brought,
    entries: readonly LandingEntry[],
    keeps: boolean,
  ): Promise<Looked> {
    if (archive === null || !('media' in file)) return { coming: [], tried: [], unfit: [] };
    const entryIds = entries.flatMap(({ sameAs }) => sameAs ?? []);
    return this.carried.look(actor, file.media, entryIds, { archive, besidePath: `${path}-unpacked`, keeps });
  }

  private async expectOfVillage(
    { communityId }: Actor,
    { source, header }: ReadableCalendarFile,
  ): Promise<void> {
    const isOurs =
      source.calendarId === header.calendarId &&
      (await this.dataSource.manager.existsBy(CalendarEntity, { id: source.calendarId, communityId }));
    if (!isOurs) throw conflict('file-of-other-village');
  }

  private async plan(
    manager: EntityManager,
    actor: Actor,
    calendar: CalendarEntity,
    file: ReadableCalendarFile,
    listed: ReadonlySet<string>,
  ): Promise<FilePlan & { season: SeasonPlan }> {
    const plan = filePlan(file, await this.today(manager, actor, calendar.year, file, listed));
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const entries = await withSignsOfToday(manager, viewer, plan.entries);
    const newIdOf = new Map(entries.flatMap(({ id, sameAs }) => (sameAs === null ? [] : [[sameAs, id]])));
    const carried = 'season' in file ? file.season : NO_SEASON;
    // Beside nothing that comes in, nothing is told of the year either.
    const said =
      entries.length === 0 ? leftWhole(carried) : await seasonToLand(manager, calendar, carried, newIdOf);
    return { ...plan, entries, season: said };
  }

  private async today(
    manager: EntityManager,
    actor: Actor,
    year: number,
    { entries }: ReadableCalendarFile,
    listed: ReadonlySet<string>,
  ): Promise<KnownToday> {
    const { communityId } = actor;
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const figures = await figuresSeenBy(manager, viewer);
    const entryIds = entries.map(({ entryId }) => entryId);
    const variantIds = entries.flatMap(({ variants = [] }) => variants.map(({ variantId }) => variantId));
    const shared = {
      entry: await sharedById(manager, 'entry', entryIds),
      variant: await sharedById(manager, 'variant', variantIds),
    };
    const taken = await manager.find(WithdrawalEntity, {
      where: { itemId: In([...entryIds, ...variantIds]) },
      select: { id: true, itemId: true },
    });
    const withdrawn = new Set([...listed, ...taken.map(({ itemId }) => itemId)]);
    const rows = await byId(manager.findBy(EntryEntity, { id: In(entryIds) }));
    const variantRows = await byId(manager.findBy(EntryVariantEntity, { id: In(variantIds) }));
    const members = await manager.find(MembershipEntity, {
      where: { communityId },
      select: { id: true, personId: true },
    });
    const isMember = new Set(members.map(({ personId }) => personId));
    const reader = anybody(viewer);
    return {
      isKnown: (entryId) => shared.entry.has(entryId),
      mayCome: (itemType, itemId, lead) => {
        const known = shared[itemType].get(itemId);
        if (withdrawn.has(itemId) || !knowsLead(lead, figures)) return false;
        // A timing that nobody knows has nobody who could take it back.
        if (known === undefined) return itemType === 'entry';
        return known.communityId === communityId && isForVillage(known, viewer.today);
      },
      wordsOf: ({ entryId, content }) => {
        const known = shared.entry.get(entryId);
        if (known === undefined) return unknownHere(content, isMember, year);
        const row = rows.get(entryId);
        const named = row ? withKeptGiver(reader, known, row.content, content) : content;
        return sharedAsToday(inYear(named, year), known);
      },
      variantWordsOf: ({ variantId, content }) => {
        const row = variantRows.get(variantId);
        const known = shared.variant.get(variantId);
        return row ? withKeptGiver(reader, known, row.content, content) : content;
      },
    };
  }
}

/** What was sent, as it was read. */
interface Brought {
  file: ReadableCalendarFile;
  /** Null where the calendar came alone. */
  archive: CalendarArchive | null;
  path: string;
}

function toFileImport(
  file: ReadableCalendarFile,
  counts: Omit<FileImport, 'from' | 'mediaLeft' | 'unfit'>,
  unfit: FileImport['unfit'],
): FileImport {
  const listed = 'media' in file ? file.media.length : 0;
  const mediaLeft = listed - counts.voices - counts.pictures - unfit.length;
  const from = { year: file.header.year, placeName: file.header.place.name, label: file.source.label };
  return { ...counts, mediaLeft, unfit, from };
}

const NO_SEASON: CalendarFileSeason = { lessons: [], decisions: [] };

function leftWhole({ lessons, decisions }: CalendarFileSeason): SeasonPlan {
  return { lessons: [], decisions: [], left: lessons.length + decisions.length };
}

async function byId<T extends { id: string }>(rows: Promise<T[]>): Promise<Map<string, T>> {
  return new Map((await rows).map((row) => [row.id, row]));
}

function knowsLead(lead: EntryLead, figures: Parameters<typeof knowsMarker>[1]): boolean {
  const markerKey = markerKeyOfLead(lead);
  return markerKey === null || knowsMarker(markerKey, figures);
}

/** What the village does not know lands as a draft of its own: nothing agreed, and no wider than the village. */
function unknownHere(content: EntryInput, isMember: ReadonlySet<string>, year: number): EntryInput {
  const { sharing: _sharing, giverId, ...rest } = inYear(content, year);
  return {
    ...rest,
    ...(typeof giverId === 'string' && isMember.has(giverId) ? { giverId } : {}),
    agreedToPrint: false,
    sharingLevel: content.kind === 'belief' ? 'elders' : 'village',
  };
}

/** Its own words about how it is shared follow, so that the next edit does not ask for a wider circle. */
function sharedAsToday(content: EntryInput, { level, details }: Sharing): EntryInput {
  const isPlain = content.sharing === undefined && sameJson(details, PLAIN_DETAILS);
  return { ...content, sharingLevel: level, ...(isPlain ? {} : { sharing: details }) };
}

/** What was seen in another year was not seen in this one. */
function inYear(content: EntryInput, year: number): EntryInput {
  const seen = seenOf(content.lead);
  if (seen === null) return content;
  const isNear = Math.abs(Number(seen.date.slice(0, 4)) - year) <= 1;
  return isNear ? content : { ...content, lead: withSeen(content.lead, null) };
}
