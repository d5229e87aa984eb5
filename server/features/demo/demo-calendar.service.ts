import type { AnswerWord } from '#shared/contracts/reviews.js';
import type { Role } from '#shared/contracts/people.js';
import { addDays, subDays } from 'date-fns';
import type { DataSource, EntityManager } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { PlaceEntity } from '../../db/entities/place.entity.js';
import type { Actor } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { ConsentsService } from '../consents/consents.service.js';
import { villageDay } from '../../policy/viewer.js';
import { CalendarsService } from '../calendars/calendars.service.js';
import { EntriesService } from '../calendars/entries.service.js';
import { SkyDatesService } from '../calendars/sky-dates.service.js';
import { CardSignInService } from '../cards/card-sign-in.service.js';
import { AnswersService } from '../reviews/answers.service.js';
import { SigningService } from '../reviews/signing.service.js';
import { FrozenContentService } from '../versions/frozen-content.service.js';
import { PublishingService } from '../versions/publishing.service.js';
import { VersionsService } from '../versions/versions.service.js';
import { VariantsService } from '../variants/variants.service.js';
import { DEMO_DOMAIN, UPPER_TAZIMEL } from './demo-villages.data.js';
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
  await new DemoRound(dataSource, clock, cast).play();
}

const AGREED = { answer: 'agree', note: '', onBehalfOf: null, witness: null } as const;

interface Cast {
  placeId: string;
  officer: Actor;
  steward: Actor;
  elder: Actor;
  elder2: Actor;
  elder3: Actor;
}

/** The people of the demo village; null where they are not all there (a database without the demo). */
async function findCast(dataSource: DataSource): Promise<Cast | null> {
  const members = await dataSource.getRepository(MembershipEntity).find({
    where: { person: { isDemo: true }, community: { name: UPPER_TAZIMEL.settings.name } },
    relations: { person: true },
  });
  const actor = (mailbox: string): Actor | null => {
    const found = members.find(({ person }) => person.email === `${mailbox}@${DEMO_DOMAIN}`);
    return found ? { person: found.person, communityId: found.communityId, roles: found.roles } : null;
  };
  const [officer, steward, elder, elder2, elder3] = ['officer', 'steward', 'elder', 'elder2', 'elder3'].map(
    actor,
  );
  if (!officer || !steward || !elder || !elder2 || !elder3) return null;
  const place = await dataSource
    .getRepository(PlaceEntity)
    .findOneBy({ communityId: officer.communityId, name: UPPER_TAZIMEL.place.name });
  return place && { placeId: place.id, officer, steward, elder, elder2, elder3 };
}

/** Plays the round; days pass between its steps, and it ends yesterday. */
class DemoRound {
  private at: Date;
  private readonly calendars: CalendarsService;
  private readonly entries: EntriesService;
  private readonly variants: VariantsService;
  private readonly consents: ConsentsService;
  private readonly publishing: PublishingService;
  private readonly answers: AnswersService;
  private readonly signing: SigningService;
  private calendarId = '';
  private withheldId = '';
  private readonly idByCode = new Map<string, string>();

  private readonly manager: EntityManager;

  constructor(
    dataSource: DataSource,
    clock: Clock,
    private readonly cast: Cast,
  ) {
    this.manager = dataSource.manager;
    this.at = subDays(clock.now(), 24);
    const playClock = { now: () => this.at };
    const sky = new SkyDatesService();
    const versions = new VersionsService(dataSource, playClock);
    const contents = new FrozenContentService(dataSource, playClock, sky);
    this.calendars = new CalendarsService(dataSource, playClock);
    this.entries = new EntriesService(dataSource, playClock, sky);
    this.variants = new VariantsService(dataSource, playClock, sky);
    const unspoken = { keepWith: () => Promise.reject(new Error('Nobody speaks in the demo')) };
    this.consents = new ConsentsService(dataSource, playClock, unspoken);
    this.publishing = new PublishingService(dataSource, playClock, contents, versions);
    const cardSignIn = new CardSignInService(dataSource, playClock);
    this.answers = new AnswersService(dataSource, playClock, cardSignIn, unspoken);
    this.signing = new SigningService(dataSource, playClock, versions);
  }

  async play(): Promise<void> {
    await this.compile();
    await this.firstRound();
    await this.secondRound();
  }

  private async compile(): Promise<void> {
    const { officer, placeId } = this.cast;
    const { id } = await this.calendars.create(officer, { placeId, year: DEMO_YEAR });
    this.calendarId = id;
    for (const { code, content } of ENTRIES) {
      const entry = await this.entries.add(officer, id, withKnownWork(content, this.idByCode));
      this.idByCode.set(code, entry.id);
    }
    for (const { code, content, by } of VARIANTS) {
      const giverId = by === null ? null : this.cast[by].person.id;
      await this.variants.add(officer, id, this.idByCode.get(code) ?? '', { ...content, giverId });
    }
    const { elder3 } = this.cast;
    const withheld = { ...WITHHELD_ENTRY, giverId: elder3.person.id };
    this.withheldId = (await this.entries.add(elder3, id, withheld)).id;
    // They tell of a time before there were records.
    await this.manager.update(EntryEntity, { calendarId: id }, { isOlder: true });
    await this.agree();
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
    const { number } = await this.publishing.submit(officer, this.calendarId);
    this.daysLater(2);
    for (const who of [elder, elder2, elder3]) {
      for (const { code } of ENTRIES) await this.answer(who, number, code, 'agree', '');
    }
    await this.answers.put(elder3, this.calendarId, number, this.withheldId, AGREED);
    await this.sign(elder2, number, 'elder');
    await this.sign(elder, number, 'elder');
    this.daysLater(1);
    await this.sign(steward, number, 'steward');
    await this.publishing.publish(officer, this.calendarId, number);
    this.daysLater(9);
  }

  /** Some entries change. One elder keeps to another star; one has not looked at what changed yet. */
  private async secondRound(): Promise<void> {
    const { officer, elder, elder2, elder3 } = this.cast;
    const { items } = await this.entries.list(officer, this.calendarId);
    for (const { code, change } of SECOND_ROUND) {
      const entry = items.find(({ id }) => id === this.idByCode.get(code));
      if (!entry) throw new Error(`The demo has no entry ${code}`);
      await this.entries.update(officer, this.calendarId, entry.id, {
        content: { ...entry.content, ...change },
        version: entry.version,
      });
    }
    this.daysLater(2);
    const { number } = await this.publishing.submit(officer, this.calendarId);
    this.daysLater(3);
    for (const { code, note } of SECOND_ROUND) await this.answer(elder, number, code, 'agree', note);
    // What hangs on the sowing waits for other days now: everybody has looked at it again.
    for (const who of [elder, elder2, elder3]) {
      for (const { code } of TAZIMEL_WEEDING) await this.answer(who, number, code, 'agree', '');
    }
    this.daysLater(2);
    const { code, note } = STANDING_DIFFERENCE;
    await this.answer(elder3, number, code, 'change-this', note);
    await this.answers.letStand(elder3, this.calendarId, number, this.idOf(code));
  }

  private async answer(
    who: Actor,
    number: number,
    code: string,
    answer: AnswerWord,
    note: string,
  ): Promise<void> {
    const input = { answer, note, onBehalfOf: null, witness: null };
    await this.answers.put(who, this.calendarId, number, this.idOf(code), input);
  }

  private async sign(who: Actor, number: number, role: Extract<Role, 'elder' | 'steward'>): Promise<void> {
    await this.signing.sign(who, this.calendarId, number, role);
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
