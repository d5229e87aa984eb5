import { CALENDAR_LAST_YEAR } from '#shared/contracts/calendars.js';
import { wordlessTiming } from '#shared/calendar/wordless-timing.js';
import type { EntryDates } from '#shared/contracts/calendars.js';
import type { PlaceSnapshot } from '#shared/contracts/stars.js';
import { ENGINE_VERSION } from '#shared/sky/index.js';
import type { RolledCalendar, RolloverReport } from '#shared/contracts/rollovers.js';
import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { RolledItemEntity } from '../../db/entities/rolled-item.entity.js';
import { RolloverEntity } from '../../db/entities/rollover.entity.js';
import { isDuplicate } from '../../db/duplicate.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { consentsById } from '../../policy/consent.repository.js';
import { isDue, isOpen, mayUse, stateOn, type ConsentFact } from '../../policy/consents.js';
import { entrySight, figureIdOf } from '../../policy/entry-sight.js';
import { viewerOf } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import { recordKeptReads } from '../audit/kept-reads.service.js';
import { lockCalendar, readDraft, recordContribution, type DraftEntry } from '../calendars/draft.service.js';
import { markerKeyOfLead, type SkyDatesService } from '../calendars/sky-dates.service.js';
import { personNames } from '../people/person-names.service.js';
import type { WhyMovedService } from '../versions/why-moved.service.js';
import { carryOver } from './carry-over.service.js';
import { toRolledEntry } from './rollovers.mapper.js';

