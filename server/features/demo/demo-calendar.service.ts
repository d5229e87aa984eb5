import type { AnswerWord } from '#shared/contracts/reviews.js';
import type { Role } from '#shared/contracts/people.js';
import { addDays, subDays } from 'date-fns';
import type { DataSource, EntityManager } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import type { Actor } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { ConsentsService } from '../consents/consents.service.js';
import { villageDay } from '../../policy/viewer.js';
import { findCast, type Cast } from './demo-cast.service.js';
import { demoStage, UNSPOKEN } from './demo-stage.service.js';
import { YearBefore } from './demo-year-before.service.js';
import { TAZIMEL_CONSENTS, WITHHELD_CODE } from './tazimel-consents.data.js';
import { VARIANTS, WITHHELD_ENTRY } from './tazimel-beside.data.js';
import { SECOND_ROUND, STANDING_DIFFERENCE, TAZIMEL_ENTRIES } from './tazimel-entries.data.js';
import { TAZIMEL_WEEDING } from './tazimel-weeding.data.js';
import { withKnownWork } from './demo-entry.js';

const DEMO_YEAR = 2027;
const SUBMISSIONS = 2;
/** In the order of the event list. */
const ENTRIES = [...TAZIMEL_ENTRIES, ...TAZIMEL_WEEDING].sort((a, b) => a.code.localeCompare(b.code));

/**
 * The demo calendar goes the same way as every other: compiled, answered, signed, published; then changed and sent to
 * review again. Steps are separate transactions, so a start that broke off half-way begins the calendar anew.
 */
export async function seedDemoCalendar(dataSource: DataSource, clock: Clock): Promise<void> {
  const cast = await findCast(dataSource);
  if (cast === null) return;
  const calendars = dataSource.getRepository(CalendarEntity);
  const begun = await calendars.findOneBy({ placeId: cast.placeId, year: DEMO_YEAR });
  if (begun !== null && begun.submissionCount >= SUBMISSIONS) return;
  if (begun !== null) await calendars.delete({ id: begun.id });
  const yearBefore = new YearBefore(dataSource, cast);
  await yearBefore.play();
  await new DemoRound(dataSource, clock, cast, yearBefore).play();
}

const AGREED = { answer: 'agree', note: '', onBehalfOf: null, witness: null } as const;

/** Plays the round; days pass between its steps, and it ends yesterday. */
class DemoRound {
  private at: Date;
  private readonly consents: ConsentsService;
  private readonly stage;
  private calendarId = '';
  private withheldId = '';
  private readonly idByCode = new Map<string, string>();

  private readonly manager: EntityManager;

  constructor(
    dataSource: DataSource,
    clock: Clock,
    private readonly cast: Cast,
    private readonly yearBefore: YearBefore,
  ) {
    this.manager = dataSource.manager;
    this.at = subDays(clock.now(), 24);
    const playClock = { now: () => this.at };
    this.stage = demoStage(dataSource, playClock);
    this.consents = new ConsentsService(dataSource, playClock, UNSPOKEN);
  }

  async play(): Promise<void> {
    await this.compile();
    await this.firstRound();
    await this.secondRound();
    await this.yearBefore.tickOff(this.calendarId, this.at);
  }

  private async compile(): Promise<void> {
    const { officer, placeId } = this.cast;
    const { id } = await this.stage.calendars.create(officer, { placeId, year: DEMO_YEAR });
    this.calendarId = id;
    for (const { code, content } of ENTRIES) {
      const entry = await this.stage.entries.add(officer, id, withKnownWork(content, this.idByCode));
      this.idByCode.set(code, entry.id);
    }
    for (const { code, content, by } of VARIANTS) {
      const giverId = by === null ? null : this.cast[by].person.id;
      await this.stage.variants.add(officer, id, this.idByCode.get(code) ?? '', { ...content, giverId });
    }
    const { elder3 } = this.cast;
    const withheld = { ...WITHHELD_ENTRY, giverId: elder3.person.id };
    this.withheldId = (await this.stage.entries.add(elder3, id, withheld)).id;
    // They tell of a time before there were records.
    await this.manager.update(EntryEntity, { calendarId: id }, { isOlder: true });
    await this.agree();
    // After the asking: what was agreed then is about this year's entries alone.
    for (const [code, entryId] of this.idByCode) await this.yearBefore.isSameAs(code, entryId, id);
    this.daysLater(3);
  }

