import { lateSaid, signsSaid } from '#shared/calendar/said-words.js';
import { boardOf } from '#shared/calendar/variants.js';
import { boardDayOf } from '#shared/calendar/board-days.js';
import type { Calendar, EntryInput } from '#shared/contracts/calendars.js';
import type { Place } from '#shared/contracts/places.js';
import type { OpenWindow, Today } from '#shared/contracts/today.js';
import { civilDateFromIso } from '#shared/kernel/iso-date.js';
import type { Actor } from '../../http/actor.js';
import { notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import type { ActualDaysService } from '../actual-days/actual-days.service.js';
import type { AfterDeathService } from '../after-death/after-death.service.js';
import type { CalendarsService } from '../calendars/calendars.service.js';
import type { ConsentsService } from '../consents/consents.service.js';
import { civilDateAt } from '../places/place-day.service.js';
import type { PlacesService } from '../places/places.service.js';
import type { FrozenContentService } from '../versions/frozen-content.service.js';
import type { ComingMarkersService, PublishedCalendar } from './coming-markers.service.js';
import { comingSigns } from './coming-signs.service.js';
import type { WaitingService } from './waiting.service.js';

export interface TodayParts {
  places: PlacesService;
  calendars: CalendarsService;
  contents: FrozenContentService;
  coming: ComingMarkersService;
  waiting: WaitingService;
  consents: ConsentsService;
  afterDeath: Pick<AfterDeathService, 'countOpen'>;
  actualDays: ActualDaysService;
  clock: Clock;
}

interface CalendarContent extends PublishedCalendar {
  calendarId: string;
}

export class TodayService {
  constructor(private readonly parts: TodayParts) {}

  /** At the given place of the village, else at the one whose calendar hangs on the wall. */
  async read(actor: Actor, placeId: string | null): Promise<Today> {
    const { places, calendars, coming, waiting, clock } = this.parts;
    const all = await calendars.listOf(actor.person, actor.communityId);
    const chosen = choosePlace(await places.list(actor), all, placeId, clock.now());
    const place = chosen && (await places.withFigures(actor, chosen));
    const date = place === null ? clock.now().toISOString().slice(0, 10) : civilDateAt(clock.now(), place);
    const { year, month } = civilDateFromIso(date);
    const { hole, row } = boardDayOf(date);
    const published = place === null ? [] : await this.publishedAround(actor, all, place.id, year);
    const markers = place === null ? { items: [], isLater: false } : coming.around(place, date, published);
    return {
      date,
      hole,
      row,
      placeId: place?.id ?? null,
      placeName: place?.name ?? null,
      clarity: place?.clarityByMonth[month - 1] ?? null,
      coming: markers.items,
      comingIsLater: markers.isLater,
      comingSigns: comingSigns(published, date),
      openWindows: published.flatMap((calendar) => openWindows(calendar, date)).sort(byLastDay),
      waiting: await waiting.of(actor, all, year),
      consentsDue: await this.parts.consents.countDue(actor),
      heirsOpen: await this.parts.afterDeath.countOpen(actor),
    };
  }

  /** Windows and ranges reach over New Year, so the calendars of both neighbouring years count. */
  private async publishedAround(
    actor: Actor,
    calendars: readonly Calendar[],
    placeId: string,
    year: number,
  ): Promise<CalendarContent[]> {
    const found: CalendarContent[] = [];
    for (const calendar of calendars) {
      if (calendar.placeId !== placeId || Math.abs(calendar.year - year) > 1) continue;
      if (calendar.published === null) continue;
      const number = String(calendar.published.number);
      const { header, entries } = await this.parts.contents.read(actor, calendar.id, number);
      found.push({
        ...{ calendarId: calendar.id, header },
        entries: await this.parts.actualDays.daysSince(header.year, entries),
      });
    }
    return found;
  }
}

/** With a published calendar of this year, else with any calendar, else the first by name. */
function choosePlace(
  places: readonly Place[],
  calendars: readonly Calendar[],
  placeId: string | null,
  now: Date,
): Place | null {
  if (placeId !== null) {
    const asked = places.find((place) => place.id === placeId);
    if (!asked) throw notFound();
    return asked;
  }
  const rank = (place: Place) => {
    const own = calendars.filter((calendar) => calendar.placeId === place.id);
    const year = civilDateFromIso(civilDateAt(now, place)).year;
    if (own.some((calendar) => calendar.published !== null && calendar.year === year)) return 0;
    return own.length > 0 ? 1 : 2;
  };
  return [...places].sort((a, b) => rank(a) - rank(b))[0] ?? null;
}

function openWindows({ calendarId, header, entries }: CalendarContent, date: string): OpenWindow[] {
  return entries.flatMap((entry) => {
    const { entryId, content } = entry;
    const { window } = boardOf(entry);
    if (window === null || date < window.earliest || date > window.lastAdvised) return [];
    return [
      {
        calendarId,
        entryId,
        titleOfficer: content.titleOfficer,
        titleVillage: content.titleVillage,
        icon: content.icon,
        window,
        ifLate: lateSaid(content),
        otherSigns: signsSaid(content),
        hasLastDate: content.hasLastDate,
        year: header.year,
        ...awaitedOf(content),
      },
    ];
  });
}

/** The signs for which people wait, where any is named. */
function awaitedOf({ record }: EntryInput): Pick<OpenWindow, 'awaits'> {
  if (record === undefined || record.signs.list.length === 0) return {};
  const { signs, work } = record;
  const { leadDays, graceDays } = record.when;
  return { awaits: { signs, when: { leadDays, graceDays }, work: { stop: work.stop } } };
}

/** What ends first comes first. */
function byLastDay(a: OpenWindow, b: OpenWindow): number {
  return a.window.lastAdvised < b.window.lastAdvised
    ? -1
    : Number(a.window.lastAdvised > b.window.lastAdvised);
}