/** Next year's draft from this year's: the pairings stay, the sky gives new days, and nobody has agreed to anything. */
export class RolloversService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly sky: SkyDatesService,
    private readonly reasons: WhyMovedService,
  ) {}

  async rollOver(actor: Actor, fromCalendarId: string): Promise<RolledCalendar> {
    return inTransaction(this.dataSource, async (manager) => {
      const from = await lockCalendar(manager, fromCalendarId);
      const year = from.year + 1;
      if (year > CALENDAR_LAST_YEAR) throw conflict('no-year-after');
      const { placeId } = from;
      const next = await manager.findOneBy(CalendarEntity, { placeId, year });
      if (next !== null) {
        const known = { calendarId: next.id, fromCalendarId };
        if (!(await manager.existsBy(RolloverEntity, known))) throw conflict('calendar-exists');
        return { calendarId: next.id, hasReport: next.submissionCount === 0 };
      }
      const { place, entries } = await readDraft(manager, this.sky, from);
      const calendarId = await this.begin(manager, actor, from, year, place);
      await carryOver(manager, entries, calendarId, this.clock.now());
      return { calendarId, hasReport: true };
    });
  }

  /** What the new year changed, as far as the person sees the entries. */
  async report(actor: Actor, calendarId: string): Promise<RolloverReport> {
    const { manager } = this.dataSource;
    const rollover = await manager.findOneBy(RolloverEntity, { calendarId });
    const calendar = await manager.findOne(CalendarEntity, {
      where: { id: calendarId },
      relations: { place: true },
    });
    if (rollover === null || calendar === null || calendar.submissionCount > 0) throw notFound();
    const from = await manager.findOneByOrFail(CalendarEntity, { id: rollover.fromCalendarId });
    const { place, entries } = await readDraft(manager, this.sky, calendar);
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const sight = await entrySight(manager, viewer, entries.map(thingOf));
    const seen = entries.filter((entry) => sight.appearance(thingOf(entry)) === 'full');
    const rows = await manager.findBy(RolledItemEntity, { calendarId, itemType: 'entry' });
    const rolledOf = new Map(rows.map((row) => [row.itemId, row]));
    const placeBefore = { ...(rollover.place ?? place), figures: place.figures };
    const inUse = `${String(calendar.year)}-01-01`;
    const needs = await consentNeeded(manager, seen, viewer.today > inUse ? viewer.today : inUse);
    const names = await personNames(manager, [rollover.rolledBy]);
    const reads = seen.map(({ row }) => row.id);
    await recordKeptReads(manager, viewer, this.clock.now(), 'entry', reads);
    return {
      calendarId,
      fromCalendarId: from.id,
      fromYear: from.year,
      year: calendar.year,
      placeName: calendar.place.name,
      rolledAt: rollover.rolledAt.toISOString(),
      rolledBy: names.get(rollover.rolledBy) ?? '',
      entries: seen.flatMap((entry) => {
        const { before, timing } = rolledOf.get(entry.row.id) ?? {};
        if (!before) return [];
        const { content } = entry.row;
        const sideBefore = {
          ...{ year: from.year, place: placeBefore, engineVersion: rollover.engineVersion ?? ENGINE_VERSION },
          timing: timing ?? wordlessTiming(content),
        };
        const sideAfter = {
          ...{ year: calendar.year, place, engineVersion: ENGINE_VERSION },
          ...{ timing: wordlessTiming(content), dates: entry.dates },
        };
        const facts = {
          ...{ entry, before, years: calendar.year - from.year, needsConsent: needs.has(entry.row.id) },
          why: (dates: EntryDates) => this.reasons.of({ ...sideBefore, dates }, sideAfter),
        };
        return [toRolledEntry(facts)];
      }),
    };
  }

  private async begin(
    manager: EntityManager,
    actor: Actor,
    { communityId, placeId, id: fromCalendarId }: CalendarEntity,
    year: number,
    { figures: _figures, ...place }: PlaceSnapshot,
  ): Promise<string> {
    const calendarId = randomUUID();
    const at = this.clock.now();
    try {
      await manager.insert(CalendarEntity, {
        ...{ id: calendarId, communityId, placeId, year, outNumber: null, publishedNumber: null },
        ...{ createdAt: at, updatedAt: at },
      });
    } catch (error) {
      throw isDuplicate(error) ? conflict('calendar-exists') : error;
    }
    const rolledBy = actor.person.id;
    await manager.insert(RolloverEntity, {
      ...{ calendarId, fromCalendarId, rolledBy, rolledAt: at },
      ...{ place, engineVersion: ENGINE_VERSION },
    });
    await recordContribution(manager, calendarId, actor.person.id, at);
    await recordAudit(manager, {
      ...{ at, communityId, actorId: actor.person.id, action: 'calendar-rolled-over' },
      ...{ subjectType: 'calendar', subjectId: calendarId, details: { placeId, fromYear: year - 1, year } },
    });
    return calendarId;
  }
}

function thingOf({ row }: DraftEntry) {
  return { entryId: row.id, markerKey: markerKeyOfLead(row.content.lead) };
}

/** Entries about which somebody is to be asked by that day: about themselves, or about the figure that they go by. */
async function consentNeeded(
  manager: EntityManager,
  entries: readonly DraftEntry[],
  day: string,
): Promise<Set<string>> {
  const figureOf = (entry: DraftEntry) => figureIdOf(thingOf(entry).markerKey);
  const ids = entries.map(({ row }) => row.id);
  const consentsOf = await consentsById(manager, 'entry', ids);
  const figureIds = entries.flatMap((entry) => figureOf(entry) ?? []);
  const figureConsentsOf = await consentsById(manager, 'figure', figureIds);
  const asks = (consents: readonly ConsentFact[]) =>
    consents.some((consent) => {
      const state = stateOn(consent, day);
      return state === 'lapsed' || isOpen(state) || isDue(consent, day);
    });
  const needing = entries.filter((entry) => {
    const { row } = entry;
    const figureId = figureOf(entry);
    const own = consentsOf(row.id);
    const neverAsked = own.length === 0 && !mayUse(own, 'print', row.content.kind, day);
    return neverAsked || asks(own) || (figureId !== null && asks(figureConsentsOf(figureId)));
  });
  return new Set(needing.map(({ row }) => row.id));
}
