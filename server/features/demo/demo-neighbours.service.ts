import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { addDays, subDays } from 'date-fns';
import type { DataSource } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { PlaceEntity } from '../../db/entities/place.entity.js';
import { VillageGroupEntity } from '../../db/entities/village-group.entity.js';
import type { Actor } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import type { EntriesService } from '../calendars/entries.service.js';
import type { AnswersService } from '../reviews/answers.service.js';
import { OwnAnswersService } from '../reviews/own-answers.service.js';
import type { SigningService } from '../reviews/signing.service.js';
import { GroupsService } from '../sharing/groups.service.js';
import { demoStage } from './demo-stage.service.js';
import { withKnownWork, type DemoEntry, type DemoVariant } from './demo-entry.js';
import { DEMO_DOMAIN, THOLMERE_LANDING, VARDESCA_TERRACES, type DemoVillage } from './demo-villages.data.js';
import { BERRY_WEEK, THOLMERE_ENTRIES, THOLMERE_VARIANTS } from './tholmere-entries.data.js';
import { LAMP_EVENING, VARDESCA_ENTRIES, VARDESCA_VARIANTS } from './vardesca-entries.data.js';

const DEMO_YEAR = 2027;

/** What a neighbouring village's calendar holds, and who does what. People are named by their mailboxes. */
interface Neighbour {
  village: DemoVillage;
  entries: readonly DemoEntry[];
  variants: readonly DemoVariant[];
  kept: DemoEntry;
  group: { name: string; founder: string; members: readonly string[] };
  officer: string;
  steward: string;
  /** Those who sign, in this order; nobody where the calendar stays in review. */
  signers: readonly string[];
  /** Has answered some entries where the calendar stays in review. */
  firstToAnswer: string;
}

const NEIGHBOURS: readonly Neighbour[] = [
  {
    village: VARDESCA_TERRACES,
    entries: VARDESCA_ENTRIES,
    variants: VARDESCA_VARIANTS,
    kept: LAMP_EVENING,
    group: { name: 'Lamp-makers', founder: 'elder-b2', members: ['elder-b2', 'observer2'] },
    officer: 'officer2',
    steward: 'steward2',
    signers: ['elder-b2', 'elder-b1'],
    firstToAnswer: 'elder-b2',
  },
  {
    village: THOLMERE_LANDING,
    entries: THOLMERE_ENTRIES,
    variants: THOLMERE_VARIANTS,
    kept: BERRY_WEEK,
    group: { name: 'Pickers', founder: 'elder-c3', members: ['elder-c3', 'observer3'] },
    officer: 'officer3',
    steward: 'steward3',
    signers: [],
    firstToAnswer: 'elder-c2',
  },
];

const AGREED = { answer: 'agree', note: '' } as const;
const IN_PERSON = { ...AGREED, onBehalfOf: null, witness: null } as const;
const ANSWERED_AT_FIRST = 3;

/** The calendars of the second and the third village: one published, one in review. What broke off before it was submitted begins anew. */
export async function seedNeighbourCalendars(dataSource: DataSource, clock: Clock): Promise<void> {
  for (const neighbour of NEIGHBOURS) await new NeighbourRound(dataSource, clock, neighbour).play();
}

/** Days pass between the steps; each is a transaction of its own, through the services that everybody uses. */
class NeighbourRound {
  private at: Date;
  private people = new Map<string, Actor>();

  constructor(
    private readonly dataSource: DataSource,
    clock: Clock,
    private readonly neighbour: Neighbour,
  ) {
    this.at = subDays(clock.now(), 20);
  }

  async play(): Promise<void> {
    const { village, officer } = this.neighbour;
    this.people = await this.findPeople();
    if (!this.castOf().every((mailbox) => this.people.has(mailbox))) return;
    const { communityId } = this.person(officer);
    const place = await this.dataSource
      .getRepository(PlaceEntity)
      .findOneBy({ communityId, name: village.place.name });
    if (place === null) return;
    const calendars = this.dataSource.getRepository(CalendarEntity);
    const begun = await calendars.findOneBy({ placeId: place.id, year: DEMO_YEAR });
    if (begun !== null && begun.submissionCount > 0) return;
    if (begun !== null) await calendars.delete({ id: begun.id });
    await this.playAt(place.id);
  }

