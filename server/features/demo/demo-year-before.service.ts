import type { EntryInput, EntryLead } from '#shared/contracts/calendars.js';
import { addSeconds } from 'date-fns';
import type { DataSource } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { RolledItemEntity } from '../../db/entities/rolled-item.entity.js';
import { ActualDaysService } from '../actual-days/actual-days.service.js';
import { SeasonTasksService } from '../season-reviews/season-tasks.service.js';
import { SeasonWordsService } from '../season-reviews/season-words.service.js';
import { OwnSightingsService } from '../signs/own-sightings.service.js';
import type { Cast } from './demo-cast.service.js';
import { withKnownWork } from './demo-entry.js';
import { yearsContent } from './demo-record.js';
import { demoStage } from './demo-stage.service.js';
import { TAZIMEL_2026, YEARS_LESSON } from './tazimel-2026.data.js';
import { TAZIMEL_ENTRIES } from './tazimel-entries.data.js';
import { TAZIMEL_WEEDING } from './tazimel-weeding.data.js';

const YEAR = 2026;
/** Entries whose days are others once the Cluster was seen, and those counted from the sowing. */
const SEEN_ANEW = ['A03', 'A04', 'A07', 'A08'];
/** Who saw most of the signs. */
const WATCHER = 'Sanwe';

/**
 * The year before the demo's own: published in spring and again once the Cluster was seen, its days and signs marked while
 * it went, looked back at when it was over. It happens in 2026 whatever the day is today.
 */
export class YearBefore {
  private at = '2026-03-02';
  private calendarId = '';
  private readonly idByCode = new Map<string, string>();
  private readonly taskIds: string[] = [];
  private seconds = 0;
  /** A second passes with every look at it, so that what was said has an order. */
  private readonly clock = { now: () => addSeconds(new Date(`${this.at}T15:00:00Z`), this.seconds++) };
  private readonly stage;

  constructor(
    private readonly dataSource: DataSource,
    private readonly cast: Cast,
  ) {
    this.stage = demoStage(dataSource, this.clock);
  }

  async play(): Promise<void> {
    const { placeId, officer } = this.cast;
    await this.dataSource.getRepository(CalendarEntity).delete({ placeId, year: YEAR });
    this.calendarId = (await this.stage.calendars.create(officer, { placeId, year: YEAR })).id;
    for (const line of TAZIMEL_2026) {
      const content = withKnownWork(yearsContent(knownContent(line.code), line), this.idByCode);
      const { id } = await this.stage.entries.add(officer, this.calendarId, content);
      this.idByCode.set(line.code, id);
    }
    await this.publish(
      '2026-03-14',
      TAZIMEL_2026.map(({ code }) => code),
    );
    await this.goThroughTheYear();
    await this.lookBack();
  }

  /** The same work of the next year's draft: what was decided stands beside it. */
  async isSameAs(code: string, itemId: string, calendarId: string): Promise<void> {
    const fromId = this.idByCode.get(code);
    if (fromId === undefined) return;
    await this.dataSource.getRepository(RolledItemEntity).insert({
      ...{ itemId, itemType: 'entry', fromId, calendarId, before: null, timing: null },
    });
  }

  /** What was decided and is done already in the next year's draft. */
  async tickOff(nextCalendarId: string, at: Date): Promise<void> {
    const tasks = new SeasonTasksService(this.dataSource, { now: () => at });
    for (const id of this.taskIds) await tasks.tick(this.cast.officer, nextCalendarId, id);
  }

  private async publish(day: string, codes: readonly string[]): Promise<void> {
    const { officer, steward, elder, elder2 } = this.cast;
    const { publishing, answers, signing } = this.stage;
    this.at = day;
    const { number } = await publishing.submit(officer, this.calendarId);
    const agreed = { answer: 'agree', note: '', onBehalfOf: null, witness: null } as const;
    for (const who of [elder, elder2]) {
      for (const code of codes) await answers.put(who, this.calendarId, number, this.idOf(code), agreed);
      await signing.sign(who, this.calendarId, number, 'elder');
    }
    await signing.sign(steward, this.calendarId, number, 'steward');
    await publishing.publish(officer, this.calendarId, number);
  }

  private async goThroughTheYear(): Promise<void> {
    await this.watch();
    await this.seeTheCluster();
    const { officer } = this.cast;
    const days = new ActualDaysService(this.dataSource, this.clock);
    for (const { code, done } of TAZIMEL_2026) {
      if (done === undefined) continue;
      this.at = done.to ?? done.from;
      await days.put(officer, { calendarId: this.calendarId, entryId: this.idOf(code) }, done);
    }
  }

  /** Signs in the entries' own words, each marked on the day on which it was seen. */
  private async watch(): Promise<void> {
    const { officer } = this.cast;
    const sightings = new OwnSightingsService(this.dataSource, this.clock);
    const { items } = await this.stage.entries.list(officer, this.calendarId);
    for (const { code, signs } of TAZIMEL_2026) {
      const entryId = this.idOf(code);
      const list = items.find(({ id }) => id === entryId)?.content.record?.signs.list ?? [];
      for (const { name, came } of signs) {
        const ownId = list.find((sign) => sign.name === name)?.ownId;
        if (came === undefined || ownId === undefined) continue;
        this.at = came;
        const sign = { calendarId: this.calendarId, entryId, ownId };
        await sightings.mark(officer, sign, { day: came, who: WATCHER });
      }
    }
  }

  private async seeTheCluster(): Promise<void> {
    const { officer } = this.cast;
    this.at = '2026-06-09';
    const { items } = await this.stage.entries.list(officer, this.calendarId);
    for (const { code, seen } of TAZIMEL_2026) {
      const entry = items.find(({ id }) => id === this.idOf(code));
      if (seen === undefined || entry?.content.lead.type !== 'marker-as-seen') continue;
      const lead: EntryLead = { ...entry.content.lead, seen };
      await this.stage.entries.update(officer, this.calendarId, entry.id, {
        content: { ...entry.content, lead },
        version: entry.version,
      });
    }
    await this.publish('2026-06-10', SEEN_ANEW);
  }

  private async lookBack(): Promise<void> {
    this.at = '2026-11-30';
    const { officer, steward } = this.cast;
    const words = new SeasonWordsService(this.dataSource, this.clock);
    for (const { code, lessons, decision } of TAZIMEL_2026) {
      const entryId = this.idOf(code);
      for (const { by, text } of lessons) {
        await words.addLesson(this.cast[by], this.calendarId, { entryId, text });
      }
      if (decision === undefined) continue;
      const { isDone, ...said } = decision;
      const { id } = await words.decide(officer, this.calendarId, { entryId, ...said });
      if (isDone) this.taskIds.push(id);
    }
    await words.addLesson(steward, this.calendarId, { entryId: null, text: YEARS_LESSON });
  }

  private idOf(code: string): string {
    const id = this.idByCode.get(code);
    if (id === undefined) throw new Error(`The demo has no entry ${code} in ${String(YEAR)}`);
    return id;
  }
}

function knownContent(code: string): EntryInput {
  const known = [...TAZIMEL_ENTRIES, ...TAZIMEL_WEEDING].find((entry) => entry.code === code);
  if (known === undefined) throw new Error(`The demo has no entry ${code}`);
  return known.content;
}
