import type { SeasonReview } from '#shared/contracts/season-reviews.js';
import type { Notice } from '#shared/contracts/weather.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import type { DataSource, EntityManager } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { SeasonDecisionEntity } from '../../db/entities/season-decision.entity.js';
import { SeasonLessonEntity } from '../../db/entities/season-lesson.entity.js';
import type { Actor } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { viewerOf } from '../../policy/viewer.js';
import { actualDaysOf } from '../actual-days/known-days.service.js';
import { withDaysSince } from '../actual-days/live-days.service.js';
import { recordKeptReads } from '../audit/kept-reads.service.js';
import { personNames } from '../people/person-names.service.js';
import { figuresOf } from '../places/watched-place.service.js';
import { daysOfSigns } from '../signs/days-of-signs.service.js';
import type { FrozenContentService } from '../versions/frozen-content.service.js';
import type { WeatherService } from '../weather/weather.service.js';
import { toDecision, toLesson, toReviewedEntry } from './season-reviews.mapper.js';
import { namedBeside, seenRows } from './seen-season.service.js';

/** The year looked back at, for one person: what they do not see has no line, and counts in nothing. */
export class SeasonReviewsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly contents: FrozenContentService,
    private readonly weather: WeatherService,
  ) {}

  async read(actor: Actor, calendarId: string): Promise<SeasonReview> {
    const { manager } = this.dataSource;
    const calendar = await manager.findOneByOrFail(CalendarEntity, { id: calendarId });
    const { placeId, year, publishedNumber } = calendar;
    const draft = await this.contents.read(actor, calendarId, 'draft');
    const published =
      publishedNumber === null ? null : await this.contents.read(actor, calendarId, String(publishedNumber));
    const wentBy = published ? await withDaysSince(manager, year, published.entries) : [];
    const isPublished = new Set(wentBy.map(({ entryId }) => entryId));
    const bodies = [...wentBy, ...draft.entries.filter(({ entryId }) => !isPublished.has(entryId))];
    const ids = bodies.map(({ entryId }) => entryId);
    const viewer = await viewerOf(manager, actor, this.clock.now());
    await recordKeptReads(manager, viewer, this.clock.now(), 'entry', ids);
    const inDraft = new Set(draft.entries.map(({ entryId }) => entryId));
    const actual = await actualDaysOf(manager, ids);
    const seenDays = await daysOfSigns(manager, { signIds: sharedSignsOf(bodies), entryIds: ids }, year);
    const said = await this.said(manager, actor, calendarId);
    const next = await manager.findOneBy(CalendarEntity, { placeId, year: year + 1 });
    const { place, villageLanguage } = draft.header;
    return {
      ...{ calendarId, placeName: place.name, year, villageLanguageTag: villageLanguage.tag },
      label: published?.label ?? null,
      entries: bodies.map((body) =>
        toReviewedEntry({
          ...{ body, year, seenDays },
          figures: figuresOf((published?.header ?? draft.header).place),
          isPublished: isPublished.has(body.entryId),
          inDraft: inDraft.has(body.entryId),
          actual: actual.get(body.entryId) ?? null,
          ...said.about(body.entryId),
        }),
      ),
      ...said.about(null),
      notices: noticesOf(year, await this.weather.allNotices(actor)),
      nextCalendarId: next?.id ?? null,
    };
  }

  /** Lessons and decisions in the order in which they were written; those of an entry are only told beside it. */
  private async said(manager: EntityManager, actor: Actor, calendarId: string) {
    const lessons = await manager.find(SeasonLessonEntity, {
      where: { calendarId },
      order: { writtenAt: 'ASC', id: 'ASC' },
    });
    const decisions = await manager.find(SeasonDecisionEntity, {
      where: { calendarId },
      order: { decidedAt: 'ASC', id: 'ASC' },
    });
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const entryIds = [...lessons, ...decisions].flatMap(({ entryId }) => entryId ?? []);
    const seen = await seenRows(manager, viewer, [...new Set(entryIds)]);
    const names = await personNames(manager, [
      ...lessons.flatMap(({ authorId, typedBy }) => [authorId, typedBy]),
      ...decisions.flatMap(({ authorId, doneBy }) => [authorId, doneBy]),
    ]);
    return {
      about: (entryId: string | null) => {
        const shared = entryId === null ? undefined : seen.sharedOf(entryId);
        const isThere = entryId === null || seen.row(entryId) !== undefined;
        const nameOf = (personId: string) => namedBeside(viewer, shared, personId, names);
        const ofIt = (row: { entryId: string | null }) => isThere && row.entryId === entryId;
        return {
          lessons: lessons.filter(ofIt).map((row) => toLesson(row, viewer.personId, nameOf)),
          decisions: decisions.filter(ofIt).map((row) => toDecision(row, nameOf)),
        };
      },
    };
  }
}

function sharedSignsOf(bodies: readonly VersionEntryBody[]): string[] {
  return bodies.flatMap(({ content }) =>
    (content.record?.signs.list ?? []).flatMap(({ sharedId }) => sharedId ?? []),
  );
}

/** Those that held on some day of the year, oldest first. */
function noticesOf(year: number, notices: readonly Notice[]): Notice[] {
  const [first, last] = [`${String(year)}-01-01`, `${String(year)}-12-31`];
  return notices.filter(({ issuedOn, expiresOn }) => issuedOn <= last && expiresOn >= first).toReversed();
}
