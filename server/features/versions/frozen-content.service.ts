import { wasPublished } from '#shared/calendar/version-state.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import type { ConsentUse } from '#shared/contracts/consents.js';
import type {
  SeenVariant,
  VersionEntry,
  VersionEntryBody,
  VersionHeader,
  VersionState,
} from '#shared/contracts/versions.js';
import { ENGINE_VERSION } from '#shared/sky/index.js';
import type { DataSource, EntityManager } from 'typeorm';
import type { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import type { VersionVariantEntity } from '../../db/entities/version-variant.entity.js';
import type { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import { askedOnce } from '../../db/asked-once.js';
import { CommunityEntity } from '../../db/entities/community.entity.js';
import { seesDrafts, type Actor } from '../../http/actor.js';
import { notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordKeptReads } from '../audit/kept-reads.service.js';
import { draftVariants } from '../variants/draft-variants.service.js';
import { readDraft } from '../calendars/draft.service.js';
import { withUsedFigures, type SkyDatesService } from '../calendars/sky-dates.service.js';
import { awaitedFor, entriesForUse, type AwaitedYes } from '../../policy/consent-gate.js';
import { entrySight } from '../../policy/entry-sight.js';
import { viewerOf, villageDay } from '../../policy/viewer.js';
import { checkSeal, leavesOf, newSalt } from './seal.service.js';
import {
  contentsOf,
  cutHeader,
  entriesForVillage,
  seenOfDraft,
  seenOfVersion,
  thingOf,
} from './seen-content.service.js';
import { toHeader, toVersionEntry, toVersionVariant } from './versions.mapper.js';
import { findVersion, frozenEntries, frozenVariants } from './versions.repository.js';

/** What a version says, or what the draft would say if it were submitted now. */
export interface CalendarContent {
  header: VersionHeader;
  entries: VersionEntryBody[];
  /** All null for the draft. */
  number: number | null;
  label: string | null;
  state: VersionState | null;
  hash: string | null;
}

/** What stands on the page for everybody, and what is open and waits for it. */
export interface ContentForEverybody extends Pick<CalendarContent, 'header' | 'entries'> {
  open: { entry: VersionEntryBody; byClosedFigure: boolean; awaited: AwaitedYes[] }[];
  givers: Pick<EntryInput, 'giver' | 'giverId'>[];
}

/** A version as it was sealed. */
interface FrozenContent {
  readonly header: VersionHeader;
  readonly entries: readonly VersionEntry[];
  readonly leaves: string[];
}

/** The one way to the content of versions and drafts, for screens, comparison and print alike: cut to who asks. */
export class FrozenContentService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly sky: SkyDatesService,
  ) {}

  /** `number` is a submission number or `draft`. What the person may not see is not there. */
  async read(actor: Actor, calendarId: string, number: string): Promise<CalendarContent> {
    const content = await this.cutToReader(actor, calendarId, number);
    if (number === 'draft') return content;
    const { manager } = this.dataSource;
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const ids = content.entries.map(({ entryId }) => entryId);
    await recordKeptReads(manager, viewer, this.clock.now(), 'entry', ids);
    return content;
  }

  private async cutToReader(actor: Actor, calendarId: string, number: string): Promise<CalendarContent> {
    const { manager } = this.dataSource;
    if (number === 'draft') {
      if (!seesDrafts(actor)) throw notFound();
      return this.draft(manager, actor, calendarId);
    }
    const version = await visibleVersion(manager, actor, calendarId, Number(number));
    const frozen = await frozenContent(manager, version);
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const { header, entries } = await seenOfVersion(manager, viewer, version, frozen.header, frozen.entries);
    const { label, state, hash } = version;
    return { header, entries: entries.map(bodyOf), number: version.number, label, state, hash };
  }

  /** For the village's board: open and the village's entries that were agreed to be printed, whoever prints it. */
  async readForBoard(actor: Actor, calendarId: string, number: string): Promise<CalendarContent> {
    return this.readForUse(actor, calendarId, number, 'print');
  }

  /** Open and the village's entries that were agreed to be used so; nothing kept, so no reading of it is noted. */
  async readForUse(
    actor: Actor,
    calendarId: string,
    number: string,
    use: ConsentUse,
  ): Promise<CalendarContent> {
    const { manager } = this.dataSource;
    const content = await this.cutToReader(actor, calendarId, number);
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const shown = await entriesForVillage(manager, viewer, content.entries);
    const entries = await entriesForUse(manager, viewer.today, use, shown);
    return { ...content, header: cutHeader(content.header, entries).header, entries };
  }

  /**
   * What is open to whoever comes by, and was agreed to for the page for everybody. Beside it all that is open by itself,
   * with what it waits for, and how the givers of the whole version are called, so that no word tells of them.
   */
  async readForEverybody(communityId: string, version: CalendarVersionEntity): Promise<ContentForEverybody> {
    const { manager } = this.dataSource;
    const today = await villageDay(manager, communityId, this.clock.now());
    const passerBy = { personId: '', communityId, roles: [], groupIds: new Set<string>(), today };
    const frozen = await frozenContent(manager, version);
    const seen = await seenOfVersion(manager, passerBy, version, frozen.header, frozen.entries);
    const shown = await entriesForVillage(manager, passerBy, seen.entries.map(bodyOf));
    const sight = await entrySight(manager, passerBy, shown.map(thingOf));
    const ownOpen = shown.filter(({ entryId }) => sight.sharedOf(entryId)?.level === 'open');
    const awaitedOf = await awaitedFor(manager, today, 'open-page', ownOpen);
    const open = ownOpen.map((entry) => ({
      entry,
      byClosedFigure: !sight.isOpen(thingOf(entry)),
      awaited: awaitedOf(entry),
    }));
    const entries = open
      .filter(({ byClosedFigure, awaited }) => !byClosedFigure && awaited.length === 0)
      .map(({ entry }) => entry);
    const givers = frozen.entries.flatMap(({ content, variants = [] }) => [
      content,
      ...variants.map((variant) => variant.content),
    ]);
    return { header: cutHeader(seen.header, entries).header, entries, open, givers };
  }

  /** Which entries a version holds, those that nobody may be shown as well: for rules, never for an answer. */
  async idsIn(actor: Actor, calendarId: string, number: number): Promise<Set<string>> {
    const { manager } = this.dataSource;
    const version = await visibleVersion(manager, actor, calendarId, number);
    const { entries } = await frozenContent(manager, version);
    return new Set(entries.map(({ entryId }) => entryId));
  }

  private async draft(manager: EntityManager, actor: Actor, calendarId: string): Promise<CalendarContent> {
    const calendar = await manager.findOneByOrFail(CalendarEntity, { id: calendarId });
    const whole = await this.draftContent(manager, calendar, this.clock.now());
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const { header, entries } = await seenOfDraft(manager, viewer, whole.header, whole.entries);
    return { header, entries, number: null, label: null, state: null, hash: null };
  }

  /** Header and entries of the draft as a submission at this moment would hold them: whole, and for nobody's eyes. */
  async draftContent(
    manager: EntityManager,
    calendar: CalendarEntity,
    at: Date,
  ): Promise<{ header: VersionHeader; entries: VersionEntryBody[] }> {
    const { place, entries } = await readDraft(manager, this.sky, calendar);
    const community = await manager.findOneByOrFail(CommunityEntity, { id: calendar.communityId });
    const beside = await draftVariants(
      manager,
      this.sky,
      place,
      calendar.year,
      entries.map(({ row }) => row),
    );
    const bodies = entries.map(({ row, dates }): VersionEntryBody => {
      const variants = beside
        .filter((variant) => variant.row.entryId === row.id)
        .map((variant) => ({
          ...{ variantId: variant.row.id, content: variant.row.content, dates: variant.dates },
          forBoard: false,
        }));
      const body = { entryId: row.id, content: row.content, dates };
      return variants.length === 0 ? body : { ...body, variants };
    });
    const contents = contentsOf(bodies);
    return {
      header: {
        schema: 1,
        calendarId: calendar.id,
        number: calendar.submissionCount + 1,
        year: calendar.year,
        engineVersion: ENGINE_VERSION,
        submittedAt: at.toISOString(),
        communityName: community.name,
        villageLanguage: { tag: community.villageLanguageTag, name: community.villageLanguageName },
        officerLanguage: { tag: community.officerLanguageTag, name: community.officerLanguageName },
        weatherContact: community.weatherContact,
        agricultureContact: community.agricultureContact,
        place: withUsedFigures(place, contents),
        markers: this.sky.frozenMarkers(place, calendar.year, contents),
        salt: newSalt(),
      },
      entries: bodies,
    };
  }
}

