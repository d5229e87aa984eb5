import type { Calendar } from '#shared/contracts/calendars.js';
import type { AnswerWord } from '#shared/contracts/reviews.js';
import type { WaitingItem } from '#shared/contracts/today.js';
import type { Version } from '#shared/contracts/versions.js';
import { hasRole, seesDrafts, type Actor } from '../../http/actor.js';
import type { AnswerList, AnswersService } from '../reviews/answers.service.js';
import type { OwnAnswersService } from '../reviews/own-answers.service.js';
import type { VersionsService } from '../versions/versions.service.js';

/** What holds others up comes first. */
const ORDER: readonly WaitingItem['kind'][] = [
  'elder-said-not-for-board',
  'elder-asked-change',
  'ready-to-publish',
  'sign-as-steward',
  'sign-as-elder',
  'answer-entries',
  'answer-own-entries',
  'review-progress',
  'go-on-with-draft',
  'print-published',
];

/** What waits for a person, by the roles that they hold in the village. */
export class WaitingService {
  constructor(
    private readonly versions: VersionsService,
    private readonly answers: AnswersService,
    private readonly own: OwnAnswersService,
  ) {}

  /** `year` is the civil year at the village: calendars of years that are over wait for nobody. */
  async of(actor: Actor, calendars: readonly Calendar[], year: number): Promise<WaitingItem[]> {
    const items: WaitingItem[] = [];
    for (const calendar of calendars) {
      if (calendar.year < year) continue;
      if (seesDrafts(actor)) items.push(...(await this.inTheMaking(actor, calendar)));
      if (hasRole(actor, 'staff') && calendar.published !== null) {
        const { number, label } = calendar.published;
        items.push(item('print-published', calendar, { number, label }));
      }
    }
    items.push(
      ...(await this.ofTheirOwn(
        actor,
        calendars.filter((calendar) => calendar.year >= year),
      )),
    );
    return items.sort((a, b) => ORDER.indexOf(a.kind) - ORDER.indexOf(b.kind) || a.year - b.year);
  }

  /** Entries in review that the person keeps with others, beside what their roles ask of them. */
  private async ofTheirOwn(actor: Actor, calendars: readonly Calendar[]): Promise<WaitingItem[]> {
    const byId = new Map(calendars.map((calendar) => [calendar.id, calendar]));
    return (await this.own.progress(actor, [...byId.keys()])).flatMap(
      ({ calendarId, number, answered, of }) => {
        const calendar = byId.get(calendarId);
        if (calendar === undefined || answered === of) return [];
        return [item('answer-own-entries', calendar, { number, done: answered, of })];
      },
    );
  }

  private async inTheMaking(actor: Actor, calendar: Calendar): Promise<WaitingItem[]> {
    if (calendar.outNumber === null) return this.ofDraft(actor, calendar);
    const version = await this.versions.glance(actor, calendar.id, calendar.outNumber);
    const answers = await this.answers.list(actor, calendar.id, calendar.outNumber);
    return [
      ...ofSigner(actor, calendar, version, answers),
      ...(hasRole(actor, 'officer') ? ofOfficer(calendar, version, answers) : []),
    ];
  }

  /** A draft that is exactly what was published last waits for nobody. */
  private async ofDraft(actor: Actor, calendar: Calendar): Promise<WaitingItem[]> {
    if (!hasRole(actor, 'officer')) return [];
    const published = (await this.versions.list(actor, calendar.id)).find(
      ({ number }) => number === calendar.published?.number,
    );
    const publishedAt = published?.publishedAt ?? '';
    return calendar.updatedAt > publishedAt
      ? [item('go-on-with-draft', calendar, { of: calendar.entryCount })]
      : [];
  }
}

function ofSigner(
  actor: Actor,
  calendar: Calendar,
  { number, state, may }: Version,
  { progress }: AnswerList,
): WaitingItem[] {
  const items: WaitingItem[] = [];
  const own = progress.find(({ elderId }) => elderId === actor.person.id);
  if (state === 'in-review' && may.answer && own && own.answered < own.of) {
    items.push(item('answer-entries', calendar, { number, done: own.answered, of: own.of }));
  }
  if (may.signAsElder) items.push(item('sign-as-elder', calendar, { number }));
  if (may.signAsSteward) items.push(item('sign-as-steward', calendar, { number }));
  return items;
}

function ofOfficer(
  calendar: Calendar,
  { number, state, entries }: Version,
  { items: given, progress }: AnswerList,
): WaitingItem[] {
  if (state === 'signed-off') return [item('ready-to-publish', calendar, { number })];
  const titles = new Map(entries.map(({ entryId, content }) => [entryId, content.titleOfficer]));
  const asked = given.flatMap(({ entryId, elderName, note, answer, letStand }) => {
    const kind = standingKind(answer, letStand);
    if (kind === null) return [];
    const entryTitle = titles.get(entryId) ?? null;
    return [item(kind, calendar, { number, entryId, entryTitle, personName: elderName, note })];
  });
  const done = progress.filter(({ answered, of }) => answered === of).length;
  return [...asked, item('review-progress', calendar, { number, done, of: progress.length })];
}

/** What an elder said that stands in the way until the officer does something about it. */
function standingKind(answer: AnswerWord, letStand: boolean): WaitingItem['kind'] | null {
  if (answer === 'not-for-the-board') return 'elder-said-not-for-board';
  return answer === 'change-this' && !letStand ? 'elder-asked-change' : null;
}

function item(
  kind: WaitingItem['kind'],
  calendar: Calendar,
  facts: Partial<Omit<WaitingItem, 'kind' | 'calendarId' | 'placeName' | 'year'>>,
): WaitingItem {
  return {
    kind,
    calendarId: calendar.id,
    placeName: calendar.placeName,
    year: calendar.year,
    number: null,
    label: null,
    entryId: null,
    entryTitle: null,
    personName: null,
    note: null,
    done: 0,
    of: 0,
    ...facts,
  };
}
