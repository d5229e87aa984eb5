import { seasonReviewsEndpoints } from '#shared/contracts/season-reviews.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { SeasonReviewsService } from './season-reviews.service.js';
import type { SeasonTasksService } from './season-tasks.service.js';
import type { SeasonWordsService } from './season-words.service.js';

export function seasonReviewsRoutes(
  mount: Mount,
  reviews: SeasonReviewsService,
  words: SeasonWordsService,
  tasks: SeasonTasksService,
): void {
  const at = seasonReviewsEndpoints;
  mount.forMember(at.read, ({ params }, actor) => reviews.read(actor, params.calendarId));
  mount.forMember(at.addLesson, ({ params, body }, actor) => words.addLesson(actor, params.calendarId, body));
  mount.forMember(at.removeLesson, async ({ params }, actor) => {
    await words.removeLesson(actor, params.calendarId, params.lessonId);
    return undefined;
  });
  mount.forMember(at.decide, ({ params, body }, actor) => words.decide(actor, params.calendarId, body));
  mount.forMember(at.removeDecision, async ({ params }, actor) => {
    await words.removeDecision(actor, params.calendarId, params.decisionId);
    return undefined;
  });
  mount.forMember(at.listTasks, async ({ params }, actor) =>
    wholeList(await tasks.list(actor, params.calendarId)),
  );
  mount.forMember(at.tick, ({ params }, actor) => tasks.tick(actor, params.calendarId, params.taskId));
  mount.forMember(at.untick, ({ params }, actor) => tasks.untick(actor, params.calendarId, params.taskId));
}
