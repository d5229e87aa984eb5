import { helpingEndpoints } from '#shared/contracts/helping.js';
import type { SessionState } from '#shared/contracts/session.js';
import type { Request, RequestHandler, Router } from 'express';
import type { Person } from '../../http/actor.js';
import { signInLimits } from '../../http/limits.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { HelpingService } from './helping.service.js';

export function helpingRoutes(
  router: Router,
  mount: Mount,
  helping: HelpingService,
  stateOf: (request: Request, person: Person) => Promise<SessionState>,
): void {
  // PINs are guessed here as at the door; wrong ones count on the card, too.
  const [perAddress] = signInLimits() as [RequestHandler];
  router.post(helpingEndpoints.start.path, perAddress);
  mount.forMember(helpingEndpoints.list, async (_call, actor) => wholeList(await helping.list(actor)));
  mount.forMember(helpingEndpoints.start, async ({ body, request }, actor) => {
    request.session.helping = await helping.start(actor, body);
    return stateOf(request, actor.person);
  });
  mount.forMember(helpingEndpoints.end, async ({ request }, actor) => {
    await helping.end(actor, request.session);
    delete request.session.helping;
    return stateOf(request, actor.person);
  });
}
