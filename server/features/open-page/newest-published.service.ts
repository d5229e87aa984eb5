import type { EntityManager } from 'typeorm';
import { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';

/** The version that stands on the village's page for everybody; null before the first is published. */
export async function newestPublished(
  manager: EntityManager,
  communityId: string,
): Promise<CalendarVersionEntity | null> {
  return manager.findOne(CalendarVersionEntity, {
    where: { state: 'published', calendar: { communityId } },
    order: { publishedAt: 'DESC', id: 'ASC' },
  });
}
