import { wasPublished } from '#shared/calendar/version-state.js';
import type {
  VersionEntry,
  VersionEntryBody,
  VersionHeader,
  VersionState,
} from '#shared/contracts/versions.js';
import { ENGINE_VERSION } from '#shared/sky/index.js';
import type { DataSource, EntityManager } from 'typeorm';
import type { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { CommunityEntity } from '../../db/entities/community.entity.js';
import { seesDrafts, type Actor } from '../../http/actor.js';
import { notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { readDraft } from '../calendars/draft.service.js';
import { withUsedFigures, type SkyDatesService } from '../calendars/sky-dates.service.js';
import { checkSeal } from './seal.service.js';
import { toHeader, toVersionEntry } from './versions.mapper.js';
import { findVersion, frozenEntries } from './versions.repository.js';

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

/** The one way to the content of versions and drafts: for screens, comparison and print alike. */
export class FrozenContentService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly sky: SkyDatesService,
  ) {}

  /** `number` is a submission number or `draft`. What the person may not see is not there. */
  async read(actor: Actor, calendarId: string, number: string): Promise<CalendarContent> {
    const { manager } = this.dataSource;
    if (number === 'draft') {
      if (!seesDrafts(actor)) throw notFound();
      return this.draft(manager, calendarId);
    }
    const version = await visibleVersion(manager, actor, calendarId, Number(number));
    const { header, entries } = await frozenContent(manager, version);
    const { label, state, hash } = version;
    return { header, entries: entries.map(bodyOf), number: version.number, label, state, hash };
  }

  private async draft(manager: EntityManager, calendarId: string): Promise<CalendarContent> {
    const calendar = await manager.findOneByOrFail(CalendarEntity, { id: calendarId });
    const content = await this.draftContent(manager, calendar, this.clock.now());
    return { ...content, number: null, label: null, state: null, hash: null };
  }

  /** Header and entries of the draft as a submission at this moment would hold them. */
  async draftContent(
    manager: EntityManager,
    calendar: CalendarEntity,
    at: Date,
  ): Promise<{ header: VersionHeader; entries: VersionEntryBody[] }> {
    const { place, entries } = await readDraft(manager, this.sky, calendar);
    const community = await manager.findOneByOrFail(CommunityEntity, { id: calendar.communityId });
    const contents = entries.map(({ row }) => row.content);
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
      },
      entries: entries.map(({ row, dates }) => ({ entryId: row.id, content: row.content, dates })),
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

/** Reads back exactly what was frozen, or throws a BrokenSealError. */
export async function frozenContent(
  manager: EntityManager,
  version: CalendarVersionEntity,
): Promise<{ header: VersionHeader; entries: VersionEntry[] }> {
  const rows = await frozenEntries(manager, version.id);
  const { headerText, headerHash, hash } = version;
  checkSeal({ headerText, headerHash, hash, entries: rows });
  return { header: toHeader(version), entries: rows.map(toVersionEntry) };
}

function bodyOf({ entryId, content, dates }: VersionEntry): VersionEntryBody {
  return { entryId, content, dates };
}