  /** What was said to the officer who asked; what Elder A-3 keeps they agreed to themself. */
  private async agree(): Promise<void> {
    for (const { code, by, reviewInDays, said } of TAZIMEL_CONSENTS) {
      const { person, communityId } = this.cast[by];
      const isOwn = code === WITHHELD_CODE;
      await this.consents.add(isOwn ? this.cast[by] : this.cast.officer, {
        ...said,
        ...{ itemType: 'entry', itemId: isOwn ? this.withheldId : this.idOf(code) },
        ...{ giverId: person.id, giverName: person.displayName },
        askedOn: await villageDay(this.manager, communityId, this.at),
        reviewBy: await villageDay(this.manager, communityId, addDays(this.at, reviewInDays)),
      });
    }
  }

  /** Everybody agrees, and the village's rule signs. */
  private async firstRound(): Promise<void> {
    const { officer, elder, elder2, elder3, steward } = this.cast;
    const { number } = await this.stage.publishing.submit(officer, this.calendarId);
    this.daysLater(2);
    for (const who of [elder, elder2, elder3]) {
      for (const { code } of ENTRIES) await this.answer(who, number, code, 'agree', '');
    }
    await this.stage.answers.put(elder3, this.calendarId, number, this.withheldId, AGREED);
    await this.sign(elder2, number, 'elder');
    await this.sign(elder, number, 'elder');
    this.daysLater(1);
    await this.sign(steward, number, 'steward');
    await this.stage.publishing.publish(officer, this.calendarId, number);
    this.daysLater(9);
  }

  /** Some entries change. One elder keeps to another star; one has not looked at what changed yet. */
  private async secondRound(): Promise<void> {
    const { officer, elder, elder2, elder3 } = this.cast;
    const { items } = await this.stage.entries.list(officer, this.calendarId);
    for (const { code, change } of SECOND_ROUND) {
      const entry = items.find(({ id }) => id === this.idByCode.get(code));
      if (!entry) throw new Error(`The demo has no entry ${code}`);
      await this.stage.entries.update(officer, this.calendarId, entry.id, {
        content: { ...entry.content, ...change },
        version: entry.version,
      });
    }
    this.daysLater(2);
    const { number } = await this.stage.publishing.submit(officer, this.calendarId);
    this.daysLater(3);
    for (const { code, note } of SECOND_ROUND) await this.answer(elder, number, code, 'agree', note);
    // What hangs on the sowing waits for other days now: everybody has looked at it again.
    for (const who of [elder, elder2, elder3]) {
      for (const { code } of TAZIMEL_WEEDING) await this.answer(who, number, code, 'agree', '');
    }
    this.daysLater(2);
    const { code, note } = STANDING_DIFFERENCE;
    await this.answer(elder3, number, code, 'change-this', note);
    await this.stage.answers.letStand(elder3, this.calendarId, number, this.idOf(code));
  }

  private async answer(
    who: Actor,
    number: number,
    code: string,
    answer: AnswerWord,
    note: string,
  ): Promise<void> {
    const input = { answer, note, onBehalfOf: null, witness: null };
    await this.stage.answers.put(who, this.calendarId, number, this.idOf(code), input);
  }

  private async sign(who: Actor, number: number, role: Extract<Role, 'elder' | 'steward'>): Promise<void> {
    await this.stage.signing.sign(who, this.calendarId, number, role);
  }

  private idOf(code: string): string {
    const id = this.idByCode.get(code);
    if (id === undefined) throw new Error(`The demo has no entry ${code}`);
    return id;
  }

  private daysLater(days: number): void {
    this.at = addDays(this.at, days);
  }
}
