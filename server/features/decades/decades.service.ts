import { anchoredDates, anchorOf, leadForAnotherYear } from '#shared/calendar/anchors.js';
import type { EntryDates } from '#shared/contracts/calendars.js';
import type { LongLook, LookedYear } from '#shared/contracts/decades.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import { setImmediate } from 'node:timers/promises';
import type { DataSource } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { seesDrafts, type Actor } from '../../http/actor.js';
import { notFound } from '../../http/app-error.js';
import { anchorSight } from '../../policy/anchor-sight.js';
import { markerKeyOfLead, type SkyDatesService } from '../calendars/sky-dates.service.js';
import type { FrozenContentService } from '../versions/frozen-content.service.js';

interface Asked {
  from: number;
  years: number;
  number?: string | undefined;
}

const NOTHING_NEW: ReadonlyMap<string, string> = new Map();

/** The same entries at the same place, reckoned for many years: what next year's officer will find, and the one after. */
export class DecadesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly contents: FrozenContentService,
    private readonly sky: SkyDatesService,
  ) {}

  async read(actor: Actor, calendarId: string, { from, years, number: asked }: Asked): Promise<LongLook> {
    const number = asked ?? (await this.usual(actor, calendarId));
    const { header, entries, label } = await this.contents.read(actor, calendarId, number);
    const mayHang = await this.sightOf(entries);
    const dated: Map<string, EntryDates | null>[] = [];
    for (let year = from; year < from + years; year += 1) {
      dated.push(this.inYear(header.place, year, entries, mayHang));
      // A year of stars is some milliseconds of work; others get their turn between two.
      await setImmediate();
    }
    return {
      ...{ calendarId, number, label, from, years },
      placeName: header.place.name,
      villageLanguageTag: header.villageLanguage.tag,
      entries: entries.map(({ entryId, content }) => ({
        entryId,
        titleVillage: content.titleVillage,
        titleOfficer: content.titleOfficer,
        icon: content.icon,
        kind: content.kind,
        protectiveWatch: content.protectiveWatch,
        years: dated.map((ofYear, index) => lookedYear(from + index, ofYear.get(entryId) ?? null)),
      })),
    };
  }

  private async usual(actor: Actor, calendarId: string): Promise<string> {
    const { publishedNumber } = await this.dataSource
      .getRepository(CalendarEntity)
      .findOneByOrFail({ id: calendarId });
    if (publishedNumber !== null) return String(publishedNumber);
    if (!seesDrafts(actor)) throw notFound();
    return 'draft';
  }

  private async sightOf(entries: readonly VersionEntryBody[]) {
    if (entries.every(({ content }) => anchorOf(content.lead) === null)) return () => true;
    const things = entries.map(({ entryId, content }) => ({
      entryId,
      markerKey: markerKeyOfLead(content.lead),
    }));
    return anchorSight(this.dataSource.manager, things);
  }

  private inYear(
    place: Parameters<SkyDatesService['datesOf']>[0],
    year: number,
    entries: readonly VersionEntryBody[],
    mayHang: (entryId: string, anchorId: string) => boolean,
  ): Map<string, EntryDates | null> {
    const contents = entries.map(({ content }) => ({
      ...content,
      lead: leadForAnotherYear(content.lead, NOTHING_NEW),
    }));
    const own = this.sky.datesOf(place, year, contents);
    const timed = entries.flatMap(({ entryId: id }, index) => {
      const content = contents[index];
      return content ? [{ id, lead: content.lead, timing: content, dates: own[index] ?? null }] : [];
    });
    return anchoredDates(timed, year, { mayHang, actualOf: () => null });
  }
}

/** What is counted from something done stands by its planned days: nobody has done it yet. */
function lookedYear(year: number, dates: EntryDates | null): LookedYear {
  const planned = dates?.counted?.basis === 'waiting' ? dates.counted.beside : null;
  return {
    year,
    window: dates?.window ?? planned,
    isPlanned: planned !== null,
    warnings: dates?.warnings ?? [],
  };
}
