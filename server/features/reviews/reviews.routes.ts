import { meetingsEndpoints } from '#shared/contracts/meetings.js';
import { reviewsEndpoints } from '#shared/contracts/reviews.js';
import type { Mount } from '../../http/mount.js';
import type { AnswersService } from './answers.service.js';
import type { OwnAnswersService } from './own-answers.service.js';
import type { MeetingsService } from './meetings.service.js';
import type { SigningService } from './signing.service.js';

export function reviewsRoutes(
  mount: Mount,
  answers: AnswersService,
  own: OwnAnswersService,
  signing: SigningService,
  meetings: MeetingsService,
): void {
  mount.forMemberUpload(meetingsEndpoints.type, ({ params, body }, actor, file) =>
    meetings.type(actor, params.calendarId, Number(params.number), body, file),
  );
  mount.forMember(reviewsEndpoints.listAnswers, ({ params }, actor) =>
    answers.list(actor, params.calendarId, Number(params.number)),
  );
  mount.forMember(reviewsEndpoints.putAnswer, ({ params, body }, actor) =>
    answers.put(actor, params.calendarId, Number(params.number), params.entryId, body),
  );
  mount.forMemberUpload(reviewsEndpoints.putSpokenAnswer, ({ params, body }, actor, file) =>
    answers.putSpoken(actor, params.calendarId, Number(params.number), params.entryId, body, file),
  );
  mount.forMember(reviewsEndpoints.takeBackAnswer, async ({ params }, actor) => {
    await answers.takeBack(actor, params.calendarId, Number(params.number), params.entryId);
    return undefined;
  });
  mount.forMember(reviewsEndpoints.letStand, ({ params }, actor) =>
    answers.letStand(actor, params.calendarId, Number(params.number), params.entryId),
  );
  mount.forMember(reviewsEndpoints.readOwn, ({ params }, actor) =>
    own.read(actor, params.calendarId, Number(params.number)),
  );
  mount.forMember(reviewsEndpoints.putOwnAnswer, ({ params, body }, actor) =>
    own.put(actor, params.calendarId, Number(params.number), params.entryId, body),
  );
  mount.forMember(reviewsEndpoints.letOwnStand, ({ params }, actor) =>
    own.letStand(actor, params.calendarId, Number(params.number), params.entryId),
  );
  mount.forMember(reviewsEndpoints.takeBackOwnAnswer, async ({ params }, actor) => {
    await own.takeBack(actor, params.calendarId, Number(params.number), params.entryId);
    return undefined;
  });
  mount.forMember(reviewsEndpoints.sign, ({ params, body }, actor) =>
    signing.sign(actor, params.calendarId, Number(params.number), body.role),
  );
}
