import type { CalendarFileSeason } from '#shared/contracts/calendar-file.js';
import { DECISIONS_MAX, LESSONS_MAX } from '#shared/contracts/season-reviews.js';
import { randomUUID } from 'node:crypto';
import { In, type EntityManager } from 'typeorm';
import type { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { SeasonDecisionEntity } from '../../db/entities/season-decision.entity.js';
import { SeasonLessonEntity } from '../../db/entities/season-lesson.entity.js';

/** What is written into a draft of what a year taught, and how much of it is not. */
export interface SeasonPlan {
  lessons: SeasonLessonEntity[];
  decisions: SeasonDecisionEntity[];
  left: number;
}

/** What a file holds of a year looked back at: what is about its own entries, and about the year. It names nobody. */
export async function seasonToCarry(
  manager: EntityManager,
  calendarId: string,
  entryIds: readonly string[],
): Promise<CalendarFileSeason> {
  const carried = new Set(entryIds);
  const isCarried = ({ entryId }: { entryId: string | null }) => entryId === null || carried.has(entryId);
  const lessons = await manager.find(SeasonLessonEntity, {
    where: { calendarId },
    order: { writtenAt: 'ASC', id: 'ASC' },
  });
  const decisions = await manager.find(SeasonDecisionEntity, {
    where: { calendarId },
    order: { decidedAt: 'ASC', id: 'ASC' },
  });
  return {
    lessons: lessons.filter(isCarried).map(({ id, entryId, text, writtenAt }) => ({
      ...{ lessonId: id, entryId, text },
      writtenAt: writtenAt.toISOString(),
    })),
    decisions: decisions.filter(isCarried).map(({ id, entryId, kind, text, decidedAt, doneOn }) => ({
      ...{ decisionId: id, entryId, kind, text, doneOn },
      decidedAt: decidedAt.toISOString(),
    })),
  };
}

/**
 * Lessons and decisions of a file as rows of a draft, in their writers' names: only those that still stand in the village, for
 * whoever took theirs out wants them nowhere; beside entries that come in; and in the year that taught them. What is said of
 * the year already is not said twice.
 * @param newIdOf ids of entries that come in, by those of their originals
 */
export async function seasonToLand(
  manager: EntityManager,
  { id: calendarId, communityId, year }: CalendarEntity,
  season: CalendarFileSeason,
  newIdOf: ReadonlyMap<string, string>,
): Promise<SeasonPlan> {
  const ids = {
    lessons: season.lessons.map(({ lessonId }) => lessonId),
    decisions: season.decisions.map(({ decisionId }) => decisionId),
  };
  const ofThisYear = { calendar: { communityId, year } };
  const there = {
    lessons: await manager.findBy(SeasonLessonEntity, { calendarId }),
    decisions: await manager.findBy(SeasonDecisionEntity, { calendarId }),
  };
  const anew = <R extends Row>(
    rows: readonly R[],
    order: readonly string[],
    standing: readonly R[],
    max: number,
  ) =>
    rows
      .toSorted((a, b) => order.indexOf(a.id) - order.indexOf(b.id))
      .flatMap((row): R[] => {
        const entryId = row.entryId === null ? null : newIdOf.get(row.entryId);
        return entryId === undefined ? [] : [{ ...row, id: randomUUID(), calendarId, entryId }];
      })
      .reduce<R[]>((coming, row) => {
        const beside = [...standing, ...coming].filter(({ entryId }) => entryId === row.entryId);
        const isSaid = beside.some((other) => says(other) === says(row));
        return isSaid || beside.length >= max ? coming : [...coming, row];
      }, []);
  const lessons = anew(
    await manager.findBy(SeasonLessonEntity, { id: In(ids.lessons), ...ofThisYear }),
    ...([ids.lessons, there.lessons, LESSONS_MAX] as const),
  );
  const decisions = anew(
    await manager.findBy(SeasonDecisionEntity, { id: In(ids.decisions), ...ofThisYear }),
    ...([ids.decisions, there.decisions, DECISIONS_MAX] as const),
  );
  const all = ids.lessons.length + ids.decisions.length;
  return { lessons, decisions, left: all - lessons.length - decisions.length };
}

export async function landSeason(manager: EntityManager, { lessons, decisions }: SeasonPlan): Promise<void> {
  if (lessons.length > 0) await manager.insert(SeasonLessonEntity, lessons);
  if (decisions.length > 0) await manager.insert(SeasonDecisionEntity, decisions);
}

interface Row {
  id: string;
  calendarId: string;
  entryId: string | null;
  authorId: string;
  text: string;
  kind?: string;
}

/** The same words by the same person about the same thing count once. */
function says({ authorId, kind = '', text }: Row): string {
  return [authorId, kind, text].join('\n');
}
