import type { EntityManager } from 'typeorm';
import { SeasonDecisionEntity } from '../../db/entities/season-decision.entity.js';
import { SeasonLessonEntity } from '../../db/entities/season-lesson.entity.js';

/** What was said and decided about an entry when its year was looked back at; the task goes with the decision. */
export async function eraseSeasonOf(manager: EntityManager, entryId: string): Promise<void> {
  await manager.delete(SeasonLessonEntity, { entryId });
  await manager.delete(SeasonDecisionEntity, { entryId });
}

/** What one person said that a year taught, in every village. */
export async function eraseLessonsBy(manager: EntityManager, personId: string): Promise<void> {
  await manager.delete(SeasonLessonEntity, { authorId: personId });
}