  private async playAt(placeId: string): Promise<void> {
    const { dataSource, neighbour } = this;
    const clock = { now: () => this.at };
    const { calendars, entries, variants, publishing, answers, signing } = demoStage(dataSource, clock);
    const officer = this.person(neighbour.officer);
    const { id } = await calendars.create(officer, { placeId, year: DEMO_YEAR });
    const idByCode = new Map<string, string>();
    for (const { code, content } of neighbour.entries) {
      idByCode.set(code, (await entries.add(officer, id, withKnownWork(content, idByCode))).id);
    }
    for (const { code, by, content } of neighbour.variants) {
      const giverId = by === null ? null : this.person(by).person.id;
      await variants.add(officer, id, idByCode.get(code) ?? '', { ...content, giverId });
    }
    const keptId = await this.keep(entries, id, await this.groupId());
    // They tell of a time before there were records.
    await dataSource.manager.update(EntryEntity, { calendarId: id }, { isOlder: true });
    this.at = addDays(this.at, 3);
    const { number } = await publishing.submit(officer, id);
    this.at = addDays(this.at, 3);
    await this.answer(answers, id, number, [...idByCode.values()]);
    if (neighbour.signers.length === 0) return;
    await this.sign(id, number, keptId, signing);
    await publishing.publish(officer, id, number);
  }

  /** Written down by whoever founded the group, as a thing of the group. */
  private async keep(entries: EntriesService, calendarId: string, groupId: string): Promise<string> {
    const { kept, group } = this.neighbour;
    const content = {
      ...kept.content,
      ...{ sharingLevel: 'group' as const, sharing: { ...PLAIN_DETAILS, groupId } },
    };
    return (await entries.add(this.person(group.founder), calendarId, content)).id;
  }

  private async groupId(): Promise<string> {
    const { name, founder, members } = this.neighbour.group;
    const actor = this.person(founder);
    const { communityId } = actor;
    const there = await this.dataSource.getRepository(VillageGroupEntity).findOneBy({ communityId, name });
    if (there !== null) return there.id;
    const groups = new GroupsService(this.dataSource, { now: () => this.at });
    const memberIds = members.map((mailbox) => this.person(mailbox).person.id);
    return (await groups.add(actor, { name, memberIds })).id;
  }

  /** Everybody who signs answers every entry of the village; else one has begun. */
  private async answer(
    answers: AnswersService,
    calendarId: string,
    number: number,
    entryIds: readonly string[],
  ): Promise<void> {
    const { signers, firstToAnswer } = this.neighbour;
    const who = signers.length > 0 ? signers : [firstToAnswer];
    const asked = signers.length > 0 ? entryIds : entryIds.slice(0, ANSWERED_AT_FIRST);
    for (const mailbox of who) {
      for (const entryId of asked) {
        await answers.put(this.person(mailbox), calendarId, number, entryId, IN_PERSON);
      }
    }
  }

  private async sign(
    calendarId: string,
    number: number,
    keptId: string,
    signing: SigningService,
  ): Promise<void> {
    const { group, signers, steward } = this.neighbour;
    const own = new OwnAnswersService(this.dataSource, { now: () => this.at });
    for (const mailbox of group.members) {
      if (mailbox === group.founder) continue;
      await own.put(this.person(mailbox), calendarId, number, keptId, AGREED);
    }
    for (const mailbox of signers) await signing.sign(this.person(mailbox), calendarId, number, 'elder');
    this.at = addDays(this.at, 1);
    await signing.sign(this.person(steward), calendarId, number, 'steward');
  }

  /** A database whose demo is older, or none, does not hold all of them: nothing is played there. */
  private castOf(): string[] {
    const { officer, steward, signers, firstToAnswer, group, variants } = this.neighbour;
    const givers = variants.flatMap(({ by }) => (by === null ? [] : [by]));
    return [officer, steward, firstToAnswer, ...signers, ...group.members, ...givers];
  }

  private person(mailbox: string): Actor {
    const found = this.people.get(mailbox);
    if (found === undefined) throw new Error(`The demo has nobody at ${mailbox}`);
    return found;
  }

  private async findPeople(): Promise<Map<string, Actor>> {
    const members = await this.dataSource.getRepository(MembershipEntity).find({
      where: { person: { isDemo: true }, community: { name: this.neighbour.village.settings.name } },
      relations: { person: true },
    });
    return new Map(
      members.map(({ person, communityId, roles }) => [
        (person.email ?? '').replace(`@${DEMO_DOMAIN}`, ''),
        { person, communityId, roles },
      ]),
    );
  }
}
