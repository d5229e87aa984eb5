import { signsEndpoints } from '#shared/contracts/signs.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { OwnSightingsService } from './own-sightings.service.js';
import type { SignsService } from './signs.service.js';

export function signsRoutes(mount: Mount, signs: SignsService, own: OwnSightingsService): void {
  mount.forMember(signsEndpoints.listOwnSeen, async (_call, actor) => wholeList(await own.list(actor)));
  mount.forMember(signsEndpoints.markOwnSeen, ({ params, body }, actor) => own.mark(actor, params, body));
  mount.forMember(signsEndpoints.takeBackOwnSeen, ({ params }, actor) =>
    own.takeBack(actor, params, params.seenId),
  );
  mount.forMember(signsEndpoints.list, async (_call, actor) => wholeList(await signs.list(actor)));
  mount.forMember(signsEndpoints.add, ({ body }, actor) => signs.add(actor, body));
  mount.forMember(signsEndpoints.update, ({ params, body }, actor) =>
    signs.update(actor, params.signId, body),
  );
  mount.forMember(signsEndpoints.remove, async ({ params }, actor) => {
    await signs.remove(actor, params.signId);
    return undefined;
  });
  mount.forMember(signsEndpoints.restore, ({ params }, actor) => signs.restore(actor, params.signId));
  mount.forMember(signsEndpoints.markSeen, ({ params, body }, actor) =>
    signs.markSeen(actor, params.signId, body),
  );
  mount.forMember(signsEndpoints.takeBackSeen, ({ params }, actor) =>
    signs.takeBackSeen(actor, params.signId, params.seenId),
  );
}