/** A version that this person may see: reviews are for those who compile, review and sign. */
export async function visibleVersion(
  manager: EntityManager,
  actor: Actor,
  calendarId: string,
  number: number,
): Promise<CalendarVersionEntity> {
  const version = await findVersion(manager, calendarId, number);
  if (version === null || !isVisible(actor, version.state)) throw notFound();
  return version;
}

export function isVisible(actor: Actor, state: VersionState): boolean {
  return seesDrafts(actor) || wasPublished(state);
}

/** Reads back exactly what was frozen, or throws a BrokenSealError. Whole: what goes out is cut to who asks. */
export function frozenContent(
  manager: EntityManager,
  version: CalendarVersionEntity,
): Promise<FrozenContent> {
  return askedOnce(manager, `frozen content ${version.id}`, () => readFrozen(manager, version));
}

async function readFrozen(manager: EntityManager, version: CalendarVersionEntity): Promise<FrozenContent> {
  const rows = await frozenEntries(manager, version.id);
  const variants = await frozenVariants(manager, version.id);
  const { headerText, headerHash, headerRedacted, hash, leaves } = version;
  const scheme = version.scheme === 1 ? 1 : 2;
  const sealed = {
    scheme,
    headerText,
    headerHash,
    headerRedacted,
    hash,
    leaves,
    entries: rows,
    variants,
  } as const;
  checkSeal(sealed);
  return {
    header: toHeader(version),
    entries: rows.map((row) => withVariants(row, variants)),
    leaves: leavesOf(sealed),
  };
}

/** One entry as it was frozen. */
export function frozenEntry(row: VersionEntryEntity): VersionEntry {
  return toVersionEntry(row);
}

function withVariants(row: VersionEntryEntity, all: readonly VersionVariantEntity[]): VersionEntry {
  const own = all.filter(({ entryId }) => entryId === row.entryId).map(toVersionVariant);
  const entry = toVersionEntry(row);
  return own.length === 0 ? entry : { ...entry, variants: own };
}

/** An entry without what only its seal needs. */
export function bodyOf({ entryId, content, dates, variants }: VersionEntry): VersionEntryBody {
  const body = { entryId, content, dates };
  if (variants === undefined) return body;
  const plain = variants.map((variant): SeenVariant => {
    const { salt: _salt, hash: _hash, rank: _rank, redacted: _redacted, ...seen } = variant;
    return seen;
  });
  return { ...body, variants: plain };
}
