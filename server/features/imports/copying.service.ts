import type { EntryInput } from '#shared/contracts/calendars.js';
import type { VillageCopy } from '#shared/contracts/imports.js';
import { anchoredDates } from '#shared/calendar/anchors.js';
import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { CommunityEntity } from '../../db/entities/community.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { PlaceEntity } from '../../db/entities/place.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import { hasRole, type Actor } from '../../http/actor.js';
import { AppError, conflict, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import type { ListedMediaService } from '../attachments/listed-media.service.js';
import { recordAudit } from '../audit/audit.service.js';
import { toPlaceSnapshot } from '../places/place-snapshot.service.js';
import type { SkyDatesService } from '../calendars/sky-dates.service.js';
import type { FrozenContentService } from '../versions/frozen-content.service.js';
import { copiedEntries, type CopiedEntry } from './copied-entry.js';
import { landOnce, type LandingEntry } from './landing.service.js';

interface Copying {
  dryRun: boolean;
  toCalendarId: string;
}

/** From one village to another, by somebody who compiles for both. Everything has to be asked for anew there. */
export class CopyingService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly sky: SkyDatesService,
    private readonly contents: FrozenContentService,
    private readonly media: ListedMediaService,
  ) {}

  async copy(actor: Actor, calendarId: string, { dryRun, toCalendarId }: Copying): Promise<VillageCopy> {
    const { manager } = this.dataSource;
    const { to, theirs } = await this.target(manager, actor, toCalendarId);
    // What files may hold, whoever takes them: nothing kept, and nothing that was not agreed to.
    const { header, entries } = await this.contents.readForUse(actor, calendarId, 'draft', 'feed');
    const village = await manager.findOneByOrFail(CommunityEntity, { id: to.communityId });
    const copied = copiedEntries(entries, {
      figures: header.place.figures ?? [],
      isSameLanguage: header.villageLanguage.tag === village.villageLanguageTag,
    });
    const landing = landingOf(copied);
    const listed = await this.media.rows(manager, actor.communityId, [...landing.keys()]);
    const mediaLeft = listed.length;
    const report = await this.report(manager, to, copied, landing);
    if (dryRun) {
      if (to.outNumber !== null) throw new AppError('draft-locked');
      return { added: landing.size, mediaLeft, entries: report };
    }
    const at = this.clock.now();
    const { added } = await inTransaction(this.dataSource, async (within) => {
      const landed = await landOnce(within, theirs, toCalendarId, at, () =>
        Promise.resolve({ way: 'village', entries: [...landing.values()], refused: 0 }),
      );
      if (landed.isNew) await recordCopied(within, actor, calendarId, landed.added, at);
      return landed;
    });
    return { added, mediaLeft, entries: report };
  }

  /** Whoever is a stranger there learns nothing, also not whether there is such a calendar. */
  private async target(
    manager: EntityManager,
    { person, communityId }: Actor,
    toCalendarId: string,
  ): Promise<{ to: CalendarEntity; theirs: Actor }> {
    const to = await manager.findOneBy(CalendarEntity, { id: toCalendarId });
    const membership =
      to && (await manager.findOneBy(MembershipEntity, { communityId: to.communityId, personId: person.id }));
    if (to === null || membership === null) throw notFound();
    if (to.communityId === communityId) throw conflict('same-village');
    const theirs: Actor = { person, communityId: to.communityId, roles: membership.roles };
    if (!hasRole(theirs, 'officer')) throw new AppError('not-allowed');
    return { to, theirs };
  }

  private async report(
    manager: EntityManager,
    { placeId, year }: CalendarEntity,
    copied: readonly CopiedEntry[],
    landing: ReadonlyMap<string, LandingEntry>,
  ): Promise<VillageCopy['entries']> {
    const place = toPlaceSnapshot(await manager.findOneByOrFail(PlaceEntity, { id: placeId }));
    const coming = [...landing.values()];
    const dates = this.sky.datesOf(
      place,
      year,
      coming.map(({ content }) => content),
    );
    const computed = coming.flatMap(({ id, content }, index) => {
      const own = dates[index];
      return own ? [{ id, lead: content.lead, timing: content, dates: own }] : [];
    });
    const counted = anchoredDates(computed, year, { mayHang: () => true, actualOf: () => null });
    const datesOf = new Map(computed.map(({ id, dates: own }) => [id, counted.get(id) ?? own]));
    return copied.map(({ fromId, title, content, notes }) => {
      const own = datesOf.get(landing.get(fromId)?.id ?? '');
      return {
        ...{ title, notes, comes: content !== null, protectiveWatch: content?.protectiveWatch ?? false },
        ...{ window: own?.window ?? null, warnings: own?.warnings ?? [] },
      };
    });
  }
}

/** Under new ids, pointing at each other as they did. */
function landingOf(copied: readonly CopiedEntry[]): Map<string, LandingEntry> {
  const coming = copied.flatMap(({ fromId, content }) => (content === null ? [] : [{ fromId, content }]));
  const newIdOf = new Map<string, string>(coming.map(({ fromId }) => [fromId, randomUUID()]));
  return new Map(
    coming.map(({ fromId, content }) => [
      fromId,
      {
        id: newIdOf.get(fromId) ?? fromId,
        content: pointing(content, newIdOf),
        ...{ sameAs: null, variants: [], isToBeAsked: true },
      },
    ]),
  );
}

function pointing(content: EntryInput, newIdOf: ReadonlyMap<string, string>): EntryInput {
  const { lead } = content;
  if (!('entryId' in lead)) return content;
  return { ...content, lead: { ...lead, entryId: newIdOf.get(lead.entryId) ?? lead.entryId } };
}

/** The village that it leaves reads of it, too. */
async function recordCopied(
  manager: EntityManager,
  { communityId, person }: Actor,
  calendarId: string,
  number: number,
  at: Date,
): Promise<void> {
  await recordAudit(manager, {
    ...{ at, communityId, actorId: person.id, action: 'entries-copied-away' },
    ...{ subjectType: 'calendar', subjectId: calendarId, details: { number } },
  });
}
